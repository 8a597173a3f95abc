import type { clientEndpoints } from "@cleatwork/contracts";
import { problem } from "../../platform/http/problem.ts";
import type { Handlers } from "../../platform/http/route.ts";
import { clientsRepository } from "./clients.repository.ts";
import { createClient, updateClient } from "./clients.service.ts";

export const clientHandlers = {
  listClients: async ({ tenant }) => ({ items: await clientsRepository(tenant).list() }),

  createClient: ({ tenant, body, deps }) => createClient(tenant, body, deps),

  getClient: async ({ tenant, params }) => {
    const client = await clientsRepository(tenant).find(params.clientId);
    if (!client) throw problem("not-found", "There is no such client.");
    return client;
  },

  updateClient: ({ tenant, params, body, version }) => updateClient(tenant, params.clientId, body, version),
} satisfies Handlers<typeof clientEndpoints>;
