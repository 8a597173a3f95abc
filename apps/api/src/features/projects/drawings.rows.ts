import type { Drawing } from "@cleatwork/contracts";
import { dayFromColumn, instantFromColumn, type DayColumn, type InstantColumn } from "../../platform/db/columns.ts";

export interface DrawingRow {
  readonly id: Drawing["id"];
  readonly sheet_number: string;
  readonly title: string;
  readonly revision: string;
  readonly dated_on: DayColumn;
  readonly file_name: string;
  readonly media_type: Drawing["mediaType"];
  readonly byte_count: number;
  readonly page_count: number;
  readonly file_hash: string;
  readonly uploaded_at: InstantColumn;
  readonly uploaded_by_name: string;
}

export const drawingFromRow = (row: DrawingRow): Drawing => ({
  id: row.id,
  sheetNumber: row.sheet_number,
  title: row.title,
  revision: row.revision,
  datedOn: dayFromColumn(row.dated_on),
  fileName: row.file_name,
  mediaType: row.media_type,
  byteCount: row.byte_count,
  pageCount: row.page_count,
  uploadedAt: instantFromColumn(row.uploaded_at),
  uploadedBy: row.uploaded_by_name,
});
