import type { peopleEndpoints } from "@cleatwork/contracts";
import { writeDefaultPricing } from "../pricing/index.ts";
import { writeDefaultSpec } from "../specs/index.ts";
import type { Handlers } from "../../platform/http/route.ts";
import { membersRepository } from "./members.repository.ts";
import { changeRole, invitePerson, removePerson, revokeInvitation } from "./members.service.ts";
import {
  acceptInvitation,
  getInvitation,
  meOf,
  requestPasswordReset,
  resendVerification,
  resetPassword,
  signIn,
  signUp,
  verifyEmail,
} from "./people.service.ts";

export const peopleHandlers = {
  signUp: async ({ body, deps, session }) => {
    const personId = await signUp(deps, body, [
      (tx, { ids, clock }) => writeDefaultSpec(tx, ids.make("spc"), clock.now()),
      (tx) => writeDefaultPricing(tx),
    ]);
    await session.start(personId);
    return meOf(deps, personId);
  },
  signIn: async ({ body, deps, session }) => {
    const personId = await signIn(deps, body);
    await session.start(personId);
    return meOf(deps, personId);
  },
  verifyEmail: ({ body, deps }) => verifyEmail(deps, body.token),
  requestPasswordReset: async ({ body, deps }) => {
    await requestPasswordReset(deps, body.email);
    return {};
  },
  resetPassword: ({ body, deps }) => resetPassword(deps, body),
  getInvitation: ({ params, deps }) => getInvitation(deps, params.token),
  acceptInvitation: async ({ params, body, deps, session }) => {
    const personId = await acceptInvitation(deps, params.token, body);
    await session.start(personId);
    return meOf(deps, personId);
  },
  // Read with the session: who asks is known already, so this costs one round trip.
  getMe: ({ person, memberships }) =>
    Promise.resolve({
      person,
      memberships: memberships.map(({ organizationId, slug, name, role }) => ({
        company: { id: organizationId, slug, name },
        role,
      })),
    }),
  signOut: ({ session }) => session.end(),
  resendVerification: async ({ person, deps }) => {
    if (!person.emailVerified) await resendVerification(deps, person);
    return {};
  },
  listPeople: ({ tenant }) => membersRepository(tenant).listPeopleAndInvitations(),
  invitePerson: ({ tenant, body, person, company, deps }) => invitePerson(tenant, body, person, company.name, deps),
  revokeInvitation: ({ tenant, params, person }) => revokeInvitation(tenant, params.invitationId, person),
  changeRole: ({ tenant, params, body, person }) => changeRole(tenant, params.personId, body.role, person),
  removePerson: ({ tenant, params, person }) => removePerson(tenant, params.personId, person),
} satisfies Handlers<typeof peopleEndpoints>;
