import { decimal, marginFromMarkup, parseNumber, type PricingRates } from "@cleatwork/calc";
import type { PricingSettings, ProjectPricing } from "@cleatwork/contracts";
import { useState } from "react";
import { Button } from "../../ui/button.tsx";
import { TextField } from "../../ui/controls.tsx";
import { Panel, PanelBody, PanelHead } from "../../ui/panel.tsx";

const RATES: readonly { readonly key: keyof PricingRates; readonly label: string }[] = [
  { key: "wasteOnMetal_bp", label: "Waste on metal" },
  { key: "tax_bp", label: "Sales tax" },
  { key: "overhead_bp", label: "Overhead" },
  { key: "contingency_bp", label: "Contingency" },
  { key: "profit_bp", label: "Profit, markup" },
  { key: "bond_bp", label: "Bond, of the price" },
];

/** Percentages of this project; the company's until it has its own. */
export function RatesPanel({
  settings,
  pricing,
  mayEdit,
  busy,
  onSave,
}: {
  settings: PricingSettings;
  pricing: ProjectPricing;
  mayEdit: boolean;
  busy: boolean;
  onSave: (pricing: ProjectPricing) => void;
}) {
  const inForce = pricing.rates ?? settings.rates;
  const [typed, setTyped] = useState<Partial<Record<keyof PricingRates, string>>>({});
  const read = (key: keyof PricingRates): number | null => {
    const text = typed[key];
    if (text === undefined) return inForce[key];
    const value = parseNumber(text.replace("%", ""));
    return value === null || value < 0 || value > 1000 ? null : Math.round(value * 100);
  };
  const changed = Object.keys(typed).length > 0;
  const profit = read("profit_bp") ?? inForce.profit_bp;
  return (
    <Panel label="Percentages">
      <PanelHead title="Percentages" fact={pricing.rates ? "this project’s own" : "the company’s"}>
        {pricing.rates && mayEdit && (
          <Button size="small" busy={busy} onClick={() => onSave({ ...pricing, rates: null })}>
            Back to the company’s
          </Button>
        )}
      </PanelHead>
      <PanelBody>
        <form
          className="grid grid-cols-2 gap-3"
          onSubmit={(event) => {
            event.preventDefault();
            const next = RATES.map(({ key }) => [key, read(key)] as const);
            if (next.some(([, value]) => value === null)) return;
            onSave({ ...pricing, rates: Object.fromEntries(next) as unknown as PricingRates });
            setTyped({});
          }}
        >
          {RATES.map(({ key, label }) => (
            <TextField
              key={key}
              label={label}
              unit="%"
              inputMode="decimal"
              disabled={!mayEdit}
              value={typed[key] ?? decimal(inForce[key] / 100, inForce[key] % 10 === 0 ? 1 : 2)}
              error={read(key) === null ? `“${typed[key] ?? ""}”: a percentage of 0 or more.` : undefined}
              hint={
                key === "profit_bp"
                  ? `a margin of ${decimal(marginFromMarkup(profit) / 100, 1)} %, before bond`
                  : undefined
              }
              onChange={(event) => setTyped({ ...typed, [key]: event.target.value })}
            />
          ))}
          {changed && (
            <div className="col-span-2 flex justify-end gap-2">
              <Button onClick={() => setTyped({})}>Leave it</Button>
              <Button rank="primary" type="submit" busy={busy}>
                Use these here
              </Button>
            </div>
          )}
        </form>
      </PanelBody>
    </Panel>
  );
}
