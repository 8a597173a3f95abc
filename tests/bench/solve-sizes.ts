/** Cold solves of growing systems, one edit in a solved one, and the same tree in a general network solver. */
import { meters, type AirSystem, type Solution } from "@cleatwork/calc";
import { benchSystem } from "@cleatwork/calc/checks/many-segments";
import { solve } from "@cleatwork/calc/network/solve";
import { createSolver } from "@cleatwork/calc/network/solver/solver";
import { cubicMetersPerSecond } from "@cleatwork/calc/quantity";
import { median, type Figure } from "./figure.ts";
import { timeGeneralSolver } from "./general-solver.ts";

const SIZES = [1_000, 5_000, 20_000, 100_000] as const;
/** Enough of each that the engine has compiled what is timed. */
const SEGMENTS_TIMED = 200_000;
const EDITS = 200;
const GENERAL_ROUNDS = 5;

interface Timed {
  readonly size: number;
  readonly cold_ms: number;
  readonly segmentEdit_ms: number;
  readonly airflowEdit_ms: number;
}

export async function solveSizeFigures(): Promise<readonly Figure[]> {
  solvesOf(benchSystem(1_000), 100);
  const timed = SIZES.map((size): Timed => {
    const system = benchSystem(size);
    return { size, cold_ms: median(solvesOf(system, rounds(size))), ...editsOf(system) };
  });
  const [smallest] = timed;
  if (!smallest) throw new Error("no size was timed");

  const figures: Figure[] = [];
  for (const each of timed) {
    figures.push({
      what: `solve of ${each.size.toLocaleString("en-US")} segments, a segment ÷ a segment of 1,000`,
      figure: each.cold_ms / each.size / (smallest.cold_ms / smallest.size),
      unit: "×",
      most: null,
      note: `${each.cold_ms.toFixed(2)} ms`,
    });
  }
  for (const each of timed) {
    figures.push({
      what: `one segment edited in ${each.size.toLocaleString("en-US")} ÷ a cold solve`,
      figure: each.segmentEdit_ms / each.cold_ms,
      unit: "×",
      most: each.size >= 5_000 ? 1 / 50 : null,
      note: `${each.segmentEdit_ms.toFixed(3)} ms; an outlet's airflow ${(each.airflowEdit_ms / each.cold_ms).toPrecision(2)}×`,
    });
  }
  figures.push(await generalSolverFigure(5_000));
  return figures;
}

const rounds = (size: number): number => Math.max(5, Math.round(SEGMENTS_TIMED / size));

function solvesOf(system: AirSystem, count: number): number[] {
  return Array.from({ length: count }, () => {
    const start = performance.now();
    solutionOf(system);
    return performance.now() - start;
  });
}

function solutionOf(system: AirSystem): Solution {
  const answer = solve(system);
  if (!answer.ok) throw new Error("the timed system has problems");
  return answer.value;
}

/** Edits all over the system, each followed by reading the pressure that it now requires. */
function editsOf(system: AirSystem): Pick<Timed, "segmentEdit_ms" | "airflowEdit_ms"> {
  const answer = createSolver(system);
  if (!answer.ok) throw new Error("the timed system has problems");
  const solver = answer.value;
  const { segments } = system;
  const outlets = system.nodes.filter(({ role }) => role === "outlet");
  const time = (edit: () => void): number => {
    const start = performance.now();
    edit();
    solver.requiredPressure_pa();
    return performance.now() - start;
  };

  const segmentEdits: number[] = [];
  const airflowEdits: number[] = [];
  for (let turn = 0; turn < EDITS; turn++) {
    const segment = segments[(turn * 7919) % segments.length];
    const outlet = outlets[(turn * 7919) % outlets.length];
    if (!segment || !outlet) throw new Error("the timed system is empty");
    segmentEdits.push(time(() => solver.replaceSegment({ ...segment, length_m: meters(2 + (turn % 5)) })));
    airflowEdits.push(time(() => solver.setAirflow(outlet.id, cubicMetersPerSecond(0.06 + 0.001 * (turn % 9)))));
  }
  const warm = EDITS / 4;
  return { segmentEdit_ms: median(segmentEdits.slice(warm)), airflowEdit_ms: median(airflowEdits.slice(warm)) };
}

async function generalSolverFigure(size: number): Promise<Figure> {
  const system = benchSystem(size);
  const ours = Math.min(...solvesOf(system, rounds(size)));
  const theirs = await timeGeneralSolver(system, solutionOf(system), {
    rounds: GENERAL_ROUNDS,
    now: () => performance.now(),
  });
  const alone = (theirs.solving_ms / ours).toPrecision(2);
  return {
    what: `the same ${size.toLocaleString("en-US")} in a general network solver, read and solved ÷ our solve`,
    figure: theirs.readingAndSolving_ms / ours,
    unit: "×",
    most: null,
    least: 50,
    note: `its equations alone, already read and ordered: ${alone}×; fastest of each`,
  };
}
