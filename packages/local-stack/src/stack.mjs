/**
 * The whole product on this machine: MariaDB, migrations, API, worker, mail catcher. `npm start`, the browser tests, the
 * fault tests, the bench and the screens all start it here.
 */
import { existsSync, mkdirSync, mkdtempSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { capture, pause, startChild, stopChild } from "./children.mjs";
import { databaseUrl, startDatabase } from "./database.mjs";
import { endLeftovers, forgetChildren, writeDown } from "./leftovers.mjs";
import { inRoot } from "./paths.mjs";
import { freePort, LOOPBACK, until } from "./ports.mjs";
import { readState, writeState } from "./state.mjs";
import { Stop } from "./say.mjs";
import { webDist } from "./web-build.mjs";

const TSX = ["--import", "tsx"];
const USUAL = { web: 8080, database: 13306, smtp: 11025, mail: 18025 };

/** A folder in memory where the machine has one: nothing in it must last. */
export const throwawayFolder = () => mkdtempSync(join(existsSync("/dev/shm") ? "/dev/shm" : tmpdir(), "cleatwork-"));

/**
 * @param {object} options
 * @param {string} options.folder         where the data lies
 * @param {boolean} [options.throwaway]   test settings; `stop()` removes the folder
 * @param {boolean} [options.watch]       restart the API when its sources change
 * @param {Record<string, string>} [options.env] more environment for API and worker
 * @param {(child: { name: string, lastLines: (n?: number) => string }) => void} [options.onDeath] a child ended by itself
 */
export async function startWholeStack({
  folder,
  throwaway = false,
  watch = false,
  env: extra = {},
  onDeath = () => {},
}) {
  mkdirSync(folder, { recursive: true });
  await endLeftovers(folder);
  const state = readState(folder);
  const taken = new Set();
  const usual = throwaway
    ? {
        web: 20_000 + (process.pid % 5000),
        database: 26_000 + (process.pid % 3000),
        smtp: 30_000 + (process.pid % 1000),
        mail: 31_500 + (process.pid % 1000),
      }
    : { ...USUAL, ...state.ports };
  const ports = {};
  for (const name of ["web", "database", "smtp", "mail"]) ports[name] = await freePort(usual[name], taken);
  state.ports = ports;
  writeState(folder, state);

  const logFile = (name) => join(folder, "logs", `${name}.log`);
  const publicUrl = `http://${LOOPBACK}:${ports.web}`;
  const env = {
    NODE_ENV: "production",
    HOST: LOOPBACK,
    PORT: String(ports.web),
    PUBLIC_URL: publicUrl,
    DATABASE_URL: databaseUrl(ports.database),
    SMTP_URL: `smtp://${LOOPBACK}:${ports.smtp}`,
    MAIL_FROM: "Cleatwork <quotes@cleatwork.example>",
    FILES_DIR: join(folder, "files"),
    WEB_DIST: webDist,
    LOG_LEVEL: "info",
    ...extra,
  };
  const children = {};
  const expected = new Set();
  let stopping = false;
  /** Once everything is being stopped, nothing may start any more: it would outlive us. */
  const unlessStopping = () => {
    if (stopping) throw new Stop("Everything is being stopped.");
  };
  const watchOver = (child) => {
    writeDown(folder, child);
    void child.exited.then(() => {
      if (!expected.has(child)) onDeath(child);
    });
    return child;
  };
  const end = async (name, options) => {
    const child = children[name];
    if (!child) return;
    expected.add(child);
    // Taken off first: whoever starts the part again meanwhile must not lose the new one.
    delete children[name];
    await stopChild(child, options);
  };

  const startDatabaseChild = async () => {
    unlessStopping();
    await startDatabase({
      folder: join(folder, "mariadb"),
      port: ports.database,
      logFile: logFile("mariadb"),
      throwaway,
      onStarted: (child) => (children.database = watchOver(child)),
    });
  };
  const startMail = async () => {
    unlessStopping();
    children.mail = watchOver(
      startChild("mail catcher", process.execPath, [inRoot("packages/local-stack/mail-catcher.mjs")], {
        env: { SMTP_PORT: String(ports.smtp), HTTP_PORT: String(ports.mail), MAIL_FOLDER: join(folder, "mail") },
        logFile: logFile("mail"),
      }),
    );
    await ready(children.mail, `http://${LOOPBACK}:${ports.mail}/healthz`);
  };
  const node = (role) => [
    ...(watch ? ["--watch", "--watch-preserve-output"] : []),
    ...TSX,
    inRoot("apps/api/src/main.ts"),
    `--role=${role}`,
  ];
  const startApi = async () => {
    unlessStopping();
    children.api = watchOver(
      startChild("API", process.execPath, node("api"), {
        env: { ...env, PROCESS_ROLE: "api" },
        logFile: logFile("api"),
      }),
    );
    await ready(children.api, `${publicUrl}/readyz`);
  };
  const startWorker = () => {
    unlessStopping();
    children.worker = watchOver(
      startChild("worker", process.execPath, node("worker"), {
        env: { ...env, PROCESS_ROLE: "worker" },
        logFile: logFile("worker"),
      }),
    );
  };

  const stop = async () => {
    stopping = true;
    await Promise.all([end("api"), end("worker")]);
    await end("mail");
    await end("database", { grace_ms: 30_000 });
    forgetChildren(folder);
    if (throwaway) rmSync(folder, { recursive: true, force: true });
  };

  try {
    await Promise.all([startDatabaseChild(), startMail()]);
    const migrated = capture(process.execPath, [...TSX, inRoot("migrations/migrate.ts")], { env });
    if (migrated.code !== 0)
      throw new Stop(`The database could not be brought up to date:\n${migrated.stdout}\n${migrated.stderr}`);
    startWorker();
    await startApi();
  } catch (error) {
    await stop();
    throw error;
  }

  return {
    env,
    ports,
    publicUrl,
    databaseUrl: env.DATABASE_URL,
    mailUrl: `http://${LOOPBACK}:${ports.mail}`,
    folder,
    state,
    saveState: () => writeState(folder, state),
    stop,
    /** For faults: ends one part, by default without warning; `start…` brings it back on the same port. */
    kill: (name, signal = "SIGKILL") => end(name, { signal, grace_ms: 5000 }),
    isStopping: () => stopping,
    startDatabase: startDatabaseChild,
    startApi,
    startMail,
    startWorker,
    /** Seeds the demo through the running API; answers the sign-ins. A second time changes nothing. */
    seed: () => {
      const seeded = capture(process.execPath, [...TSX, inRoot("migrations/seed/demo.ts")], {
        env: { ...env, API_URL: publicUrl, MAIL_API_URL: `http://${LOOPBACK}:${ports.mail}` },
      });
      if (seeded.code !== 0) throw new Stop(`The demo could not be seeded:\n${seeded.stdout}\n${seeded.stderr}`);
      return JSON.parse(seeded.stdout.trim().split("\n").at(-1)).signIns;
    },
  };
}

async function ready(child, url) {
  const up = await until(
    async () => {
      try {
        return (await fetch(url, { signal: AbortSignal.timeout(1000) })).ok;
      } catch {
        return false;
      }
    },
    { timeout_ms: 60_000, every_ms: 50, failed: async () => !child.isRunning() },
  );
  if (!up) throw new Stop(`The ${child.name} did not start. Its last words:\n${child.lastLines()}`);
  await pause(0);
}
