import {
  inches,
  inchesOfWater,
  NO_COMPANY_STANDARDS,
  shippedPractice,
  shippedStandards,
  type CompanyStandards,
  type GaugeRow,
} from "@cleatwork/calc";
import type { Numbers } from "@cleatwork/layout";
import { randomUUID } from "node:crypto";
import { describe, expect, test } from "vitest";
import { aProject } from "../../testing/a-project.ts";
import { adding, aSmallSystem } from "../../testing/a-small-system.ts";
import { foundCompany, type TestCompany } from "../../testing/found-company.ts";
import { computeProject } from "../pricing/index.ts";

const TODAY = "2026-12-01";

/** Every size and shape of galvanized duct in one sheet: whatever is drawn, the company's schedule holds it. */
const allIn = (gauge: string, more: Partial<GaugeRow> = {}): CompanyStandards => ({
  ...NO_COMPANY_STANDARDS,
  gauges: {
    name: "Our sheet",
    source: "the owner",
    standing: "own",
    rows: (["rectangular", "round"] as const).map((shape) => ({
      material: "galvanized",
      shape,
      pressureClass_pa: inchesOfWater(10),
      sizes: [{ upTo_m: inches(120), gauge, reinforcement: { kind: "not-required" }, ...more }],
    })),
  },
});

const save = (
  { owner }: TestCompany,
  version: number,
  document: CompanyStandards,
  { effectiveOn = TODAY, note = "" } = {},
) => owner.ok("updateStandards", { version, body: { effectiveOn, note, document } });

describe("a company's standards", () => {
  test("are the shipped ones until an owner writes some", async () => {
    const { estimator } = await foundCompany();
    expect(await estimator.ok("getStandards")).toEqual({
      version: 0,
      shownVersion: 0,
      effectiveOn: null,
      document: NO_COMPANY_STANDARDS,
    });
  });

  test("are written by an owner and read by an estimator", async () => {
    const company = await foundCompany();
    const document = allIn("22 ga");
    expect(await save(company, 0, document)).toMatchObject({ version: 1, effectiveOn: TODAY });
    expect(await company.estimator.ok("getStandards")).toMatchObject({ version: 1, document });
    const body = { effectiveOn: TODAY, note: "", document };
    expect((await company.estimator.refused("updateStandards", { version: 1, body })).status).toBe(403);
    expect((await company.foreman.refused("getStandards")).status).toBe(403);
  });

  test("saved on an old version are refused, and two at once give one version", async () => {
    const company = await foundCompany();
    const both = await Promise.all(
      ["22 ga", "20 ga"].map((gauge) =>
        company.owner.send("updateStandards", {
          version: 0,
          body: { effectiveOn: TODAY, note: "", document: allIn(gauge) },
        }),
      ),
    );
    expect(both.map(({ status }) => status).sort()).toEqual([200, 412]);
    expect((await company.estimator.ok("getStandards")).version).toBe(1);
  });

  test("of another company stay there", async () => {
    const [first, second] = [await foundCompany(), await foundCompany()];
    await save(first, 0, allIn("22 ga"));
    expect(await second.estimator.ok("getStandards")).toMatchObject({ version: 0, document: NO_COMPANY_STANDARDS });
    expect((await second.estimator.ok("listStandardsHistory")).items).toEqual([]);
  });

  test("take effect on their date, not before", async () => {
    const company = await foundCompany();
    await save(company, 0, allIn("22 ga"));
    await save(company, 1, allIn("20 ga"), { effectiveOn: "2027-01-01" });
    await save(company, 2, allIn("18 ga"), { effectiveOn: "2026-12-15" });
    const on = async (day: string) => {
      const { shownVersion, version } = await company.estimator.ok("getStandards", { query: { on: day } });
      return [shownVersion, version];
    };
    expect(await on("2026-11-30")).toEqual([0, 3]);
    expect(await on("2026-12-14")).toEqual([1, 3]);
    expect(await on("2026-12-15")).toEqual([3, 3]);
    expect(await on("2027-01-01")).toEqual([2, 3]);
  });

  test("tell who changed which value, in the history and in the audit trail", async () => {
    const company = await foundCompany();
    await save(company, 0, allIn("22 ga"));
    await save(company, 1, allIn("20 ga"), { note: "Heavier after the noise at the school" });
    const [latest] = (await company.estimator.ok("listStandardsHistory")).items;
    expect(latest).toMatchObject({
      version: 2,
      by: { id: company.owner.id, name: company.owner.name },
      note: "Heavier after the noise at the school",
      moreChanges: 0,
    });
    expect(latest?.changes).toHaveLength(2);
    expect(latest?.changes[0]).toMatchObject({ field: "gauge", before: "22 ga", after: "20 ga" });
    const [entry] = (await company.owner.ok("listAudit")).items;
    expect(entry).toMatchObject({ event: "standards.changed", subject: "version 2" });
  });

  test("that change nothing are no version", async () => {
    const company = await foundCompany();
    await save(company, 0, allIn("22 ga"));
    expect((await save(company, 1, allIn("22 ga"))).version).toBe(1);
  });

  test("stay as they were saved: the database refuses to change or drop a version", async () => {
    const company = await foundCompany();
    await save(company, 0, allIn("22 ga"));
    const tenant = company.server.deps.db.tenant(company.organizationId);
    await expect(tenant.from("standards").update({ note: "never mind" })).rejects.toThrow("only ever added");
    await expect(tenant.from("standards").delete()).rejects.toThrow("only ever added");
  });
});

