import { z } from "zod";
import { address, email, longText, name, shortText, version } from "./common.ts";
import { endpoint, member } from "./endpoint.ts";
import { clientId, contactId } from "./ids.ts";

export const contact = z.strictObject({
  id: contactId,
  name,
  email: email.or(z.literal("")),
  phone: z.string().trim().max(40),
  title: shortText,
});
export type Contact = z.infer<typeof contact>;

export const clientRequest = z.strictObject({ name, address, notes: longText, contacts: z.array(contact).max(100) });
export const clientResponse = z.object({
  id: clientId,
  name: z.string(),
  address,
  notes: z.string(),
  contacts: z.array(contact),
  projectCount: z.int(),
  version,
});
export type Client = z.infer<typeof clientResponse>;

export const clientEndpoints = {
  listClients: endpoint({
    method: "get",
    path: "/companies/:company/clients",
    access: member("clients.read"),
    summary: "Clients with their contacts, by name",
    response: z.object({ items: z.array(clientResponse) }),
  }),
  createClient: endpoint({
    method: "post",
    path: "/companies/:company/clients",
    access: member("clients.write"),
    summary: "Add a client",
    body: clientRequest,
    response: clientResponse,
    status: 201,
    guards: ["idempotency-key"],
  }),
  getClient: endpoint({
    method: "get",
    path: "/companies/:company/clients/:clientId",
    access: member("clients.read"),
    summary: "One client",
    response: clientResponse,
  }),
  updateClient: endpoint({
    method: "put",
    path: "/companies/:company/clients/:clientId",
    access: member("clients.write"),
    summary: "Change a client and its contacts",
    body: clientRequest,
    response: clientResponse,
    guards: ["if-match"],
  }),
};
