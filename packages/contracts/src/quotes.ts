import { z } from "zod";
import { address, calendarDate, email, instant, longText, name, shortText, version } from "./common.ts";
import { endpoint, member, open } from "./endpoint.ts";
import { quoteId, quoteLinkId, revisionId } from "./ids.ts";

export const PRICE_DETAILS = ["lump-sum", "by-system"] as const;
export const REVISION_STATES = ["issued", "superseded", "accepted", "declined", "expired", "withdrawn"] as const;
export type RevisionState = (typeof REVISION_STATES)[number];

const lines = z.array(z.string().trim().min(1, "some words").max(500)).max(100);

/** What the estimator writes. */
export const quoteDraft = z.strictObject({
  title: name,
  greeting: longText,
  scope: longText,
  inclusions: lines,
  exclusions: lines,
  clarifications: lines,
  addenda: lines,
  terms: longText,
  validDays: z.int().min(1).max(365),
  priceDetail: z.enum(PRICE_DETAILS),
});
export type QuoteDraft = z.infer<typeof quoteDraft>;

export const recipient = z.strictObject({ name, email });

export const revisionItem = z.object({
  id: revisionId,
  number: z.int(),
  state: z.enum(REVISION_STATES),
  issuedAt: instant,
  issuedBy: z.string(),
  validUntilOn: calendarDate,
  price_minor: z.int(),
  currency: z.string(),
  /** SHA-256 of the snapshot's canonical JSON. */
  snapshotHash: z.string(),
  links: z.array(
    z.object({
      id: quoteLinkId,
      recipientName: z.string(),
      recipientEmail: z.string(),
      mailState: z.enum(["queued", "sent", "refused", "dead"]),
      mailError: z.string().nullable(),
      openedAt: instant.nullable(),
      expiresAt: instant,
      revokedAt: instant.nullable(),
    }),
  ),
  response: z
    .object({
      kind: z.enum(["accepted", "declined"]),
      name: z.string(),
      title: z.string(),
      poNumber: z.string(),
      reason: z.string(),
      at: instant,
    })
    .nullable(),
});
export type RevisionItem = z.infer<typeof revisionItem>;

export const quoteResponse = z.object({
  id: quoteId,
  number: z.string(),
  draft: quoteDraft,
  revisions: z.array(revisionItem),
  version,
});
export type Quote = z.infer<typeof quoteResponse>;

export const issueQuoteRequest = z.strictObject({
  recipients: z.array(recipient).min(1, "at least one recipient").max(20),
  message: longText,
  /** The layout the estimator was looking at; refused when someone has edited since. */
  layoutSequence: z.int().min(0),
  /** The price the estimator was looking at; refused when the server computes another. */
  price_minor: z.int(),
});

/** What a client sees: words and prices they are meant to see; no cost, rate, margin, hour or note. */
export const clientQuoteResponse = z.object({
  company: z.object({
    name: z.string(),
    address,
    phone: z.string(),
    licenseNumber: z.string(),
    brandColor: z.string(),
  }),
  estimator: z.object({ name: z.string(), email: z.string() }),
  recipientName: z.string(),
  clientName: z.string(),
  projectName: z.string(),
  quoteNumber: z.string(),
  revision: z.int(),
  state: z.enum(REVISION_STATES),
  issuedAt: instant,
  validUntilOn: calendarDate,
  title: z.string(),
  greeting: z.string(),
  scope: z.string(),
  inclusions: z.array(z.string()),
  exclusions: z.array(z.string()),
  clarifications: z.array(z.string()),
  addenda: z.array(z.string()),
  terms: z.string(),
  currency: z.string(),
  price_minor: z.int(),
  /** Empty when the quote is a lump sum; otherwise adds up to the price. */
  parts: z.array(z.object({ name: z.string(), price_minor: z.int() })),
  snapshotHash: z.string(),
  consent: z.string(),
  response: z.object({ kind: z.enum(["accepted", "declined"]), name: z.string(), at: instant }).nullable(),
});
export type ClientQuote = z.infer<typeof clientQuoteResponse>;

