/** What keeps a layout from being a tree, each with the segment or node named. */
import type { AirSystem } from "../air-system.ts";
import { nodeSubject, problem, segmentSubject } from "./problems.ts";
import type { SystemProblem } from "./solution.ts";
import { NONE, type Tree } from "./tree-shape.ts";

export function reportDuplicates(subjects: readonly SystemProblem["subject"][], problems: SystemProblem[]): void {
  const seen = new Set<string>();
  for (const subject of subjects) {
    if (seen.has(subject.id)) problems.push(problem("duplicate-id", subject, "id", subject.id, "an id of its own"));
    seen.add(subject.id);
  }
}

/** A segment that leads to a node which another leads to, or back toward the equipment. */
export function reportSecondParent(
  system: AirSystem,
  s: number,
  ends: { from: Int32Array; into: Int32Array; equipment: number; tail: number; head: number },
  problems: SystemProblem[],
): void {
  const { from, into, equipment, tail, head } = ends;
  const segment = system.segments[s]!;
  if (head === equipment || head === tail || leadsBack(into, from, tail, head)) {
    const limit = "a node farther from the equipment";
    problems.push(problem("segment-loops", segmentSubject(segment), "toNodeId", segment.toNodeId, limit));
    return;
  }
  const first = system.segments[into[head]!]!;
  const limit = `one segment leading to a node; ${first.name || first.id} already does`;
  problems.push(problem("node-has-two-parents", segmentSubject(segment), "toNodeId", segment.toNodeId, limit));
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

/** Every node hangs on the tree, every branch of it ends at an outlet and goes no farther. */
export function reportLooseEnds({ nodes, segments }: AirSystem, tree: Tree, problems: SystemProblem[]): void {
  const { into, childStart } = tree;
  for (let n = 0; n < nodes.length; n++) {
    const node = nodes[n]!;
    if (node.role === "equipment") continue;
    const isLeaf = childStart[n] === childStart[n + 1];
    if (into[n] === NONE) {
      problems.push(problem("node-orphaned", nodeSubject(node), "id", node.id, "a segment that leads to it"));
    } else if (node.role === "outlet") {
      if (isLeaf) continue;
      problems.push(
        problem("outlet-with-children", nodeSubject(node), "role", node.role, "no segment beyond an outlet"),
      );
    } else if (isLeaf) {
      const subject = segmentSubject(segments[into[n]!]!);
      problems.push(problem("dead-end-without-outlet", subject, "toNodeId", node.id, "an outlet at the end of a run"));
    }
  }
}

/** Every path is told segment by segment, so a main with thousands of taps in a row would be told millions of times. */
const MOST_SEGMENTS_ON_A_PATH = 1000;

export function reportLongWays({ segments }: AirSystem, tree: Tree, reached: number, problems: SystemProblem[]): void {
  for (let at = 0; at < reached; at++) {
    const s = tree.order[at]!;
    // The first beyond the limit stands for all that follow it.
    if (tree.depth[s] !== MOST_SEGMENTS_ON_A_PATH) continue;
    const limit = `at most ${MOST_SEGMENTS_ON_A_PATH} segments from the equipment to an outlet`;
    const segment = segments[s]!;
    problems.push(problem("value-out-of-range", segmentSubject(segment), "fromNodeId", segment.fromNodeId, limit));
  }
}

/** Segments that feed themselves although each node has one parent: circles off the tree. Each segment is named once. */
export function reportCircles({ segments }: AirSystem, tree: Tree, problems: SystemProblem[]): void {
  const { from, to, into, segmentCount } = tree;
  // The walk that met a segment first, so that coming back to it within one walk is a circle.
  const walkOf = new Int32Array(segmentCount);
  for (let start = 0; start < segmentCount; start++) {
    const walk = start + 1;
    let s = to[start] !== NONE && into[to[start]!] === start ? start : NONE;
    while (s !== NONE && walkOf[s] === 0) {
      walkOf[s] = walk;
      s = into[from[s]!] ?? NONE;
    }
    if (s === NONE || walkOf[s] !== walk) continue;
    const first = s;
    do {
      const segment = segments[s]!;
      const limit = "a way back to the equipment";
      problems.push(problem("segment-loops", segmentSubject(segment), "toNodeId", segment.toNodeId, limit));
      s = into[from[s]!]!;
    } while (s !== first);
  }
}
