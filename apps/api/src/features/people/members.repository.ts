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
interface ListRow<Id> {
  id: Id;
  name: string;
  email: string;
  role: Role;
  from_instant: Date;
}
type PersonRow = ListRow<PersonId> & { to_instant: Date | null };
/** The name is of the one who invited. */
type InvitationRow = ListRow<InvitationId> & { to_instant: Date };
type PersonOrInvitationRow = PersonRow | InvitationRow;

const isInvitation = (row: PersonOrInvitationRow): row is InvitationRow => row.id.startsWith("inv_");
const isMember = (row: PersonOrInvitationRow): row is PersonRow => !isInvitation(row);

/** People and invitations of one company. */
export const membersRepository = (db: TenantDb) => ({
  /** Both lists of the people page in one round trip; an id says which of the two a row belongs to. */
  async listPeopleAndInvitations() {
    const rows = (await db
      .from("memberships", "m")
      .join("people as p", "p.id", "m.person_id")
      .select({ id: "p.id", name: "p.name", email: "p.email", role: "m.role" })
      .select({ from_instant: "m.joined_at", to_instant: "m.last_seen_at" })
      .unionAll(
        db
          .from("invitations", "i")
          .join("people as by", "by.id", "i.invited_by")
          .whereNull("i.accepted_at")
          .whereNull("i.revoked_at")
          .where("i.expires_at", ">", db.now())
          .select({ id: "i.id", name: "by.name", email: "i.email", role: "i.role" })
          .select({ from_instant: "i.created_at", to_instant: "i.expires_at" }),
      )) as PersonOrInvitationRow[];
    const invited = rows.filter(isInvitation).sort((a, b) => b.from_instant.getTime() - a.from_instant.getTime());
    const joined = rows.filter(isMember).sort((a, b) => a.name.localeCompare(b.name, "en"));
    return { people: joined.map(personFromRow), invitations: invited.map(invitationFromRow) };
  },

  async find(personId: PersonId) {
    const row = ((await members(db).where("m.person_id", personId)) as MemberRow[])[0];
    return row ? memberFromRow(row) : null;
  },

  /** Every owner, locked, so that two removals cannot both see the other one. */
  async lockOwners(): Promise<number> {
    const rows: unknown[] = await db.from("memberships").where({ role: "owner" }).forUpdate().select("person_id");
    return rows.length;
  },

  async setRole(personId: PersonId, role: Role): Promise<void> {
    await db.from("memberships").where({ person_id: personId }).update({ role });
  },

  async remove(personId: PersonId): Promise<void> {
    await db.from("memberships").where({ person_id: personId }).delete();
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

const personFromRow = ({ from_instant, to_instant, ...row }: PersonRow) => ({
  ...row,
  joinedAt: instantFromColumn(from_instant),
  lastSeenAt: instantOrNull(to_instant),
});

const invitationFromRow = ({ name, from_instant, to_instant, ...row }: InvitationRow) => ({
  ...row,
  invitedBy: name,
  createdAt: instantFromColumn(from_instant),
  expiresAt: instantFromColumn(to_instant),
});
