import { z } from "zod";
import { email, instant, name, newPassword, timeZone } from "./common.ts";
import { endpoint, member, open, signedIn } from "./endpoint.ts";
import { companySlug, invitationId, organizationId, personId } from "./ids.ts";
import { roleSchema } from "./permissions.ts";

export const meResponse = z.object({
  person: z.object({ id: personId, name: z.string(), email: z.string(), emailVerified: z.boolean() }),
  memberships: z.array(
    z.object({ company: z.object({ id: organizationId, slug: companySlug, name: z.string() }), role: roleSchema }),
  ),
});
export type Me = z.infer<typeof meResponse>;

const password = z.string().min(1, "your password").max(200);
const token = z.string().regex(/^[A-Za-z0-9_-]{43}$/, "the link from the e-mail");

export const signUpRequest = z.strictObject({ companyName: name, name, email, password: newPassword, timeZone });
export const signInRequest = z.strictObject({ email, password });
export const emailRequest = z.strictObject({ email });
export const tokenRequest = z.strictObject({ token });
export const resetPasswordRequest = z.strictObject({ token, password: newPassword });
/** A newcomer gives a name and a password; a person who has an account gives its password. */
export const acceptInvitationRequest = z.strictObject({ name: name.optional(), password: newPassword.or(password) });

export const invitationResponse = z.object({
  companyName: z.string(),
  email: z.string(),
  role: roleSchema,
  invitedBy: z.string(),
  hasAccount: z.boolean(),
});

export const memberItem = z.object({
  id: personId,
  name: z.string(),
  email: z.string(),
  role: roleSchema,
  joinedAt: instant,
  lastSeenAt: instant.nullable(),
});
export const invitationItem = z.object({
  id: invitationId,
  email: z.string(),
  role: roleSchema,
  invitedBy: z.string(),
  createdAt: instant,
  expiresAt: instant,
});
export const peopleResponse = z.object({ people: z.array(memberItem), invitations: z.array(invitationItem) });
export const inviteRequest = z.strictObject({ email, role: roleSchema });
export const changeRoleRequest = z.strictObject({ role: roleSchema });

export const peopleEndpoints = {
  signUp: endpoint({
    method: "post",
    path: "/open/sign-up",
    access: open("a newcomer has no account yet"),
    summary: "Create a company and its owner, and sign the owner in",
    body: signUpRequest,
    response: meResponse,
    status: 201,
  }),
  signIn: endpoint({
    method: "post",
    path: "/open/sign-in",
    access: open("signing in"),
    summary: "Sign in with e-mail and password",
    body: signInRequest,
    response: meResponse,
  }),
  verifyEmail: endpoint({
    method: "post",
    path: "/open/verify-email",
    access: open("the token from the mail says who"),
    summary: "Confirm an e-mail address",
    body: tokenRequest,
  }),
  requestPasswordReset: endpoint({
    method: "post",
    path: "/open/password-reset/request",
    access: open("the person cannot sign in"),
    summary: "Mail a link to set a new password; answers the same for any address",
    body: emailRequest,
    status: 202,
    response: z.object({}),
  }),
  resetPassword: endpoint({
    method: "post",
    path: "/open/password-reset",
    access: open("the token from the mail says who"),
    summary: "Set a new password and end every session",
    body: resetPasswordRequest,
  }),
  getInvitation: endpoint({
    method: "get",
    path: "/open/invitations/:token",
    access: open("the invited person has no account yet"),
    summary: "Read an invitation",
    response: invitationResponse,
  }),
  acceptInvitation: endpoint({
    method: "post",
    path: "/open/invitations/:token/accept",
    access: open("the invited person has no account yet"),
    summary: "Join the company that invited",
    body: acceptInvitationRequest,
    response: meResponse,
  }),
  getMe: endpoint({
    method: "get",
    path: "/me",
    access: signedIn,
    summary: "Who is signed in, and in which companies",
    response: meResponse,
  }),
  signOut: endpoint({ method: "post", path: "/me/sign-out", access: signedIn, summary: "End this session" }),
  resendVerification: endpoint({
    method: "post",
    path: "/me/verification",
    access: signedIn,
    summary: "Mail the confirmation link again",
    status: 202,
    response: z.object({}),
  }),
  listPeople: endpoint({
    method: "get",
    path: "/companies/:company/people",
    access: member("people.read"),
    summary: "The people of the company and open invitations",
    response: peopleResponse,
  }),
  invitePerson: endpoint({
    method: "post",
    path: "/companies/:company/invitations",
    access: member("people.manage"),
    summary: "Invite by e-mail with a role",
    body: inviteRequest,
    response: invitationItem,
    status: 201,
    guards: ["idempotency-key"],
  }),
  revokeInvitation: endpoint({
    method: "delete",
    path: "/companies/:company/invitations/:invitationId",
    access: member("people.manage"),
    summary: "Take an invitation back",
  }),
  changeRole: endpoint({
    method: "patch",
    path: "/companies/:company/people/:personId",
    access: member("people.manage"),
    summary: "Change a person's role; the last owner stays owner",
    body: changeRoleRequest,
    response: memberItem,
  }),
  removePerson: endpoint({
    method: "delete",
    path: "/companies/:company/people/:personId",
    access: member("people.manage"),
    summary: "End a membership; the person's work stays",
  }),
};
