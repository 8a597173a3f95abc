import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { aRun, aSystem, rectangular, round, takeoffOf } from "../checks/metal-system.ts";
import { lineAmount, percentOf, sumMinor } from "../money.ts";
import { hours, inches } from "../quantity.ts";
import type { Takeoff } from "../takeoff/takeoff.ts";
import { differenceBetween } from "./difference.ts";
import type { Estimate, PriceItem, PricingBasis, PricingRates } from "./estimate.ts";
import { price } from "./price.ts";
import { PRICE_STEPS, chargeOnPrice, climb } from "./steps.ts";
import { NO_CHANGE, applyWhatIf, profitAtPrice } from "./what-if.ts";

const TODAY = "2026-06-16";
const item = (key: string, unit: PriceItem["unit"], dollars: number, more: Partial<PriceItem> = {}): PriceItem => ({
  key,
  description: key,
  group: "metal",
  unit,
  unitPrice_micro: Math.round(dollars * 1_000_000),
  supplier: "Invented Supply",
  effectiveOn: "2026-06-04",
  taxable: true,
  ...more,
});

const rates: PricingRates = {
  wasteOnMetal_bp: 1000,
  tax_bp: 750,
  overhead_bp: 1200,
  contingency_bp: 300,
  profit_bp: 1400,
  bond_bp: 110,
};

const basis: PricingBasis = {
  currency: "USD",
  items: [
    item("metal:galvanized:26 ga", "lb", 1.12),
    item("metal:galvanized:24 ga", "lb", 1.06),
    item("metal:galvanized:28 ga", "lb", 1.16),
    item("hanger", "ea", 9.4),
    item("sealant", "gal", 31.5),
    item("slip-strip", "ft", 0.38),
    item("drive-strip", "ft", 0.36),
    item("coupling", "ea", 6.2),
    item("wrap", "ft2", 3.85, { group: "subcontracts", taxable: false }),
    item("flexible:10", "ft", 4.1, { group: "devices" }),
    item("volume-damper", "ea", 41.5, { group: "accessories" }),
    item("diffuser-24x24", "ea", 78, { group: "devices" }),
  ],
  labor: [
    {
      key: "shop",
      name: "Shop",
      parts: [
        { label: "Wage", amount_micro: 36_200_000 },
        { label: "Burden", amount_micro: 32_200_000 },
      ],
    },
    {
      key: "field",
      name: "Field",
      parts: [
        { label: "Wage", amount_micro: 42_100_000 },
        { label: "Burden", amount_micro: 39_050_000 },
      ],
    },
  ],
  rates,
  adds: [],
  pricedOn: TODAY,
  staleAfterDays: 30,
  marginFloor_bp: 1000,
};

const job = (): Takeoff =>
  takeoffOf(
    aSystem(
      [
        {
          to: "tap",
          after: "unit",
          at: [30, 0],
          section: rectangular(24, 12),
          more: { accessories: ["volume-damper"] },
        },
        { to: "far", after: "tap", at: [50, 0], section: rectangular(24, 12), outlet: { deviceKey: "diffuser-24x24" } },
        { to: "side", after: "tap", at: [30, 12], section: round(10) },
        {
          to: "drop",
          after: "side",
          at: [30, 16],
          section: round(10),
          more: { flexible: true },
          outlet: { deviceKey: "diffuser-24x24" },
        },
      ],
      { insulation: { kind: "wrap", thickness_m: inches(1.5) } },
    ),
  );

const lineOf = ({ lines }: Estimate, key: string) => {
  const line = lines.find((each) => each.key === key);
  if (!line) throw new Error(`no line ${key} in ${lines.map((each) => each.key).join(", ")}`);
  return line;
};
const stepOf = ({ steps }: Estimate, name: string) => steps.find(({ step }) => step === name)!;

