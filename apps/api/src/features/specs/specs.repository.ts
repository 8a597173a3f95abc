import type { Spec, SpecId } from "@cleatwork/contracts";
import { ask, type Question } from "../../platform/db/question.ts";
import type { TenantDb } from "../../platform/db/tenant-db.ts";
import { rowFromSpec, specFromRow, type SpecRequest, type SpecRow } from "./specs.rows.ts";

export const specsQuestion = (db: TenantDb): Question<Spec[]> => ({
  from: db.from("specs"),
  columns: { id: "id", name: "name", construction: "construction", version: "version" },
  order: "name, id",
  read: (rows: readonly SpecRow[]) => rows.map(specFromRow),
});

export const specsRepository = (db: TenantDb) => ({
  list: (): Promise<Spec[]> => ask(specsQuestion(db)),

  async insert(id: SpecId, spec: SpecRequest, now: Date): Promise<void> {
    await db.insert("specs", { id, ...rowFromSpec(spec), version: 1, created_at: now });
  },

  /** The version now, with the row locked; null when there is no such spec here. */
  async lock(id: SpecId): Promise<number | null> {
    const row: { version: number } | undefined = await db.from("specs").where({ id }).forUpdate().first("version");
    return row?.version ?? null;
  },

  async update(id: SpecId, spec: SpecRequest, expected: number): Promise<void> {
    await db
      .from("specs")
      .where({ id, version: expected })
      .update({ ...rowFromSpec(spec), version: expected + 1 });
  },
});
