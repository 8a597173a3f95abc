import { endpoints, type CompanySlug } from "@cleatwork/contracts";
import { queryOptions } from "@tanstack/react-query";
import { api } from "../../lib/http.ts";

export const specQueries = {
  list: (company: CompanySlug) =>
    queryOptions({
      queryKey: [company, "specs"],
      queryFn: ({ signal }) => api(endpoints.listSpecs, { params: { company }, signal }),
    }),
};
