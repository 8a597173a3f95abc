import type { Me, OrganizationId, PersonId, Role } from "@cleatwork/contracts";
import { recordAudit } from "../../platform/audit.ts";
import type { SystemDb } from "../../platform/db/system-db.ts";
import type { TenantDb } from "../../platform/db/tenant-db.ts";
import { isDuplicate } from "../../platform/db/transaction.ts";
import { problem } from "../../platform/http/problem.ts";
import type { Deps } from "../../platform/http/route.ts";
import { enqueueMail } from "../../platform/mail/outbox.ts";
import { hashOfToken, newToken } from "../../platform/tokens.ts";
import { resetMail, verifyMail } from "./mails.ts";
import { hashPassword, passwordMatches } from "./passwords.ts";
import { peopleRepository } from "./people.repository.ts";
import { expiry, invitationState, slugFrom } from "./people.rules.ts";

/** What a new company starts with is written by the features it belongs to, in the same transaction. */
export type FoundCompany = (tx: TenantDb, deps: Pick<Deps, "clock" | "ids">) => Promise<void>;

const SLUG_TRIES = 50;

export async function signUp(
  deps: Deps,
  request: { companyName: string; name: string; email: string; password: string; timeZone: string },
  foundings: readonly FoundCompany[],
): Promise<PersonId> {
  const passwordHash = await hashPassword(request.password);
  const personId = deps.ids.make("per");
  const organizationId = deps.ids.make("org");
  const db = deps.db.system("a company is founded");
  try {
    await db.transaction(async (tx) => {
      const people = peopleRepository(tx);
      const { email, name } = request;
      await people.insert({ id: personId, email, name, passwordHash, emailVerifiedAt: null });
      await people.insertOrganization({
        id: organizationId,
        slug: await freeSlug(tx, request.companyName),
        name: request.companyName,
        timeZone: request.timeZone,
      });
      await people.insertMembership({ organizationId, personId, role: "owner" });
      const tenant = tx.tenantOf(organizationId);
      for (const found of foundings) await found(tenant, deps);
      await recordAudit(tenant, { by: personId, event: "company.founded", subject: request.companyName, details: {} });
      await sendVerification(tx, deps, { id: personId, name, email });
    });
  } catch (error) {
    if (isDuplicate(error))
      throw problem("email-taken", "Sign in instead, or ask for a new password.", [
        { pointer: "/email", code: "email-taken", message: "an address without an account", value: request.email },
      ]);
    throw error;
  }
  return personId;
}

async function freeSlug(tx: SystemDb, companyName: string): Promise<string> {
  for (let attempt = 1; attempt <= SLUG_TRIES; attempt++) {
    const slug = slugFrom(companyName, attempt);
    if (!(await peopleRepository(tx).slugTaken(slug))) return slug;
  }
  throw problem("not-valid", "Too many companies have this name.", [
    { pointer: "/companyName", code: "name-taken", message: "a more particular name", value: companyName },
  ]);
}

async function sendVerification(
  tx: SystemDb,
  deps: Deps,
  person: { id: PersonId; name: string; email: string },
): Promise<void> {
  const { token, hash } = newToken();
  const people = peopleRepository(tx);
  await people.addToken({ hash, personId: person.id, purpose: "verify", expiresAt: expiry(tx.now(), "verify") });
  const link = `${deps.config.publicUrl}/verify-email?token=${token}`;
  await enqueueMail(tx, { key: `verify:${hash}`, ...verifyMail(person, link) });
}

export const resendVerification = (deps: Deps, person: { id: PersonId; name: string; email: string }) =>
  deps.db.system("a person confirms an address").transaction((tx) => sendVerification(tx, deps, person));

export async function verifyEmail(deps: Deps, token: string): Promise<void> {
  await deps.db.system("a link says who").transaction(async (tx) => {
    const people = peopleRepository(tx);
    const personId = await people.useToken(hashOfToken(token), "verify");
    if (!personId) throw linkNotValid();
    await people.markVerified(personId);
  });
}

export async function signIn(deps: Deps, request: { email: string; password: string }): Promise<PersonId> {
  const person = await peopleRepository(deps.db.system("someone signs in")).findByEmail(request.email);
  if (!(await passwordMatches(person?.passwordHash ?? null, request.password)) || !person)
    throw problem("credentials-wrong", "Check both and try again, or ask for a new password.");
  return person.id;
}

