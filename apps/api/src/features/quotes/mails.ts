/** The words of the mails about quotes. */
import { formatMoney } from "@cleatwork/calc";
import { letter } from "../../platform/mail/letter.ts";
import type { Mailbox } from "../../platform/mail/outbox.ts";

const day = (date: string): string =>
  new Intl.DateTimeFormat("en-US", { dateStyle: "long", timeZone: "UTC" }).format(
    new Date(`${date.slice(0, 10)}T00:00:00Z`),
  );

export const quoteMail = (facts: {
  recipient: Mailbox;
  by: Mailbox;
  company: { name: string; brandColor: string };
  projectName: string;
  quoteNumber: string;
  revision: number;
  price_minor: number;
  currency: string;
  validUntilOn: string;
  message: string;
  link: string;
}) => ({
  to: facts.recipient,
  replyTo: { name: facts.by.name, email: facts.by.email },
  ...letter({
    subject: `Quote ${facts.quoteNumber}${facts.revision > 1 ? `, revision ${facts.revision}` : ""}: ${facts.projectName}`,
    paragraphs: [
      `Dear ${facts.recipient.name},`,
      ...(facts.message.trim() ? [facts.message.trim()] : []),
      `${facts.company.name} quotes ${formatMoney(facts.price_minor, facts.currency).text} for the ductwork of ${facts.projectName}, valid through ${day(facts.validUntilOn)}. The letter is attached, and the same is on your private page, where you can accept or decline.`,
    ],
    action: { label: "Open the quote", link: facts.link },
    after: [
      `The page is for you alone; please do not pass the link on. Reply to this mail to reach ${facts.by.name}.`,
      `${facts.by.name}\n${facts.company.name}`,
    ],
    color: facts.company.brandColor,
  }),
});

export const acceptedMail = (
  to: Mailbox,
  facts: {
    quoteNumber: string;
    projectName: string;
    name: string;
    title: string;
    poNumber: string;
    price: string | null;
    link: string;
  },
) => ({
  to,
  ...letter({
    subject: `Accepted: ${facts.projectName}, quote ${facts.quoteNumber}`,
    paragraphs: [
      `${facts.name}${facts.title ? `, ${facts.title},` : ""} accepted quote ${facts.quoteNumber} for ${facts.projectName}${facts.price ? ` at ${facts.price}` : ""}.`,
      ...(facts.price && facts.poNumber ? [`Purchase order: ${facts.poNumber}`] : []),
      "The approved takeoff is ready for the shop and the site.",
    ],
    action: { label: "Open the approved takeoff", link: facts.link },
  }),
});

export const receiptMail = (
  to: Mailbox,
  facts: {
    companyName: string;
    brandColor: string;
    quoteNumber: string;
    projectName: string;
    price: string;
    at: string;
    record: string;
    link: string;
  },
) => ({
  to,
  ...letter({
    subject: `Your acceptance of quote ${facts.quoteNumber}: ${facts.projectName}`,
    paragraphs: [
      `Thank you. You accepted quote ${facts.quoteNumber} of ${facts.companyName} for ${facts.projectName} at ${facts.price}, on ${facts.at}.`,
      `What you accepted is kept under record ${facts.record}; the letter is attached.`,
    ],
    action: { label: "Open the quote", link: facts.link },
    color: facts.brandColor,
  }),
});

export const declinedMail = (
  to: Mailbox,
  facts: { quoteNumber: string; projectName: string; name: string; reason: string; link: string },
) => ({
  to,
  ...letter({
    subject: `Declined: ${facts.projectName}, quote ${facts.quoteNumber}`,
    paragraphs: [
      `${facts.name} declined quote ${facts.quoteNumber} for ${facts.projectName}.`,
      `Their words: ${facts.reason}`,
    ],
    action: { label: "Open the project", link: facts.link },
  }),
});
