/** Builds the tree once, in one pass over nodes and one over segments. */
import type { AirSystem } from "../air-system.ts";
import { isNodeSound, problemsOfNode } from "./check-node.ts";
import { isSegmentSound, problemsOfSegment } from "./check-segment.ts";
import { reportCircles, reportDuplicates, reportLongWays, reportLooseEnds, reportSecondParent } from "./check-tree.ts";
import { findIdNear, indexIds, NOT_FOUND } from "./id-index.ts";
import { nodeSubject, problem, segmentSubject, systemSubject } from "./problems.ts";
import type { SystemProblem } from "./solution.ts";
import { NONE, type Tree } from "./tree-shape.ts";

export { NONE, type Tree } from "./tree-shape.ts";

/** The tree; sound only when no problem was added. Every problem found on the way is. */
export function buildTree(system: AirSystem, problems: SystemProblem[]): Tree {
  const { nodes, segments } = system;
  const outlets: number[] = [];
  const equipment = readNodes(system, outlets, problems);

  const from = new Int32Array(segments.length);
  const to = new Int32Array(segments.length);
  const into = new Int32Array(nodes.length).fill(NONE);
  readSegments(system, { from, to, into, equipment }, problems);

  const childStart = new Int32Array(nodes.length + 1);
  const childList = new Int32Array(segments.length);
  listChildren(from, childStart, childList);

  const before = new Int32Array(segments.length).fill(NONE);
  const order = new Int32Array(segments.length);
  const depth = new Int32Array(segments.length);
  const tree: Tree = {
    segmentCount: segments.length,
    equipment,
    from,
    to,
    into,
    before,
    childStart,
    childList,
    order,
    depth,
    outlets,
  };
  const reached = equipment === NONE ? 0 : walk(tree);
  reportLongWays(system, tree, reached, problems);

  reportLooseEnds(system, tree, problems);
  if (reached < segments.length) reportCircles(system, tree, problems);
  return tree;
}

/** Checks the nodes and sorts out the outlets; answers the equipment. */
function readNodes(system: AirSystem, outlets: number[], problems: SystemProblem[]): number {
  const { nodes } = system;
  let equipment = NONE;
  for (let n = 0; n < nodes.length; n++) {
    const node = nodes[n]!;
    if (node.role === "outlet") outlets.push(n);
    else if (node.role === "equipment") {
      if (equipment === NONE) equipment = n;
      else problems.push(problem("several-equipment", nodeSubject(node), "role", node.role, "one for each system"));
    }
    if (!isNodeSound(node)) problems.push(...problemsOfNode(node));
  }
  if (equipment === NONE) {
    problems.push(problem("no-equipment", systemSubject(system), "nodes", null, "one node with the role equipment"));
  }
  if (outlets.length === 0) {
    problems.push(problem("no-outlet", systemSubject(system), "nodes", null, "at least one node with the role outlet"));
  }
  return equipment;
}

interface Ends {
  readonly from: Int32Array;
  readonly to: Int32Array;
  readonly into: Int32Array;
  readonly equipment: number;
}

/** Checks the segments and ties them to their nodes. */
function readSegments(system: AirSystem, ends: Ends, problems: SystemProblem[]): void {
  const { nodes, segments, spec } = system;
  const { from, to, into, equipment } = ends;
  const nodeIndex = indexIds(nodes);
  if (nodeIndex.hasDuplicates) reportDuplicates(nodes.map(nodeSubject), problems);
  if (indexIds(segments).hasDuplicates) reportDuplicates(segments.map(segmentSubject), problems);

  // As runs are drawn: on from where the last segment ended, or, after an outlet, off the node that it left.
  let tailGuess = equipment;
  let headGuess = 0;
  for (let s = 0; s < segments.length; s++) {
    const segment = segments[s]!;
    if (!isSegmentSound(segment, spec)) problems.push(...problemsOfSegment(segment, spec));

    const tail = findIdNear(nodeIndex, segment.fromNodeId, tailGuess);
    const head = findIdNear(nodeIndex, segment.toNodeId, headGuess);
    tailGuess = head !== NOT_FOUND && nodes[head]!.role === "outlet" ? tail : head;
    headGuess = head + 1;
    from[s] = tail;
    to[s] = head;
    if (tail === NOT_FOUND || head === NOT_FOUND) {
      const field = tail === NOT_FOUND ? "fromNodeId" : "toNodeId";
      problems.push(problem("node-unknown", segmentSubject(segment), field, segment[field], "a node of this system"));
    } else if (into[head] === NONE && head !== equipment && head !== tail) into[head] = s;
    else reportSecondParent(system, s, { ...ends, tail, head }, problems);
  }
}

function listChildren(from: Int32Array, childStart: Int32Array, childList: Int32Array): void {
  for (let s = 0; s < from.length; s++) if (from[s] !== NONE) childStart[from[s]! + 1]!++;
  for (let n = 1; n < childStart.length; n++) childStart[n]! += childStart[n - 1]!;
  const filled = childStart.slice();
  for (let s = 0; s < from.length; s++) if (from[s] !== NONE) childList[filled[from[s]!]!++] = s;
}

/** Goes from the equipment to every end, a branch at a time, without recursion; answers how many segments it met. */
function walk({ equipment, to, into, before, childStart, childList, order, depth }: Tree): number {
  const waiting = new Int32Array(order.length + 1);
  let waitingCount = 0;
  let reached = 0;
  let node = equipment;
  let through = NONE;
  for (;;) {
    for (let c = childStart[node + 1]! - 1; c >= childStart[node]!; c--) {
      const child = childList[c]!;
      if (into[to[child]!] !== child) continue;
      before[child] = through;
      depth[child] = through === NONE ? 0 : depth[through]! + 1;
      waiting[waitingCount++] = child;
    }
    if (waitingCount === 0) return reached;
    through = waiting[--waitingCount]!;
    order[reached++] = through;
    node = to[through]!;
  }
}
