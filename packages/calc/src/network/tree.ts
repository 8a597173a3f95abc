/** The air system as a tree of whole numbers: built once, in one pass over nodes and one over segments. */
import type { AirNode, AirSystem } from "../air-system.ts";
import { nodeSubject, problem, segmentSubject, systemSubject } from "./problems.ts";
import { isIn, ranges } from "./ranges.table.ts";
import type { SystemProblem } from "./solution.ts";
import { isSegmentSound, problemsOfSegment } from "./check-segment.ts";

export const NONE = -1;

export interface Tree {
  readonly segmentCount: number;
  /** Node index of each segment's ends. */
  readonly from: Int32Array;
  readonly to: Int32Array;
  /** The segment that leads to a node; NONE at the equipment. */
  readonly into: Int32Array;
  /** The segments that leave node n are childList[childStart[n]] up to childStart[n + 1]. */
  readonly childStart: Int32Array;
  readonly childList: Int32Array;
  /** Segments so that each comes after the one that feeds it. */
  readonly order: Int32Array;
  readonly outlets: readonly number[];
}

/** The tree; sound only when no problem was added. Every problem found on the way is. */
export function buildTree(system: AirSystem, problems: SystemProblem[]): Tree {
  const { nodes, segments } = system;
  const indexOfNode = new Map<string, number>();
  const outlets: number[] = [];
  let equipment = NONE;

  for (let n = 0; n < nodes.length; n++) {
    const node = nodes[n]!;
    indexOfNode.set(node.id, n);
    if (node.role === "outlet") outlets.push(n);
    else if (node.role === "equipment") {
      if (equipment === NONE) equipment = n;
      else problems.push(problem("several-equipment", nodeSubject(node), "role", "equipment", "one for each system"));
    }
    if (!isNodeSound(node)) checkNode(node, problems);
  }
  if (indexOfNode.size !== nodes.length) reportDuplicates(system, "node", problems);
  if (equipment === NONE) {
    problems.push(problem("no-equipment", systemSubject(system), "nodes", null, "one node with the role equipment"));
  }
  if (outlets.length === 0) {
    problems.push(problem("no-outlet", systemSubject(system), "nodes", null, "at least one node with the role outlet"));
  }

  const segmentCount = segments.length;
  const from = new Int32Array(segmentCount);
  const to = new Int32Array(segmentCount);
  const into = new Int32Array(nodes.length).fill(NONE);
  const childStart = new Int32Array(nodes.length + 1);
  const segmentIds = new Set<string>();

  for (let s = 0; s < segmentCount; s++) {
    const segment = segments[s]!;
    segmentIds.add(segment.id);
    if (!isSegmentSound(segment, system.spec)) problems.push(...problemsOfSegment(segment, system.spec));

    const tail = indexOfNode.get(segment.fromNodeId) ?? NONE;
    const head = indexOfNode.get(segment.toNodeId) ?? NONE;
    from[s] = tail;
    to[s] = head;
    if (tail === NONE || head === NONE) {
      const field = tail === NONE ? "fromNodeId" : "toNodeId";
      problems.push(problem("node-unknown", segmentSubject(segment), field, segment[field], "a node of this system"));
      continue;
    }
    childStart[tail + 1]!++;
    if (into[head] === NONE && head !== equipment && head !== tail) into[head] = s;
    else if (head === equipment || head === tail || leadsBack(into, from, tail, head)) {
      problems.push(
        problem(
          "segment-loops",
          segmentSubject(segment),
          "toNodeId",
          segment.toNodeId,
          "a node farther from the equipment",
        ),
      );
    } else {
      const first = segments[into[head]!]!;
      problems.push(
        problem(
          "node-has-two-parents",
          segmentSubject(segment),
          "toNodeId",
          segment.toNodeId,
          `one segment leading to a node; ${first.name || first.id} already does`,
        ),
      );
    }
  }
  if (segmentIds.size !== segmentCount) reportDuplicates(system, "segment", problems);

  for (let n = 0; n < nodes.length; n++) childStart[n + 1]! += childStart[n]!;
  const childList = new Int32Array(segmentCount);
  const filled = childStart.slice(0, nodes.length);
  for (let s = 0; s < segmentCount; s++) {
    const tail = from[s]!;
    if (tail !== NONE) childList[filled[tail]!++] = s;
  }

  const order = new Int32Array(segmentCount);
  let reached = 0;
  const reach = (node: number) => {
    for (let c = childStart[node]!; c < childStart[node + 1]!; c++) {
      const child = childList[c]!;
      if (into[to[child]!] === child) order[reached++] = child;
    }
  };
  if (equipment !== NONE) reach(equipment);
  for (let at = 0; at < reached; at++) reach(to[order[at]!]!);

  const tree = { segmentCount, from, to, into, childStart, childList, order, outlets };
  checkEnds(system, tree, problems);
  if (reached < segmentCount) reportCircles(system, tree, problems);
  return tree;
}

