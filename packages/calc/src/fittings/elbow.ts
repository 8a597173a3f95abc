/** Loss coefficients of elbows, on the velocity pressure of the duct. Friction along the bend counts as duct length. */
import type { Radians } from "../quantity.ts";
import { rectangularElbowTable } from "./elbow.table.ts";
import { readLinear } from "../linear-table.ts";

const DEGREES = 180 / Math.PI;

export const SMOOTH_ELBOW_SOURCE = "Rennels and Hudson (2012), Pipe Flow, ch. 15, less friction along the bend";
export const RADIUS_ELBOW_SOURCE = "Idelchik, diagram 6-1, closed form";
export const SQUARE_THROAT_SOURCE = "Weisbach's miter formula with Idelchik's factors, diagram 6-5";

/**
 * Smooth round elbow.
 *
 *     K = (0.10 + 2.4 f) sin(α/2) + 6.6 f (√sin(α/2) + sin(α/2)) / (r/D)^(4α/π)
 *
 * Range    r/D ≥ 0.5, r to the center line; 0 < α ≤ 180°; turbulent flow
 * Source   Rennels, D. C., Hudson, H. M. (2012), Pipe Flow, ch. 15. Its term f α r/D is left out, because the length of duct
 *          is measured to the corner.
 *
 * @example smoothElbowCoefficient({ angle: radians(Math.PI / 2), radiusRatio: 1.5, darcyFrictionFactor: 0.016 }) // 0.171
 */
export function smoothElbowCoefficient(elbow: {
  angle: Radians;
  radiusRatio: number;
  darcyFrictionFactor: number;
}): number {
  const { angle, radiusRatio, darcyFrictionFactor: f } = elbow;
  const sine = Math.sin(angle / 2);
  const curvature = radiusRatio ** ((4 * angle) / Math.PI);
  return (0.1 + 2.4 * f) * sine + (6.6 * f * (Math.sqrt(sine) + sine)) / curvature;
}

/** Share of a 90° bend's loss at another angle: 0.9 sin α to 70°, then straight to 1 at 90°, then 0.7 + 0.35 α/90. */
export function bendAngleFactor(angle: Radians): number {
  const degrees = angle * DEGREES;
  if (degrees <= 70) return 0.9 * Math.sin(angle);
  if (degrees <= 90) {
    const at70 = 0.9 * Math.sin(70 / DEGREES);
    return at70 + ((degrees - 70) / 20) * (1 - at70);
  }
  if (degrees <= 100) return 1 + ((degrees - 90) / 10) * (0.7 + (0.35 * 100) / 90 - 1);
  return 0.7 + (0.35 * degrees) / 90;
}

/**
 * Rectangular elbow with a radius, without splitters.
 *
 *     C = A(α) · B · C1(H/W),   B = 0.21 / (r/W)^2.5 for r/W ≤ 1, 0.21 / √(r/W) above
 *
 * W lies in the plane of the bend, H across it; r to the center line.
 *
 * Range    0.5 ≤ r/W; H/W from 0.25 to 8, outside the nearest row and a finding
 * Source   Idelchik, diagram 6-1
 */
export function radiusElbowCoefficient(elbow: { angle: Radians; radiusRatio: number; sideRatio: number }): number {
  const { radiusRatio } = elbow;
  const bend = radiusRatio <= 1 ? 0.21 / radiusRatio ** 2.5 : 0.21 / Math.sqrt(radiusRatio);
  return bendAngleFactor(elbow.angle) * bend * readLinear(rectangularElbowTable.radiusSideRatio, elbow.sideRatio);
}

/**
 * Square-throat (mitered) elbow without vanes.
 *
 *     C = A(α) · C1(H/W) · (0.95 sin²(α/2) + 2.05 sin⁴(α/2))
 *
 * Range    20° to 180°; H/W from 0.25 to 8, outside the nearest row and a finding
 * Source   Weisbach (1855), with factors A and C1 of Idelchik, diagram 6-5
 */
export function squareThroatElbowCoefficient(elbow: { angle: Radians; sideRatio: number }): number {
  const square = Math.sin(elbow.angle / 2) ** 2;
  return (
    readLinear(rectangularElbowTable.squareThroatAngle, elbow.angle * DEGREES) *
    readLinear(rectangularElbowTable.squareThroatSideRatio, elbow.sideRatio) *
    (0.95 * square + 2.05 * square * square)
  );
}

/** Outside the side ratios of the tables the nearest row is taken; this says so. */
export const isSideRatioInTable = (sideRatio: number): boolean =>
  sideRatio >= rectangularElbowTable.range.sideRatio.from && sideRatio <= rectangularElbowTable.range.sideRatio.to;
