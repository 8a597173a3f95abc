/** Arithmetic of an estimate against published and worked sums. */
import { describe, expect, it } from "vitest";
import { divideRounded, lineAmount, percentOf, sumMinor } from "../money.ts";
import type { PricingRates } from "../pricing/estimate.ts";
import { marginFromMarkup, markupFromMargin } from "../pricing/markup.ts";
import { PRICE_STEPS, climb, type StepRule } from "../pricing/steps.ts";

const cents = (dollars: number) => Math.round(dollars * 100);
const micro = (dollars: number) => Math.round(dollars * 1_000_000);
const noRates: PricingRates = {
  wasteOnMetal_bp: 0,
  tax_bp: 0,
  overhead_bp: 0,
  contingency_bp: 0,
  profit_bp: 0,
  bond_bp: 0,
};
const amounts = (rules: readonly StepRule[], direct: number, taxable: number, rates: PricingRates) =>
  Object.fromEntries(
    climb(rules, { direct_minor: direct, taxable_minor: taxable }, rates).map(({ step, amount_minor }) => [
      step,
      amount_minor,
    ]),
  );

describe("markup and margin", () => {
  // Finance article's table, printed to 0.1 %; standing: found.
  it.each([
    [10, 9.1],
    [15, 13],
    [20, 16.7],
    [25, 20],
    [30, 23.1],
    [35, 25.9],
    [40, 28.6],
    [50, 33.3],
    [100, 50],
  ])("%i %% markup is %f %% margin", (markup, margin) => {
    expect(Math.abs(marginFromMarkup(markup * 100) / 100 - margin)).toBeLessThanOrEqual(0.05 + 1e-9);
    expect(markupFromMargin(marginFromMarkup(markup * 100))).toBeCloseTo(markup * 100, 8);
  });

  it("P03: 80,000 at 20 % markup is 96,000, at 20 % margin 100,000 (contractor finance article, found)", () => {
    const rates = { ...noRates, profit_bp: 2000 };
    expect(amounts(PRICE_STEPS, cents(80_000), 0, rates)["price"]).toBe(cents(96_000));
    const asMargin = { ...noRates, profit_bp: markupFromMargin(2000) };
    expect(amounts(PRICE_STEPS, cents(80_000), 0, asMargin)["price"]).toBe(cents(100_000));
    expect(marginFromMarkup(2000) / 100).toBeCloseTo(16.67, 2);
  });

  it("P04: 200,000 at 25 % markup is 250,000, a fifth of it gross profit (engineering reference page, found)", () => {
    const steps = amounts(PRICE_STEPS, cents(200_000), 0, { ...noRates, profit_bp: 2500 });
    expect(steps["price"]).toBe(cents(250_000));
    expect(steps["profit"]! / steps["price"]!).toBe(0.2);
  });
});

describe("P07: duct bid roll-up (own example of the reference, standing computed)", () => {
  const lines = {
    metal: lineAmount({ quantity: 13_977.6, unitPrice_micro: micro(1.35) }),
    otherMaterial: cents(6842.5),
    shop: lineAmount({ quantity: 236, unitPrice_micro: micro(68.4) }),
    field: lineAmount({ quantity: 498, unitPrice_micro: micro(74.15) }),
    other: [3150, 18_750, 980, 640].map(cents),
  };
  const material = lines.metal + lines.otherMaterial;
  const direct = sumMinor([material, lines.shop, lines.field, ...lines.other]);

  it("has its lines to the cent", () => {
    // 12,480 lb net with 12 % waste are 13,977.6 lb.
    expect(lines.metal).toBe(cents(18_869.76));
    expect(material).toBe(cents(25_712.26));
    expect(lines.shop + lines.field).toBe(cents(53_069.1));
    expect(percentOf(material, 725)).toBe(cents(1864.14));
  });

  it("climbs in that example's own order: contingency, then overhead on it, then profit", () => {
    // The example counts tax in direct cost and takes contingency first. Ours takes both of cost; the list is what differs.
    const rules: readonly StepRule[] = [
      { step: "direct", how: "given" },
      { step: "tax", how: "percent-of-taxable", rate: "tax_bp" },
      { step: "cost", how: "sum", of: ["direct", "tax"] },
      { step: "contingency", how: "percent", rate: "contingency_bp", of: ["cost"] },
      { step: "overhead", how: "percent", rate: "overhead_bp", of: ["cost", "contingency"] },
      { step: "profit", how: "percent", rate: "profit_bp", of: ["cost", "contingency", "overhead"] },
      { step: "price", how: "sum", of: ["cost", "contingency", "overhead", "profit"] },
    ];
    const rates = { ...noRates, tax_bp: 725, contingency_bp: 300, overhead_bp: 1400, profit_bp: 800 };
    const steps = amounts(rules, direct, material, rates);
    expect(steps).toMatchObject({
      cost: cents(104_165.5),
      contingency: cents(3124.97),
      overhead: cents(15_020.67),
      profit: cents(9784.89),
      price: cents(132_096.03),
    });
  });
});

