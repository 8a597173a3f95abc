import type { QueryClient } from "@tanstack/react-query";
import type { LoaderFunctionArgs } from "react-router-dom";
import { SpecsScreen, specQueries } from "../features/specs/index.ts";
import { useSession } from "../features/session/index.ts";
import { companyParam } from "../lib/route-params.ts";
import { SpecTabs } from "./spec-tabs.tsx";

export const loader =
  (client: QueryClient) =>
  ({ params }: LoaderFunctionArgs) => {
    void client.prefetchQuery(specQueries.list(companyParam(params)));
    return null;
  };

export function Component() {
  const { company } = useSession();
  return (
    <>
      <title>{`Specs, ${company.name}`}</title>
      <SpecTabs />
      <SpecsScreen />
    </>
  );
}