describe("lines", () => {
  const estimate = price([job()], basis);

  it("multiply out as they are printed", () => {
    for (const line of estimate.lines) {
      expect(line.quantity).toBe(Number(line.quantity.toFixed(1)));
      expect(line.amount_minor).toBe(lineAmount(line));
    }
  });

  it("buy metal with seams and waste, by gauge", () => {
    const takeoff = job();
    const line = lineOf(estimate, "metal:galvanized:26 ga");
    const own = takeoff.pieces.filter(({ gauge }) => gauge === "26 ga");
    const blank = own.reduce((sum, piece) => sum + (piece.weight_kg * piece.blankArea_m2) / piece.netArea_m2, 0);
    expect(line.unit).toBe("lb");
    expect(line.quantity).toBeCloseTo((blank / 0.45359237) * 1.1, 1);
    const [net, laps, waste] = line.arithmetic;
    expect((net!.value + laps!.value) * waste!.value).toBeCloseTo(line.quantity, 1);
  });

  it("price a damper of any size where the book has none of its own", () => {
    expect(lineOf(estimate, "volume-damper")).toMatchObject({ quantity: 1, amount_minor: 4150 });
    const sized = {
      ...basis,
      items: [...basis.items, item("volume-damper:24x12", "ea", 62, { group: "accessories" })],
    };
    expect(lineOf(price([job()], sized), "volume-damper:24x12").amount_minor).toBe(6200);
  });

  it("take labor at the sum of its parts, and say where the hours come from", () => {
    const line = lineOf(estimate, "labor:field");
    expect(line.unitPrice_micro).toBe(81_150_000);
    const explained = line.arithmetic.reduce((sum, { value }) => sum + value, 0);
    expect(explained).toBeCloseTo(line.quantity, 1);
    expect(line.arithmetic.map(({ label }) => label)).toContain("hangers");
  });

  it("keep what was added by hand as typed", () => {
    const added = {
      id: "a1",
      description: "Lift",
      group: "rentals-freight" as const,
      quantity: 2.25,
      unit: "week" as const,
      unitPrice_micro: 640_000_000,
      taxable: false,
    };
    const line = lineOf(price([], { ...basis, adds: [added] }), "add:a1");
    expect(line).toMatchObject({ quantity: 2.25, amount_minor: 144_000, origin: "by-hand", priceAge_days: null });
  });

  it("price metal by area where the book does", () => {
    const byArea = {
      ...basis,
      items: basis.items.map((each) =>
        each.key === "metal:galvanized:26 ga" ? { ...each, unit: "ft2" as const } : each,
      ),
    };
    const takeoff = job();
    const own = takeoff.pieces.filter(({ gauge }) => gauge === "26 ga");
    const blank = own.reduce((sum, { blankArea_m2 }) => sum + blankArea_m2, 0);
    expect(lineOf(price([takeoff], byArea), "metal:galvanized:26 ga").quantity).toBeCloseTo(
      (blank / 0.3048 ** 2) * 1.1,
      1,
    );
  });

  it("take the latest price in effect, not one of a later day", () => {
    const items = [
      ...basis.items,
      item("hanger", "ea", 10, { effectiveOn: "2026-06-10" }),
      item("hanger", "ea", 99, { effectiveOn: "2026-06-17" }),
    ];
    expect(lineOf(price([job()], { ...basis, items }), "hanger").unitPrice_micro).toBe(10_000_000);
  });
});

