import type { AirSystem } from "../air-system.ts";
import type { Finding, Solution, SolvedSegment, SystemProblem } from "../network/solution.ts";
import { solve } from "../network/solve.ts";

export function solved(system: AirSystem): Solution {
  const answer = solve(system);
  if (!answer.ok) throw new Error(`not solved: ${JSON.stringify(answer.problems)}`);
  return answer.value;
}

export function refused(system: AirSystem): readonly SystemProblem[] {
  const answer = solve(system);
  if (answer.ok) throw new Error("solved, though it should be refused");
  return answer.problems;
}

export function segmentOf(solution: Solution, id: string): SolvedSegment {
  const segment = solution.segments.find(({ segmentId }) => segmentId === id);
  if (!segment) throw new Error(`no segment ${id}`);
  return segment;
}

export const fittingTypes = (solution: Solution, id: string): readonly string[] =>
  segmentOf(solution, id).fittings.map(({ type }) => type);

export const findingIds = ({ findings }: { findings: readonly Finding[] }): readonly string[] =>
  findings.map(({ id }) => id);
