import type { FittingType, Section } from "../air-system.ts";
import {
  bendAngleFactor,
  isSideRatioInTable,
  radiusElbowCoefficient,
  smoothElbowCoefficient,
  squareThroatElbowCoefficient,
} from "../fittings/elbow.ts";
import { rectangularElbowTable } from "../fittings/elbow.table.ts";
import { SMALLEST_TURN_COSINE, elbowType } from "../fittings/infer.ts";
import { angleOfCosine } from "../fittings/joints.ts";
import { radians, type Radians } from "../quantity.ts";
import { from, openFitting, type FittingSource } from "./fitting-columns.ts";
import { markOutOfTable, type FittingContext } from "./fitting-context.ts";
import { NONE } from "./tree-shape.ts";

const RIGHT_ANGLE = radians(Math.PI / 2);

/** The turn as drawn; a right angle where an elbow or tap was chosen and nothing was drawn. */
export function drawnTurn({ joints }: FittingContext, s: number): Radians {
  const cosine = joints.turnCosine[s]!;
  return cosine < SMALLEST_TURN_COSINE ? angleOfCosine(cosine) : RIGHT_ANGLE;
}

/** An elbow comes after the change of size, so it is made in this segment's section. */
export function putElbow(context: FittingContext, s: number, before: number, chosen: FittingType | null): void {
  const { system, sections, friction, fittings } = context;
  const section = sections.section[s]!;
  const type = chosen ?? elbowType(section, system.spec);
  const angle = drawnTurn(context, s);
  const { coefficient, source } = elbowLoss(context, s, before, type, section, angle);
  // Flexible duct bends by itself: its loss is that of a smooth elbow, and no piece is made.
  const madeHere = !system.segments[s]!.flexible;
  const upstream = before === NONE ? NONE : s;
  const pressure = friction.velocityPressure[s]!;
  const at = openFitting(fittings, s, type, chosen !== null, madeHere, upstream, source);
  fittings.angle[at] = angle;
  fittings.lossCoefficient[at] = coefficient;
  fittings.velocityPressure[at] = pressure;
}

function elbowLoss(
  context: FittingContext,
  s: number,
  before: number,
  type: FittingType,
  section: Section,
  angle: Radians,
): { coefficient: number; source: FittingSource } {
  const { practice, friction } = context;
  const { radiusRatio } = context.system.spec.elbow;
  switch (type) {
    case "elbow-radius": {
      const sideRatio = sideRatioOf(context, s, before, section);
      return { coefficient: radiusElbowCoefficient({ angle, radiusRatio, sideRatio }), source: from.radiusElbow };
    }
    case "elbow-square-throat": {
      const sideRatio = sideRatioOf(context, s, before, section);
      return { coefficient: squareThroatElbowCoefficient({ angle, sideRatio }), source: from.squareThroat };
    }
    case "elbow-square-throat-vanes":
      return { coefficient: practice.vanedElbow * bendAngleFactor(angle), source: from.practice };
    default: {
      const darcyFrictionFactor = friction.darcyFrictionFactor[s]!;
      const smooth = smoothElbowCoefficient({ angle, radiusRatio, darcyFrictionFactor });
      return type === "elbow-gored"
        ? { coefficient: smooth * practice.goredOverSmooth, source: from.goredFactor }
        : { coefficient: smooth, source: from.smoothElbow };
    }
  }
}

/** Side across the plane of the bend over the side in it: a bend up or down lies in the height, any other in the width. */
function sideRatioOf(context: FittingContext, s: number, before: number, section: Section): number {
  if (section.shape !== "rectangular" && section.shape !== "flat-oval") return 1;
  const { direction } = context.course;
  const isVertical = isSteep(direction, s) || (before !== NONE && isSteep(direction, before));
  const ratio = isVertical ? section.width_m / section.height_m : section.height_m / section.width_m;
  if (!isSideRatioInTable(ratio)) {
    const { from: least, to: most } = rectangularElbowTable.range.sideRatio;
    const limit = ratio < least ? least : most;
    markOutOfTable(context, s, { value: ratio, limit, limitSource: rectangularElbowTable.source });
  }
  return ratio;
}

const isSteep = (direction: Float64Array, s: number): boolean => Math.abs(direction[3 * s + 2]!) > 0.5;
