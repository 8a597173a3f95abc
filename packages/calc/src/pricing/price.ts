/** The money stage: takeoffs and a basis in, priced lines and the way from cost to price out. */
import { allocate, sumMinor } from "../money.ts";
import type { Takeoff } from "../takeoff/takeoff.ts";
import { LINE_GROUPS, type Estimate, type EstimateWarning, type PricingBasis } from "./estimate.ts";
import { addedLines, laborLines, takeoffLines, type WeightedLine } from "./lines.ts";
import { PRICE_STEPS, climb, type Step, type StepName } from "./steps.ts";

/**
 * Lines, totals and price of a job of one or more systems.
 *
 * A line rounds once, half away from zero, of the quantity as printed; everything above a line is integer addition; a
 * percentage of a total rounds once. So what is printed adds up. A thing without a price is a line of zero and a warning
 * that stops, never a guess.
 *
 * @param takeoffs one for each system
 */
export function price(takeoffs: readonly Takeoff[], basis: PricingBasis): Estimate {
  const metal = takeoffLines(takeoffs, basis);
  const labor = laborLines(takeoffs, basis);
  const weighted = [...metal.lines, ...labor.lines, ...addedLines(basis.adds)];
  const lines = LINE_GROUPS.flatMap((group) => weighted.map(({ line }) => line).filter((line) => line.group === group));

  const direct = sumMinor(lines.map(({ amount_minor }) => amount_minor));
  const taxable = sumMinor(lines.filter((line) => line.taxable).map(({ amount_minor }) => amount_minor));
  const steps = climb(PRICE_STEPS, { direct_minor: direct, taxable_minor: taxable }, basis.rates);
  const profit = amountOf(steps, "profit");
  const total = amountOf(steps, "price");
  const margin = total === 0 ? 0 : Math.round((10_000 * profit) / total);

  return {
    currency: basis.currency,
    lines,
    groups: LINE_GROUPS.map((group) => ({
      group,
      amount_minor: sumMinor(lines.filter((line) => line.group === group).map(({ amount_minor }) => amount_minor)),
    })),
    steps,
    directCost_minor: direct,
    cost_minor: amountOf(steps, "cost"),
    profit_minor: profit,
    price_minor: total,
    margin_bp: margin,
    bySystem: splitBySystem(takeoffs, weighted, total),
    warnings: [
      ...metal.warnings,
      ...labor.warnings,
      ...wasteWarning(takeoffs, basis),
      ...marginWarning(margin, total, basis),
    ],
  };
}

export function amountOf(steps: readonly Step[], name: StepName): number {
  const step = steps.find((each) => each.step === name);
  if (!step) throw new Error(`no step "${name}"`);
  return step.amount_minor;
}

/** Waste that a spec carries as an allowance and the price adds as a percentage is paid for twice. */
function wasteWarning(takeoffs: readonly Takeoff[], { rates }: PricingBasis): EstimateWarning[] {
  const isCarried = takeoffs.some(({ items }) => items.some(({ key }) => key.startsWith("allowance:waste:")));
  if (!isCarried || rates.wasteOnMetal_bp === 0) return [];
  const message = `Waste on metal is added here, ${(rates.wasteOnMetal_bp / 100).toFixed(1)} %, and carried as an allowance of the spec too; take one of them out`;
  return [{ code: "carried-twice", severity: "warn", key: "waste", message }];
}

function marginWarning(margin: number, total: number, { marginFloor_bp }: PricingBasis): EstimateWarning[] {
  if (total === 0 || margin >= marginFloor_bp) return [];
  const message = `Margin ${(margin / 100).toFixed(1)} % is under the company's floor of ${(marginFloor_bp / 100).toFixed(1)} %`;
  return [{ code: "margin-under-floor", severity: "warn", key: "margin", message }];
}

/**
 * The price by system, to the cent: each line goes to systems by their share of its quantity, and what belongs to the whole
 * job, overhead, profit and bond among it, in proportion to that.
 */
function splitBySystem(
  takeoffs: readonly Takeoff[],
  lines: readonly WeightedLine[],
  total: number,
): Estimate["bySystem"] {
  const systemIds = [...new Set(takeoffs.map(({ systemId }) => systemId))];
  if (systemIds.length === 0) return [];
  const direct = systemIds.map(() => 0);
  for (const { line, bySystem } of lines) {
    if (bySystem.size === 0) continue;
    const parts = allocate(
      line.amount_minor,
      systemIds.map((id) => bySystem.get(id) ?? 0),
    );
    parts.forEach((part, at) => {
      direct[at]! += part;
    });
  }
  return allocate(total, direct).map((price_minor, at) => ({ systemId: systemIds[at]!, price_minor }));
}
