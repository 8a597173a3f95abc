import { endpoints, type CompanySlug, type ProjectId } from "@cleatwork/contracts";
import { queryOptions, type QueryClient } from "@tanstack/react-query";
import { api } from "../../lib/http.ts";

export const workspaceQueries = {
  layout: (company: CompanySlug, projectId: ProjectId) =>
    queryOptions({
      queryKey: [company, "layouts", projectId],
      queryFn: ({ signal }) => api(endpoints.getLayout, { params: { company, projectId }, signal }),
      // The store owns the layout once it is loaded; a later read would be older than what is on the screen.
      staleTime: Infinity,
      gcTime: 0,
    }),
  specs: (company: CompanySlug) =>
    queryOptions({
      queryKey: [company, "specs"],
      queryFn: ({ signal }) => api(endpoints.listSpecs, { params: { company }, signal }),
    }),
  priceBook: (company: CompanySlug) =>
    queryOptions({
      queryKey: [company, "prices", "book"],
      queryFn: ({ signal }) => api(endpoints.getPriceBook, { params: { company }, signal }),
    }),
  settings: (company: CompanySlug) =>
    queryOptions({
      queryKey: [company, "prices", "settings"],
      queryFn: ({ signal }) => api(endpoints.getPricingSettings, { params: { company }, signal }),
    }),
  /** The company's own schedules, in force on the day. */
  standards: (company: CompanySlug, on: string) =>
    queryOptions({
      queryKey: [company, "standards", "on", on],
      queryFn: ({ signal }) => api(endpoints.getStandards, { params: { company }, query: { on }, signal }),
    }),
  pricing: (company: CompanySlug, projectId: ProjectId) =>
    queryOptions({
      queryKey: [company, "projects", projectId, "pricing"],
      queryFn: ({ signal }) => api(endpoints.getProjectPricing, { params: { company, projectId }, signal }),
    }),
  drawings: (company: CompanySlug, projectId: ProjectId) =>
    queryOptions({
      queryKey: [company, "projects", projectId, "drawings"],
      queryFn: ({ signal }) => api(endpoints.listDrawings, { params: { company, projectId }, signal }),
    }),
};

/** Everything that the numbers are made from, asked for at once. */
export function prefetchWorkspace(client: QueryClient, company: CompanySlug, projectId: ProjectId): void {
  void client.prefetchQuery(workspaceQueries.layout(company, projectId));
  void client.prefetchQuery(workspaceQueries.specs(company));
  void client.prefetchQuery(workspaceQueries.priceBook(company));
  void client.prefetchQuery(workspaceQueries.settings(company));
  void client.prefetchQuery(workspaceQueries.pricing(company, projectId));
  void client.prefetchQuery(workspaceQueries.drawings(company, projectId));
}
