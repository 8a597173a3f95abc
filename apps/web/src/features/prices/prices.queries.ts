import { endpoints, type CompanySlug } from "@cleatwork/contracts";
import { queryOptions } from "@tanstack/react-query";
import { api } from "../../lib/http.ts";

export const priceQueries = {
  book: (company: CompanySlug) =>
    queryOptions({
      queryKey: [company, "prices", "book"],
      queryFn: ({ signal }) => api(endpoints.getPriceBook, { params: { company }, signal }),
    }),
  settings: (company: CompanySlug) =>
    queryOptions({
      queryKey: [company, "prices", "settings"],
      queryFn: ({ signal }) => api(endpoints.getPricingSettings, { params: { company }, signal }),
    }),
};
