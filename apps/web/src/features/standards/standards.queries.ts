import { endpoints, type CompanySlug } from "@cleatwork/contracts";
import { queryOptions } from "@tanstack/react-query";
import { api } from "../../lib/http.ts";

export const standardsQueries = {
  latest: (company: CompanySlug) =>
    queryOptions({
      queryKey: [company, "standards", "latest"],
      queryFn: ({ signal }) => api(endpoints.getStandards, { params: { company }, signal }),
    }),
  history: (company: CompanySlug) =>
    queryOptions({
      queryKey: [company, "standards", "history"],
      queryFn: ({ signal }) => api(endpoints.listStandardsHistory, { params: { company }, signal }),
    }),
};
