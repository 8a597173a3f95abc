/** What an engineer would mark on segments that can be solved all the same. */
import { DUCT_CLASSES, type AirSystem } from "../air-system.ts";
import { FLEXIBLE_RANGE, FLEXIBLE_SOURCE, compressionOfSlack } from "../friction/flexible.ts";
import { LAMINAR_UNDER_REYNOLDS, TURBULENT_FROM_REYNOLDS } from "../friction/friction-factor.ts";
import { aspectRatio } from "../geometry/section.ts";
import { MOST_ASPECT_RATIO, addFinding, limitSources, type FindingList } from "./findings.ts";
import { staticLessTotal } from "./losses.ts";
import type { FindingCode } from "./solution.ts";
import { byPlace } from "./traits.ts";
import type { SolvedColumns } from "./write-segments.ts";

/** A size by rule meets its limit exactly; the last digit is not a finding. */
const isOver = (value: number, limit: number): boolean => value > limit * (1 + 1e-9);

export function checkDesign(columns: SolvedColumns, findings: FindingList): void {
  checkSpeed(columns, findings);
  checkPressureClass(columns, findings);
  checkForm(columns, findings);
}

function checkSpeed({ system, traits, friction }: SolvedColumns, findings: FindingList): void {
  const { velocity, frictionRate, reynoldsNumber } = friction;
  const velocityLimits = byPlace(system.limits.velocity_m_s);
  const frictionLimits = byPlace(system.limits.frictionRate_pa_m);
  for (let s = 0; s < velocity.length; s++) {
    const place = traits.ductClass[s]!;
    if (isOver(velocity[s]!, velocityLimits[place]!)) {
      const source = limitSources.velocity(DUCT_CLASSES[place]!);
      mark(findings, system, s, "velocity-over-limit", velocity[s]!, velocityLimits[place]!, "m/s", source);
    }
    if (isOver(frictionRate[s]!, frictionLimits[place]!)) {
      const source = limitSources.friction(DUCT_CLASSES[place]!);
      mark(findings, system, s, "friction-over-limit", frictionRate[s]!, frictionLimits[place]!, "Pa/m", source);
    }
    const reynolds = reynoldsNumber[s]!;
    if (reynolds >= LAMINAR_UNDER_REYNOLDS && reynolds < TURBULENT_FROM_REYNOLDS) {
      const source = limitSources.transitional;
      mark(findings, system, s, "flow-transitional", reynolds, TURBULENT_FROM_REYNOLDS, "1", source);
    }
  }
}

function checkPressureClass({ system, friction, losses }: SolvedColumns, findings: FindingList): void {
  const limit = Math.abs(system.spec.pressureClass_pa);
  const { entering, leaving } = losses;
  for (let s = 0; s < entering.length; s++) {
    const toStatic = staticLessTotal(system.service === "supply", friction.velocityPressure[s]!);
    const most = Math.max(Math.abs(entering[s]! + toStatic), Math.abs(leaving[s]! + toStatic));
    if (!isOver(most, limit)) continue;
    mark(findings, system, s, "pressure-class-exceeded", most, limit, "Pa", limitSources.pressureClass);
  }
}

function checkForm(columns: SolvedColumns, findings: FindingList): void {
  const { system, sections, traits } = columns;
  for (let s = 0; s < sections.area.length; s++) {
    const ratio = aspectRatio(sections.section[s]!);
    if (isOver(ratio, MOST_ASPECT_RATIO)) {
      mark(findings, system, s, "aspect-ratio-high", ratio, MOST_ASPECT_RATIO, "1", limitSources.aspectRatio);
    }
    if (traits.isFlexible[s] === 1) checkFlexible(columns, s, findings);
  }
}

function checkFlexible({ system, course, sections }: SolvedColumns, s: number, findings: FindingList): void {
  const length = course.length[s]!;
  const lengthLimit = system.limits.flexibleLength_m;
  if (isOver(length, lengthLimit)) {
    mark(findings, system, s, "flexible-too-long", length, lengthLimit, "m", limitSources.flexibleLength);
  }
  const compression = compressionOfSlack(system.spec.flexibleSlack);
  const { compression: mostCompression, diameter_m: mostDiameter } = FLEXIBLE_RANGE;
  const diameter = sections.hydraulicDiameter[s]!;
  if (isOver(compression, mostCompression)) {
    mark(findings, system, s, "table-range-exceeded", compression, mostCompression, "1", FLEXIBLE_SOURCE);
  } else if (compression > 0 && isOver(diameter, mostDiameter)) {
    mark(findings, system, s, "table-range-exceeded", diameter, mostDiameter, "m", FLEXIBLE_SOURCE);
  }
}

function mark(
  findings: FindingList,
  { segments }: AirSystem,
  s: number,
  code: FindingCode,
  value: number,
  limit: number,
  unit: string,
  limitSource: string,
): void {
  addFinding(findings, s, code, { kind: "segment", id: segments[s]!.id }, { value, limit, unit, limitSource });
}
