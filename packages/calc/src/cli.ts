/**
 * Calculations by hand: `pnpm --silent calc solve|takeoff|price FILE.json`; `-` reads from standard input.
 * The answer goes to standard output as JSON; problems go to standard error as JSON, with exit code 1.
 */
import { readFileSync } from "node:fs";
import { answerCommand } from "./command-line.ts";

const STANDARD_INPUT = 0;

const answer = answerCommand(process.argv.slice(2), (file) =>
  readFileSync(file === "-" ? STANDARD_INPUT : file, "utf8"),
);
if (answer.ok) process.stdout.write(`${JSON.stringify(answer.value, null, 2)}\n`);
else {
  process.stderr.write(`${JSON.stringify({ problems: answer.problems }, null, 2)}\n`);
  process.exitCode = 1;
}
