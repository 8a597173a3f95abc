/** What was sold, frozen: everything that the PDF, the client's page and the field are made from, and what the price rests on. */
import type { AirSystem, Estimate, Solution, Takeoff } from "@cleatwork/calc";
import type { Address, ClientQuote, Company, QuoteDraft, RevisionState, UnitSystem } from "@cleatwork/contracts";
import { createHash } from "node:crypto";
import { canonicalJson } from "./canonical-json.ts";
import { consentText } from "./quotes.rules.ts";

export interface QuoteSnapshot {
  readonly schema: "cleatwork.quote-snapshot/1";
  readonly quoteNumber: string;
  readonly revision: number;
  readonly issuedAt: string;
  readonly validUntilOn: string;
  readonly estimator: { readonly name: string; readonly email: string };
  readonly company: Pick<Company, "name" | "address" | "phone" | "licenseNumber" | "brandColor">;
  readonly client: { readonly name: string; readonly address: Address };
  readonly project: {
    readonly id: string;
    readonly name: string;
    readonly siteAddress: Address;
    readonly unitSystem: UnitSystem;
  };
  readonly draft: QuoteDraft;
  readonly layoutSequence: number;
  readonly systems: readonly AirSystem[];
  readonly air: readonly Pick<
    Solution,
    "systemId" | "requiredPressure_pa" | "availablePressure_pa" | "outletAirflow_m3s" | "findings"
  >[];
  readonly takeoffs: readonly Takeoff[];
  readonly estimate: Estimate;
}

export interface Frozen {
  readonly text: string;
  readonly hash: string;
}

/** The canonical text and its SHA-256. */
export function freeze(value: object): Frozen {
  const text = canonicalJson(value);
  return { text, hash: createHash("sha256").update(text).digest("hex") };
}

/** The price by system, adding up to the price; empty for a lump sum. */
export function partsOf(snapshot: Pick<QuoteSnapshot, "draft" | "systems" | "estimate">): ClientQuote["parts"] {
  if (snapshot.draft.priceDetail === "lump-sum") return [];
  const names = new Map(snapshot.systems.map(({ id, tag, name }) => [id, name ? `${tag} ${name}` : tag]));
  return snapshot.estimate.bySystem.map(({ systemId, price_minor }) => ({
    name: names.get(systemId) ?? "General",
    price_minor,
  }));
}

/** What a client sees of it: each field named here, so that a new one in the snapshot cannot slip through. */
export function clientQuoteFrom(
  snapshot: QuoteSnapshot,
  facts: { recipientName: string; state: RevisionState; snapshotHash: string; response: ClientQuote["response"] },
): ClientQuote {
  const { company, draft, estimate } = snapshot;
  return {
    company: {
      name: company.name,
      address: company.address,
      phone: company.phone,
      licenseNumber: company.licenseNumber,
      brandColor: company.brandColor,
    },
    estimator: snapshot.estimator,
    recipientName: facts.recipientName,
    clientName: snapshot.client.name,
    projectName: snapshot.project.name,
    quoteNumber: snapshot.quoteNumber,
    revision: snapshot.revision,
    state: facts.state,
    issuedAt: snapshot.issuedAt,
    validUntilOn: snapshot.validUntilOn,
    title: draft.title,
    greeting: draft.greeting,
    scope: draft.scope,
    inclusions: draft.inclusions,
    exclusions: draft.exclusions,
    clarifications: draft.clarifications,
    addenda: draft.addenda,
    terms: draft.terms,
    currency: estimate.currency,
    price_minor: estimate.price_minor,
    parts: partsOf(snapshot),
    snapshotHash: facts.snapshotHash,
    consent: consentText(snapshot.client.name, company.name),
    response: facts.response,
  };
}