describe("from cost to price", () => {
  it("adds up as it is printed", () => {
    const anyRate = fc.integer({ min: 0, max: 4000 });
    const anyRates = fc.record({
      wasteOnMetal_bp: anyRate,
      tax_bp: anyRate,
      overhead_bp: anyRate,
      contingency_bp: anyRate,
      profit_bp: anyRate,
      bond_bp: anyRate,
    });
    const takeoff = job();
    fc.assert(
      fc.property(anyRates, (some) => {
        const estimate = price([takeoff], { ...basis, rates: some });
        const amount = (name: string) => stepOf(estimate, name).amount_minor;
        expect(estimate.directCost_minor).toBe(sumMinor(estimate.lines.map(({ amount_minor }) => amount_minor)));
        expect(estimate.directCost_minor).toBe(sumMinor(estimate.groups.map(({ amount_minor }) => amount_minor)));
        expect(amount("cost")).toBe(amount("direct") + amount("tax"));
        expect(estimate.price_minor).toBe(
          amount("cost") + amount("overhead") + amount("contingency") + amount("profit") + amount("bond"),
        );
        expect(sumMinor(estimate.bySystem.map(({ price_minor }) => price_minor))).toBe(estimate.price_minor);
      }),
      { numRuns: 50 },
    );
  });

  it("charges tax on taxable lines only", () => {
    const estimate = price([job()], basis);
    const taxable = sumMinor(estimate.lines.filter((line) => line.taxable).map(({ amount_minor }) => amount_minor));
    expect(taxable).toBeLessThan(estimate.directCost_minor);
    expect(stepOf(estimate, "tax").amount_minor).toBe(percentOf(taxable, 750));
  });

  it("charges the bond on the price that includes it", () => {
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 1e11 }), fc.integer({ min: 0, max: 9_999 }), (before, rate) => {
        const bond = chargeOnPrice(before, rate);
        expect(percentOf(before + bond, rate)).toBe(bond);
      }),
    );
  });

  it("refuses a step that uses what has not been taken", () => {
    const turned = [...PRICE_STEPS].reverse();
    expect(() => climb(turned, { direct_minor: 1, taxable_minor: 0 }, rates)).toThrow("before it is taken");
  });

  it("costs no less when a price goes up", () => {
    const takeoff = job();
    const before = price([takeoff], basis).price_minor;
    fc.assert(
      fc.property(fc.nat({ max: basis.items.length - 1 }), fc.integer({ min: 0, max: 1e9 }), (at, more) => {
        const items = basis.items.map((each, index) =>
          index === at ? { ...each, unitPrice_micro: each.unitPrice_micro + more } : each,
        );
        expect(price([takeoff], { ...basis, items }).price_minor).toBeGreaterThanOrEqual(before);
      }),
      { numRuns: 50 },
    );
  });

  it("does not depend on the order of pieces and items", () => {
    const takeoff = job();
    const turned = { ...takeoff, pieces: [...takeoff.pieces].reverse(), items: [...takeoff.items].reverse() };
    const amounts = ({ lines }: Estimate) => new Map(lines.map(({ key, amount_minor }) => [key, amount_minor]));
    expect(amounts(price([turned], basis))).toEqual(amounts(price([takeoff], basis)));
    expect(price([turned], basis).price_minor).toBe(price([takeoff], basis).price_minor);
  });

  it("splits by system what the systems cost", () => {
    const first = { ...job(), systemId: "a" };
    const relabeled = {
      ...first,
      pieces: first.pieces.map((p) => ({ ...p, systemId: "a" })),
      items: first.items.map((i) => ({ ...i, systemId: "a" })),
    };
    const second = {
      ...relabeled,
      systemId: "b",
      pieces: relabeled.pieces.map((p) => ({ ...p, systemId: "b" })),
      items: relabeled.items.map((i) => ({ ...i, systemId: "b" })),
    };
    const { bySystem, price_minor } = price([relabeled, second], basis);
    expect(bySystem.map(({ systemId }) => systemId)).toEqual(["a", "b"]);
    // Alike to the few cents that odd line amounts leave.
    expect(Math.abs(bySystem[0]!.price_minor - bySystem[1]!.price_minor)).toBeLessThan(50);
    expect(bySystem[0]!.price_minor + bySystem[1]!.price_minor).toBe(price_minor);
  });
});

