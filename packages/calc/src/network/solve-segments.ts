/** The way down the tree: friction, fittings and pressure left of every segment, each after the one that feeds it. */
import type { AirSystem } from "../air-system.ts";
import { velocityPressure as pressureOfVelocity } from "../air/velocity-pressure.ts";
import { FLEXIBLE_RANGE, FLEXIBLE_SOURCE, compressionOfSlack, slackFactor } from "../friction/flexible.ts";
import { darcyFrictionFactor, flowRegime, TURBULENT_FROM_REYNOLDS } from "../friction/friction-factor.ts";
import { roughnessOf } from "../friction/roughness.ts";
import { equivalentDiameter } from "../geometry/equivalent-diameter.ts";
import { aspectRatio, hydraulicDiameter, outerPerimeter, wettedPerimeter } from "../geometry/section.ts";
import {
  cubicMetersPerSecond,
  meters,
  metersPerSecond,
  pascals,
  pascalsPerMeter,
  squareMeters,
  type KilogramsPerCubicMeter,
  type PascalSeconds,
} from "../quantity.ts";
import { MOST_ASPECT_RATIO, addFinding, limitSources, type FindingList } from "./findings.ts";
import { leakage, leakageClass } from "./leakage.ts";
import { lossOfAccessories } from "./solve-accessories.ts";
import { fittingsOf, type FittingContext } from "./solve-fittings.ts";
import type { FindingCode, SolvedSegment } from "./solution.ts";
import { NONE } from "./tree.ts";

export interface SolveContext extends FittingContext {
  readonly outletCount: Int32Array;
  readonly density: KilogramsPerCubicMeter;
  readonly viscosity: PascalSeconds;
}

export interface SolvedTree {
  readonly segments: readonly SolvedSegment[];
  /** Sums from the equipment to the far end of each segment. */
  readonly lengthTo: Float64Array;
  readonly frictionTo: Float64Array;
  readonly dynamicTo: Float64Array;
  readonly leakage: number;
}

/** Velocity pressure of every segment, by its real area. */
export function velocityPressures(
  airflow: Float64Array,
  area: Float64Array,
  density: KilogramsPerCubicMeter,
): Float64Array {
  const result = new Float64Array(airflow.length);
  for (let s = 0; s < airflow.length; s++) {
    result[s] = pressureOfVelocity(density, metersPerSecond(airflow[s]! / area[s]!));
  }
  return result;
}

export function solveSegments(context: SolveContext): SolvedTree {
  const { system, tree } = context;
  const { segmentCount, order, from, into } = tree;
  const available = system.design.availablePressure_pa;
  const segments = new Array<SolvedSegment>(segmentCount);
  const lengthTo = new Float64Array(segmentCount);
  const frictionTo = new Float64Array(segmentCount);
  const dynamicTo = new Float64Array(segmentCount);
  let leaked = 0;

  for (let at = 0; at < segmentCount; at++) {
    const s = order[at]!;
    const before = into[from[s]!]!;
    const lengthBefore = before === NONE ? 0 : lengthTo[before]!;
    const frictionBefore = before === NONE ? 0 : frictionTo[before]!;
    const dynamicBefore = before === NONE ? 0 : dynamicTo[before]!;

    const segment = solveSegment(context, s, available - frictionBefore - dynamicBefore);
    segments[s] = segment;
    lengthTo[s] = lengthBefore + segment.length_m;
    frictionTo[s] = frictionBefore + segment.frictionLoss_pa;
    dynamicTo[s] = dynamicBefore + segment.dynamicLoss_pa;
    leaked += segment.leakage_m3s;
  }
  return { segments, lengthTo, frictionTo, dynamicTo, leakage: leaked };
}

