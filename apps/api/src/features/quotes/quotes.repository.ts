import type { PersonId, ProjectId, Quote, QuoteDraft, QuoteId, QuoteLinkId, RevisionId } from "@cleatwork/contracts";
import { fromJson } from "../../platform/db/columns.ts";
import { ask, type Question } from "../../platform/db/question.ts";
import type { TenantDb } from "../../platform/db/tenant-db.ts";
import { quotesFromRows, type QuoteRow } from "./quotes.rows.ts";
import type { StoredState } from "./quotes.rules.ts";

/** Every quote of a project with revisions, links, mail and answers. Null when there is no such project. */
export const quotesQuestion = (db: TenantDb, projectId: ProjectId): Question<Quote[] | null> => ({
  from: db
    .from("projects", "p")
    .join("organizations as o", "o.id", "p.organization_id")
    .leftJoin("quotes as q", { "q.organization_id": "p.organization_id", "q.project_id": "p.id" })
    .leftJoin("quote_revisions as r", { "r.organization_id": "q.organization_id", "r.quote_id": "q.id" })
    .leftJoin("people as issuer", "issuer.id", "r.issued_by")
    .leftJoin("quote_responses as a", { "a.organization_id": "r.organization_id", "a.revision_id": "r.id" })
    .leftJoin("quote_links as l", { "l.organization_id": "r.organization_id", "l.revision_id": "r.id" })
    .leftJoin("outbox as m", "m.id", "l.mail_id")
    .where("p.id", projectId),
  columns: COLUMNS,
  order: "q.id, r.number desc, l.id",
  read: (rows: readonly (QuoteRow & { time_zone: string })[]) => {
    const [first] = rows;
    if (!first) return null;
    const quoted = rows.filter((row) => row.quote_id !== null);
    return quotesFromRows(quoted, first.time_zone, db.now());
  },
});

