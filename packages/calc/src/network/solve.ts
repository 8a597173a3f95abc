/** The air stage: a layout with its conditions in, flows, sizes, losses, paths and findings out. */
import type { AirSystem } from "../air-system.ts";
import { airDensity } from "../air/density.ts";
import { dynamicViscosity } from "../air/viscosity.ts";
import { describeJoints } from "../fittings/joints.ts";
import { sumJunctions } from "../fittings/junction-sums.ts";
import { shippedPractice, type PracticeCoefficients } from "../fittings/practice.table.ts";
import { transitionForm } from "../fittings/transition.ts";
import {
  cubicMetersPerSecond,
  pascals,
  radians,
  type KilogramsPerCubicMeter,
  type PascalSeconds,
} from "../quantity.ts";
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
import { findNeeds, reportShort, writePaths, type OutletNeeds } from "./paths.ts";
import { chooseSections } from "./sections.ts";
import type { Solution, SystemProblem } from "./solution.ts";
import { readTraits } from "./traits.ts";
import { buildTree, type Tree } from "./tree.ts";
import { writeSegments, type SolvedColumns } from "./write-segments.ts";

/**
 * Flows, sizes, pressure losses, paths and findings of a system, or every reason why it has none.
 *
 * Segments carry the air of the outlets beyond them. Leakage is told beside it and added to what the equipment moves; it
 * does not change the flow in a segment. Total pressure is accounted throughout, friction on the hydraulic diameter.
 *
 * The answer is plain data, also for JSON and structured clones, though most of it is made on first reading.
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
  const needs = findNeeds(system, tree, friction, losses);
  const columns = { system, course, flows, sections, traits, friction, fittings, accessories, losses };
  return ok(solutionOf({ columns, tree, needs, findings, practice, air: { density, viscosity } }));
}

interface Solved {
  readonly columns: SolvedColumns;
  readonly tree: Tree;
  readonly needs: OutletNeeds;
  /** What was marked on the way; the review adds to it. */
  readonly findings: FindingList;
  readonly practice: PracticeCoefficients;
  readonly air: { readonly density: KilogramsPerCubicMeter; readonly viscosity: PascalSeconds };
}

/**
 * The answer. What follows from the solved columns and changes nothing else (records, leakage, the fan's duty, findings) is
 * computed when it is first read, and kept: together it costs more than the rest, and most readers want little of it.
 */
function solutionOf({ columns, tree, needs, findings, practice, air }: Solved): Solution {
  const { system, friction } = columns;
  const { design } = system;
  const requiredPressure = needs.required[needs.governing]!;
  const outletAirflow = totalAirflow(system, tree.outlets);
  const leakage = once(() => findLeakage(columns));
  const fan = once(() => {
    const sums = { requiredPressure, outletAirflow, leakage: totalOf(leakage()) };
    return fanDuty(design, sums, tree, friction.velocityPressure);
  });
  const segments = once(() => writeSegments(columns, leakage(), requiredPressure));
  const paths = once(() => writePaths(columns, tree, needs, practice));
  const found = once(() => {
    checkDesign(columns, findings);
    reportShort(system, tree, needs, findings);
    review({ columns, tree, needs, fan: fan(), findings });
    return inOrder(findings);
  });
  return {
    systemId: system.id,
    air: { density_kg_m3: air.density, viscosity_pa_s: air.viscosity },
    get segments() {
      return segments();
    },
    get paths() {
      return paths();
    },
    governingOutletNodeId: system.nodes[tree.outlets[needs.governing]!]!.id,
    requiredPressure_pa: pascals(requiredPressure),
    availablePressure_pa: design.availablePressure_pa,
    outletAirflow_m3s: cubicMetersPerSecond(outletAirflow),
    get leakage_m3s() {
      return cubicMetersPerSecond(totalOf(leakage()));
    },
    get fan() {
      return fan();
    },
    get findings() {
      return found();
    },
  };
}

function once<T>(make: () => T): () => T {
  let made: { readonly value: T } | null = null;
  return () => (made ??= { value: make() }).value;
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
