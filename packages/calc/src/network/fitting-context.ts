import type { AirSystem } from "../air-system.ts";
import type { Joints } from "../fittings/joints.ts";
import type { JunctionSums } from "../fittings/junction-sums.ts";
import type { PracticeCoefficients } from "../fittings/practice.table.ts";
import type { TransitionForm } from "../fittings/transition.ts";
import type { Course } from "./course.ts";
import { addFinding, type FindingList } from "./findings.ts";
import type { FittingColumns } from "./fitting-columns.ts";
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

/** A coefficient was read at the edge of its table. */
export function markOutOfTable(
  context: FittingContext,
  s: number,
  measured: { value: number; limit: number; limitSource: string },
): void {
  const subject = { kind: "segment", id: context.system.segments[s]!.id } as const;
  addFinding(context.findings, s, "table-range-exceeded", subject, { ...measured, unit: "1" });
}
