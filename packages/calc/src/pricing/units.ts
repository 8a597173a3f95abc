/** Units that prices come in, by what they measure. Factors are exact by definition. */
import { KILOGRAMS_PER_POUND, METERS_PER_FOOT } from "../quantity.ts";
import type { PriceUnit } from "./estimate.ts";

/** The international gallon of 231 cubic inches, in liters. Exact. */
export const LITERS_PER_GALLON = 3.785411784;

export type Dimension = "mass" | "length" | "area" | "volume" | "count" | "time" | "whole";

const units: Readonly<Record<PriceUnit, { readonly dimension: Dimension; readonly inBase: number }>> = {
  kg: { dimension: "mass", inBase: 1 },
  lb: { dimension: "mass", inBase: KILOGRAMS_PER_POUND },
  m: { dimension: "length", inBase: 1 },
  ft: { dimension: "length", inBase: METERS_PER_FOOT },
  m2: { dimension: "area", inBase: 1 },
  ft2: { dimension: "area", inBase: METERS_PER_FOOT ** 2 },
  L: { dimension: "volume", inBase: 1 },
  gal: { dimension: "volume", inBase: LITERS_PER_GALLON },
  ea: { dimension: "count", inBase: 1 },
  h: { dimension: "time", inBase: 1 },
  day: { dimension: "whole", inBase: 1 },
  week: { dimension: "whole", inBase: 1 },
  lot: { dimension: "whole", inBase: 1 },
};

export const dimensionOf = (unit: PriceUnit): Dimension => units[unit].dimension;

/** An SI quantity (or a count) in the unit of a price of the same dimension. */
export const inUnit = (value: number, unit: PriceUnit): number => value / units[unit].inBase;

export const baseUnit: Readonly<Record<Dimension, PriceUnit>> = {
  mass: "kg",
  length: "m",
  area: "m2",
  volume: "L",
  count: "ea",
  time: "h",
  whole: "lot",
};
