import type { FittingType } from "../air-system.ts";
import { transitionType } from "../fittings/infer.ts";
import { contractionCoefficient, expansionCoefficient } from "../fittings/transition.ts";
import { squareMeters } from "../quantity.ts";
import { openFitting, writeLaw } from "./fitting-columns.ts";
import type { FittingContext } from "./fitting-context.ts";

/** The change of size comes after a junction, so it carries this segment's air in both areas. */
export function putTransition(context: FittingContext, s: number, before: number, chosen: FittingType | null): void {
  const { system, sections, friction, transitionForm, practice, diverges, fittings } = context;
  const type = chosen ?? transitionType(sections.section[before]!, sections.section[s]!);
  const areaBefore = squareMeters(sections.area[before]!);
  const areaHere = squareMeters(sections.area[s]!);

  const narrows = areaHere <= areaBefore;
  const step = narrows ? { smaller: areaHere, larger: areaBefore } : { smaller: areaBefore, larger: areaHere };
  const contracts = narrows === diverges;
  const bySize = contracts ? contractionCoefficient(transitionForm, step) : expansionCoefficient(transitionForm, step);
  const isPractice = type === "shape-transition" && bySize < practice.shapeChange;
  const coefficient = isPractice ? practice.shapeChange : bySize;

  const widening = areaHere / step.smaller;
  const at = openFitting(fittings, s, type, chosen !== null, true, before);
  fittings.lossCoefficient[at] = coefficient;
  fittings.velocityPressure[at] = friction.velocityPressure[s]! * widening * widening;
  const law = isPractice ? "shapeChange" : contracts ? "contraction" : "expansion";
  writeLaw(fittings, at, law, step.smaller / step.larger, system.spec.transitionAngle_rad, practice.shapeChange);
}
