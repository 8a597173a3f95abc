import type { PersonId } from "@cleatwork/contracts";
import { createHash } from "node:crypto";
import type { TenantDb } from "../db/tenant-db.ts";
import { idempotencyRepository } from "./idempotency.repository.ts";
import { problem } from "./problem.ts";

interface Once {
  readonly tenant: TenantDb;
  readonly personId: PersonId;
  readonly key: string | undefined;
  readonly endpoint: string;
  readonly request: unknown;
  readonly status: number;
}

/** The same key and request get the stored answer; the work is done once. A refused request frees its key. */
export async function onlyOnce<T>(once: Once, work: () => Promise<T>): Promise<T> {
  const { key } = once;
  if (!key || !/^[\w.:-]{8,80}$/.test(key))
    throw problem(
      "not-valid",
      "This request needs an Idempotency-Key header of 8 to 80 letters, digits, dots or hyphens.",
    );
  const requestHash = createHash("sha256")
    .update(JSON.stringify(once.request ?? null))
    .digest("hex");
  const keys = idempotencyRepository(once.tenant, once.personId);
  const kept = await keys.claim(key, once.endpoint, requestHash);
  if (kept) {
    if (kept.endpoint !== once.endpoint || kept.requestHash !== requestHash)
      throw problem("idempotency-mismatch", "This Idempotency-Key belongs to a different request. Use a new one.");
    if (kept.status === null) throw problem("still-running", "The first request with this key has not ended yet.");
    return kept.answer as T;
  }
  try {
    const answer = await work();
    await keys.keep(key, once.status, answer);
    return answer;
  } catch (error) {
    await keys.release(key);
    throw error;
  }
}
