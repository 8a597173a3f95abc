/** Reads the mail catcher's inbox as a person would: wait for a mail, find the private link in it. */
import { setTimeout as pause } from "node:timers/promises";

interface CaughtMail {
  Content: { Headers: Record<string, string[]>; Body: string };
  Created: string;
}

const PATIENCE_MS = 30_000;

/** The token of the newest mail to an address whose link goes to `path`, such as "/invitations/". */
export async function tokenFromMail(mailApiUrl: string, to: string, path: RegExp): Promise<string> {
  const search = new URL("/api/v2/search", mailApiUrl);
  search.search = new URLSearchParams({ kind: "to", query: to }).toString();
  const link = new RegExp(`${path.source}([A-Za-z0-9_-]{43})(?![A-Za-z0-9_-])`);
  const deadline = Date.now() + PATIENCE_MS;
  for (;;) {
    const response = await fetch(search);
    const { items } = (await response.json()) as { items: CaughtMail[] };
    const newestFirst = items.toSorted((a, b) => b.Created.localeCompare(a.Created));
    for (const mail of newestFirst) {
      const token = link.exec(readable(mail.Content.Body))?.[1];
      if (token) return token;
    }
    if (Date.now() > deadline) throw new Error(`no mail to ${to} with a link to ${path.source} within 30 s`);
    await pause(200);
  }
}

/** Undoes quoted-printable and any base64 text part, well enough to find a link. */
function readable(body: string): string {
  const plain = body
    .replace(/=\r?\n/g, "")
    .replace(/=([0-9A-F]{2})/g, (_, hex: string) => String.fromCharCode(parseInt(hex, 16)));
  const decoded = [...body.matchAll(/\r?\n\r?\n((?:[A-Za-z0-9+/=]{20,76}\r?\n)+)/g)].map((match) =>
    Buffer.from(match[1] ?? "", "base64").toString("utf8"),
  );
  return [plain, ...decoded].join("\n");
}
