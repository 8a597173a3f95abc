import { formatMoney, formatShare, type Estimate } from "@cleatwork/calc";
import { Panel, PanelHead } from "../../ui/panel.tsx";
import { groupNames, stepNames } from "./words.ts";

interface Rung {
  readonly label: string;
  readonly amount: number;
  /** Where its bar begins, in money. */
  readonly from: number;
  readonly total: boolean;
  readonly profit: boolean;
}

/** From cost to price: a ledger whose bars are the stair. */
export function CostLadder({ estimate }: { estimate: Estimate }) {
  const rungs = rungsOf(estimate);
  const price = Math.max(estimate.price_minor, 1);
  return (
    <Panel label="From cost to price">
      <PanelHead title="From cost to price" fact={`margin ${formatShare(estimate.margin_bp).text}`} />
      <table className="w-full">
        <caption className="sr-only">Each step from direct cost to price, with its share of the price</caption>
        <tbody>
          {rungs.map(({ label, amount, from, total, profit }) => (
            <tr key={label} className={total ? "border-y border-line-strong font-semibold" : ""}>
              <th scope="row" className="px-4 py-1 text-left font-[inherit]">
                {label}
              </th>
              <td className="px-2 text-right">{formatMoney(amount, estimate.currency).value}</td>
              <td className="px-2 text-right text-ink-3">{((100 * amount) / price).toFixed(1)} %</td>
              <td className="w-2/5 pr-4">
                <svg viewBox="0 0 100 10" preserveAspectRatio="none" className="block h-3 w-full" aria-hidden>
                  <rect
                    x={(100 * from) / price}
                    y={0}
                    width={Math.max(0.3, (100 * amount) / price)}
                    height={10}
                    className={total ? "fill-ink" : profit ? "fill-dye" : "fill-line-strong"}
                  />
                </svg>
              </td>
            </tr>
          ))}
        </tbody>
      </table>
    </Panel>
  );
}

function rungsOf(estimate: Estimate): Rung[] {
  const rungs: Rung[] = [];
  let climbed = 0;
  for (const { group, amount_minor } of estimate.groups) {
    if (amount_minor === 0) continue;
    rungs.push({ label: groupNames[group], amount: amount_minor, from: climbed, total: false, profit: false });
    climbed += amount_minor;
  }
  for (const { step, amount_minor, rate_bp } of estimate.steps) {
    if (step === "direct") continue;
    const total = step === "cost" || step === "price";
    const label = rate_bp === null ? stepNames[step] : `${stepNames[step]}, ${formatShare(rate_bp).text}`;
    rungs.push({ label, amount: amount_minor, from: total ? 0 : climbed, total, profit: step === "profit" });
    if (!total) climbed += amount_minor;
  }
  return rungs;
}
