/** Builds the web when its sources have changed since the last build. */
import { createHash } from "node:crypto";
import { existsSync, readdirSync, statSync } from "node:fs";
import { join } from "node:path";
import { run } from "./children.mjs";
import { inRoot } from "./paths.mjs";
import { say, Stop } from "./say.mjs";

const SOURCES = [
  "apps/web/src",
  "apps/web/public",
  "apps/web/index.html",
  "apps/web/vite.config.ts",
  "packages/calc/src",
  "packages/layout/src",
  "packages/contracts/src",
  "pnpm-lock.yaml",
];

/** Names, sizes and times: cheap, and a touched file costs one build at most. */
export function sourceStamp() {
  const hash = createHash("sha256");
  const walk = (path) => {
    if (!existsSync(path)) return;
    const stat = statSync(path);
    if (stat.isDirectory()) for (const name of readdirSync(path).sort()) walk(join(path, name));
    else hash.update(`${path}\0${stat.size}\0${stat.mtimeMs}\n`);
  };
  for (const source of SOURCES) walk(inRoot(source));
  return hash.digest("hex");
}

export const webDist = inRoot("apps", "web", "dist");

export async function buildWeb({ quiet = true } = {}) {
  const code = await run(
    process.execPath,
    [inRoot("apps/web/node_modules/vite/bin/vite.js"), "build", ...(quiet ? ["--logLevel", "error"] : [])],
    { cwd: inRoot("apps/web") },
  );
  if (code !== 0) throw new Stop("The web could not be built.");
}

export async function buildWebIfChanged(state) {
  const stamp = sourceStamp();
  if (state.webBuild === stamp && existsSync(join(webDist, "index.html"))) return;
  say("Building the web");
  await buildWeb();
  state.webBuild = stamp;
}
