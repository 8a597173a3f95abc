/** An answer that was given and a takeoff that was approved are only ever added. */
import type { Knex } from "knex";

const GUARDED = ["quote_responses", "approved_takeoffs"];

export async function up(knex: Knex): Promise<void> {
  for (const table of GUARDED)
    for (const event of ["UPDATE", "DELETE"])
      await knex.raw(`
        CREATE TRIGGER IF NOT EXISTS ${table}_refuse_${event.toLowerCase()} BEFORE ${event} ON ${table}
        FOR EACH ROW SIGNAL SQLSTATE '45000' SET MESSAGE_TEXT = '${table.replace("_", " ")} are only ever added'
      `);
}

export async function down(knex: Knex): Promise<void> {
  for (const table of GUARDED)
    for (const event of ["update", "delete"]) await knex.raw(`DROP TRIGGER IF EXISTS ${table}_refuse_${event}`);
}
