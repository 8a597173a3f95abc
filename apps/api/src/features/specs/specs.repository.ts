import type { Spec, SpecId } from "@cleatwork/contracts";
import type { TenantDb } from "../../platform/db/tenant-db.ts";
import { rowFromSpec, specFromRow, type SpecRequest, type SpecRow } from "./specs.rows.ts";

export const specsRepository = (db: TenantDb) => ({
  async list(): Promise<Spec[]> {
    const rows = (await db
      .from("specs")
      .select("id", "name", "construction", "version")
      .orderBy(["name", "id"])) as SpecRow[];
    return rows.map(specFromRow);
  },

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
