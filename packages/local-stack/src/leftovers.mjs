/**
 * What an earlier start-up left running when it was itself ended without warning. Each child is written down with its
 * pid and the moment it was born, so that a pid which now belongs to someone else is left alone.
 */
import { mkdirSync, readFileSync, renameSync, rmSync, writeFileSync } from "node:fs";
import { join } from "node:path";
import { isAlive, pause } from "./children.mjs";

const fileOf = (folder) => join(folder, "children.json");

/** Clock ticks from the machine's start to the process's, from /proc; null where it cannot be told. */
export function bornAt(pid) {
  try {
    const stat = readFileSync(`/proc/${pid}/stat`, "utf8");
    return stat.slice(stat.lastIndexOf(")") + 2).split(" ")[19] ?? null;
  } catch {
    return null;
  }
}

const read = (folder) => {
  try {
    return JSON.parse(readFileSync(fileOf(folder), "utf8"));
  } catch {
    return [];
  }
};

export function writeDown(folder, child) {
  if (child.pid === undefined) return;
  const others = read(folder).filter(({ pid, born }) => bornAt(pid) === born);
  const temporary = `${fileOf(folder)}.new`;
  mkdirSync(folder, { recursive: true });
  writeFileSync(temporary, JSON.stringify([...others, { name: child.name, pid: child.pid, born: bornAt(child.pid) }]));
  renameSync(temporary, fileOf(folder));
}

export const forgetChildren = (folder) => rmSync(fileOf(folder), { force: true });

/** Ends what is left, last born first, and answers the names. The database needs time to close its files. */
export async function endLeftovers(folder, { grace_ms = 30_000 } = {}) {
  const left = read(folder).filter(({ pid, born }) => born !== null && bornAt(pid) === born);
  for (const { pid, born } of left.reverse()) {
    const gone = () => !isAlive(pid) || bornAt(pid) !== born;
    signal(pid, "SIGTERM");
    for (const end = Date.now() + grace_ms; !gone() && Date.now() < end;) await pause(50);
    if (!gone()) signal(pid, "SIGKILL");
  }
  forgetChildren(folder);
  return left.map(({ name }) => name);
}

function signal(pid, name) {
  try {
    process.kill(pid, name);
  } catch {
    // It ended in between.
  }
}
