/** Every edit of a layout, in order. Rows are added, never changed. */
import type { Knex } from "knex";

export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    CREATE TABLE IF NOT EXISTS layout_changes (
      organization_id VARCHAR(30) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      project_id VARCHAR(30) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      sequence INT UNSIGNED NOT NULL,
      batch_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      batch_hash CHAR(64) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      person_id VARCHAR(30) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      label VARCHAR(120) NOT NULL,
      changes JSON NOT NULL,
      at DATETIME(3) NOT NULL,
      PRIMARY KEY (organization_id, project_id, sequence),
      KEY layout_changes_by_batch (organization_id, project_id, batch_id, sequence),
      CONSTRAINT layout_changes_layout FOREIGN KEY (organization_id, project_id)
        REFERENCES layouts (organization_id, project_id),
      CONSTRAINT layout_changes_person FOREIGN KEY (person_id) REFERENCES people (id)
    ) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_ci
  `);
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw("DROP TABLE IF EXISTS layout_changes");
}
