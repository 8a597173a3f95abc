/** Solving, in units of the friction law that it must evaluate once for every segment. */
import { measureSolveRatio, type SolveKind } from "@cleatwork/calc/checks/solve-ratio";
import type { Figure } from "./figure.ts";

const WHAT: Readonly<Record<SolveKind, string>> = {
  typed: "solve of 5,000 typed segments ÷ 5,000 Colebrook evaluations",
  allDifferent: "the same, no two floors alike",
  byRule: "the same, sized by the rule",
  written: "the same, every record of the answer written",
};

export function solveFigures(): readonly Figure[] {
  const ratio = measureSolveRatio({ segmentCount: 5000, warmUp: 60, rounds: 61, now: () => performance.now() });
  return (Object.keys(WHAT) as SolveKind[]).map((kind) => ({
    what: WHAT[kind],
    figure: ratio.overColebrook[kind],
    unit: "×",
    most: kind === "typed" ? 3 : null,
    note: `${ratio.undisturbed[kind].toFixed(1)}× for the fastest tenth; bare ${ratio.colebrook_ms.toFixed(2)} ms`,
  }));
}
