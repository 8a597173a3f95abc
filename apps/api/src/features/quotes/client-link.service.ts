/** What a client does behind a private link. Nothing here reads a cost. */
import { formatMoney } from "@cleatwork/calc";
import type { ClientQuote } from "@cleatwork/contracts";
import { recordAudit } from "../../platform/audit.ts";
import type { TenantDb } from "../../platform/db/tenant-db.ts";
import { problem } from "../../platform/http/problem.ts";
import type { Deps } from "../../platform/http/route.ts";
import { enqueueMail } from "../../platform/mail/outbox.ts";
import { hashOfToken } from "../../platform/tokens.ts";
import { approveTakeoff } from "../field/index.ts";
import { moveProject } from "../projects/index.ts";
import { findLink, linksRepository, type OpenedLink } from "./links.repository.ts";
import { acceptedMail, declinedMail, receiptMail } from "./mails.ts";
import { recordOf } from "./quote-pdf.ts";
import { consentText, mayRespond, REASONS, stateAt } from "./quotes.rules.ts";
import { pdfName } from "./quotes.service.ts";
import { clientQuoteFrom, type QuoteSnapshot } from "./snapshot.ts";

interface From {
  readonly ip: string;
  readonly userAgent: string;
}

export async function readClientQuote(deps: Deps, token: string): Promise<ClientQuote> {
  const link = await openLink(deps, token);
  if (!link.openedAt) await linksRepository(deps.db.tenant(link.organizationId)).markOpened(link.linkId);
  return clientQuoteOf(link, deps.clock.now());
}

export async function clientQuotePdf(deps: Deps, token: string) {
  const link = await openLink(deps, token);
  const { quoteNumber, revision } = snapshotIn(link);
  return {
    bytes: await deps.files.get(link.organizationId, link.pdfHash),
    mediaType: "application/pdf",
    fileName: pdfName(quoteNumber, revision),
    inline: true,
  };
}

export async function acceptQuote(
  deps: Deps,
  token: string,
  answer: { name: string; title: string; poNumber: string; snapshotHash: string },
  from: From,
): Promise<ClientQuote> {
  const link = await openLink(deps, token);
  const snapshot = snapshotIn(link);
  await deps.db.tenant(link.organizationId).transaction(async (tx) => {
    await lockOpen(tx, link, answer.snapshotHash);
    const links = linksRepository(tx);
    await links.insertResponse({
      ...answer,
      ...from,
      kind: "accepted",
      reason: "",
      revisionId: link.revisionId,
      linkId: link.linkId,
      consent: consentText(snapshot.client.name, snapshot.company.name),
    });
    await links.setState(link.revisionId, "accepted");
    await moveProject(tx, link.projectId, "won");
    await approveTakeoff(tx, { ...link, snapshot });
    await recordAudit(tx, {
      by: null,
      event: "quote.accepted",
      subject: snapshot.quoteNumber,
      details: {
        revision: snapshot.revision,
        name: answer.name,
        title: answer.title,
        poNumber: answer.poNumber,
        snapshotHash: link.snapshotHash,
        ip: from.ip,
      },
    });
    await tellOfAcceptance(tx, deps, link, snapshot, answer, token);
  });
  return clientQuoteOf(await openLink(deps, token), deps.clock.now());
}

export async function declineQuote(
  deps: Deps,
  token: string,
  answer: { name: string; reason: string },
  from: From,
): Promise<ClientQuote> {
  const link = await openLink(deps, token);
  const snapshot = snapshotIn(link);
  await deps.db.tenant(link.organizationId).transaction(async (tx) => {
    await lockOpen(tx, link, null);
    const links = linksRepository(tx);
    await links.insertResponse({
      ...answer,
      ...from,
      kind: "declined",
      title: "",
      poNumber: "",
      consent: "",
      snapshotHash: link.snapshotHash,
      revisionId: link.revisionId,
      linkId: link.linkId,
    });
    await links.setState(link.revisionId, "declined");
    await recordAudit(tx, {
      by: null,
      event: "quote.declined",
      subject: snapshot.quoteNumber,
      details: { revision: snapshot.revision, name: answer.name, reason: answer.reason, ip: from.ip },
    });
    for (const person of await links.peopleToTell())
      if (person.role === "owner" || person.id === link.issuedBy)
        await enqueueMail(tx, {
          key: `declined:${link.revisionId}:${person.id}`,
          ...declinedMail(person, {
            quoteNumber: snapshot.quoteNumber,
            projectName: snapshot.project.name,
            ...answer,
            link: `${deps.config.publicUrl}/c/${link.slug}/projects/${link.projectId}/quote`,
          }),
        });
  });
  return clientQuoteOf(await openLink(deps, token), deps.clock.now());
}

