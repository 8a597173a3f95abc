/** The price that holds on a day. */
import type { PriceItem } from "./estimate.ts";

export interface PriceBookIndex {
  readonly find: (key: string) => PriceItem | null;
}

/** Of several prices under one key the latest that is in effect; a price of a later day does not hold yet. */
export function indexPrices(items: readonly PriceItem[], pricedOn: string): PriceBookIndex {
  const latest = new Map<string, PriceItem>();
  for (const item of items) {
    if (item.effectiveOn > pricedOn) continue;
    const known = latest.get(item.key);
    if (!known || item.effectiveOn > known.effectiveOn) latest.set(item.key, item);
  }
  return { find: (key) => latest.get(key) ?? null };
}

const MILLISECONDS_PER_DAY = 86_400_000;

/** Whole days from one calendar date to another, both YYYY-MM-DD. */
export function daysBetween({ from, to }: { readonly from: string; readonly to: string }): number {
  const days = (Date.parse(`${to}T00:00:00Z`) - Date.parse(`${from}T00:00:00Z`)) / MILLISECONDS_PER_DAY;
  if (!Number.isInteger(days)) throw new RangeError(`not calendar dates: ${from}, ${to}`);
  return days;
}
