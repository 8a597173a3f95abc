/** The door of companies. */
import type { TenantDb } from "../../platform/db/tenant-db.ts";
import { companiesRepository } from "./companies.repository.ts";

export { companyHandlers } from "./companies.routes.ts";

export const getCompany = (db: TenantDb) => companiesRepository(db).get();
