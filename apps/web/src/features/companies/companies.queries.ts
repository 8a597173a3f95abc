import { endpoints, type CompanySlug } from "@cleatwork/contracts";
import { infiniteQueryOptions } from "@tanstack/react-query";
import { api } from "../../lib/http.ts";

const firstPage: { after?: string } = {};

export const companyQueries = {
  audit: (company: CompanySlug) =>
    infiniteQueryOptions({
      queryKey: [company, "audit"],
      queryFn: ({ pageParam, signal }) =>
        api(endpoints.listAudit, { params: { company }, query: { limit: 100, ...pageParam }, signal }),
      initialPageParam: firstPage,
      getNextPageParam: (page) => (page.next ? { after: page.next } : undefined),
    }),
  mail: (company: CompanySlug) =>
    infiniteQueryOptions({
      queryKey: [company, "mail"],
      queryFn: ({ pageParam, signal }) =>
        api(endpoints.listMail, { params: { company }, query: { limit: 100, ...pageParam }, signal }),
      initialPageParam: firstPage,
      getNextPageParam: (page) => (page.next ? { after: page.next } : undefined),
      // What waits is on its way while one looks.
      refetchInterval: 10_000,
    }),
};
