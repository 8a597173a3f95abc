import type { InvitationId, PersonId, Role } from "@cleatwork/contracts";
import { recordAudit } from "../../platform/audit.ts";
import type { TenantDb } from "../../platform/db/tenant-db.ts";
import { problem } from "../../platform/http/problem.ts";
import type { Deps } from "../../platform/http/route.ts";
import { enqueueMail } from "../../platform/mail/outbox.ts";
import { newToken } from "../../platform/tokens.ts";
import { invitationMail } from "./mails.ts";
import { membersRepository } from "./members.repository.ts";
import { expiry, mayStopBeing } from "./people.rules.ts";

interface By {
  readonly id: PersonId;
  readonly name: string;
}

export async function invitePerson(
  tenant: TenantDb,
  request: { email: string; role: Role },
  by: By,
  companyName: string,
  deps: Deps,
) {
  const { token, hash } = newToken();
  const id = deps.ids.make("inv");
  return tenant.transaction(async (tx) => {
    const members = membersRepository(tx);
    if (await members.isMember(request.email))
      throw problem("wrong-state", "This person belongs to the company already.", [
        { pointer: "/email", code: "member-already", message: "someone who is not a member", value: request.email },
      ]);
    await members.revokeOpenTo(request.email);
    const now = tx.now();
    const expiresAt = expiry(now, "invitation");
    await members.insertInvitation({ id, ...request, tokenHash: hash, by: by.id, expiresAt });
    const link = `${deps.config.publicUrl}/invitations/${token}`;
    await enqueueMail(tx, {
      key: `invitation:${id}`,
      ...invitationMail({ ...request, companyName, invitedBy: by.name }, link),
    });
    await recordAudit(tx, {
      by: by.id,
      event: "person.invited",
      subject: request.email,
      details: { role: request.role },
    });
    return { id, ...request, invitedBy: by.name, createdAt: now.toISOString(), expiresAt: expiresAt.toISOString() };
  });
}

export async function revokeInvitation(tenant: TenantDb, id: InvitationId, by: By): Promise<void> {
  await tenant.transaction(async (tx) => {
    if (!(await membersRepository(tx).revoke(id))) throw problem("not-found", "There is no such open invitation.");
    await recordAudit(tx, { by: by.id, event: "invitation.revoked", subject: id, details: {} });
  });
}

export async function changeRole(tenant: TenantDb, personId: PersonId, role: Role, by: By) {
  return tenant.transaction(async (tx) => {
    const members = membersRepository(tx);
    const before = await lockMember(tx, personId, role === "owner" ? null : "an owner must remain");
    await members.setRole(personId, role);
    await recordAudit(tx, {
      by: by.id,
      event: "role.changed",
      subject: before.email,
      details: { old: before.role, new: role },
    });
    return { ...before, role };
  });
}

export async function removePerson(tenant: TenantDb, personId: PersonId, by: By): Promise<void> {
  await tenant.transaction(async (tx) => {
    const before = await lockMember(tx, personId, "an owner must remain");
    await membersRepository(tx).remove(personId);
    await recordAudit(tx, {
      by: by.id,
      event: "person.removed",
      subject: before.email,
      details: { role: before.role },
    });
  });
}

async function lockMember(tx: TenantDb, personId: PersonId, ownersMust: string | null) {
  const members = membersRepository(tx);
  const owners = await members.lockOwners();
  const member = await members.find(personId);
  if (!member) throw problem("not-found", "There is no such person in this company.");
  if (ownersMust !== null && !mayStopBeing(member.role, owners).allowed)
    throw problem("wrong-state", "This is the last owner. Make someone else an owner first.");
  return member;
}
