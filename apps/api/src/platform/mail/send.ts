import type { Transporter } from "nodemailer";
import type { Deps } from "../http/route.ts";
import type { ClaimedMail, outboxRepository } from "./outbox.repository.ts";
import { nextAttempt, verdictOf } from "./retry.rules.ts";

export type Transport = Pick<Transporter, "sendMail" | "close">;

interface SendDeps extends Pick<Deps, "clock" | "files" | "log" | "config"> {
  readonly outbox: ReturnType<typeof outboxRepository>;
  readonly transport: Transport;
}

/** Hands one mail to the server. Its Message-ID is made of its own id, so that a second delivery is known as the same. */
export async function sendMail(mail: ClaimedMail, deps: SendDeps): Promise<void> {
  const { outbox, log } = deps;
  try {
    const attachments = await attachmentsOf(mail, deps);
    const { to, replyTo, subject, text, html } = mail.message;
    const info = (await deps.transport.sendMail({
      messageId: `<${mail.id}@${new URL(deps.config.publicUrl).hostname}>`,
      to: { name: to.name, address: to.email },
      ...(replyTo ? { replyTo: { name: replyTo.name, address: replyTo.email } } : {}),
      subject,
      text,
      html,
      attachments,
    })) as { rejected?: readonly unknown[] };
    if (info.rejected && info.rejected.length > 0) {
      await outbox.giveUp(mail.id, "refused", "The mail server refused the address.");
      return;
    }
    await outbox.markSent(mail.id);
    log.info({ mailId: mail.id }, "mail sent");
  } catch (error) {
    const words = error instanceof Error ? error.message : String(error);
    const verdict = verdictOf(error, mail.attempts);
    log.warn({ mailId: mail.id, attempts: mail.attempts, verdict, reason: words }, "mail not sent");
    if (verdict === "retry")
      await outbox.retryAt(mail.id, nextAttempt(deps.clock.now(), mail.attempts, Math.random()), words);
    else await outbox.giveUp(mail.id, verdict, words);
  }
}

async function attachmentsOf(mail: ClaimedMail, { files }: SendDeps) {
  const { organizationId } = mail;
  if (!mail.message.attachments || organizationId === null) return [];
  return Promise.all(
    mail.message.attachments.map(async ({ fileHash, fileName, mediaType }) => ({
      filename: fileName,
      content: await files.get(organizationId, fileHash),
      contentType: mediaType,
    })),
  );
}
