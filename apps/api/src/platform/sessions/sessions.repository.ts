import type { PersonId } from "@cleatwork/contracts";
import { fromJson } from "../db/columns.ts";
import type { SystemDb } from "../db/system-db.ts";
import type { Membership } from "../http/route.ts";
import type { UserAttributes } from "./user-attributes.ts";

interface SessionRow {
  person_id: PersonId;
  expires_at: Date;
  name: string;
  email: string;
  email_verified_at: Date | null;
  memberships: unknown;
}

/** Session, person and every membership in one statement: an authenticated request spends one round trip on who asks. */
const MEMBERSHIPS = `(SELECT COALESCE(JSON_ARRAYAGG(JSON_OBJECT(
    'organizationId', o.id, 'slug', o.slug, 'name', o.name, 'currency', o.currency, 'role', m.role)), '[]')
  FROM memberships m JOIN organizations o ON o.id = m.organization_id
  WHERE m.person_id = p.id) AS memberships`;

export const sessionsRepository = (db: SystemDb) => ({
  async find(hash: string): Promise<{ personId: PersonId; expiresAt: Date; attributes: UserAttributes } | null> {
    const row: SessionRow | undefined = await db
      .from("sessions", "s")
      .join("people as p", "p.id", "s.person_id")
      .where("s.id", hash)
      .first("s.person_id", "s.expires_at", "p.name", "p.email", "p.email_verified_at", db.raw(MEMBERSHIPS));
    if (!row) return null;
    const { name, email } = row;
    return {
      personId: row.person_id,
      expiresAt: row.expires_at,
      attributes: {
        name,
        email,
        emailVerified: row.email_verified_at !== null,
        memberships: fromJson<Membership[]>(row.memberships),
      },
    };
  },

  async listOf(personId: PersonId) {
    const rows: { id: string; expiresAt: Date; ip: string | null; userAgent: string | null }[] = await db
      .from("sessions")
      .where({ person_id: personId })
      .select({ id: "id", expiresAt: "expires_at", ip: "ip", userAgent: "user_agent" });
    return rows;
  },

  async insert(session: {
    id: string;
    personId: PersonId;
    expiresAt: Date;
    ip: string | null;
    userAgent: string | null;
  }): Promise<void> {
    await db.insert("sessions", {
      id: session.id,
      person_id: session.personId,
      expires_at: session.expiresAt,
      created_at: db.now(),
      ip: session.ip,
      user_agent: session.userAgent?.slice(0, 300) ?? null,
    });
    // Once a session, not once a request: reading must not cost a write.
    await db.from("memberships").where({ person_id: session.personId }).update({ last_seen_at: db.now() });
  },

  async prolong(id: string, expiresAt: Date): Promise<void> {
    await db.from("sessions").where({ id }).update({ expires_at: expiresAt });
  },
  async delete(id: string): Promise<void> {
    await db.from("sessions").where({ id }).delete();
  },
  async deleteOf(personId: PersonId): Promise<void> {
    await db.from("sessions").where({ person_id: personId }).delete();
  },
  async deleteExpired(): Promise<void> {
    await db.from("sessions").where("expires_at", "<", db.now()).delete();
  },
});
