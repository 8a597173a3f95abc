import type { PriceItem } from "@cleatwork/calc";
import type {
  PersonId,
  PricingSettings,
  pricingSettingsRequest,
  ProjectId,
  ProjectPricing,
  projectPricingRequest,
} from "@cleatwork/contracts";
import type { z } from "zod";
import { recordAudit } from "../../platform/audit.ts";
import type { TenantDb } from "../../platform/db/tenant-db.ts";
import { problem } from "../../platform/http/problem.ts";
import { pricingRepository } from "./pricing.repository.ts";
import {
  addedItemProblems,
  isEmpty,
  laborProblems,
  priceItemDifferences,
  projectPricingDifferences,
  settingsDifferences,
} from "./pricing.rules.ts";

export async function putPriceItem(tenant: TenantDb, key: string, item: PriceItem, by: PersonId): Promise<PriceItem> {
  if (item.key !== key)
    throw problem("not-valid", "The item's key and the address do not agree.", [
      { pointer: "/key", code: "key-differs", message: `the key in the address, ${key}`, value: item.key },
    ]);
  await tenant.transaction(async (tx) => {
    const pricing = pricingRepository(tx);
    const before = await pricing.lockItem(key);
    if (!before) {
      await pricing.insertItem(item);
      await recordAudit(tx, { by, event: "price.added", subject: key, details: { new: item } });
      return;
    }
    const differences = priceItemDifferences(before, item);
    if (isEmpty(differences)) return;
    await pricing.updateItem(item);
    await recordAudit(tx, { by, event: "price.changed", subject: key, details: differences });
  });
  return item;
}

export async function deletePriceItem(tenant: TenantDb, key: string, by: PersonId): Promise<void> {
  await tenant.transaction(async (tx) => {
    const pricing = pricingRepository(tx);
    const before = await pricing.lockItem(key);
    if (!before) throw problem("not-found", "There is no price with this key.");
    await pricing.deleteItem(key);
    await recordAudit(tx, { by, event: "price.removed", subject: key, details: { old: before } });
  });
}

export async function updatePricingSettings(
  tenant: TenantDb,
  request: z.infer<typeof pricingSettingsRequest>,
  expected: number,
  by: PersonId,
): Promise<PricingSettings> {
  const problems = laborProblems(request.labor);
  if (problems.length > 0) throw problem("not-valid", "The labor rates cannot be saved as they are.", problems);
  return tenant.transaction(async (tx) => {
    const pricing = pricingRepository(tx);
    const before = await pricing.lockSettings();
    if (before.version !== expected)
      throw problem("stale", "The pricing settings were saved by someone else meanwhile.");
    await pricing.updateSettings(request, expected);
    const differences = settingsDifferences(before, request);
    if (!isEmpty(differences))
      await recordAudit(tx, { by, event: "pricing-settings.changed", subject: "company", details: differences });
    return { ...request, version: expected + 1 };
  });
}

export async function updateProjectPricing(
  tenant: TenantDb,
  projectId: ProjectId,
  request: z.infer<typeof projectPricingRequest>,
  expected: number,
  by: PersonId,
): Promise<ProjectPricing> {
  const problems = addedItemProblems(request.adds);
  if (problems.length > 0) throw problem("not-valid", "The added lines cannot be saved as they are.", problems);
  return tenant.transaction(async (tx) => {
    const pricing = pricingRepository(tx);
    const before = await pricing.lockProjectPricing(projectId);
    if (!before) throw problem("not-found", "There is no such project.");
    if (before.version !== expected)
      throw problem("stale", "The project's pricing was saved by someone else meanwhile.");
    await pricing.saveProjectPricing(projectId, request, expected);
    const differences = projectPricingDifferences(before, request);
    if (!isEmpty(differences))
      await recordAudit(tx, { by, event: "project-pricing.changed", subject: projectId, details: differences });
    return { ...request, version: expected + 1 };
  });
}
