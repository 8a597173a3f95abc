import type { ProjectId } from "@cleatwork/contracts";
import type { TenantDb } from "../../platform/db/tenant-db.ts";
import { findLayout } from "../layouts/index.ts";
import { findProject } from "../projects/index.ts";
import { listSpecs } from "../specs/index.ts";
import { computeNumbers, type ProjectNumbers } from "./compute.ts";
import { pricingRepository } from "./pricing.repository.ts";

/**
 * A project's numbers from what is stored now; null when there is no such project here. One transaction, so that all of
 * it is of one moment.
 */
export const computeProject = (
  tenant: TenantDb,
  projectId: ProjectId,
  { pricedOn }: { pricedOn: string },
): Promise<ProjectNumbers | null> =>
  tenant.transaction(async (tx) => {
    const repository = pricingRepository(tx);
    const project = await findProject(tx, projectId);
    const layout = await findLayout(tx, projectId);
    const pricing = await repository.findProjectPricing(projectId);
    if (!project || !layout || !pricing) return null;
    return computeNumbers({
      project,
      ...layout,
      specs: await listSpecs(tx),
      currency: await repository.currency(),
      items: await repository.listItems(),
      settings: await repository.getSettings(),
      pricing,
      pricedOn,
    });
  });
