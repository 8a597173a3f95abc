import { meters } from "@cleatwork/calc";
import { endpoints, projectRequest } from "@cleatwork/contracts";
import { useQueryClient } from "@tanstack/react-query";
import { useNavigate, useSearchParams } from "react-router-dom";
import { emptyAddress } from "../../lib/format/address.ts";
import { api } from "../../lib/http.ts";
import { paths } from "../../lib/paths.ts";
import { Button } from "../../ui/button.tsx";
import { useContractForm } from "../../ui/form/use-contract-form.ts";
import { LinkButton } from "../../ui/link-button.tsx";
import { NoPermission } from "../../ui/error-view.tsx";
import { Panel, PanelBody, PanelHead } from "../../ui/panel.tsx";
import { useSession } from "../session/index.ts";
import { ProjectForm } from "./project-form.tsx";
import { projectQueries } from "./projects.queries.ts";

export function NewProject() {
  const { slug, company, may } = useSession();
  const cache = useQueryClient();
  const navigate = useNavigate();
  const [search] = useSearchParams();
  const contractForm = useContractForm({
    schema: projectRequest,
    initial: {
      name: "",
      number: "",
      clientId: search.get("client") ?? "",
      contactId: null,
      siteAddress: emptyAddress,
      altitude_m: meters(0),
      dueAt: null,
      dueZone: company.timeZone,
      unitSystem: company.unitSystem,
    },
    save: (body, { idempotencyKey }) =>
      api(endpoints.createProject, { params: { company: slug }, body, idempotencyKey }),
    onSaved: async (project) => {
      await cache.invalidateQueries({ queryKey: projectQueries.list(slug).queryKey });
      await navigate(paths.project(slug, project.id, "setup"));
    },
  });
  if (!may("projects.write")) return <NoPermission screen title="Estimators and owners start projects" />;
  return (
    <main className="min-h-0 flex-1 overflow-auto p-4">
      <Panel live className="max-w-3xl">
        <PanelHead title="New project" fact="what it is; drawings and air systems come next" />
        <PanelBody>
          <ProjectForm
            contractForm={contractForm}
            actions={
              <div className="flex flex-wrap gap-2 border-t border-line pt-4">
                <Button type="submit" rank="primary" busy={contractForm.busy}>
                  Start the project
                </Button>
                <LinkButton to={paths.projects(slug)}>Cancel</LinkButton>
              </div>
            }
          />
        </PanelBody>
      </Panel>
    </main>
  );
}
