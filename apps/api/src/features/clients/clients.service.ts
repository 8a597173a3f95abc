import type { Client, ClientId } from "@cleatwork/contracts";
import type { TenantDb } from "../../platform/db/tenant-db.ts";
import { problem } from "../../platform/http/problem.ts";
import type { Deps } from "../../platform/http/route.ts";
import { clientsRepository } from "./clients.repository.ts";
import { contactProblems } from "./clients.rules.ts";
import type { ClientRequest } from "./clients.rows.ts";

export async function createClient(
  tenant: TenantDb,
  request: ClientRequest,
  deps: Pick<Deps, "clock" | "ids">,
): Promise<Client> {
  const id = deps.ids.make("cli");
  await tenant.transaction(async (tx) => {
    const clients = clientsRepository(tx);
    await refuseContacts(tx, id, request);
    await clients.insert(id, request, deps.clock.now());
    await clients.saveContacts(id, request.contacts);
  });
  return { id, ...request, projectCount: 0, version: 1 };
}

export async function updateClient(
  tenant: TenantDb,
  id: ClientId,
  request: ClientRequest,
  expected: number,
): Promise<Client> {
  return tenant.transaction(async (tx) => {
    const clients = clientsRepository(tx);
    const before = await clients.lock(id);
    if (!before) throw problem("not-found", "There is no such client.");
    if (before.version !== expected) throw problem("stale", "This client was saved by someone else meanwhile.");
    await refuseContacts(tx, id, request);
    await clients.update(id, request, expected);
    await clients.saveContacts(id, request.contacts);
    const after = await clients.find(id);
    if (!after) throw new Error(`client ${id} vanished inside its own transaction`);
    return after;
  });
}

async function refuseContacts(tx: TenantDb, clientId: ClientId, request: ClientRequest): Promise<void> {
  const clients = clientsRepository(tx);
  const ids = request.contacts.map((contact) => contact.id);
  const problems = contactProblems({
    clientId,
    contacts: request.contacts,
    owners: await clients.contactOwners(ids),
    namedByProjects: await clients.namedByProjects(clientId, ids),
  });
  if (problems.length > 0) throw problem("not-valid", "The contacts cannot be saved as they are.", problems);
}
