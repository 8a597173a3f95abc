/** The database itself refuses to change or remove what the layout's log says. */
import type { Knex } from "knex";

export async function up(knex: Knex): Promise<void> {
  for (const event of ["UPDATE", "DELETE"]) {
    await knex.raw(`
      CREATE TRIGGER IF NOT EXISTS layout_changes_refuse_${event.toLowerCase()} BEFORE ${event} ON layout_changes
      FOR EACH ROW SIGNAL SQLSTATE '45000' SET MESSAGE_TEXT = 'layout changes are only ever added'
    `);
  }
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw("DROP TRIGGER IF EXISTS layout_changes_refuse_update");
  await knex.raw("DROP TRIGGER IF EXISTS layout_changes_refuse_delete");
}