it("P11: 10 % overhead and 5 % profit on 10,000 are 11,500 side by side and 11,550 one on the other (clause, computed)", () => {
  const rates = { ...noRates, overhead_bp: 1000, profit_bp: 500 };
  expect(amounts(PRICE_STEPS, cents(10_000), 0, rates)["price"]).toBe(cents(11_550));
  const sideBySide: readonly StepRule[] = [
    { step: "direct", how: "given" },
    { step: "overhead", how: "percent", rate: "overhead_bp", of: ["direct"] },
    { step: "profit", how: "percent", rate: "profit_bp", of: ["direct"] },
    { step: "price", how: "sum", of: ["direct", "overhead", "profit"] },
  ];
  expect(amounts(sideBySide, cents(10_000), 0, rates)["price"]).toBe(cents(11_500));
});

it("P12: a contractor who is the consumer pays tax on material, then marks it up (state practice summary, computed)", () => {
  const rates = { ...noRates, tax_bp: 600, profit_bp: 2500 };
  const steps = amounts(PRICE_STEPS, cents(60_000), cents(24_000), rates);
  expect(steps).toMatchObject({ tax: cents(1440), cost: cents(61_440), price: cents(76_800) });
});

it("P15: an alternate is priced as a difference (own example, computed)", () => {
  const rates = { ...noRates, overhead_bp: 1400, profit_bp: 800 };
  const steps = amounts(PRICE_STEPS, cents(19_850 - 14_200), 0, rates);
  expect(steps).toMatchObject({ overhead: cents(791), profit: cents(515.28), price: cents(6956.28) });
});

it("P16: a unit price from hours and material (own example, computed)", () => {
  const labor = lineAmount({ quantity: 3.75, unitPrice_micro: micro(74.15) });
  expect(labor).toBe(cents(278.06));
  const rates = { ...noRates, overhead_bp: 1400, profit_bp: 800 };
  expect(amounts(PRICE_STEPS, cents(148.35) + labor, 0, rates)["price"]).toBe(cents(525));
});

it("P17: cents are rounded at the line, so the sum is 81.56 and not 81.55 (own example, computed)", () => {
  const lines = [
    { quantity: 37.333, unitPrice_micro: micro(1.155) },
    { quantity: 12.5, unitPrice_micro: micro(0.875) },
    { quantity: 8.25, unitPrice_micro: micro(3.333) },
  ];
  expect(sumMinor(lines.map(lineAmount))).toBe(8156);
});

it("P01: a burdened rate is wages and what comes with them over hours worked (textbook example 7-5, found)", () => {
  // Printed: wages 70,720; social security 4,385; Medicare 1,025; FUTA 56; SUTA 810; comp 5,127; liability 530; health 3,600.
  const wages = 29 * (20 * (40 + 10 * 1.5) + 32 * 40) + 12 * 100 + 500;
  expect(wages).toBe(70_720);
  const parts = [wages, 4384.64, 1025.44, 56, 810, 5127.2, 530.4, 3600, 3182.4].map(cents);
  // 20 weeks of 50 h and 29 of 40 h are worked; three are paid off.
  expect(Number(divideRounded(BigInt(sumMinor(parts)), BigInt(20 * 50 + 29 * 40)))).toBe(cents(41.41));
});
