import type { PersonId } from "@cleatwork/contracts";
import { fromJson } from "../db/columns.ts";
import type { TenantDb } from "../db/tenant-db.ts";
import { isDuplicate } from "../db/transaction.ts";

export interface KeptAnswer {
  readonly endpoint: string;
  readonly requestHash: string;
  /** Null while the first request is still running. */
  readonly status: number | null;
  readonly answer: unknown;
}

/** No request runs this long: whoever claimed the key has died. */
const ABANDONED_AFTER_MS = 120_000;

export const idempotencyRepository = (db: TenantDb, personId: PersonId) => {
  const row = (key: string) => db.from("idempotency_keys").where({ person_id: personId, request_key: key });
  return {
    /** Null when the key is ours now; otherwise what the first request left. */
    async claim(key: string, endpoint: string, requestHash: string): Promise<KeptAnswer | null> {
      try {
        await db.insert("idempotency_keys", {
          person_id: personId,
          request_key: key,
          endpoint,
          request_hash: requestHash,
          created_at: db.now(),
        });
        return null;
      } catch (error) {
        if (!isDuplicate(error)) throw error;
      }
      if (await this.takeOver(key, endpoint, requestHash)) return null;
      const kept: KeptAnswer | undefined = await row(key).first({
        endpoint: "endpoint",
        requestHash: "request_hash",
        status: "status",
        answer: "answer",
      });
      return kept ? { ...kept, answer: kept.answer === null ? null : fromJson(kept.answer) } : null;
    },
    /** Claims the key of a request that never ended: the process was killed, and only the first to ask again may go on. */
    async takeOver(key: string, endpoint: string, requestHash: string): Promise<boolean> {
      const changed = await row(key)
        .where({ endpoint, request_hash: requestHash })
        .whereNull("status")
        .where("created_at", "<", new Date(db.now().getTime() - ABANDONED_AFTER_MS))
        .update({ created_at: db.now() });
      return changed === 1;
    },
    async keep(key: string, status: number, answer: unknown): Promise<void> {
      await row(key).update({ status, answer: JSON.stringify(answer ?? null) });
    },
    async release(key: string): Promise<void> {
      await row(key).delete();
    },
  };
};
