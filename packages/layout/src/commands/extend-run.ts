/** The next duct of a run: from a node, straight on or turned, as long as said or to a point. */
import { meters, type Meters } from "@cleatwork/calc";
import type { NodeRecord, SegmentRecord } from "@cleatwork/contracts";
import type { Layout } from "../layout.ts";
import { indexOf, nextNumber, type LayoutIndex } from "../layout-index.ts";
import { bareNode } from "./add-system.ts";
import { added, changeSet, need, refuse, type CommandResult, type IdSource } from "./command.ts";
import { between, lengthOf, round, scale, turned, unit, type Turn, type Vector } from "./direction.ts";

export type RunTo =
  | { readonly kind: "length"; readonly length_m: Meters; readonly turn: Turn }
  | { readonly kind: "point"; readonly x_m: number; readonly y_m: number };

/** What is said of the new duct; what is not said is taken from the duct before it. */
export type DuctFields = Partial<
  Pick<SegmentRecord, "name" | "ductClass" | "section" | "flexible" | "accessories" | "insulation" | "fitting">
>;

/** What makes the far end an outlet. */
export type OutletFields = Pick<NodeRecord, "airflow_m3s" | "requiredPressure_pa" | "deviceKey" | "spaceName" | "tag">;

export interface ExtendRun {
  readonly fromNodeId: string;
  readonly to: RunTo;
  readonly duct: DuctFields;
  readonly outlet: OutletFields | null;
}

export function extendRun(
  layout: Layout,
  input: ExtendRun,
  ids: Pick<IdSource, "node" | "segment">,
  index: LayoutIndex = indexOf(layout),
): CommandResult {
  const found = need(layout, "node", input.fromNodeId);
  if (!found.ok) return found;
  const from = found.value;
  if (from.role === "outlet")
    return refuse("outlet-goes-on", "An outlet ends its run. Turn it into a joint first.", from.id);
  const by = displacement(layout, index, from, input.to);
  if (!by || lengthOf(by) < 1e-6) return refuse("length-not-positive", "A duct is longer than nothing.", from.id);

  const parent = index.parentOf.get(from.id) ?? null;
  const to: NodeRecord = {
    ...bareNode,
    ...(input.outlet ?? {}),
    id: ids.node(),
    systemId: from.systemId,
    levelId: from.levelId,
    role: input.outlet ? "outlet" : "junction",
    x_m: meters(round(from.x_m + by.x)),
    y_m: meters(round(from.y_m + by.y)),
    elevation_m: meters(round(from.elevation_m + by.z)),
  };
  const siblings = index.childrenOf.get(from.id) ?? [];
  const segment: SegmentRecord = {
    kind: "segment",
    id: ids.segment(),
    systemId: from.systemId,
    fromNodeId: from.id,
    toNodeId: to.id,
    ordinal: (siblings.at(-1)?.ordinal ?? 0) + 1,
    number: nextNumber(index, from.systemId),
    name: parent?.name ?? "",
    ductClass: parent?.ductClass ?? "main",
    section: null,
    length_m: null,
    flexible: false,
    fitting: null,
    accessories: [],
    insulation: null,
    ...input.duct,
  };
  return changeSet(input.outlet ? "Add run with outlet" : "Add run", [added(to), added(segment)]);
}

function displacement(layout: Layout, index: LayoutIndex, from: NodeRecord, to: RunTo): Vector | null {
  if (to.kind === "point") return { x: to.x_m - from.x_m, y: to.y_m - from.y_m, z: 0 };
  if (!(to.length_m > 0)) return null;
  return scale(turned(headingAt(layout, index, from), to.turn), to.length_m);
}

/** Where the air has come from, going on; to the right of the sheet at the equipment. */
function headingAt(layout: Layout, index: LayoutIndex, node: NodeRecord): Vector {
  const parent = index.parentOf.get(node.id);
  const before = parent && layout.records.get(parent.fromNodeId);
  const heading = before?.kind === "node" ? unit(between(layout, before, node)) : null;
  return heading ?? { x: 1, y: 0, z: 0 };
}
