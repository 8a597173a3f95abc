import type { DesignConditions } from "../air-system.ts";
import { cubicMetersPerSecond, pascals } from "../quantity.ts";
import type { FanDuty } from "./solution.ts";
import { NONE, type Tree } from "./tree-shape.ts";

/**
 * What the fan must move and make for this duct system.
 *
 *     FTP = required × (1 + margin),   FSP = FTP − velocity pressure at the fan
 *
 * Leakage counts in the air that the fan moves, not in the flow of the segments, which carry the design air of their outlets as
 * they are sized by. Where 5 % of the air leaks, the first segments really carry up to 5 % more and lose about 10 % more than
 * their design friction: that is one of the things the margin is for, and why leakage is told beside it.
 *
 * Source   definitions of fan total and fan static pressure as in ANSI/AMCA 210 (from memory; the standard itself was not seen)
 */
export function fanDuty(
  { safetyMargin }: DesignConditions,
  sums: { requiredPressure: number; outletAirflow: number; leakage: number },
  { before }: Tree,
  velocityPressure: Float64Array,
): FanDuty {
  const { requiredPressure, outletAirflow, leakage } = sums;
  const margin = safetyMargin * requiredPressure;
  const total = requiredPressure + margin;
  const atFan = greatestAtEquipment(before, velocityPressure);
  return {
    airflow_m3s: cubicMetersPerSecond(outletAirflow + leakage),
    requiredPressure_pa: pascals(requiredPressure),
    safetyMargin,
    marginPressure_pa: pascals(margin),
    totalPressure_pa: pascals(total),
    velocityPressure_pa: pascals(atFan),
    staticPressure_pa: pascals(total - atFan),
  };
}

function greatestAtEquipment(before: Int32Array, velocityPressure: Float64Array): number {
  let greatest = 0;
  for (let s = 0; s < before.length; s++) {
    if (before[s] === NONE && velocityPressure[s]! > greatest) greatest = velocityPressure[s]!;
  }
  return greatest;
}
