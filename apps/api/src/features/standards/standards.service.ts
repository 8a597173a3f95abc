import { NO_COMPANY_STANDARDS } from "@cleatwork/calc";
import type { PersonId, Standards, standardsRequest } from "@cleatwork/contracts";
import type { z } from "zod";
import { recordAudit } from "../../platform/audit.ts";
import type { TenantDb } from "../../platform/db/tenant-db.ts";
import { problem } from "../../platform/http/problem.ts";
import { standardsRepository } from "./standards.repository.ts";
import { standardsFrom } from "./standards.rows.ts";
import { standardsChanges } from "./standards.rules.ts";

/** The latest version, or the one asked for, or the one in force on a day. */
export async function getStandards(
  tenant: TenantDb,
  { on, version }: { on?: string | undefined; version?: number | undefined },
): Promise<Standards> {
  const standards = standardsRepository(tenant);
  const latest = await standards.latestVersion();
  if (on !== undefined) return standardsFrom(await standards.findOn(on), latest, NO_COMPANY_STANDARDS);
  const shown = latest === 0 && version === undefined ? null : await standards.find(version ?? latest);
  if (version !== undefined && !shown) throw problem("not-found", "There is no such version of the standards.");
  return standardsFrom(shown, latest, NO_COMPANY_STANDARDS);
}

/** A version is added, never changed; a document that changes nothing is not a version. */
export async function updateStandards(
  tenant: TenantDb,
  request: z.infer<typeof standardsRequest>,
  expected: number,
  by: PersonId,
): Promise<Standards> {
  return tenant.transaction(async (tx) => {
    const standards = standardsRepository(tx);
    const latest = await standards.lockLatestVersion();
    if (latest !== expected) throw problem("stale", "The standards were saved by someone else meanwhile.");
    const before = latest === 0 ? null : await standards.find(latest);
    const { effectiveOn, note, document } = request;
    const changes = standardsChanges(before?.document ?? NO_COMPANY_STANDARDS, document);
    if (changes.length === 0 && (before?.effectiveOn ?? effectiveOn) === effectiveOn)
      return standardsFrom(before, latest, NO_COMPANY_STANDARDS);
    const version = latest + 1;
    await standards.add({ version, effectiveOn, document, changes, note, by });
    await recordAudit(tx, {
      by,
      event: "standards.changed",
      subject: `version ${version}`,
      details: { effectiveOn, note, changes: changes.slice(0, AUDITED), changeCount: changes.length },
    });
    return standardsFrom({ version, effectiveOn, document }, version, NO_COMPANY_STANDARDS);
  });
}

/** The rows of the history hold them all; the audit trail names the first. */
const AUDITED = 40;