describe("a cell that cannot be", () => {
  const refusedFor = async (document: CompanyStandards) => {
    const { owner } = await foundCompany();
    const problem = await owner.refused("updateStandards", {
      version: 0,
      body: { effectiveOn: TODAY, note: "", document },
    });
    expect(problem.status).toBe(422);
    return problem.errors?.[0];
  };

  test("a sheet of another metal is refused with the field, what was typed and what is allowed", async () => {
    expect(await refusedFor(allIn("0.050 in."))).toMatchObject({
      pointer: "/document/gauges/rows/0/sizes/0/gauge",
      value: "0.050 in.",
      message: expect.stringContaining("24 ga") as string,
    });
  });

  test("no sheet is refused where the size is neither blank nor not designed", async () => {
    const none = { gauge: null, reinforcement: { kind: "not-required" } } as const;
    expect(await refusedFor(allIn("22 ga", none))).toMatchObject({ pointer: "/document/gauges/rows/0/sizes/0/gauge" });
  });

  test("a size that is not larger than the one above it is refused", async () => {
    const { gauges } = allIn("22 ga");
    const rows = gauges!.rows.map((chart) => ({ ...chart, sizes: [...chart.sizes, ...chart.sizes] }));
    expect(await refusedFor({ ...NO_COMPANY_STANDARDS, gauges: { ...gauges!, rows } })).toMatchObject({
      pointer: "/document/gauges/rows/0/sizes/1/upTo_m",
    });
  });

  test("two charts for the same duct are refused", async () => {
    const { gauges } = allIn("22 ga");
    const rows = [...gauges!.rows, gauges!.rows[0]!];
    expect(await refusedFor({ ...NO_COMPANY_STANDARDS, gauges: { ...gauges!, rows } })).toMatchObject({
      pointer: "/document/gauges/rows/2/pressureClass_pa",
    });
  });

  test("a copy of what is shipped is accepted whole", async () => {
    const company = await foundCompany();
    const { conditionFactor: _factor, ...hours } = shippedStandards.productivity;
    await save(company, 0, { ...NO_COMPANY_STANDARDS, gauges: shippedStandards.gauges, hours });
    const read = await company.estimator.ok("getStandards");
    expect(read.document.gauges?.rows).toHaveLength(shippedStandards.gauges.rows.length);
  });
});

