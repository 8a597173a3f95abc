/** Rectangular radius elbow with splitters that run all the way round the bend. */
import type { Radians } from "../quantity.ts";
import { bendAngleFactor } from "./elbow.ts";

export const SPLITTER_ELBOW_SOURCE =
  "Idelchik's bend term, diagram 6-1, on passages of one curve ratio; computed, checked against single printed rows";

/**
 * Throat radius over heel radius of every passage, the same for all: the splitters stand in a geometric row.
 *
 *     CR = (throat / heel)^(1 / (n + 1)),   throat / heel = (r/W − 1/2) / (r/W + 1/2)
 *
 * @example splitterCurveRatio({ radiusRatio: 0.75, splitterCount: 1 }) // 0.447
 */
export const splitterCurveRatio = (elbow: { radiusRatio: number; splitterCount: number }): number =>
  ((elbow.radiusRatio - 0.5) / (elbow.radiusRatio + 0.5)) ** (1 / (elbow.splitterCount + 1));

/**
 * Radius elbow with splitters.
 *
 *     C = A(α) · 0.21 / ρ^2.5,   ρ = (1 + CR) / (2 (1 − CR))
 *
 * ρ is the center-line radius over the width of each passage: all passages bend alike, lose alike, and so share the air by
 * their area. Unlike an open bend a passage keeps the power 2.5 above ρ = 1, where the printed rows fall on it.
 *
 * Range    0.55 ≤ r/W, one to three splitters; below it the row of 0.55 and a finding. Side ratios from 0.5 to 2: beyond, the
 *          printed rows of tight bends lie higher, up to 2.5 times at H/W 8
 * Source   Idelchik, diagram 6-1, for the term; the rule of one curve ratio is common practice
 */
export function splitterElbowCoefficient(elbow: {
  angle: Radians;
  radiusRatio: number;
  splitterCount: number;
}): number {
  const curveRatio = splitterCurveRatio({
    radiusRatio: Math.max(elbow.radiusRatio, LEAST_SPLITTER_RADIUS_RATIO),
    splitterCount: elbow.splitterCount,
  });
  const passageRatio = (1 + curveRatio) / (2 * (1 - curveRatio));
  return (bendAngleFactor(elbow.angle) * 0.21) / passageRatio ** 2.5;
}

/** A throat of 5 % of the width; a bend with none would have nothing to split by. */
export const LEAST_SPLITTER_RADIUS_RATIO = 0.55;
