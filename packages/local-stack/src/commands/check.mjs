/** `npm run check`: types, lint, boundaries, unused code, formatting. All of them, then one summary. */
import { spawn } from "node:child_process";
import { performance } from "node:perf_hooks";
import { ensurePackages } from "../packages.mjs";
import { inRoot, root } from "../paths.mjs";
import { say } from "../say.mjs";

const bin = (name) => inRoot("node_modules", ".bin", name);
const types = (project) => [process.execPath, inRoot("node_modules/ts7/bin/tsc"), "-p", project];

const CHECKS = [
  ...["packages/calc", "packages/contracts", "packages/layout", "migrations", "apps/api", "apps/web", "tests"].map(
    (project) => ({ name: `types ${project}`, command: types(project) }),
  ),
  { name: "lint", command: [bin("eslint"), ".", "--max-warnings", "0"] },
  {
    name: "boundaries",
    command: [bin("depcruise"), "--config", ".dependency-cruiser.cjs", "packages", "apps", "migrations"],
  },
  { name: "unused code", command: [bin("knip")] },
  { name: "formatting", command: [bin("prettier"), "--check", "--log-level", "warn", "."] },
];

export async function checkCommand() {
  await ensurePackages();
  return (await check()) ? 0 : 1;
}

/** Two at a time, since two cores are what there is. */
export async function check() {
  const results = new Map();
  const queue = [...CHECKS];
  const worker = async () => {
    for (let next = queue.shift(); next; next = queue.shift()) results.set(next.name, await quietly(next.command));
  };
  await Promise.all([worker(), worker()]);
  for (const { name } of CHECKS) {
    const { code, output, seconds } = results.get(name);
    say(`${code === 0 ? "ok    " : "FAILED"} ${name} (${seconds.toFixed(1)} s)`);
    if (code !== 0) say(output.trimEnd());
  }
  return [...results.values()].every(({ code }) => code === 0);
}

function quietly([command, ...args]) {
  return new Promise((resolve) => {
    const began = performance.now();
    const child = spawn(command, args, {
      cwd: root,
      env: { ...process.env, FORCE_COLOR: "0" },
      stdio: ["ignore", "pipe", "pipe"],
    });
    let output = "";
    for (const stream of [child.stdout, child.stderr]) stream.on("data", (chunk) => (output += chunk));
    child.once("error", (error) => resolve({ code: 1, output: String(error), seconds: 0 }));
    child.once("close", (code) => resolve({ code: code ?? 1, output, seconds: (performance.now() - began) / 1000 }));
  });
}
