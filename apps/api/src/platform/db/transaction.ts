import type { Knex } from "knex";

/** Deadlock and lock wait: MariaDB took the whole transaction back, and it may simply be done again. */
const REPEATABLE = new Set([1213, 1205]);
const TRIES = 5;

/** Runs the work in a transaction, again when a deadlock took it back. So the work must bear repeating. */
export async function inTransaction<T>(sql: Knex, work: (tx: Knex) => Promise<T>): Promise<T> {
  for (let attempt = 1; ; attempt++) {
    try {
      return await sql.transaction((tx) => work(tx));
    } catch (error) {
      if (attempt >= TRIES || !isRepeatable(error)) throw error;
      await new Promise((resolve) => setTimeout(resolve, 10 * 2 ** attempt * (0.5 + Math.random())));
    }
  }
}

export const isRepeatable = (error: unknown): boolean => REPEATABLE.has(errnoOf(error));
/** A unique key holds the row already. */
export const isDuplicate = (error: unknown): boolean => errnoOf(error) === 1062;
/** A foreign key points at nothing of this company. */
export const isMissingReference = (error: unknown): boolean => errnoOf(error) === 1452;

const errnoOf = (error: unknown): number =>
  typeof error === "object" && error !== null && "errno" in error ? Number(error.errno) : 0;
