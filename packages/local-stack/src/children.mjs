/**
 * Child processes, each ended by its own pid. Nothing is found by name, so nothing that someone else started is touched.
 */
import { spawn, spawnSync } from "node:child_process";
import { closeSync, mkdirSync, openSync, readFileSync } from "node:fs";
import { dirname } from "node:path";
import { root } from "./paths.mjs";

/** Runs to the end with the output shown; answers the exit code. */
export function run(command, args, { env = {}, cwd = root, quiet = false } = {}) {
  return new Promise((resolve, reject) => {
    const child = spawn(command, args, {
      cwd,
      env: { ...process.env, ...env },
      stdio: quiet ? "ignore" : ["ignore", "inherit", "inherit"],
    });
    child.once("error", reject);
    child.once("exit", (code, signal) => resolve(signal ? 1 : (code ?? 1)));
  });
}

/** Runs to the end and answers what was printed. */
export function capture(command, args, { env = {}, cwd = root } = {}) {
  const { status, stdout, stderr } = spawnSync(command, args, {
    cwd,
    env: { ...process.env, ...env },
    encoding: "utf8",
    maxBuffer: 256 * 2 ** 20,
  });
  return { code: status ?? 1, stdout: stdout ?? "", stderr: stderr ?? "" };
}

/**
 * Starts a server. Its output goes to a log file. It gets a process group of its own, so that Ctrl-C in the terminal
 * reaches only the start-up, which then stops everything in the right order.
 */
export function startChild(name, command, args, { env = {}, logFile, cwd = root, uid, gid } = {}) {
  mkdirSync(dirname(logFile), { recursive: true });
  const log = openSync(logFile, "a");
  const child = spawn(command, args, {
    cwd,
    env: { ...process.env, ...env },
    stdio: ["ignore", log, log],
    detached: true,
    uid,
    gid,
  });
  closeSync(log);
  const exited = new Promise((resolve) => {
    child.once("exit", (code, signal) => resolve({ code, signal }));
    child.once("error", (error) => resolve({ code: 1, signal: null, error }));
  });
  return {
    name,
    pid: child.pid,
    exited,
    isRunning: () => child.exitCode === null && child.signalCode === null && child.pid !== undefined,
    kill: (signal) => child.kill(signal),
    lastLines: (count = 15) => lastLines(logFile, count),
  };
}

/** Asks to stop, waits, and insists by the same pid when the grace is over. */
export async function stopChild(child, { signal = "SIGTERM", grace_ms = 8000 } = {}) {
  if (!child.isRunning()) return;
  child.kill(signal);
  const late = Symbol("late");
  const first = await Promise.race([child.exited, later(grace_ms, late)]);
  if (first === late) {
    child.kill("SIGKILL");
    await child.exited;
  }
}

export const later = (ms, value) => new Promise((resolve) => setTimeout(resolve, ms, value).unref?.());
export const pause = (ms) => new Promise((resolve) => setTimeout(resolve, ms));

export function isAlive(pid) {
  try {
    process.kill(pid, 0);
    return true;
  } catch (error) {
    return error.code === "EPERM";
  }
}

function lastLines(file, count) {
  try {
    return readFileSync(file, "utf8").trimEnd().split("\n").slice(-count).join("\n");
  } catch {
    return "";
  }
}
