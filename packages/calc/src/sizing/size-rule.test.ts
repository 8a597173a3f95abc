import { describe, expect, it } from "vitest";
import type { AirSegment, SizingRule } from "../air-system.ts";
import { inches, meters, metersPerSecond, pascalsPerMeter } from "../quantity.ts";
import { oneDuct, ordinary } from "../testing/air-system-builder.ts";
import { findingIds, solved } from "../testing/answers.ts";
import { standardCandidates } from "./candidates.ts";

const sized = (airflow: number, rule: Partial<SizingRule>, segment: Partial<AirSegment> = {}) => {
  const sizing = { ...ordinary.sizing, ...rule };
  const solution = solved(oneDuct(null, airflow, { ...segment, system: { sizing, ...{ limits: ordinary.limits } } }));
  return { solution, segment: solution.segments[0]! };
};

describe("equal friction", () => {
  it("takes the least standard duct that keeps the friction rate", () => {
    const { segment } = sized(0.5, { frictionRate_pa_m: pascalsPerMeter(0.8) });
    expect(segment.sized).toBe("by-rule");
    expect(segment.frictionRate_pa_m).toBeLessThanOrEqual(0.8);
    const { section } = segment;
    const index = standardCandidates.round.findIndex(
      (candidate) => JSON.stringify(candidate.section) === JSON.stringify(section),
    );
    const smaller = solved(oneDuct(standardCandidates.round[index - 1]!.section, 0.5)).segments[0]!;
    expect(smaller.frictionRate_pa_m).toBeGreaterThan(0.8);
  });

  it("keeps the velocity limit of the duct class too", () => {
    const { segment } = sized(8, { frictionRate_pa_m: pascalsPerMeter(8) });
    expect(segment.meanVelocity_m_s).toBeLessThanOrEqual(12);
    expect(segment.frictionRate_pa_m).toBeLessThan(4);
  });

  it("keeps rectangular duct under the height there is", () => {
    const { segment } = sized(1.5, { shape: "rectangular", maximumHeight_m: inches(12) });
    expect(segment.section).toMatchObject({ shape: "rectangular" });
    expect(segment.section.shape === "rectangular" && segment.section.height_m).toBeLessThanOrEqual(inches(12));
    expect(segment.frictionRate_pa_m).toBeLessThanOrEqual(0.8);
  });

  it("makes flat oval from the round duct of the same girth", () => {
    const { segment } = sized(0.8, { shape: "flat-oval", maximumHeight_m: inches(10) });
    expect(segment.section).toMatchObject({ shape: "flat-oval" });
    expect(segment.frictionRate_pa_m).toBeLessThanOrEqual(0.8);
  });

  it("sizes flexible duct round, for its slack, whatever the rule's shape", () => {
    const rigid = sized(0.1, { shape: "round" }).segment;
    const flexible = sized(0.1, { shape: "rectangular" }, { flexible: true }).segment;
    expect(flexible.section.shape).toBe("round");
    expect(flexible.frictionRate_pa_m).toBeLessThanOrEqual(0.8);
    expect(flexible.area_m2).toBeGreaterThan(rigid.area_m2);
  });

  it("sizes lined duct on its clear inside", () => {
    const insulation = { kind: "liner", thickness_m: meters(0.0254) } as const;
    const bare = sized(0.8, { shape: "rectangular" }).segment;
    const lined = sized(0.8, { shape: "rectangular" }, { insulation }).segment;
    expect(lined.frictionRate_pa_m).toBeLessThanOrEqual(0.8);
    expect(lined.area_m2).toBeGreaterThan(bare.area_m2);
  });

  it("takes the largest and says so when none is large enough", () => {
    const { solution, segment } = sized(200, {});
    expect(segment.section).toEqual({ shape: "round", diameter_m: inches(84) });
    expect(findingIds(solution)[0]).toBe("size-not-found:unit-out");
    expect(solution.findings[0]).toMatchObject({ severity: "stop", value: 200, unit: "m³/s" });
  });

  it("uses the lowest there are when the height allows nothing", () => {
    const { segment } = sized(0.05, { shape: "rectangular", maximumHeight_m: inches(2) });
    expect(segment.section).toMatchObject({ height_m: inches(4) });
  });
});

describe("velocity", () => {
  it("takes the least standard duct under the velocity limit, whatever the friction", () => {
    const { segment } = sized(0.5, { method: "velocity" });
    expect(segment.meanVelocity_m_s).toBeLessThanOrEqual(metersPerSecond(12));
    expect(segment.frictionRate_pa_m).toBeGreaterThan(0.8);
  });
});

describe("standard sizes", () => {
  it("stay within four to one", () => {
    for (const { section } of [...standardCandidates.rectangular, ...standardCandidates["flat-oval"]]) {
      if (section.shape !== "rectangular" && section.shape !== "flat-oval") throw new Error(section.shape);
      expect(section.width_m / section.height_m).toBeLessThanOrEqual(4 + 1e-9);
    }
  });

  it("come least metal first", () => {
    for (const candidates of Object.values(standardCandidates)) {
      const perimeters = candidates.map(({ perimeter }) => perimeter);
      expect(perimeters).toEqual([...perimeters].sort((a, b) => a - b));
    }
  });
});
