/** Takeoff, in units of the solve that it follows. */
import { createTakeoff, shippedStandards, solve, takeOff, type AirSystem, type Solution } from "@cleatwork/calc";
import { benchSystem } from "@cleatwork/calc/checks/many-segments";
import { median, type Figure } from "./figure.ts";

const WARM_UP = 12;
const ROUNDS = 31;

export function takeoffFigures(): readonly Figure[] {
  const system = benchSystem(5000);
  const standards = shippedStandards;
  const edited: AirSystem = {
    ...system,
    segments: system.segments.map((segment, s) => (s === 2500 ? { ...segment, name: "edited" } : segment)),
  };
  const states = [system, edited].map((state) => ({ state, solution: solved(state) }));
  const again = createTakeoff();
  const times: Record<"solve" | "takeoff" | "again", number[]> = { solve: [], takeoff: [], again: [] };
  for (let round = 0; round < WARM_UP + ROUNDS; round++) {
    const { state, solution } = states[round % 2]!;
    const took = {
      solve: timed(() => solved(state)),
      takeoff: timed(() => takeOff({ system: state, standards }, solution)),
      again: timed(() => again({ system: state, standards }, solution)),
    };
    if (round < WARM_UP) continue;
    for (const what of ["solve", "takeoff", "again"] as const) times[what].push(took[what]);
  }
  const [bare, whole, after] = [median(times.solve), median(times.takeoff), median(times.again)];
  const against = `against ${bare.toFixed(2)} ms`;
  return [
    {
      what: "takeoff of 5,000 segments ÷ their solve",
      figure: whole / bare,
      unit: "×",
      most: 1,
      note: `${whole.toFixed(2)} ms ${against}`,
    },
    {
      what: "takeoff again after one edit ÷ the same solve",
      figure: after / bare,
      unit: "×",
      most: 1,
      note: `${after.toFixed(2)} ms ${against}`,
    },
  ];
}

function solved(system: AirSystem): Solution {
  const answer = solve(system);
  if (!answer.ok) throw new Error("The timed system stopped being solvable");
  return answer.value;
}

function timed(work: () => unknown): number {
  const start = performance.now();
  work();
  return performance.now() - start;
}
