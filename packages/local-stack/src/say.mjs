/** Everything the start-up prints, in one voice. */
export const say = (line = "") => process.stdout.write(`${line}\n`);
export const complain = (line) => process.stderr.write(`${line}\n`);

/** A reason to stop that a tired person understands; printed without a stack. */
export class Stop extends Error {}
