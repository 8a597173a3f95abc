/** The door of layouts. */
import type { ProjectId } from "@cleatwork/contracts";
import type { TenantDb } from "../../platform/db/tenant-db.ts";
import { layoutsRepository } from "./layouts.repository.ts";

export { layoutHandlers } from "./layouts.routes.ts";
export { startLayout } from "./layouts.service.ts";

/** The layout and its sequence; null when there is no such project here. */
export const findLayout = (db: TenantDb, projectId: ProjectId) => layoutsRepository(db).find(projectId);
