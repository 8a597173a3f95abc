import { useSuspenseQuery, type QueryClient } from "@tanstack/react-query";
import { Outlet, useParams, type LoaderFunctionArgs } from "react-router-dom";
import { projectQueries } from "../features/projects/index.ts";
import { useSession } from "../features/session/index.ts";
import { PROJECT_STEPS, paths } from "../lib/paths.ts";
import { companyParam, projectParam } from "../lib/route-params.ts";
import { TopBar } from "../ui/top-bar.tsx";

export const loader =
  (client: QueryClient) =>
  ({ params }: LoaderFunctionArgs) => {
    void client.prefetchQuery(projectQueries.detail(companyParam(params), projectParam(params)));
    return null;
  };

const labels = {
  layout: "Layout",
  air: "Air check",
  takeoff: "Takeoff",
  price: "Price",
  quote: "Quote",
  field: "Field",
};

/** The frame of one project: its name and the steps in the order of the work. */
export function Component() {
  const { slug } = useSession();
  const id = projectParam(useParams());
  const { data: project } = useSuspenseQuery(projectQueries.detail(slug, id));
  return (
    <>
      <TopBar
        heading={false}
        title={project.name}
        fact={project.clientName}
        label="Steps"
        tabs={PROJECT_STEPS.map((step) => ({ to: paths.project(slug, id, step), label: labels[step] }))}
      />
      <Outlet />
    </>
  );
}
