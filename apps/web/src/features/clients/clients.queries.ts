import { endpoints, type CompanySlug } from "@cleatwork/contracts";
import { queryOptions } from "@tanstack/react-query";
import { api } from "../../lib/http.ts";

export const clientQueries = {
  list: (company: CompanySlug) =>
    queryOptions({
      queryKey: [company, "clients"],
      queryFn: ({ signal }) => api(endpoints.listClients, { params: { company }, signal }),
    }),
};
