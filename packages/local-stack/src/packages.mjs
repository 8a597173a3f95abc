/** The project's JavaScript packages, through a pnpm of the project's own. */
import { existsSync } from "node:fs";
import { capture, run } from "./children.mjs";
import { inRoot } from "./paths.mjs";
import { say, Stop } from "./say.mjs";

/** 11 needs a newer Node.js than 20; 12 is a native program. The lockfile is made by this version. */
const PNPM = "12.21.0";
const folder = inRoot(".cache", `pnpm-${PNPM}`);
const program = `${folder}/node_modules/pnpm/bin/pnpm.mjs`;

export async function ensurePackages() {
  const [major = 0, minor = 0] = process.versions.node.split(".").map(Number);
  if (major < 20 || (major === 20 && minor < 19))
    throw new Stop(`Node.js 20.19 or later is needed; this is ${process.versions.node}.`);
  if (!existsSync(program)) {
    say("Fetching the package manager");
    const code = await run(
      "npm",
      [
        "install",
        "--prefix",
        folder,
        "--no-save",
        "--no-audit",
        "--no-fund",
        "--ignore-scripts",
        "--loglevel=error",
        `pnpm@${PNPM}`,
      ],
      { quiet: true },
    );
    if (code !== 0 || !existsSync(program))
      throw new Stop("The package manager could not be fetched. Is the npm registry reachable from here?");
  }
  if (!existsSync(inRoot("node_modules"))) say("Installing packages (the first time takes about half a minute)");
  const { code, stdout, stderr } = capture(process.execPath, [program, "install", "--frozen-lockfile"], {
    env: { CI: "true" },
  });
  if (code !== 0) throw new Stop(`Packages could not be installed:\n${stdout}\n${stderr}`);
}
