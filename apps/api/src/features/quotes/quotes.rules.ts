/** Pure decisions about revisions and answers. They take `now`; they never ask for it. */
import type { RevisionState } from "@cleatwork/contracts";

/** As it is stored; that it has expired is told by the clock. */
export type StoredState = Exclude<RevisionState, "expired">;

/** A link outlives the quote's validity, so that a late client reads that it has expired. */
const LINK_OUTLIVES_MS = 60 * 24 * 3600_000;

/** What may come after what. */
export const NEXT_STATES: Readonly<Record<StoredState, readonly StoredState[]>> = {
  issued: ["superseded", "accepted", "declined", "withdrawn"],
  declined: ["superseded"],
  superseded: [],
  accepted: [],
  withdrawn: [],
};

/** The calendar day in a zone, YYYY-MM-DD. */
export function dayIn(zone: string, now: Date): string {
  return new Intl.DateTimeFormat("en-CA", { timeZone: zone, dateStyle: "short" }).format(now);
}

/** The last day on which the quote may be accepted, counted from the day of issue where the company is. */
export function validUntil(issuedAt: Date, validDays: number, zone: string): string {
  const day = new Date(`${dayIn(zone, issuedAt)}T00:00:00Z`);
  day.setUTCDate(day.getUTCDate() + validDays);
  return day.toISOString().slice(0, 10);
}

/** Valid through the whole of its last day, where the company is. */
export const isExpired = (validUntilOn: string, zone: string, now: Date): boolean => dayIn(zone, now) > validUntilOn;

export const stateAt = (
  revision: { state: StoredState; validUntilOn: string },
  zone: string,
  now: Date,
): RevisionState =>
  revision.state === "issued" && isExpired(revision.validUntilOn, zone, now) ? "expired" : revision.state;

export const linkExpiry = (validUntilOn: string): Date =>
  new Date(new Date(`${validUntilOn}T00:00:00Z`).getTime() + LINK_OUTLIVES_MS);

export type MayRespond =
  | { readonly allowed: true }
  | { readonly allowed: false; readonly reason: Exclude<RevisionState, "issued"> | "other-snapshot" };

/** A client may answer what is open and what they have seen. */
export function mayRespond(
  revision: { state: StoredState; validUntilOn: string; snapshotHash: string },
  seenHash: string | null,
  zone: string,
  now: Date,
): MayRespond {
  const state = stateAt(revision, zone, now);
  if (state !== "issued") return { allowed: false, reason: state };
  if (seenHash !== null && seenHash !== revision.snapshotHash) return { allowed: false, reason: "other-snapshot" };
  return { allowed: true };
}

export const REASONS: Readonly<Record<Exclude<MayRespond, { allowed: true }>["reason"], string>> = {
  superseded: "A newer revision of this quote has been sent. Use the link in the newer e-mail.",
  accepted: "This quote has been accepted already.",
  declined: "This quote has been declined already.",
  expired: "This quote is no longer valid. Ask for a new one.",
  withdrawn: "This quote was taken back.",
  "other-snapshot": "The page shows another revision than the one that would be accepted. Load it again.",
};

/** What a client agrees to, in the words that are kept with the signature. */
export const consentText = (clientName: string, companyName: string): string =>
  `By accepting, I agree for ${clientName} to the price, the scope and the terms of this quote. ${companyName} is told at once.`;

export type MayIssue =
  | { readonly allowed: true }
  | {
      readonly allowed: false;
      readonly reason:
        | "email-unverified"
        | "layout-moved"
        | "cannot-be-computed"
        | "price-missing"
        | "price-differs"
        | "nothing-to-price";
      readonly detail: string;
    };

/** Whether what the estimator saw is what would be sent. */
export function mayIssue(facts: {
  readonly emailVerified: boolean;
  readonly seen: { readonly layoutSequence: number; readonly price_minor: number };
  readonly now: {
    readonly layoutSequence: number;
    readonly price_minor: number | null;
    readonly problems: readonly string[];
    readonly stops: readonly string[];
  };
}): MayIssue {
  const { seen, now } = facts;
  const no = (reason: Exclude<MayIssue, { allowed: true }>["reason"], detail: string): MayIssue => ({
    allowed: false,
    reason,
    detail,
  });
  if (!facts.emailVerified)
    return no("email-unverified", "Confirm your e-mail address first; the link is in your inbox.");
  if (now.problems.length > 0 || now.price_minor === null)
    return no("cannot-be-computed", `The layout has to be mended first: ${now.problems.slice(0, 3).join("; ")}.`);
  if (now.stops.length > 0)
    return no("price-missing", `The price is not complete: ${now.stops.slice(0, 3).join("; ")}.`);
  if (seen.layoutSequence !== now.layoutSequence)
    return no("layout-moved", "Someone has edited the layout since you looked. Look at the new numbers, then issue.");
  if (seen.price_minor !== now.price_minor)
    return no(
      "price-differs",
      `You saw ${seen.price_minor / 100}, the server computes ${now.price_minor / 100}. Load the page again.`,
    );
  if (now.price_minor === 0) return no("nothing-to-price", "There is nothing to price yet.");
  return { allowed: true };
}
