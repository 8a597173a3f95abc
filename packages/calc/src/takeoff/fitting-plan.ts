/** What each made fitting is, and what it takes out of the straight duct. */
import type { FittingType, Section } from "../air-system.ts";
import type { Meters, Radians, SquareMeters } from "../quantity.ts";
import type { Body } from "./body.ts";
import { isSteep, segmentBefore, type Frame } from "./frame.ts";
import { longestSide } from "./gauge.ts";
import { outerWall } from "./surface/girth.ts";
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
  readonly body: Body;
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

export const GEOMETRY = "true surface, by geometry";

/** Sides in the plane of the bend and across it. */
export function sidesInBend(frame: Frame, s: number, section: Section): { planeSide: Meters; acrossSide: Meters } {
  const wall = outerWall(section);
  if (wall.shape === "round") return { planeSide: wall.diameter_m, acrossSide: wall.diameter_m };
  const before = segmentBefore(frame, s);
  const isVertical = isSteep(frame, s) || (before !== null && isSteep(frame, before));
  return isVertical
    ? { planeSide: wall.height_m, acrossSide: wall.width_m }
    : { planeSide: wall.width_m, acrossSide: wall.height_m };
}

/** Of a piece that changes size, the end that sets its gauge. */
export const larger = (a: Section, b: Section): Section => (longestSide(a) >= longestSide(b) ? a : b);
