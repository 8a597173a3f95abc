import { z } from "zod";
import { constructionSpecSchema } from "./air-system.ts";
import { name, version } from "./common.ts";
import { endpoint, member } from "./endpoint.ts";
import { specId } from "./ids.ts";

export const specRequest = z.strictObject({ name, construction: constructionSpecSchema });
export const specResponse = z.object({ id: specId, name: z.string(), construction: constructionSpecSchema, version });
export type Spec = z.infer<typeof specResponse>;

export const specEndpoints = {
  listSpecs: endpoint({
    method: "get",
    path: "/companies/:company/specs",
    access: member("specs.read"),
    summary: "Construction specs of the company",
    response: z.object({ items: z.array(specResponse) }),
  }),
  createSpec: endpoint({
    method: "post",
    path: "/companies/:company/specs",
    access: member("specs.write"),
    summary: "Add a construction spec",
    body: specRequest,
    response: specResponse,
    status: 201,
    guards: ["idempotency-key"],
  }),
  updateSpec: endpoint({
    method: "put",
    path: "/companies/:company/specs/:specId",
    access: member("specs.write"),
    summary: "Change a construction spec",
    body: specRequest,
    response: specResponse,
    guards: ["if-match"],
  }),
};
