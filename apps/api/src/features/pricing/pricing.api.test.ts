import type { PriceItem } from "@cleatwork/calc";
import { describe, expect, test } from "vitest";
import { foundCompany } from "../../testing/found-company.ts";
import { aProject } from "../../testing/a-project.ts";

const sheet: PriceItem = {
  key: "metal:galvanized:24 ga",
  description: "Galvanized sheet, 24 ga",
  group: "metal",
  unit: "lb",
  unitPrice_micro: 1_060_000,
  supplier: "Prairie Coil (invented)",
  effectiveOn: "2026-11-20",
  taxable: true,
};
const params = { itemKey: sheet.key };

describe("the price book", () => {
  test("of a new company is empty: no price is invented", async () => {
    const { owner, estimator } = await foundCompany();
    expect(await estimator.ok("getPriceBook")).toMatchObject({ currency: "USD", items: [] });
    const settings = await owner.ok("getPricingSettings");
    expect(settings.labor).toMatchObject([{ parts: [] }, { parts: [] }]);
  });

  test("keeps what was written", async () => {
    const { owner, estimator } = await foundCompany();
    await owner.ok("putPriceItem", { params, body: sheet });
    await owner.ok("putPriceItem", { params, body: { ...sheet, unitPrice_micro: 1_120_000 } });
    expect((await estimator.ok("getPriceBook")).items).toEqual([{ ...sheet, unitPrice_micro: 1_120_000 }]);
    await owner.ok("deletePriceItem", { params });
    expect((await estimator.ok("getPriceBook")).items).toEqual([]);
    expect((await owner.refused("deletePriceItem", { params })).status).toBe(404);
  });

  test("tells the audit trail each change, with the old and the new price", async () => {
    const { owner } = await foundCompany();
    await owner.ok("putPriceItem", { params, body: sheet });
    await owner.ok("putPriceItem", { params, body: sheet });
    await owner.ok("putPriceItem", { params, body: { ...sheet, unitPrice_micro: 1_120_000 } });
    await owner.ok("deletePriceItem", { params });
    const { items } = await owner.ok("listAudit");
    const prices = items.filter((item) => item.event.startsWith("price."));
    expect(prices.map((item) => item.event).toSorted()).toEqual(["price.added", "price.changed", "price.removed"]);
    expect(prices.find((item) => item.event === "price.changed")).toMatchObject({
      subject: sheet.key,
      by: { name: owner.name },
      details: { unitPrice_micro: { old: 1_060_000, new: 1_120_000 } },
    });
  });

  test("refuses a key that is not the address’s", async () => {
    const { owner } = await foundCompany();
    expect(await owner.refused("putPriceItem", { params, body: { ...sheet, key: "wrap" } })).toMatchObject({
      status: 422,
      errors: [{ pointer: "/key", value: "wrap" }],
    });
  });

  test("refuses a price below zero with the field, the value and the limit", async () => {
    const { owner } = await foundCompany();
    expect(await owner.refused("putPriceItem", { params, body: { ...sheet, unitPrice_micro: -1 } })).toMatchObject({
      status: 422,
      errors: [{ pointer: "/unitPrice_micro", value: -1, message: expect.stringContaining("0") as string }],
    });
  });

  test("written by two people at the same moment holds one of the two prices", async () => {
    const { owner } = await foundCompany();
    const offers = [1_000_000, 2_000_000, 3_000_000];
    await Promise.all(
      offers.map((unitPrice_micro) => owner.ok("putPriceItem", { params, body: { ...sheet, unitPrice_micro } })),
    );
    const { items } = await owner.ok("getPriceBook");
    expect(items).toHaveLength(1);
    expect(offers).toContain(items[0]?.unitPrice_micro);
  });

  test("is the owner’s to change", async () => {
    const { estimator, foreman } = await foundCompany();
    expect((await estimator.refused("putPriceItem", { params, body: sheet })).status).toBe(403);
    expect((await foreman.refused("getPriceBook")).status).toBe(403);
  });
});

