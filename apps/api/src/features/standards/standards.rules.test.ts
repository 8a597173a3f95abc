import {
  feet,
  inches,
  inchesOfWater,
  NO_COMPANY_STANDARDS,
  shippedPractice,
  shippedStandards,
  type CompanyStandards,
} from "@cleatwork/calc";
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

  test("names the fitting and both coefficients", () => {
    const own = { ...shippedPractice, source: "our own readings" };
    const before = { ...NO_COMPANY_STANDARDS, coefficients: own };
    const after = { ...NO_COMPANY_STANDARDS, coefficients: { ...own, vanedElbow: 0.15 } };
    expect(standardsChanges(before, after)).toEqual([
      { subject: "Square-throat elbow with vanes", field: "coefficient", before: "0.25", after: "0.15" },
    ]);
  });

  test("is nothing where nothing changed", () => {
    expect(standardsChanges(withGauge("24 ga"), withGauge("24 ga"))).toEqual([]);
  });

  test("a chart that is new is ours from now on, beside the shipped one that it stands before", () => {
    const changes = standardsChanges(NO_COMPANY_STANDARDS, withGauge("24 ga"));
    expect(changes[0]).toEqual({
      subject: "galvanized rectangular",
      field: "schedule",
      before: "shipped",
      after: "ours",
    });
    // The shipped chart of 1 in. at 5 ft has 26 ga up to 30 in.
    expect(changes).toContainEqual(expect.objectContaining({ field: "gauge", before: "26 ga", after: "24 ga" }));
  });

  test("a copy of what is shipped with one cell changed is one cell, and whose it is", () => {
    const rows = shippedStandards.gauges.rows.filter(({ shape }) => shape === "flat-oval");
    const [first, ...rest] = rows;
    const sizes = first!.sizes.map((size, index) => (index === 0 ? { ...size, gauge: "18 ga" } : size));
    const own = { name: "Our sheet", source: "", standing: "own" as const, rows: [{ ...first!, sizes }, ...rest] };
    const changes = standardsChanges(NO_COMPANY_STANDARDS, { ...NO_COMPANY_STANDARDS, gauges: own });
    expect(changes.filter(({ field }) => field !== "schedule")).toEqual([
      expect.objectContaining({ field: "gauge", before: "24 ga", after: "18 ga" }),
    ]);
  });
});
