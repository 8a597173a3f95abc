/** Questions an owner asks of a bid. Nothing is stored: a changed copy is priced as any other. */
import { divideRounded } from "../money.ts";
import { hours, type Hours } from "../quantity.ts";
import type { Takeoff } from "../takeoff/takeoff.ts";
import type { Estimate, PricingBasis } from "./estimate.ts";

/** Changes in basis points: 1,000 is 10 % more, −500 is 5 % less. */
export interface WhatIf {
  readonly metalPrice_bp: number;
  readonly fieldHours_bp: number;
  /** On the whole hourly rate, shop and field. */
  readonly wages_bp: number;
  /** The markup instead of the basis's own; null leaves it. */
  readonly profit_bp: number | null;
}

export const NO_CHANGE: WhatIf = { metalPrice_bp: 0, fieldHours_bp: 0, wages_bp: 0, profit_bp: null };

export interface PricingInput {
  readonly takeoffs: readonly Takeoff[];
  readonly basis: PricingBasis;
}

const scaleMicro = (micro: number, change_bp: number): number =>
  Number(divideRounded(BigInt(micro) * BigInt(10_000 + change_bp), 10_000n));

export function applyWhatIf({ takeoffs, basis }: PricingInput, change: WhatIf): PricingInput {
  const { metalPrice_bp, fieldHours_bp, wages_bp, profit_bp } = change;
  return {
    takeoffs: fieldHours_bp === 0 ? takeoffs : takeoffs.map((takeoff) => scaleFieldHours(takeoff, fieldHours_bp)),
    basis: {
      ...basis,
      items: basis.items.map((item) =>
        item.key.startsWith("metal:")
          ? { ...item, unitPrice_micro: scaleMicro(item.unitPrice_micro, metalPrice_bp) }
          : item,
      ),
      labor: basis.labor.map((rate) => ({
        ...rate,
        parts: rate.parts.map((part) => ({ ...part, amount_micro: scaleMicro(part.amount_micro, wages_bp) })),
      })),
      rates: { ...basis.rates, profit_bp: profit_bp ?? basis.rates.profit_bp },
    },
  };
}

function scaleFieldHours(takeoff: Takeoff, change_bp: number): Takeoff {
  const factor = (10_000 + change_bp) / 10_000;
  const scale = (worked: Hours) => hours(worked * factor);
  return {
    ...takeoff,
    pieces: takeoff.pieces.map((piece) => ({ ...piece, fieldHours_h: scale(piece.fieldHours_h) })),
    items: takeoff.items.map((item) => ({ ...item, fieldHours_h: scale(item.fieldHours_h) })),
    totals: { ...takeoff.totals, fieldHours_h: scale(takeoff.totals.fieldHours_h) },
  };
}

/** What is left of profit when the price is held: everything else at this estimate's cost, the bond on the held price. */
export function profitAtPrice(
  { steps, cost_minor }: Estimate,
  held_minor: number,
): { readonly profit_minor: number; readonly margin_bp: number } {
  const find = (name: "overhead" | "contingency" | "bond") => steps.find(({ step }) => step === name);
  const bondRate = find("bond")?.rate_bp ?? 0;
  // Of a price that includes it, the bond is simply its share.
  const bond = Number(divideRounded(BigInt(held_minor) * BigInt(bondRate), 10_000n));
  const profit =
    held_minor - bond - cost_minor - (find("overhead")?.amount_minor ?? 0) - (find("contingency")?.amount_minor ?? 0);
  return { profit_minor: profit, margin_bp: held_minor === 0 ? 0 : Math.round((10_000 * profit) / held_minor) };
}
