import { describe, expect, it } from "vitest";
import { feet, inches, inchesOfWater, meters } from "../quantity.ts";
import { shippedGauges } from "./gauge-schedule.table.ts";
import type { GaugeChart, GaugeSchedule } from "./gauge-schedule.ts";
import { gaugeReader, missingWords, NO_OVERRIDES, type PieceQuestion } from "./gauge.ts";

const galvanized = { material: "galvanized", pressureClass_pa: inchesOfWater(1) } as const;
const duct = (width_in: number, height_in: number, spacing_ft = 5): PieceQuestion => ({
  shape: "rectangular",
  construction: "longitudinal-seam",
  size_m: inches(Math.max(width_in, height_in)),
  otherSize_m: inches(Math.min(width_in, height_in)),
  spacing_m: feet(spacing_ft),
});
const shippedOnly = gaugeReader({ company: null, shipped: shippedGauges }, galvanized);

const ownChart: GaugeChart = {
  material: "galvanized",
  shape: "rectangular",
  pressureClass_pa: inchesOfWater(1),
  sizes: [
    { upTo_m: inches(18), gauge: "24 ga", reinforcement: { kind: "not-required" }, joint: "slip-and-drive" },
    { upTo_m: inches(30), gauge: null, reinforcement: { kind: "not-designed" } },
    { upTo_m: inches(42), gauge: null, reinforcement: { kind: "blank" } },
    { upTo_m: inches(60), gauge: "20 ga", reinforcement: { kind: "required", grade: "F", spacing_m: feet(5) } },
  ],
};
const own: GaugeSchedule = { name: "Our sheet", source: "the owner", standing: "own", rows: [ownChart] };
const withOwn = gaugeReader({ company: own, shipped: shippedGauges }, galvanized);

describe("who decides the gauge", () => {
  it("is the shipped schedule, where nobody says otherwise", () => {
    expect(shippedOnly(duct(24, 12), NO_OVERRIDES)).toMatchObject({ gauge: "26 ga", decider: "shipped" });
  });

  it("is the company's schedule before the shipped one", () => {
    expect(withOwn(duct(12, 12), NO_OVERRIDES)).toMatchObject({
      gauge: "24 ga",
      decider: "company",
      source: "Our sheet",
    });
  });

  it("is the spec before the company's schedule", () => {
    expect(withOwn(duct(12, 12), { piece: null, spec: "22 ga" })).toMatchObject({
      gauge: "22 ga",
      decider: "spec",
      scheduled: "24 ga",
    });
  });

  it("is the piece itself before everything", () => {
    expect(withOwn(duct(12, 12), { piece: "18 ga", spec: "22 ga" })).toMatchObject({
      gauge: "18 ga",
      decider: "piece",
    });
  });

  it("is the shipped schedule for a shape that the company has no chart of", () => {
    const round = { shape: "round", construction: "spiral", size_m: inches(10), spacing_m: feet(10) } as const;
    expect(withOwn(round, NO_OVERRIDES).decider).toBe("shipped");
  });
});

describe("outside the company's own schedule", () => {
  it.each([
    ["a size past its last row", duct(72, 12), "size-beyond"],
    ["a size printed as not designed", duct(24, 12), "not-designed"],
    ["a blank cell", duct(40, 12), "blank"],
  ] as const)("%s is told, though the shipped schedule has it", (_what, piece, code) => {
    const answer = withOwn(piece, NO_OVERRIDES);
    expect(answer).toMatchObject({ gauge: null, decider: null, missing: { code } });
    expect(shippedOnly(piece, NO_OVERRIDES).gauge).not.toBeNull();
  });

  it("a pressure past its last class is told with the class", () => {
    const reader = gaugeReader({ company: own, shipped: shippedGauges }, { ...galvanized, pressureClass_pa: 500 });
    const { missing } = reader(duct(12, 12), NO_OVERRIDES);
    expect(missing).toMatchObject({ code: "class-beyond" });
    expect(missing && missingWords(missing)).toContain("1.0 in. of water (249 Pa)");
  });

  it("a gauge means nothing without its metal: a steel label is no sheet of aluminum", () => {
    const reader = gaugeReader(
      { company: null, shipped: shippedGauges },
      { material: "aluminum", pressureClass_pa: inchesOfWater(1) },
    );
    const answer = reader(duct(12, 12), { piece: "24 ga", spec: null });
    expect(answer).toMatchObject({ gauge: null, missing: { code: "no-such-sheet", gauge: "24 ga" } });
  });
});

describe("blank, not required, not designed", () => {
  const at = (width_in: number, spacing_ft: number) => shippedOnly(duct(width_in, 6, spacing_ft), NO_OVERRIDES);

  it("are three answers of one table (1-4: 1 in. of water)", () => {
    // 12 in.: not required at any spacing; 72 in. at 10 ft: not designed; 96 in. at 10 ft: blank.
    expect(at(12, 10)).toMatchObject({ gauge: "26 ga", reinforcement: { kind: "not-required" }, missing: null });
    expect(at(72, 10)).toMatchObject({ gauge: null, missing: { code: "not-designed" } });
    expect(at(96, 10)).toMatchObject({ gauge: null, missing: { code: "blank" } });
  });
});

describe("reinforcement", () => {
  it("of 54 × 18 in. at 1 in. of water, 5 ft: grade F on 22 ga, none on the short sides", () => {
    // SMACNA 1995, reading guide (worked reading); standing: found.
    expect(shippedOnly(duct(54, 18), NO_OVERRIDES)).toMatchObject({
      gauge: "22 ga",
      reinforcement: { kind: "required", grade: "F", spacing_m: feet(5) },
      otherReinforcement: { kind: "not-required" },
    });
  });

  it("closer joints allow lighter sheet: 48 in. at 1 in. of water is 22 ga at 5 ft, 24 ga at 4 ft", () => {
    // Table 1-4, row 43 to 48 in.; standing: found.
    expect(shippedOnly(duct(48, 12, 5), NO_OVERRIDES).gauge).toBe("22 ga");
    expect(shippedOnly(duct(48, 12, 4), NO_OVERRIDES).gauge).toBe("24 ga");
    // Joints 56 1/2 in. apart are within 5 ft and not within 4.
    expect(shippedOnly({ ...duct(48, 12), spacing_m: inches(56.5) }, NO_OVERRIDES).gauge).toBe("22 ga");
  });

  it("of round duct under suction is a ring: 48 in. at 10 in. of water, 2 in. angles every 6 ft", () => {
    // Table 3-2B, 48 in., -10 in., spiral: 18F6; standing: found.
    const reader = gaugeReader(
      { company: null, shipped: shippedGauges },
      { material: "galvanized", pressureClass_pa: inchesOfWater(-10) },
    );
    expect(
      reader({ shape: "round", construction: "spiral", size_m: inches(48), spacing_m: feet(10) }, NO_OVERRIDES),
    ).toMatchObject({ gauge: "18 ga", reinforcement: { kind: "required", grade: "ring F", spacing_m: feet(6) } });
  });

  it("is not asked of sheet that does without: 22 ga set on an 18 in. side", () => {
    const answer = shippedOnly(duct(18, 18), { piece: "22 ga", spec: null });
    expect(answer.reinforcement).toEqual({ kind: "not-required" });
    expect(shippedOnly(duct(18, 18), NO_OVERRIDES).reinforcement.kind).toBe("required");
  });

  it("a millimeter size finds the row of its inches", () => {
    expect(shippedOnly({ ...duct(12, 12), size_m: meters(0.3048), spacing_m: meters(1.525) }, NO_OVERRIDES).gauge).toBe(
      "26 ga",
    );
  });
});
