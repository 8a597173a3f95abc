import type {
  Address,
  Company,
  ProjectId,
  Quote,
  QuoteDraft,
  QuoteId,
  QuoteLinkId,
  RevisionId,
} from "@cleatwork/contracts";
import { recordAudit } from "../../platform/audit.ts";
import type { TenantDb } from "../../platform/db/tenant-db.ts";
import { problem } from "../../platform/http/problem.ts";
import type { Deps, Person } from "../../platform/http/route.ts";
import { clientAddressQuestion } from "../clients/index.ts";
import { computeProject, numbersFrom, projectQuestions, type ProjectNumbers } from "../pricing/index.ts";
import { firstDraft } from "./draft.ts";
import { quotePdf } from "./quote-pdf.ts";
import { quotesQuestion, quotesRepository } from "./quotes.repository.ts";
import { dayIn, NEXT_STATES, validUntil } from "./quotes.rules.ts";
import { clientQuoteFrom, type QuoteSnapshot } from "./snapshot.ts";

export async function listQuotes(tenant: TenantDb, projectId: ProjectId): Promise<Quote[]> {
  const quotes = await quotesRepository(tenant).list(projectId);
  if (!quotes) throw problem("not-found", "There is no such project.");
  return quotes;
}

export async function createQuote(tenant: TenantDb, projectId: ProjectId, by: Person, deps: Deps): Promise<Quote> {
  const computed = await computeProject(tenant, projectId, ({ timeZone }) => dayIn(timeZone, deps.clock.now()));
  if (!computed) throw problem("not-found", "There is no such project.");
  const { company, numbers } = computed;
  const id = deps.ids.make("quo");
  const draft = firstDraft({
    systems: numbers.systems,
    units: numbers.project.unitSystem,
    terms: company.quoteTerms,
    projectName: numbers.project.name,
  });
  return tenant.transaction(async (tx) => {
    const quotes = quotesRepository(tx);
    const number = await quotes.nextNumber();
    await quotes.insert({ id, projectId, number, draft, by: by.id });
    await recordAudit(tx, { by: by.id, event: "quote.started", subject: number, details: { projectId } });
    return { id, number, draft, revisions: [], version: 1 };
  });
}

export async function updateDraft(
  tenant: TenantDb,
  at: { projectId: ProjectId; quoteId: QuoteId },
  draft: QuoteDraft,
  expected: number,
): Promise<Quote> {
  return tenant.transaction(async (tx) => {
    const quotes = quotesRepository(tx);
    const before = await lockQuote(tx, at, expected);
    await quotes.saveDraft(at.quoteId, draft, before.version + 1);
    return getQuote(tx, at);
  });
}

/** The version that the caller saw, locked; else not found or stale. */
export async function lockQuote(tx: TenantDb, at: { projectId: ProjectId; quoteId: QuoteId }, expected: number) {
  const quote = await quotesRepository(tx).lock(at.projectId, at.quoteId);
  if (!quote) throw problem("not-found", "There is no such quote.");
  if (quote.version !== expected) throw problem("stale", "This quote was saved by someone else meanwhile.");
  return quote;
}

export async function getQuote(tenant: TenantDb, at: { projectId: ProjectId; quoteId: QuoteId }): Promise<Quote> {
  const quote = await quotesRepository(tenant).find(at.projectId, at.quoteId);
  if (!quote) throw problem("not-found", "There is no such quote.");
  return quote;
}

/** A quote beside its project's numbers as they are now: one statement, so that all of it is of one moment. */
export async function readWithNumbers(
  tenant: TenantDb,
  at: { projectId: ProjectId; quoteId: QuoteId },
  deps: Deps,
): Promise<{ company: Company; quote: Quote; numbers: ProjectNumbers; clientAddress: Address }> {
  const { quotes, clientAddress, ...answers } = await tenant.askTogether({
    ...projectQuestions(tenant, at.projectId),
    quotes: quotesQuestion(tenant, at.projectId),
    clientAddress: clientAddressQuestion(tenant, at.projectId),
  });
  const { company } = answers;
  const quote = quotes?.find(({ id }) => id === at.quoteId);
  const numbers = numbersFrom(answers, dayIn(company.timeZone, deps.clock.now()));
  if (!quote || !numbers || !clientAddress) throw problem("not-found", "There is no such quote.");
  return { company, quote, numbers, clientAddress };
}

export async function withdrawRevision(
  tenant: TenantDb,
  at: { projectId: ProjectId; quoteId: QuoteId; revisionId: RevisionId },
  by: Person,
): Promise<Quote> {
  return tenant.transaction(async (tx) => {
    const quotes = quotesRepository(tx);
    const revision = await quotes.lockRevision(at.projectId, at.quoteId, at.revisionId);
    if (!revision) throw problem("not-found", "There is no such revision.");
    if (!NEXT_STATES[revision.state].includes("withdrawn"))
      throw problem("wrong-state", `Revision ${revision.number} is ${revision.state} and cannot be taken back.`);
    await quotes.setState(at.revisionId, "withdrawn");
    await recordAudit(tx, {
      by: by.id,
      event: "quote.withdrawn",
      subject: at.quoteId,
      details: { revision: revision.number },
    });
    return getQuote(tx, at);
  });
}

