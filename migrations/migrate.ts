/** Brings the database up to date: `node --import tsx migrations/migrate.ts`, with DATABASE_URL. Safe to run again. */
import knex, { type Knex } from "knex";
import { readdirSync } from "node:fs";
import { dirname, join } from "node:path";
import { fileURLToPath, pathToFileURL } from "node:url";

const versions = join(dirname(fileURLToPath(import.meta.url)), "versions");

/** The files of `versions`, taken by an import of our own, so that a test runner can transform them too. */
const steps: Knex.MigrationSource<string> = {
  getMigrations: () =>
    Promise.resolve(
      readdirSync(versions)
        .filter((file) => file.endsWith(".ts"))
        .sort(),
    ),
  getMigrationName: (file) => file,
  getMigration: async (file) => (await import(pathToFileURL(join(versions, file)).href)) as Knex.Migration,
};

/** Longer than all steps take. */
const LOCK_WAIT_S = 300;

/** Makes the database when it is missing and applies every step that it has not seen. Answers their names. */
export async function migrate(databaseUrl: string): Promise<string[]> {
  const url = new URL(databaseUrl);
  const name = url.pathname.slice(1);
  if (!/^\w+$/.test(name)) throw new Error("DATABASE_URL must name a database, in letters, digits and underscores");
  const connection = {
    host: url.hostname,
    port: Number(url.port || 3306),
    user: decodeURIComponent(url.username),
    password: decodeURIComponent(url.password),
    timezone: "Z",
  };
  // One connection, so that the lock taken on it holds until it closes: several processes may start at once.
  const server = knex({ client: "mysql2", connection, pool: { min: 1, max: 1 } });
  const database = knex({ client: "mysql2", connection: { ...connection, database: name } });
  try {
    await server.raw(`CREATE DATABASE IF NOT EXISTS ${name} CHARACTER SET utf8mb4 COLLATE utf8mb4_unicode_ci`);
    await server.raw("SELECT GET_LOCK(?, ?)", [`migrate ${name}`, LOCK_WAIT_S]);
    // Whoever holds the lock is alone: a mark in knex's own table was left by a process that died.
    const options = { migrationSource: steps, disableTransactions: true };
    await database.migrate.forceFreeMigrationsLock(options);
    // MariaDB commits at every schema statement; each step is written so that it can be run again.
    const [, applied] = (await database.migrate.latest(options)) as [number, string[]];
    return applied;
  } finally {
    await database.destroy();
    await server.destroy();
  }
}

if (process.argv[1] === fileURLToPath(import.meta.url)) {
  const databaseUrl = process.env["DATABASE_URL"];
  if (!databaseUrl) throw new Error("DATABASE_URL says which database: mysql://user@host:port/name");
  const applied = await migrate(databaseUrl);
  console.log(applied.length === 0 ? "The database is up to date." : `Applied ${applied.length} steps.`);
}
