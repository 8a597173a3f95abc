import {
  fixesFor,
  formatHours,
  formatMoneyChange,
  formatPressureChange,
  formatWeightChange,
  hours,
  kilograms,
  pascals,
  type Finding,
  type Fix,
} from "@cleatwork/calc";
import type { ChangeSet } from "@cleatwork/contracts";
import { applyFix, type TrialOutcome } from "@cleatwork/layout";
import { useMemo } from "react";
import { Button } from "../../ui/button.tsx";
import { notify } from "../../ui/toast.tsx";
import { useTrial, useWorkspace } from "../workspace/index.ts";
import { fixText } from "./fix-words.ts";

interface Offer {
  readonly fix: Fix;
  readonly text: string;
  readonly set: ChangeSet;
}

/** What can be done about a finding; each was tried, and says what it would change before it is done. */
export function FixList({ finding, systemId }: { finding: Finding; systemId: string }) {
  const { layout, numbers, solutionOf, units, numberOf, run } = useWorkspace();
  const system = numbers?.systems.find(({ id }) => id === systemId);
  const solution = solutionOf(systemId);
  const offers = useMemo((): readonly Offer[] => {
    if (!system || !solution) return [];
    return fixesFor(finding, system, solution).flatMap((fix) => {
      const text = fixText(fix, units, numberOf);
      const set = applyFix(layout, { fix, label: text });
      return set.ok ? [{ fix, text, set: set.value }] : [];
    });
  }, [finding, system, solution, layout, units, numberOf]);
  const outcomes = useTrial(useMemo(() => offers.map(({ set }) => set), [offers]));

  if (offers.length === 0)
    return (
      <p className="mt-1 text-help text-ink-2">Nothing near by helps. Change the route, the shape or the limit.</p>
    );
  return (
    <ul className="mt-1 grid gap-1" aria-label="Fixes">
      {offers.map(({ fix, text }, position) => (
        <li key={text} className="border border-line bg-sheet-hi p-2">
          <div className="flex items-start gap-2">
            <span className="font-[560] text-ink">
              {text}
              {!fix.clears && <span className="block text-help font-normal text-ink-3">helps, does not clear it</span>}
            </span>
            <Button
              size="small"
              rank="primary"
              className="ml-auto"
              aria-label={`Do it: ${text}`}
              onClick={() => {
                if (run((current) => applyFix(current, { fix, label: text })).ok) notify(`Done: ${text}.`);
              }}
            >
              Do it
            </Button>
          </div>
          <Cost outcome={outcomes[position] ?? null} systemId={systemId} />
        </li>
      ))}
    </ul>
  );
}

function Cost({ outcome, systemId }: { outcome: TrialOutcome | null; systemId: string }) {
  const { units, company } = useWorkspace();
  if (!outcome) return <p className="text-help text-ink-3">Computing what it changes…</p>;
  if (!outcome.ok) return <p className="text-help text-warn-ink">{outcome.reason}</p>;
  const { change } = outcome;
  const pressure = change.systems.find((each) => each.systemId === systemId)?.requiredPressure_pa ?? 0;
  const labor = change.shop_h + change.field_h;
  const figures = [
    ["Required pressure", formatPressureChange(pascals(pressure), units).text],
    ["Metal", formatWeightChange(kilograms(change.metal_kg), units).text],
    ["Hours", `${labor < 0 ? "−" : "+"}${formatHours(hours(Math.abs(labor)), units).text}`],
    [
      "Price",
      change.price_minor === null ? "no price yet" : formatMoneyChange(change.price_minor, company.currency).text,
    ],
  ] as const;
  return (
    <>
      <dl className="mt-1 grid grid-cols-4 gap-x-3 text-help max-md:grid-cols-2">
        {figures.map(([label, text]) => (
          <div key={label}>
            <dt className="text-ink-3">{label}</dt>
            <dd className="font-[560] text-ink tabular-nums">{text}</dd>
          </div>
        ))}
      </dl>
      {change.raised.length > 0 && (
        <p className="mt-1 text-help text-warn-ink">
          Brings {change.raised.length} other {change.raised.length === 1 ? "finding" : "findings"}.
        </p>
      )}
    </>
  );
}
