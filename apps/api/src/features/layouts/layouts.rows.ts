import type { Change, LayoutRecord, PersonId } from "@cleatwork/contracts";
import { fromJson, instantFromColumn, type InstantColumn } from "../../platform/db/columns.ts";

/** A record beside the head it belongs to; a layout without records gives one row with nulls. */
export interface HeadAndRecordRow {
  readonly sequence: number;
  readonly document: unknown;
}

export const recordsFromRows = (rows: readonly HeadAndRecordRow[]): LayoutRecord[] =>
  rows.filter((row) => row.document !== null).map((row) => fromJson<LayoutRecord>(row.document));

/** Foreign keys that the database can check rest in columns of their own, beside the document. */
export const rowFromRecord = (projectId: string, record: LayoutRecord) => ({
  project_id: projectId,
  id: record.id,
  kind: record.kind,
  document: JSON.stringify(record),
  spec_id: record.kind === "system" ? record.specId : null,
  drawing_id: record.kind === "level" ? (record.underlay?.drawingId ?? null) : null,
});

export interface ChangeRow {
  readonly sequence: number;
  readonly person_id: PersonId;
  readonly person_name: string;
  readonly label: string;
  readonly changes: unknown;
  readonly at: InstantColumn;
}

export const loggedChangeFromRow = (row: ChangeRow) => ({
  sequence: row.sequence,
  by: { id: row.person_id, name: row.person_name },
  at: instantFromColumn(row.at),
  label: row.label,
  changes: fromJson<Change[]>(row.changes),
});
