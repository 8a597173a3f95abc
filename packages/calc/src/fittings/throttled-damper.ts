/** A single-blade volume damper, open and throttled, and the setting that takes up a given pressure. */
import { radians, type Radians } from "../quantity.ts";

/** How a blade closes a duct; a company's own to set. */
export interface DamperBlade {
  /** Coefficient of the blade fully open. */
  readonly open: number;
  /** Jet term k of the formula: how much narrower the jet is than the gap it comes from. */
  readonly jet: number;
}

export const DAMPER_SOURCE = "Idelchik, 3rd ed., diagram 9-17, plane disk; the open blade as set";

/** Farther closed the blade's edge leaks more than its gap passes, and no formula holds. */
export const MOST_DAMPER_ANGLE = radians((70 * Math.PI) / 180);

/**
 * Loss coefficient of a damper whose blade is turned by `angle` from open, on the velocity pressure of the duct.
 *
 *     C = C0 + (k / (1 − sin δ) − 1)² − (k − 1)²
 *
 * C0 open; k = 1.56 for a disk in a round duct. 1 − sin δ is the share of the duct that the blade leaves free; the jet behind
 * it is narrower still, and what it loses is a sudden enlargement.
 *
 * Range    0° to 70°; beyond, the value at 70°, and a finding
 * Source   Idelchik, 3rd ed., diagram 9-17, for Reynolds numbers over 10,000; that he gives no separate loss for the open blade
 *          is why his own is taken off and C0 put on
 *
 * @example damperCoefficient({ open: 0.2, jet: 1.56 }, radians(Math.PI / 6)) // 4.38
 */
export function damperCoefficient({ open, jet }: DamperBlade, angle: Radians): number {
  const free = 1 - Math.sin(Math.min(angle, MOST_DAMPER_ANGLE));
  return open + (jet / free - 1) ** 2 - (jet - 1) ** 2;
}

/**
 * How far the blade must be turned from open for a coefficient: the formula above read backwards.
 *
 *     sin δ = 1 − k / (1 + √(C − C0 + (k − 1)²))
 *
 * Answers null where even the blade at 70° loses less. Open, or less than open, is 0.
 */
export function damperAngle({ open, jet }: DamperBlade, coefficient: number): Radians | null {
  if (!(coefficient > open)) return radians(0);
  const angle = Math.asin(1 - jet / (1 + Math.sqrt(coefficient - open + (jet - 1) ** 2)));
  return angle <= MOST_DAMPER_ANGLE + 1e-12 ? radians(angle) : null;
}
