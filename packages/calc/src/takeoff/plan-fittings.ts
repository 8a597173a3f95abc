/**
 * What each made fitting is, and what it takes out of the straight duct.
 *
 * Our habit, always the same: segments are measured along the center line from corner to corner, and a fitting comes out
 * of the straight where its length along that line is known: an elbow its tangent on both sides, a transition its length,
 * a tap half of its main and its collar, a junction body half of itself along the main.
 */
import { isElbow, isMouth, isTransition } from "../fittings/infer.ts";
import type { SolvedFitting } from "../network/solution.ts";
import { radians } from "../quantity.ts";
import { GEOMETRY, larger, type FittingPlan, type FittingPlans } from "./fitting-plan.ts";
import { segmentBefore, type Frame } from "./frame.ts";
import { makingTable } from "./making.table.ts";
import { planElbow, planOffset } from "./plan-elbow.ts";
import { planJunction } from "./plan-junction.ts";
import { capSurface } from "./surface/body.ts";
import { girth } from "./surface/girth.ts";
import { transitionLength, transitionSurface } from "./surface/transition.ts";

export function planFittings(frame: Frame): FittingPlans {
  const count = frame.system.segments.length;
  const of: FittingPlan[][] = Array.from({ length: count }, () => []);
  const plans = { of, near: new Float64Array(count), far: new Float64Array(count) };
  for (let s = 0; s < count; s++) {
    const { fittings } = frame.solution.segments[s]!;
    for (const fitting of fittings) {
      // Bellmouths and plenums are bought with the equipment or added by hand.
      if (fitting.madeHere && fitting.type !== "none" && !isMouth(fitting.type)) {
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
  if (fitting.type === "end-cap") return planCap(frame, s, fitting);
  return planJunction(frame, plans, s, fitting);
}

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
