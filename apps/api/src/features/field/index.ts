/** The door of the field. */
import type { ApprovedTakeoffId, ProjectId, RevisionId } from "@cleatwork/contracts";
import { createHash } from "node:crypto";
import type { TenantDb } from "../../platform/db/tenant-db.ts";
import { approvedDocument, type Sold } from "./approved-takeoff.ts";
import { fieldRepository } from "./field.repository.ts";

export { fieldHandlers } from "./field.routes.ts";

/** Freezes what was sold as what is built, in the transaction of the acceptance. */
export async function approveTakeoff(
  tx: TenantDb,
  sold: { projectId: ProjectId; revisionId: RevisionId; snapshotHash: string; snapshot: Sold },
): Promise<void> {
  const document = approvedDocument(sold.snapshot, sold.snapshotHash);
  const text = JSON.stringify(document);
  await fieldRepository(tx).insert({
    id: tx.newId("apt") as ApprovedTakeoffId,
    projectId: sold.projectId,
    revisionId: sold.revisionId,
    document: text,
    hash: createHash("sha256").update(text).digest("hex"),
    pieceCount: document.pieces.length,
    weight_kg: document.pieces.reduce((sum, { weight_kg }) => sum + weight_kg, 0),
  });
}
