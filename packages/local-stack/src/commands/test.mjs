/** `npm test`: installs what is missing, then checks, unit and API tests, the web's build, and the browser. */
import { mkdirSync, readFileSync, rmSync } from "node:fs";
import { join } from "node:path";
import { run, stopChild } from "../children.mjs";
import { startDatabase } from "../database.mjs";
import { BROWSER, DATABASE, ensureDebian } from "../debian.mjs";
import { ensurePackages } from "../packages.mjs";
import { inRoot } from "../paths.mjs";
import { freePort, LOOPBACK } from "../ports.mjs";
import { say } from "../say.mjs";
import { throwawayFolder } from "../stack.mjs";
import { buildWeb } from "../web-build.mjs";
import { check } from "./check.mjs";

const reports = inRoot(".cache", "reports");

export async function test() {
  await ensureDebian([...DATABASE, ...BROWSER]);
  await ensurePackages();
  rmSync(reports, { recursive: true, force: true });
  mkdirSync(reports, { recursive: true });

  say("\nChecks");
  const checked = await check();

  say("\nUnit, API, isolation and fault tests");
  const vitest = await withDatabase((url) =>
    run(
      process.execPath,
      [
        inRoot("node_modules/vitest/vitest.mjs"),
        "run",
        "--reporter=default",
        "--reporter=json",
        `--outputFile.json=${join(reports, "vitest.json")}`,
      ],
      {
        env: { TEST_DATABASE_URL: url },
      },
    ),
  );

  say("\nBrowser tests");
  await buildWeb();
  const playwright = await run(
    process.execPath,
    [inRoot("tests/node_modules/@playwright/test/cli.js"), "test", "--config", "tests/playwright.config.ts"],
    {
      env: { PLAYWRIGHT_JSON_OUTPUT_NAME: join(reports, "playwright.json") },
    },
  );

  const counts = countAll();
  say();
  if (!checked) say("The checks failed; see above.");
  say(`${counts.passed} passed, ${counts.failed} failed`);
  return checked &&
    vitest === 0 &&
    playwright === 0 &&
    counts.failed === 0 &&
    counts.vitest > 0 &&
    counts.playwright > 0
    ? 0
    : 1;
}

async function withDatabase(work) {
  const folder = throwawayFolder();
  const port = await freePort(26_000 + (process.pid % 3000));
  const database = await startDatabase({ folder, port, logFile: join(folder, "mariadb.log"), throwaway: true });
  try {
    return await work(`mysql://root@${LOOPBACK}:${port}`);
  } finally {
    await stopChild(database, { grace_ms: 30_000 });
    rmSync(folder, { recursive: true, force: true });
  }
}

function countAll() {
  const vitest = report("vitest.json");
  const playwright = report("playwright.json")?.stats;
  const passed = { vitest: vitest?.numPassedTests ?? 0, playwright: playwright?.expected ?? 0 };
  // A test that did not run has not passed.
  const failed =
    (vitest?.numFailedTests ?? 0) +
    (vitest?.numPendingTests ?? 0) +
    (playwright?.unexpected ?? 0) +
    (playwright?.flaky ?? 0) +
    (playwright?.skipped ?? 0);
  return { ...passed, passed: passed.vitest + passed.playwright, failed };
}

function report(name) {
  try {
    return JSON.parse(readFileSync(join(reports, name), "utf8"));
  } catch {
    return null;
  }
}
