import type { OrganizationId, PersonId, Role } from "@cleatwork/contracts";
import type { SystemDb } from "../../platform/db/system-db.ts";

export interface PersonRow {
  readonly id: PersonId;
  readonly email: string;
  readonly name: string;
  readonly passwordHash: string;
}

const PERSON = { id: "id", email: "email", name: "name", passwordHash: "password_hash" };

export const peopleRepository = (db: SystemDb) => ({
  async findByEmail(email: string): Promise<PersonRow | null> {
    const row: PersonRow | undefined = await db.from("people").where({ email }).first(PERSON);
    return row ?? null;
  },

  async insert(person: PersonRow & { emailVerifiedAt: Date | null }): Promise<void> {
    await db.insert("people", {
      id: person.id,
      email: person.email,
      name: person.name,
      password_hash: person.passwordHash,
      email_verified_at: person.emailVerifiedAt,
      created_at: db.now(),
    });
  },

  async setPassword(id: PersonId, passwordHash: string): Promise<void> {
    await db.from("people").where({ id }).update({ password_hash: passwordHash });
  },

  async markVerified(id: PersonId): Promise<void> {
    await db.from("people").where({ id }).whereNull("email_verified_at").update({ email_verified_at: db.now() });
  },

  async slugTaken(slug: string): Promise<boolean> {
    return (await db.from("organizations").where({ slug }).first("id")) !== undefined;
  },

  async insertOrganization(row: { id: OrganizationId; slug: string; name: string; timeZone: string }): Promise<void> {
    await db.insert("organizations", {
      id: row.id,
      slug: row.slug,
      name: row.name,
      unit_system: "inch-pound",
      currency: "USD",
      time_zone: row.timeZone,
      address: JSON.stringify({ line1: "", line2: "", city: "", region: "", postalCode: "" }),
      phone: "",
      license_number: "",
      brand_color: "#1C429C",
      quote_terms: "",
      created_at: db.now(),
    });
  },

  async insertMembership(row: { organizationId: OrganizationId; personId: PersonId; role: Role }): Promise<void> {
    await db.insert("memberships", {
      organization_id: row.organizationId,
      person_id: row.personId,
      role: row.role,
      joined_at: db.now(),
    });
  },

  async addToken(row: {
    hash: string;
    personId: PersonId;
    purpose: "verify" | "reset";
    expiresAt: Date;
  }): Promise<void> {
    await db.insert("email_tokens", {
      token_hash: row.hash,
      person_id: row.personId,
      purpose: row.purpose,
      created_at: db.now(),
      expires_at: row.expiresAt,
    });
  },

  /** Locks the token, marks it used and answers whose it was; null when it is unknown, used or late. */
  async useToken(hash: string, purpose: "verify" | "reset"): Promise<PersonId | null> {
    const row: { person_id: PersonId; expires_at: Date; used_at: Date | null } | undefined = await db
      .from("email_tokens")
      .where({ token_hash: hash, purpose })
      .forUpdate()
      .first("person_id", "expires_at", "used_at");
    if (!row || row.used_at !== null || row.expires_at <= db.now()) return null;
    await db.from("email_tokens").where({ token_hash: hash }).update({ used_at: db.now() });
    return row.person_id;
  },

  async endSessionsOf(personId: PersonId): Promise<void> {
    await db.from("sessions").where({ person_id: personId }).delete();
  },

  /** Locked, so that two people cannot both take it. */
  async lockInvitation(hash: string) {
    const row = (await invitation(db, hash).forUpdate()) as InvitationRow | undefined;
    return row ?? null;
  },

  async findInvitation(hash: string) {
    const row = (await invitation(db, hash)) as InvitationRow | undefined;
    return row ?? null;
  },

  async markAccepted(organizationId: OrganizationId, id: string): Promise<void> {
    await db.from("invitations").where({ organization_id: organizationId, id }).update({ accepted_at: db.now() });
  },

  async membershipsOf(personId: PersonId) {
    const rows: { id: OrganizationId; slug: string; name: string; role: Role }[] = await db
      .from("memberships", "m")
      .join("organizations as o", "o.id", "m.organization_id")
      .where("m.person_id", personId)
      .orderBy("o.name")
      .select({ id: "o.id", slug: "o.slug", name: "o.name", role: "m.role" });
    return rows;
  },

  async isVerified(personId: PersonId): Promise<boolean> {
    const row: { email_verified_at: Date | null } | undefined = await db
      .from("people")
      .where({ id: personId })
      .first("email_verified_at");
    return (row?.email_verified_at ?? null) !== null;
  },
});

interface InvitationRow {
  readonly organizationId: OrganizationId;
  readonly id: string;
  readonly email: string;
  readonly role: Role;
  readonly companyName: string;
  readonly invitedBy: string;
  readonly expiresAt: Date;
  readonly acceptedAt: Date | null;
  readonly revokedAt: Date | null;
  readonly accountId: PersonId | null;
}

const invitation = (db: SystemDb, hash: string) =>
  db
    .from("invitations", "i")
    .join("organizations as o", "o.id", "i.organization_id")
    .join("people as by", "by.id", "i.invited_by")
    .leftJoin("people as account", "account.email", "i.email")
    .where("i.token_hash", hash)
    .first({
      organizationId: "i.organization_id",
      id: "i.id",
      email: "i.email",
      role: "i.role",
      companyName: "o.name",
      invitedBy: "by.name",
      expiresAt: "i.expires_at",
      acceptedAt: "i.accepted_at",
      revokedAt: "i.revoked_at",
      accountId: "account.id",
    });
