import type { AirSystem } from "../air-system.ts";
import type { Joints } from "../fittings/joints.ts";
import type { JunctionSums } from "../fittings/junction-sums.ts";
import type { PracticeCoefficients } from "../fittings/practice.table.ts";
import type { TransitionForm } from "../fittings/transition.ts";
import type { Course } from "./course.ts";
import { addFinding, type FindingList } from "./findings.ts";
import { typeOfFitting, type FittingColumns } from "./fitting-columns.ts";
import type { Friction } from "./friction.ts";
import type { Sections } from "./sections.ts";
import type { Tree } from "./tree-shape.ts";

/** What is known of a system when its fittings are looked for, and where they are put. */
export interface FittingContext {
  readonly system: AirSystem;
  readonly tree: Tree;
  readonly course: Course;
  readonly airflow: Float64Array;
  readonly sections: Sections;
  readonly friction: Friction;
  readonly joints: Joints;
  readonly sums: JunctionSums;
  readonly practice: PracticeCoefficients;
  readonly transitionForm: TransitionForm;
  /** Supply air leaves the equipment and junctions diverge; else it comes in and they converge. */
  readonly diverges: boolean;
  readonly findings: FindingList;
  readonly fittings: FittingColumns;
}

/** The coefficient of the fitting at this place was read at the edge of its table. */
export function markOutOfTable(
  context: FittingContext,
  at: number,
  s: number,
  { value, limit, limitSource }: { value: number; limit: number; limitSource: string },
): void {
  context.fittings.isClamped[at] = 1;
  const subject = { kind: "segment", id: context.system.segments[s]!.id } as const;
  const fitting = typeOfFitting(context.fittings, at).replaceAll("-", " ");
  const measured = { value, limit, unit: "1", limitSource: `${fitting}: ${limitSource}` };
  addFinding(context.findings, s, "table-range-exceeded", subject, measured);
}
