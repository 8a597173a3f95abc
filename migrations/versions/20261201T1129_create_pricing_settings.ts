/** A company's labor rates, percentages and limits. */
import type { Knex } from "knex";

export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    CREATE TABLE IF NOT EXISTS pricing_settings (
      organization_id VARCHAR(30) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      document JSON NOT NULL,
      version INT UNSIGNED NOT NULL DEFAULT 1,
      PRIMARY KEY (organization_id),
      CONSTRAINT pricing_settings_organization FOREIGN KEY (organization_id) REFERENCES organizations (id)
    ) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_ci
  `);
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw("DROP TABLE IF EXISTS pricing_settings");
}
