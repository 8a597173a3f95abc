import { NO_COMPANY_STANDARDS, type CompanyStandards } from "@cleatwork/calc";
import type { PersonId, StandardsChange } from "@cleatwork/contracts";
import type { Question } from "../../platform/db/question.ts";
import type { TenantDb } from "../../platform/db/tenant-db.ts";
import {
  historyFromRow,
  versionFromRow,
  type HistoryRow,
  type StandardsVersion,
  type VersionRow,
} from "./standards.rows.ts";

const DAY_MS = 86_400_000;

/**
 * The versions that can be in force today somewhere on earth: the one of yesterday and those that begin until tomorrow.
 * Which of them it is depends on the company's day, which only the caller knows.
 */
export const standardsQuestion = (db: TenantDb): Question<StandardsVersion[]> => {
  const day = (offset: number) => new Date(db.now().getTime() + offset * DAY_MS).toISOString().slice(0, 10);
  return {
    from: db
      .from("standards", "s")
      .where("s.effective_on", "<=", day(1))
      .whereNotExists(
        db
          .from("standards", "later")
          .select("later.version")
          .where("later.effective_on", "<=", day(-1))
          .whereRaw("(later.effective_on, later.version) > (s.effective_on, s.version)"),
      ),
    columns: { version: "s.version", effective_on: "s.effective_on", document: "s.document" },
    order: "s.effective_on, s.version",
    read: (rows: readonly VersionRow[]) => rows.map(versionFromRow),
  };
};

/** The version in force on a day: the latest effective date up to it, of two the later version; nothing of its own before. */
export const standardsOn = (versions: readonly StandardsVersion[], day: string): CompanyStandards =>
  versions.findLast(({ effectiveOn }) => effectiveOn <= day)?.document ?? NO_COMPANY_STANDARDS;

const VERSION_COLUMNS = ["version", "effective_on", "document"];

export const standardsRepository = (db: TenantDb) => ({
  async latestVersion(): Promise<number> {
    const row = (await db.from("standards").max({ version: "version" }).first()) as
      { version: number | null } | undefined;
    return row?.version ?? 0;
  },

  /** The same, with the company's row locked: two first saves at once wait for each other. */
  async lockLatestVersion(): Promise<number> {
    await db.organization().forUpdate().first("id");
    return this.latestVersion();
  },

  async find(version: number): Promise<StandardsVersion | null> {
    const row: VersionRow | undefined = await db.from("standards").where({ version }).first(VERSION_COLUMNS);
    return row ? versionFromRow(row) : null;
  },

  async findOn(day: string): Promise<StandardsVersion | null> {
    const row: VersionRow | undefined = await db
      .from("standards")
      .where("effective_on", "<=", day)
      .orderBy([
        { column: "effective_on", order: "desc" },
        { column: "version", order: "desc" },
      ])
      .first(VERSION_COLUMNS);
    return row ? versionFromRow(row) : null;
  },

  async history() {
    const rows: HistoryRow[] = await db
      .from("standards", "s")
      .join("people as p", "p.id", "s.changed_by")
      .orderBy("s.version", "desc")
      .limit(100)
      .select("s.version", "s.effective_on", "s.note", "s.changes", "s.changed_by", "s.changed_at", {
        person_name: "p.name",
      });
    return rows.map(historyFromRow);
  },

  add: (row: {
    version: number;
    effectiveOn: string;
    document: CompanyStandards;
    changes: readonly StandardsChange[];
    note: string;
    by: PersonId;
  }): Promise<void> =>
    db.insert("standards", {
      version: row.version,
      effective_on: row.effectiveOn,
      document: JSON.stringify(row.document),
      changes: JSON.stringify(row.changes),
      note: row.note,
      changed_by: row.by,
      changed_at: db.now(),
    }),
});
