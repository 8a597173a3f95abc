import type { takeoffEndpoints } from "@cleatwork/contracts";
import type { Handlers } from "../../platform/http/route.ts";
import { issuedRatios, issuedTakeoff } from "../quotes/index.ts";
import { takeoffFile } from "./takeoffs.service.ts";

export const takeoffHandlers = {
  getRevisionTakeoff: ({ tenant, params }) => issuedTakeoff(tenant, params),
  listTakeoffRatios: async ({ tenant }) => ({ items: await issuedRatios(tenant) }),
  getTakeoffFile: ({ tenant, params, query, deps }) => takeoffFile(tenant, params.projectId, query.format, deps),
} satisfies Handlers<typeof takeoffEndpoints>;
