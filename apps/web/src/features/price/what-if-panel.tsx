import {
  NO_CHANGE,
  applyWhatIf,
  formatMoney,
  formatMoneyChange,
  formatShare,
  price,
  profitAtPrice,
  signed,
  type PricingBasis,
  type Takeoff,
  type WhatIf,
} from "@cleatwork/calc";
import { useMemo, useState } from "react";
import { Button } from "../../ui/button.tsx";
import { Panel, PanelBody, PanelHead } from "../../ui/panel.tsx";
import { SeverityText } from "../../ui/severity.tsx";

const SLIDERS = [
  { key: "metalPrice_bp", label: "Metal price" },
  { key: "fieldHours_bp", label: "Field hours" },
  { key: "wages_bp", label: "Wages" },
] as const;

/** What if metal rises, or the hours run over? Nothing here is saved. */
export function WhatIfPanel({ takeoffs, basis }: { takeoffs: readonly Takeoff[]; basis: PricingBasis }) {
  const [change, setChange] = useState<WhatIf>(NO_CHANGE);
  const base = useMemo(() => price(takeoffs, basis), [takeoffs, basis]);
  const would = useMemo(() => {
    const input = applyWhatIf({ takeoffs, basis }, change);
    return price(input.takeoffs, input.basis);
  }, [takeoffs, basis, change]);
  const { margin_bp: heldMargin_bp } = profitAtPrice(would, base.price_minor);
  return (
    <Panel label="What if">
      <PanelHead title="What if" fact="nothing is saved">
        <Button size="small" onClick={() => setChange(NO_CHANGE)}>
          Reset
        </Button>
      </PanelHead>
      <PanelBody>
        <div className="grid gap-3">
          {SLIDERS.map(({ key, label }) => (
            <label key={key} className="grid grid-cols-[1fr_auto] items-baseline gap-x-3">
              <span>{label}</span>
              <output className="font-semibold">{signed(change[key] / 100, 0)} %</output>
              <input
                type="range"
                min={-3000}
                max={3000}
                step={100}
                value={change[key]}
                className="col-span-2 w-full accent-dye"
                onChange={(event) => setChange({ ...change, [key]: Number(event.target.value) })}
              />
            </label>
          ))}
        </div>
        <dl className="mt-3 grid grid-cols-[1fr_auto] gap-y-1 border-t border-line-strong pt-2">
          <dt>Price would be</dt>
          <dd className="text-right font-semibold">{formatMoney(would.price_minor, would.currency).text}</dd>
          <dt className="text-ink-2">change</dt>
          <dd className="text-right">{formatMoneyChange(would.price_minor - base.price_minor, would.currency).text}</dd>
          <dt>Price held, margin falls to</dt>
          <dd className="text-right font-semibold">{formatShare(heldMargin_bp).text}</dd>
        </dl>
        {heldMargin_bp < basis.marginFloor_bp && (
          <div className="mt-2">
            <SeverityText severity="warn">Under the {formatShare(basis.marginFloor_bp).text} floor</SeverityText>
          </div>
        )}
      </PanelBody>
    </Panel>
  );
}
