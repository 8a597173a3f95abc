import type { Change, DrawingId, LayoutRecord, PersonId, ProjectId, RecordId, SpecId } from "@cleatwork/contracts";
import { ask, type Question } from "../../platform/db/question.ts";
import type { TenantDb } from "../../platform/db/tenant-db.ts";
import {
  loggedChangeFromRow,
  recordsFromRows,
  rowFromRecord,
  type ChangeRow,
  type HeadAndRecordRow,
} from "./layouts.rows.ts";

/** Rows a statement; keeps one statement well under MariaDB's default packet of 16 MiB. */
const ROWS_A_STATEMENT = 1000;
const BYTES_A_STATEMENT = 4_000_000;

export interface LoggedSet {
  readonly sequence: number;
  readonly batchId: string;
  readonly batchHash: string;
  readonly by: PersonId;
  readonly at: Date;
  readonly label: string;
  readonly changes: readonly Change[];
}

interface StoredLayout {
  readonly sequence: number;
  readonly records: LayoutRecord[];
}

/** Null when there is no such project here. */
export const layoutQuestion = (db: TenantDb, projectId: ProjectId): Question<StoredLayout | null> => ({
  from: db
    .from("layouts", "l")
    .leftJoin("layout_records as r", { "r.organization_id": "l.organization_id", "r.project_id": "l.project_id" })
    .where("l.project_id", projectId),
  columns: { sequence: "l.sequence", document: "r.document" },
  order: "r.id",
  read: (rows: readonly HeadAndRecordRow[]) =>
    rows[0] ? { sequence: rows[0].sequence, records: recordsFromRows(rows) } : null,
});

export const layoutsRepository = (db: TenantDb) => ({
  find: (projectId: ProjectId): Promise<StoredLayout | null> => ask(layoutQuestion(db, projectId)),

  /** Locks the head, so that saves of one layout go one after the other. */
  async lockHead(projectId: ProjectId): Promise<{ sequence: number } | null> {
    const row: { sequence: number } | undefined = await db
      .from("layouts")
      .where({ project_id: projectId })
      .forUpdate()
      .first("sequence");
    return row ?? null;
  },

  async findBatch(
    projectId: ProjectId,
    batchId: string,
  ): Promise<{ firstSequence: number; lastSequence: number; hash: string } | null> {
    const row = (await db
      .from("layout_changes")
      .where({ project_id: projectId, batch_id: batchId })
      .min({ firstSequence: "sequence", hash: "batch_hash" })
      .max({ lastSequence: "sequence" })
      .first()) as { firstSequence: number | null; lastSequence: number; hash: string } | undefined;
    return row && row.firstSequence !== null ? { ...row, firstSequence: row.firstSequence } : null;
  },

  async insertHead(projectId: ProjectId): Promise<void> {
    await db.insert("layouts", { project_id: projectId, sequence: 0, segment_count: 0 });
  },

  async moveHead(projectId: ProjectId, head: { sequence: number; segmentCount: number }): Promise<void> {
    await db
      .from("layouts")
      .where({ project_id: projectId })
      .update({ sequence: head.sequence, segment_count: head.segmentCount });
  },

  async replaceRecords(
    projectId: ProjectId,
    touched: { gone: readonly RecordId[]; written: readonly LayoutRecord[] },
  ): Promise<void> {
    const ids = [...touched.gone, ...touched.written.map((record) => record.id)];
    for (const some of chunksOf(ids, ROWS_A_STATEMENT))
      await db.from("layout_records").where({ project_id: projectId }).whereIn("id", some).delete();
    const rows = touched.written.map((record) => rowFromRecord(projectId, record));
    for (const some of chunksOf(rows, ROWS_A_STATEMENT)) await db.insert("layout_records", some);
  },

  async appendLog(projectId: ProjectId, sets: readonly LoggedSet[]): Promise<void> {
    const rows = sets.map((set) => ({
      project_id: projectId,
      sequence: set.sequence,
      batch_id: set.batchId,
      batch_hash: set.batchHash,
      person_id: set.by,
      label: set.label,
      changes: JSON.stringify(set.changes),
      at: set.at,
    }));
    for (const some of chunksBySize(rows, (row) => row.changes.length)) await db.insert("layout_changes", some);
  },

  /** Null when there is no such project here. */
  async listChanges(projectId: ProjectId, after: number, limit: number) {
    const rows = (await db
      .from("layouts", "l")
      .leftJoin("layout_changes as c", function () {
        this.on("c.organization_id", "l.organization_id")
          .andOn("c.project_id", "l.project_id")
          .andOnVal("c.sequence", ">", after);
      })
      .leftJoin("people as u", "u.id", "c.person_id")
      .where("l.project_id", projectId)
      .select("c.sequence", "c.person_id", "c.label", "c.changes", "c.at", { person_name: "u.name" })
      .orderBy("c.sequence")
      .limit(limit)) as (ChangeRow | { sequence: null })[];
    if (rows.length === 0) return null;
    return rows.filter((row): row is ChangeRow => row.sequence !== null).map(loggedChangeFromRow);
  },

  async knownSpecs(ids: readonly SpecId[]): Promise<Set<SpecId>> {
    if (ids.length === 0) return new Set();
    const rows: { id: SpecId }[] = await db
      .from("specs")
      .whereIn("id", [...ids])
      .select("id");
    return new Set(rows.map((row) => row.id));
  },

  async knownDrawings(projectId: ProjectId, ids: readonly DrawingId[]): Promise<Set<DrawingId>> {
    if (ids.length === 0) return new Set();
    const rows: { id: DrawingId }[] = await db
      .from("drawings")
      .where({ project_id: projectId })
      .whereIn("id", [...ids])
      .select("id");
    return new Set(rows.map((row) => row.id));
  },
});

function* chunksOf<T>(items: readonly T[], size: number): Generator<T[]> {
  for (let start = 0; start < items.length; start += size) yield items.slice(start, start + size);
}

function* chunksBySize<T>(items: readonly T[], size: (item: T) => number): Generator<T[]> {
  let chunk: T[] = [];
  let bytes = 0;
  for (const item of items) {
    if (chunk.length > 0 && bytes + size(item) > BYTES_A_STATEMENT) {
      yield chunk;
      chunk = [];
      bytes = 0;
    }
    chunk.push(item);
    bytes += size(item);
  }
  if (chunk.length > 0) yield chunk;
}
