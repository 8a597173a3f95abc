/** When a mail is tried again, and when not. */

/** About three days, with the delays below. */
export const MAX_ATTEMPTS = 14;
const FIRST_DELAY_MS = 2000;
const LONGEST_DELAY_MS = 12 * 3600_000;

export type Verdict = "retry" | "refused" | "dead";

/** A server that says 5xx means it; everything else, no server at all included, may pass. */
export function verdictOf(error: unknown, attempts: number): Verdict {
  const code = typeof error === "object" && error !== null && "responseCode" in error ? Number(error.responseCode) : 0;
  if (code >= 500 && code < 600) return "refused";
  return attempts >= MAX_ATTEMPTS ? "dead" : "retry";
}

/** Doubles each time, with up to a quarter more by chance, so that many mails do not come back at once. */
export function nextAttempt(now: Date, attempts: number, chance: number): Date {
  const delay = Math.min(FIRST_DELAY_MS * 2 ** (attempts - 1), LONGEST_DELAY_MS);
  return new Date(now.getTime() + delay * (1 + chance / 4));
}
