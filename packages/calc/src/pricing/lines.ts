/** Priced lines: what was taken off, labor, and what was added by hand. Each rounds once. */
import { lineAmount, roundTo } from "../money.ts";
import type { CountedItem, Takeoff } from "../takeoff/takeoff.ts";
import { demandsOf, type Demand, type Measure } from "./demand.ts";
import type { AddedItem, EstimateLine, EstimateWarning, LaborRate, PriceItem, PricingBasis } from "./estimate.ts";
import { daysBetween, indexPrices } from "./price-book.ts";
import { baseUnit, dimensionOf, inUnit } from "./units.ts";

/**
 * Decimals of a quantity on a line. It is rounded before it is multiplied, so that the line as printed multiplies out:
 * 1,100.0 lb × 1.12 is 1,232.00.
 */
export const QUANTITY_DECIMALS = 1;

/** A line, and how much of its quantity is each system's. No weights: it belongs to the whole job. */
export interface WeightedLine {
  readonly line: EstimateLine;
  readonly bySystem: ReadonlyMap<string, number>;
}

export interface LineSet {
  readonly lines: readonly WeightedLine[];
  readonly warnings: readonly EstimateWarning[];
}

export function takeoffLines(takeoffs: readonly Takeoff[], basis: PricingBasis): LineSet {
  const book = indexPrices(basis.items, basis.pricedOn);
  const warnings: EstimateWarning[] = [];
  const lines = demandsOf(takeoffs, (key) => book.find(key) !== null).map((demand) => {
    const item = book.find(demand.priceKey);
    const measure = item && demand.measures.find(({ dimension }) => dimension === dimensionOf(item.unit));
    if (!item || !measure) {
      warnings.push(missing(demand, item));
      return unpriced(demand, basis);
    }
    const age = daysBetween({ from: item.effectiveOn, to: basis.pricedOn });
    if (age > basis.staleAfterDays) warnings.push(stale(item, age, basis.staleAfterDays));
    return priced(demand, measure, item, age, basis);
  });
  return { lines, warnings };
}

const missing = ({ priceKey: key, description, measures }: Demand, item: PriceItem | null): EstimateWarning => ({
  code: "price-missing",
  severity: "stop",
  key,
  message: item
    ? `${item.description} is priced by ${item.unit}, which does not measure it: ${measures.map(({ dimension }) => dimension).join(" or ")} does`
    : `No price for ${description} (${key})`,
});

const stale = (item: PriceItem, age: number, limit: number): EstimateWarning => ({
  code: "price-stale",
  severity: "warn",
  key: item.key,
  message: `${item.description}: price is ${age} days old, more than ${limit}`,
});

const totalOf = ({ bySystem }: Measure): number => {
  let total = 0;
  for (const amount of bySystem.values()) total += amount;
  return total;
};

/** Quantity of a measure as bought, with waste where it is metal, and the terms that explain it. */
function bought(measure: Measure, demand: Demand, unit: PriceItem["unit"], { rates }: PricingBasis) {
  const waste = demand.isMetal ? 1 + rates.wasteOnMetal_bp / 10_000 : 1;
  const cut = inUnit(totalOf(measure), unit);
  const quantity = roundTo(cut * waste, QUANTITY_DECIMALS);
  const net = inUnit(measure.net, unit);
  const arithmetic = demand.isMetal
    ? [
        { label: "net", value: net, unit },
        { label: "seams, joints, laps", value: cut - net, unit },
        { label: "with waste", value: waste, unit: "×" },
      ]
    : [{ label: "taken off", value: net, unit }];
  return { quantity, arithmetic };
}

function priced(demand: Demand, measure: Measure, item: PriceItem, age: number, basis: PricingBasis): WeightedLine {
  const { quantity, arithmetic } = bought(measure, demand, item.unit, basis);
  return {
    line: {
      key: demand.key,
      group: item.group,
      description: demand.key === demand.priceKey ? item.description : demand.description,
      quantity,
      unit: item.unit,
      unitPrice_micro: item.unitPrice_micro,
      amount_minor: lineAmount({ quantity, unitPrice_micro: item.unitPrice_micro }),
      taxable: item.taxable,
      origin: "takeoff",
      priceAge_days: age,
      arithmetic,
    },
    bySystem: measure.bySystem,
  };
}

