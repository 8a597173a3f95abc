/** Fittings where they stand: too fast for their kind, too close to one another or to the fan, without room. */
import { FITTING_TYPES, type FittingType, type Section } from "../air-system.ts";
import { isElbow, isJunction, isTransition } from "../fittings/infer.ts";
import type { FittingColumns } from "../network/fitting-columns.ts";
import { NONE } from "../network/tree-shape.ts";
import { TRANSITION_SOURCE, practiceLimits } from "./practice-limits.table.ts";
import { markSegment, type ReviewContext } from "./review-context.ts";

export function reviewFittings(context: ReviewContext): void {
  const { start } = context.columns.fittings;
  for (let s = 0; s < context.tree.segmentCount; s++) {
    reviewSpacing(context, s);
    if (start[s] === start[s + 1]) continue;
    reviewElbow(context, s);
    reviewTransition(context, s);
  }
}

function typesOf({ columns }: ReviewContext, s: number): readonly FittingType[] {
  const { start } = columns.fittings;
  const types: FittingType[] = [];
  for (let f = start[s]!; f < start[s + 1]!; f++) types.push(typeAt(columns.fittings, f));
  return types;
}

const typeAt = ({ type }: FittingColumns, f: number): FittingType => FITTING_TYPES[type[f]!]!;

function reviewElbow(context: ReviewContext, s: number): void {
  const velocity = context.columns.friction.velocity[s]!;
  const types = typesOf(context, s);
  const { squareThroatVelocity_m_s: bare, vanedElbowVelocity_m_s: vaned } = practiceLimits;
  if (types.some((type) => type === "elbow-square-throat" || type === "elbow-mitered") && velocity > bare.value) {
    markSegment(context, s, "elbow-too-sharp", {
      value: velocity,
      limit: bare.value,
      unit: "m/s",
      limitSource: bare.source,
    });
  } else if (types.includes("elbow-square-throat-vanes") && velocity > vaned.value) {
    markSegment(context, s, "elbow-too-sharp", {
      value: velocity,
      limit: vaned.value,
      unit: "m/s",
      limitSource: vaned.source,
    });
  }
}

/** A change of size at the spec's angle needs length, and the segment that begins with it must have it. */
function reviewTransition(context: ReviewContext, s: number): void {
  const { columns, tree } = context;
  const before = tree.before[s]!;
  if (before === NONE || !typesOf(context, s).some(isTransition)) return;
  const change = largestChange(columns.sections.section[before]!, columns.sections.section[s]!);
  const needed = change / 2 / Math.tan(columns.system.spec.transitionAngle_rad / 2);
  const length = columns.course.length[s]!;
  if (needed <= length) return;
  markSegment(context, s, "transition-abrupt", {
    value: needed,
    limit: length,
    unit: "m",
    limitSource: TRANSITION_SOURCE,
  });
}

function largestChange(from: Section, to: Section): number {
  const [a, b] = [sidesOf(from), sidesOf(to)];
  return Math.max(Math.abs(a.width - b.width), Math.abs(a.height - b.height));
}

function sidesOf(section: Section): { width: number; height: number } {
  switch (section.shape) {
    case "round":
      return { width: section.diameter_m, height: section.diameter_m };
    case "annular":
      return { width: section.outerDiameter_m, height: section.outerDiameter_m };
    case "rectangular":
    case "flat-oval":
      return { width: section.width_m, height: section.height_m };
  }
}

/** Straight duct between the fitting that begins a segment and a turn that ends it. */
function reviewSpacing(context: ReviewContext, s: number): void {
  const { columns, tree } = context;
  const { course, sections, traits } = columns;
  if (traits.isFlexible[s] === 1) return;
  const isFirst = tree.before[s] === NONE;
  if ((!isFirst && !hasOwnTurn(context, s)) || !endsInTurn(context, s)) return;
  const { value: limit, source: limitSource } = isFirst ? practiceLimits.fanConnection : practiceLimits.fittingSpacing;
  const value = course.length[s]! / sections.hydraulicDiameter[s]!;
  if (value >= limit) return;
  const code = isFirst ? "turn-near-equipment" : "fittings-too-close";
  markSegment(context, s, code, { value, limit, unit: "diameters", limitSource });
}

/** A turn or branch of its own at its beginning; not one that it only passes. */
function hasOwnTurn({ columns }: ReviewContext, s: number): boolean {
  const { start, madeHere, isFarEnd } = columns.fittings;
  for (let f = start[s]!; f < start[s + 1]!; f++) {
    const type = typeAt(columns.fittings, f);
    if (madeHere[f] === 1 && isFarEnd[f] === 0 && (isElbow(type) || isJunction(type))) return true;
  }
  return false;
}

/** Any segment that leaves the end of s begins with an elbow. */
function endsInTurn({ columns, tree }: ReviewContext, s: number): boolean {
  const node = tree.to[s]!;
  const { start } = columns.fittings;
  for (let c = tree.childStart[node]!; c < tree.childStart[node + 1]!; c++) {
    const child = tree.childList[c]!;
    for (let f = start[child]!; f < start[child + 1]!; f++) if (isElbow(typeAt(columns.fittings, f))) return true;
  }
  return false;
}
