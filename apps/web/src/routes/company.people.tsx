import type { QueryClient } from "@tanstack/react-query";
import type { LoaderFunctionArgs } from "react-router-dom";
import { PeopleScreen, peopleQueries } from "../features/people/index.ts";
import { useSession } from "../features/session/index.ts";
import { companyParam } from "../lib/route-params.ts";

export const loader =
  (client: QueryClient) =>
  ({ params }: LoaderFunctionArgs) => {
    void client.prefetchQuery(peopleQueries.list(companyParam(params)));
    return null;
  };

export function Component() {
  const { company } = useSession();
  return (
    <>
      <title>{`People, ${company.name}`}</title>
      <PeopleScreen />
    </>
  );
}