/** The quantity is shown all the same, so that the estimator knows what to ask a price for. */
function unpriced(demand: Demand, basis: PricingBasis): WeightedLine {
  const measure = demand.measures[0]!;
  const unit = baseUnit[measure.dimension];
  const { quantity, arithmetic } = bought(measure, demand, unit, basis);
  return {
    line: {
      key: demand.key,
      group: demand.group,
      description: demand.description,
      quantity,
      unit,
      unitPrice_micro: 0,
      amount_minor: 0,
      taxable: false,
      origin: "takeoff",
      priceAge_days: null,
      arithmetic,
    },
    bySystem: measure.bySystem,
  };
}

/** Burdened rate per hour: the sum of its parts. */
export const hourlyRate = ({ parts }: LaborRate): number =>
  parts.reduce((sum, { amount_micro }) => sum + amount_micro, 0);

export function laborLines(takeoffs: readonly Takeoff[], { labor }: PricingBasis): LineSet {
  const warnings: EstimateWarning[] = [];
  const hasMetal = takeoffs.some(({ pieces }) => pieces.length > 0);
  const lines = (["shop", "field"] as const).map((key) => {
    const rate = labor.find((each) => each.key === key);
    const unitPrice_micro = rate ? hourlyRate(rate) : 0;
    const bySystem = new Map<string, number>();
    for (const { systemId, totals } of takeoffs) {
      const worked = key === "shop" ? totals.shopHours_h : totals.fieldHours_h;
      bySystem.set(systemId, (bySystem.get(systemId) ?? 0) + worked);
    }
    const total = [...bySystem.values()].reduce((sum, worked) => sum + worked, 0);
    const quantity = roundTo(total, QUANTITY_DECIMALS);
    const lineKey = `labor:${key}`;
    const name = rate?.name ?? (key === "shop" ? "Shop" : "Field");
    if (quantity > 0 && unitPrice_micro === 0) {
      const message = `${name} labor has ${quantity} h and no rate`;
      warnings.push({ code: "price-missing", severity: "stop", key: lineKey, message });
    }
    if (hasMetal && quantity === 0) {
      warnings.push({ code: "hours-zero", severity: "warn", key: lineKey, message: `${name} labor has no hours` });
    }
    const line: EstimateLine = {
      key: lineKey,
      group: "labor",
      description: `${name} labor`,
      quantity,
      unit: "h",
      unitPrice_micro,
      amount_minor: lineAmount({ quantity, unitPrice_micro }),
      taxable: false,
      origin: "labor",
      priceAge_days: null,
      arithmetic: hourTerms(takeoffs, key),
    };
    return { line, bySystem };
  });
  return { lines, warnings };
}

const ITEM_HOURS: Readonly<Record<CountedItem["kind"], string>> = {
  hanger: "hangers",
  sealant: "sealing",
  hardware: "hardware",
  allowance: "allowances",
  accessory: "dampers, doors, connectors",
  device: "devices",
};

/** Where the hours come from: by weight and length, then what is counted. Zero terms are left out. */
function hourTerms(takeoffs: readonly Takeoff[], key: LaborRate["key"]): EstimateLine["arithmetic"] {
  const sums = new Map<string, number>();
  const add = (label: string, worked: number) => sums.set(label, (sums.get(label) ?? 0) + worked);
  for (const { pieces, items } of takeoffs) {
    for (const piece of pieces) {
      const label =
        piece.kind === "flexible" ? "flexible duct" : piece.kind === "straight" ? "straight duct" : "fittings";
      add(label, key === "shop" ? piece.shopHours_h : piece.fieldHours_h);
    }
    for (const item of items) add(ITEM_HOURS[item.kind], key === "field" ? item.fieldHours_h : (item.shopHours_h ?? 0));
  }
  return [...sums].filter(([, worked]) => worked > 0).map(([label, value]) => ({ label, value, unit: "h" }));
}

const NO_SYSTEM: ReadonlyMap<string, number> = new Map();

/** The quantity is as typed, for that is what is printed. */
export const addedLines = (adds: readonly AddedItem[]): readonly WeightedLine[] =>
  adds.map(({ id, description, group, quantity, unit, unitPrice_micro, taxable }) => ({
    line: {
      key: `add:${id}`,
      group,
      description,
      quantity,
      unit,
      unitPrice_micro,
      amount_minor: lineAmount({ quantity, unitPrice_micro }),
      taxable,
      origin: "by-hand",
      priceAge_days: null,
      arithmetic: [{ label: "by hand", value: quantity, unit }],
    },
    bySystem: NO_SYSTEM,
  }));