describe("warnings", () => {
  const codes = ({ warnings }: Estimate) => warnings.map(({ code, severity, key }) => [code, severity, key]);

  it("has none when all is priced", () => {
    expect(codes(price([job()], basis))).toEqual([]);
  });

  it("stops on a missing price and counts it as nothing", () => {
    const estimate = price([job()], { ...basis, items: basis.items.filter(({ key }) => key !== "hanger") });
    expect(codes(estimate)).toEqual([["price-missing", "stop", "hanger"]]);
    expect(lineOf(estimate, "hanger")).toMatchObject({ amount_minor: 0, unit: "ea" });
    expect(lineOf(estimate, "hanger").quantity).toBeGreaterThan(0);
  });

  it("stops on a price in a unit that does not measure the thing", () => {
    const items = basis.items.map((each) => (each.key === "sealant" ? { ...each, unit: "ea" as const } : each));
    expect(codes(price([job()], { ...basis, items }))).toEqual([["price-missing", "stop", "sealant"]]);
  });

  it("warns of waste that is carried by the spec and added here", () => {
    const carried = takeoffOf(aRun(rectangular(24, 12), 40, { allowances: [{ of: "waste", share: 0.1 }] }));
    expect(codes(price([carried], basis))).toContainEqual(["carried-twice", "warn", "waste"]);
    const rates = { ...basis.rates, wasteOnMetal_bp: 0 };
    expect(codes(price([carried], { ...basis, rates }))).toEqual([]);
  });

  it("stops on labor without a rate", () => {
    const labor = basis.labor.map((rate) => ({ ...rate, parts: [] }));
    expect(codes(price([job()], { ...basis, labor }))).toEqual([
      ["price-missing", "stop", "labor:shop"],
      ["price-missing", "stop", "labor:field"],
    ]);
  });

  it("warns of an old price from the day after its limit", () => {
    const aged = (effectiveOn: string) =>
      codes(
        price([job()], {
          ...basis,
          items: basis.items.map((each) => (each.key === "hanger" ? { ...each, effectiveOn } : each)),
        }),
      );
    expect(aged("2026-05-17")).toEqual([]);
    expect(aged("2026-05-16")).toEqual([["price-stale", "warn", "hanger"]]);
  });

  it("warns of labor without hours", () => {
    const takeoff = job();
    const idle = { ...takeoff, totals: { ...takeoff.totals, shopHours_h: hours(0) } };
    expect(codes(price([idle], basis))).toEqual([["hours-zero", "warn", "labor:shop"]]);
  });

  it("warns of a margin under the floor", () => {
    const thin = { ...basis, rates: { ...rates, profit_bp: 500 } };
    expect(codes(price([job()], thin))).toEqual([["margin-under-floor", "warn", "margin"]]);
  });
});

describe("what if", () => {
  const input = { takeoffs: [job()], basis };
  const now = price(input.takeoffs, input.basis);

  it("changes nothing when nothing is changed", () => {
    const same = applyWhatIf(input, NO_CHANGE);
    expect(price(same.takeoffs, same.basis)).toEqual(now);
  });

  it("moves metal alone with metal", () => {
    const dearer = applyWhatIf(input, { ...NO_CHANGE, metalPrice_bp: 1000 });
    const then = price(dearer.takeoffs, dearer.basis);
    const { lines } = differenceBetween(
      { takeoffs: input.takeoffs, estimate: now },
      { takeoffs: dearer.takeoffs, estimate: then },
    );
    expect(lines.length).toBeGreaterThan(0);
    expect(lines.every(({ key }) => key.startsWith("metal:"))).toBe(true);
  });

  it("moves hours with field hours, and not the pieces", () => {
    const slower = applyWhatIf(input, { ...NO_CHANGE, fieldHours_bp: 800 });
    const then = price(slower.takeoffs, slower.basis);
    const difference = differenceBetween(
      { takeoffs: input.takeoffs, estimate: now },
      { takeoffs: slower.takeoffs, estimate: then },
    );
    expect(difference.fieldHours_h).toBeCloseTo(0.08 * input.takeoffs[0]!.totals.fieldHours_h, 9);
    expect(difference.shopHours_h).toBe(0);
    expect(difference.pieces).toEqual({ added: [], removed: [], changed: [] });
    expect(difference.lines.map(({ key }) => key)).toEqual(["labor:field"]);
  });

  it("leaves the input as it was", () => {
    const before = JSON.stringify(input);
    applyWhatIf(input, { metalPrice_bp: 500, fieldHours_bp: 500, wages_bp: 500, profit_bp: 100 });
    expect(JSON.stringify(input)).toBe(before);
  });

  it("holding the price it has leaves the profit it has", () => {
    expect(profitAtPrice(now, now.price_minor)).toEqual({ profit_minor: now.profit_minor, margin_bp: now.margin_bp });
  });
});

describe("difference", () => {
  it("names pieces and lines that came, went and changed", () => {
    const state = (takeoff: Takeoff) => ({ takeoffs: [takeoff], estimate: price([takeoff], basis) });
    const short = state(takeoffOf(aRun(rectangular(24, 12), 8)));
    const long = state(takeoffOf(aRun(rectangular(24, 12), 12)));
    const difference = differenceBetween(short, long);
    expect(difference.pieces).toEqual({
      added: [{ systemId: "system", mark: "1C" }],
      removed: [],
      changed: [{ systemId: "system", mark: "1B" }],
    });
    expect(difference.price_minor).toBe(long.estimate.price_minor - short.estimate.price_minor);
    expect(differenceBetween(long, short).netWeight_kg).toBeCloseTo(-difference.netWeight_kg, 9);
  });
});
