/** New levels, systems and their equipment. */
import { meters, type Meters } from "@cleatwork/calc";
import type { LevelRecord, NodeRecord, SystemRecord } from "@cleatwork/contracts";
import { find, type Layout } from "../layout.ts";
import { indexOf } from "../layout-index.ts";
import { added, changeSet, need, refuse, removed, type CommandResult, type IdSource } from "./command.ts";

export const addLevel = (
  _layout: Layout,
  input: { name: string; elevation_m: Meters },
  ids: Pick<IdSource, "level">,
): CommandResult => {
  const level: LevelRecord = { kind: "level", id: ids.level(), ...input, underlay: null };
  return changeSet(`Add ${input.name}`, [added(level)]);
};

/** A system with its equipment, which is the root of its tree. */
export function addSystem(
  layout: Layout,
  input: {
    system: Omit<SystemRecord, "kind" | "id">;
    equipment: { tag: string; levelId: string; x_m: Meters; y_m: Meters; elevation_m: Meters };
  },
  ids: Pick<IdSource, "system" | "node">,
): CommandResult {
  const level = need(layout, "level", input.equipment.levelId);
  if (!level.ok) return level;
  const system: SystemRecord = { kind: "system", id: ids.system(), ...input.system };
  const equipment: NodeRecord = {
    ...bareNode,
    ...input.equipment,
    levelId: level.value.id,
    id: ids.node(),
    systemId: system.id,
    role: "equipment",
  };
  return changeSet(`Add system ${system.tag}`, [added(system), added(equipment)]);
}

/** Puts equipment into a system that has none. */
export function placeEquipment(
  layout: Layout,
  input: { systemId: string; levelId: string; tag: string; x_m: Meters; y_m: Meters; elevation_m: Meters },
  ids: Pick<IdSource, "node">,
): CommandResult {
  const system = need(layout, "system", input.systemId);
  if (!system.ok) return system;
  const level = need(layout, "level", input.levelId);
  if (!level.ok) return level;
  const standing = indexOf(layout).equipmentOf.get(system.value.id);
  if (standing)
    return refuse(
      "has-equipment",
      `${system.value.tag} has its equipment already: ${standing.tag || "unnamed"}. Move that one.`,
      standing.id,
    );
  const { systemId: _systemId, levelId: _levelId, ...place } = input;
  return changeSet(`Place ${input.tag}`, [
    added({
      ...bareNode,
      ...place,
      id: ids.node(),
      systemId: system.value.id,
      levelId: level.value.id,
      role: "equipment",
    }),
  ]);
}

/** The system with all that belongs to it. */
export function removeSystem(layout: Layout, input: { id: string }): CommandResult {
  const system = find(layout, "system", input.id);
  if (!system) return refuse("not-found", "This system is no longer there.");
  const changes = [];
  for (const record of layout.records.values())
    if ((record.kind === "node" || record.kind === "segment") && record.systemId === system.id)
      changes.push(removed(record));
  return changeSet(`Remove system ${system.tag}`, [...changes, removed(system)]);
}

/** A node with nothing said about it yet. */
export const bareNode = {
  kind: "node",
  tag: "",
  elevation_m: meters(0),
  airflow_m3s: null,
  requiredPressure_pa: null,
  deviceKey: null,
  spaceName: "",
} as const;
