import { describe, expect, it } from "vitest";
import { solve } from "../network/solve.ts";
import { cubicMetersPerSecond, inches, meters, pascalsPerMeter } from "../quantity.ts";
import { duct, oneDuct, ordinary } from "../testing/air-system-builder.ts";
import { sizeOptions } from "./size-options.ts";

const airflow = cubicMetersPerSecond(0.6);
const segment = duct("unit", "out", null);
const air = () => {
  const solved = solve(oneDuct(null, airflow));
  if (!solved.ok) throw new Error("the duct can be solved");
  return solved.value.air;
};
const optionsOf = (sizing: Partial<typeof ordinary.sizing> = {}, more = {}) =>
  sizeOptions({ ...ordinary, sizing: { ...ordinary.sizing, ...sizing } }, { ...segment, ...more }, airflow, air());

describe("size options at equal friction", () => {
  it("say what the solved duct says when it has that size", () => {
    const options = optionsOf();
    expect(new Set(options.map(({ section }) => section.shape))).toEqual(
      new Set(["round", "rectangular", "flat-oval"]),
    );
    for (const option of options) {
      const solved = solve(oneDuct(option.section, airflow));
      if (!solved.ok) throw new Error("the duct can be solved");
      const [result] = solved.value.segments;
      expect(option.meanVelocity_m_s).toBeCloseTo(result!.meanVelocity_m_s, 9);
      expect(option.frictionRate_pa_m).toBeCloseTo(result!.frictionRate_pa_m, 9);
    }
  });

  it("keep the rate, and one step narrower would not", () => {
    const rate = ordinary.sizing.frictionRate_pa_m;
    for (const { section, frictionRate_pa_m } of optionsOf()) {
      expect(frictionRate_pa_m).toBeLessThanOrEqual(rate * (1 + 1e-9));
      if (section.shape !== "rectangular" || section.width_m - inches(2) < section.height_m) continue;
      const narrower = solve(oneDuct({ ...section, width_m: meters(section.width_m - inches(2)) }, airflow));
      if (!narrower.ok) throw new Error("the duct can be solved");
      expect(narrower.value.segments[0]!.frictionRate_pa_m).toBeGreaterThan(rate);
    }
  });

  it("stay under the greatest height, and are round alone where the duct is flexible", () => {
    for (const { section } of optionsOf({ maximumHeight_m: inches(12) }))
      expect(
        section.shape === "round" ? section.diameter_m : "height_m" in section ? section.height_m : 0,
      ).toBeLessThanOrEqual(inches(12) + 1e-6);
    expect(optionsOf({}, { flexible: true }).map(({ section }) => section.shape)).toEqual(["round"]);
  });

  it("are none where no standard size carries the air", () => {
    expect(optionsOf({ frictionRate_pa_m: pascalsPerMeter(1e-9) })).toEqual([]);
  });
});
