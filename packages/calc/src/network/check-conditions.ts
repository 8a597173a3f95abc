/** The checks of what is said once for the whole system: conditions, limits, spec, sizing rule. */
import {
  AIR_SYSTEM_SCHEMA,
  DUCT_CLASSES,
  FRICTION_BASES,
  MATERIALS,
  RECTANGULAR_BRANCHES,
  RECTANGULAR_ELBOWS,
  ROUND_BRANCHES,
  ROUND_ELBOWS,
  SEAL_CLASSES,
  SERVICES,
  SPLITTER_COUNTS,
  type AirSystem,
  type Insulation,
} from "../air-system.ts";
import { problem, systemSubject } from "./problems.ts";
import { isIn, ranges, type Range } from "./ranges.table.ts";
import type { SystemProblem } from "./solution.ts";

export function checkConditions(system: AirSystem, problems: SystemProblem[]): void {
  const subject = systemSubject(system);
  const refuse = (field: string, value: unknown, limit: string) =>
    problems.push(problem("value-out-of-range", subject, field, value, limit));
  const check = (field: string, value: number, range: Range) => {
    if (!isIn(range, value)) refuse(field, value, range.words);
  };
  const checkOneOf = (field: string, value: string, accepted: readonly string[]) => {
    if (!accepted.includes(value)) refuse(field, value, `one of ${accepted.join(", ")}`);
  };

  const { design, limits, spec, sizing } = system;
  checkOneOf("schema", system.schema, [AIR_SYSTEM_SCHEMA]);
  checkOneOf("service", system.service, SERVICES);
  checkOneOf("frictionBasis", system.frictionBasis, FRICTION_BASES);

  check("design.altitude_m", design.altitude_m, ranges.altitude);
  check("design.temperature_k", design.temperature_k, ranges.temperature);
  check("design.relativeHumidity", design.relativeHumidity, ranges.relativeHumidity);
  check("design.availablePressure_pa", design.availablePressure_pa, ranges.availablePressure);

  check("design.safetyMargin", design.safetyMargin, ranges.safetyMargin);

  for (const ductClass of DUCT_CLASSES) {
    check(`limits.velocity_m_s.${ductClass}`, limits.velocity_m_s[ductClass], ranges.velocityLimit);
    check(`limits.frictionRate_pa_m.${ductClass}`, limits.frictionRate_pa_m[ductClass], ranges.frictionLimit);
  }
  check("limits.flexibleLength_m", limits.flexibleLength_m, ranges.length);

  checkOneOf("sizing.method", sizing.method, ["equal-friction", "velocity"]);
  checkOneOf("sizing.shape", sizing.shape, ["round", "rectangular", "flat-oval"]);
  check("sizing.frictionRate_pa_m", sizing.frictionRate_pa_m, ranges.frictionLimit);
  if (sizing.maximumHeight_m !== null) check("sizing.maximumHeight_m", sizing.maximumHeight_m, ranges.side);

  checkOneOf("spec.material", spec.material, MATERIALS);
  checkOneOf("spec.sealClass", spec.sealClass, SEAL_CLASSES);
  checkOneOf("spec.elbow.rectangular", spec.elbow.rectangular, RECTANGULAR_ELBOWS);
  checkOneOf("spec.elbow.round", spec.elbow.round, ROUND_ELBOWS);
  checkOneOf("spec.branch.rectangular", spec.branch.rectangular, RECTANGULAR_BRANCHES);
  checkOneOf("spec.branch.round", spec.branch.round, ROUND_BRANCHES);
  if (!isSplitterCount(spec.elbow.splitterCount)) {
    refuse("spec.elbow.splitterCount", spec.elbow.splitterCount, `one of ${SPLITTER_COUNTS.join(", ")}`);
  }
  check("spec.elbow.radiusRatio", spec.elbow.radiusRatio, ranges.radiusRatio);
  check("spec.transitionAngle_rad", spec.transitionAngle_rad, ranges.transitionAngle);
  check("spec.flexibleSlack", spec.flexibleSlack, ranges.flexibleSlack);
  check("spec.pressureClass_pa", spec.pressureClass_pa, ranges.pressureClass);
  checkOneOf("spec.sizesAre", spec.sizesAre, ["clear-inside", "sheet-metal"]);
  checkOneOf("spec.insulation.kind", spec.insulation.kind, INSULATION_KINDS);
  if (!isInsulation(spec.insulation)) {
    refuse("spec.insulation.thickness_m", thicknessOf(spec.insulation), ranges.insulationThickness.words);
  }

  for (const level of system.levels) {
    check(`levels.${level.id}.elevation_m`, level.elevation_m, ranges.position);
  }
}

const isSplitterCount = (count: number | undefined): boolean =>
  count === undefined || SPLITTER_COUNTS.some((accepted) => accepted === count);

const INSULATION_KINDS: readonly Insulation["kind"][] = ["none", "wrap", "liner"];

const thicknessOf = (insulation: Insulation): number => (insulation.kind === "none" ? 0 : insulation.thickness_m);

/** Of a thickness that can be. */
export const isInsulation = (insulation: Insulation): boolean =>
  insulation.kind === "none" || isIn(ranges.insulationThickness, insulation.thickness_m);
