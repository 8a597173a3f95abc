/** What an engineer would mark on a segment that can be solved all the same. */
import { FLEXIBLE_RANGE, FLEXIBLE_SOURCE, compressionOfSlack } from "../friction/flexible.ts";
import { TURBULENT_FROM_REYNOLDS } from "../friction/friction-factor.ts";
import { aspectRatio } from "../geometry/section.ts";
import { MOST_ASPECT_RATIO, addFinding, limitSources, type FindingList } from "./findings.ts";
import type { FittingContext } from "./solve-fittings.ts";
import { staticLessTotal } from "./static-pressure.ts";
import type { FindingCode, SolvedSegment } from "./solution.ts";

/** A size by rule meets its limit exactly; the last digit is not a finding. */
const isOver = (value: number, limit: number): boolean => value > limit * (1 + 1e-9);

export function checkDesign(context: FittingContext, solved: SolvedSegment, s: number): void {
  const { findings } = context;
  const { segments, limits, spec } = context.system;
  const { ductClass, flexible } = segments[s]!;
  const velocityLimit = limits.velocity_m_s[ductClass];
  if (isOver(solved.meanVelocity_m_s, velocityLimit)) {
    const limitSource = limitSources.velocity(ductClass);
    mark(findings, s, solved, "velocity-over-limit", solved.meanVelocity_m_s, velocityLimit, "m/s", limitSource);
  }
  const frictionLimit = limits.frictionRate_pa_m[ductClass];
  if (isOver(solved.frictionRate_pa_m, frictionLimit)) {
    const limitSource = limitSources.friction(ductClass);
    mark(findings, s, solved, "friction-over-limit", solved.frictionRate_pa_m, frictionLimit, "Pa/m", limitSource);
  }
  const ratio = aspectRatio(solved.section);
  if (isOver(ratio, MOST_ASPECT_RATIO)) {
    mark(findings, s, solved, "aspect-ratio-high", ratio, MOST_ASPECT_RATIO, "1", limitSources.aspectRatio);
  }
  if (solved.regime === "transitional") {
    const { transitional } = limitSources;
    mark(findings, s, solved, "flow-transitional", solved.reynoldsNumber, TURBULENT_FROM_REYNOLDS, "1", transitional);
  }
  const pressureClass = Math.abs(spec.pressureClass_pa);
  const toStatic = staticLessTotal(context.diverges, solved.velocityPressure_pa);
  const entering = Math.abs(solved.pressureLeftEntering_pa + toStatic);
  const leaving = Math.abs(solved.pressureLeftLeaving_pa + toStatic);
  const mostStaticPressure = entering > leaving ? entering : leaving;
  if (isOver(mostStaticPressure, pressureClass)) {
    const limitSource = limitSources.pressureClass;
    mark(findings, s, solved, "pressure-class-exceeded", mostStaticPressure, pressureClass, "Pa", limitSource);
  }
  if (flexible) checkFlexible(solved, s, limits.flexibleLength_m, spec.flexibleSlack, findings);
}

function checkFlexible(
  solved: SolvedSegment,
  s: number,
  lengthLimit: number,
  slack: number,
  findings: FindingList,
): void {
  if (isOver(solved.length_m, lengthLimit)) {
    mark(findings, s, solved, "flexible-too-long", solved.length_m, lengthLimit, "m", limitSources.flexibleLength);
  }
  const compression = compressionOfSlack(slack);
  const { compression: mostCompression, diameter_m: mostDiameter } = FLEXIBLE_RANGE;
  if (isOver(compression, mostCompression)) {
    mark(findings, s, solved, "table-range-exceeded", compression, mostCompression, "1", FLEXIBLE_SOURCE);
  } else if (compression > 0 && isOver(solved.hydraulicDiameter_m, mostDiameter)) {
    mark(findings, s, solved, "table-range-exceeded", solved.hydraulicDiameter_m, mostDiameter, "m", FLEXIBLE_SOURCE);
  }
}

function mark(
  findings: FindingList,
  s: number,
  { segmentId }: SolvedSegment,
  code: FindingCode,
  value: number,
  limit: number,
  unit: string,
  limitSource: string,
): void {
  addFinding(findings, s, code, { kind: "segment", id: segmentId }, { value, limit, unit, limitSource });
}
