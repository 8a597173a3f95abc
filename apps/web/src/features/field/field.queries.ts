import { endpoints, type CompanySlug, type ProjectId } from "@cleatwork/contracts";
import { queryOptions } from "@tanstack/react-query";
import { api } from "../../lib/http.ts";

export const fieldQueries = {
  projects: (company: CompanySlug) =>
    queryOptions({
      queryKey: [company, "field", "projects"],
      queryFn: ({ signal }) => api(endpoints.listFieldProjects, { params: { company }, signal }),
    }),
  takeoff: (company: CompanySlug, projectId: ProjectId) =>
    queryOptions({
      queryKey: [company, "field", "takeoff", projectId],
      queryFn: ({ signal }) => api(endpoints.getFieldTakeoff, { params: { company, projectId }, signal }),
      // What was approved does not change; a phone in a basement keeps what it has.
      staleTime: 10 * 60_000,
    }),
};
