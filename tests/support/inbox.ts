/** Reads the mail catcher as a person reads an inbox. */
export interface CaughtMail {
  readonly ID: string;
  readonly To: readonly { readonly Mailbox: string; readonly Domain: string }[];
  readonly Content: { readonly Headers: Readonly<Record<string, readonly string[]>>; readonly Body: string };
  readonly Raw: { readonly Data: string };
}

/** Mails to an address, newest first. */
async function mailsTo(mailUrl: string, address: string): Promise<readonly CaughtMail[]> {
  const response = await fetch(`${mailUrl}/api/v2/search?kind=to&query=${encodeURIComponent(address)}&limit=50`);
  return ((await response.json()) as { items: readonly CaughtMail[] }).items;
}

/** To whom the newest mail went whose subject begins so. */
export async function recipientOf(mailUrl: string, subject: string): Promise<string> {
  const response = await fetch(`${mailUrl}/api/v2/search?kind=containing&query=${encodeURIComponent(subject)}`);
  const { items } = (await response.json()) as { items: readonly CaughtMail[] };
  const to = items.find((mail) => mail.Content.Headers["Subject"]?.[0]?.startsWith(subject))?.To[0];
  if (!to) throw new Error(`no mail begins with ${subject}`);
  return `${to.Mailbox}@${to.Domain}`;
}

/** Waits for a mail to an address whose plain text holds a link to this place; answers the link. */
export async function linkInMail(
  mailUrl: string,
  address: string,
  place: "/q/" | "/verify-email" | "/invitations/",
): Promise<string> {
  for (let tries = 0; tries < 100; tries++) {
    for (const mail of await mailsTo(mailUrl, address)) {
      const text = mail.Raw.Data.replaceAll(/=\r?\n/g, "").replaceAll("=3D", "=");
      const link = /https?:\/\/[^\s"<>]+/g;
      for (const [found] of text.matchAll(link)) if (found.includes(place)) return found;
    }
    await new Promise((resolve) => setTimeout(resolve, 200));
  }
  throw new Error(`no mail to ${address} with a link to ${place}`);
}
