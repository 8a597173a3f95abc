import { endpoints, type CompanySlug, type ProjectId, type QuoteId, type RevisionId } from "@cleatwork/contracts";
import { queryOptions } from "@tanstack/react-query";
import { api } from "../../lib/http.ts";

export const takeoffQueries = {
  issued: (company: CompanySlug, projectId: ProjectId, quoteId: QuoteId, revisionId: RevisionId) =>
    queryOptions({
      queryKey: [company, "projects", projectId, "issued-takeoff", revisionId],
      queryFn: ({ signal }) =>
        api(endpoints.getRevisionTakeoff, { params: { company, projectId, quoteId, revisionId }, signal }),
      // What was issued does not change.
      staleTime: Infinity,
    }),
  ratios: (company: CompanySlug) =>
    queryOptions({
      queryKey: [company, "takeoff-ratios"],
      queryFn: ({ signal }) => api(endpoints.listTakeoffRatios, { params: { company }, signal }),
    }),
};
