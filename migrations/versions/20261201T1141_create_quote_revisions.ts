/** What was sent, as it was sent: a snapshot with its hash. Only its state moves. */
import type { Knex } from "knex";

export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    CREATE TABLE IF NOT EXISTS quote_revisions (
      organization_id VARCHAR(30) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      id VARCHAR(30) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      quote_id VARCHAR(30) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      project_id VARCHAR(30) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      number INT UNSIGNED NOT NULL,
      state VARCHAR(12) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      issued_at DATETIME(3) NOT NULL,
      issued_by VARCHAR(30) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      valid_until_on DATE NOT NULL,
      price_minor BIGINT NOT NULL,
      currency CHAR(3) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      snapshot LONGTEXT NOT NULL,
      snapshot_hash CHAR(64) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      pdf_hash CHAR(64) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      PRIMARY KEY (organization_id, id),
      UNIQUE KEY quote_revisions_number (organization_id, quote_id, number),
      KEY quote_revisions_by_project (organization_id, project_id, issued_at),
      CONSTRAINT quote_revisions_state CHECK (state IN ('issued', 'superseded', 'accepted', 'declined', 'withdrawn')),
      CONSTRAINT quote_revisions_quote FOREIGN KEY (organization_id, quote_id) REFERENCES quotes (organization_id, id),
      CONSTRAINT quote_revisions_project FOREIGN KEY (organization_id, project_id) REFERENCES projects (organization_id, id),
      CONSTRAINT quote_revisions_person FOREIGN KEY (issued_by) REFERENCES people (id)
    ) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_ci
  `);
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw("DROP TABLE IF EXISTS quote_revisions");
}
