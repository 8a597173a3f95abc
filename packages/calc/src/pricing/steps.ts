/** The way from cost to price, as a list: what is charged on what, in which order. */
import { divideRounded, percentOf } from "../money.ts";
import type { Estimate, PricingRates } from "./estimate.ts";

export type StepName = Estimate["steps"][number]["step"];
export type Step = Estimate["steps"][number];

/** `rate` is charged on the sum of the named steps; a `sum` adds up what came before; a `charge` is of the price itself. */
export type StepRule =
  | { readonly step: StepName; readonly how: "given" }
  | {
      readonly step: StepName;
      readonly how: "percent";
      readonly rate: keyof PricingRates;
      readonly of: readonly StepName[];
    }
  | { readonly step: StepName; readonly how: "percent-of-taxable"; readonly rate: keyof PricingRates }
  | {
      readonly step: StepName;
      readonly how: "charge-on-price";
      readonly rate: keyof PricingRates;
      readonly of: readonly StepName[];
    }
  | { readonly step: StepName; readonly how: "sum"; readonly of: readonly StepName[] };

/**
 * Overhead and contingency are each taken of cost; profit is a markup on all of them; the bond is charged on the price.
 * Common practice; the order is a decision, not an accident.
 */
export const PRICE_STEPS: readonly StepRule[] = [
  { step: "direct", how: "given" },
  { step: "tax", how: "percent-of-taxable", rate: "tax_bp" },
  { step: "cost", how: "sum", of: ["direct", "tax"] },
  { step: "overhead", how: "percent", rate: "overhead_bp", of: ["cost"] },
  { step: "contingency", how: "percent", rate: "contingency_bp", of: ["cost"] },
  { step: "profit", how: "percent", rate: "profit_bp", of: ["cost", "overhead", "contingency"] },
  { step: "bond", how: "charge-on-price", rate: "bond_bp", of: ["cost", "overhead", "contingency", "profit"] },
  { step: "price", how: "sum", of: ["cost", "overhead", "contingency", "profit", "bond"] },
];

/** Each percentage is taken once of an integer and rounded once; all else is addition. */
export function climb(
  rules: readonly StepRule[],
  start: { readonly direct_minor: number; readonly taxable_minor: number },
  rates: PricingRates,
): readonly Step[] {
  const amounts = new Map<StepName, number>();
  const sumOf = (names: readonly StepName[]) =>
    names.reduce((sum, name) => {
      const amount = amounts.get(name);
      if (amount === undefined) throw new Error(`step "${name}" is used before it is taken`);
      return sum + amount;
    }, 0);

  return rules.map((rule) => {
    const amount = amountOf(rule, start, rates, sumOf);
    amounts.set(rule.step, amount);
    return { step: rule.step, amount_minor: amount, rate_bp: "rate" in rule ? rates[rule.rate] : null };
  });
}

function amountOf(
  rule: StepRule,
  start: { readonly direct_minor: number; readonly taxable_minor: number },
  rates: PricingRates,
  sumOf: (names: readonly StepName[]) => number,
): number {
  switch (rule.how) {
    case "given":
      return start.direct_minor;
    case "percent":
      return percentOf(sumOf(rule.of), rates[rule.rate]);
    case "percent-of-taxable":
      return percentOf(start.taxable_minor, rates[rule.rate]);
    case "charge-on-price":
      return chargeOnPrice(sumOf(rule.of), rates[rule.rate]);
    case "sum":
      return sumOf(rule.of);
  }
}

/**
 * A charge that is a percentage of the price which includes it: solved for, not added.
 *
 *     x = b (B + x)   ⇒   x = B b / (1 − b)
 *
 * Rounded once; then x is also exactly what b of the price B + x rounds to, so the printed line checks out.
 *
 * Range    rate from 0 to 9,999 basis points
 */
export function chargeOnPrice(before_minor: number, rate_bp: number): number {
  if (!(rate_bp >= 0 && rate_bp < 10_000)) throw new RangeError("a charge on the price is under the whole of it");
  return Number(divideRounded(BigInt(before_minor) * BigInt(rate_bp), BigInt(10_000 - rate_bp)));
}
