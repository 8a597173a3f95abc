/** The fittings of every segment: chosen by the estimator, or inferred. Nearest the equipment first. */
import type { FittingType } from "../air-system.ts";
import { SMALLEST_TURN_COSINE, isElbow, isJunction, isMouth, isTransition } from "../fittings/infer.ts";
import { leg } from "../fittings/joints.ts";
import { isSameSection } from "../geometry/section.ts";
import { openFitting, writeLaw } from "./fitting-columns.ts";
import type { FittingContext } from "./fitting-context.ts";
import { putElbow, putOffset } from "./lose-elbow.ts";
import { putJunction, putPassage } from "./lose-junction.ts";
import { putCollarAtEquipment, putMouthAtEquipment, putMouthAtOutlet } from "./lose-mouth.ts";
import { putTransition } from "./lose-transition.ts";
import { NONE } from "./tree-shape.ts";

export function findFittings(context: FittingContext): void {
  const { segments } = context.system;
  const { start } = context.fittings;
  const { before } = context.tree;
  for (let s = 0; s < segments.length; s++) {
    start[s + 1] = start[s]!;
    const { fitting, mouth } = segments[s]!;
    if (fitting !== null) putChosen(context, s, before[s]!, fitting);
    else if (before[s] !== NONE) putInferred(context, s, before[s]!);
    if (mouth !== undefined && mouth !== null && isLast(context, s)) putMouthAtOutlet(context, s, mouth);
  }
}

/** No duct goes on from its far end. */
function isLast({ tree }: FittingContext, s: number): boolean {
  const end = tree.to[s]!;
  return tree.childStart[end] === tree.childStart[end + 1];
}

function putInferred(context: FittingContext, s: number, before: number): void {
  const kind = context.joints.leg[s];
  if (kind === leg.branch || kind === leg.split) return putJunction(context, s, before, null);
  if (kind === leg.run) putPassage(context, s, before);
  if (!isSizeKept(context, s, before)) putTransition(context, s, before, null);
  if (kind !== leg.only || !(context.joints.turnCosine[s]! < SMALLEST_TURN_COSINE)) return;
  if (!endsOffset(context, s, before)) putElbow(context, s, before, null);
}

/** The estimator's choice in place of what was inferred; the loss of passing another's branch stays. */
function putChosen(context: FittingContext, s: number, before: number, chosen: FittingType): void {
  if (chosen === "none") return;
  if (before === NONE) return putAtEquipment(context, s, chosen);
  if (isJunction(chosen)) return putJunction(context, s, before, chosen);

  const kind = context.joints.leg[s];
  if (kind === leg.run) putPassage(context, s, before);
  if (isTransition(chosen)) return putTransition(context, s, before, chosen);
  if (chosen === "end-cap") return putEndCap(context, s, before);
  const joinsDirectly = kind === leg.only || kind === leg.run;
  if (joinsDirectly && !isSizeKept(context, s, before)) putTransition(context, s, before, null);
  if (isMouth(chosen)) return putMouthAtEquipment(context, s, chosen);
  if (chosen === "offset") return putOffset(context, s, before);
  putElbow(context, s, before, chosen);
}

const isSizeKept = ({ sections }: FittingContext, s: number, before: number): boolean =>
  isSameSection(sections.section[before]!, sections.section[s]!);

/** This turn is the second one of the offset that the segment before begins with: it has been counted there. */
function endsOffset({ system, tree, joints, course }: FittingContext, s: number, before: number): boolean {
  if (system.segments[before]!.fitting !== "offset") return false;
  const first = tree.before[before]!;
  if (first === NONE || !(joints.turnCosine[before]! < SMALLEST_TURN_COSINE)) return false;
  const { direction } = course;
  const along =
    direction[3 * s]! * direction[3 * first]! +
    direction[3 * s + 1]! * direction[3 * first + 1]! +
    direction[3 * s + 2]! * direction[3 * first + 2]!;
  return along >= SMALLEST_TURN_COSINE;
}

/** Its numbers are all zero, as the columns are from the start. */
function putEndCap({ fittings }: FittingContext, s: number, before: number): void {
  writeLaw(fittings, openFitting(fittings, s, "end-cap", true, true, before), "endCap");
}

/** A fitting chosen for a segment that starts at the equipment: an elbow, or an opening in the plenum. */
function putAtEquipment(context: FittingContext, s: number, chosen: FittingType): void {
  if (isElbow(chosen)) return putElbow(context, s, NONE, chosen);
  if (chosen === "offset") return putOffset(context, s, NONE);
  if (chosen === "end-cap") return putEndCap(context, s, NONE);
  if (isMouth(chosen)) return putMouthAtEquipment(context, s, chosen);
  putCollarAtEquipment(context, s, chosen);
}
