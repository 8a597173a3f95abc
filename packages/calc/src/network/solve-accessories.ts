import type { AirSegment, Section } from "../air-system.ts";
import { PRACTICE_SOURCE, type PracticeCoefficients } from "../fittings/practice.table.ts";
import { pascals } from "../quantity.ts";
import type { SolvedAccessory } from "./solution.ts";

const NO_ACCESSORIES: readonly SolvedAccessory[] = [];

/** Dampers and the like, open, each on the velocity pressure of the segment. */
export function lossOfAccessories(
  { accessories }: AirSegment,
  section: Section,
  velocityPressure: number,
  practice: PracticeCoefficients,
): readonly SolvedAccessory[] {
  if (accessories.length === 0) return NO_ACCESSORIES;
  return accessories.map((kind) => {
    const row = practice.accessory[kind];
    const lossCoefficient = section.shape === "rectangular" ? row.rectangular : row.other;
    return { kind, lossCoefficient, loss_pa: pascals(lossCoefficient * velocityPressure), source: PRACTICE_SOURCE };
  });
}
