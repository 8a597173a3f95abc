/** The door of specs. */
import type { SpecId } from "@cleatwork/contracts";
import type { TenantDb } from "../../platform/db/tenant-db.ts";
import { DEFAULT_SPEC_NAME, defaultConstruction } from "./default-spec.ts";
import { specsRepository } from "./specs.repository.ts";

export { specsQuestion } from "./specs.repository.ts";
export { specHandlers } from "./specs.routes.ts";

/** The spec a newly founded company starts with. */
export const writeDefaultSpec = (db: TenantDb, id: SpecId, now: Date) =>
  specsRepository(db).insert(id, { name: DEFAULT_SPEC_NAME, construction: defaultConstruction }, now);
