import type { QueryClient } from "@tanstack/react-query";
import type { LoaderFunctionArgs } from "react-router-dom";
import { useSession } from "../features/session/index.ts";
import { StandardsScreen, standardsQueries } from "../features/standards/index.ts";
import { companyParam } from "../lib/route-params.ts";
import { SpecTabs } from "./spec-tabs.tsx";

export const loader =
  (client: QueryClient) =>
  ({ params }: LoaderFunctionArgs) => {
    void client.prefetchQuery(standardsQueries.latest(companyParam(params)));
    return null;
  };

export function Component() {
  const { company } = useSession();
  return (
    <>
      <title>{`Schedules, ${company.name}`}</title>
      <SpecTabs />
      <StandardsScreen />
    </>
  );
}
