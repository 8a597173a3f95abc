#!/usr/bin/env node
/**
 * One obvious command for each thing: start, dev, test, check, build, bench, screens. Needs Node.js and npm alone; it
 * installs the rest. Start it as `node packages/local-stack/run.mjs <command>` where signals must reach it.
 */
import { complain, Stop } from "./src/say.mjs";

const commands = {
  start: () => import("./src/commands/start.mjs").then((it) => it.start({ watch: false })),
  dev: () => import("./src/commands/start.mjs").then((it) => it.start({ watch: true })),
  test: () => import("./src/commands/test.mjs").then((it) => it.test()),
  check: () => import("./src/commands/check.mjs").then((it) => it.checkCommand()),
  build: () => import("./src/commands/build.mjs").then((it) => it.build()),
  bench: () => import("./src/commands/with-stack.mjs").then((it) => it.bench()),
  screens: () => import("./src/commands/with-stack.mjs").then((it) => it.screens()),
};

const name = process.argv[2] ?? "";
if (!Object.hasOwn(commands, name)) {
  complain(`Say what: ${Object.keys(commands).join(", ")}.`);
  process.exit(2);
}
try {
  process.exitCode = (await commands[name]()) ?? 0;
} catch (error) {
  complain(error instanceof Stop ? `\n${error.message}` : (error?.stack ?? String(error)));
  process.exitCode = 1;
}
