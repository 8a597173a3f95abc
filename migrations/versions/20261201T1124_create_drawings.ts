/** Sheets of a project; the bytes rest in the file store under their hash. */
import type { Knex } from "knex";

export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    CREATE TABLE IF NOT EXISTS drawings (
      organization_id VARCHAR(30) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      id VARCHAR(30) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      project_id VARCHAR(30) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      sheet_number VARCHAR(40) NOT NULL,
      title VARCHAR(200) NOT NULL,
      revision VARCHAR(20) NOT NULL,
      dated_on DATE NOT NULL,
      file_name VARCHAR(255) NOT NULL,
      media_type VARCHAR(40) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      byte_count INT UNSIGNED NOT NULL,
      page_count INT UNSIGNED NOT NULL,
      file_hash CHAR(64) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      uploaded_by VARCHAR(30) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      uploaded_at DATETIME(3) NOT NULL,
      PRIMARY KEY (organization_id, id),
      UNIQUE KEY drawings_of_project (organization_id, project_id, id),
      CONSTRAINT drawings_project FOREIGN KEY (organization_id, project_id)
        REFERENCES projects (organization_id, id),
      CONSTRAINT drawings_person FOREIGN KEY (uploaded_by) REFERENCES people (id)
    ) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_ci
  `);
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw("DROP TABLE IF EXISTS drawings");
}
