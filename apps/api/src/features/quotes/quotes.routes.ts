import type { quoteEndpoints } from "@cleatwork/contracts";
import type { Handlers } from "../../platform/http/route.ts";
import { acceptQuote, clientQuotePdf, declineQuote, readClientQuote } from "./client-link.service.ts";
import { issueQuote } from "./issue-quote.ts";
import {
  createQuote,
  draftPdf,
  listQuotes,
  revisionPdf,
  revokeLink,
  updateDraft,
  withdrawRevision,
} from "./quotes.service.ts";

export const quoteHandlers = {
  listQuotes: async ({ tenant, params }) => ({ items: await listQuotes(tenant, params.projectId) }),
  createQuote: ({ tenant, params, person, deps }) => createQuote(tenant, params.projectId, person, deps),
  updateQuoteDraft: ({ tenant, params, body, version }) => updateDraft(tenant, params, body, version),
  issueQuote: ({ tenant, params, body, person, version, deps }) =>
    issueQuote(tenant, params, body, { by: person, version, deps }),
  withdrawRevision: ({ tenant, params, person }) => withdrawRevision(tenant, params, person),
  revokeLink: ({ tenant, params, person }) => revokeLink(tenant, params, person),
  getRevisionPdf: ({ tenant, params, deps }) => revisionPdf(tenant, params, deps),
  getDraftPdf: ({ tenant, params, person, deps }) => draftPdf(tenant, params, person, deps),

  getClientQuote: ({ params, deps }) => readClientQuote(deps, params.token),
  getClientQuotePdf: ({ params, deps }) => clientQuotePdf(deps, params.token),
  acceptQuote: ({ params, body, request, deps }) => acceptQuote(deps, params.token, body, request),
  declineQuote: ({ params, body, request, deps }) => declineQuote(deps, params.token, body, request),
} satisfies Handlers<typeof quoteEndpoints>;
