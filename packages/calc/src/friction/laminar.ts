/** Laminar friction constants C = f·Re, Darcy f, both on the hydraulic diameter. Exact by shape: 64 is for circles only. */
import type { Section } from "../air-system.ts";
import { readLinear } from "../linear-table.ts";
import { flatOvalLaminarTable } from "./laminar-flat-oval.table.ts";

const ROUND = 64;
const PARALLEL_PLATES = 96;

/**
 * Laminar constant of a rectangle, 56.9 for a square to 96 for parallel plates.
 *
 *     C = 96 / [ (1 + a)² (1 − 192/π⁵ · a · Σ tanh((2k+1)π/2a) / (2k+1)⁵) ]     a = shorter/longer side
 *
 * Source   Shah, R. K., London, A. L. (1978), Laminar Flow Forced Convection in Ducts, ch. VII, the exact series
 */
export function laminarConstantOfRectangle(shorterOverLonger: number): number {
  const a = shorterOverLonger;
  let sum = 0;
  // Terms fall with the fifth power: the fortieth is under 1e-9 of the first.
  for (let n = 1; n < 80; n += 2) sum += Math.tanh((n * Math.PI) / (2 * a)) / n ** 5;
  return PARALLEL_PLATES / ((1 + a) ** 2 * (1 - (192 / Math.PI ** 5) * a * sum));
}

/**
 * Laminar constant of a concentric annulus. Taking 64 instead understates friction by a third.
 *
 *     C = 64 (1 − k)² / [ 1 + k² + (1 − k²)/ln k ]     k = inner/outer diameter
 *
 * Source   closed form of the axial momentum equation; Shah and London (1978), ch. XII
 */
export function laminarConstantOfAnnulus(innerOverOuter: number): number {
  const k = innerOverOuter;
  // Near k = 1 numerator and denominator both vanish; the series there is 96 (1 − (1 − k)²/60 …).
  if (k > 0.999) return PARALLEL_PLATES * (1 - (1 - k) ** 2 / 60);
  return (ROUND * (1 - k) ** 2) / (1 + k * k + (1 - k * k) / Math.log(k));
}

/**
 * Laminar constant of a flat oval: no closed form exists, so it is read from computed points, linear in height over width,
 * on to 96 where the oval becomes two parallel plates.
 *
 * Source   laminar-flat-oval.table.ts
 */
export const laminarConstantOfFlatOval = (heightOverWidth: number): number =>
  readLinear(flatOvalLaminarTable.heightOverWidth, heightOverWidth);

/** Laminar constant f·Re of any section. */
export function laminarConstant(section: Section): number {
  switch (section.shape) {
    case "round":
      return ROUND;
    case "rectangular":
      return laminarConstantOfRectangle(
        Math.min(section.width_m, section.height_m) / Math.max(section.width_m, section.height_m),
      );
    case "flat-oval":
      return laminarConstantOfFlatOval(section.height_m / section.width_m);
    case "annular":
      return laminarConstantOfAnnulus(section.innerDiameter_m / section.outerDiameter_m);
  }
}
