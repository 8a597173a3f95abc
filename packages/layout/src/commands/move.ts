/** Moves nodes, and everything attached follows: ducts have no place of their own. */
import { meters, type Meters } from "@cleatwork/calc";
import type { NodeRecord, SegmentRecord } from "@cleatwork/contracts";
import type { Layout } from "../layout.ts";
import { indexOf, subtreeOf, type LayoutIndex } from "../layout-index.ts";
import { changed, changeSet, need, refuse, type CommandResult } from "./command.ts";
import { between, lengthOf, movedBy, round, scale, unit } from "./direction.ts";

export function moveNode(layout: Layout, input: { id: string; x_m: number; y_m: number }): CommandResult {
  const node = need(layout, "node", input.id);
  if (!node.ok) return node;
  return changeSet("Move", [
    changed(node.value, { ...node.value, x_m: meters(round(input.x_m)), y_m: meters(round(input.y_m)) }),
  ]);
}

/**
 * Makes a duct as long as said, along the way it runs. What hangs on its far end moves along, so that the drawing and
 * the length agree. A duct without a direction keeps its place and is only said to be that long.
 */
export function setLength(
  layout: Layout,
  input: { segmentId: string; length_m: Meters },
  index: LayoutIndex = indexOf(layout),
): CommandResult {
  const found = need(layout, "segment", input.segmentId);
  if (!found.ok) return found;
  const segment = found.value;
  if (!(input.length_m > 0)) return refuse("length-not-positive", "A duct is longer than nothing.", segment.id);
  const from = need(layout, "node", segment.fromNodeId);
  const to = need(layout, "node", segment.toNodeId);
  if (!from.ok) return from;
  if (!to.ok) return to;
  const drawn = between(layout, from.value, to.value);
  const heading = unit(drawn);
  if (!heading) return changeSet("Length", [changed(segment, { ...segment, length_m: input.length_m })]);
  const by = scale(heading, input.length_m - lengthOf(drawn));
  return changeSet("Length", [
    changed(segment, { ...segment, length_m: null }),
    ...farNodes(layout, index, segment).map((node) => changed(node, movedBy(node, by))),
  ]);
}

/** The far node of a segment and every node beyond it. */
export const farNodes = (layout: Layout, index: LayoutIndex, root: SegmentRecord): NodeRecord[] =>
  subtreeOf(index, root).flatMap(({ toNodeId }) => {
    const node = layout.records.get(toNodeId);
    return node?.kind === "node" ? [node] : [];
  });

/** As long as said, or as drawn. */
export function lengthOfSegment(layout: Layout, segment: SegmentRecord): number {
  if (segment.length_m !== null) return segment.length_m;
  const from = layout.records.get(segment.fromNodeId);
  const to = layout.records.get(segment.toNodeId);
  return from?.kind === "node" && to?.kind === "node" ? lengthOf(between(layout, from, to)) : 0;
}
