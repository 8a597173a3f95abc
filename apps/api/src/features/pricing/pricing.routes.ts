import type { pricingEndpoints } from "@cleatwork/contracts";
import { problem } from "../../platform/http/problem.ts";
import type { Handlers } from "../../platform/http/route.ts";
import { pricingRepository } from "./pricing.repository.ts";
import { deletePriceItem, putPriceItem, updatePricingSettings, updateProjectPricing } from "./pricing.service.ts";

export const pricingHandlers = {
  getPriceBook: async ({ tenant, company }) => ({
    name: `${company.name} price book`,
    currency: company.currency,
    items: await pricingRepository(tenant).listItems(),
  }),
  putPriceItem: ({ tenant, params, body, person }) => putPriceItem(tenant, params.itemKey, body, person.id),
  deletePriceItem: ({ tenant, params, person }) => deletePriceItem(tenant, params.itemKey, person.id),

  getPricingSettings: ({ tenant }) => pricingRepository(tenant).getSettings(),
  updatePricingSettings: ({ tenant, body, version, person }) => updatePricingSettings(tenant, body, version, person.id),

  getProjectPricing: async ({ tenant, params }) => {
    const pricing = await pricingRepository(tenant).findProjectPricing(params.projectId);
    if (!pricing) throw problem("not-found", "There is no such project.");
    return pricing;
  },
  updateProjectPricing: ({ tenant, params, body, version, person }) =>
    updateProjectPricing(tenant, params.projectId, body, version, person.id),
} satisfies Handlers<typeof pricingEndpoints>;
