import type { PersonId, Project, ProjectId } from "@cleatwork/contracts";
import type { TenantDb } from "../../platform/db/tenant-db.ts";
import { problem } from "../../platform/http/problem.ts";
import type { Deps } from "../../platform/http/route.ts";
import { checkClientReference } from "../clients/index.ts";
import { startLayout } from "../layouts/index.ts";
import { projectsRepository } from "./projects.repository.ts";
import type { ProjectRequest } from "./projects.rows.ts";

export async function createProject(
  tenant: TenantDb,
  request: ProjectRequest,
  by: PersonId,
  deps: Pick<Deps, "clock" | "ids">,
): Promise<Project> {
  const id = deps.ids.make("prj");
  return tenant.transaction(async (tx) => {
    await refuseUnknownClient(tx, request);
    const now = deps.clock.now();
    await projectsRepository(tx).insert(id, request, now);
    await startLayout(tx, id, { by, now, levelId: deps.ids.make("lvl") });
    return getProject(tx, id);
  });
}

export async function updateProject(
  tenant: TenantDb,
  id: ProjectId,
  request: ProjectRequest,
  expected: number,
): Promise<Project> {
  return tenant.transaction(async (tx) => {
    const projects = projectsRepository(tx);
    const before = await projects.lock(id);
    if (!before) throw problem("not-found", "There is no such project.");
    if (before.version !== expected) throw problem("stale", "This project was saved by someone else meanwhile.");
    await refuseUnknownClient(tx, request);
    await projects.update(id, request, expected);
    return getProject(tx, id);
  });
}

export async function getProject(tenant: TenantDb, id: ProjectId): Promise<Project> {
  const project = await projectsRepository(tenant).find(id);
  if (!project) throw problem("not-found", "There is no such project.");
  return project;
}

async function refuseUnknownClient(tx: TenantDb, request: ProjectRequest): Promise<void> {
  const answer = await checkClientReference(tx, request);
  if (answer === "client-unknown")
    throw problem("not-valid", "The project names a client that is not here.", [
      { pointer: "/clientId", code: answer, message: "a client of this company", value: request.clientId },
    ]);
  if (answer === "contact-unknown")
    throw problem("not-valid", "The project names a contact that its client does not have.", [
      { pointer: "/contactId", code: answer, message: "a contact of this client, or none", value: request.contactId },
    ]);
}
