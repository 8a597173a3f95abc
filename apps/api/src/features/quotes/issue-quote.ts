import type { ProjectId, Quote, QuoteId } from "@cleatwork/contracts";
import { recordAudit } from "../../platform/audit.ts";
import type { TenantDb } from "../../platform/db/tenant-db.ts";
import { problem } from "../../platform/http/problem.ts";
import type { Deps, Person } from "../../platform/http/route.ts";
import { enqueueMail } from "../../platform/mail/outbox.ts";
import { newToken } from "../../platform/tokens.ts";
import { moveProject } from "../projects/index.ts";
import type { ProjectNumbers } from "../pricing/index.ts";
import { quoteMail } from "./mails.ts";
import { quotesRepository } from "./quotes.repository.ts";
import { linkExpiry, mayIssue, type MayIssue } from "./quotes.rules.ts";
import { getQuote, lockQuote, namesOf, pdfName, pdfOf, readWithNumbers, snapshotOf } from "./quotes.service.ts";
import { freeze } from "./snapshot.ts";

interface IssueRequest {
  readonly recipients: readonly { readonly name: string; readonly email: string }[];
  readonly message: string;
  readonly layoutSequence: number;
  readonly price_minor: number;
}

/**
 * Computes on the server from what is stored, freezes it with its hash, renders the PDF and writes one mail for each
 * recipient. The PDF is written before the transaction and the mail sent after it, so no network call stands inside.
 */
export async function issueQuote(
  tenant: TenantDb,
  at: { projectId: ProjectId; quoteId: QuoteId },
  request: IssueRequest,
  facts: { by: Person; version: number; deps: Deps },
): Promise<Quote> {
  const { by, deps } = facts;
  const read = await readWithNumbers(tenant, at, deps);
  const { company, quote, numbers } = read;
  refuse(mayIssue({ emailVerified: by.emailVerified, seen: request, now: factsOf(numbers) }));

  const issuedAt = deps.clock.now();
  const revision = (quote.revisions[0]?.number ?? 0) + 1;
  const snapshot = snapshotOf({ ...read, by, revision, issuedAt });
  if (!snapshot) throw problem("cannot-be-computed", "There is no price yet.");
  const frozen = freeze(snapshot);
  const recipients = request.recipients.map(({ name }) => name);
  const pdf = await pdfOf(snapshot, { hash: frozen.hash, recipients, isDraft: false });
  const { hash: pdfHash } = await deps.files.put(tenant.organizationId, pdf);

  return tenant.transaction(async (tx) => {
    const quotes = quotesRepository(tx);
    const locked = await lockQuote(tx, at, facts.version);
    if (await quotes.isSold(at.quoteId))
      throw problem("wrong-state", "This quote has been accepted; start another for a change.");
    if ((await quotes.lastRevision(at.quoteId)) !== revision - 1)
      throw problem("stale", "Someone else has issued this quote meanwhile.");
    await quotes.supersede(at.quoteId);
    const revisionId = deps.ids.make("rev");
    await quotes.insertRevision({
      id: revisionId,
      ...at,
      number: revision,
      by: by.id,
      issuedAt,
      validUntilOn: snapshot.validUntilOn,
      price_minor: snapshot.estimate.price_minor,
      currency: snapshot.estimate.currency,
      snapshot: frozen.text,
      snapshotHash: frozen.hash,
      pdfHash,
    });
    for (const recipient of request.recipients) {
      const { token, hash } = newToken();
      const linkId = deps.ids.make("lnk");
      const mailId = await enqueueMail(tx, {
        key: `quote-link:${linkId}`,
        ...quoteMail({
          recipient,
          by,
          company,
          projectName: numbers.project.name,
          quoteNumber: quote.number,
          revision,
          price_minor: snapshot.estimate.price_minor,
          currency: snapshot.estimate.currency,
          validUntilOn: snapshot.validUntilOn,
          message: request.message,
          link: `${deps.config.publicUrl}/q/${token}`,
        }),
        attachments: [{ fileHash: pdfHash, fileName: pdfName(quote.number, revision), mediaType: "application/pdf" }],
      });
      await quotes.insertLink({
        id: linkId,
        quoteId: at.quoteId,
        revisionId,
        ...recipient,
        tokenHash: hash,
        mailId,
        expiresAt: linkExpiry(snapshot.validUntilOn),
      });
    }
    await quotes.bump(at.quoteId, locked.version + 1);
    await moveProject(tx, at.projectId, "quoted");
    await recordAudit(tx, {
      by: by.id,
      event: "quote.issued",
      subject: quote.number,
      details: {
        revision,
        price_minor: snapshot.estimate.price_minor,
        snapshotHash: frozen.hash,
        recipients: request.recipients,
      },
    });
    return getQuote(tx, at);
  });
}

const factsOf = (numbers: ProjectNumbers) => ({
  layoutSequence: numbers.sequence,
  price_minor: numbers.estimate?.price_minor ?? null,
  problems: namesOf(numbers),
  stops: [
    ...(numbers.estimate?.warnings ?? []).filter(({ severity }) => severity === "stop").map(({ message }) => message),
    ...numbers.takeoffs.flatMap(({ findings }) =>
      findings.filter(({ severity }) => severity === "stop").map(({ message }) => message),
    ),
  ],
});

function refuse(decision: MayIssue): void {
  if (decision.allowed) return;
  const code =
    decision.reason === "cannot-be-computed" || decision.reason === "price-missing"
      ? "cannot-be-computed"
      : "wrong-state";
  throw problem(code, decision.detail, [{ pointer: "", code: decision.reason, message: decision.detail }]);
}
