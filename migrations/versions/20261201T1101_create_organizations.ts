/** A company: the wall that nothing crosses. */
import type { Knex } from "knex";

export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    CREATE TABLE IF NOT EXISTS organizations (
      id VARCHAR(30) CHARACTER SET ascii COLLATE ascii_bin NOT NULL PRIMARY KEY,
      slug VARCHAR(48) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      name VARCHAR(120) NOT NULL,
      unit_system VARCHAR(20) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      currency CHAR(3) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      time_zone VARCHAR(64) NOT NULL,
      address JSON NOT NULL,
      phone VARCHAR(40) NOT NULL,
      license_number VARCHAR(200) NOT NULL,
      brand_color CHAR(7) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      quote_terms TEXT NOT NULL,
      version INT UNSIGNED NOT NULL DEFAULT 1,
      created_at DATETIME(3) NOT NULL,
      UNIQUE KEY organizations_slug (slug)
    ) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_ci
  `);
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw("DROP TABLE IF EXISTS organizations");
}
