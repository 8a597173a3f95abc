import { NO_COMPANY_STANDARDS, type PriceItem } from "@cleatwork/calc";
import { computeNumbers } from "@cleatwork/layout";
import { randomUUID } from "node:crypto";
import { describe, expect, test } from "vitest";
import { foundCompany, type TestCompany } from "../../testing/found-company.ts";
import { adding, aSmallSystem } from "../../testing/a-small-system.ts";
import { aProject } from "../../testing/a-project.ts";
import { unitOf } from "../../testing/a-quotable-project.ts";
import { computeProject } from "./index.ts";

const PRICED_ON = "2026-12-01";

async function aDrawnProject(company: TestCompany) {
  const { estimator, server, organizationId } = company;
  const { project, params } = await aProject(estimator);
  const [level] = (await estimator.ok("getLayout", { params })).records;
  const [spec] = (await estimator.ok("listSpecs")).items;
  if (level?.kind !== "level" || !spec) throw new Error("a new project has a level, a founded company a spec");
  const drawn = aSmallSystem(level.id, spec.id);
  const sets = [adding(...drawn.records)];
  await estimator.ok("saveLayout", { params, body: { batchId: randomUUID(), baseSequence: 1, sets } });
  const compute = async () => {
    const tenant = server.deps.db.tenant(organizationId);
    const numbers = (await computeProject(tenant, project.id, () => PRICED_ON))?.numbers;
    if (!numbers?.estimate) throw new Error("the small system can be computed");
    return { ...numbers, estimate: numbers.estimate };
  };
  return { project, params, drawn, compute };
}

/** Prices whatever the estimate misses, at a dollar a unit and forty an hour: invented. */
async function priceWhatIsMissing({ owner }: TestCompany, keys: readonly string[]): Promise<void> {
  const { version, ...settings } = await owner.ok("getPricingSettings");
  const parts = [{ label: "Wage", amount_micro: 40_000_000 }];
  const labor = (["shop", "field"] as const).map((key) => ({ key, name: key, parts }));
  await owner.ok("updatePricingSettings", { version, body: { ...settings, labor } });
  for (const key of keys.filter((key) => !key.startsWith("labor:"))) {
    const item: PriceItem = {
      key,
      description: key,
      group: "metal",
      unit: unitOf(key),
      unitPrice_micro: 1_000_000,
      supplier: "Prairie Coil (invented)",
      effectiveOn: "2026-11-20",
      taxable: true,
    };
    await owner.ok("putPriceItem", { params: { itemKey: key }, body: item });
  }
}

describe("a project’s numbers", () => {
  test("on the server are the browser’s, from the same documents", async () => {
    const company = await foundCompany();
    const { estimator } = company;
    const { project, params, compute } = await aDrawnProject(company);
    const { estimate, systems, solutions, takeoffs } = await compute();
    const [layout, specs, book, settings, pricing] = await Promise.all([
      estimator.ok("getLayout", { params }),
      estimator.ok("listSpecs"),
      estimator.ok("getPriceBook"),
      estimator.ok("getPricingSettings"),
      estimator.ok("getProjectPricing", { params }),
    ]);
    const browser = computeNumbers({
      records: layout.records,
      specs: specs.items,
      altitude_m: project.altitude_m,
      frictionBasis: "hydraulic-diameter",
      currency: book.currency,
      items: book.items,
      settings,
      standards: NO_COMPANY_STANDARDS,
      pricing,
      pricedOn: PRICED_ON,
    });
    expect({ estimate, systems, solutions, takeoffs, problems: [] }).toEqual(browser);
  });

  test("tell every missing price as missing, and none once it is there", async () => {
    const company = await foundCompany();
    const { compute } = await aDrawnProject(company);
    const missing = (await compute()).estimate.warnings.filter((warning) => warning.code === "price-missing");
    expect(missing.map((warning) => warning.key)).toEqual(
      expect.arrayContaining(["sealant", "labor:shop", "labor:field"]),
    );
    await priceWhatIsMissing(
      company,
      missing.map((warning) => warning.key),
    );
    const after = (await compute()).estimate.warnings;
    expect(after.filter((warning) => warning.code === "price-missing")).toEqual([]);
  });

  test("follow the project’s own condition factor before the company’s", async () => {
    const company = await foundCompany();
    const { estimator } = company;
    const { params, compute } = await aDrawnProject(company);
    const usual = (await compute()).takeoffs[0]!.totals;
    await estimator.ok("updateProjectPricing", {
      params,
      version: 1,
      body: { rates: null, conditionFactor: 2, conditionReason: "High ceilings", adds: [] },
    });
    const high = (await compute()).takeoffs[0]!.totals;
    expect(high.fieldHours_h).toBeCloseTo(2 * usual.fieldHours_h, 9);
    expect(high.shopHours_h).toBe(usual.shopHours_h);
  });

  test("of another company are not there", async () => {
    const [ours, theirs] = [await foundCompany(), await foundCompany()];
    const { project } = await aDrawnProject(ours);
    const tenant = theirs.server.deps.db.tenant(theirs.organizationId);
    expect(await computeProject(tenant, project.id, () => PRICED_ON)).toBeNull();
  });
});

describe("the project list", () => {
  test("shows the price and the state of the latest issued revision", async () => {
    const company = await foundCompany();
    const { estimator } = company;
    const { params, compute } = await aDrawnProject(company);
    await priceWhatIsMissing(
      company,
      (await compute()).estimate.warnings.map((warning) => warning.key),
    );
    const { sequence, estimate } = await compute();
    const quote = await estimator.ok("createQuote", { params });
    const issue = (version: number) =>
      estimator.ok("issueQuote", {
        params: { ...params, quoteId: quote.id },
        version,
        body: {
          recipients: [{ name: "Priya Lindqvist", email: "priya@oxbow.example" }],
          message: "",
          layoutSequence: sequence,
          price_minor: estimate.price_minor,
        },
      });
    const first = await issue(quote.version);
    await issue(first.version);
    expect((await estimator.ok("listProjects")).items).toMatchObject([
      { state: "quoted", price_minor: estimate.price_minor, quoteState: "issued", segmentCount: 3 },
    ]);
  });
});
