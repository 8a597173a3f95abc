import { execFileSync } from "node:child_process";
import { mkdtempSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { createHash, randomUUID } from "node:crypto";
import { describe, expect, test } from "vitest";
import { anIssuedQuote, aQuotableProject } from "../../testing/a-quotable-project.ts";
import { changing } from "../../testing/a-small-system.ts";
import { foundCompany } from "../../testing/found-company.ts";
import { canonicalJson } from "./canonical-json.ts";

const answer = {
  name: "Priya Lindqvist",
  title: "Preconstruction manager",
  poNumber: "PO-4471",
  consent: true,
} as const;

async function anOpenQuote() {
  const company = await foundCompany();
  const issued = await anIssuedQuote(company);
  const { stranger } = company;
  const params = { token: issued.token as never };
  const letter = () => stranger.ok("getClientQuote", { params });
  const accept = async (fields: Partial<{ snapshotHash: string }> = {}) =>
    stranger.send("acceptQuote", {
      params,
      body: { ...answer, snapshotHash: (await letter()).snapshotHash, ...fields },
    });
  return { company, ...issued, stranger, linkParams: params, letter, accept };
}

describe("issuing", () => {
  test("freezes what the server computes, with a hash over its canonical JSON", async () => {
    const { company, quote } = await anOpenQuote();
    const [revision] = quote.revisions;
    const system = company.server.deps.db.system("a test looks at what is stored");
    const row: {
      snapshot: string;
      snapshot_hash: string;
    } = await system.from("quote_revisions").where({ id: revision?.id }).first("snapshot", "snapshot_hash");
    expect(createHash("sha256").update(row.snapshot).digest("hex")).toBe(row.snapshot_hash);
    expect(canonicalJson(JSON.parse(row.snapshot))).toBe(row.snapshot);
    expect(revision).toMatchObject({ number: 1, state: "issued", snapshotHash: row.snapshot_hash });
    expect((JSON.parse(row.snapshot) as { estimate: { price_minor: number } }).estimate.price_minor).toBe(
      revision?.price_minor,
    );
  });

  test("leaves a snapshot that the database itself will not change", async () => {
    const { company, quote } = await anOpenQuote();
    const rows = () =>
      company.server.deps.db
        .system("a test tries to forge")
        .from("quote_revisions")
        .where({ id: quote.revisions[0]?.id });
    await expect(rows().update({ price_minor: 1 })).rejects.toThrow("does not change");
    await expect(rows().update({ snapshot: "{}" })).rejects.toThrow("does not change");
    await expect(rows().delete()).rejects.toThrow("does not go");
  });

  test("mails each recipient a link of their own, with the PDF and the estimator to reply to", async () => {
    const { company, recipient } = await anOpenQuote();
    const [mail] = await company.mailTo(recipient.email);
    expect(mail).toMatchObject({
      to: recipient,
      replyTo: { email: company.estimator.email },
      attachments: [{ mediaType: "application/pdf", fileName: "quote-Q-1001-rev-1.pdf" }],
    });
    expect(mail?.text).toContain("/q/");
  });

  test("happens once for one key", async () => {
    const company = await foundCompany();
    const { params, seen } = await aQuotableProject(company);
    const quote = await company.estimator.ok("createQuote", { params });
    const call = {
      params: { ...params, quoteId: quote.id },
      version: quote.version,
      idempotencyKey: randomUUID(),
      body: {
        recipients: [{ name: "Once", email: `once-${randomUUID()}@oxbow.example` }],
        message: "",
        ...(await seen()),
      },
    };
    const first = await company.estimator.ok("issueQuote", call);
    expect(await company.estimator.ok("issueQuote", call)).toEqual(first);
    expect(await company.mailTo(call.body.recipients[0]?.email ?? "")).toHaveLength(1);
  });

  test("is refused when the layout or the price is not what the estimator saw", async () => {
    const { company, quote, issue, params, drawn, seen } = await anOpenQuote();
    const before = await seen();
    const sets = [changing(drawn.main, { name: "Trunk" })];
    await company.estimator.ok("saveLayout", {
      params,
      body: { batchId: randomUUID(), baseSequence: before.layoutSequence, sets },
    });
    expect(await company.estimator.refused("issueQuote", await issue(quote, before))).toMatchObject({
      status: 409,
      errors: [{ code: "layout-moved" }],
    });
    const other = { ...(await seen()), price_minor: 1 };
    expect(await company.estimator.refused("issueQuote", await issue(quote, other))).toMatchObject({
      status: 409,
      errors: [{ code: "price-differs" }],
    });
  });

  test("waits for every price, and names what is missing", async () => {
    const { company, quote, issue } = await anOpenQuote();
    const { items } = await company.owner.ok("getPriceBook");
    const gone = items.find(({ key }) => key.startsWith("metal"));
    await company.owner.ok("deletePriceItem", { params: { itemKey: gone?.key ?? "" } });
    expect(await company.estimator.refused("issueQuote", await issue(quote))).toMatchObject({
      status: 422,
      errors: [{ code: "price-missing" }],
    });
  });

  test("names the outlet that has no airflow, and loses nothing", async () => {
    const { company, quote, issue, params, drawn, seen } = await anOpenQuote();
    const { layoutSequence } = await seen();
    const sets = [changing(drawn.outlets[0], { airflow_m3s: null })];
    await company.estimator.ok("saveLayout", {
      params,
      body: { batchId: randomUUID(), baseSequence: layoutSequence, sets },
    });
    const problem = await company.estimator.refused("issueQuote", await issue(quote));
    expect(problem).toMatchObject({ status: 422, errors: [{ code: "cannot-be-computed" }] });
    expect(problem.detail).toContain(drawn.outlets[0].tag);
    expect((await company.estimator.ok("listQuotes", { params })).items[0]?.revisions).toHaveLength(1);
  });

  test("waits for a confirmed address", async () => {
    const { company, quote, issue } = await anOpenQuote();
    await company.server.deps.db
      .system("a test forgets a confirmation")
      .from("people")
      .where({ id: company.estimator.id })
      .update({ email_verified_at: null });
    expect(await company.estimator.refused("issueQuote", await issue(quote))).toMatchObject({
      errors: [{ code: "email-unverified" }],
    });
  });

  test("supersedes the revision before", async () => {
    const { company, quote, issue, letter, accept } = await anOpenQuote();
    const after = await company.estimator.ok("issueQuote", await issue(quote));
    expect(after.revisions.map(({ number, state }) => [number, state])).toEqual([
      [2, "issued"],
      [1, "superseded"],
    ]);
    expect((await letter()).state).toBe("superseded");
    expect((await accept()).status).toBe(409);
  });
});

describe("the PDF", () => {
  test("holds the price and the client in embedded fonts", async () => {
    const { company, params, quote, linkParams, stranger } = await anOpenQuote();
    const revisionId = quote.revisions[0]?.id;
    const { bytes, headers } = await company.estimator.download("getRevisionPdf", {
      params: { ...params, quoteId: quote.id, ...(revisionId ? { revisionId } : {}) },
    });
    expect(headers.get("content-type")).toBe("application/pdf");
    const file = join(mkdtempSync(join(tmpdir(), "cleatwork-pdf-")), "quote.pdf");
    writeFileSync(file, bytes);
    const text = execFileSync("pdftotext", ["-layout", file, "-"], { encoding: "utf8" });
    const price = ((quote.revisions[0]?.price_minor ?? 0) / 100).toLocaleString("en-US", { minimumFractionDigits: 2 });
    for (const words of [
      "Oxbow Builders",
      "Marrow Creek Branch Library",
      price,
      "page 1 of",
      "authority having",
      "jurisdiction govern",
    ])
      expect(text).toContain(words);
    const fonts = execFileSync("pdffonts", [file], { encoding: "utf8" }).trim().split("\n").slice(2);
    expect(fonts.length).toBeGreaterThanOrEqual(2);
    for (const font of fonts) expect(font).toMatch(/Archivo.*yes yes yes/);
    expect((await stranger.download("getClientQuotePdf", { params: linkParams })).bytes.equals(bytes)).toBe(true);
  });

  test("of a draft says so", async () => {
    const { company, params, quote } = await anOpenQuote();
    const { bytes } = await company.estimator.download("getDraftPdf", { params: { ...params, quoteId: quote.id } });
    const file = join(mkdtempSync(join(tmpdir(), "cleatwork-pdf-")), "draft.pdf");
    writeFileSync(file, bytes);
    expect(execFileSync("pdftotext", ["-layout", file, "-"], { encoding: "utf8" })).toContain("DRAFT, not issued");
  });

  test("of a draft reads quote, company, client, layout and prices in one statement, after the session", async () => {
    const { company, params, quote } = await anOpenQuote();
    const answer = await company.estimator.send("getDraftPdf", { params: { ...params, quoteId: quote.id } });
    expect(answer.headers.get("x-db-queries")).toBe("2");
  });
});

describe("a client behind a link", () => {
  test("reads the letter without an account, and no cost", async () => {
    const { letter, stranger, linkParams, quote } = await anOpenQuote();
    expect(await letter()).toMatchObject({
      state: "issued",
      clientName: "Oxbow Builders",
      price_minor: quote.revisions[0]?.price_minor,
    });
    const { bytes } = await stranger.send("getClientQuote", { params: linkParams });
    const money = [
      ...bytes.toString("utf8").matchAll(/"(\w*(?:_minor|_micro|_bp|cost|margin|markup|rate|hours)\w*)"/gi),
    ].map(([, key]) => key);
    expect(new Set(money)).toEqual(new Set(["price_minor"]));
  });

  test("adds up the parts to the price", async () => {
    const { parts, price_minor } = await (await anOpenQuote()).letter();
    expect(parts.reduce((sum, part) => sum + part.price_minor, 0)).toBe(price_minor);
  });

  test("is seen to have opened it", async () => {
    const { company, letter, params } = await anOpenQuote();
    await letter();
    const [quote] = (await company.estimator.ok("listQuotes", { params })).items;
    expect(quote?.revisions[0]?.links[0]?.openedAt).not.toBeNull();
  });

  test("accepts once, of two at the same moment one", async () => {
    const { company, accept, letter, params, project } = await anOpenQuote();
    const [first, second] = await Promise.all([accept(), accept()]);
    expect([first.status, second.status].toSorted()).toEqual([200, 409]);
    expect((await accept()).status).toBe(409);
    expect(await letter()).toMatchObject({ state: "accepted", response: { kind: "accepted", name: answer.name } });
    expect((await company.estimator.ok("getProject", { params })).state).toBe("won");
    const { items } = await company.owner.ok("listAudit", { query: {} });
    expect(items.filter(({ event }) => event === "quote.accepted")).toHaveLength(1);
    expect(await company.mailTo(company.owner.email)).toEqual(
      expect.arrayContaining([expect.objectContaining({ subject: expect.stringContaining(project.name) as string })]),
    );
  });

  test("accepts only what they have seen", async () => {
    const { accept, letter } = await anOpenQuote();
    expect((await accept({ snapshotHash: "0".repeat(64) })).status).toBe(409);
    expect((await letter()).state).toBe("issued");
  });

  test("is told which field is missing", async () => {
    const { stranger, linkParams, letter } = await anOpenQuote();
    const body = { ...answer, name: " ", consent: false as never, snapshotHash: (await letter()).snapshotHash };
    expect(await stranger.refused("acceptQuote", { params: linkParams, body })).toMatchObject({
      status: 422,
      errors: [
        expect.objectContaining({ pointer: "/name" }),
        expect.objectContaining({ pointer: "/consent", message: "tick to agree" }),
      ],
    });
  });

  test("declines with a reason, which the estimator is told", async () => {
    const { company, stranger, linkParams, letter } = await anOpenQuote();
    await stranger.ok("declineQuote", {
      params: linkParams,
      body: { name: "Priya Lindqvist", reason: "We chose another." },
    });
    expect((await letter()).state).toBe("declined");
    expect((await company.mailTo(company.estimator.email))[0]?.text).toContain("We chose another.");
  });

  test.each(["withdrawn", "revoked", "expired", "long gone", "unknown"])(
    "finds a closed door when the quote is %s",
    async (how) => {
      const { company, quote, params, stranger, linkParams, accept, letter } = await anOpenQuote();
      const at = { ...params, quoteId: quote.id };
      const revision = quote.revisions[0];
      const hash = (await letter()).snapshotHash;
      if (how === "withdrawn" && revision)
        await company.estimator.ok("withdrawRevision", { params: { ...at, revisionId: revision.id } });
      if (how === "revoked" && revision?.links[0])
        await company.estimator.ok("revokeLink", { params: { ...at, linkId: revision.links[0].id } });
      if (how === "expired") company.server.clock.advanceDays(40);
      if (how === "long gone") company.server.clock.advanceDays(120);
      const where = how === "unknown" ? { token: "A".repeat(43) as never } : linkParams;
      const read = await stranger.send("getClientQuote", { params: where });
      const state =
        read.status === 200 ? (JSON.parse(read.bytes.toString()) as { state: string }).state : String(read.status);
      expect(state).toBe(
        { withdrawn: "withdrawn", revoked: "410", expired: "expired", "long gone": "410", unknown: "404" }[how],
      );
      const answered =
        how === "unknown"
          ? await stranger.send("acceptQuote", { params: where, body: { ...answer, snapshotHash: hash } })
          : await accept({ snapshotHash: hash }).catch(() => ({ status: 410 }));
      expect([404, 409, 410]).toContain(answered.status);
    },
  );
});

describe("the field", () => {
  test("gets what was sold, and not one cost", async () => {
    const { company, accept, params } = await anOpenQuote();
    expect((await company.foreman.refused("getFieldTakeoff", { params })).status).toBe(404);
    await accept();
    const list = await company.foreman.send("listFieldProjects");
    const takeoff = await company.foreman.send("getFieldTakeoff", { params });
    const { pieces } = JSON.parse(takeoff.bytes.toString()) as { pieces: { mark: string }[] };
    expect(pieces.length).toBeGreaterThan(0);
    expect(new Set(pieces.map(({ mark }) => mark)).size).toBe(pieces.length);
    for (const { bytes, headers } of [list, takeoff]) {
      expect(bytes.toString()).not.toMatch(/_minor|_micro|_bp|"\w*(cost|price|margin|markup|rate|amount)\w*"/i);
      expect(Number(headers.get("x-db-queries"))).toBeLessThanOrEqual(2);
    }
  });

  test("keeps what was sold when the layout changes afterwards", async () => {
    const { company, accept, params, drawn, seen } = await anOpenQuote();
    await accept();
    const before = await company.foreman.ok("getFieldTakeoff", { params });
    const { layoutSequence } = await seen();
    const sets = [changing(drawn.main, { name: "Changed after the sale" })];
    await company.estimator.ok("saveLayout", {
      params,
      body: { batchId: randomUUID(), baseSequence: layoutSequence, sets },
    });
    expect(await company.foreman.ok("getFieldTakeoff", { params })).toEqual(before);
  });
});

describe("drafts", () => {
  test("are read in two round trips and saved on the version that was seen", async () => {
    const { company, params, quote } = await anOpenQuote();
    const { headers } = await company.estimator.send("listQuotes", { params });
    expect(headers.get("x-db-queries")).toBe("2");
    const at = { params: { ...params, quoteId: quote.id }, body: { ...quote.draft, title: "Ductwork" } };
    const saved = await company.estimator.ok("updateQuoteDraft", { ...at, version: quote.version });
    expect(saved.draft.title).toBe("Ductwork");
    expect((await company.estimator.refused("updateQuoteDraft", { ...at, version: quote.version })).status).toBe(412);
    expect((await company.estimator.refused("updateQuoteDraft", at)).status).toBe(428);
  });

  test("of another company are not there", async () => {
    const { quote, params } = await anOpenQuote();
    const other = await foundCompany();
    expect((await other.owner.refused("listQuotes", { params })).status).toBe(404);
    expect(
      (
        await other.owner.refused("updateQuoteDraft", {
          params: { ...params, quoteId: quote.id },
          version: 1,
          body: quote.draft,
        })
      ).status,
    ).toBe(404);
  });
});