function solveSegment(context: SolveContext, s: number, pressureLeftEntering: number): SolvedSegment {
  const { system, sections, density, viscosity } = context;
  const segment = system.segments[s]!;
  const section = sections.section[s]!;
  const area = squareMeters(sections.area[s]!);
  const perimeter = wettedPerimeter(section);
  const hydraulic = hydraulicDiameter(area, perimeter);
  const airflow = context.airflow[s]!;
  const length = context.course.length[s]!;
  const velocity = airflow / area;
  const velocityPressure = context.velocityPressure[s]!;

  const reynoldsNumber = (density * velocity * hydraulic) / viscosity;
  const roughness = roughnessOf(segment, system.spec);
  const factor = darcyFrictionFactor(section, reynoldsNumber, roughness / hydraulic);
  const slack = segment.flexible ? slackFactor({ slack: system.spec.flexibleSlack, diameter: hydraulic }) : 1;
  const frictionRate = (slack * factor * velocityPressure) / hydraulic;
  const frictionLoss = frictionRate * length;

  const fittings = fittingsOf(context, s, factor);
  const accessories = lossOfAccessories(segment, section, velocityPressure, context.practice);
  let dynamicLoss = 0;
  for (let f = 0; f < fittings.length; f++) dynamicLoss += fittings[f]!.loss_pa;
  for (let a = 0; a < accessories.length; a++) dynamicLoss += accessories[a]!.loss_pa;

  const pressureLeftLeaving = pressureLeftEntering - frictionLoss - dynamicLoss;
  // Supply duct is under pressure by its total less its velocity pressure; duct toward a fan is under suction by their sum.
  const sign = context.diverges ? -1 : 1;
  const staticEntering = pressureLeftEntering + sign * velocityPressure;
  const staticLeaving = pressureLeftLeaving + sign * velocityPressure;

  const solvedSegment: SolvedSegment = {
    segmentId: segment.id,
    section,
    sized: segment.section === null ? "by-rule" : "typed",
    volumetricFlowRate_m3s: cubicMetersPerSecond(airflow),
    length_m: meters(length),
    area_m2: area,
    hydraulicDiameter_m: hydraulic,
    equivalentDiameter_m: equivalentDiameter(section, { area, perimeter, hydraulicDiameter: hydraulic }),
    meanVelocity_m_s: metersPerSecond(velocity),
    velocityPressure_pa: pascals(velocityPressure),
    reynoldsNumber,
    regime: flowRegime(reynoldsNumber),
    darcyFrictionFactor: factor,
    frictionRate_pa_m: pascalsPerMeter(frictionRate),
    frictionLoss_pa: pascals(frictionLoss),
    fittings,
    accessories,
    dynamicLoss_pa: pascals(dynamicLoss),
    totalPressureLoss_pa: pascals(frictionLoss + dynamicLoss),
    leakage_m3s: leakage({
      leakageClass: leakageClass(system.spec.sealClass, section.shape, segment.flexible),
      surface: squareMeters(outerPerimeter(section) * length),
      staticPressure: pascals((staticEntering + staticLeaving) / 2),
    }),
    outletCount: context.outletCount[s]!,
    pressureLeftEntering_pa: pascals(pressureLeftEntering),
    pressureLeftLeaving_pa: pascals(pressureLeftLeaving),
  };
  checkSegment(system, solvedSegment, s, Math.max(Math.abs(staticEntering), Math.abs(staticLeaving)), context.findings);
  return solvedSegment;
}

/** What an engineer would mark on this segment. */
function checkSegment(
  { segments, limits, spec }: AirSystem,
  solved: SolvedSegment,
  s: number,
  mostStaticPressure: number,
  findings: FindingList,
): void {
  const { ductClass, flexible } = segments[s]!;
  const over = (code: FindingCode, value: number, limit: number, unit: string, limitSource: string) =>
    addFinding(findings, s, code, { kind: "segment", id: solved.segmentId }, { value, limit, unit, limitSource });

  // A size by rule meets its limit exactly; the last digit is not a finding.
  const isOver = (value: number, limit: number) => value > limit * (1 + 1e-9);
  const velocityLimit = limits.velocity_m_s[ductClass];
  if (isOver(solved.meanVelocity_m_s, velocityLimit)) {
    over("velocity-over-limit", solved.meanVelocity_m_s, velocityLimit, "m/s", limitSources.velocity(ductClass));
  }
  const frictionLimit = limits.frictionRate_pa_m[ductClass];
  if (isOver(solved.frictionRate_pa_m, frictionLimit)) {
    over("friction-over-limit", solved.frictionRate_pa_m, frictionLimit, "Pa/m", limitSources.friction(ductClass));
  }
  const ratio = aspectRatio(solved.section);
  if (isOver(ratio, MOST_ASPECT_RATIO)) {
    over("aspect-ratio-high", ratio, MOST_ASPECT_RATIO, "1", limitSources.aspectRatio);
  }
  if (solved.regime === "transitional") {
    over("flow-transitional", solved.reynoldsNumber, TURBULENT_FROM_REYNOLDS, "1", limitSources.transitional);
  }
  const pressureClass = Math.abs(spec.pressureClass_pa);
  if (isOver(mostStaticPressure, pressureClass)) {
    over("pressure-class-exceeded", mostStaticPressure, pressureClass, "Pa", limitSources.pressureClass);
  }
  if (!flexible) return;
  if (isOver(solved.length_m, limits.flexibleLength_m)) {
    over("flexible-too-long", solved.length_m, limits.flexibleLength_m, "m", limitSources.flexibleLength);
  }
  const compression = compressionOfSlack(spec.flexibleSlack);
  if (compression > FLEXIBLE_RANGE.compression) {
    over("table-range-exceeded", compression, FLEXIBLE_RANGE.compression, "1", FLEXIBLE_SOURCE);
  } else if (compression > 0 && isOver(solved.hydraulicDiameter_m, FLEXIBLE_RANGE.diameter_m)) {
    over("table-range-exceeded", solved.hydraulicDiameter_m, FLEXIBLE_RANGE.diameter_m, "m", FLEXIBLE_SOURCE);
  }
}
