/** The database itself refuses to change or remove a version of the standards: a quote may rest on it. */
import type { Knex } from "knex";

export async function up(knex: Knex): Promise<void> {
  for (const event of ["UPDATE", "DELETE"]) {
    await knex.raw(`
      CREATE TRIGGER IF NOT EXISTS standards_refuse_${event.toLowerCase()} BEFORE ${event} ON standards
      FOR EACH ROW SIGNAL SQLSTATE '45000' SET MESSAGE_TEXT = 'versions of the standards are only ever added'
    `);
  }
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw("DROP TRIGGER IF EXISTS standards_refuse_update");
  await knex.raw("DROP TRIGGER IF EXISTS standards_refuse_delete");
}
