import type { OrganizationId, PersonId, ProjectId, QuoteId, QuoteLinkId, RevisionId, Role } from "@cleatwork/contracts";
import { dayFromColumn } from "../../platform/db/columns.ts";
import type { SystemDb } from "../../platform/db/system-db.ts";
import type { TenantDb } from "../../platform/db/tenant-db.ts";
import type { StoredState } from "./quotes.rules.ts";

export interface OpenedLink {
  readonly organizationId: OrganizationId;
  readonly slug: string;
  readonly zone: string;
  readonly linkId: QuoteLinkId;
  readonly recipient: { readonly name: string; readonly email: string };
  readonly openedAt: Date | null;
  readonly expiresAt: Date;
  readonly revokedAt: Date | null;
  readonly revisionId: RevisionId;
  readonly quoteId: QuoteId;
  readonly projectId: ProjectId;
  readonly issuedBy: PersonId;
  readonly state: StoredState;
  readonly validUntilOn: string;
  readonly snapshot: string;
  readonly snapshotHash: string;
  readonly pdfHash: string;
  readonly response: { readonly kind: "accepted" | "declined"; readonly name: string; readonly at: Date } | null;
}

type LinkRow = Omit<OpenedLink, "validUntilOn" | "recipient" | "response"> & {
  readonly validUntilOn: Date | string;
  readonly recipientName: string;
  readonly recipientEmail: string;
  readonly responseKind: "accepted" | "declined" | null;
  readonly responseName: string;
  readonly responseAt: Date;
};

/** A private link says which company: this is the one way into a company's data without a membership. */
export async function findLink(db: SystemDb, tokenHash: string): Promise<OpenedLink | null> {
  const row: LinkRow | undefined = await db
    .from("quote_links", "l")
    .join("quote_revisions as r", { "r.organization_id": "l.organization_id", "r.id": "l.revision_id" })
    .join("organizations as o", "o.id", "l.organization_id")
    .leftJoin("quote_responses as a", { "a.organization_id": "r.organization_id", "a.revision_id": "r.id" })
    .where("l.token_hash", tokenHash)
    .first({
      organizationId: "l.organization_id",
      slug: "o.slug",
      zone: "o.time_zone",
      linkId: "l.id",
      recipientName: "l.recipient_name",
      recipientEmail: "l.recipient_email",
      openedAt: "l.opened_at",
      expiresAt: "l.expires_at",
      revokedAt: "l.revoked_at",
      revisionId: "r.id",
      quoteId: "r.quote_id",
      projectId: "r.project_id",
      issuedBy: "r.issued_by",
      state: "r.state",
      validUntilOn: "r.valid_until_on",
      snapshot: "r.snapshot",
      snapshotHash: "r.snapshot_hash",
      pdfHash: "r.pdf_hash",
      responseKind: "a.kind",
      responseName: "a.name",
      responseAt: "a.at",
    });
  if (!row) return null;
  const { recipientName, recipientEmail, responseKind, responseName, responseAt, ...link } = row;
  return {
    ...link,
    validUntilOn: dayFromColumn(row.validUntilOn),
    recipient: { name: recipientName, email: recipientEmail },
    response: responseKind && { kind: responseKind, name: responseName, at: responseAt },
  };
}

export const linksRepository = (db: TenantDb) => ({
  async markOpened(linkId: QuoteLinkId): Promise<void> {
    await db.from("quote_links").where({ id: linkId }).whereNull("opened_at").update({ opened_at: db.now() });
  },

  /** The revision's state with its row locked, so that of two answers one comes first. */
  async lockState(revisionId: RevisionId): Promise<StoredState> {
    const row: { state: StoredState } = await db
      .from("quote_revisions")
      .where({ id: revisionId })
      .forUpdate()
      .first("state");
    return row.state;
  },

  async isRevoked(linkId: QuoteLinkId): Promise<boolean> {
    return (await db.from("quote_links").where({ id: linkId }).whereNull("revoked_at").first("id")) === undefined;
  },

  async insertResponse(row: {
    revisionId: RevisionId;
    linkId: QuoteLinkId;
    kind: "accepted" | "declined";
    name: string;
    title: string;
    poNumber: string;
    reason: string;
    consent: string;
    snapshotHash: string;
    ip: string;
    userAgent: string;
  }): Promise<void> {
    await db.insert("quote_responses", {
      revision_id: row.revisionId,
      link_id: row.linkId,
      kind: row.kind,
      name: row.name,
      title: row.title,
      po_number: row.poNumber,
      reason: row.reason,
      consent: row.consent,
      snapshot_hash: row.snapshotHash,
      ip: row.ip,
      user_agent: row.userAgent,
      at: db.now(),
    });
  },

  async setState(revisionId: RevisionId, state: StoredState): Promise<void> {
    await db.from("quote_revisions").where({ id: revisionId }).update({ state });
  },

  /** Who hears of an answer. */
  async peopleToTell(): Promise<{ id: PersonId; name: string; email: string; role: Role }[]> {
    const rows: { id: PersonId; name: string; email: string; role: Role }[] = await db
      .from("memberships", "m")
      .join("people as p", "p.id", "m.person_id")
      .orderBy("p.id")
      .select({ id: "p.id", name: "p.name", email: "p.email", role: "m.role" });
    return rows;
  },
});
