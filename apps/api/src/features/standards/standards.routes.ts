import type { standardsEndpoints } from "@cleatwork/contracts";
import type { Handlers } from "../../platform/http/route.ts";
import { standardsRepository } from "./standards.repository.ts";
import { getStandards, updateStandards } from "./standards.service.ts";

export const standardsHandlers = {
  getStandards: ({ tenant, query }) => getStandards(tenant, query),
  listStandardsHistory: async ({ tenant }) => ({ items: await standardsRepository(tenant).history() }),
  updateStandards: ({ tenant, body, version, person }) => updateStandards(tenant, body, version, person.id),
} satisfies Handlers<typeof standardsEndpoints>;
