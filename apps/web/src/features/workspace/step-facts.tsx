import { formatMoney } from "@cleatwork/calc";
import type { ReactNode } from "react";
import type { ProjectStep } from "../../lib/paths.ts";
import { SeverityMark } from "../../ui/severity.tsx";
import { tallyFacts } from "./tally-facts.ts";
import { useWorkspace } from "./workspace-context.ts";

/** The one fact that stands under each step. */
export function useStepFacts(): Readonly<Partial<Record<ProjectStep, ReactNode>>> {
  const { index, numbers, company, project } = useWorkspace();
  const segments = [...index.segmentsOf.values()].reduce((sum, { length }) => sum + length, 0);
  const facts: Partial<Record<ProjectStep, ReactNode>> = {
    layout: `${segments} ${segments === 1 ? "segment" : "segments"}`,
    quote: project.state === "bidding" ? "not sent" : project.state,
    field: project.state === "won" ? "approved takeoff" : "after acceptance",
  };
  if (!numbers) return facts;
  const { findings } = tallyFacts(numbers);
  const pieces = numbers.takeoffs.reduce((sum, { totals }) => sum + totals.pieceCount, 0);
  return {
    ...facts,
    air:
      findings.stop > 0 ? (
        <>
          <SeverityMark severity="stop" size={11} /> {findings.stop} stop, {findings.warn} warn
        </>
      ) : findings.warn > 0 ? (
        <>
          <SeverityMark severity="warn" size={11} /> {findings.warn} warn
        </>
      ) : (
        "clear"
      ),
    takeoff: `${pieces} pieces`,
    price: numbers.estimate ? formatMoney(numbers.estimate.price_minor, company.currency).text : "no price yet",
  };
}
