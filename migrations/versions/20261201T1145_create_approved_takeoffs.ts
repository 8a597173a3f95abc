/** What the shop and the site build: frozen at acceptance, without a price in it. */
import type { Knex } from "knex";

export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    CREATE TABLE IF NOT EXISTS approved_takeoffs (
      organization_id VARCHAR(30) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      id VARCHAR(30) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      project_id VARCHAR(30) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      revision_id VARCHAR(30) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      document LONGTEXT NOT NULL,
      document_hash CHAR(64) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      piece_count INT UNSIGNED NOT NULL,
      weight_kg DOUBLE NOT NULL,
      approved_at DATETIME(3) NOT NULL,
      PRIMARY KEY (organization_id, id),
      UNIQUE KEY approved_takeoffs_revision (organization_id, revision_id),
      KEY approved_takeoffs_by_project (organization_id, project_id, approved_at),
      CONSTRAINT approved_takeoffs_project FOREIGN KEY (organization_id, project_id)
        REFERENCES projects (organization_id, id),
      CONSTRAINT approved_takeoffs_revision_sold FOREIGN KEY (organization_id, revision_id)
        REFERENCES quote_revisions (organization_id, id)
    ) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_ci
  `);
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw("DROP TABLE IF EXISTS approved_takeoffs");
}
