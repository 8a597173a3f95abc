/** Times `solve` against bare evaluations of the friction law it uses, in one run. No clock of its own: it is handed in. */
import type { AirSystem } from "../air-system.ts";
import { colebrookFrictionFactor } from "../friction/colebrook.ts";
import { solve } from "../network/solve.ts";
import { benchSystem } from "./many-segments.ts";

export interface SolveRatio {
  readonly segmentCount: number;
  readonly colebrook_ms: number;
  readonly solveTyped_ms: number;
  readonly solveByRule_ms: number;
  readonly typedOverColebrook: number;
  readonly byRuleOverColebrook: number;
}

/** Medians of `rounds` timings after `warmUp` untimed ones, the three kinds of work taking turns. */
export function measureSolveRatio(options: {
  segmentCount: number;
  warmUp: number;
  rounds: number;
  /** Milliseconds, such as `performance.now`. */
  now: () => number;
}): SolveRatio {
  const { segmentCount, warmUp, rounds, now } = options;
  const typed = benchSystem(segmentCount);
  const byRule: AirSystem = { ...typed, segments: typed.segments.map((segment) => ({ ...segment, section: null })) };
  const flows = frictionInputs(typed);

  const work = [() => evaluateBare(flows), () => solveOnce(typed), () => solveOnce(byRule)];
  const timings = work.map((): number[] => []);
  for (let round = 0; round < warmUp + rounds; round++) {
    work.forEach((task, index) => {
      const start = now();
      task();
      if (round >= warmUp) timings[index]!.push(now() - start);
    });
  }

  const [colebrook_ms = NaN, solveTyped_ms = NaN, solveByRule_ms = NaN] = timings.map(median);
  return {
    segmentCount,
    colebrook_ms,
    solveTyped_ms,
    solveByRule_ms,
    typedOverColebrook: solveTyped_ms / colebrook_ms,
    byRuleOverColebrook: solveByRule_ms / colebrook_ms,
  };
}

interface FrictionInputs {
  readonly reynoldsNumber: Float64Array;
  readonly relativeRoughness: Float64Array;
}

/** The very Reynolds numbers and roughnesses that the system has, so that both do the same friction work. */
function frictionInputs(system: AirSystem): FrictionInputs {
  const answer = solve(system);
  if (!answer.ok) throw new Error(`The system to be timed has problems: ${JSON.stringify(answer.problems[0])}`);
  const { segments } = answer.value;
  return {
    reynoldsNumber: Float64Array.from(segments, (segment) => segment.reynoldsNumber),
    relativeRoughness: Float64Array.from(segments, (segment) => 9.144e-5 / segment.hydraulicDiameter_m),
  };
}

function evaluateBare({ reynoldsNumber, relativeRoughness }: FrictionInputs): number {
  let sum = 0;
  for (let i = 0; i < reynoldsNumber.length; i++) {
    sum += colebrookFrictionFactor(reynoldsNumber[i]!, relativeRoughness[i]!).value;
  }
  return sum;
}

function solveOnce(system: AirSystem): number {
  const answer = solve(system);
  if (!answer.ok) throw new Error("The timed system stopped being solvable");
  return answer.value.requiredPressure_pa;
}

const median = (values: readonly number[]): number => [...values].sort((a, b) => a - b)[values.length >> 1] ?? NaN;
