/**
 * Calculations by hand: `pnpm --silent calc solve|takeoff|price FILE.json`; `-` reads from standard input.
 * The answer goes to standard output as JSON; problems go to standard error as JSON, with exit code 1.
 */
import { readFileSync } from "node:fs";
import { parseJob, priceJob, solveJob, takeOffJob, type Job } from "./job.ts";
import { fail, type Result } from "./result.ts";

type Answer = Result<unknown, unknown>;

const commands: Readonly<Record<string, (job: Job) => Answer>> = {
  solve: (job) => alone(job, solveJob(job)),
  takeoff: (job) => alone(job, takeOffJob(job)),
  price: priceJob,
};

/** One system in, one answer out; a job in, a list out. */
const alone = (job: Job, answers: Result<readonly unknown[], unknown>): Answer =>
  answers.ok && job.isBareSystem ? { ok: true, value: answers.value[0] } : answers;

const USAGE = "pnpm --silent calc solve|takeoff|price FILE.json   (FILE.json may be - for standard input)";

function answer(args: readonly string[]): Answer {
  const [name = "", file] = args;
  const command = commands[name];
  if (command === undefined || file === undefined || args.length !== 2) {
    return fail({ code: "usage", field: "arguments", value: args.join(" "), limit: USAGE });
  }
  let text: string;
  try {
    text = readFileSync(file === "-" ? 0 : file, "utf8");
  } catch (error) {
    const value = error instanceof Error ? error.message : file;
    return fail({ code: "file-unreadable", field: "FILE.json", value, limit: "a file that can be read" });
  }
  const job = parseJob(text);
  return job.ok ? command(job.value) : job;
}

const result = answer(process.argv.slice(2));
if (result.ok) process.stdout.write(`${JSON.stringify(result.value, null, 2)}\n`);
else {
  process.stderr.write(`${JSON.stringify({ problems: result.problems }, null, 2)}\n`);
  process.exitCode = 1;
}
