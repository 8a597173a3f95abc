/** Sheet weights against the printed tables, gauges against tables other than the one they were read from. */
import { describe, expect, it } from "vitest";
import type { Material } from "../air-system.ts";
import {
  KILOGRAMS_PER_POUND,
  METERS_PER_FOOT,
  METERS_PER_INCH,
  feet,
  inches,
  inchesOfWater,
  pascals,
} from "../quantity.ts";
import { findGauge, type GaugeQuestion } from "../takeoff/gauge.ts";
import { shippedGauges } from "../takeoff/gauge-schedule.table.ts";
import { findSheet } from "../takeoff/sheet-weights.table.ts";

const poundsPerSquareFoot = (material: Material, label: string): number => {
  const sheet = findSheet(material, label);
  if (!sheet) throw new Error(`no sheet ${label} of ${material}`);
  return (sheet.weight_kg_m2 * METERS_PER_FOOT ** 2) / KILOGRAMS_PER_POUND;
};

describe("sheet weights", () => {
  const source = {
    work: "SMACNA, HVAC Duct Construction Standards, Metal and Flexible, 2nd ed. 1995, open legal copy",
    place: "appendix A: kg/m² column, printed beside lb/ft²",
    printedTo: 0.01,
    standing: "found",
  } as const;
  // The metric column is printed on its own, so it also catches a slip in the inch-pound one.
  const printed_kg_m2 = [
    ["30 ga", 3.2],
    ["28 ga", 3.81],
    ["26 ga", 4.42],
    ["24 ga", 5.64],
    ["22 ga", 6.86],
    ["20 ga", 8.08],
    ["18 ga", 10.52],
    ["16 ga", 12.96],
    ["14 ga", 16.01],
    ["12 ga", 22.11],
    ["10 ga", 28.21],
  ] as const;

  it.each(printed_kg_m2)(`galvanized %s weighs %f kg/m² (${source.place})`, (label, printed) => {
    // The source converts with a rounded factor: up to 0.05 % beside half of the last digit.
    const tolerance = source.printedTo / 2 + printed * 5e-4;
    expect(Math.abs((findSheet("galvanized", label)?.weight_kg_m2 ?? 0) - printed)).toBeLessThan(tolerance);
  });

  it("steel of both kinds weighs what its thickness does", () => {
    // Basis printed with the tables: 41.82 lb/ft² for an inch of black steel, 41.99 of 300 series stainless.
    for (const [material, basis] of [
      ["black-steel", 41.82],
      ["stainless", 41.99],
    ] as const) {
      for (const gauge of [26, 24, 22, 20, 18, 16, 14, 12, 10]) {
        const sheet = findSheet(material, `${gauge} ga`)!;
        const thickness_in = sheet.thickness_m / METERS_PER_INCH;
        expect(Math.abs(poundsPerSquareFoot(material, `${gauge} ga`) - basis * thickness_in)).toBeLessThan(0.005);
      }
    }
  });

  it("aluminum weighs 14.256 lb/ft² for an inch", () => {
    for (const label of ["0.025 in.", "0.032 in.", "0.040 in.", "0.050 in.", "0.063 in.", "0.071 in.", "0.090 in."]) {
      expect(poundsPerSquareFoot("aluminum", label)).toBeCloseTo(14.256 * Number.parseFloat(label), 2);
    }
  });

  it("one gauge number is another sheet in another metal", () => {
    const weights = (["galvanized", "stainless", "black-steel"] as const).map((m) => poundsPerSquareFoot(m, "24 ga"));
    expect(new Set(weights).size).toBe(3);
    expect(findSheet("aluminum", "24 ga")).toBeNull();
  });

  it.each([
    [12, "24 ga", 3.78],
    [18, "26 ga", 4.38],
    [30, "22 ga", 11.22],
    [36, "20 ga", 15.82],
    [48, "18 ga", 27.41],
    [60, "16 ga", 42.09],
  ] as const)(
    "round %i in. of %s weighs %f lb/ft with 1.5 in. of seam (appendix p. A.10)",
    (diameter, gauge, printed) => {
      const perFoot = ((Math.PI * diameter + 1.5) / 12) * poundsPerSquareFoot("galvanized", gauge);
      // The printed table differs from its own sheet weights by up to 0.17 %.
      expect(Math.abs(perFoot - printed) / printed).toBeLessThan(0.002);
    },
  );
});

