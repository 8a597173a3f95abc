/** The price book: one price an item, in millionths of the currency's major unit. */
import type { Knex } from "knex";

export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    CREATE TABLE IF NOT EXISTS price_items (
      organization_id VARCHAR(30) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      item_key VARCHAR(120) CHARACTER SET utf8mb4 COLLATE utf8mb4_bin NOT NULL,
      description VARCHAR(200) NOT NULL,
      line_group VARCHAR(20) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      unit VARCHAR(10) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      unit_price_micro BIGINT NOT NULL,
      supplier VARCHAR(120) NOT NULL,
      effective_on DATE NOT NULL,
      taxable BOOLEAN NOT NULL,
      PRIMARY KEY (organization_id, item_key),
      CONSTRAINT price_items_not_negative CHECK (unit_price_micro >= 0),
      CONSTRAINT price_items_organization FOREIGN KEY (organization_id) REFERENCES organizations (id)
    ) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_ci
  `);
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw("DROP TABLE IF EXISTS price_items");
}
