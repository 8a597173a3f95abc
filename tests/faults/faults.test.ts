/** What must not be lost when a part fails: the real product, its parts ended without warning. */
import { startWholeStack, throwawayFolder, type WholeStack } from "@cleatwork/local-stack/stack";
import { NO_COMPANY_STANDARDS } from "@cleatwork/calc";
import { computeNumbers } from "@cleatwork/layout";
import { ApiClient } from "@cleatwork/migrations/seed/api-client";
import type { CompanySlug, ProjectId, SegmentRecord } from "@cleatwork/contracts";
import { randomUUID } from "node:crypto";
import { afterAll, beforeAll, describe, expect, test } from "vitest";

let stack: WholeStack;
let estimator: ApiClient;
let params: { company: CompanySlug; projectId: ProjectId };

beforeAll(async () => {
  stack = await startWholeStack({ folder: throwawayFolder(), throwaway: true });
  const signIn = stack.seed().find(({ role }) => role === "estimator");
  if (!signIn) throw new Error("the demo has an estimator");
  // Seeding blocks this process for a while: let it see which connections the server has closed meanwhile.
  await new Promise((resolve) => setTimeout(resolve, 200));
  estimator = new ApiClient(stack.publicUrl);
  const me = await estimator.call("signIn", { params: {}, body: { email: signIn.email, password: signIn.password } });
  const company = me.memberships[0]?.company.slug;
  if (!company) throw new Error("the estimator works somewhere");
  const { items } = await estimator.call("listProjects", { params: { company } });
  const project = items.find(({ state }) => state === "bidding");
  if (!project) throw new Error("the demo has a project to bid");
  params = { company, projectId: project.id };
}, 180_000);

afterAll(() => stack.stop(), 60_000);

const patiently = async <T>(read: () => Promise<T>, until: (value: T) => boolean): Promise<T> => {
  for (let tries = 0; ; tries++) {
    const value = await read();
    if (until(value) || tries > 200) return value;
    await new Promise((resolve) => setTimeout(resolve, 250));
  }
};

describe("the mail server is down", () => {
  const to = `fault-${randomUUID()}@oxbowbuilders.example`;

  test("a quote is issued all the same; its mail waits and goes out once when the server is back", async () => {
    const [quote] = (await estimator.call("listQuotes", { params })).items;
    if (!quote) throw new Error("the demo has a draft");
    await stack.kill("mail");
    const issued = await estimator.call("issueQuote", {
      params: { ...params, quoteId: quote.id },
      version: quote.version,
      body: { recipients: [{ name: "Fault", email: to }], message: "", ...(await seen()) },
    });
    expect(issued.revisions).toHaveLength(quote.revisions.length + 1);

    const link = async () => (await estimator.call("listQuotes", { params })).items[0]?.revisions[0]?.links[0];
    const waiting = await patiently(link, (each) => each?.mailError !== null);
    expect(waiting).toMatchObject({ mailState: "queued" });
    expect(waiting?.mailError).toContain("ECONNREFUSED");

    await stack.startMail();
    expect(await patiently(link, (each) => each?.mailState === "sent")).toMatchObject({
      mailState: "sent",
      mailError: null,
    });
    const found = (await (
      await fetch(`${stack.mailUrl}/api/v2/search?kind=to&query=${encodeURIComponent(to)}`)
    ).json()) as {
      total: number;
      items: { Raw: { Data: string } }[];
    };
    expect(found.total).toBe(1);
    expect(found.items[0]?.Raw.Data).toContain("application/pdf");
  }, 120_000);

  async function seen() {
    const [project, layout, specs, book, settings, pricing] = await Promise.all([
      estimator.call("getProject", { params }),
      estimator.call("getLayout", { params }),
      estimator.call("listSpecs", { params }),
      estimator.call("getPriceBook", { params }),
      estimator.call("getPricingSettings", { params }),
      estimator.call("getProjectPricing", { params }),
    ]);
    const { estimate } = computeNumbers({
      records: layout.records,
      specs: specs.items,
      altitude_m: project.altitude_m,
      frictionBasis: "hydraulic-diameter",
      currency: book.currency,
      items: book.items,
      settings,
      standards: NO_COMPANY_STANDARDS,
      pricing,
      pricedOn: new Date().toISOString().slice(0, 10),
    });
    return { layoutSequence: layout.sequence, price_minor: estimate?.price_minor ?? 0 };
  }
});

describe("the API is killed in the middle of editing", () => {
  test("every acknowledged edit is there afterwards, and what was not answered counts once when sent again", async () => {
    const layout = await estimator.call("getLayout", { params });
    const segment = layout.records.find((record): record is SegmentRecord => record.kind === "segment");
    if (!segment) throw new Error("the demo is drawn");
    const batch = (before: SegmentRecord, after: SegmentRecord) => ({
      batchId: randomUUID(),
      baseSequence: layout.sequence,
      sets: [{ label: after.name, changes: [{ id: segment.id, before, after }] }],
    });

    const acknowledged: string[] = [];
    let now = segment;
    let unanswered = null;
    let killed = Promise.resolve();
    for (let n = 1; unanswered === null; n++) {
      const next = { ...now, name: `Edit ${n}` };
      const body = batch(now, next);
      if (n === 25)
        setTimeout(() => {
          killed = stack.kill("api");
        }, 1);
      try {
        await estimator.call("saveLayout", { params, body });
        acknowledged.push(next.name);
        now = next;
      } catch {
        unanswered = { body, next };
      }
    }
    await killed;
    await stack.startApi();

    expect(acknowledged.length).toBeGreaterThanOrEqual(24);
    const labels = async () => {
      const { items } = await estimator.call("listLayoutChanges", { params });
      return items.filter(({ sequence }) => sequence > layout.sequence).map(({ label }) => label);
    };
    expect((await labels()).slice(0, acknowledged.length)).toEqual(acknowledged);

    await estimator.call("saveLayout", { params, body: unanswered.body });
    expect(await labels()).toEqual([...acknowledged, unanswered.next.name]);
    const after = await estimator.call("getLayout", { params });
    expect(after.records.find(({ id }) => id === segment.id)).toEqual(unanswered.next);
  }, 120_000);
});
