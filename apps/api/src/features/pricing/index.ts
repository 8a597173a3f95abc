/** The door of pricing. */
import type { TenantDb } from "../../platform/db/tenant-db.ts";
import { defaultPricingSettings } from "./default-settings.ts";
import { pricingRepository } from "./pricing.repository.ts";

export { computeProject, numbersFrom, projectQuestions } from "./compute-project.ts";
export type { ProjectNumbers } from "./compute.ts";
export { pricingHandlers } from "./pricing.routes.ts";

/** The settings a newly founded company starts with. */
export const writeDefaultPricing = (db: TenantDb) => pricingRepository(db).insertSettings(defaultPricingSettings);
