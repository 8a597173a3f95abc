/** Elbows: radius, square-throat with or without vanes, smooth and gored. */
import type { SolvedFitting } from "../network/solution.ts";
import { meters, radians, squareMeters, type Meters } from "../quantity.ts";
import { GEOMETRY, sidesInBend, type FittingPlan, type FittingPlans } from "./fitting-plan.ts";
import { segmentBefore, type Frame } from "./frame.ts";
import { makingTable } from "./making.table.ts";
import {
  WIDEST_MITER_RAD,
  gorePieces,
  goredElbowSurface,
  radiusElbowSurface,
  radiusElbowTangent,
  splitterSurface,
  squareElbowSurface,
  squareElbowTangent,
  vaneCount,
  vaneSurface,
} from "./surface/elbow.ts";
import { girth } from "./surface/girth.ts";

export function planElbow(
  frame: Frame,
  plans: FittingPlans,
  s: number,
  { type, angle_rad }: SolvedFitting,
): FittingPlan {
  const section = frame.metal[s]!;
  const angle = radians(angle_rad);
  const { planeSide, acrossSide } = sidesInBend(frame, s, section);
  const { radiusRatio } = frame.system.spec.elbow;
  const centerRadius = meters(radiusRatio * planeSide);
  const around = { label: "girth", value: girth(section), unit: "m" };
  const base = {
    segment: s,
    type,
    kind: "elbow",
    section,
    otherSection: null,
    angle,
    gaugeSection: section,
  } as const;

  const bend = {
    section,
    planeSide_m: planeSide,
    acrossSide_m: acrossSide,
    angle_rad: angle,
    centerRadius_m: centerRadius,
  };

  const takeOut = (tangent: Meters) => {
    plans.near[s]! += tangent;
    const before = segmentBefore(frame, s);
    if (before !== null) plans.far[before]! += tangent;
  };

  if (type === "elbow-square-throat" || type === "elbow-square-throat-vanes" || type === "elbow-mitered") {
    const tangent = squareElbowTangent(angle, planeSide);
    takeOut(tangent);
    const walls = squareElbowSurface(section, angle, planeSide);
    const terms = [around, { label: "center line through the corner", value: 2 * tangent, unit: "m" }];
    const mitered = {
      kind: "mitered-elbow",
      bend: { ...bend, angle_rad: radians(Math.min(angle, WIDEST_MITER_RAD)) },
      leg_m: makingTable.squareThroatLeg,
      vaneCount: type === "elbow-square-throat-vanes" ? vaneCount(planeSide) : 0,
    } as const;
    if (type !== "elbow-square-throat-vanes") {
      const length = meters(2 * tangent);
      return { ...base, body: mitered, length, netArea: walls, netTerms: terms, netBasis: GEOMETRY };
    }
    const vanes = vaneSurface({ planeSide, acrossSide, angle });
    return {
      ...base,
      body: { ...mitered, bend: { ...mitered.bend, angle_rad: angle } },
      length: meters(2 * tangent),
      netArea: squareMeters(walls + vanes),
      netTerms: [...terms, { label: `${vaneCount(planeSide)} turning vanes`, value: vanes, unit: "m²" }],
      netBasis: `${GEOMETRY}; vanes of 2 in. radius, 1 1/2 in. apart, rails not counted`,
    };
  }

  takeOut(radiusElbowTangent(angle, centerRadius));
  if (type === "elbow-radius-splitters") {
    const { splitterCount = 1 } = frame.system.spec.elbow;
    const walls = radiusElbowSurface(section, angle, centerRadius);
    const splitters = splitterSurface({ planeSide, acrossSide, angle, centerRadius }, splitterCount);
    return {
      ...base,
      body: { kind: "radius-elbow", bend, splitterCount },
      length: meters(angle * centerRadius),
      netArea: squareMeters(walls + splitters),
      netTerms: [
        { label: "two cheeks, throat and heel", value: walls, unit: "m²" },
        { label: splitterCount === 1 ? "1 splitter" : `${splitterCount} splitters`, value: splitters, unit: "m²" },
      ],
      netBasis: `${GEOMETRY}; splitters in a geometric row from throat to heel`,
    };
  }
  if (type === "elbow-gored") {
    const pieces = gorePieces(angle, radiusRatio);
    const netArea = goredElbowSurface(section, angle, centerRadius, pieces);
    return {
      ...base,
      body: { kind: "gored-elbow", bend, pieceCount: pieces },
      length: meters(netArea / girth(section)),
      netArea,
      netTerms: [
        around,
        { label: `center line of ${pieces} gored pieces`, value: netArea / girth(section), unit: "m" },
      ],
      netBasis: GEOMETRY,
    };
  }
  return {
    ...base,
    body: { kind: "radius-elbow", bend, splitterCount: 0 },
    length: meters(angle * centerRadius),
    netArea: radiusElbowSurface(section, angle, centerRadius),
    netTerms: [
      around,
      { label: "angle", value: angle, unit: "rad" },
      { label: "center-line radius", value: centerRadius, unit: "m" },
    ],
    netBasis: GEOMETRY,
  };
}

/** Two radius elbows end to end, one turning away and one back. */
export function planOffset(
  frame: Frame,
  plans: FittingPlans,
  s: number,
  { type, angle_rad }: SolvedFitting,
): FittingPlan {
  const section = frame.metal[s]!;
  const angle = radians(angle_rad);
  const { planeSide, acrossSide } = sidesInBend(frame, s, section);
  const centerRadius = meters(frame.system.spec.elbow.radiusRatio * planeSide);
  const tangent = radiusElbowTangent(angle, centerRadius);
  plans.near[s]! += 3 * tangent;
  const before = segmentBefore(frame, s);
  if (before !== null) plans.far[before]! += tangent;
  const one = radiusElbowSurface(section, angle, centerRadius);
  return {
    segment: s,
    type,
    kind: "elbow",
    section,
    otherSection: null,
    angle,
    gaugeSection: section,
    body: {
      kind: "offset",
      bend: {
        section,
        planeSide_m: planeSide,
        acrossSide_m: acrossSide,
        angle_rad: angle,
        centerRadius_m: centerRadius,
      },
    },
    length: meters(2 * angle * centerRadius),
    netArea: squareMeters(2 * one),
    netTerms: [
      { label: "girth", value: girth(section), unit: "m" },
      { label: "angle of both turns", value: 2 * angle, unit: "rad" },
      { label: "center-line radius", value: centerRadius, unit: "m" },
    ],
    netBasis: `${GEOMETRY}; two radius elbows`,
  };
}
