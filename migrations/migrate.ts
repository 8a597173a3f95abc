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
  const server = knex({ client: "mysql2", connection });
  await server.raw(`CREATE DATABASE IF NOT EXISTS ${name} CHARACTER SET utf8mb4 COLLATE utf8mb4_unicode_ci`);
  await server.destroy();

  const database = knex({ client: "mysql2", connection: { ...connection, database: name } });
  try {
    const [, applied] = (await database.migrate.latest({
      migrationSource: steps,
      // MariaDB commits at every schema statement; each step is written so that it can be run again.
      disableTransactions: true,
    })) as [number, string[]];
    return applied;
  } finally {
    await database.destroy();
  }
}

if (process.argv[1] === fileURLToPath(import.meta.url)) {
  const databaseUrl = process.env["DATABASE_URL"];
  if (!databaseUrl) throw new Error("DATABASE_URL says which database: mysql://user@host:port/name");
  const applied = await migrate(databaseUrl);
  console.log(applied.length === 0 ? "The database is up to date." : `Applied ${applied.length} steps.`);
}
