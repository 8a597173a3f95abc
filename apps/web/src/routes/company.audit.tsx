import type { QueryClient } from "@tanstack/react-query";
import type { LoaderFunctionArgs } from "react-router-dom";
import { AuditScreen, companyQueries } from "../features/companies/index.ts";
import { useSession } from "../features/session/index.ts";
import { companyParam } from "../lib/route-params.ts";

export const loader =
  (client: QueryClient) =>
  ({ params }: LoaderFunctionArgs) => {
    void client.prefetchInfiniteQuery(companyQueries.audit(companyParam(params)));
    return null;
  };

export function Component() {
  const { company } = useSession();
  return (
    <>
      <title>{`Audit, ${company.name}`}</title>
      <AuditScreen />
    </>
  );
}
