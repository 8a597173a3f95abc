/** One app for each test process, on a port of its own, over a database of its own. */
import { createServer } from "node:http";
import type { AddressInfo } from "node:net";
import { mkdtempSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { pino } from "pino";
import { migrate } from "@cleatwork/migrations/migrate";
import { buildApp } from "../app.ts";
import { readConfig } from "../config.ts";
import { openDatabase } from "../platform/db/database.ts";
import { fileStore } from "../platform/files.ts";
import type { Deps } from "../platform/http/route.ts";
import { idsFrom } from "../platform/ids.ts";
import { createSessions, type Sessions } from "../platform/sessions/sessions.ts";
import { TestClock } from "./clock.ts";

export interface TestServer {
  readonly url: string;
  readonly deps: Deps;
  readonly clock: TestClock;
  readonly sessions: Sessions;
}

let running: Promise<TestServer> | null = null;

export const testServer = (): Promise<TestServer> => (running ??= start());

async function start(): Promise<TestServer> {
  const server = process.env["TEST_DATABASE_URL"];
  if (!server) throw new Error("TEST_DATABASE_URL says which MariaDB server the tests may use");
  const databaseUrl = `${server.replace(/\/$/, "")}/cleatwork_test_${process.env["VITEST_POOL_ID"] ?? "0"}`;
  await migrate(databaseUrl);

  const clock = new TestClock();
  const ids = idsFrom(clock);
  const config = readConfig({
    NODE_ENV: "test",
    PORT: "0",
    PUBLIC_URL: "http://127.0.0.1:8080",
    DATABASE_URL: databaseUrl,
    SMTP_URL: "smtp://127.0.0.1:9",
    MAIL_FROM: "Cleatwork <quotes@cleatwork.example>",
    FILES_DIR: mkdtempSync(join(tmpdir(), "cleatwork-files-")),
    LOG_LEVEL: "silent",
    RATE_LIMIT_FACTOR: "10000",
  });
  const db = openDatabase(databaseUrl, { clock, ids, poolSize: 6 });
  const deps: Deps = { db, clock, ids, files: fileStore(config.filesDir), config, log: pino({ level: "silent" }) };
  const http = createServer(buildApp(deps));
  await new Promise<void>((resolve) => http.listen(0, "127.0.0.1", resolve));
  http.unref();
  const { port } = http.address() as AddressInfo;
  return { url: `http://127.0.0.1:${port}`, deps, clock, sessions: createSessions(db, { secureCookies: false }) };
}
