/** The layout as it stands: one row a record. Specs and drawings it names are of the same company and project. */
import type { Knex } from "knex";

export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    CREATE TABLE IF NOT EXISTS layout_records (
      organization_id VARCHAR(30) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      project_id VARCHAR(30) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      id VARCHAR(30) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      kind VARCHAR(10) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      document JSON NOT NULL,
      spec_id VARCHAR(30) CHARACTER SET ascii COLLATE ascii_bin NULL,
      drawing_id VARCHAR(30) CHARACTER SET ascii COLLATE ascii_bin NULL,
      PRIMARY KEY (organization_id, project_id, id),
      CONSTRAINT layout_records_layout FOREIGN KEY (organization_id, project_id)
        REFERENCES layouts (organization_id, project_id),
      CONSTRAINT layout_records_spec FOREIGN KEY (organization_id, spec_id)
        REFERENCES specs (organization_id, id),
      CONSTRAINT layout_records_drawing FOREIGN KEY (organization_id, project_id, drawing_id)
        REFERENCES drawings (organization_id, project_id, id)
    ) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_ci
  `);
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw("DROP TABLE IF EXISTS layout_records");
}
