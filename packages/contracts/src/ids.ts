/** Ids carry their kind, so a log line reads itself and the wrong kind fails at the edge. */
import { z } from "zod";

declare const kind: unique symbol;
type Id<K extends string> = string & { readonly [kind]: K };

/** 26 characters of Crockford base 32: 48 bits of time, 80 of chance. */
const BODY = "[0-9a-hjkmnp-tv-z]{26}";

const id = <K extends string>(prefix: K) =>
  z.string().regex(new RegExp(`^${prefix}_${BODY}$`), `an id that starts with ${prefix}_`) as unknown as z.ZodType<
    Id<K>,
    string
  >;

export type PersonId = Id<"per">;
export type OrganizationId = Id<"org">;
export type InvitationId = Id<"inv">;
export type ClientId = Id<"cli">;
export type ContactId = Id<"con">;
export type ProjectId = Id<"prj">;
export type DrawingId = Id<"drw">;
export type SpecId = Id<"spc">;
export type QuoteId = Id<"quo">;
export type RevisionId = Id<"rev">;
export type QuoteLinkId = Id<"lnk">;
export type ApprovedTakeoffId = Id<"apt">;
export type LevelId = Id<"lvl">;
export type SystemId = Id<"sys">;
export type NodeId = Id<"nod">;
export type SegmentId = Id<"seg">;
export type RecordId = LevelId | SystemId | NodeId | SegmentId;

export const personId = id("per");
export const organizationId = id("org");
export const invitationId = id("inv");
export const clientId = id("cli");
export const contactId = id("con");
export const projectId = id("prj");
export const drawingId = id("drw");
export const specId = id("spc");
export const quoteId = id("quo");
export const revisionId = id("rev");
export const quoteLinkId = id("lnk");
export const approvedTakeoffId = id("apt");
export const levelId = id("lvl");
export const systemId = id("sys");
export const nodeId = id("nod");
export const segmentId = id("seg");
export const recordId = z.union([levelId, systemId, nodeId, segmentId]);

/** A company's name in an address: `tallgrass`. */
export type CompanySlug = Id<"slug">;
export const companySlug = z
  .string()
  .regex(/^[a-z0-9](?:[a-z0-9-]{0,46}[a-z0-9])?$/, "lower-case letters, digits and hyphens") as unknown as z.ZodType<
  CompanySlug,
  string
>;

const ALPHABET = "0123456789abcdefghjkmnpqrstvwxyz";

/**
 * A new id of a kind. Time first, so that ids sort by age. The clock and chance come in through arguments.
 *
 * @example makeId("prj", { now: Date.now(), random: (bytes) => crypto.getRandomValues(bytes) })
 */
export function makeId<K extends string>(
  prefix: K,
  source: { now: number; random: (bytes: Uint8Array<ArrayBuffer>) => Uint8Array },
): Id<K> {
  let time = source.now;
  let head = "";
  for (let i = 0; i < 10; i++) {
    head = ALPHABET.charAt(time % 32) + head;
    time = Math.floor(time / 32);
  }
  let tail = "";
  for (const byte of source.random(new Uint8Array(16))) tail += ALPHABET.charAt(byte % 32);
  return `${prefix}_${head}${tail}` as Id<K>;
}
