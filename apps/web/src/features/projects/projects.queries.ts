import { endpoints, type CompanySlug, type ProjectId } from "@cleatwork/contracts";
import { queryOptions } from "@tanstack/react-query";
import { api } from "../../lib/http.ts";

export const projectQueries = {
  list: (company: CompanySlug) =>
    queryOptions({
      queryKey: [company, "projects", "list"],
      queryFn: ({ signal }) => api(endpoints.listProjects, { params: { company }, signal }),
    }),
  detail: (company: CompanySlug, projectId: ProjectId) =>
    queryOptions({
      queryKey: [company, "projects", projectId],
      queryFn: ({ signal }) => api(endpoints.getProject, { params: { company, projectId }, signal }),
    }),
  drawings: (company: CompanySlug, projectId: ProjectId) =>
    queryOptions({
      queryKey: [company, "projects", projectId, "drawings"],
      queryFn: ({ signal }) => api(endpoints.listDrawings, { params: { company, projectId }, signal }),
    }),
};