export const quotesRepository = (db: TenantDb) => ({
  list: (projectId: ProjectId): Promise<Quote[] | null> => ask(quotesQuestion(db, projectId)),

  async find(projectId: ProjectId, id: QuoteId): Promise<Quote | null> {
    return (await this.list(projectId))?.find((quote) => quote.id === id) ?? null;
  },

  /** The number after the highest: "Q-1001" and on. The company's row is locked, so that two quotes never share one. */
  async nextNumber(): Promise<string> {
    await db.organization().forUpdate().first("id");
    const row = (await db.from("quotes").count({ count: "*" }).first()) as { count: number } | undefined;
    return `Q-${1001 + Number(row?.count ?? 0)}`;
  },

  async insert(quote: {
    id: QuoteId;
    projectId: ProjectId;
    number: string;
    draft: QuoteDraft;
    by: PersonId;
  }): Promise<void> {
    await db.insert("quotes", {
      id: quote.id,
      project_id: quote.projectId,
      number: quote.number,
      draft: JSON.stringify(quote.draft),
      created_by: quote.by,
      created_at: db.now(),
    });
  },

  async lock(
    projectId: ProjectId,
    id: QuoteId,
  ): Promise<{ number: string; draft: QuoteDraft; version: number } | null> {
    const row: { number: string; draft: unknown; version: number } | undefined = await db
      .from("quotes")
      .where({ id, project_id: projectId })
      .forUpdate()
      .first("number", "draft", "version");
    return row ? { ...row, draft: fromJson<QuoteDraft>(row.draft) } : null;
  },

  async saveDraft(id: QuoteId, draft: QuoteDraft, version: number): Promise<void> {
    await db
      .from("quotes")
      .where({ id })
      .update({ draft: JSON.stringify(draft), version });
  },

  async bump(id: QuoteId, version: number): Promise<void> {
    await db.from("quotes").where({ id }).update({ version });
  },

  async lastRevision(quoteId: QuoteId): Promise<number> {
    const row = (await db.from("quote_revisions").where({ quote_id: quoteId }).max({ number: "number" }).first()) as
      { number: number | null } | undefined;
    return row?.number ?? 0;
  },

  async isSold(quoteId: QuoteId): Promise<boolean> {
    return (await db.from("quote_revisions").where({ quote_id: quoteId, state: "accepted" }).first("id")) !== undefined;
  },

  /** What was open or declined gives way to the newer revision. */
  async supersede(quoteId: QuoteId): Promise<void> {
    await db
      .from("quote_revisions")
      .where({ quote_id: quoteId })
      .whereIn("state", ["issued", "declined"])
      .update({ state: "superseded" });
  },

  async insertRevision(row: {
    id: RevisionId;
    quoteId: QuoteId;
    projectId: ProjectId;
    number: number;
    by: PersonId;
    issuedAt: Date;
    validUntilOn: string;
    price_minor: number;
    currency: string;
    snapshot: string;
    snapshotHash: string;
    pdfHash: string;
  }): Promise<void> {
    await db.insert("quote_revisions", {
      id: row.id,
      quote_id: row.quoteId,
      project_id: row.projectId,
      number: row.number,
      state: "issued",
      issued_at: row.issuedAt,
      issued_by: row.by,
      valid_until_on: row.validUntilOn,
      price_minor: row.price_minor,
      currency: row.currency,
      snapshot: row.snapshot,
      snapshot_hash: row.snapshotHash,
      pdf_hash: row.pdfHash,
    });
  },

  async insertLink(row: {
    id: QuoteLinkId;
    quoteId: QuoteId;
    revisionId: RevisionId;
    name: string;
    email: string;
    tokenHash: string;
    mailId: string;
    expiresAt: Date;
  }): Promise<void> {
    await db.insert("quote_links", {
      id: row.id,
      quote_id: row.quoteId,
      revision_id: row.revisionId,
      recipient_name: row.name,
      recipient_email: row.email,
      token_hash: row.tokenHash,
      mail_id: row.mailId,
      created_at: db.now(),
      expires_at: row.expiresAt,
    });
  },

  async lockRevision(
    projectId: ProjectId,
    quoteId: QuoteId,
    id: RevisionId,
  ): Promise<{ state: StoredState; number: number } | null> {
    const row: { state: StoredState; number: number } | undefined = await db
      .from("quote_revisions")
      .where({ id, quote_id: quoteId, project_id: projectId })
      .forUpdate()
      .first("state", "number");
    return row ?? null;
  },

  async setState(id: RevisionId, state: StoredState): Promise<void> {
    await db.from("quote_revisions").where({ id }).update({ state });
  },

  /** False when there is no such open link here. */
  async revokeLink(quoteId: QuoteId, id: QuoteLinkId): Promise<boolean> {
    const changed = await db
      .from("quote_links")
      .where({ id, quote_id: quoteId })
      .whereNull("revoked_at")
      .update({ revoked_at: db.now() });
    return changed === 1;
  },

  async pdfHash(
    projectId: ProjectId,
    quoteId: QuoteId,
    id: RevisionId,
  ): Promise<{ pdfHash: string; number: string; revision: number } | null> {
    const row: { pdfHash: string; number: string; revision: number } | undefined = await db
      .from("quote_revisions", "r")
      .join("quotes as q", { "q.organization_id": "r.organization_id", "q.id": "r.quote_id" })
      .where({ "r.id": id, "r.quote_id": quoteId, "r.project_id": projectId })
      .first({ pdfHash: "r.pdf_hash", number: "q.number", revision: "r.number" });
    return row ?? null;
  },
});

const COLUMNS = {
  quote_id: "q.id",
  number: "q.number",
  draft: "q.draft",
  version: "q.version",
  revision_id: "r.id",
  revision_number: "r.number",
  state: "r.state",
  issued_at: "r.issued_at",
  issued_by: "issuer.name",
  valid_until_on: "r.valid_until_on",
  price_minor: "r.price_minor",
  currency: "r.currency",
  snapshot_hash: "r.snapshot_hash",
  response_kind: "a.kind",
  response_name: "a.name",
  response_title: "a.title",
  po_number: "a.po_number",
  reason: "a.reason",
  response_at: "a.at",
  link_id: "l.id",
  recipient_name: "l.recipient_name",
  recipient_email: "l.recipient_email",
  opened_at: "l.opened_at",
  expires_at: "l.expires_at",
  revoked_at: "l.revoked_at",
  mail_state: "m.state",
  mail_error: "m.last_error",
  time_zone: "o.time_zone",
} satisfies Readonly<Record<keyof QuoteRow | "time_zone", string>>;
