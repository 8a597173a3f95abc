import type { QueryClient } from "@tanstack/react-query";
import type { LoaderFunctionArgs } from "react-router-dom";
import { ProjectsScreen, projectQueries } from "../features/projects/index.ts";
import { useSession } from "../features/session/index.ts";
import { companyParam } from "../lib/route-params.ts";
import { useNow } from "../lib/use-now.ts";
import { TopBar } from "../ui/top-bar.tsx";

export const loader =
  (client: QueryClient) =>
  ({ params }: LoaderFunctionArgs) => {
    void client.prefetchQuery(projectQueries.list(companyParam(params)));
    return null;
  };

export function Component() {
  const { company } = useSession();
  const today = new Intl.DateTimeFormat("en-US", { dateStyle: "full", timeZone: company.timeZone }).format(useNow());
  return (
    <>
      <title>{`Projects, ${company.name}`}</title>
      <TopBar title={`Projects of ${company.name}`} fact={today} />
      <ProjectsScreen />
    </>
  );
}
