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
import {
  LEAST_SPLITTER_RADIUS_RATIO,
  SPLITTER_ELBOW_SOURCE,
  splitterCurveRatio,
  splitterElbowCoefficient,
} from "../fittings/splitter-elbow.ts";
import { radians, type Radians } from "../quantity.ts";
import { gorePieces } from "../takeoff/surface/elbow.ts";
import { openFitting, writeLaw } from "./fitting-columns.ts";
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
  const type = chosen ?? elbowType(sections.section[s]!, system.spec);
  // Flexible duct bends by itself: its loss is that of a smooth elbow, and no piece is made.
  const madeHere = !system.segments[s]!.flexible;
  const at = openFitting(fittings, s, type, chosen !== null, madeHere, before === NONE ? NONE : s);
  const angle = drawnTurn(context, s);
  fittings.angle[at] = angle;
  fittings.velocityPressure[at] = friction.velocityPressure[s]!;
  fittings.lossCoefficient[at] = elbowLoss(context, at, s, before, type, angle);
}

/** Two elbows of the spec's kind that turn away and back; where no turn is drawn, by the angle of practice. */
export function putOffset(context: FittingContext, s: number, before: number): void {
  const { system, sections, friction, fittings, practice, joints } = context;
  const at = openFitting(fittings, s, "offset", true, !system.segments[s]!.flexible, before === NONE ? NONE : s);
  const isDrawn = joints.turnCosine[s]! < SMALLEST_TURN_COSINE;
  const angle = isDrawn ? drawnTurn(context, s) : radians(practice.offsetAngle_rad);
  const one = elbowLoss(context, at, s, before, elbowType(sections.section[s]!, system.spec), angle);
  writeLaw(fittings, at, "offset", one);
  fittings.angle[at] = angle;
  fittings.velocityPressure[at] = friction.velocityPressure[s]!;
  fittings.lossCoefficient[at] = 2 * one;
}

function elbowLoss(
  context: FittingContext,
  at: number,
  s: number,
  before: number,
  type: FittingType,
  angle: Radians,
): number {
  const { practice, friction, sections, fittings } = context;
  const { radiusRatio } = context.system.spec.elbow;
  switch (type) {
    case "elbow-radius": {
      const sideRatio = sideRatioOf(context, at, s, before, sections.section[s]!);
      writeLaw(fittings, at, "radiusElbow", radiusRatio, sideRatio);
      return radiusElbowCoefficient({ angle, radiusRatio, sideRatio });
    }
    case "elbow-radius-splitters":
      return splitterLoss(context, at, s, angle);
    case "elbow-square-throat":
    case "elbow-mitered": {
      const sideRatio = sideRatioOf(context, at, s, before, sections.section[s]!);
      writeLaw(fittings, at, "squareThroat", sideRatio);
      return squareThroatElbowCoefficient({ angle, sideRatio });
    }
    case "elbow-square-throat-vanes":
      writeLaw(fittings, at, "vanedElbow", practice.vanedElbow);
      return practice.vanedElbow * bendAngleFactor(angle);
    default: {
      const darcyFrictionFactor = friction.darcyFrictionFactor[s]!;
      const smooth = smoothElbowCoefficient({ angle, radiusRatio, darcyFrictionFactor });
      if (type !== "elbow-gored") {
        writeLaw(fittings, at, "smoothElbow", radiusRatio, darcyFrictionFactor);
        return smooth;
      }
      // The pieces of a right angle, whatever the turn: a lesser one has fewer, each as narrow.
      const pieces = gorePieces(RIGHT_ANGLE, radiusRatio);
      writeLaw(fittings, at, "goredElbow", radiusRatio, darcyFrictionFactor, pieces);
      const { pieces3, pieces4, pieces5 } = practice.goredOverSmooth;
      return smooth * (pieces <= 3 ? pieces3 : pieces === 4 ? pieces4 : pieces5);
    }
  }
}

function splitterLoss(context: FittingContext, at: number, s: number, angle: Radians): number {
  const { radiusRatio, splitterCount = 1 } = context.system.spec.elbow;
  if (radiusRatio < LEAST_SPLITTER_RADIUS_RATIO) {
    const limitSource = SPLITTER_ELBOW_SOURCE;
    markOutOfTable(context, at, s, { value: radiusRatio, limit: LEAST_SPLITTER_RADIUS_RATIO, limitSource });
  }
  const used = Math.max(radiusRatio, LEAST_SPLITTER_RADIUS_RATIO);
  const elbow = { angle, radiusRatio: used, splitterCount };
  writeLaw(context.fittings, at, "splitterElbow", used, splitterCount, splitterCurveRatio(elbow));
  return splitterElbowCoefficient(elbow);
}

/** Side across the plane of the bend over the side in it: a bend up or down lies in the height, any other in the width. */
function sideRatioOf(context: FittingContext, at: number, s: number, before: number, section: Section): number {
  if (section.shape !== "rectangular" && section.shape !== "flat-oval") return 1;
  const { direction } = context.course;
  const isVertical = isSteep(direction, s) || (before !== NONE && isSteep(direction, before));
  const ratio = isVertical ? section.width_m / section.height_m : section.height_m / section.width_m;
  if (!isSideRatioInTable(ratio)) {
    const { from: least, to: most } = rectangularElbowTable.range.sideRatio;
    const limit = ratio < least ? least : most;
    markOutOfTable(context, at, s, { value: ratio, limit, limitSource: rectangularElbowTable.source });
  }
  return ratio;
}

const isSteep = (direction: Float64Array, s: number): boolean => Math.abs(direction[3 * s + 2]!) > 0.5;
