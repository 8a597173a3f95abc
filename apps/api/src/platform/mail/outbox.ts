import type { SystemDb } from "../db/system-db.ts";
import type { TenantDb } from "../db/tenant-db.ts";

export interface Mailbox {
  readonly name: string;
  readonly email: string;
}

export interface MailMessage {
  readonly to: Mailbox;
  readonly replyTo?: Mailbox;
  readonly subject: string;
  readonly text: string;
  readonly html: string;
  /** By content hash, read when the mail is sent; ids, not copies. */
  readonly attachments?: readonly {
    readonly fileHash: string;
    readonly fileName: string;
    readonly mediaType: string;
  }[];
}

/**
 * Writes a mail into the outbox, in the transaction of what causes it. The worker sends it after commit, again and again
 * until a server takes it. The key makes a second enqueue harmless.
 */
export async function enqueueMail(
  tx: TenantDb | SystemDb,
  mail: MailMessage & { readonly key: string },
): Promise<string> {
  const { key, ...message } = mail;
  const id = tx.newId("out");
  await tx.enqueue({
    id,
    unique_key: key,
    message: JSON.stringify(message),
    recipient: message.to.email,
    subject: message.subject.slice(0, 300),
    next_attempt_at: tx.now(),
    created_at: tx.now(),
  });
  return id;
}
