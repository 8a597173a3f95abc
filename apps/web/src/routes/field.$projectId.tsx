import type { QueryClient } from "@tanstack/react-query";
import { useParams, type LoaderFunctionArgs } from "react-router-dom";
import { FieldTakeoffPage, fieldQueries } from "../features/field/index.ts";
import { useSession } from "../features/session/index.ts";
import { companyParam, projectParam } from "../lib/route-params.ts";

export const loader =
  (client: QueryClient) =>
  ({ params }: LoaderFunctionArgs) => {
    void client.prefetchQuery(fieldQueries.takeoff(companyParam(params), projectParam(params)));
    return null;
  };

export function Component() {
  const { slug } = useSession();
  return <FieldTakeoffPage company={slug} projectId={projectParam(useParams())} />;
}
