/** MariaDB on loopback, in a folder of the project. */
import { existsSync, mkdirSync } from "node:fs";
import { join } from "node:path";
import { capture, startChild } from "./children.mjs";
import { answers, LOOPBACK, until } from "./ports.mjs";
import { Stop } from "./say.mjs";

const isRoot = () => process.getuid?.() === 0;
const asRoot = () => (isRoot() ? ["--user=root"] : []);

const SQL_MODE =
  "STRICT_TRANS_TABLES,ONLY_FULL_GROUP_BY,NO_ZERO_IN_DATE,NO_ZERO_DATE,ERROR_FOR_DIVISION_BY_ZERO,NO_ENGINE_SUBSTITUTION";
/** For tests only: nothing of it must survive a power cut. */
const THROWAWAY = [
  "--innodb-flush-log-at-trx-commit=0",
  "--innodb-doublewrite=0",
  "--innodb-log-file-size=32M",
  "--skip-log-bin",
];

/** Starts MariaDB on `port` with its data in `folder`, made when it is not there. Answers the child once it greets. */
export async function startDatabase({ folder, port, logFile, throwaway = false, onStarted = () => {} }) {
  const data = join(folder, "data");
  // A socket's path has room for 107 characters; the data folder may be deeper than that.
  const socket = join("/tmp", `cleatwork-${process.pid}-${port}.sock`);
  if (!existsSync(join(data, "mysql"))) {
    mkdirSync(folder, { recursive: true });
    const made = capture("mariadb-install-db", [
      "--no-defaults",
      `--datadir=${data}`,
      "--auth-root-authentication-method=normal",
      "--skip-test-db",
      "--skip-name-resolve",
      ...asRoot(),
    ]);
    if (made.code !== 0) throw new Stop(`The database could not be made:\n${made.stdout}\n${made.stderr}`);
  }
  const child = startChild(
    "MariaDB",
    "mariadbd",
    [
      "--no-defaults",
      `--datadir=${data}`,
      `--socket=${socket}`,
      `--pid-file=${join(data, "mariadb.pid")}`,
      `--bind-address=${LOOPBACK}`,
      `--port=${port}`,
      "--skip-name-resolve",
      "--default-time-zone=+00:00",
      "--character-set-server=utf8mb4",
      "--collation-server=utf8mb4_unicode_ci",
      `--sql-mode=${SQL_MODE}`,
      "--innodb-buffer-pool-size=256M",
      ...(throwaway ? THROWAWAY : []),
      ...asRoot(),
    ],
    { logFile },
  );
  onStarted(child);
  const up = await until(() => answers(port, { greets: true }), {
    timeout_ms: 60_000,
    failed: async () => !child.isRunning(),
  });
  if (!up) throw new Stop(`MariaDB did not start. Its last words:\n${child.lastLines()}`);
  return child;
}

export const databaseUrl = (port, name = "cleatwork") => `mysql://root@${LOOPBACK}:${port}/${name}`;