/** The same answer for any address, so that no one can find out who has an account. */
export async function requestPasswordReset(deps: Deps, email: string): Promise<void> {
  const person = await peopleRepository(deps.db.system("someone lost a password")).findByEmail(email);
  if (!person) return;
  await deps.db.system("someone lost a password").transaction(async (tx) => {
    const { token, hash } = newToken();
    await peopleRepository(tx).addToken({
      hash,
      personId: person.id,
      purpose: "reset",
      expiresAt: expiry(tx.now(), "reset"),
    });
    await enqueueMail(tx, {
      key: `reset:${hash}`,
      ...resetMail(person, `${deps.config.publicUrl}/reset-password?token=${token}`),
    });
  });
}

/** The person proved to hold the mailbox, so the address is confirmed too; every session ends. */
export async function resetPassword(deps: Deps, request: { token: string; password: string }): Promise<void> {
  const passwordHash = await hashPassword(request.password);
  await deps.db.system("a link says who").transaction(async (tx) => {
    const people = peopleRepository(tx);
    const personId = await people.useToken(hashOfToken(request.token), "reset");
    if (!personId) throw linkNotValid();
    await people.setPassword(personId, passwordHash);
    await people.markVerified(personId);
    await people.endSessionsOf(personId);
  });
}

export async function getInvitation(deps: Deps, token: string) {
  const invitation = await peopleRepository(deps.db.system("a link says who")).findInvitation(hashOfToken(token));
  if (!invitation || invitationState(invitation, deps.clock.now()) !== "open") throw linkNotValid();
  const { companyName, email, role, invitedBy, accountId } = invitation;
  return { companyName, email, role, invitedBy, hasAccount: accountId !== null };
}

export async function acceptInvitation(
  deps: Deps,
  token: string,
  request: { name?: string | undefined; password: string },
): Promise<PersonId> {
  const system = deps.db.system("an invited person has no account yet");
  const before = await getInvitation(deps, token);
  const account = await peopleRepository(system).findByEmail(before.email);
  if (account && !(await passwordMatches(account.passwordHash, request.password)))
    throw problem("credentials-wrong", "There is an account with this address: use its password.");
  if (!account) refuseNewcomer(request);
  const passwordHash = account ? null : await hashPassword(request.password);
  const personId = account?.id ?? deps.ids.make("per");

  await system.transaction(async (tx) => {
    const people = peopleRepository(tx);
    const invitation = await people.lockInvitation(hashOfToken(token));
    if (!invitation || invitationState(invitation, tx.now()) !== "open") throw linkNotValid();
    const { organizationId, email, role } = invitation;
    if (passwordHash !== null)
      await people.insert({
        id: personId,
        email,
        name: request.name ?? email,
        passwordHash,
        emailVerifiedAt: tx.now(),
      });
    else await people.markVerified(personId);
    await joinCompany(tx, { organizationId, personId, role });
    await people.markAccepted(organizationId, invitation.id);
    await recordAudit(tx.tenantOf(organizationId), {
      by: personId,
      event: "person.joined",
      subject: email,
      details: { role },
    });
  });
  return personId;
}

function refuseNewcomer(request: { name?: string | undefined; password: string }): void {
  const errors = [
    ...(request.name ? [] : [{ pointer: "/name", code: "name-missing", message: "your name" }]),
    ...(request.password.length >= 12
      ? []
      : [{ pointer: "/password", code: "too-small", message: "12 characters or more" }]),
  ];
  if (errors.length > 0) throw problem("not-valid", "Look at the fields named below.", errors);
}

async function joinCompany(
  tx: SystemDb,
  membership: { organizationId: OrganizationId; personId: PersonId; role: Role },
): Promise<void> {
  try {
    await peopleRepository(tx).insertMembership(membership);
  } catch (error) {
    if (!isDuplicate(error)) throw error;
  }
}

export async function meOf(deps: Deps, personId: PersonId): Promise<Me> {
  const db = deps.db.system("a person asks who they are");
  const person: { id: PersonId; name: string; email: string } = await db
    .from("people")
    .where({ id: personId })
    .first("id", "name", "email");
  const people = peopleRepository(db);
  const memberships = await people.membershipsOf(personId);
  return {
    person: { ...person, emailVerified: await people.isVerified(personId) },
    memberships: memberships.map(({ role, ...company }) => ({ company, role })) as Me["memberships"],
  };
}

const linkNotValid = () => problem("link-not-valid", "It was used, has expired or was taken back. Ask for a new one.");
