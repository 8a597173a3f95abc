/** Reads the environment, opens the database, serves HTTP or works the outbox, and ends cleanly. */
import { createServer } from "node:http";
import { pino } from "pino";
import { buildApp } from "./app.ts";
import { ConfigError, readConfig } from "./config.ts";
import { systemClock } from "./platform/clock.ts";
import { openDatabase } from "./platform/db/database.ts";
import { fileStore } from "./platform/files.ts";
import type { Deps } from "./platform/http/route.ts";
import { idsFrom } from "./platform/ids.ts";
import { startWorker } from "./platform/jobs/worker.ts";

function main(): void {
  const config = readConfig(process.env);
  const role = process.env["PROCESS_ROLE"] ?? "all";
  const log = pino({ level: config.logLevel, base: { role } });
  const clock = systemClock;
  const ids = idsFrom(clock);
  const db = openDatabase(config.databaseUrl, { clock, ids, poolSize: config.databasePool });
  const deps: Deps = { db, clock, ids, files: fileStore(config.filesDir), config, log };

  const server = role === "worker" ? null : createServer(buildApp(deps)).listen(config.port, config.host);
  server?.once("listening", () => log.info({ host: config.host, port: config.port }, "serving"));
  server?.once("error", (error) => {
    log.fatal({ err: error }, "cannot serve");
    process.exit(1);
  });
  const worker = role === "api" ? null : startWorker(deps);

  const stop = async (signal: string) => {
    log.info({ signal }, "stopping");
    const closed = server && new Promise((resolve) => server.close(resolve));
    server?.closeIdleConnections();
    await Promise.all([closed, worker?.stop()]);
    await db.close();
  };
  let stopping = false;
  for (const signal of ["SIGTERM", "SIGINT"] as const)
    process.on(signal, () => {
      if (stopping) return;
      stopping = true;
      void stop(signal).then(() => process.exit(0));
    });
}

try {
  main();
} catch (error) {
  process.stderr.write(`${error instanceof ConfigError ? error.message : String((error as Error).stack ?? error)}\n`);
  process.exit(1);
}
