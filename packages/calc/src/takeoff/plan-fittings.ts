/**
 * What each made fitting is, and what it takes out of the straight duct.
 *
 * Our habit, always the same: segments are measured along the center line from corner to corner, and a fitting comes out
 * of the straight where its length along that line is known: an elbow its tangent on both sides, a transition its length,
 * a tap half of its main and its collar, a junction body half of itself along the main.
 */
import type { FittingType, Section } from "../air-system.ts";
import { isElbow, isTransition } from "../fittings/infer.ts";
import { leg } from "../fittings/joints.ts";
import type { SolvedFitting } from "../network/solution.ts";
import { meters, radians, squareMeters, type Meters, type Radians, type SquareMeters } from "../quantity.ts";
import { isSteep, segmentBefore, type Frame } from "./frame.ts";
import { longestSide } from "./gauge.ts";
import { makingTable } from "./making.table.ts";
import { bodyLength, bodySurface, capSurface } from "./surface/body.ts";
import {
  gorePieces,
  goredElbowSurface,
  radiusElbowSurface,
  radiusElbowTangent,
  squareElbowSurface,
  squareElbowTangent,
  vaneCount,
  vaneSurface,
} from "./surface/elbow.ts";
import { girth, outerWall } from "./surface/girth.ts";
import { collarSurface, coneSurface, shoeEntry, shoeSurface, wallOfMain, type MainWall } from "./surface/tap.ts";
import { extent, transitionLength, transitionSurface } from "./surface/transition.ts";
import type { Arithmetic, PieceKind } from "./takeoff.ts";

type Terms = Arithmetic["terms"];

export interface FittingPlan {
  readonly segment: number;
  readonly type: FittingType;
  readonly kind: Exclude<PieceKind, "straight" | "flexible">;
  readonly section: Section;
  readonly otherSection: Section | null;
  readonly angle: Radians;
  /** Along its center line. */
  readonly length: Meters;
  /** The larger end sets the gauge of all of it. */
  readonly gaugeSection: Section;
  readonly netArea: SquareMeters;
  readonly netTerms: Terms;
  readonly netBasis: string;
}

export interface FittingPlans {
  /** By segment, nearest the equipment first. */
  readonly of: readonly (readonly FittingPlan[])[];
  /** Center-line length that fittings take from each segment, at the end nearer the equipment and at the far end. */
  readonly near: Float64Array;
  readonly far: Float64Array;
}

export function planFittings(frame: Frame): FittingPlans {
  const count = frame.system.segments.length;
  const of: FittingPlan[][] = Array.from({ length: count }, () => []);
  const plans = { of, near: new Float64Array(count), far: new Float64Array(count) };
  for (let s = 0; s < count; s++) {
    const { fittings } = frame.solution.segments[s]!;
    for (const fitting of fittings) {
      if (fitting.madeHere && fitting.type !== "none") {
        of[s]!.push(planFitting(frame, plans, s, fitting));
      }
    }
  }
  return plans;
}

function planFitting(frame: Frame, plans: FittingPlans, s: number, fitting: SolvedFitting): FittingPlan {
  if (isElbow(fitting.type)) return planElbow(frame, plans, s, fitting);
  if (isTransition(fitting.type)) return planTransition(frame, plans, s, fitting);
  if (fitting.type === "end-cap") return planCap(frame, s, fitting);
  return planJunction(frame, plans, s, fitting);
}

/** Sides in the plane of the bend and across it. */
function sidesInBend(frame: Frame, s: number, section: Section): { planeSide: Meters; acrossSide: Meters } {
  const wall = outerWall(section);
  if (wall.shape === "round") return { planeSide: wall.diameter_m, acrossSide: wall.diameter_m };
  const before = segmentBefore(frame, s);
  const isVertical = isSteep(frame, s) || (before !== null && isSteep(frame, before));
  return isVertical
    ? { planeSide: wall.height_m, acrossSide: wall.width_m }
    : { planeSide: wall.width_m, acrossSide: wall.height_m };
}

