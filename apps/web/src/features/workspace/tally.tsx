import {
  formatHours,
  formatMoney,
  formatMoneyChange,
  formatPressure,
  formatPressureChange,
  formatShare,
  formatWeight,
  formatWeightChange,
  hours,
  kilograms,
  pascals,
  signed,
} from "@cleatwork/calc";
import { useEffect, useMemo, useRef, useState, type ReactNode } from "react";
import { Figure } from "../../ui/figure.tsx";
import { SeverityText } from "../../ui/severity.tsx";
import { announce } from "../../ui/toast.tsx";
import { SaveMark } from "./save-mark.tsx";
import { tallyFacts, type TallyFacts } from "./tally-facts.ts";
import { useWorkspace } from "./workspace-context.ts";

/** Always in view: what an edit anywhere does to pressure, metal, hours and price. */
export function Tally() {
  const { numbers, units, company } = useWorkspace();
  const facts = useMemo(() => (numbers ? tallyFacts(numbers) : null), [numbers]);
  const change = useChange(facts);
  const { currency } = company;

  if (!facts) return <div className="h-[52px] shrink-0 border-b border-line-strong bg-recess" aria-busy="true" />;
  const short = facts.pressure !== null && facts.pressure.spare_pa < -0.5;
  return (
    <section
      aria-label="Tally"
      className="flex min-h-[52px] shrink-0 flex-wrap items-stretch border-b border-line-strong bg-recess print:hidden"
    >
      <Cell label={facts.pressure ? `Governing pressure, ${facts.pressure.tag}` : "Governing pressure"}>
        {facts.pressure ? (
          <>
            <strong className="text-tally font-[660]">{formatPressure(facts.pressure.required_pa, units).value}</strong>
            <span className="text-ink-2">of {formatPressure(facts.pressure.available_pa, units).text}</span>
            {short ? (
              <SeverityText severity="stop">
                short {formatPressure(pascals(0 - facts.pressure.spare_pa), units).value}
              </SeverityText>
            ) : (
              <SeverityText severity="good">spare {formatPressure(facts.pressure.spare_pa, units).value}</SeverityText>
            )}
            <Chip change={change?.pressure ?? 0}>{(value) => formatPressureChange(pascals(value), units).value}</Chip>
          </>
        ) : (
          <span className="text-ink-3">no system yet</span>
        )}
      </Cell>
      <Cell label="Metal">
        <Big {...formatWeight(facts.metal_kg, units)} />
        <Chip change={change?.metal ?? 0}>{(value) => formatWeightChange(kilograms(value), units).value}</Chip>
      </Cell>
      <Cell label="Hours, shop + field">
        <Big
          value={`${formatHours(facts.shop_h, units).value} + ${formatHours(facts.field_h, units).value}`}
          unit="h"
        />
        <Chip change={change?.hours ?? 0}>{(value) => signed(hours(value), 1)}</Chip>
      </Cell>
      <Cell label="Price">
        {facts.price_minor === null ? (
          <span className="text-ink-3">after the stops are mended</span>
        ) : (
          <>
            <Big {...formatMoney(facts.price_minor, currency)} />
            {facts.margin_bp !== null && <span className="text-ink-2">{formatShare(facts.margin_bp).text} margin</span>}
            <Chip change={change?.price ?? 0}>{(value) => formatMoneyChange(value, currency).value}</Chip>
          </>
        )}
      </Cell>
      <Cell label="Findings">
        {facts.findings.stop > 0 && <SeverityText severity="stop">{facts.findings.stop} stop</SeverityText>}
        {facts.findings.warn > 0 && <SeverityText severity="warn">{facts.findings.warn} warn</SeverityText>}
        {facts.findings.note > 0 && <SeverityText severity="note">{facts.findings.note} note</SeverityText>}
        {facts.findings.stop + facts.findings.warn + facts.findings.note === 0 && (
          <SeverityText severity="good">clear</SeverityText>
        )}
      </Cell>
      <div className="ml-auto">
        <SaveMark />
      </div>
    </section>
  );
}

const Cell = ({ label, children }: { label: string; children: ReactNode }) => (
  <div className="min-w-0 border-r border-line px-4 py-1.5">
    <div className="label-width text-label text-ink-3">{label}</div>
    <div className="flex flex-wrap items-center gap-x-2">{children}</div>
  </div>
);

const Big = ({ value, unit }: { value: string; unit: string }) => (
  <Figure className="text-tally font-[660]" value={value} unit={unit} />
);

/** What the last edit did; goes by itself after two seconds. */
function Chip({ change, children }: { change: number; children: (value: number) => string }) {
  if (change === 0) return null;
  return (
    <span
      className="label-width border border-line-strong bg-sheet-hi px-1 text-help font-semibold"
      data-testid="tally-change"
    >
      {children(change)}
    </span>
  );
}

interface Change {
  readonly pressure: number;
  readonly metal: number;
  readonly hours: number;
  readonly price: number;
}

const SHOWN_MS = 4000;

function useChange(facts: TallyFacts | null): Change | null {
  const before = useRef<TallyFacts | null>(null);
  const [change, setChange] = useState<Change | null>(null);
  useEffect(() => {
    const last = before.current;
    before.current = facts;
    if (!last || !facts) return;
    const made: Change = {
      pressure: rounded((facts.pressure?.required_pa ?? 0) - (last.pressure?.required_pa ?? 0), 0.1),
      metal: rounded(facts.metal_kg - last.metal_kg, 0.01),
      hours: rounded(facts.shop_h + facts.field_h - last.shop_h - last.field_h, 0.01),
      price: facts.price_minor === null || last.price_minor === null ? 0 : facts.price_minor - last.price_minor,
    };
    if (Object.values(made).every((value) => value === 0)) return;
    setChange(made);
    announce(wordsOf(facts));
    const timer = setTimeout(() => setChange(null), SHOWN_MS);
    return () => clearTimeout(timer);
  }, [facts]);
  return change;
}

const rounded = (value: number, least: number) => (Math.abs(value) < least ? 0 : value);

const wordsOf = ({ price_minor, findings }: TallyFacts) =>
  `${price_minor === null ? "No price" : `Price ${(price_minor / 100).toFixed(2)}`}, ${findings.stop} stops, ${findings.warn} warnings`;
