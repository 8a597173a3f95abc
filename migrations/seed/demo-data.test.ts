import { feet, inches, meters, NO_COMPANY_STANDARDS } from "@cleatwork/calc";
import type { LayoutRecord, LevelRecord } from "@cleatwork/contracts";
import { checkLayout, computeNumbers, createLayout } from "@cleatwork/layout";
import { describe, expect, test } from "vitest";
import { layoutOfSystem, sectionFrom } from "./layout-builder.ts";
import { building } from "./library/plan.ts";
import { newId } from "./new-id.ts";
import { labor, MARGIN_FLOOR_BP, priceBook, rates, STALE_AFTER_DAYS } from "./price-book.ts";
import { library, projects, type DemoProject } from "./projects.ts";
import { specs } from "./specs.ts";

const TODAY = new Date("2026-12-01T12:00:00Z");

function numbersOf(project: DemoProject) {
  const level: LevelRecord = {
    kind: "level",
    id: newId("lvl"),
    name: "Level 1",
    elevation_m: meters(0),
    underlay: null,
  };
  const known = specs.map((spec) => ({ ...spec, id: newId("spc") }));
  const records: LayoutRecord[] = [level];
  for (const system of project.systems) {
    const spec = known.find(({ name }) => name === system.spec);
    if (!spec) throw new Error(`${system.tag} is built by ${system.spec}, which is no spec of the demo`);
    const { changes } = layoutOfSystem(system, {
      levelId: level.id,
      specId: spec.id,
      altitude_ft: project.altitude_ft,
    });
    records.push(...changes.flatMap(({ after }) => (after ? [after] : [])));
  }
  const numbers = computeNumbers({
    records,
    specs: known,
    altitude_m: feet(project.altitude_ft),
    frictionBasis: "hydraulic-diameter",
    currency: "USD",
    items: priceBook(TODAY),
    settings: {
      labor: labor.map((rate) => ({ ...rate, parts: [...rate.parts] })),
      rates,
      staleAfterDays: STALE_AFTER_DAYS,
      marginFloor_bp: MARGIN_FLOOR_BP,
      conditionFactor: 1,
      version: 1,
    },
    standards: NO_COMPANY_STANDARDS,
    pricing: { rates: null, conditionFactor: null, conditionReason: "", adds: [], version: 1 },
    pricedOn: TODAY.toISOString().slice(0, 10),
  });
  return { records, ...numbers };
}

describe.each(projects.map((project) => [project.name, project] as const))("%s", (_name, project) => {
  const { records, problems, estimate, takeoffs } = numbersOf(project);

  test("is sound and can be solved", () => {
    expect(checkLayout(createLayout(records))).toEqual([]);
    expect(problems).toEqual([]);
  });

  test("finds every price it needs in the demo’s book", () => {
    expect(estimate?.warnings.filter(({ severity }) => severity === "stop")).toEqual([]);
    expect(takeoffs.flatMap(({ findings }) => findings).filter(({ severity }) => severity === "stop")).toEqual([]);
  });
});

describe("the library", () => {
  const { solutions, systems, records } = numbersOf(library);

  test("has more than sixty segments in four systems and every shape of duct", () => {
    const segments = records.flatMap((record) => (record.kind === "segment" ? [record] : []));
    expect(segments.length).toBeGreaterThan(60);
    expect(systems.map(({ service }) => service).toSorted()).toEqual(["exhaust", "outside-air", "return", "supply"]);
    expect(new Set(segments.map(({ section }) => section?.shape))).toEqual(
      new Set(["round", "rectangular", "flat-oval", "annular"]),
    );
  });

  test("lies within its building", () => {
    for (const record of records) {
      if (record.kind !== "node") continue;
      expect(record.x_m).toBeGreaterThanOrEqual(0);
      expect(record.x_m).toBeLessThanOrEqual(feet(building.width_ft));
      expect(record.y_m).toBeGreaterThanOrEqual(0);
      expect(record.y_m).toBeLessThanOrEqual(feet(building.depth_ft));
    }
  });

  test("shows what the air check is for: a short path, a trunk too fast, a flexible duct too long", () => {
    const codes = new Set(solutions.flatMap(({ findings }) => findings.map(({ code }) => code)));
    expect(codes).toContain("pressure-short");
    expect(codes).toContain("velocity-over-limit");
    expect(codes).toContain("flexible-too-long");
  });
});

describe("a size as it is read off a plan", () => {
  test.each([
    ["24x12", { shape: "rectangular", width_m: inches(24), height_m: inches(12) }],
    ["14", { shape: "round", diameter_m: inches(14) }],
    ["10 flex", { shape: "round", diameter_m: inches(10) }],
    ["18x8 oval", { shape: "flat-oval", width_m: inches(18), height_m: inches(8) }],
    ["14/4 ring", { shape: "annular", outerDiameter_m: inches(14), innerDiameter_m: inches(4) }],
  ])("%s", (size, section) => {
    expect(sectionFrom(size)).toEqual(section);
  });

  test.each(["", "24x", "14 oval", "24/12", "twelve"])("“%s” is none", (size) => {
    expect(() => sectionFrom(size)).toThrow(/is no size/);
  });
});
