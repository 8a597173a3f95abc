/** The database itself refuses to change or remove what the audit says. */
import type { Knex } from "knex";

export async function up(knex: Knex): Promise<void> {
  for (const event of ["UPDATE", "DELETE"]) {
    await knex.raw(`
      CREATE TRIGGER IF NOT EXISTS audit_entries_refuse_${event.toLowerCase()} BEFORE ${event} ON audit_entries
      FOR EACH ROW SIGNAL SQLSTATE '45000' SET MESSAGE_TEXT = 'audit entries are only ever added'
    `);
  }
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw("DROP TRIGGER IF EXISTS audit_entries_refuse_update");
  await knex.raw("DROP TRIGGER IF EXISTS audit_entries_refuse_delete");
}
