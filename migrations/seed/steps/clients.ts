import type { Client } from "@cleatwork/contracts";
import { clients } from "../clients.ts";
import { newId } from "../new-id.ts";
import type { People } from "./people.ts";

/** The demo's clients by name. */
export async function seedClients({ estimator, company }: People): Promise<ReadonlyMap<string, Client>> {
  const { items } = await estimator.call("listClients", { params: { company } });
  const byName = new Map(items.map((client) => [client.name, client]));
  for (const client of clients)
    if (!byName.has(client.name)) {
      const contacts = client.contacts.map((contact) => ({ id: newId("con"), ...contact }));
      const added = await estimator.call("createClient", { params: { company }, body: { ...client, contacts } });
      byName.set(added.name, added);
    }
  return byName;
}
