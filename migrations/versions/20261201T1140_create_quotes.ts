/** A quote: a number and the draft that the next revision is made from. */
import type { Knex } from "knex";

export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    CREATE TABLE IF NOT EXISTS quotes (
      organization_id VARCHAR(30) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      id VARCHAR(30) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      project_id VARCHAR(30) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      number VARCHAR(40) NOT NULL,
      draft JSON NOT NULL,
      version INT UNSIGNED NOT NULL DEFAULT 1,
      created_by VARCHAR(30) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      created_at DATETIME(3) NOT NULL,
      PRIMARY KEY (organization_id, id),
      UNIQUE KEY quotes_number (organization_id, number),
      KEY quotes_by_project (organization_id, project_id),
      CONSTRAINT quotes_project FOREIGN KEY (organization_id, project_id) REFERENCES projects (organization_id, id),
      CONSTRAINT quotes_person FOREIGN KEY (created_by) REFERENCES people (id)
    ) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_ci
  `);
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw("DROP TABLE IF EXISTS quotes");
}
