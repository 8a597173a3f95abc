import type { specEndpoints } from "@cleatwork/contracts";
import type { Handlers } from "../../platform/http/route.ts";
import { specsRepository } from "./specs.repository.ts";
import { createSpec, updateSpec } from "./specs.service.ts";

export const specHandlers = {
  listSpecs: async ({ tenant }) => ({ items: await specsRepository(tenant).list() }),
  createSpec: ({ tenant, body, deps }) => createSpec(tenant, body, deps),
  updateSpec: ({ tenant, params, body, version }) => updateSpec(tenant, params.specId, body, version),
} satisfies Handlers<typeof specEndpoints>;
