/** Puts a joint into a duct, so that something can hang on it. The two parts are as the whole was. */
import { meters } from "@cleatwork/calc";
import type { NodeRecord, SegmentRecord } from "@cleatwork/contracts";
import type { Layout } from "../layout.ts";
import { indexOf, nextNumber } from "../layout-index.ts";
import { bareNode } from "./add-system.ts";
import { added, changed, changeSet, need, refuse, type CommandResult, type IdSource } from "./command.ts";
import { round } from "./direction.ts";

/** `share` is how far along the duct, from the end nearer the equipment. */
export function splitSegment(
  layout: Layout,
  input: { segmentId: string; share: number },
  ids: Pick<IdSource, "node" | "segment">,
): CommandResult {
  const found = need(layout, "segment", input.segmentId);
  if (!found.ok) return found;
  const segment = found.value;
  const { share } = input;
  if (!(share > 0 && share < 1)) return refuse("share-outside", "A duct is split between its ends.", segment.id);
  const from = need(layout, "node", segment.fromNodeId);
  const to = need(layout, "node", segment.toNodeId);
  if (!from.ok) return from;
  if (!to.ok) return to;

  const along = (a: number, b: number) => meters(round(a + (b - a) * share));
  const joint: NodeRecord = {
    ...bareNode,
    id: ids.node(),
    systemId: segment.systemId,
    role: "junction",
    levelId: from.value.levelId,
    x_m: along(from.value.x_m, to.value.x_m),
    y_m: along(from.value.y_m, to.value.y_m),
    elevation_m:
      from.value.levelId === to.value.levelId
        ? along(from.value.elevation_m, to.value.elevation_m)
        : from.value.elevation_m,
  };
  const part = (length: number | null) => (length === null ? null : meters(length));
  const second: SegmentRecord = {
    ...segment,
    id: ids.segment(),
    number: nextNumber(indexOf(layout), segment.systemId),
    fromNodeId: joint.id,
    ordinal: 1,
    length_m: part(segment.length_m && segment.length_m * (1 - share)),
    fitting: null,
    accessories: [],
    ...(segment.damperAngle_rad ? { damperAngle_rad: null } : {}),
  };
  // The damper stays in the first part, the end at the outlet goes with the second.
  const withoutMouth = segment.mouth ? { mouth: null } : {};
  return changeSet("Split", [
    added(joint),
    changed(segment, {
      ...segment,
      ...withoutMouth,
      toNodeId: joint.id,
      length_m: part(segment.length_m && segment.length_m * share),
    }),
    added(second),
  ]);
}