export async function revokeLink(
  tenant: TenantDb,
  at: { projectId: ProjectId; quoteId: QuoteId; linkId: QuoteLinkId },
  by: Person,
): Promise<Quote> {
  return tenant.transaction(async (tx) => {
    const quote = await getQuote(tx, at);
    if (!(await quotesRepository(tx).revokeLink(at.quoteId, at.linkId)))
      throw problem("not-found", "There is no such open link.");
    await recordAudit(tx, {
      by: by.id,
      event: "quote-link.revoked",
      subject: quote.number,
      details: { linkId: at.linkId },
    });
    return getQuote(tx, at);
  });
}

export async function revisionPdf(
  tenant: TenantDb,
  at: { projectId: ProjectId; quoteId: QuoteId; revisionId: RevisionId },
  deps: Deps,
) {
  const found = await quotesRepository(tenant).pdfHash(at.projectId, at.quoteId, at.revisionId);
  if (!found) throw problem("not-found", "There is no such revision.");
  return {
    bytes: await deps.files.get(tenant.organizationId, found.pdfHash),
    mediaType: "application/pdf",
    fileName: pdfName(found.number, found.revision),
    inline: true,
  };
}

export const pdfName = (number: string, revision: number) => `quote-${number}-rev-${revision}.pdf`;

export async function draftPdf(
  tenant: TenantDb,
  at: { projectId: ProjectId; quoteId: QuoteId },
  by: Person,
  deps: Deps,
) {
  const read = await readWithNumbers(tenant, at, deps);
  const { quote, numbers } = read;
  const revision = (quote.revisions[0]?.number ?? 0) + 1;
  const snapshot = snapshotOf({ ...read, by, revision, issuedAt: deps.clock.now() });
  if (!snapshot)
    throw problem("cannot-be-computed", `The layout has to be mended first: ${namesOf(numbers).join("; ")}.`);
  return {
    bytes: await pdfOf(snapshot, { hash: "", recipients: [], isDraft: true }),
    mediaType: "application/pdf",
    fileName: `${quote.number}-draft.pdf`,
    inline: true,
  };
}

export const namesOf = (numbers: ProjectNumbers): string[] =>
  numbers.problems.map(({ subject, limit }) => `${subject.name || subject.kind}: ${limit}`);

/** Null while there is no price. */
export function snapshotOf(facts: {
  company: Company;
  quote: Pick<Quote, "number" | "draft">;
  numbers: ProjectNumbers;
  clientAddress: Address;
  by: Person;
  revision: number;
  issuedAt: Date;
}): QuoteSnapshot | null {
  const { company, quote, numbers, by } = facts;
  const { project, estimate } = numbers;
  if (!estimate) return null;
  return {
    schema: "cleatwork.quote-snapshot/1",
    quoteNumber: quote.number,
    revision: facts.revision,
    issuedAt: facts.issuedAt.toISOString(),
    validUntilOn: validUntil(facts.issuedAt, quote.draft.validDays, company.timeZone),
    estimator: { name: by.name, email: by.email },
    company: {
      name: company.name,
      address: company.address,
      phone: company.phone,
      licenseNumber: company.licenseNumber,
      brandColor: company.brandColor,
    },
    client: { name: project.clientName, address: facts.clientAddress },
    project: { id: project.id, name: project.name, siteAddress: project.siteAddress, unitSystem: project.unitSystem },
    draft: quote.draft,
    layoutSequence: numbers.sequence,
    systems: numbers.systems,
    air: numbers.solutions.map(
      ({ systemId, requiredPressure_pa, availablePressure_pa, outletAirflow_m3s, findings }) => ({
        systemId,
        requiredPressure_pa,
        availablePressure_pa,
        outletAirflow_m3s,
        findings,
      }),
    ),
    takeoffs: numbers.takeoffs,
    estimate,
  };
}

export const pdfOf = (
  snapshot: QuoteSnapshot,
  facts: { hash: string; recipients: readonly string[]; isDraft: boolean },
) =>
  quotePdf({
    ...clientQuoteFrom(snapshot, { recipientName: "", state: "issued", snapshotHash: facts.hash, response: null }),
    clientAddress: snapshot.client.address,
    siteAddress: snapshot.project.siteAddress,
    recipients: facts.recipients,
    paper: snapshot.project.unitSystem === "inch-pound" ? "LETTER" : "A4",
    isDraft: facts.isDraft,
  });
