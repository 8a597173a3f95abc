import type { AirSystem } from "../air-system.ts";
import { PRACTICE_SOURCE, type PracticeCoefficients } from "../fittings/practice.table.ts";
import { pascals } from "../quantity.ts";
import type { Friction } from "./friction.ts";
import type { Sections } from "./sections.ts";
import type { SolvedAccessory } from "./solution.ts";

const NO_ACCESSORIES: readonly SolvedAccessory[] = [];

/** Dampers and the like of every segment, open, each on the velocity pressure of the segment. */
export function findAccessories(
  { segments }: AirSystem,
  { section }: Sections,
  { velocityPressure }: Friction,
  practice: PracticeCoefficients,
): readonly (readonly SolvedAccessory[])[] {
  return segments.map(({ accessories }, s) => {
    if (accessories.length === 0) return NO_ACCESSORIES;
    return accessories.map((kind) => {
      const row = practice.accessory[kind];
      const lossCoefficient = section[s]!.shape === "rectangular" ? row.rectangular : row.other;
      const loss_pa = pascals(lossCoefficient * velocityPressure[s]!);
      return { kind, lossCoefficient, loss_pa, source: PRACTICE_SOURCE };
    });
  });
}
