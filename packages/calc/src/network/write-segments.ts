/** The columns of the air stage, written out as one record for each segment. */
import type { AirSystem } from "../air-system.ts";
import { flowRegime } from "../friction/friction-factor.ts";
import { equivalentDiameter } from "../geometry/equivalent-diameter.ts";
import { cubicMetersPerSecond, meters, metersPerSecond, pascals, pascalsPerMeter, squareMeters } from "../quantity.ts";
import type { Course } from "./course.ts";
import { fittingsOf, type FittingColumns } from "./fitting-columns.ts";
import type { Flows } from "./flows.ts";
import type { Friction } from "./friction.ts";
import { gaugePressures } from "./gauge-pressures.ts";
import type { Losses } from "./losses.ts";
import { plainRecord, type Draft } from "./plain-record.ts";
import type { Sections } from "./sections.ts";
import type { Traits } from "./traits.ts";
import type { SolvedAccessory, SolvedFitting, SolvedSegment } from "./solution.ts";

export interface SolvedColumns {
  readonly system: AirSystem;
  readonly course: Course;
  readonly flows: Flows;
  readonly sections: Sections;
  readonly traits: Traits;
  readonly friction: Friction;
  readonly fittings: FittingColumns;
  readonly accessories: readonly (readonly SolvedAccessory[])[];
  readonly losses: Losses;
}

export function writeSegments(
  columns: SolvedColumns,
  leakage: Float64Array,
  requiredPressure: number,
): readonly SolvedSegment[] {
  const segments = new Array<SolvedSegment>(leakage.length);
  write(columns, leakage, requiredPressure, segments);
  return segments;
}

// A function of its own that answers nothing: the engine keeps such a loop compiled.
function write(
  columns: SolvedColumns,
  leakage: Float64Array,
  requiredPressure: number,
  segments: SolvedSegment[],
): void {
  const scratch: SolvedFitting[] = [];
  for (let s = 0; s < segments.length; s++) {
    const fittings = fittingsOf(columns.system, columns.sections, columns.fittings, s, scratch);
    segments[s] = new SegmentRecord(columns, s, fittings, leakage[s]!, requiredPressure);
  }
}

const SegmentRecord = plainRecord(function (
  this: Draft<SolvedSegment>,
  columns: SolvedColumns,
  s: number,
  fittings: readonly SolvedFitting[],
  leakage: number,
  requiredPressure: number,
) {
  const { sections, friction, losses } = columns;
  const segment = columns.system.segments[s]!;
  const perimeter = meters(sections.perimeter[s]!);
  this.segmentId = segment.id;
  this.section = sections.section[s]!;
  this.sized = segment.section === null ? "by-rule" : "typed";
  this.volumetricFlowRate_m3s = cubicMetersPerSecond(columns.flows.airflow[s]!);
  this.length_m = meters(columns.course.length[s]!);
  this.area_m2 = squareMeters(sections.area[s]!);
  this.hydraulicDiameter_m = meters(sections.hydraulicDiameter[s]!);
  this.equivalentDiameter_m = equivalentDiameter(this.section, this.area_m2, perimeter, this.hydraulicDiameter_m);
  this.meanVelocity_m_s = metersPerSecond(friction.velocity[s]!);
  this.velocityPressure_pa = pascals(friction.velocityPressure[s]!);
  this.reynoldsNumber = friction.reynoldsNumber[s]!;
  this.regime = flowRegime(friction.reynoldsNumber[s]!);
  this.darcyFrictionFactor = friction.darcyFrictionFactor[s]!;
  this.frictionRate_pa_m = pascalsPerMeter(friction.frictionRate[s]!);
  this.frictionLoss_pa = pascals(losses.frictionLoss[s]!);
  this.fittings = fittings;
  this.accessories = columns.accessories[s]!;
  this.dynamicLoss_pa = pascals(losses.dynamicLoss[s]!);
  this.totalPressureLoss_pa = pascals(losses.frictionLoss[s]! + losses.dynamicLoss[s]!);
  this.leakage_m3s = cubicMetersPerSecond(leakage);
  this.outletCount = columns.flows.outletCount[s]!;
  this.pressureLeftEntering_pa = pascals(losses.entering[s]!);
  this.pressureLeftLeaving_pa = pascals(losses.leaving[s]!);
  const gauge = gaugePressures(s, columns.system.service, requiredPressure, losses, friction);
  this.totalPressureEntering_pa = gauge.totalPressureEntering_pa;
  this.totalPressureLeaving_pa = gauge.totalPressureLeaving_pa;
  this.staticPressureEntering_pa = gauge.staticPressureEntering_pa;
  this.staticPressureLeaving_pa = gauge.staticPressureLeaving_pa;
});
