/** Wrap, liner, sections and weight of whole runs against worked examples. */
import { describe, expect, it } from "vitest";
import { KILOGRAMS_PER_POUND, METERS_PER_FOOT, METERS_PER_INCH, feet, inches, inchesOfWater } from "../quantity.ts";
import { cutStraight } from "../takeoff/cut-straight.ts";
import { aRun, rectangular, round, takeoffOf } from "./metal-system.ts";

const squareFeet = (area: number) => area / METERS_PER_FOOT ** 2;

describe("wrap: insulation makers' stretch-out table (2017), 1 1/2 in., printed to 0.1 ft²", () => {
  // Worked examples on the printed table; standing: computed.
  it.each([
    [24, 12, 30, "1.5 in.", 1.5, 80, 200],
    [24, 12, 30, "2.2 in.", 2.2, 83, 207.5],
    [36, 20, 50, "2.2 in.", 2.2, 123, 512.5],
  ])("%i × %i, %i ft in %s", (width, height, length, _label, thickness, stretchOut_in, printed) => {
    const { totals } = takeoffOf(
      aRun(rectangular(width, height), length, { insulation: { kind: "wrap", thickness_m: inches(thickness) } }),
    );
    expect(squareFeet(totals.insulationArea_m2)).toBeCloseTo(printed, 1);
    expect(squareFeet(totals.insulationArea_m2)).toBeCloseTo((stretchOut_in / 12) * length, 6);
    expect(totals.linerArea_m2).toBe(0);
  });

  it("round duct of 12 in. in 2 in. wrap is cut 12 in. wider than its girth", () => {
    const { totals } = takeoffOf(aRun(round(12), 10, { insulation: { kind: "wrap", thickness_m: inches(2) } }));
    expect(squareFeet(totals.insulationArea_m2)).toBeCloseTo(((Math.PI * 12 + 12) / 12) * 10, 6);
  });
});

describe("liner makes the metal grow: worked examples, standing computed", () => {
  it.each([
    [24, 12, 1, 10, 66.667, 60],
    [36, 18, 1, 20, 193.333, 180],
    [14, 10, 2, 8, 42.667, 32],
  ])("%i × %i clear, %i in. liner, %i ft", (width, height, thickness, length, metal, unlined) => {
    const liner = { insulation: { kind: "liner", thickness_m: inches(thickness) } } as const;
    const clear = takeoffOf(aRun(rectangular(width, height), length, { ...liner, sizesAre: "clear-inside" }));
    expect(squareFeet(clear.totals.netArea_m2)).toBeCloseTo(metal, 3);
    expect(squareFeet(clear.totals.linerArea_m2)).toBeCloseTo(metal, 3);
    expect(squareFeet(takeoffOf(aRun(rectangular(width, height), length)).totals.netArea_m2)).toBeCloseTo(unlined, 6);

    // Given as sheet metal, the metal is as given and the air has less.
    const given = takeoffOf(aRun(rectangular(width, height), length, { ...liner, sizesAre: "sheet-metal" }));
    expect(squareFeet(given.totals.netArea_m2)).toBeCloseTo(unlined, 6);
  });
});

describe("straight duct", () => {
  it("37 ft in sections of 56.5 in. are seven and one of 48.5 in. (worked example, standing computed)", () => {
    const { whole, rest } = cutStraight(feet(37), inches(56.5));
    expect(whole).toBe(7);
    expect(rest / METERS_PER_INCH).toBeCloseTo(48.5, 6);
  });

  it("G01: 24 × 12 of 24 ga, 56.5 in., weighs 32.657 lb (worked value, standing computed)", () => {
    // The shipped schedule would make this 26 ga at 1 in. w.g.; 3 in. w.g. makes it 24.
    const { pieces } = takeoffOf(aRun(rectangular(24, 12), 56.5 / 12, { pressureClass_pa: inchesOfWater(3) }));
    expect(pieces.map(({ gauge }) => gauge)).toEqual(["24 ga"]);
    expect(pieces[0]!.weight_kg / KILOGRAMS_PER_POUND).toBeCloseTo(32.657, 3);
  });

  it("G17: 14 in. round of 26 ga, 10 ft, weighs 33.207 lb (worked value, standing computed)", () => {
    const { pieces } = takeoffOf(aRun(round(14), 10, { roundConstruction: "longitudinal-seam" }));
    expect(pieces.map(({ gauge }) => gauge)).toEqual(["26 ga"]);
    expect(pieces[0]!.weight_kg / KILOGRAMS_PER_POUND).toBeCloseTo(33.207, 3);
  });
});
