/** A company's own schedules: every version that was ever saved, with the day it counts from, who saved it and what changed. */
import type { Knex } from "knex";

export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    CREATE TABLE IF NOT EXISTS standards (
      organization_id VARCHAR(30) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      version INT UNSIGNED NOT NULL,
      effective_on DATE NOT NULL,
      document JSON NOT NULL,
      changes JSON NOT NULL,
      note VARCHAR(200) NOT NULL,
      changed_by VARCHAR(30) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      changed_at DATETIME(3) NOT NULL,
      PRIMARY KEY (organization_id, version),
      KEY standards_in_force (organization_id, effective_on, version),
      CONSTRAINT standards_organization FOREIGN KEY (organization_id) REFERENCES organizations (id),
      CONSTRAINT standards_person FOREIGN KEY (changed_by) REFERENCES people (id)
    ) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_ci
  `);
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw("DROP TABLE IF EXISTS standards");
}
