/** Times `solve` against bare evaluations of the friction law it uses, in one run. No clock of its own: it is handed in. */
import type { AirSystem } from "../air-system.ts";
import { colebrookFrictionFactor } from "../friction/colebrook.ts";
import { solve } from "../network/solve.ts";
import { benchSystem } from "./many-segments.ts";

export interface SolveRatio {
  readonly segmentCount: number;
  /** Medians. */
  readonly colebrook_ms: number;
  readonly solveTyped_ms: number;
  readonly solveByRule_ms: number;
  readonly typedOverColebrook: number;
  readonly byRuleOverColebrook: number;
  /** The same ratios of the fastest tenth of each: what is left when the machine has other work to do. */
  readonly undisturbed: { readonly typedOverColebrook: number; readonly byRuleOverColebrook: number };
}

interface Turns {
  readonly segmentCount: number;
  /** Untimed turns first, so that the engine has compiled what it times. */
  readonly warmUp: number;
  readonly rounds: number;
  /** Milliseconds, such as `performance.now`. */
  readonly now: () => number;
}

export function measureSolveRatio(turns: Turns): SolveRatio {
  const typed = takeTurns(benchSystem(turns.segmentCount, "typed"), turns);
  const byRule = takeTurns(benchSystem(turns.segmentCount, "by-rule"), turns);
  return {
    segmentCount: turns.segmentCount,
    colebrook_ms: quantile(typed.bare, 0.5),
    solveTyped_ms: quantile(typed.solving, 0.5),
    solveByRule_ms: quantile(byRule.solving, 0.5),
    typedOverColebrook: ratioAt(0.5, typed),
    byRuleOverColebrook: ratioAt(0.5, byRule),
    undisturbed: { typedOverColebrook: ratioAt(0.1, typed), byRuleOverColebrook: ratioAt(0.1, byRule) },
  };
}

interface Timings {
  readonly bare: readonly number[];
  readonly solving: readonly number[];
}

/** Bare evaluations and a solve of the same system, one after the other, again and again. */
function takeTurns(system: AirSystem, { warmUp, rounds, now }: Turns): Timings {
  const inputs = frictionInputs(system);
  const bare: number[] = [];
  const solving: number[] = [];
  for (let round = 0; round < warmUp + rounds; round++) {
    const start = now();
    evaluateBare(inputs);
    const between = now();
    solveOnce(system);
    const end = now();
    if (round < warmUp) continue;
    bare.push(between - start);
    solving.push(end - between);
  }
  return { bare, solving };
}

const ratioAt = (share: number, { bare, solving }: Timings): number => quantile(solving, share) / quantile(bare, share);

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

const quantile = (values: readonly number[], share: number): number =>
  [...values].sort((a, b) => a - b)[Math.floor(values.length * share)] ?? NaN;
