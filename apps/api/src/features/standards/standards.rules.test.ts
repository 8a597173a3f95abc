import { feet, inches, inchesOfWater, NO_COMPANY_STANDARDS, type CompanyStandards } from "@cleatwork/calc";
import { describe, expect, test } from "vitest";
import { standardsChanges } from "./standards.rules.ts";

const withGauge = (gauge: string): CompanyStandards => ({
  ...NO_COMPANY_STANDARDS,
  gauges: {
    name: "Our sheet",
    source: "the owner",
    standing: "own",
    rows: [
      {
        material: "galvanized",
        shape: "rectangular",
        pressureClass_pa: inchesOfWater(1),
        spacing_m: feet(5),
        sizes: [{ upTo_m: inches(30), gauge, reinforcement: { kind: "not-required" } }],
      },
    ],
  },
});

describe("what changed in the standards", () => {
  test("names chart, size, field, the old value and the new one", () => {
    expect(standardsChanges(withGauge("24 ga"), withGauge("22 ga"))).toEqual([
      {
        subject: "galvanized rectangular, 1 in. w.g. (249 Pa), joints 60 in. (1524 mm) apart, up to 30 in. (762 mm)",
        field: "gauge",
        before: "24 ga",
        after: "22 ga",
      },
    ]);
  });

  test("is nothing where nothing changed", () => {
    expect(standardsChanges(withGauge("24 ga"), withGauge("24 ga"))).toEqual([]);
  });

  test("a chart that is new has no value before", () => {
    const changes = standardsChanges(NO_COMPANY_STANDARDS, withGauge("24 ga"));
    expect(changes).toContainEqual(expect.objectContaining({ field: "gauge", before: null, after: "24 ga" }));
    expect(standardsChanges(withGauge("24 ga"), NO_COMPANY_STANDARDS)).toHaveLength(changes.length);
  });
});