describe("a project's numbers", () => {
  async function aDrawnProject(company: TestCompany) {
    const { estimator, server, organizationId } = company;
    const { project, params } = await aProject(estimator);
    const [level] = (await estimator.ok("getLayout", { params })).records;
    const [spec] = (await estimator.ok("listSpecs")).items;
    if (level?.kind !== "level" || !spec) throw new Error("a new project has a level, a founded company a spec");
    const sets = [adding(...aSmallSystem(level.id, spec.id).records)];
    await estimator.ok("saveLayout", { params, body: { batchId: randomUUID(), baseSequence: 1, sets } });
    return async (day: string) => {
      const computed = await computeProject(server.deps.db.tenant(organizationId), project.id, () => day);
      if (!computed) throw new Error("the project is there");
      return computed.numbers;
    };
  }
  const gaugedPieces = ({ takeoffs }: Numbers) =>
    takeoffs.flatMap(({ pieces }) => pieces).filter(({ gauge }) => gauge !== null);

  test("is made by the company's schedule from its effective date on, and each piece says so", async () => {
    const company = await foundCompany();
    const numbersOn = await aDrawnProject(company);
    const piecesOn = async (day: string) => gaugedPieces(await numbersOn(day));
    await save(company, 0, allIn("18 ga"), { effectiveOn: "2026-12-02" });
    const before = await piecesOn(TODAY);
    const after = await piecesOn("2026-12-02");
    expect(new Set(before.map(({ gaugeDecider }) => gaugeDecider))).toEqual(new Set(["shipped"]));
    expect(new Set(after.map(({ gauge, gaugeDecider }) => `${gauge} ${gaugeDecider}`))).toEqual(
      new Set(["18 ga company"]),
    );
    expect(after.length).toBe(before.length);
  });

  test("takes the company's hours", async () => {
    const company = await foundCompany();
    const numbersOn = await aDrawnProject(company);
    const piecesOn = async (day: string) => gaugedPieces(await numbersOn(day));
    const { conditionFactor: _factor, ...hours } = shippedStandards.productivity;
    const rows = hours.rows.map((row) => ({ ...row, hours_h: 2 * row.hours_h, standing: "own" as const }));
    const before = await piecesOn(TODAY);
    await save(company, 0, { ...NO_COMPANY_STANDARDS, hours: { ...hours, name: "Our hours", rows } });
    const after = await piecesOn(TODAY);
    for (const [index, piece] of after.entries()) {
      expect(piece.shopHours_h).toBeCloseTo(2 * before[index]!.shopHours_h, 9);
      expect(piece.fieldHours_h).toBeCloseTo(2 * before[index]!.fieldHours_h, 9);
    }
    expect(after.length).toBeGreaterThan(0);
  });

  test("take a company's loss coefficient from its effective date on, and the fitting says so", async () => {
    const company = await foundCompany();
    const numbersOn = await aDrawnProject(company);
    const own = { ...shippedPractice, source: "our own readings", easedTapOverStraight: { shoe: 0.4, conical: 0.4 } };
    await save(company, 0, { ...NO_COMPANY_STANDARDS, coefficients: own }, { effectiveOn: "2026-12-02" });
    const eased = ({ solutions }: Numbers) =>
      solutions
        .flatMap(({ segments }) => segments)
        .flatMap(({ fittings }) => fittings)
        .filter(({ inputs }) => inputs.some(({ name }) => name === "practice-factor"));
    const [before, after] = [eased(await numbersOn(TODAY)), eased(await numbersOn("2026-12-02"))];
    expect(before.length).toBeGreaterThan(0);
    expect(before.every(({ source }) => source.includes("common practice"))).toBe(true);
    expect(after.every(({ source }) => source.includes("our own readings"))).toBe(true);
    expect(after[0]!.lossCoefficient / before[0]!.lossCoefficient).toBeCloseTo(0.4 / 0.65, 9);
  });

  test("keep to a coefficient that can be: another is refused with its place", async () => {
    const { owner } = await foundCompany();
    const coefficients = { ...shippedPractice, vanedElbow: 40 };
    const body = { effectiveOn: TODAY, note: "", document: { ...NO_COMPANY_STANDARDS, coefficients } };
    const { status, errors } = await owner.refused("updateStandards", { version: 0, body });
    expect(status).toBe(422);
    expect(errors?.[0]).toMatchObject({ pointer: "/document/coefficients/vanedElbow", value: 40 });
  });
});
