/** Solving, in units of the friction law that it must evaluate once for every segment. */
import { measureSolveRatio } from "@cleatwork/calc/checks/solve-ratio";
import type { Figure } from "./figure.ts";

export function solveFigures(): readonly Figure[] {
  const ratio = measureSolveRatio({ segmentCount: 5000, warmUp: 20, rounds: 41, now: () => performance.now() });
  const bare = `against ${ratio.colebrook_ms.toFixed(2)} ms bare`;
  return [
    {
      what: "solve of 5,000 typed segments ÷ 5,000 Colebrook evaluations",
      figure: ratio.typedOverColebrook,
      unit: "×",
      most: 3,
      note: `${ratio.solveTyped_ms.toFixed(2)} ms ${bare}`,
    },
    {
      what: "solve of 5,000 segments sized by the rule ÷ the same",
      figure: ratio.byRuleOverColebrook,
      unit: "×",
      most: 3,
      note: `${ratio.solveByRule_ms.toFixed(2)} ms ${bare}`,
    },
  ];
}
