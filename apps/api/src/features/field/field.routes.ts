import type { fieldEndpoints } from "@cleatwork/contracts";
import { problem } from "../../platform/http/problem.ts";
import type { Handlers } from "../../platform/http/route.ts";
import { fieldRepository } from "./field.repository.ts";

export const fieldHandlers = {
  listFieldProjects: async ({ tenant }) => ({ items: await fieldRepository(tenant).listProjects() }),
  getFieldTakeoff: async ({ tenant, params }) => {
    const takeoff = await fieldRepository(tenant).find(params.projectId);
    if (!takeoff) throw problem("not-found", "Nothing is approved for this project yet.");
    return takeoff;
  },
} satisfies Handlers<typeof fieldEndpoints>;
