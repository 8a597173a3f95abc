import type { layoutEndpoints } from "@cleatwork/contracts";
import { problem } from "../../platform/http/problem.ts";
import type { Handlers } from "../../platform/http/route.ts";
import { layoutsRepository } from "./layouts.repository.ts";
import { saveLayout } from "./layouts.service.ts";

export const layoutHandlers = {
  getLayout: async ({ tenant, params }) => {
    const layout = await layoutsRepository(tenant).find(params.projectId);
    if (!layout) throw problem("not-found", "There is no such project.");
    return layout;
  },

  saveLayout: ({ tenant, params, body, person, deps }) =>
    saveLayout(tenant, params.projectId, { by: person.id, now: deps.clock.now() }, body),

  listLayoutChanges: async ({ tenant, params, query }) => {
    const found = await layoutsRepository(tenant).listChanges(params.projectId, query.after, query.limit + 1);
    if (!found) throw problem("not-found", "There is no such project.");
    const items = found.slice(0, query.limit);
    return { items, next: found.length > items.length ? (items.at(-1)?.sequence ?? null) : null };
  },
} satisfies Handlers<typeof layoutEndpoints>;
