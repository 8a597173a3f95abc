import { endpoints, type CompanySlug } from "@cleatwork/contracts";
import { queryOptions } from "@tanstack/react-query";
import { api } from "../../lib/http.ts";

export const peopleQueries = {
  list: (company: CompanySlug) =>
    queryOptions({
      queryKey: [company, "people"],
      queryFn: ({ signal }) => api(endpoints.listPeople, { params: { company }, signal }),
    }),
  invitation: (token: string) =>
    queryOptions({
      queryKey: ["invitation", token],
      queryFn: ({ signal }) => api(endpoints.getInvitation, { params: { token }, signal }),
      staleTime: 60_000,
      retry: false,
    }),
};
