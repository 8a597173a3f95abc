/** A project that can be quoted: drawn, solved, and priced at invented prices. */
import type { PriceItem } from "@cleatwork/calc";
import type { endpoints } from "@cleatwork/contracts";
import { type BodyOf, type Quote } from "@cleatwork/contracts";
import { randomUUID } from "node:crypto";
import { computeProject } from "../features/pricing/index.ts";
import { aProject } from "./a-project.ts";
import { adding, aSmallSystem } from "./a-small-system.ts";
import { tokenIn, type TestCompany } from "./found-company.ts";

type IssueBody = BodyOf<(typeof endpoints)["issueQuote"]>;

export async function aQuotableProject(company: TestCompany) {
  const { estimator, owner, server, organizationId } = company;
  const { project, params } = await aProject(estimator);
  const [level] = (await estimator.ok("getLayout", { params })).records;
  const [spec] = (await estimator.ok("listSpecs")).items;
  if (level?.kind !== "level" || !spec) throw new Error("a new project has a level, a founded company a spec");
  const drawn = aSmallSystem(level.id, spec.id);
  const sets = [adding(...drawn.records)];
  await estimator.ok("saveLayout", { params, body: { batchId: randomUUID(), baseSequence: 1, sets } });

  const compute = async () => {
    const computed = await computeProject(server.deps.db.tenant(organizationId), project.id, () => "2026-12-01");
    if (!computed) throw new Error("the project is there");
    return computed.numbers;
  };
  const { version, ...settings } = await owner.ok("getPricingSettings");
  const parts = [{ label: "Wage", amount_micro: 40_000_000 }];
  const labor = (["shop", "field"] as const).map((key) => ({ key, name: key, parts }));
  await owner.ok("updatePricingSettings", { version, body: { ...settings, labor } });
  for (const { code, key } of (await compute()).estimate?.warnings ?? [])
    if (code === "price-missing") await owner.ok("putPriceItem", { params: { itemKey: key }, body: aPrice(key) });

  const seen = async (): Promise<Pick<IssueBody, "layoutSequence" | "price_minor">> => {
    const { sequence, estimate } = await compute();
    return { layoutSequence: sequence, price_minor: estimate?.price_minor ?? 0 };
  };
  return { project, params, drawn, seen };
}

/** What the takeoff measures it by. */
export const unitOf = (key: string): PriceItem["unit"] => {
  if (key.startsWith("metal")) return "kg";
  if (key === "sealant" || key === "liner-adhesive") return "L";
  return /strip$|^gasket$|-tape$/.test(key) ? "m" : "ea";
};

const aPrice = (key: string): PriceItem => ({
  key,
  description: key,
  group: "metal",
  unit: unitOf(key),
  unitPrice_micro: 1_000_000,
  supplier: "Prairie Coil (invented)",
  effectiveOn: "2026-11-20",
  taxable: true,
});

/** A quote that has been issued to one client, and the client's private link. */
export async function anIssuedQuote(company: TestCompany) {
  const quotable = await aQuotableProject(company);
  const { estimator } = company;
  const started = await estimator.ok("createQuote", { params: quotable.params });
  const recipient = { name: "Priya Lindqvist", email: `priya-${randomUUID()}@oxbow.example` };
  const issue = async (quote: Quote, fields: Partial<IssueBody> = {}) => ({
    params: { ...quotable.params, quoteId: quote.id },
    version: quote.version,
    body: { recipients: [recipient], message: "", ...(await quotable.seen()), ...fields },
  });
  const quote = await estimator.ok("issueQuote", await issue(started));
  const newestToken = async () => tokenIn((await company.mailTo(recipient.email))[0]);
  return { ...quotable, quote, recipient, issue, newestToken, token: await newestToken() };
}