const rectangularAt = (side_in: number, class_inwg: number, spacing_ft = 5): GaugeQuestion => ({
  spacing_m: feet(spacing_ft),
  material: "galvanized",
  shape: "rectangular",
  size_m: inches(side_in),
  pressureClass_pa: inchesOfWater(class_inwg),
  construction: "longitudinal-seam",
});
const roundAt = (diameter_in: number, class_inwg: number, construction: GaugeQuestion["construction"] = "spiral") => ({
  ...rectangularAt(diameter_in, class_inwg),
  shape: "round" as const,
  construction,
});
const gaugeOf = (question: GaugeQuestion) => findGauge(shippedGauges, question);

describe("gauges", () => {
  it.each([
    [10, "26 ga"],
    [20, "26 ga"],
    [26, "26 ga"],
    [30, "24 ga"],
    [36, "22 ga"],
  ] as const)("a %i in. side at 2 in. w.g. is %s in the publisher's short table too (p. A.14, 5 ft)", (side, gauge) => {
    expect(gaugeOf(rectangularAt(side, 2))).toBe(gauge);
  });

  it.each([
    // Table 1-4 (1 in. w.g.) and table 1-5 (2 in. w.g.), 5 ft column; standing: found in the open legal copy.
    [31, 1, "24 ga"],
    [54, 1, "22 ga"],
    [84, 1, "18 ga"],
    [48, 2, "20 ga"],
    [72, 2, "16 ga"],
    [24, 4, "22 ga" as const],
  ] as const)("a %i in. side at %i in. w.g. is %s at 5 ft", (side, pressure, gauge) => {
    expect(gaugeOf(rectangularAt(side, pressure))).toBe(gauge);
  });

  it("suction asks for heavier round duct than pressure", () => {
    expect(gaugeOf(roundAt(24, 2))).toBe("26 ga");
    expect(gaugeOf(roundAt(24, -2))).toBe("22 ga");
  });

  it("the sign changes nothing for rectangular duct", () => {
    expect(gaugeOf(rectangularAt(40, -2))).toBe(gaugeOf(rectangularAt(40, 2)));
  });

  it("a fitting on spiral duct is made as duct with a seam", () => {
    expect(gaugeOf(roundAt(16, 2, "spiral"))).toBe("26 ga");
    expect(gaugeOf(roundAt(16, 2, "fitting"))).toBe("24 ga");
  });

  it("a class typed in pascals finds the column of its inches", () => {
    const metric = { ...rectangularAt(40, 1), pressureClass_pa: pascals(250) };
    expect(gaugeOf(metric)).toBe(gaugeOf(rectangularAt(40, 1)));
  });

  it.each([
    ["a side past the last row", rectangularAt(97, 1)],
    ["a pressure past the last class", rectangularAt(12, 11)],
    ["suction on flat oval", { ...roundAt(20, -1), shape: "flat-oval" as const }],
    ["rectangular aluminum", { ...rectangularAt(12, 1), material: "aluminum" as const }],
    ["suction past what copies agree on", roundAt(60, -10)],
    ["joints farther apart than any column", rectangularAt(24, 1, 12)],
  ])("%s has no gauge", (_case, question) => {
    expect(gaugeOf(question)).toBeNull();
  });

  it("a larger size is never lighter, a higher class neither", () => {
    const number = (question: GaugeQuestion) => Number.parseInt(gaugeOf(question) ?? "0", 10);
    for (const pressure of [0.5, 1, 2, 3, 4, 6, 10]) {
      for (let side = 6; side <= 96; side += 2) {
        const here = number(rectangularAt(side, pressure));
        expect(number(rectangularAt(side + 2, pressure))).toBeLessThanOrEqual(here);
        expect(number(rectangularAt(side, pressure + 1))).toBeLessThanOrEqual(here);
      }
    }
  });

  it("every label of the schedule has a sheet", () => {
    for (const { material, sizes } of shippedGauges.rows) {
      for (const { gauge, reinforcement } of sizes) {
        if (gauge === null) expect(["blank", "not-designed"]).toContain(reinforcement.kind);
        else expect(findSheet(material, gauge)).not.toBeNull();
      }
    }
  });
});
