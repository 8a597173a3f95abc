/** The door of projects. */
import type { Project, ProjectId } from "@cleatwork/contracts";
import type { TenantDb } from "../../platform/db/tenant-db.ts";
import { projectsRepository } from "./projects.repository.ts";

export { sheetsQuestion } from "./drawings.repository.ts";
export { projectQuestion } from "./projects.repository.ts";
export { projectHandlers } from "./projects.routes.ts";

/** Sets how the bid stands, when a quote is issued, accepted or declined. False when the project is not here. */
export const moveProject = (db: TenantDb, id: ProjectId, state: Project["state"]) =>
  projectsRepository(db).setState(id, state);
