/** The words of the mails about people. Plain text and HTML say the same. */
import type { Role } from "@cleatwork/contracts";
import { letter } from "../../platform/mail/letter.ts";

export const verifyMail = (to: { name: string; email: string }, link: string) => ({
  to,
  ...letter({
    subject: "Confirm your e-mail address",
    paragraphs: [
      `Hello ${to.name},`,
      "Please confirm that this address is yours. You need it before you can send a quote.",
    ],
    action: { label: "Confirm this address", link },
    after: ["The link works for seven days. If you did not sign up for Cleatwork, you need do nothing."],
  }),
});

export const resetMail = (to: { name: string; email: string }, link: string) => ({
  to,
  ...letter({
    subject: "Set a new password",
    paragraphs: [`Hello ${to.name},`, "Someone, most likely you, asked to set a new password for your account."],
    action: { label: "Set a new password", link },
    after: ["The link works once, for two hours. If it was not you, your password stays as it is."],
  }),
});

export const invitationMail = (
  invitation: { email: string; role: Role; companyName: string; invitedBy: string },
  link: string,
) => ({
  to: { name: invitation.email, email: invitation.email },
  ...letter({
    subject: `${invitation.invitedBy} invites you to ${invitation.companyName}`,
    paragraphs: [
      `${invitation.invitedBy} invites you to work with ${invitation.companyName} in Cleatwork, as ${invitation.role}.`,
    ],
    action: { label: `Join ${invitation.companyName}`, link },
    after: ["The link works for two weeks and is meant for you alone."],
  }),
});
