import type { InvitationId, PersonId, Role } from "@cleatwork/contracts";
import { instantFromColumn, instantOrNull } from "../../platform/db/columns.ts";
import type { TenantDb } from "../../platform/db/tenant-db.ts";

interface MemberRow {
  id: PersonId;
  name: string;
  email: string;
  role: Role;
  joined_at: Date;
  last_seen_at: Date | null;
}
interface InvitationRow {
  id: InvitationId;
  email: string;
  role: Role;
  invited_by: string;
  created_at: Date;
  expires_at: Date;
}

/** People and invitations of one company. */
export const membersRepository = (db: TenantDb) => ({
  async list() {
    const rows = (await members(db).orderBy("p.name")) as MemberRow[];
    return rows.map(memberFromRow);
  },

  async find(personId: PersonId) {
    const row = ((await members(db).where("m.person_id", personId)) as MemberRow[])[0];
    return row ? memberFromRow(row) : null;
  },

  /** Every owner, locked, so that two removals cannot both see the other one. */
  async lockOwners(): Promise<number> {
    const rows = (await db.from("memberships").where({ role: "owner" }).forUpdate().select("person_id")) as unknown[];
    return rows.length;
  },

  async setRole(personId: PersonId, role: Role): Promise<void> {
    await db.from("memberships").where({ person_id: personId }).update({ role });
  },

  async remove(personId: PersonId): Promise<void> {
    await db.from("memberships").where({ person_id: personId }).delete();
  },

  async listInvitations() {
    const rows = (await db
      .from("invitations", "i")
      .join("people as p", "p.id", "i.invited_by")
      .whereNull("i.accepted_at")
      .whereNull("i.revoked_at")
      .where("i.expires_at", ">", db.now())
      .orderBy("i.created_at", "desc")
      .select("i.id", "i.email", "i.role", "i.created_at", "i.expires_at", {
        invited_by: "p.name",
      })) as InvitationRow[];
    return rows.map((row) => ({
      id: row.id,
      email: row.email,
      role: row.role,
      invitedBy: row.invited_by,
      createdAt: instantFromColumn(row.created_at),
      expiresAt: instantFromColumn(row.expires_at),
    }));
  },

  async isMember(email: string): Promise<boolean> {
    return (
      (await db
        .from("memberships", "m")
        .join("people as p", "p.id", "m.person_id")
        .where("p.email", email)
        .first("p.id")) !== undefined
    );
  },

  /** A newer invitation takes the place of an open one to the same address. */
  async revokeOpenTo(email: string): Promise<void> {
    await db
      .from("invitations")
      .where({ email })
      .whereNull("accepted_at")
      .whereNull("revoked_at")
      .update({ revoked_at: db.now() });
  },

  async insertInvitation(row: {
    id: InvitationId;
    email: string;
    role: Role;
    tokenHash: string;
    by: PersonId;
    expiresAt: Date;
  }): Promise<void> {
    await db.insert("invitations", {
      id: row.id,
      email: row.email,
      role: row.role,
      token_hash: row.tokenHash,
      invited_by: row.by,
      created_at: db.now(),
      expires_at: row.expiresAt,
    });
  },

  /** False when there is no open invitation of this id here. */
  async revoke(id: InvitationId): Promise<boolean> {
    const changed = await db
      .from("invitations")
      .where({ id })
      .whereNull("accepted_at")
      .whereNull("revoked_at")
      .update({ revoked_at: db.now() });
    return changed === 1;
  },
});

const members = (db: TenantDb) =>
  db
    .from("memberships", "m")
    .join("people as p", "p.id", "m.person_id")
    .select("p.id", "p.name", "p.email", "m.role", "m.joined_at", "m.last_seen_at");

const memberFromRow = (row: MemberRow) => ({
  id: row.id,
  name: row.name,
  email: row.email,
  role: row.role,
  joinedAt: instantFromColumn(row.joined_at),
  lastSeenAt: instantOrNull(row.last_seen_at),
});
