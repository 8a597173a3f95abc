import type {
  LayoutRecord,
  LevelId,
  LevelRecord,
  PersonId,
  ProjectId,
  SaveLayoutRequest,
  SaveLayoutResponse,
} from "@cleatwork/contracts";
import { meters } from "@cleatwork/calc";
import { createHash, randomUUID } from "node:crypto";
import type { TenantDb } from "../../platform/db/tenant-db.ts";
import { problem } from "../../platform/http/problem.ts";
import { layoutsRepository, type LoggedSet } from "./layouts.repository.ts";
import { applySets, pointersInto, referenceErrors, soundnessErrors } from "./layouts.rules.ts";

interface Edit {
  readonly by: PersonId;
  readonly now: Date;
}

/** Gives a new project its layout: a head and, as the first change of the log, a first level. */
export async function startLayout(
  tx: TenantDb,
  projectId: ProjectId,
  edit: Edit & { levelId: LevelId },
): Promise<void> {
  await layoutsRepository(tx).insertHead(projectId);
  const level: LevelRecord = {
    kind: "level",
    id: edit.levelId,
    name: "Level 1",
    elevation_m: meters(0),
    underlay: null,
  };
  await saveLayout(tx, projectId, edit, {
    batchId: randomUUID(),
    baseSequence: 0,
    sets: [{ label: "Start with Level 1", changes: [{ id: level.id, before: null, after: level }] }],
  });
}

/**
 * Applies a batch of edits, all or none. The head is locked first, so that saves of one layout go one after the other;
 * the log itself remembers which batches were done, so that a batch sent twice counts once.
 */
export async function saveLayout(
  tenant: TenantDb,
  projectId: ProjectId,
  edit: Edit,
  request: SaveLayoutRequest,
): Promise<SaveLayoutResponse> {
  const batchHash = createHash("sha256").update(JSON.stringify(request.sets)).digest("hex");

  return tenant.transaction(async (tx) => {
    const layouts = layoutsRepository(tx);
    const head = await layouts.lockHead(projectId);
    if (!head) throw problem("not-found", "There is no such project.");

    const done = await layouts.findBatch(projectId, request.batchId);
    if (done) {
      if (done.hash !== batchHash)
        throw problem("idempotency-mismatch", "This batch id was used for other edits; send these under a new one.");
      return { sequence: done.lastSequence, previousSequence: done.firstSequence - 1 };
    }
    if (request.baseSequence > head.sequence)
      throw problem("not-valid", "The edits build on a layout that is not here yet.", [
        {
          pointer: "/baseSequence",
          code: "base-ahead",
          message: `at most ${head.sequence}, the present sequence`,
          value: request.baseSequence,
        },
      ]);

    const current = await layouts.find(projectId);
    const applied = applySets(current?.records ?? [], request.sets);
    if (applied.kind === "malformed")
      throw problem("layout-refused", "Some of the changes contradict themselves.", [...applied.errors]);
    if (applied.kind === "conflict")
      throw problem("layout-conflict", "Others have changed some of the same things meanwhile.", [...applied.errors]);

    const after = [...applied.records.values()];
    const written = after.filter((record) => applied.touched.has(record.id));
    const pointer = pointersInto(request.sets);
    const refused = [
      ...soundnessErrors(applied.records, pointer),
      ...(await unknownReferences(tx, projectId, written, pointer)),
    ];
    if (refused.length > 0) throw problem("layout-refused", sentence(refused), refused);

    const gone = [...applied.touched].filter((id) => !applied.records.has(id));
    await layouts.replaceRecords(projectId, { gone, written });
    const log = request.sets.map((set, index): LoggedSet => ({
      sequence: head.sequence + 1 + index,
      batchId: request.batchId,
      batchHash,
      by: edit.by,
      at: edit.now,
      label: set.label,
      changes: set.changes,
    }));
    await layouts.appendLog(projectId, log);
    const sequence = head.sequence + log.length;
    const segmentCount = after.filter((record) => record.kind === "segment").length;
    await layouts.moveHead(projectId, { sequence, segmentCount });
    return { sequence, previousSequence: head.sequence };
  });
}

/** Specs must be the company's, drawings the project's; the foreign keys say so too, but cannot name the record. */
async function unknownReferences(
  tx: TenantDb,
  projectId: ProjectId,
  written: readonly LayoutRecord[],
  pointer: (recordId: string, field: string) => string,
) {
  const layouts = layoutsRepository(tx);
  const specIds = written.flatMap((record) => (record.kind === "system" ? [record.specId] : []));
  const drawingIds = written.flatMap((record) =>
    record.kind === "level" && record.underlay ? [record.underlay.drawingId] : [],
  );
  const known = {
    specs: await layouts.knownSpecs(specIds),
    drawings: await layouts.knownDrawings(projectId, drawingIds),
  };
  return referenceErrors(written, known, pointer);
}

const sentence = (errors: readonly { message: string }[]) =>
  errors.length === 1
    ? `One thing stands against saving: ${errors[0]?.message ?? ""}.`
    : `${errors.length} things stand against saving.`;
