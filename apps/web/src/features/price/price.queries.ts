import { endpoints, type CompanySlug, type ProjectId, type ProjectPricing } from "@cleatwork/contracts";
import { useMutation, useQueryClient } from "@tanstack/react-query";
import { api } from "../../lib/http.ts";
import { workspaceQueries } from "../workspace/index.ts";

/** Saves the project's own rates and lines; the numbers follow as soon as it is taken. */
export function useSaveProjectPricing(company: CompanySlug, projectId: ProjectId) {
  const client = useQueryClient();
  const { queryKey } = workspaceQueries.pricing(company, projectId);
  return useMutation({
    mutationFn: ({ version, ...body }: ProjectPricing) =>
      api(endpoints.updateProjectPricing, { params: { company, projectId }, body, version }),
    onSuccess: (saved) => client.setQueryData(queryKey, saved),
    onError: () => client.invalidateQueries({ queryKey }),
  });
}