describe("pricing settings", () => {
  test("tell the audit trail a changed markup and wage", async () => {
    const { owner } = await foundCompany();
    const { version, ...settings } = await owner.ok("getPricingSettings");
    const [shop, field] = settings.labor;
    const changed = await owner.ok("updatePricingSettings", {
      version,
      body: {
        ...settings,
        labor: [shop!, { ...field!, parts: [{ label: "Wage", amount_micro: 42_100_000 }] }],
        rates: { ...settings.rates, profit_bp: 1_400 },
      },
    });
    expect(changed.version).toBe(version + 1);
    expect(await owner.ok("getPricingSettings")).toEqual(changed);
    const { items } = await owner.ok("listAudit");
    expect(items.find((item) => item.event === "pricing-settings.changed")?.details).toMatchObject({
      "rates.profit_bp": { old: settings.rates.profit_bp, new: 1_400 },
      "labor.field": { old: { parts: [] }, new: { parts: [{ amount_micro: 42_100_000 }] } },
    });
  });

  test("saved on an old version are refused", async () => {
    const { owner } = await foundCompany();
    const { version, ...body } = await owner.ok("getPricingSettings");
    await owner.ok("updatePricingSettings", { version, body: { ...body, staleAfterDays: 10 } });
    expect((await owner.refused("updatePricingSettings", { version, body })).status).toBe(412);
    expect((await owner.ok("getPricingSettings")).staleAfterDays).toBe(10);
  });

  test("with two shop rates are refused with the second named", async () => {
    const { owner } = await foundCompany();
    const { version, ...body } = await owner.ok("getPricingSettings");
    const [shop] = body.labor;
    expect(
      await owner.refused("updatePricingSettings", { version, body: { ...body, labor: [shop!, shop!] } }),
    ).toMatchObject({ status: 422, errors: [{ pointer: "/labor/1/key", value: "shop" }] });
  });
});

describe("a project’s pricing", () => {
  const crane = {
    id: "crane",
    description: "Crane day",
    group: "rentals-freight",
    quantity: 1,
    unit: "day",
    unitPrice_micro: 1_450_000_000,
    taxable: false,
  } as const;

  test("goes by the company’s until someone changes it", async () => {
    const { estimator } = await foundCompany();
    const project = await aProject(estimator);
    const untouched = await estimator.ok("getProjectPricing", { params: project.params });
    expect(untouched).toEqual({ rates: null, conditionFactor: null, conditionReason: "", adds: [], version: 1 });
    const body = { rates: null, conditionFactor: 1.15, conditionReason: "Occupied building", adds: [crane] };
    const changed = await estimator.ok("updateProjectPricing", { params: project.params, version: 1, body });
    expect(changed).toEqual({ ...body, version: 2 });
    expect(await estimator.ok("getProjectPricing", { params: project.params })).toEqual(changed);
  });

  test("changed first by two people at once keeps one and refuses the other", async () => {
    const { estimator, owner } = await foundCompany();
    const project = await aProject(estimator);
    const answers = await Promise.all(
      [estimator, owner].map((person, index) =>
        person.send("updateProjectPricing", {
          params: project.params,
          version: 1,
          body: { rates: null, conditionFactor: 1 + index, conditionReason: "", adds: [] },
        }),
      ),
    );
    expect(answers.map((answer) => answer.status).toSorted()).toEqual([200, 412]);
  });

  test("tells the audit trail an added line", async () => {
    const { estimator, owner } = await foundCompany();
    const project = await aProject(estimator);
    const body = { rates: null, conditionFactor: null, conditionReason: "", adds: [crane] };
    await estimator.ok("updateProjectPricing", { params: project.params, version: 1, body });
    const { items } = await owner.ok("listAudit");
    expect(items.find((item) => item.event === "project-pricing.changed")).toMatchObject({
      subject: project.project.id,
      details: { "adds.crane": { old: null, new: { unitPrice_micro: 1_450_000_000 } } },
    });
  });

  test("with a quantity of zero is refused with the field named", async () => {
    const { estimator } = await foundCompany();
    const project = await aProject(estimator);
    const adds = [{ ...crane, quantity: 0 }];
    expect(
      await estimator.refused("updateProjectPricing", {
        params: project.params,
        version: 1,
        body: { rates: null, conditionFactor: null, conditionReason: "", adds },
      }),
    ).toMatchObject({ status: 422, errors: [{ pointer: "/adds/0/quantity", value: 0, message: "more than zero" }] });
  });

  test("of another company is not there", async () => {
    const [ours, theirs] = [await foundCompany(), await foundCompany()];
    const { params: foreign } = await aProject(ours.estimator);
    expect((await theirs.owner.refused("getProjectPricing", { params: foreign })).status).toBe(404);
  });
});
