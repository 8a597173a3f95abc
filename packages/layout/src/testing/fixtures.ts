/** A small system to edit in tests, and ids that count. */
import {
  cubicFeetPerMinute,
  degreesFahrenheit,
  feet,
  feetPerMinute,
  inches,
  inchesOfWater,
  inchesOfWaterPer100Feet,
  meters,
} from "@cleatwork/calc";
import type { ChangeSet, LevelId, NodeId, SegmentId, SpecId, SystemId } from "@cleatwork/contracts";
import { applyChangeSet } from "../change-set.ts";
import { addLevel, addSystem } from "../commands/add-system.ts";
import type { CommandResult, IdSource } from "../commands/command.ts";
import { extendRun } from "../commands/extend-run.ts";
import { createLayout, listOf, type Layout } from "../layout.ts";
import { indexOf } from "../layout-index.ts";

export function countingIds(): IdSource {
  let count = 0;
  const next = (kind: string) => `${kind}_${String(++count).padStart(26, "0")}`;
  return {
    level: () => next("lvl") as LevelId,
    system: () => next("sys") as SystemId,
    node: () => next("nod") as NodeId,
    segment: () => next("seg") as SegmentId,
  };
}

export const specId = `spc_${"0".repeat(26)}` as SpecId;

/** The layout after a command that must succeed. */
export function done(layout: Layout, result: CommandResult): Layout {
  if (!result.ok) throw new Error(result.problems.map(({ message }) => message).join("; "));
  const applied = applyChangeSet(layout, result.value);
  if (!applied.ok) throw new Error("the set does not fit");
  return applied.value;
}

export function setOf(result: CommandResult): ChangeSet {
  if (!result.ok) throw new Error(result.problems.map(({ message }) => message).join("; "));
  return result.value;
}

const perClass = <T>(value: T) => ({ main: value, branch: value, runout: value });

/** Level 1 with a supply system: a main of three ducts, a branch off its second joint, an outlet at each end. */
export function smallSystem(ids: IdSource): Layout {
  let layout = done(createLayout([]), addLevel(createLayout([]), { name: "Level 1", elevation_m: meters(0) }, ids));
  const levelId = listOf(layout, "level")[0]?.id ?? "";
  layout = done(
    layout,
    addSystem(
      layout,
      {
        system: {
          tag: "S1",
          name: "Supply",
          service: "supply",
          specId,
          design: {
            altitude_m: meters(0),
            temperature_k: degreesFahrenheit(55),
            relativeHumidity: 0.5,
            availablePressure_pa: inchesOfWater(0.5),
            safetyMargin: 0,
          },
          limits: {
            velocity_m_s: perClass(feetPerMinute(1500)),
            frictionRate_pa_m: perClass(inchesOfWaterPer100Feet(0.1)),
            flexibleLength_m: feet(5),
          },
          sizing: {
            method: "equal-friction",
            frictionRate_pa_m: inchesOfWaterPer100Feet(0.08),
            shape: "rectangular",
            maximumHeight_m: null,
          },
        },
        equipment: { tag: "AH-1", levelId, x_m: meters(0), y_m: meters(0), elevation_m: feet(10) },
      },
      ids,
    ),
  );
  const outlet = {
    airflow_m3s: cubicFeetPerMinute(400),
    requiredPressure_pa: inchesOfWater(0.05),
    deviceKey: "diffuser-24x24",
    spaceName: "Reading",
    tag: "D-1",
  };
  const main = { name: "Main", section: { shape: "rectangular", width_m: inches(24), height_m: inches(12) } } as const;
  const straight = { kind: "length", length_m: feet(20), turn: "straight" } as const;
  layout = done(layout, extendRun(layout, { fromNodeId: rootOf(layout), to: straight, duct: main, outlet: null }, ids));
  layout = done(layout, extendRun(layout, { fromNodeId: endOf(layout), to: straight, duct: {}, outlet: null }, ids));
  const joint = endOf(layout);
  layout = done(layout, extendRun(layout, { fromNodeId: joint, to: straight, duct: {}, outlet }, ids));
  return done(
    layout,
    extendRun(
      layout,
      {
        fromNodeId: joint,
        to: { ...straight, turn: "right" },
        duct: { name: "Branch", ductClass: "branch", section: { shape: "round", diameter_m: inches(10) } },
        outlet,
      },
      ids,
    ),
  );
}

const rootOf = (layout: Layout): string => [...indexOf(layout).equipmentOf.values()][0]?.id ?? "";
/** The end of the duct that was added last. */
const endOf = (layout: Layout): string => listOf(layout, "segment").at(-1)?.toNodeId ?? "";
