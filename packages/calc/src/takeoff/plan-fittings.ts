/**
 * What each made fitting is, and what it takes out of the straight duct.
 *
 * Our habit, always the same: segments are measured along the center line from corner to corner, and a fitting comes out
 * of the straight where its length along that line is known: an elbow its tangent on both sides, a transition its length,
 * a tap half of its main and its collar, a junction body half of itself along the main.
 */
import { isElbow, isMouth, isTransition } from "../fittings/infer.ts";
import type { Section, TransitionAlignment } from "../air-system.ts";
import type { SolvedFitting } from "../network/solution.ts";
import { meters, radians } from "../quantity.ts";
import { GEOMETRY, larger, type FittingPlan, type FittingPlans } from "./fitting-plan.ts";
import { segmentBefore, type Frame } from "./frame.ts";
import { makingTable } from "./making.table.ts";
import { planElbow, planOffset } from "./plan-elbow.ts";
import { planJunction } from "./plan-junction.ts";
import { capSurface, plenumSurface } from "./surface/body.ts";
import { girth } from "./surface/girth.ts";
import { CONCENTRIC, type Shift } from "./shift.ts";
import { extent, transitionLength, transitionSurface } from "./surface/transition.ts";

export function planFittings(frame: Frame): FittingPlans {
  const count = frame.system.segments.length;
  const of: FittingPlan[][] = Array.from({ length: count }, () => []);
  const plans = { of, near: new Float64Array(count), far: new Float64Array(count) };
  for (let s = 0; s < count; s++) {
    const { fittings } = frame.solution.segments[s]!;
    for (const fitting of fittings) {
      // Other mouths are how the duct's end was cut, or bought with the equipment.
      if (fitting.madeHere && fitting.type !== "none" && (!isMouth(fitting.type) || fitting.type === "plenum")) {
        of[s]!.push(planFitting(frame, plans, s, fitting));
      }
    }
  }
  return plans;
}

function planFitting(frame: Frame, plans: FittingPlans, s: number, fitting: SolvedFitting): FittingPlan {
  if (fitting.type === "offset") return planOffset(frame, plans, s, fitting);
  if (isElbow(fitting.type)) return planElbow(frame, plans, s, fitting);
  if (isTransition(fitting.type)) return planTransition(frame, plans, s, fitting);
  if (fitting.type === "plenum") return planPlenum(frame, plans, s, fitting);
  if (fitting.type === "end-cap") return planCap(frame, s, fitting);
  return planJunction(frame, plans, s, fitting);
}

function planTransition(frame: Frame, plans: FittingPlans, s: number, { type }: SolvedFitting): FittingPlan {
  const before = segmentBefore(frame, s);
  const section = frame.metal[s]!;
  const from = before === null ? section : frame.metal[before]!;
  const { spec } = frame.system;
  const shift = shiftOf(from, section, spec.transitionAlignment ?? "centered");
  const length = transitionLength(from, section, radians(spec.transitionAngle_rad), shift);
  plans.near[s]! += length;
  const netArea = transitionSurface(from, section, length, shift);
  return {
    segment: s,
    type,
    kind: "transition",
    section: from,
    otherSection: section,
    angle: radians(0),
    length,
    gaugeSection: larger(from, section),
    body: { kind: "transition", from, to: section, length_m: length, shift },
    netArea,
    netTerms: [
      { label: "mean girth", value: (girth(from) + girth(section)) / 2, unit: "m" },
      { label: "mean slant of its walls", value: netArea / ((girth(from) + girth(section)) / 2), unit: "m" },
    ],
    netBasis: `${GEOMETRY}; ${shift === CONCENTRIC ? "concentric" : (spec.transitionAlignment ?? "")}`,
  };
}

/** Flat on top or below: the center moves by half of what the height changes. */
function shiftOf(from: Section, to: Section, alignment: TransitionAlignment): Shift {
  const change = extent(to).height - extent(from).height;
  if (alignment === "centered" || change === 0) return CONCENTRIC;
  return { x_m: 0, y_m: (alignment === "flat-bottom" ? change : -1 * change) / 2 };
}

/** A box as wide and high as its duct with a margin all round. */
function planPlenum(frame: Frame, plans: FittingPlans, s: number, { type }: SolvedFitting): FittingPlan {
  const section = frame.metal[s]!;
  const { margin, length } = makingTable.plenum;
  const { width, height } = extent(section);
  const box = { width_m: meters(width + 2 * margin), height_m: meters(height + 2 * margin), length_m: length };
  const openings = [section, section];
  const netArea = plenumSurface(box, openings);
  const closed = plenumSurface(box, []);
  plans.near[s]! += length;
  return {
    segment: s,
    type,
    kind: "branch",
    section,
    otherSection: null,
    angle: radians(0),
    length,
    gaugeSection: { shape: "rectangular", width_m: box.width_m, height_m: box.height_m },
    body: { kind: "plenum", ...box, openings },
    netArea,
    netTerms: [
      { label: "six sides", value: closed, unit: "m²" },
      { label: "less its two openings", value: netArea - closed, unit: "m²" },
    ],
    netBasis: `${GEOMETRY}; 6 in. around the duct, 24 in. long: ${makingTable.source}`,
  };
}

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
    body: { kind: "cap", section },
    netArea: capSurface(section),
    netTerms: [{ label: "end and its turned edge", value: capSurface(section), unit: "m²" }],
    netBasis: GEOMETRY,
  };
}
