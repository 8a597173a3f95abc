import type { AirSegment, SealClass, Shape } from "../air-system.ts";
import {
  CUBIC_METERS_PER_SECOND_PER_CFM,
  METERS_PER_FOOT,
  PASCALS_PER_INCH_OF_WATER,
  cubicMetersPerSecond,
  type CubicMetersPerSecond,
  type Pascals,
  type SquareMeters,
} from "../quantity.ts";
import { leakageClassTable } from "./leakage.table.ts";

/** m³/s per m² at 1 Pa for one unit of leakage class. */
const PER_CLASS =
  CUBIC_METERS_PER_SECOND_PER_CFM /
  (100 * METERS_PER_FOOT ** 2) /
  PASCALS_PER_INCH_OF_WATER ** leakageClassTable.exponent;

/** Leakage class of a duct; flat oval and annular outer walls are made as round. */
export function leakageClass(sealClass: SealClass, shape: Shape, flexible: AirSegment["flexible"]): number {
  const row = leakageClassTable.rows[sealClass];
  return flexible ? row.flexible : shape === "rectangular" ? row.rectangular : row.round;
}

/**
 * Air that leaks through the wall of a duct, out of it under pressure and into it under suction.
 *
 *     Q = CL A P^0.65     Q in cfm, A in 100 ft², P in in. of water
 *
 * The pressure is the static one in this duct, whatever its sign, not the fan's.
 *
 * Source   SMACNA HVAC Air Duct Leakage Test Manual
 *
 * @example 2,500 ft² of class 12 at 2 in. of water: 470.8 cfm
 */
export const leakage = (
  leakageClassOfDuct: number,
  surface: SquareMeters,
  staticPressure: Pascals,
): CubicMetersPerSecond =>
  // A power by logarithms: many times faster than the general one, and good to the last digits.
  cubicMetersPerSecond(
    PER_CLASS *
      leakageClassOfDuct *
      surface *
      Math.exp(leakageClassTable.exponent * Math.log(Math.abs(staticPressure))),
  );
