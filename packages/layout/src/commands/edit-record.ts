/** Sets fields of records; an absent field stays, a null one is set to null. */
import type { LevelRecord, NodeRecord, SegmentRecord, SystemRecord } from "@cleatwork/contracts";
import type { Layout } from "../layout.ts";
import { changed, changeSet, need, refuse, type CommandResult } from "./command.ts";

type Fields<R> = Partial<Omit<R, "kind" | "id" | "systemId">>;

/** Sets the same fields on many segments at once: one undo step. */
export function setSegments(
  layout: Layout,
  input: { ids: readonly string[]; fields: Fields<Omit<SegmentRecord, "fromNodeId" | "toNodeId">>; label: string },
): CommandResult {
  const changes = [];
  for (const id of input.ids) {
    const segment = need(layout, "segment", id);
    if (!segment.ok) return segment;
    changes.push(changed(segment.value, { ...segment.value, ...input.fields }));
  }
  return changeSet(input.label, changes);
}

export function setNodes(
  layout: Layout,
  input: { ids: readonly string[]; fields: Fields<NodeRecord>; label: string },
): CommandResult {
  const changes = [];
  for (const id of input.ids) {
    const node = need(layout, "node", id);
    if (!node.ok) return node;
    changes.push(changed(node.value, { ...node.value, ...input.fields }));
  }
  return changeSet(input.label, changes);
}

export function setSystem(layout: Layout, input: { id: string; fields: Fields<SystemRecord> }): CommandResult {
  const system = need(layout, "system", input.id);
  if (!system.ok) return system;
  return changeSet(`Change system ${system.value.tag}`, [changed(system.value, { ...system.value, ...input.fields })]);
}

export function setLevel(layout: Layout, input: { id: string; fields: Fields<LevelRecord> }): CommandResult {
  const level = need(layout, "level", input.id);
  if (!level.ok) return level;
  return changeSet(`Change ${level.value.name}`, [changed(level.value, { ...level.value, ...input.fields })]);
}

/** A level that nothing stands on goes. */
export function removeLevel(layout: Layout, input: { id: string }): CommandResult {
  const level = need(layout, "level", input.id);
  if (!level.ok) return level;
  for (const record of layout.records.values())
    if (record.kind === "node" && record.levelId === input.id)
      return refuse("level-in-use", `Ducts stand on ${level.value.name}. Move or remove them first.`, level.value.id);
  return changeSet(`Remove ${level.value.name}`, [{ id: level.value.id, before: level.value, after: null }]);
}
