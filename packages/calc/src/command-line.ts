/** What the command line answers, without its rim: the caller reads files, writes and exits. */
import { parseJob, priceJob, solveJob, takeOffJob, type Job } from "./job.ts";
import { fail, type Result } from "./result.ts";

export type Answer = Result<unknown, unknown>;

const commands: Readonly<Record<string, (job: Job) => Answer>> = {
  solve: (job) => alone(job, solveJob(job)),
  takeoff: (job) => alone(job, takeOffJob(job)),
  price: priceJob,
};

/** One system in, one answer out; a job in, a list out. */
const alone = (job: Job, answers: Result<readonly unknown[], unknown>): Answer =>
  answers.ok && job.isBareSystem ? { ok: true, value: answers.value[0] } : answers;

const USAGE = "pnpm --silent calc solve|takeoff|price FILE.json   (FILE.json may be - for standard input)";

/** `read` answers the text of a file, of standard input for "-"; it may throw. */
export function answerCommand(args: readonly string[], read: (file: string) => string): Answer {
  const [name = "", file] = args;
  const command = Object.hasOwn(commands, name) ? commands[name] : undefined;
  if (command === undefined || file === undefined || args.length !== 2) {
    return fail({ code: "usage", field: "arguments", value: args.join(" "), limit: USAGE });
  }
  let text: string;
  try {
    text = read(file);
  } catch (error) {
    const value = error instanceof Error ? error.message : file;
    return fail({ code: "file-unreadable", field: "FILE.json", value, limit: "a file that can be read" });
  }
  const job = parseJob(text);
  return job.ok ? command(job.value) : job;
}
