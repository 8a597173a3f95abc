/** Copies a branch, with everything that hangs on it, onto another node. */
import type { NodeId, NodeRecord, SegmentRecord } from "@cleatwork/contracts";
import type { Layout } from "../layout.ts";
import { indexOf, nextNumber, subtreeOf, type LayoutIndex } from "../layout-index.ts";
import { added, changeSet, need, refuse, type CommandResult, type IdSource } from "./command.ts";
import { movedBy, type Vector } from "./direction.ts";

export interface CopyBranch {
  readonly segmentId: string;
  /** The node that the copy hangs on; the same one puts it beside itself. */
  readonly toNodeId: string;
  /** Mirrored over the line of the sheet through the new node. */
  readonly mirror: "none" | "left-right" | "up-down";
}

export function copyBranch(
  layout: Layout,
  input: CopyBranch,
  ids: Pick<IdSource, "node" | "segment">,
  index: LayoutIndex = indexOf(layout),
): CommandResult {
  const root = need(layout, "segment", input.segmentId);
  const target = need(layout, "node", input.toNodeId);
  if (!root.ok) return root;
  if (!target.ok) return target;
  const origin = need(layout, "node", root.value.fromNodeId);
  if (!origin.ok) return origin;
  if (target.value.role === "outlet")
    return refuse("outlet-goes-on", "Nothing hangs on an outlet. Choose a joint.", target.value.id);

  const copies = new Map<NodeId, NodeRecord>([[origin.value.id, target.value]]);
  const changes = [];
  let number = nextNumber(index, target.value.systemId);
  for (const segment of subtreeOf(index, root.value)) {
    const from = copies.get(segment.fromNodeId);
    const end = layout.records.get(segment.toNodeId);
    if (!from || end?.kind !== "node") continue;
    const node = copyOf(end, origin.value, target.value, input.mirror, ids.node());
    copies.set(end.id, node);
    const siblings = index.childrenOf.get(target.value.id) ?? [];
    const copy: SegmentRecord = {
      ...segment,
      id: ids.segment(),
      number: number++,
      systemId: target.value.systemId,
      fromNodeId: from.id,
      toNodeId: node.id,
      ordinal: from.id === target.value.id ? (siblings.at(-1)?.ordinal ?? 0) + 1 : segment.ordinal,
    };
    changes.push(added(node), added(copy));
  }
  return changeSet(`Copy ${root.value.name || "branch"}`, changes);
}

function copyOf(
  node: NodeRecord,
  origin: NodeRecord,
  target: NodeRecord,
  mirror: CopyBranch["mirror"],
  id: NodeId,
): NodeRecord {
  const from: Vector = { x: node.x_m - origin.x_m, y: node.y_m - origin.y_m, z: node.elevation_m - origin.elevation_m };
  const by: Vector = {
    x: mirror === "left-right" ? -from.x : from.x,
    y: mirror === "up-down" ? -from.y : from.y,
    z: from.z,
  };
  return {
    ...node,
    ...movedBy(target, by),
    id,
    systemId: target.systemId,
    levelId: target.levelId,
    role: node.role,
    tag: "",
    airflow_m3s: node.airflow_m3s,
    requiredPressure_pa: node.requiredPressure_pa,
    deviceKey: node.deviceKey,
    spaceName: node.spaceName,
  };
}
