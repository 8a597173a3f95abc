/** Head of a project's layout: the row that a save locks, and the number of its last change. */
import type { Knex } from "knex";

export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    CREATE TABLE IF NOT EXISTS layouts (
      organization_id VARCHAR(30) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      project_id VARCHAR(30) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      sequence INT UNSIGNED NOT NULL DEFAULT 0,
      segment_count INT UNSIGNED NOT NULL DEFAULT 0,
      PRIMARY KEY (organization_id, project_id),
      CONSTRAINT layouts_project FOREIGN KEY (organization_id, project_id)
        REFERENCES projects (organization_id, id)
    ) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_ci
  `);
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw("DROP TABLE IF EXISTS layouts");
}
