/** What the stack remembers between starts: ports, whether the demo is seeded and its sign-ins. */
import { mkdirSync, readFileSync, renameSync, writeFileSync } from "node:fs";
import { join } from "node:path";

const fileOf = (folder) => join(folder, "stack.json");

export function readState(folder) {
  try {
    return JSON.parse(readFileSync(fileOf(folder), "utf8"));
  } catch {
    return { ports: {}, signIns: null, webBuild: null };
  }
}

export function writeState(folder, state) {
  mkdirSync(folder, { recursive: true });
  const temporary = `${fileOf(folder)}.new`;
  writeFileSync(temporary, JSON.stringify(state, null, 2), { mode: 0o600 });
  renameSync(temporary, fileOf(folder));
}
