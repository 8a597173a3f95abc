/** The checks of one node's own values: place, role, what an outlet asks for. */
import type { AirNode } from "../air-system.ts";
import { nodeSubject, problem } from "./problems.ts";
import { isIn, ranges } from "./ranges.table.ts";
import type { SystemProblem } from "./solution.ts";

/** Everything in order, cheaply: the long answer is made only when it is needed. */
export const isNodeSound = (node: AirNode): boolean =>
  isIn(ranges.position, node.x_m) &&
  isIn(ranges.position, node.y_m) &&
  isIn(ranges.position, node.elevation_m) &&
  (node.role === "outlet"
    ? node.airflow_m3s !== null &&
      isIn(ranges.airflow, node.airflow_m3s) &&
      (node.requiredPressure_pa === null || isIn(ranges.outletPressure, node.requiredPressure_pa))
    : node.role === "junction" || node.role === "equipment");

/** Every problem of a node that is not sound. */
export function problemsOfNode(node: AirNode): SystemProblem[] {
  const problems: SystemProblem[] = [];
  const subject = nodeSubject(node);
  for (const field of ["x_m", "y_m", "elevation_m"] as const) {
    if (!isIn(ranges.position, node[field])) {
      problems.push(problem("value-out-of-range", subject, field, node[field], ranges.position.words));
    }
  }
  if (node.role !== "outlet") {
    if (node.role !== "junction" && node.role !== "equipment") {
      problems.push(problem("value-out-of-range", subject, "role", node.role, "equipment, junction or outlet"));
    }
    return problems;
  }
  const { airflow_m3s: airflow, requiredPressure_pa: required } = node;
  if (airflow === null || airflow === 0) {
    problems.push(problem("outlet-without-airflow", subject, "airflow_m3s", airflow, ranges.airflow.words));
  } else if (!isIn(ranges.airflow, airflow)) {
    problems.push(problem("value-out-of-range", subject, "airflow_m3s", airflow, ranges.airflow.words));
  }
  if (required !== null && !isIn(ranges.outletPressure, required)) {
    const { words } = ranges.outletPressure;
    problems.push(problem("value-out-of-range", subject, "requiredPressure_pa", required, words));
  }
  return problems;
}
