import type { QuoteDraft, QuoteId, QuoteLinkId, RevisionId, Quote, RevisionItem } from "@cleatwork/contracts";
import { dayFromColumn, fromJson, instantFromColumn, instantOrNull } from "../../platform/db/columns.ts";
import { stateAt, type StoredState } from "./quotes.rules.ts";

/** A quote with one of its revisions and one of that revision's links: the flat answer of one statement. */
export interface QuoteRow {
  quote_id: QuoteId;
  number: string;
  draft: unknown;
  version: number;
  revision_id: RevisionId | null;
  revision_number: number;
  state: StoredState;
  issued_at: Date;
  issued_by: string;
  valid_until_on: Date | string;
  price_minor: number | string;
  currency: string;
  snapshot_hash: string;
  response_kind: "accepted" | "declined" | null;
  response_name: string;
  response_title: string;
  po_number: string;
  reason: string;
  response_at: Date;
  link_id: QuoteLinkId | null;
  recipient_name: string;
  recipient_email: string;
  opened_at: Date | null;
  expires_at: Date;
  revoked_at: Date | null;
  mail_state: RevisionItem["links"][number]["mailState"] | null;
  mail_error: string | null;
}

/** Rows come by quote, then newest revision first. */
export function quotesFromRows(rows: readonly QuoteRow[], zone: string, now: Date): Quote[] {
  const quotes = new Map<QuoteId, Quote & { revisions: RevisionItem[] }>();
  const revisions = new Map<RevisionId, RevisionItem>();
  for (const row of rows) {
    let quote = quotes.get(row.quote_id);
    if (!quote) {
      quote = {
        id: row.quote_id,
        number: row.number,
        draft: fromJson<QuoteDraft>(row.draft),
        revisions: [],
        version: row.version,
      };
      quotes.set(row.quote_id, quote);
    }
    if (row.revision_id === null) continue;
    let revision = revisions.get(row.revision_id);
    if (!revision) {
      revision = revisionFromRow(row, row.revision_id, zone, now);
      revisions.set(row.revision_id, revision);
      quote.revisions.push(revision);
    }
    if (row.link_id !== null) revision.links.push(linkFromRow(row, row.link_id));
  }
  return [...quotes.values()];
}

const revisionFromRow = (row: QuoteRow, id: RevisionId, zone: string, now: Date): RevisionItem => {
  const validUntilOn = dayFromColumn(row.valid_until_on);
  return {
    id,
    number: row.revision_number,
    state: stateAt({ state: row.state, validUntilOn }, zone, now),
    issuedAt: instantFromColumn(row.issued_at),
    issuedBy: row.issued_by,
    validUntilOn,
    price_minor: Number(row.price_minor),
    currency: row.currency,
    snapshotHash: row.snapshot_hash,
    links: [],
    response: row.response_kind && {
      kind: row.response_kind,
      name: row.response_name,
      title: row.response_title,
      poNumber: row.po_number,
      reason: row.reason,
      at: instantFromColumn(row.response_at),
    },
  };
};

const linkFromRow = (row: QuoteRow, id: QuoteLinkId): RevisionItem["links"][number] => ({
  id,
  recipientName: row.recipient_name,
  recipientEmail: row.recipient_email,
  mailState: row.mail_state ?? "queued",
  mailError: row.mail_error,
  openedAt: instantOrNull(row.opened_at),
  expiresAt: instantFromColumn(row.expires_at),
  revokedAt: instantOrNull(row.revoked_at),
});