function planElbow(frame: Frame, plans: FittingPlans, s: number, { type, angle_rad }: SolvedFitting): FittingPlan {
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

  const takeOut = (tangent: Meters) => {
    plans.near[s]! += tangent;
    const before = segmentBefore(frame, s);
    if (before !== null) plans.far[before]! += tangent;
  };

  if (type === "elbow-square-throat" || type === "elbow-square-throat-vanes") {
    const tangent = squareElbowTangent(angle, planeSide);
    takeOut(tangent);
    const walls = squareElbowSurface(section, angle, planeSide);
    const terms = [around, { label: "center line through the corner", value: 2 * tangent, unit: "m" }];
    if (type === "elbow-square-throat") {
      return { ...base, length: meters(2 * tangent), netArea: walls, netTerms: terms, netBasis: GEOMETRY };
    }
    const vanes = vaneSurface({ planeSide, acrossSide, angle });
    return {
      ...base,
      length: meters(2 * tangent),
      netArea: squareMeters(walls + vanes),
      netTerms: [...terms, { label: `${vaneCount(planeSide)} turning vanes`, value: vanes, unit: "m²" }],
      netBasis: `${GEOMETRY}; vanes of 2 in. radius, 1 1/2 in. apart, rails not counted`,
    };
  }

  takeOut(radiusElbowTangent(angle, centerRadius));
  if (type === "elbow-gored") {
    const pieces = gorePieces(angle, radiusRatio);
    const netArea = goredElbowSurface(section, angle, centerRadius, pieces);
    return {
      ...base,
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

const GEOMETRY = "true surface, by geometry";

function planTransition(frame: Frame, plans: FittingPlans, s: number, { type }: SolvedFitting): FittingPlan {
  const before = segmentBefore(frame, s);
  const section = frame.metal[s]!;
  const from = before === null ? section : frame.metal[before]!;
  const length = transitionLength(from, section, radians(frame.system.spec.transitionAngle_rad));
  plans.near[s]! += length;
  const netArea = transitionSurface(from, section, length);
  return {
    segment: s,
    type,
    kind: "transition",
    section: from,
    otherSection: section,
    angle: radians(0),
    length,
    gaugeSection: larger(from, section),
    netArea,
    netTerms: [
      { label: "mean girth", value: (girth(from) + girth(section)) / 2, unit: "m" },
      { label: "mean slant of its walls", value: netArea / ((girth(from) + girth(section)) / 2), unit: "m" },
    ],
    netBasis: `${GEOMETRY}; concentric`,
  };
}

const larger = (a: Section, b: Section): Section => (longestSide(a) >= longestSide(b) ? a : b);

function planCap(frame: Frame, s: number, { type }: SolvedFitting): FittingPlan {
  const section = frame.metal[s]!;
  return {
    segment: s,
    type,
    kind: "end-cap",
    section,
    otherSection: null,
    angle: radians(0),
    length: makingTable.capTurn,
    gaugeSection: section,
    netArea: capSurface(section),
    netTerms: [{ label: "end and its turned edge", value: capSurface(section), unit: "m²" }],
    netBasis: GEOMETRY,
  };
}

function planJunction(frame: Frame, plans: FittingPlans, s: number, fitting: SolvedFitting): FittingPlan {
  const before = segmentBefore(frame, s);
  // At the equipment a branch is a collar on a flat casing; its length is measured from there.
  if (before === null) return planTap(frame, plans, s, fitting, { distance: meters(0), radius: null }, null);
  const isSplit = frame.joints.leg[s] === leg.split;
  if (fitting.type === "wye" && isSplit) return planWye(frame, plans, s, before, fitting);
  if (fitting.type === "tee" || fitting.type === "cross") return planBody(frame, plans, s, before, fitting);
  const vertical = isSteep(frame, s) && !isSteep(frame, before);
  const main = frame.metal[before]!;
  return planTap(frame, plans, s, fitting, wallOfMain(main, vertical), main);
}

/** Straight, shoe and conical taps, and the lateral that leaves a main at a slant. */
function planTap(
  frame: Frame,
  plans: FittingPlans,
  s: number,
  { type, angle_rad }: SolvedFitting,
  wall: MainWall,
  main: Section | null,
): FittingPlan {
  const section = frame.metal[s]!;
  // A branch drawn along its main still leaves it; under 15° it could not be made.
  const angle = radians(type === "wye" ? Math.max(angle_rad, MOST_SLANTED) : Math.PI / 2);
  const entry = type === "tap-shoe" && section.shape === "rectangular" ? shoeEntry(section.width_m) : meters(0);
  // A slanted collar is long enough for its short side to clear the main.
  const lean = extent(section).width / 2 / Math.tan(angle);
  const length = meters(Math.max(makingTable.tapCollar + lean, entry));
  plans.near[s]! += wall.distance / Math.sin(angle) + length;

  let netArea = collarSurface(section, wall, angle, length);
  if (type === "tap-shoe" && section.shape === "rectangular") netArea = shoeSurface(section, wall, length, entry);
  if (type === "tap-conical" && section.shape !== "annular") {
    netArea = coneSurface(section, wall, length, makingTable.coneSpread);
  }
  return {
    segment: s,
    type,
    kind: "branch",
    section,
    otherSection: main,
    angle: radians(angle_rad),
    length,
    gaugeSection: section,
    netArea,
    netTerms: [
      { label: "girth", value: girth(section), unit: "m" },
      { label: "mean length to the main's wall", value: netArea / girth(section), unit: "m" },
    ],
    netBasis: `${GEOMETRY}; the hole in the main is not taken off`,
  };
}

const MOST_SLANTED = Math.PI / 12;

const childrenAt = ({ tree }: Frame, s: number): number[] => {
  const node = tree.from[s]!;
  return Array.from(tree.childList.subarray(tree.childStart[node], tree.childStart[node + 1]));
};

/** A wye that ends its main: two or more radius elbows back to back. */
function planWye(frame: Frame, plans: FittingPlans, s: number, before: number, { type }: SolvedFitting): FittingPlan {
  const { joints, metal, system } = frame;
  const legs = childrenAt(frame, s);
  let netArea = 0;
  let farthest = 0;
  const terms: { label: string; value: number; unit: string }[] = [];
  for (const child of legs) {
    const section = metal[child]!;
    const cosine = joints.turnCosine[child]!;
    const angle = radians(Number.isNaN(cosine) ? Math.PI / 4 : Math.acos(cosine));
    const centerRadius = meters(system.spec.elbow.radiusRatio * sidesInBend(frame, child, section).planeSide);
    const area = radiusElbowSurface(section, angle, centerRadius);
    const tangent = radiusElbowTangent(angle, centerRadius);
    netArea += area;
    farthest = Math.max(farthest, tangent);
    plans.near[child]! += tangent;
    terms.push({ label: "leg, girth × angle × radius", value: area, unit: "m²" });
  }
  plans.far[before]! += farthest;
  return {
    segment: s,
    type,
    kind: "branch",
    section: metal[before]!,
    otherSection: metal[s]!,
    angle: radians(frame.solution.segments[s]!.fittings.find((fitting) => fitting.type === type)?.angle_rad ?? 0),
    length: meters(2 * farthest),
    gaugeSection: larger(metal[before]!, metal[s]!),
    netArea: squareMeters(netArea),
    netTerms: terms,
    netBasis: `${GEOMETRY}; radius legs back to back`,
  };
}

/** A tee or cross takes the place of a piece of the main; it is closed at its end where no duct runs on. */
function planBody(
  frame: Frame,
  plans: FittingPlans,
  s: number,
  before: number,
  { type, angle_rad }: SolvedFitting,
): FittingPlan {
  const { joints, metal } = frame;
  const legs = childrenAt(frame, s);
  const isShared = type === "cross" || joints.leg[s] === leg.split;
  const branches = isShared ? legs.filter((child) => joints.leg[child] !== leg.run) : [s];
  const run = legs.find((child) => joints.leg[child] === leg.run) ?? null;
  const main = metal[before]!;
  const sections = branches.map((child) => metal[child]!);
  const length = bodyLength(sections);

  plans.far[before]! += length / 2;
  if (run !== null) plans.near[run]! += length / 2;
  const vertical = isSteep(frame, s) && !isSteep(frame, before);
  for (const child of branches) plans.near[child]! += wallOfMain(main, vertical).distance + makingTable.bodyCollar;

  const netArea = bodySurface(main, sections, { length, runsOn: run !== null });
  const walls = girth(main) * length;
  return {
    segment: s,
    type,
    kind: "branch",
    section: main,
    otherSection: metal[s]!,
    angle: radians(angle_rad),
    length,
    gaugeSection: larger(main, metal[s]!),
    netArea,
    netTerms: [
      { label: "walls along the main", value: walls, unit: "m²" },
      {
        label: run === null ? "closed end and collars, less holes" : "collars, less holes",
        value: netArea - walls,
        unit: "m²",
      },
    ],
    netBasis: `${GEOMETRY}; walls taken as flat`,
  };
}
