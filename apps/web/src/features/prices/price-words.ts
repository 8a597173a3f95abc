import type { LineGroup, PriceUnit } from "@cleatwork/calc";

export const groupWords: Record<LineGroup, string> = {
  metal: "Metal",
  devices: "Air devices",
  accessories: "Accessories and sundries",
  labor: "Labor",
  subcontracts: "Subcontracts",
  "rentals-freight": "Rentals and freight",
};

export const unitWords: Record<PriceUnit, string> = {
  kg: "kg",
  lb: "lb",
  m: "m",
  ft: "ft",
  m2: "m²",
  ft2: "ft²",
  ea: "each",
  L: "L",
  gal: "gal",
  h: "hour",
  day: "day",
  week: "week",
  lot: "lot",
};