/** One statement; unknown, revoked and expired links tell nothing of whose they were. */
async function openLink(deps: Deps, token: string): Promise<OpenedLink> {
  const link = await findLink(deps.db.system("a private link says which company"), hashOfToken(token));
  if (!link) throw problem("not-found", "There is no quote at this address. Check that the whole link was copied.");
  if (link.revokedAt) throw problem("link-not-valid", "The sender has taken this link back.");
  if (link.expiresAt <= deps.clock.now()) throw problem("link-not-valid", "This link has expired.");
  return link;
}

/** Of two answers at the same moment the second finds the revision answered. */
async function lockOpen(tx: TenantDb, link: OpenedLink, seenHash: string | null): Promise<void> {
  const links = linksRepository(tx);
  const state = await links.lockState(link.revisionId);
  if (await links.isRevoked(link.linkId)) throw problem("link-not-valid", "The sender has taken this link back.");
  const decision = mayRespond({ ...link, state }, seenHash, link.zone, tx.now());
  if (!decision.allowed)
    throw problem("wrong-state", REASONS[decision.reason], [
      { pointer: "", code: decision.reason, message: REASONS[decision.reason] },
    ]);
}

async function tellOfAcceptance(
  tx: TenantDb,
  deps: Deps,
  link: OpenedLink,
  snapshot: QuoteSnapshot,
  answer: { name: string; title: string; poNumber: string },
  token: string,
): Promise<void> {
  const { quoteNumber, project, estimate } = snapshot;
  const price = formatMoney(estimate.price_minor, estimate.currency).text;
  for (const person of await linksRepository(tx).peopleToTell()) {
    const field = person.role === "foreman";
    if (!field && person.role !== "owner" && person.id !== link.issuedBy) continue;
    await enqueueMail(tx, {
      key: `accepted:${link.revisionId}:${person.id}`,
      // A foreman is told that it is sold, not for how much.
      ...acceptedMail(person, {
        quoteNumber,
        projectName: project.name,
        ...answer,
        price: field ? null : price,
        link: `${deps.config.publicUrl}/c/${link.slug}/field/${link.projectId}`,
      }),
    });
  }
  await enqueueMail(tx, {
    key: `receipt:${link.revisionId}`,
    ...receiptMail(link.recipient, {
      companyName: snapshot.company.name,
      brandColor: snapshot.company.brandColor,
      quoteNumber,
      projectName: project.name,
      price,
      at: new Intl.DateTimeFormat("en-US", { dateStyle: "long", timeStyle: "short", timeZone: link.zone }).format(
        tx.now(),
      ),
      record: recordOf(link.snapshotHash),
      link: `${deps.config.publicUrl}/q/${token}`,
    }),
    attachments: [
      { fileHash: link.pdfHash, fileName: pdfName(quoteNumber, snapshot.revision), mediaType: "application/pdf" },
    ],
  });
}

const snapshotIn = (link: OpenedLink): QuoteSnapshot => JSON.parse(link.snapshot) as QuoteSnapshot;

const clientQuoteOf = (link: OpenedLink, now: Date): ClientQuote =>
  clientQuoteFrom(snapshotIn(link), {
    recipientName: link.recipient.name,
    state: stateAt(link, link.zone, now),
    snapshotHash: link.snapshotHash,
    response: link.response && { ...link.response, at: link.response.at.toISOString() },
  });
