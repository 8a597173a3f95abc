/** Who did what. Rows are added, never changed. */
import type { Knex } from "knex";

export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    CREATE TABLE IF NOT EXISTS audit_entries (
      organization_id VARCHAR(30) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      id VARCHAR(30) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      at DATETIME(3) NOT NULL,
      person_id VARCHAR(30) CHARACTER SET ascii COLLATE ascii_bin NULL,
      event VARCHAR(80) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      subject VARCHAR(200) NOT NULL,
      details JSON NOT NULL,
      PRIMARY KEY (organization_id, id),
      CONSTRAINT audit_entries_organization FOREIGN KEY (organization_id) REFERENCES organizations (id),
      CONSTRAINT audit_entries_person FOREIGN KEY (person_id) REFERENCES people (id)
    ) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_ci
  `);
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw("DROP TABLE IF EXISTS audit_entries");
}
