import type { PriceItem } from "@cleatwork/calc";
import { describe, expect, test } from "vitest";
import { defaultPricingSettings } from "./default-settings.ts";
import {
  addedItemProblems,
  laborProblems,
  priceItemDifferences,
  projectPricingDifferences,
  settingsDifferences,
} from "./pricing.rules.ts";

const sheet: PriceItem = {
  key: "metal:galvanized:24 ga",
  description: "Galvanized sheet, 24 ga",
  group: "metal",
  unit: "lb",
  unitPrice_micro: 1_060_000,
  supplier: "Prairie Coil",
  effectiveOn: "2026-06-04",
  taxable: true,
};
const crane = {
  id: "crane",
  description: "Crane day",
  group: "rentals-freight",
  quantity: 1,
  unit: "day",
  unitPrice_micro: 1_450_000_000,
  taxable: false,
} as const;

describe("what changed in prices, for the audit trail", () => {
  test("a changed price is told with the old and the new", () => {
    expect(priceItemDifferences(sheet, { ...sheet, unitPrice_micro: 1_120_000 })).toEqual({
      unitPrice_micro: { old: 1_060_000, new: 1_120_000 },
    });
  });

  test("saving the same price again is no change", () => {
    expect(priceItemDifferences(sheet, { ...sheet })).toEqual({});
  });

  test("a changed markup is told by its name", () => {
    const after = { ...defaultPricingSettings, rates: { ...defaultPricingSettings.rates, profit_bp: 1_400 } };
    expect(settingsDifferences(defaultPricingSettings, after)).toEqual({
      "rates.profit_bp": { old: 800, new: 1_400 },
    });
  });

  test("a wage part is a change of that labor rate only", () => {
    const parts = [{ label: "Wage", amount_micro: 42_100_000 }];
    const [shop, field] = defaultPricingSettings.labor;
    if (!shop || !field) throw new Error("two rates by default");
    const after = { ...defaultPricingSettings, labor: [shop, { ...field, parts }] };
    expect(Object.keys(settingsDifferences(defaultPricingSettings, after))).toEqual(["labor.field"]);
  });

  test("an added line is told with nothing before it", () => {
    const before = { rates: null, conditionFactor: null, conditionReason: "", adds: [] };
    expect(projectPricingDifferences(before, { ...before, adds: [crane] })).toEqual({
      "adds.crane": { old: null, new: crane },
    });
  });
});

describe("what cannot be saved", () => {
  test("two rates for the shop are refused with the second one named", () => {
    const [shop] = defaultPricingSettings.labor;
    if (!shop) throw new Error("two rates by default");
    expect(laborProblems([shop, shop])).toEqual([
      { pointer: "/labor/1/key", code: "labor-twice", message: "one rate for shop and one for field", value: "shop" },
    ]);
  });

  test("two added lines with one id are refused", () => {
    expect(addedItemProblems([crane, crane])).toMatchObject([{ pointer: "/adds/1/id", value: "crane" }]);
  });
});
