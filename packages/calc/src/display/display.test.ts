import * as fc from "fast-check";
import { describe, expect, it } from "vitest";
import type { Section } from "../air-system.ts";
import {
  cubicFeetPerMinute,
  cubicMetersPerSecond,
  feet,
  feetPerMinute,
  inches,
  inchesOfWater,
  inchesOfWaterPer100Feet,
  meters,
  pascals,
  type Meters,
} from "../quantity.ts";
import type { Result } from "../result.ts";
import {
  formatAirflow,
  formatCounted,
  formatFrictionRate,
  formatLength,
  formatMoney,
  formatMoneyChange,
  formatPressure,
  formatThickness,
  formatUnitPrice,
  formatVelocity,
  fractionOf,
} from "./format.ts";
import { formatSize } from "./format-size.ts";
import {
  parseAirflow,
  parseFrictionRate,
  parseLength,
  parsePressure,
  parseSize,
  parseTemperature,
  parseThickness,
  parseVelocity,
} from "./parse.ts";

const valueOf = <T>(result: Result<T, { message: string }>): T => {
  if (!result.ok) throw new Error(result.problems[0]?.message);
  return result.value;
};

describe("lengths as people type them", () => {
  it.each([
    ["12'6\"", 12.5],
    ["12'6", 12.5],
    ["12' 6 1/2\"", 12 + 6.5 / 12],
    ["12-6", 12.5],
    ["12-6½", 12 + 6.5 / 12],
    ['150"', 12.5],
    ["6 1/2", 6.5],
    ["12.5", 12.5],
    ["12.5 ft", 12.5],
    ["12′-6½″", 12 + 6.5 / 12],
  ])("%s is feet", (typed, expected) => {
    expect(valueOf(parseLength(typed, "inch-pound"))).toBeCloseTo(feet(expected), 9);
  });

  it.each([
    ["3.8 m", 3.8],
    ["3800", 3.8],
    ["3800 mm", 3.8],
    ["3.8", 3.8],
    ["12'6\"", 3.81],
  ])("%s is meters where SI is used", (typed, expected) => {
    expect(valueOf(parseLength(typed, "si"))).toBeCloseTo(expected, 9);
  });

  it("says what cannot be read, and what can", () => {
    expect(parseLength("twelve", "inch-pound")).toMatchObject({
      ok: false,
      problems: [{ code: "not-readable", typed: "twelve" }],
    });
    expect(parseLength("-3", "inch-pound")).toMatchObject({ ok: false, problems: [{ code: "not-positive" }] });
  });
});

describe("sizes as people type them", () => {
  it.each<[string, Section]>([
    ["24x12", { shape: "rectangular", width_m: inches(24), height_m: inches(12) }],
    ["24 × 12", { shape: "rectangular", width_m: inches(24), height_m: inches(12) }],
    ["14ø", { shape: "round", diameter_m: inches(14) }],
    ["14o", { shape: "round", diameter_m: inches(14) }],
    ["9 round", { shape: "round", diameter_m: inches(9) }],
    ["20x10fo", { shape: "flat-oval", width_m: inches(20), height_m: inches(10) }],
    ["20x10 oval", { shape: "flat-oval", width_m: inches(20), height_m: inches(10) }],
    ["12/8", { shape: "annular", outerDiameter_m: inches(12), innerDiameter_m: inches(8) }],
    ["600x300 mm", { shape: "rectangular", width_m: meters(0.6), height_m: meters(0.3) }],
  ])("%s", (typed, expected) => {
    expect(parseSize(typed, "inch-pound")).toEqual({ ok: true, value: expected });
  });

  it("asks for the other side", () => {
    expect(parseSize("14x", "inch-pound")).toMatchObject({ ok: false, problems: [{ code: "one-side" }] });
    expect(parseSize("14", "inch-pound")).toMatchObject({ ok: false, problems: [{ code: "one-side" }] });
    expect(parseSize("14", "inch-pound", "round")).toEqual({
      ok: true,
      value: { shape: "round", diameter_m: inches(14) },
    });
  });

  it("refuses a side of nothing", () => {
    expect(parseSize("0x12", "inch-pound")).toMatchObject({ ok: false, problems: [{ code: "not-positive" }] });
  });
});

describe("air as people type it", () => {
  it("takes either unit wherever it is typed", () => {
    expect(valueOf(parseAirflow("1200 cfm", "si"))).toBeCloseTo(cubicFeetPerMinute(1200), 12);
    expect(valueOf(parseAirflow("570 L/s", "inch-pound"))).toBeCloseTo(0.57, 12);
    expect(valueOf(parseAirflow("1,200", "inch-pound"))).toBeCloseTo(cubicFeetPerMinute(1200), 12);
    expect(valueOf(parsePressure("0.08 in. w.g.", "si"))).toBeCloseTo(inchesOfWater(0.08), 12);
    expect(valueOf(parsePressure("20 Pa", "inch-pound"))).toBe(20);
    expect(valueOf(parseVelocity("1500", "inch-pound"))).toBeCloseTo(feetPerMinute(1500), 12);
    expect(valueOf(parseTemperature("55", "inch-pound"))).toBeCloseTo(285.93, 2);
    expect(valueOf(parseTemperature("13 C", "inch-pound"))).toBeCloseTo(286.15, 9);
    expect(valueOf(parseFrictionRate("0.08", "inch-pound"))).toBeCloseTo(inchesOfWaterPer100Feet(0.08), 12);
  });

  it("refuses a unit of something else", () => {
    expect(parseAirflow("1200 Pa", "inch-pound").ok).toBe(false);
    expect(parsePressure("20 cfm", "inch-pound").ok).toBe(false);
  });
});

