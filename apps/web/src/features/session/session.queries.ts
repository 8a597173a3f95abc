import { endpoints, type CompanySlug } from "@cleatwork/contracts";
import { queryOptions } from "@tanstack/react-query";
import { api } from "../../lib/http.ts";

export const sessionQueries = {
  me: () =>
    queryOptions({
      queryKey: ["me"],
      queryFn: ({ signal }) => api(endpoints.getMe, { signal }),
      staleTime: 60_000,
    }),
  company: (company: CompanySlug) =>
    queryOptions({
      queryKey: [company, "company"],
      queryFn: ({ signal }) => api(endpoints.getCompany, { params: { company }, signal }),
      staleTime: 60_000,
    }),
};
