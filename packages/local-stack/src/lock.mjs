/** One stack for one data folder: the lock names the process that holds it, and is worthless once that process is gone. */
import { closeSync, mkdirSync, openSync, readFileSync, renameSync, rmSync, writeFileSync, writeSync } from "node:fs";
import { join } from "node:path";
import { isAlive } from "./children.mjs";

const fileOf = (folder) => join(folder, "running.json");

export function readLock(folder) {
  try {
    const lock = JSON.parse(readFileSync(fileOf(folder), "utf8"));
    return typeof lock.pid === "number" && isAlive(lock.pid) ? lock : null;
  } catch {
    return null;
  }
}

/** Answers null when the lock was taken, or what holds it. */
export function takeLock(folder, content) {
  mkdirSync(folder, { recursive: true });
  for (let attempt = 0; attempt < 2; attempt++) {
    try {
      const file = openSync(fileOf(folder), "wx", 0o600);
      writeSync(file, JSON.stringify({ pid: process.pid, ...content }));
      closeSync(file);
      return null;
    } catch (error) {
      if (error.code !== "EEXIST") throw error;
      const holder = readLock(folder);
      if (holder) return holder;
      rmSync(fileOf(folder), { force: true });
    }
  }
  return readLock(folder);
}

/** Says more in a lock that we hold; it is never free in between. */
export function updateLock(folder, content) {
  const temporary = `${fileOf(folder)}.new`;
  writeFileSync(temporary, JSON.stringify({ pid: process.pid, ...content }), { mode: 0o600 });
  renameSync(temporary, fileOf(folder));
}

export const releaseLock = (folder) => rmSync(fileOf(folder), { force: true });
