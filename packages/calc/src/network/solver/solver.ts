/** A system that stays solved while it is edited: an edit computes again only what it touches. */
import type { AirSegment, AirSystem } from "../../air-system.ts";
import { shippedPractice, type PracticeCoefficients } from "../../fittings/practice.table.ts";
import { pascals, type CubicMetersPerSecond, type Pascals } from "../../quantity.ts";
import { ok, type Result } from "../../result.ts";
import type { Solution, SystemProblem } from "../solution.ts";
import { solve } from "../solve.ts";
import { placeOfMost, valueAt } from "./most-of-range.ts";
import { aroundPath, aroundSegment } from "./neighborhood.ts";
import { loadState, update, type SolverState } from "./solver-state.ts";

export interface Solver {
  /** As edited so far. */
  readonly system: () => AirSystem;
  readonly requiredPressure_pa: () => Pascals;
  readonly governingOutletNodeId: () => string;
  /** What the path to this outlet needs, with the outlet's own pressure. */
  readonly requiredAt_pa: (outletNodeId: string) => Pascals;
  /** Everything, solved from the start unless nothing was edited since it was last asked for. */
  readonly solution: () => Solution;
  /** Puts this in place of the segment with the same id. Nothing has changed where the answer is problems. */
  readonly replaceSegment: (segment: AirSegment) => Result<null, SystemProblem>;
  readonly setAirflow: (outletNodeId: string, airflow: CubicMetersPerSecond) => Result<null, SystemProblem>;
}

/** These choose a section by the segment's own flow. Under a rule that looks at neighbors, every edit is a cold solve. */
const LOCAL_SIZING: ReadonlySet<string> = new Set<string>(["equal-friction", "velocity"]);

/**
 * Solves once, and keeps what edits need.
 *
 * A segment's edit solves the few segments around it as a small system of their own, with the same code; what its losses
 * change is added to all outlets beyond at once, in O(log n). An outlet's airflow does the same along its path to the
 * equipment. An edit that ties a segment to other nodes solves anew.
 *
 * Sums drift in their last digits from edit to edit; `solution` begins from the start again.
 */
export function createSolver(
  system: AirSystem,
  practice: PracticeCoefficients = shippedPractice,
): Result<Solver, SystemProblem> {
  const loaded = loadState(system, practice);
  if (!loaded.ok) return loaded;
  let state = loaded.value;

  const solveAnew = (changed: AirSystem): Result<null, SystemProblem> => {
    const again = loadState(changed, practice);
    if (!again.ok) return again;
    state = again.value;
    return ok(null);
  };
  const replaceSegment = (segment: AirSegment): Result<null, SystemProblem> => {
    const s = state.segmentAt.get(segment.id);
    if (s === undefined) throw new Error(`there is no segment ${segment.id}`);
    const { segments, sizing } = state.system;
    const old = segments[s]!;
    const staysInPlace = old.fromNodeId === segment.fromNodeId && old.toNodeId === segment.toNodeId;
    if (!staysInPlace || !LOCAL_SIZING.has(sizing.method)) {
      return solveAnew({ ...state.system, segments: segments.with(s, segment) });
    }
    segments[s] = segment;
    const answer = update(state, aroundSegment(state.system, state.tree, state.airflow, s), practice);
    if (!answer.ok) segments[s] = old;
    return answer;
  };
  const setAirflow = (outletNodeId: string, airflow: CubicMetersPerSecond): Result<null, SystemProblem> => {
    const last = lastSegment(state, outletNodeId);
    const { nodes, sizing } = state.system;
    const n = state.tree.to[last]!;
    const old = nodes[n]!;
    const node = { ...old, airflow_m3s: airflow };
    if (!LOCAL_SIZING.has(sizing.method)) return solveAnew({ ...state.system, nodes: nodes.with(n, node) });
    nodes[n] = node;
    const answer = update(state, aroundPath(state.system, state.tree, state.airflow, last), practice);
    if (!answer.ok) nodes[n] = old;
    return answer;
  };

  return ok({
    system: () => ({ ...state.system, nodes: [...state.system.nodes], segments: [...state.system.segments] }),
    requiredPressure_pa: () => pascals(valueAt(state.required, placeOfMost(state.required))),
    governingOutletNodeId: () => state.system.nodes[state.outletNode[placeOfMost(state.required)]!]!.id,
    requiredAt_pa: (outletNodeId) =>
      pascals(valueAt(state.required, state.firstOutlet[lastSegment(state, outletNodeId)]!)),
    solution: () => (state.solution ??= solvedAnew(state.system, practice)),
    replaceSegment,
    setAirflow,
  });
}

function lastSegment({ nodeAt, system, tree }: SolverState, outletNodeId: string): number {
  const n = nodeAt.get(outletNodeId);
  if (n === undefined || system.nodes[n]!.role !== "outlet") throw new Error(`there is no outlet ${outletNodeId}`);
  return tree.into[n]!;
}

function solvedAnew(system: AirSystem, practice: PracticeCoefficients): Solution {
  // The lists of the state go on changing, and an answer writes its records from them later.
  const answer = solve({ ...system, nodes: [...system.nodes], segments: [...system.segments] }, practice);
  if (!answer.ok) throw new Error("every edit was solved in its neighborhood, but the whole is not");
  return answer.value;
}
