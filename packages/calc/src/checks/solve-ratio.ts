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
  readonly overColebrook: Readonly<Record<SolveKind, number>>;
  /** The same ratios of the fastest tenth of each: what is left when the machine has other work to do. */
  readonly undisturbed: Readonly<Record<SolveKind, number>>;
}

/** Sizes typed, floors alike; no two floors alike; sizes by the rule; and typed with every record of the answer written. */
const KINDS = ["typed", "allDifferent", "byRule", "written"] as const;
export type SolveKind = (typeof KINDS)[number];

interface Turns {
  readonly segmentCount: number;
  /** Untimed turns first, so that the engine has compiled what it times. */
  readonly warmUp: number;
  readonly rounds: number;
  /** Milliseconds, such as `performance.now`. */
  readonly now: () => number;
}

export function measureSolveRatio(turns: Turns): SolveRatio {
  const { segmentCount } = turns;
  const timings: Record<SolveKind, Timings> = {
    typed: takeTurns(benchSystem(segmentCount), turns, solveOnce),
    allDifferent: takeTurns(benchSystem(segmentCount, "typed", "all-different"), turns, solveOnce),
    byRule: takeTurns(benchSystem(segmentCount, "by-rule"), turns, solveOnce),
    written: takeTurns(benchSystem(segmentCount), turns, solveAndWrite),
  };
  const ratiosAt = (share: number) =>
    Object.fromEntries(KINDS.map((kind) => [kind, ratioAt(share, timings[kind])])) as Record<SolveKind, number>;
  return {
    segmentCount,
    colebrook_ms: quantile(timings.typed.bare, 0.5),
    solveTyped_ms: quantile(timings.typed.solving, 0.5),
    overColebrook: ratiosAt(0.5),
    undisturbed: ratiosAt(0.1),
  };
}

interface Timings {
  readonly bare: readonly number[];
  readonly solving: readonly number[];
}

/** Bare evaluations and a solve of the same system, one after the other, again and again. */
function takeTurns(system: AirSystem, { warmUp, rounds, now }: Turns, work: (system: AirSystem) => number): Timings {
  const inputs = frictionInputs(system);
  const bare: number[] = [];
  const solving: number[] = [];
  for (let round = 0; round < warmUp + rounds; round++) {
    const start = now();
    evaluateBare(inputs);
    const between = now();
    work(system);
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

function solveAndWrite(system: AirSystem): number {
  const answer = solve(system);
  if (!answer.ok) throw new Error("The timed system stopped being solvable");
  const { segments, paths, findings, fan } = answer.value;
  return segments.length + paths.length + findings.length + fan.airflow_m3s;
}

const quantile = (values: readonly number[], share: number): number =>
  [...values].sort((a, b) => a - b)[Math.floor(values.length * share)] ?? NaN;
