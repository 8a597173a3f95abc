/** The solved system as a shop sees it: sheet-metal sizes, and how each segment leaves the one before. */
import type { AirSystem, Insulation, Section, SheetReference } from "../air-system.ts";
import { describeJoints, type Joints } from "../fittings/joints.ts";
import { clearSection, insulationOf } from "../network/clear-section.ts";
import { layCourse, type Course } from "../network/course.ts";
import type { Solution, SystemProblem } from "../network/solution.ts";
import { buildTree } from "../network/tree.ts";
import { meters } from "../quantity.ts";
import { gaugeReader } from "./gauge.ts";
import { markNumbers } from "./marks.ts";
import { hoursReader } from "./productivity.ts";
import type { ShopStandards } from "./takeoff.ts";

export interface Frame {
  readonly system: AirSystem;
  readonly solution: Solution;
  readonly standards: ShopStandards;
  readonly tree: ReturnType<typeof buildTree>;
  readonly course: Course;
  readonly joints: Joints;
  /** Outside of the liner; what is cut. */
  readonly metal: readonly Section[];
  readonly insulation: readonly Insulation[];
  /** By segment: what its marks begin with. */
  readonly numbers: readonly number[];
  readonly sheetOfLevel: ReadonlyMap<string, SheetReference | null>;
  /** Of the system's metal and pressure class. */
  readonly readGauge: ReturnType<typeof gaugeReader>;
  readonly readHours: ReturnType<typeof hoursReader>;
}

export function frameOf(system: AirSystem, solution: Solution, standards: ShopStandards): Frame {
  const problems: SystemProblem[] = [];
  const tree = buildTree(system, problems);
  const course = layCourse(system, tree, problems);
  const isItsOwn =
    solution.segments.length === system.segments.length &&
    system.segments.every(({ id }, s) => solution.segments[s]!.segmentId === id);
  if (problems.length > 0 || !isItsOwn) {
    throw new Error("take off got a system that its solution was not made from");
  }
  const airflow = Float64Array.from(solution.segments, ({ volumetricFlowRate_m3s }) => volumetricFlowRate_m3s);
  const insulation = system.segments.map((segment) => insulationOf(segment, system.spec));
  return {
    system,
    solution,
    standards,
    tree,
    course,
    joints: describeJoints(tree, course, airflow),
    metal: solution.segments.map(({ section }, s) =>
      metalSection(section, system.segments[s]!.flexible ? { kind: "none" } : insulation[s]!),
    ),
    insulation,
    numbers: markNumbers(system.segments),
    sheetOfLevel: new Map(system.levels.map(({ id, sheet }) => [id, sheet ?? null])),
    readGauge: gaugeReader({ company: standards.companyGauges, shipped: standards.gauges }, system.spec),
    readHours: hoursReader(standards.productivity),
  };
}

/** Drawing sizes may be clear or metal; what is solved is always clear, so the liner comes back on here. */
export const metalSection = (clear: Section, insulation: Insulation): Section =>
  insulation.kind === "liner" ? clearSection(clear, meters(-1 * insulation.thickness_m)) : clear;

/** A bend up or down turns in the height of the duct, any other in its width. */
export const isSteep = ({ course }: Frame, s: number): boolean => Math.abs(course.direction[3 * s + 2]!) > 0.5;

/** The segment that feeds this one; null at the equipment. */
export function segmentBefore({ tree }: Frame, s: number): number | null {
  const before = tree.into[tree.from[s]!]!;
  return before < 0 ? null : before;
}
