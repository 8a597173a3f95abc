/** A project's own rates and the lines added by hand. */
import type { Knex } from "knex";

export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    CREATE TABLE IF NOT EXISTS project_pricing (
      organization_id VARCHAR(30) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      project_id VARCHAR(30) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      document JSON NOT NULL,
      version INT UNSIGNED NOT NULL DEFAULT 1,
      PRIMARY KEY (organization_id, project_id),
      CONSTRAINT project_pricing_project FOREIGN KEY (organization_id, project_id)
        REFERENCES projects (organization_id, id)
    ) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_ci
  `);
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw("DROP TABLE IF EXISTS project_pricing");
}
