import { FieldHome, fieldQueries } from "../features/field/index.ts";
import { useSession } from "../features/session/index.ts";
import { companyParam } from "../lib/route-params.ts";
import type { QueryClient } from "@tanstack/react-query";
import type { LoaderFunctionArgs } from "react-router-dom";

export const loader =
  (client: QueryClient) =>
  ({ params }: LoaderFunctionArgs) => {
    void client.prefetchQuery(fieldQueries.projects(companyParam(params)));
    return null;
  };

export function Component() {
  const { slug, company } = useSession();
  return <FieldHome company={slug} units={company.unitSystem} />;
}
