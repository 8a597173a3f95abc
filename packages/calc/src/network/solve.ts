/** The air stage: a layout with its conditions in, flows, sizes, losses, paths and findings out. */
import type { AirSystem } from "../air-system.ts";
import { airDensity } from "../air/density.ts";
import { dynamicViscosity } from "../air/viscosity.ts";
import { describeJoints } from "../fittings/joints.ts";
import { sumJunctions } from "../fittings/junction-sums.ts";
import { shippedPractice, type PracticeCoefficients } from "../fittings/practice.table.ts";
import { transitionForm } from "../fittings/transition.ts";
import { cubicMetersPerSecond, pascals, radians } from "../quantity.ts";
import { review } from "../findings/review.ts";
import { ok, type Result } from "../result.ts";
import { sizingTables } from "../sizing/size-rule.ts";
import { findAccessories } from "./accessories.ts";
import { checkConditions } from "./check-conditions.ts";
import { checkDesign } from "./check-design.ts";
import { layCourse } from "./course.ts";
import { inOrder, type FindingList } from "./findings.ts";
import { fanDuty } from "./fan-duty.ts";
import { findFittings } from "./find-fittings.ts";
import { fittingColumns } from "./fitting-columns.ts";
import { addUpFlows } from "./flows.ts";
import { findFriction } from "./friction.ts";
import { findLeakage, sumLosses } from "./losses.ts";
import { findNeeds, reportShort, writePaths } from "./paths.ts";
import { chooseSections } from "./sections.ts";
import type { Finding, Solution, SolvedPath, SolvedSegment, SystemProblem } from "./solution.ts";
import { readTraits } from "./traits.ts";
import { buildTree } from "./tree.ts";
import { writeSegments } from "./write-segments.ts";

/**
 * Flows, sizes, pressure losses, paths and findings of a system, or every reason why it has none.
 *
 * Segments carry the air of the outlets beyond them. Leakage is told beside it and added to what the equipment moves; it
 * does not change the flow in a segment. Total pressure is accounted throughout, friction on the hydraulic diameter.
 *
 * The answer is plain data, also for JSON and structured clones; `segments`, `paths` and `findings` are made on first reading.
 *
 * Range    one pass each way over the segments: cost is linear in them
 * Problem  every code of `SystemProblem`, all at once
 * Source   Darcy and Weisbach, Colebrook; fittings each with their own source in the answer
 */
export function solve(
  system: AirSystem,
  practice: PracticeCoefficients = shippedPractice,
): Result<Solution, SystemProblem> {
  const problems: SystemProblem[] = [];
  checkConditions(system, problems);
  const tree = buildTree(system, problems);
  const course = layCourse(system, tree, problems);
  if (problems.length > 0) return { ok: false, problems };

  const { design, spec } = system;
  const density = airDensity({
    altitude: design.altitude_m,
    temperature: design.temperature_k,
    relativeHumidity: design.relativeHumidity,
  });
  const viscosity = dynamicViscosity(design.temperature_k);

  const findings: FindingList = { findings: [] };
  const flows = addUpFlows(system, tree);
  const { airflow } = flows;
  const sections = chooseSections(system, airflow, sizingTables(system, { density, viscosity }), findings);
  const traits = readTraits(system, sections.section);
  const friction = findFriction(system, airflow, sections, traits, { density, viscosity });

  const joints = describeJoints(tree, course, airflow);
  const fittings = fittingColumns(tree.segmentCount, practice.source);
  findFittings({
    system,
    tree,
    course,
    airflow,
    sections,
    friction,
    joints,
    sums: sumJunctions(tree, joints, airflow, sections.area),
    practice,
    transitionForm: transitionForm(radians(spec.transitionAngle_rad)),
    diverges: system.service === "supply",
    findings,
    fittings,
  });
  const accessories = findAccessories(system, sections, friction, practice, findings);

  const losses = sumLosses(system, tree, course, friction, fittings, accessories);
  const leakage = findLeakage(system, sections, traits, course, friction, losses);
  const columns = { system, course, flows, sections, traits, friction, fittings, accessories, losses, leakage };
  checkDesign(columns, findings);
  const needs = findNeeds(system, tree, friction, losses);
  reportShort(system, tree, needs, findings);

  const requiredPressure = needs.required[needs.governing]!;
  const outletAirflow = totalAirflow(system, tree.outlets);
  const totalLeakage = totalOf(leakage);
  const sums = { requiredPressure, outletAirflow, leakage: totalLeakage };
  const fan = fanDuty(design, sums, tree, friction.velocityPressure);

  // Records cost as much as the physics, and most readers want few of them: written when they are first asked for.
  let segments: readonly SolvedSegment[] | null = null;
  let paths: readonly SolvedPath[] | null = null;
  let found: readonly Finding[] | null = null;
  return ok({
    systemId: system.id,
    air: { density_kg_m3: density, viscosity_pa_s: viscosity },
    get segments() {
      return (segments ??= writeSegments(columns, requiredPressure));
    },
    get paths() {
      return (paths ??= writePaths(columns, tree, needs, practice));
    },
    governingOutletNodeId: system.nodes[tree.outlets[needs.governing]!]!.id,
    requiredPressure_pa: pascals(requiredPressure),
    availablePressure_pa: design.availablePressure_pa,
    outletAirflow_m3s: cubicMetersPerSecond(outletAirflow),
    leakage_m3s: cubicMetersPerSecond(totalLeakage),
    fan,
    get findings() {
      if (found === null) {
        review({ columns, tree, needs, fan, findings });
        found = inOrder(findings);
      }
      return found;
    },
  });
}

function totalAirflow({ nodes }: AirSystem, outlets: readonly number[]): number {
  let total = 0;
  for (const n of outlets) total += nodes[n]!.airflow_m3s!;
  return total;
}

function totalOf(column: Float64Array): number {
  let total = 0;
  for (let i = 0; i < column.length; i++) total += column[i]!;
  return total;
}
