import type { QueryClient } from "@tanstack/react-query";
import { useParams, type LoaderFunctionArgs } from "react-router-dom";
import { clientQueries } from "../features/clients/index.ts";
import { ProjectSetup, projectQueries } from "../features/projects/index.ts";
import { companyParam, projectParam } from "../lib/route-params.ts";

export const loader =
  (client: QueryClient) =>
  ({ params }: LoaderFunctionArgs) => {
    const company = companyParam(params);
    void client.prefetchQuery(clientQueries.list(company));
    void client.prefetchQuery(projectQueries.drawings(company, projectParam(params)));
    return null;
  };

export function Component() {
  return <ProjectSetup projectId={projectParam(useParams())} />;
}
