import type { Client, Contact } from "@cleatwork/contracts";
import type { z } from "zod";
import type { clientRequest } from "@cleatwork/contracts";
import { fromJson } from "../../platform/db/columns.ts";

export type ClientRequest = z.infer<typeof clientRequest>;

/** One client with one of its contacts; contact columns are null where it has none. */
export interface ClientContactRow {
  readonly id: Client["id"];
  readonly name: string;
  readonly address: unknown;
  readonly notes: string;
  readonly version: number;
  readonly project_count: number | string;
  readonly contact_id: Contact["id"] | null;
  readonly contact_name: string;
  readonly contact_email: string;
  readonly contact_phone: string;
  readonly contact_title: string;
}

/** Rows in the order of the query; rows of one client follow each other. */
export function clientsFromRows(rows: readonly ClientContactRow[]): Client[] {
  const clients: Client[] = [];
  for (const row of rows) {
    let client = clients.at(-1);
    if (client?.id !== row.id) {
      client = {
        id: row.id,
        name: row.name,
        address: fromJson(row.address),
        notes: row.notes,
        contacts: [],
        projectCount: Number(row.project_count),
        version: row.version,
      };
      clients.push(client);
    }
    if (row.contact_id !== null)
      client.contacts.push({
        id: row.contact_id,
        name: row.contact_name,
        email: row.contact_email,
        phone: row.contact_phone,
        title: row.contact_title,
      });
  }
  return clients;
}

export const rowFromClient = (client: ClientRequest) => ({
  name: client.name,
  address: JSON.stringify(client.address),
  notes: client.notes,
});

export const rowFromContact = (clientId: Client["id"], contact: Contact, position: number) => ({
  id: contact.id,
  client_id: clientId,
  position,
  name: contact.name,
  email: contact.email,
  phone: contact.phone,
  title: contact.title,
});
