/** The diameter that a company computes turbulent friction on. */
import type { Knex } from "knex";

export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    ALTER TABLE organizations
      ADD COLUMN IF NOT EXISTS friction_basis VARCHAR(40) CHARACTER SET ascii COLLATE ascii_bin
      NOT NULL DEFAULT 'hydraulic-diameter' AFTER brand_color
  `);
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw("ALTER TABLE organizations DROP COLUMN IF EXISTS friction_basis");
}
