import type { QueryClient } from "@tanstack/react-query";
import type { LoaderFunctionArgs } from "react-router-dom";
import { MailScreen, companyQueries } from "../features/companies/index.ts";
import { useSession } from "../features/session/index.ts";
import { companyParam } from "../lib/route-params.ts";

export const loader =
  (client: QueryClient) =>
  ({ params }: LoaderFunctionArgs) => {
    void client.prefetchInfiniteQuery(companyQueries.mail(companyParam(params)));
    return null;
  };

export function Component() {
  const { company } = useSession();
  return (
    <>
      <title>{`Mail, ${company.name}`}</title>
      <MailScreen />
    </>
  );
}
