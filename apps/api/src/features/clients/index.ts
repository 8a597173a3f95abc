/** The door of clients. */
import type { ClientId, ContactId } from "@cleatwork/contracts";
import type { TenantDb } from "../../platform/db/tenant-db.ts";
import { clientsRepository } from "./clients.repository.ts";

export { clientAddressQuestion } from "./clients.repository.ts";
export { clientHandlers } from "./clients.routes.ts";

/** Whether a client, and a contact of it, are here to be named by a project. */
export async function checkClientReference(
  db: TenantDb,
  reference: { clientId: ClientId; contactId: ContactId | null },
): Promise<"known" | "client-unknown" | "contact-unknown"> {
  const client = await clientsRepository(db).find(reference.clientId);
  if (!client) return "client-unknown";
  if (reference.contactId === null) return "known";
  return client.contacts.some((contact) => contact.id === reference.contactId) ? "known" : "contact-unknown";
}
