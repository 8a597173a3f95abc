/** `npm run bench` and `npm run screens`: TypeScript programs under tests/ that start what they need themselves. */
import { run } from "../children.mjs";
import { BROWSER, DATABASE, ensureDebian } from "../debian.mjs";
import { ensurePackages } from "../packages.mjs";
import { inRoot } from "../paths.mjs";
import { buildWeb } from "../web-build.mjs";

async function program(path) {
  await ensureDebian([...DATABASE, ...BROWSER]);
  await ensurePackages();
  await buildWeb();
  return run(process.execPath, ["--import", "tsx", inRoot(path)]);
}

export const bench = () => program("tests/bench/main.ts");
export const screens = () => program("tests/screens/main.ts");
