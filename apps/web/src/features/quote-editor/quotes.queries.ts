import {
  endpoints,
  type BodyOf,
  type CompanySlug,
  type ProjectId,
  type Quote,
  type QuoteDraft,
  type QuoteId,
  type QuoteLinkId,
  type RevisionId,
} from "@cleatwork/contracts";
import { queryOptions, useMutation, useQueryClient } from "@tanstack/react-query";
import { api } from "../../lib/http.ts";

export const quoteQueries = {
  list: (company: CompanySlug, projectId: ProjectId) =>
    queryOptions({
      queryKey: [company, "quotes", projectId],
      queryFn: ({ signal }) => api(endpoints.listQuotes, { params: { company, projectId }, signal }),
    }),
};

export type IssueRequest = BodyOf<typeof endpoints.issueQuote>;

/** What can be done with the quotes of a project; each answers the quote as it is then. */
export function useQuoteActions(company: CompanySlug, projectId: ProjectId) {
  const client = useQueryClient();
  const params = { company, projectId };
  const { queryKey } = quoteQueries.list(company, projectId);
  const options = {
    onSuccess: (quote: Quote) => {
      client.setQueryData(queryKey, (before: { items: Quote[] } | undefined) => ({
        items: [...(before?.items ?? []).filter(({ id }) => id !== quote.id), quote],
      }));
      return client.invalidateQueries({ queryKey: [company, "projects"], refetchType: "none" });
    },
  };
  return {
    create: useMutation({ ...options, mutationFn: () => api(endpoints.createQuote, { params }) }),
    saveDraft: useMutation({
      ...options,
      mutationFn: ({ quoteId, version, draft }: { quoteId: QuoteId; version: number; draft: QuoteDraft }) =>
        api(endpoints.updateQuoteDraft, { params: { ...params, quoteId }, version, body: draft }),
    }),
    issue: useMutation({
      ...options,
      mutationFn: ({
        quoteId,
        version,
        request,
        key,
      }: {
        quoteId: QuoteId;
        version: number;
        request: IssueRequest;
        key: string;
      }) => api(endpoints.issueQuote, { params: { ...params, quoteId }, version, body: request, idempotencyKey: key }),
    }),
    withdraw: useMutation({
      ...options,
      mutationFn: (at: { quoteId: QuoteId; revisionId: RevisionId }) =>
        api(endpoints.withdrawRevision, { params: { ...params, ...at } }),
    }),
    revokeLink: useMutation({
      ...options,
      mutationFn: (at: { quoteId: QuoteId; linkId: QuoteLinkId }) =>
        api(endpoints.revokeLink, { params: { ...params, ...at } }),
    }),
  };
}