/** Going up from `node` we meet `ancestor`: a segment from the one to the other would close a circle. */
function leadsBack(into: Int32Array, from: Int32Array, node: number, ancestor: number): boolean {
  let at = node;
  // A circle elsewhere on the way up must not catch us.
  for (let steps = 0; steps <= into.length; steps++) {
    if (at === ancestor) return true;
    const up = into[at]!;
    if (up === NONE) return false;
    at = from[up]!;
  }
  return false;
}

const isNodeSound = (node: AirNode): boolean =>
  isIn(ranges.position, node.x_m) &&
  isIn(ranges.position, node.y_m) &&
  isIn(ranges.position, node.elevation_m) &&
  (node.role === "outlet"
    ? node.airflow_m3s !== null &&
      isIn(ranges.airflow, node.airflow_m3s) &&
      (node.requiredPressure_pa === null || isIn(ranges.outletPressure, node.requiredPressure_pa))
    : node.role === "junction" || node.role === "equipment");

function checkNode(node: AirNode, problems: SystemProblem[]): void {
  const subject = nodeSubject(node);
  for (const field of ["x_m", "y_m", "elevation_m"] as const) {
    if (!isIn(ranges.position, node[field])) {
      problems.push(problem("value-out-of-range", subject, field, node[field], ranges.position.words));
    }
  }
  if (node.role !== "outlet") {
    if (node.role !== "junction" && node.role !== "equipment") {
      problems.push(problem("value-out-of-range", subject, "role", node.role, "equipment, junction or outlet"));
    }
    return;
  }
  if (node.airflow_m3s === null || node.airflow_m3s === 0) {
    problems.push(problem("outlet-without-airflow", subject, "airflow_m3s", node.airflow_m3s, ranges.airflow.words));
  } else if (!isIn(ranges.airflow, node.airflow_m3s)) {
    problems.push(problem("value-out-of-range", subject, "airflow_m3s", node.airflow_m3s, ranges.airflow.words));
  }
  const required = node.requiredPressure_pa;
  if (required !== null && !isIn(ranges.outletPressure, required)) {
    problems.push(problem("value-out-of-range", subject, "requiredPressure_pa", required, ranges.outletPressure.words));
  }
}

function reportDuplicates(system: AirSystem, kind: "node" | "segment", problems: SystemProblem[]): void {
  const seen = new Set<string>();
  const subjects = kind === "node" ? system.nodes.map(nodeSubject) : system.segments.map(segmentSubject);
  for (const subject of subjects) {
    if (seen.has(subject.id))
      problems.push(problem("duplicate-id", subject, "id", subject.id, `one ${kind} for each id`));
    seen.add(subject.id);
  }
}

/** Every node hangs on the tree, every branch of it ends at an outlet and goes no farther. */
function checkEnds(system: AirSystem, { into, childStart }: Tree, problems: SystemProblem[]): void {
  for (let n = 0; n < system.nodes.length; n++) {
    const node = system.nodes[n]!;
    const isLeaf = childStart[n] === childStart[n + 1];
    if (node.role === "equipment") {
      continue;
    } else if (into[n] === NONE) {
      problems.push(problem("node-orphaned", nodeSubject(node), "id", node.id, "a segment that leads to it"));
    } else if (node.role === "outlet" && !isLeaf) {
      problems.push(
        problem("outlet-with-children", nodeSubject(node), "role", node.role, "no segment beyond an outlet"),
      );
    } else if (node.role === "junction" && isLeaf) {
      const segment = system.segments[into[n]!]!;
      problems.push(
        problem(
          "dead-end-without-outlet",
          segmentSubject(segment),
          "toNodeId",
          node.id,
          "an outlet at the end of a run",
        ),
      );
    }
  }
}

/** Segments that feed themselves although each node has one parent: circles off the tree. Each segment is named once. */
function reportCircles(system: AirSystem, { from, to, into, segmentCount }: Tree, problems: SystemProblem[]): void {
  // The walk that met a segment first, so that coming back to it within one walk is a circle.
  const walkOf = new Int32Array(segmentCount);
  for (let start = 0; start < segmentCount; start++) {
    const walk = start + 1;
    let s = into[to[start]!] === start ? start : NONE;
    while (s !== NONE && walkOf[s] === 0) {
      walkOf[s] = walk;
      s = into[from[s]!] ?? NONE;
    }
    if (s === NONE || walkOf[s] !== walk) continue;
    const first = s;
    do {
      const segment = system.segments[s]!;
      const limit = "a way back to the equipment";
      problems.push(problem("segment-loops", segmentSubject(segment), "toNodeId", segment.toNodeId, limit));
      s = into[from[s]!]!;
    } while (s !== first);
  }
}
