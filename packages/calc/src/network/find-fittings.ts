/** The fittings of every segment: chosen by the estimator, or inferred. Nearest the equipment first. */
import type { FittingType } from "../air-system.ts";
import { FLUSH_ENTRY_COEFFICIENT, OPEN_EXIT_COEFFICIENT } from "../fittings/ends.ts";
import { SMALLEST_TURN_COSINE, isElbow, isJunction, isTransition } from "../fittings/infer.ts";
import { leg } from "../fittings/joints.ts";
import { isSameSection } from "../geometry/section.ts";
import { from, openFitting } from "./fitting-columns.ts";
import type { FittingContext } from "./fitting-context.ts";
import { putElbow } from "./lose-elbow.ts";
import { putJunction, putPassage } from "./lose-junction.ts";
import { putTransition } from "./lose-transition.ts";
import { NONE } from "./tree-shape.ts";

export function findFittings(context: FittingContext): void {
  const { segments } = context.system;
  const { start } = context.fittings;
  const { before } = context.tree;
  for (let s = 0; s < segments.length; s++) {
    start[s + 1] = start[s]!;
    const chosen = segments[s]!.fitting;
    if (chosen !== null) putChosen(context, s, before[s]!, chosen);
    else if (before[s] !== NONE) putInferred(context, s, before[s]!);
  }
}

function putInferred(context: FittingContext, s: number, before: number): void {
  const kind = context.joints.leg[s];
  if (kind === leg.branch || kind === leg.split) return putJunction(context, s, before, null);
  if (kind === leg.run) putPassage(context, s, before);
  if (!isSizeKept(context, s, before)) putTransition(context, s, before, null);
  if (kind === leg.only && context.joints.turnCosine[s]! < SMALLEST_TURN_COSINE) putElbow(context, s, before, null);
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
  putElbow(context, s, before, chosen);
}

const isSizeKept = ({ sections }: FittingContext, s: number, before: number): boolean =>
  isSameSection(sections.section[before]!, sections.section[s]!);

/** Its numbers are all zero, as the columns are from the start. */
function putEndCap({ fittings }: FittingContext, s: number, before: number): void {
  openFitting(fittings, s, "end-cap", true, true, before, from.endCap);
}

/** A fitting chosen for a segment that starts at the equipment: an elbow, or an opening in the plenum. */
function putAtEquipment(context: FittingContext, s: number, chosen: FittingType): void {
  if (isElbow(chosen)) return putElbow(context, s, NONE, chosen);
  if (chosen === "end-cap") return putEndCap(context, s, NONE);
  const coefficient = context.diverges ? FLUSH_ENTRY_COEFFICIENT : OPEN_EXIT_COEFFICIENT;
  const pressure = context.friction.velocityPressure[s]!;
  const at = openFitting(context.fittings, s, chosen, true, true, NONE, from.ends);
  context.fittings.lossCoefficient[at] = coefficient;
  context.fittings.velocityPressure[at] = pressure;
}
