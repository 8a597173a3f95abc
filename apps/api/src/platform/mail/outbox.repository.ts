import type { OrganizationId } from "@cleatwork/contracts";
import { fromJson } from "../db/columns.ts";
import type { SystemDb } from "../db/system-db.ts";
import type { MailMessage } from "./outbox.ts";

/** A worker that dies leaves its claim behind; after this long another takes it. */
const LEASE_MS = 2 * 60_000;

export interface ClaimedMail {
  readonly id: string;
  readonly organizationId: OrganizationId | null;
  readonly message: MailMessage;
  readonly attempts: number;
}

export const outboxRepository = (db: SystemDb) => ({
  /** The mail that has waited longest, ours for a while. Several workers never take the same one. */
  claim(): Promise<ClaimedMail | null> {
    return db.transaction(async (tx) => {
      const now = tx.now();
      const row:
        { id: string; organization_id: OrganizationId | null; message: unknown; attempts: number } | undefined =
        await tx
          .from("outbox")
          .where({ state: "queued" })
          .where("next_attempt_at", "<=", now)
          .where((free) => void free.whereNull("leased_until").orWhere("leased_until", "<", now))
          .orderBy("next_attempt_at")
          .forUpdate()
          .skipLocked()
          .first("id", "organization_id", "message", "attempts");
      if (!row) return null;
      await tx
        .from("outbox")
        .where({ id: row.id })
        .update({ leased_until: new Date(now.getTime() + LEASE_MS), attempts: row.attempts + 1 });
      return {
        id: row.id,
        organizationId: row.organization_id,
        message: fromJson<MailMessage>(row.message),
        attempts: row.attempts + 1,
      };
    });
  },

  async markSent(id: string): Promise<void> {
    await db
      .from("outbox")
      .where({ id })
      .update({ state: "sent", sent_at: db.now(), leased_until: null, last_error: null });
  },

  async retryAt(id: string, at: Date, error: string): Promise<void> {
    await db
      .from("outbox")
      .where({ id })
      .update({ next_attempt_at: at, leased_until: null, last_error: error.slice(0, 500) });
  },

  async giveUp(id: string, state: "refused" | "dead", error: string): Promise<void> {
    await db
      .from("outbox")
      .where({ id })
      .update({ state, leased_until: null, last_error: error.slice(0, 500) });
  },

  /** What has expired and helps no one any more. Mail is never swept. */
  async sweep(): Promise<void> {
    const day = 24 * 3600_000;
    const now = db.now();
    await db.from("sessions").where("expires_at", "<", now).delete();
    await db
      .from("email_tokens")
      .where("expires_at", "<", new Date(now.getTime() - day))
      .delete();
    await db
      .from("idempotency_keys")
      .where("created_at", "<", new Date(now.getTime() - 3 * day))
      .delete();
  },
});
