/** Surface of elbows: girth times the length of the line through its center, exact for any section that stays the same. */
import type { Section } from "../../air-system.ts";
import { meters, squareMeters, type Meters, type Radians, type SquareMeters } from "../../quantity.ts";
import { goreTable, makingTable } from "../making.table.ts";
import { girth } from "./girth.ts";

/** Over this a bend is made of two, so that a turn back on itself stays finite. */
export const WIDEST_MITER_RAD = (2 * Math.PI) / 3;

const halfTangent = (angle: Radians): number => Math.tan(Math.min(angle, WIDEST_MITER_RAD) / 2);

/** From the corner of the center lines to the end of the elbow, for a bend of this center-line radius. */
export const radiusElbowTangent = (angle: Radians, centerRadius: Meters): Meters =>
  meters(centerRadius * halfTangent(angle));

/**
 * Radius elbow of a rectangular or any other constant section.
 *
 *     A = P θ Rc;   for a rectangle θ (2 Rt + W)(W + H): two cheeks, throat and heel
 *
 * Range    Rc ≥ half the side in the plane of the bend
 * Source   geometry (Pappus)
 */
export const radiusElbowSurface = (section: Section, angle: Radians, centerRadius: Meters): SquareMeters =>
  squareMeters(girth(section) * angle * centerRadius);

/** The parts of a rectangular radius elbow, as they are cut. `planeSide` lies in the plane of the bend. */
export function radiusElbowParts(elbow: {
  planeSide: Meters;
  acrossSide: Meters;
  angle: Radians;
  centerRadius: Meters;
}) {
  const { planeSide, acrossSide, angle, centerRadius } = elbow;
  const throatRadius = centerRadius - planeSide / 2;
  return {
    cheeks: squareMeters(angle * planeSide * (2 * throatRadius + planeSide)),
    throat: squareMeters(angle * throatRadius * acrossSide),
    heel: squareMeters(angle * (throatRadius + planeSide) * acrossSide),
  };
}

/**
 * Splitters of a radius elbow: arcs of the bend's own angle, as high as the duct, that divide it in passages of one curve
 * ratio. Radius of splitter i is throat · (heel / throat)^(i / (n + 1)).
 *
 * Source   geometry
 */
export const splitterSurface = (
  elbow: { planeSide: Meters; acrossSide: Meters; angle: Radians; centerRadius: Meters },
  splitterCount: number,
): SquareMeters => {
  const { planeSide, acrossSide, angle, centerRadius } = elbow;
  const radii = splitterRadii({ planeSide_m: planeSide, centerRadius_m: centerRadius }, splitterCount);
  return squareMeters(angle * acrossSide * radii.reduce((sum, radius) => sum + radius, 0));
};

/** None where the throat has no radius: passages of one curve ratio cannot start there. */
export function splitterRadii(
  { planeSide_m, centerRadius_m }: { readonly planeSide_m: Meters; readonly centerRadius_m: Meters },
  splitterCount: number,
): readonly number[] {
  const throat = centerRadius_m - planeSide_m / 2;
  const heel = throat + planeSide_m;
  if (throat <= 0) return [];
  return Array.from({ length: splitterCount }, (_, i) => throat * (heel / throat) ** ((i + 1) / (splitterCount + 1)));
}

/** Center-line length of a square-throat elbow: its legs to the corner and on. W/2 tan(θ/2) + leg on each side. */
export const squareElbowTangent = (angle: Radians, planeSide: Meters): Meters =>
  meters((planeSide / 2) * halfTangent(angle) + makingTable.squareThroatLeg);

/**
 * Square-throat (mitered) elbow without its vanes.
 *
 *     A = P · 2 (W/2 tan(θ/2) + e);   at 90° 2 (W + H)(W + 2 e)
 *
 * Source   geometry: a mitered duct has the surface of its center line
 */
export const squareElbowSurface = (section: Section, angle: Radians, planeSide: Meters): SquareMeters =>
  squareMeters(girth(section) * 2 * squareElbowTangent(angle, planeSide));

/** Number of single-thickness vanes across the plane of the bend: one less than the gaps. */
export const vaneCount = (planeSide: Meters): number =>
  Math.max(0, Math.ceil(planeSide / makingTable.vane.spacing - 1e-9) - 1);

/** Each vane an arc of the bend's own angle, as high as the duct. Rails are not counted. */
export const vaneSurface = (elbow: { planeSide: Meters; acrossSide: Meters; angle: Radians }): SquareMeters =>
  squareMeters(vaneCount(elbow.planeSide) * elbow.angle * makingTable.vane.radius * elbow.acrossSide);

/** Pieces of a gored elbow, both ends counted: by its radius and its angle. More than 90° gets more of them. */
export function gorePieces(angle: Radians, radiusRatio: number): number {
  let row: (typeof goreTable.rows)[number] = goreTable.rows[0];
  for (const next of goreTable.rows) if (radiusRatio >= next.radiusRatio - 1e-9) row = next;
  const degrees = (angle * 180) / Math.PI;
  if (degrees <= 45 + 1e-6) return row.at45;
  if (degrees <= 60 + 1e-6) return row.at60;
  return Math.max(row.at90, Math.ceil((row.at90 * degrees) / 90 - 1e-9));
}

/**
 * Gored round elbow of N pieces, each end piece half a gore: 2 (N − 1) half gores.
 *
 *     A = P · 2 (N − 1) Rc tan(θ / (2 (N − 1)))
 *
 * Source   geometry
 */
export function goredElbowSurface(
  section: Section,
  angle: Radians,
  centerRadius: Meters,
  pieces: number,
): SquareMeters {
  const halfGores = 2 * (pieces - 1);
  return squareMeters(girth(section) * halfGores * centerRadius * Math.tan(angle / halfGores));
}
