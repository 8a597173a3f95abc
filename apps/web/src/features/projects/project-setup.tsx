import { endpoints, projectRequest, type ProjectId } from "@cleatwork/contracts";
import { useQueryClient, useSuspenseQuery } from "@tanstack/react-query";
import { api } from "../../lib/http.ts";
import { paths } from "../../lib/paths.ts";
import { Button } from "../../ui/button.tsx";
import { useContractForm } from "../../ui/form/use-contract-form.ts";
import { LinkButton } from "../../ui/link-button.tsx";
import { Panel, PanelBody, PanelHead } from "../../ui/panel.tsx";
import { notify } from "../../ui/toast.tsx";
import { useSession } from "../session/index.ts";
import { Drawings } from "./drawings.tsx";
import { ProjectForm, projectValues } from "./project-form.tsx";
import { projectQueries } from "./projects.queries.ts";

/** What the project is, and its drawings. Air systems are laid out in the first step. */
export function ProjectSetup({ projectId }: { projectId: ProjectId }) {
  const { slug } = useSession();
  const cache = useQueryClient();
  const { data: project } = useSuspenseQuery(projectQueries.detail(slug, projectId));
  const contractForm = useContractForm({
    schema: projectRequest,
    initial: projectValues(project),
    version: project.version,
    save: (body, { version }) => api(endpoints.updateProject, { params: { company: slug, projectId }, body, version }),
    onSaved: async (saved) => {
      cache.setQueryData(projectQueries.detail(slug, projectId).queryKey, saved);
      notify(`${saved.name} is saved.`, { severity: "good" });
      await cache.invalidateQueries({ queryKey: projectQueries.list(slug).queryKey });
    },
    reload: async () => {
      const now = await api(endpoints.getProject, { params: { company: slug, projectId } });
      cache.setQueryData(projectQueries.detail(slug, projectId).queryKey, now);
      return { values: projectValues(now), version: now.version };
    },
  });
  return (
    <main className="grid min-h-0 flex-1 content-start gap-4 overflow-auto p-4 xl:grid-cols-[minmax(28rem,5fr)_6fr]">
      <h1 className="sr-only">Setup of {project.name}</h1>
      <Panel live>
        <PanelHead title="Project" />
        <PanelBody>
          <ProjectForm
            contractForm={contractForm}
            actions={
              <div className="flex flex-wrap gap-2 border-t border-line pt-4">
                <Button type="submit" rank="primary" busy={contractForm.busy}>
                  Save
                </Button>
                <LinkButton to={paths.project(slug, projectId)}>To the layout</LinkButton>
              </div>
            }
          />
        </PanelBody>
      </Panel>
      <Drawings projectId={projectId} />
    </main>
  );
}
