import type { Address, ClientId, Client, Contact, ContactId, ProjectId } from "@cleatwork/contracts";
import { fromJson } from "../../platform/db/columns.ts";
import type { Question } from "../../platform/db/question.ts";
import type { TenantDb } from "../../platform/db/tenant-db.ts";
import {
  clientsFromRows,
  rowFromClient,
  rowFromContact,
  type ClientContactRow,
  type ClientRequest,
} from "./clients.rows.ts";

/** Where the project's client is to be found; null when there is no such project here. */
export const clientAddressQuestion = (db: TenantDb, projectId: ProjectId): Question<Address | null> => ({
  from: db
    .from("projects", "p")
    .join("clients as c", { "c.organization_id": "p.organization_id", "c.id": "p.client_id" })
    .where("p.id", projectId),
  columns: { address: "c.address" },
  order: "c.id",
  read: ([row]: readonly { address: unknown }[]) => (row ? fromJson<Address>(row.address) : null),
});

export const clientsRepository = (db: TenantDb) => {
  const withContacts = () =>
    db
      .from("clients", "c")
      .leftJoin("client_contacts as k", { "k.organization_id": "c.organization_id", "k.client_id": "c.id" })
      .select("c.id", "c.name", "c.address", "c.notes", "c.version")
      .select({
        contact_id: "k.id",
        contact_name: "k.name",
        contact_email: "k.email",
        contact_phone: "k.phone",
        contact_title: "k.title",
      })
      .select(db.from("projects", "p").count("*").whereRaw("p.client_id = c.id").as("project_count"))
      .orderBy(["c.name", "c.id", "k.position"]);

  return {
    async list(): Promise<Client[]> {
      return clientsFromRows((await withContacts()) as ClientContactRow[]);
    },

    async find(id: ClientId): Promise<Client | null> {
      return clientsFromRows((await withContacts().where("c.id", id)) as ClientContactRow[])[0] ?? null;
    },

    /** The version now, with the row locked; null when there is no such client here. */
    async lock(id: ClientId): Promise<{ version: number } | null> {
      const row: { version: number } | undefined = await db.from("clients").where({ id }).forUpdate().first("version");
      return row ?? null;
    },

    async insert(id: ClientId, client: ClientRequest, now: Date): Promise<void> {
      await db.insert("clients", { id, ...rowFromClient(client), version: 1, created_at: now });
    },

    /** False when someone else saved first. */
    async update(id: ClientId, client: ClientRequest, expected: number): Promise<boolean> {
      const changed = await db
        .from("clients")
        .where({ id, version: expected })
        .update({ ...rowFromClient(client), version: expected + 1 });
      return changed === 1;
    },

    /** Contacts of this company with these ids, whichever client they belong to. */
    async contactOwners(ids: readonly ContactId[]): Promise<{ id: ContactId; clientId: ClientId }[]> {
      if (ids.length === 0) return [];
      const rows: { id: ContactId; clientId: ClientId }[] = await db
        .from("client_contacts")
        .whereIn("id", [...ids])
        .select({ id: "id", clientId: "client_id" });
      return rows;
    },

    /** Contacts of this client, other than the kept ones, that a project names. */
    async namedByProjects(
      clientId: ClientId,
      kept: readonly ContactId[],
    ): Promise<{ id: ContactId; name: string; projectName: string }[]> {
      const rows: {
        id: ContactId;
        name: string;
        projectName: string;
      }[] = await db
        .from("client_contacts", "k")
        .join("projects as p", { "p.organization_id": "k.organization_id", "p.contact_id": "k.id" })
        .where("k.client_id", clientId)
        .whereNotIn("k.id", [...kept])
        .select({ id: "k.id", name: "k.name", projectName: "p.name" });
      return rows;
    },

    async saveContacts(clientId: ClientId, contacts: readonly Contact[]): Promise<void> {
      const kept = contacts.map((contact) => contact.id);
      await db.from("client_contacts").where({ client_id: clientId }).whereNotIn("id", kept).delete();
      const known = new Set((await this.contactOwners(kept)).map((contact) => contact.id));
      const added = [];
      for (const [position, contact] of contacts.entries()) {
        const { id, ...row } = rowFromContact(clientId, contact, position);
        if (known.has(id)) await db.from("client_contacts").where({ id, client_id: clientId }).update(row);
        else added.push({ id, ...row });
      }
      if (added.length > 0) await db.insert("client_contacts", added);
    },
  };
};
