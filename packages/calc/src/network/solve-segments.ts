/** The way down the tree: fittings, losses and pressure left of every segment, each after the one that feeds it. */
import { flowRegime } from "../friction/friction-factor.ts";
import { equivalentDiameter } from "../geometry/equivalent-diameter.ts";
import { outerPerimeter } from "../geometry/section.ts";
import { cubicMetersPerSecond, meters, metersPerSecond, pascals, pascalsPerMeter, squareMeters } from "../quantity.ts";
import { checkDesign } from "./check-design.ts";
import { leakage, leakageClass } from "./leakage.ts";
import { plainRecord, type Draft } from "./plain-record.ts";
import { lossOfAccessories } from "./solve-accessories.ts";
import { fittingsOf, type FittingContext } from "./solve-fittings.ts";
import type { SolvedAccessory, SolvedFitting, SolvedSegment } from "./solution.ts";
import { staticLessTotal } from "./static-pressure.ts";
import { NONE } from "./tree.ts";

export interface SolveContext extends FittingContext {
  readonly outletCount: Int32Array;
}

export interface SolvedTree {
  readonly segments: SolvedSegment[];
  /** Sums from the equipment to the far end of each segment. */
  readonly lengthTo: Float64Array;
  readonly frictionTo: Float64Array;
  readonly dynamicTo: Float64Array;
}

export function solveSegments(context: SolveContext): SolvedTree {
  const { segmentCount } = context.tree;
  const solved: SolvedTree = {
    segments: new Array<SolvedSegment>(segmentCount),
    lengthTo: new Float64Array(segmentCount),
    frictionTo: new Float64Array(segmentCount),
    dynamicTo: new Float64Array(segmentCount),
  };
  walkDown(context, solved);
  return solved;
}

// A function of its own that answers nothing: the engine keeps such a loop compiled.
function walkDown(context: SolveContext, { segments, lengthTo, frictionTo, dynamicTo }: SolvedTree): void {
  const { order, before } = context.tree;
  for (let at = 0; at < order.length; at++) {
    const s = order[at]!;
    const parent = before[s]!;
    const frictionBefore = parent === NONE ? 0 : frictionTo[parent]!;
    const dynamicBefore = parent === NONE ? 0 : dynamicTo[parent]!;

    const segment = new SegmentRecord(context, s, frictionBefore + dynamicBefore);
    segments[s] = segment;
    checkDesign(context, segment, s);
    lengthTo[s] = (parent === NONE ? 0 : lengthTo[parent]!) + segment.length_m;
    frictionTo[s] = frictionBefore + segment.frictionLoss_pa;
    dynamicTo[s] = dynamicBefore + segment.dynamicLoss_pa;
  }
}

const SegmentRecord = plainRecord(function (
  this: Draft<SolvedSegment>,
  context: SolveContext,
  s: number,
  lossBefore: number,
) {
  const { system, sections, friction } = context;
  const segment = system.segments[s]!;
  const section = sections.section[s]!;
  const area = squareMeters(sections.area[s]!);
  const perimeter = meters(sections.perimeter[s]!);
  const hydraulicDiameter = meters(sections.hydraulicDiameter[s]!);
  const length = meters(context.course.length[s]!);
  const velocityPressure = pascals(friction.velocityPressure[s]!);
  const reynoldsNumber = friction.reynoldsNumber[s]!;

  const fittings = fittingsOf(context, s);
  const accessories = lossOfAccessories(segment, section, velocityPressure, context.practice);
  const frictionLoss = friction.frictionRate[s]! * length;
  const dynamicLoss = sumOfLosses(fittings) + sumOfLosses(accessories);

  const pressureLeftEntering = system.design.availablePressure_pa - lossBefore;
  const pressureLeftLeaving = pressureLeftEntering - frictionLoss - dynamicLoss;

  this.segmentId = segment.id;
  this.section = section;
  this.sized = segment.section === null ? "by-rule" : "typed";
  this.volumetricFlowRate_m3s = cubicMetersPerSecond(context.airflow[s]!);
  this.length_m = length;
  this.area_m2 = area;
  this.hydraulicDiameter_m = hydraulicDiameter;
  this.equivalentDiameter_m = equivalentDiameter(section, area, perimeter, hydraulicDiameter);
  this.meanVelocity_m_s = metersPerSecond(friction.velocity[s]!);
  this.velocityPressure_pa = velocityPressure;
  this.reynoldsNumber = reynoldsNumber;
  this.regime = flowRegime(reynoldsNumber);
  this.darcyFrictionFactor = friction.darcyFrictionFactor[s]!;
  this.frictionRate_pa_m = pascalsPerMeter(friction.frictionRate[s]!);
  this.frictionLoss_pa = pascals(frictionLoss);
  this.fittings = fittings;
  this.accessories = accessories;
  this.dynamicLoss_pa = pascals(dynamicLoss);
  this.totalPressureLoss_pa = pascals(frictionLoss + dynamicLoss);
  this.leakage_m3s = leakage(
    leakageClass(system.spec.sealClass, section.shape, segment.flexible),
    squareMeters(outerPerimeter(section) * length),
    pascals((pressureLeftEntering + pressureLeftLeaving) / 2 + staticLessTotal(context.diverges, velocityPressure)),
  );
  this.outletCount = context.outletCount[s]!;
  this.pressureLeftEntering_pa = pascals(pressureLeftEntering);
  this.pressureLeftLeaving_pa = pascals(pressureLeftLeaving);
});

function sumOfLosses(parts: readonly SolvedFitting[] | readonly SolvedAccessory[]): number {
  let sum = 0;
  for (let i = 0; i < parts.length; i++) sum += parts[i]!.loss_pa;
  return sum;
}
