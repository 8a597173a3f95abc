import type { PersonId } from "@cleatwork/contracts";
import type { TenantDb } from "./db/tenant-db.ts";

export interface AuditEntry {
  /** Null when no one is signed in: a client behind a link, a timer. */
  readonly by: PersonId | null;
  /** Past tense: `quote.issued`. */
  readonly event: string;
  readonly subject: string;
  readonly details: Record<string, unknown>;
}

/** Writes who did what, in the transaction that does it. The database refuses to change it later. */
export async function recordAudit(tx: TenantDb, entry: AuditEntry): Promise<void> {
  await tx.insert("audit_entries", {
    id: tx.newId("aud"),
    at: tx.now(),
    person_id: entry.by,
    event: entry.event,
    subject: entry.subject.slice(0, 200),
    details: JSON.stringify(entry.details),
  });
}
