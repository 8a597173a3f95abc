/** The database itself refuses to change what was sent, or to lose it. */
import type { Knex } from "knex";

const FROZEN = [
  "organization_id",
  "id",
  "quote_id",
  "project_id",
  "number",
  "issued_at",
  "issued_by",
  "valid_until_on",
  "price_minor",
  "currency",
  "snapshot",
  "snapshot_hash",
  "pdf_hash",
];

export async function up(knex: Knex): Promise<void> {
  const same = FROZEN.map((column) => `NEW.${column} <=> OLD.${column}`).join(" AND ");
  await knex.raw(`
    CREATE TRIGGER IF NOT EXISTS quote_revisions_refuse_update BEFORE UPDATE ON quote_revisions FOR EACH ROW
    BEGIN
      IF NOT (${same}) THEN SIGNAL SQLSTATE '45000' SET MESSAGE_TEXT = 'an issued revision does not change'; END IF;
    END
  `);
  await knex.raw(`
    CREATE TRIGGER IF NOT EXISTS quote_revisions_refuse_delete BEFORE DELETE ON quote_revisions FOR EACH ROW
    SIGNAL SQLSTATE '45000' SET MESSAGE_TEXT = 'an issued revision does not go'
  `);
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw("DROP TRIGGER IF EXISTS quote_revisions_refuse_update");
  await knex.raw("DROP TRIGGER IF EXISTS quote_revisions_refuse_delete");
}
