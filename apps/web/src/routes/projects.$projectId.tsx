import type { QueryClient } from "@tanstack/react-query";
import { Outlet, useParams, type LoaderFunctionArgs } from "react-router-dom";
import { projectQueries } from "../features/projects/index.ts";
import { useSession } from "../features/session/index.ts";
import {
  prefetchWorkspace,
  Tally,
  useStepFacts,
  useWorkspace,
  WorkspaceProvider,
} from "../features/workspace/index.ts";
import { PROJECT_STEPS, paths } from "../lib/paths.ts";
import { companyParam, projectParam } from "../lib/route-params.ts";
import { TopBar } from "../ui/top-bar.tsx";

export const loader =
  (client: QueryClient) =>
  ({ params }: LoaderFunctionArgs) => {
    const [company, project] = [companyParam(params), projectParam(params)];
    void client.prefetchQuery(projectQueries.detail(company, project));
    prefetchWorkspace(client, company, project);
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

/** One project, open: its name, the steps in the order of the work, and the tally that every step keeps in view. */
export function Component() {
  const { slug } = useSession();
  const id = projectParam(useParams());
  return (
    <WorkspaceProvider key={id} company={slug} projectId={id}>
      <Frame />
    </WorkspaceProvider>
  );
}

function Frame() {
  const { project, company } = useWorkspace();
  const facts = useStepFacts();
  return (
    <>
      <TopBar
        heading={false}
        title={project.name}
        fact={[project.clientName, dueWords(project.dueAt, project.dueZone)].filter(Boolean).join(" · ")}
        label="Steps"
        tabs={PROJECT_STEPS.map((step) => ({
          to: paths.project(company.slug, project.id, step),
          label: labels[step],
          fact: facts[step],
        }))}
      />
      <Tally />
      <Outlet />
    </>
  );
}

const dueWords = (dueAt: string | null, zone: string): string =>
  dueAt === null
    ? ""
    : `bid ${new Intl.DateTimeFormat("en-US", {
        timeZone: zone,
        weekday: "short",
        month: "short",
        day: "numeric",
        hour: "numeric",
        minute: "2-digit",
        timeZoneName: "short",
      }).format(new Date(dueAt))}`;