describe("what is shown is read back as the same", () => {
  const systems = fc.constantFrom("inch-pound" as const, "si" as const);

  it("for lengths, to half of an eighth of an inch or of a centimeter", () => {
    fc.assert(
      fc.property(fc.double({ min: 0, max: 500, noNaN: true }), systems, (value, units) => {
        const back = valueOf(parseLength(formatLength(meters(value), units).text, units));
        expect(Math.abs(back - value)).toBeLessThanOrEqual((units === "si" ? 0.005 : inches(1 / 16)) + 1e-9);
      }),
    );
  });

  it("for sizes made in the shop", () => {
    const side = fc.integer({ min: 1, max: 960 });
    fc.assert(
      fc.property(side, side, fc.constantFrom("round", "rectangular", "flat-oval"), systems, (a, b, shape, units) => {
        const of = (n: number): Meters => (units === "si" ? meters(n / 1000) : inches(n / 8));
        const section: Section =
          shape === "round" ? { shape, diameter_m: of(a) } : { shape, width_m: of(a), height_m: of(b) };
        const back = valueOf(parseSize(formatSize(section, units).text, units));
        expect(back.shape).toBe(section.shape);
        for (const [name, value] of Object.entries(section))
          if (typeof value === "number") expect(Reflect.get(back, name)).toBeCloseTo(value, 9);
      }),
    );
  });

  it("for airflow, pressure and friction, to half of the last digit", () => {
    fc.assert(
      fc.property(fc.double({ min: 0, max: 50, noNaN: true }), systems, (value, units) => {
        const airflow = valueOf(parseAirflow(formatAirflow(cubicMetersPerSecond(value), units).text, units));
        expect(Math.abs(airflow - value)).toBeLessThanOrEqual(units === "si" ? 0.000501 : cubicFeetPerMinute(0.501));
        const pressure = valueOf(parsePressure(formatPressure(pascals(value), units).text, units));
        expect(Math.abs(pressure - value)).toBeLessThanOrEqual(units === "si" ? 0.501 : inchesOfWater(0.000501));
      }),
    );
    expect(formatFrictionRate(inchesOfWaterPer100Feet(0.08), "inch-pound").value).toBe("0.080");
  });
});

describe("figures", () => {
  it("show inches as a tape does", () => {
    expect(fractionOf(6.5, 8)).toBe("6½");
    expect(fractionOf(0.1875, 16)).toBe("3/16");
    expect(fractionOf(7.999, 8)).toBe("8");
    expect(formatLength(feet(12.5), "inch-pound").text).toBe("12′-6″");
    expect(formatLength(inches(11.99), "inch-pound").text).toBe("1′-0″");
    expect(formatThickness(inches(1.5), "inch-pound").text).toBe("1½ in.");
    expect(valueOf(parseThickness("1 1/2", "inch-pound"))).toBeCloseTo(inches(1.5), 12);
  });

  it("never show a minus before nothing", () => {
    expect(formatPressure(pascals(-0.01), "inch-pound").value).toBe("0.000");
    expect(formatVelocity(feetPerMinute(1320), "inch-pound").text).toBe("1,320 fpm");
  });

  it("show whole cents, and a unit price as fine as it is", () => {
    expect(formatMoney(6_612_062, "USD").text).toBe("$66,120.62");
    expect(formatMoney(-500, "USD").text).toBe("−$5.00");
    expect(formatMoneyChange(11_530, "USD").text).toBe("+$115.30");
    expect(formatUnitPrice(1_062_500, "USD").text).toBe("$1.0625");
    expect(formatUnitPrice(1_120_000, "USD").text).toBe("$1.12");
  });
});

describe("a counted thing", () => {
  it("is a bare number where it is counted in pieces", () => {
    expect(formatCounted(41, "ea", "inch-pound").text).toBe("41");
  });
  it("is measured in the person's units", () => {
    expect(formatCounted(3.048, "m", "inch-pound")).toMatchObject({ value: "10", unit: "ft" });
    expect(formatCounted(3.048, "m", "si")).toMatchObject({ value: "3.0", unit: "m" });
    expect(formatCounted(3.785411784, "L", "inch-pound")).toMatchObject({ value: "1.0", unit: "gal" });
    expect(formatCounted(45.359237, "kg", "inch-pound")).toMatchObject({ value: "100.0", unit: "lb" });
  });
});
