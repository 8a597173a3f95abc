import { describe, expect, it } from "vitest";
import { cubicFeetPerMinute, feet, meters, pounds, squareFeet } from "../quantity.ts";
import { checkRatios, ratiosOf, US_RATIO, type TakeoffRatios } from "./ratios.ts";

const straight = { kind: "straight", length_m: feet(10), weight_kg: pounds(60), netArea_m2: squareFeet(50) } as const;
const elbow = { kind: "elbow", length_m: meters(0), weight_kg: pounds(20), netArea_m2: squareFeet(16) } as const;
const flexible = { kind: "flexible", length_m: feet(8), weight_kg: pounds(0), netArea_m2: squareFeet(0) } as const;

describe("ratios of a takeoff", () => {
  it("are pounds per cfm, pounds per foot of made straight, square feet per fitting", () => {
    // 80 lb over 400 cfm, 80 lb over 10 ft, 16 ft² in one fitting: by hand.
    const ratios = ratiosOf([straight, elbow, flexible], cubicFeetPerMinute(400));
    const us = (ratio: keyof TakeoffRatios) => (ratios[ratio] ?? 0) * US_RATIO[ratio].factor;
    expect(us("metalPerAirflow_kg_per_m3s")).toBeCloseTo(0.2, 9);
    expect(us("metalPerLength_kg_per_m")).toBeCloseTo(8, 9);
    expect(us("areaPerFitting_m2")).toBeCloseTo(16, 9);
  });

  it("are not there where there is nothing to divide by", () => {
    expect(ratiosOf([], 0)).toEqual({
      metalPerAirflow_kg_per_m3s: null,
      metalPerLength_kg_per_m: null,
      areaPerFitting_m2: null,
    });
  });
});

describe("a ratio beside the company's history", () => {
  const of = (value: number): TakeoffRatios => ({
    metalPerAirflow_kg_per_m3s: value,
    metalPerLength_kg_per_m: null,
    areaPerFitting_m2: null,
  });
  const check = (value: number, history: readonly number[]) => checkRatios(of(value), history.map(of), 0.5);

  it("is held against the median: one odd job does not move it", () => {
    expect(check(10, [9, 10, 11, 100])[0]).toMatchObject({ usual: 10.5, jobs: 4, isFarOff: false });
  });
  it("is far off by half again, and by the same share below", () => {
    expect(check(15.1, [10])[0]?.isFarOff).toBe(true);
    expect(check(14.9, [10])[0]?.isFarOff).toBe(false);
    expect(check(6.6, [10])[0]?.isFarOff).toBe(true);
    expect(check(6.7, [10])[0]?.isFarOff).toBe(false);
  });
  it("says nothing without a job to compare with", () => {
    expect(check(10, [])).toEqual([]);
  });
});
