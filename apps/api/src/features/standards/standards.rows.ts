import type { CompanyStandards } from "@cleatwork/calc";
import type { PersonId, Standards, StandardsChange } from "@cleatwork/contracts";
import {
  dayFromColumn,
  fromJson,
  instantFromColumn,
  type DayColumn,
  type InstantColumn,
} from "../../platform/db/columns.ts";

export interface VersionRow {
  readonly version: number;
  readonly effective_on: DayColumn;
  readonly document: unknown;
}

export interface StandardsVersion {
  readonly version: number;
  readonly effectiveOn: string;
  readonly document: CompanyStandards;
}

export const versionFromRow = (row: VersionRow): StandardsVersion => ({
  version: row.version,
  effectiveOn: dayFromColumn(row.effective_on),
  document: fromJson<CompanyStandards>(row.document),
});

export interface HistoryRow {
  readonly version: number;
  readonly effective_on: DayColumn;
  readonly note: string;
  readonly changes: unknown;
  readonly changed_by: PersonId;
  readonly person_name: string;
  readonly changed_at: InstantColumn;
}

const LISTED = 200;

export function historyFromRow(row: HistoryRow) {
  const changes = fromJson<StandardsChange[]>(row.changes);
  return {
    version: row.version,
    effectiveOn: dayFromColumn(row.effective_on),
    note: row.note,
    by: { id: row.changed_by, name: row.person_name },
    at: instantFromColumn(row.changed_at),
    changes: changes.slice(0, LISTED),
    moreChanges: Math.max(0, changes.length - LISTED),
  };
}

export const standardsFrom = (
  shown: StandardsVersion | null,
  latest: number,
  nothing: CompanyStandards,
): Standards => ({
  version: latest,
  shownVersion: shown?.version ?? 0,
  effectiveOn: shown?.effectiveOn ?? null,
  document: shown?.document ?? nothing,
});