export const acceptQuoteRequest = z.strictObject({
  name: name,
  title: shortText,
  poNumber: z.string().trim().max(60),
  consent: z.literal(true, "tick to agree"),
  /** What the client saw, so that nobody accepts something else. */
  snapshotHash: z.string().regex(/^[0-9a-f]{64}$/),
});
export const declineQuoteRequest = z.strictObject({
  name,
  reason: z.string().trim().min(1, "a reason, in a few words").max(2000),
});

export const quoteEndpoints = {
  listQuotes: endpoint({
    method: "get",
    path: "/companies/:company/projects/:projectId/quotes",
    access: member("quotes.read"),
    summary: "Quotes of a project with their revisions",
    response: z.object({ items: z.array(quoteResponse) }),
  }),
  createQuote: endpoint({
    method: "post",
    path: "/companies/:company/projects/:projectId/quotes",
    access: member("quotes.write"),
    summary: "Start a quote with scope text from the systems",
    response: quoteResponse,
    status: 201,
    guards: ["idempotency-key"],
  }),
  updateQuoteDraft: endpoint({
    method: "put",
    path: "/companies/:company/projects/:projectId/quotes/:quoteId/draft",
    access: member("quotes.write"),
    summary: "Change the draft; what was issued stays",
    body: quoteDraft,
    response: quoteResponse,
    guards: ["if-match"],
  }),
  issueQuote: endpoint({
    method: "post",
    path: "/companies/:company/projects/:projectId/quotes/:quoteId/issue",
    access: member("quotes.issue"),
    summary: "Compute, freeze and hash a revision, and mail it to its recipients",
    body: issueQuoteRequest,
    response: quoteResponse,
    status: 201,
    guards: ["if-match", "idempotency-key"],
  }),
  withdrawRevision: endpoint({
    method: "post",
    path: "/companies/:company/projects/:projectId/quotes/:quoteId/revisions/:revisionId/withdraw",
    access: member("quotes.issue"),
    summary: "Take an issued revision back",
    response: quoteResponse,
  }),
  revokeLink: endpoint({
    method: "post",
    path: "/companies/:company/projects/:projectId/quotes/:quoteId/links/:linkId/revoke",
    access: member("quotes.issue"),
    summary: "End one recipient's link",
    response: quoteResponse,
  }),
  getRevisionPdf: endpoint({
    method: "get",
    path: "/companies/:company/projects/:projectId/quotes/:quoteId/revisions/:revisionId/pdf",
    access: member("quotes.read"),
    summary: "The PDF as it was sent",
    answers: "file",
    status: 200,
  }),
  getDraftPdf: endpoint({
    method: "get",
    path: "/companies/:company/projects/:projectId/quotes/:quoteId/draft/pdf",
    access: member("quotes.read"),
    summary: "The PDF as the draft would be sent now",
    answers: "file",
    status: 200,
  }),
  getClientQuote: endpoint({
    method: "get",
    path: "/open/quotes/:token",
    access: open("the private link says who"),
    summary: "Read a quote",
    response: clientQuoteResponse,
  }),
  getClientQuotePdf: endpoint({
    method: "get",
    path: "/open/quotes/:token/pdf",
    access: open("the private link says who"),
    summary: "The quote as PDF",
    answers: "file",
    status: 200,
  }),
  acceptQuote: endpoint({
    method: "post",
    path: "/open/quotes/:token/accept",
    access: open("the private link says who"),
    summary: "Accept with a typed name",
    body: acceptQuoteRequest,
    response: clientQuoteResponse,
  }),
  declineQuote: endpoint({
    method: "post",
    path: "/open/quotes/:token/decline",
    access: open("the private link says who"),
    summary: "Decline with a reason",
    body: declineQuoteRequest,
    response: clientQuoteResponse,
  }),
};
