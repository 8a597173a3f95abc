import { FRICTION_BASES } from "@cleatwork/calc";
import { z } from "zod";
import { address, currency, instant, longText, name, shortText, timeZone, unitSystem, version } from "./common.ts";
import { endpoint, member } from "./endpoint.ts";
import { companySlug, organizationId, personId } from "./ids.ts";
import { pageOf, pageQuery } from "./common.ts";

/** What every member may see; no rate, price or margin. */
export const companyResponse = z.object({
  id: organizationId,
  slug: companySlug,
  name: z.string(),
  unitSystem,
  currency,
  timeZone: z.string(),
  address,
  phone: z.string(),
  licenseNumber: z.string(),
  /** The brand color of quotes, #rrggbb. */
  brandColor: z.string(),
  /** The diameter in the Reynolds number of turbulent friction. */
  frictionBasis: z.enum(FRICTION_BASES),
  quoteTerms: z.string(),
  version,
});
export type Company = z.infer<typeof companyResponse>;

export const companyRequest = z.strictObject({
  name,
  unitSystem,
  timeZone,
  address,
  phone: z.string().trim().max(40),
  licenseNumber: shortText,
  brandColor: z.string().regex(/^#[0-9a-fA-F]{6}$/, "a color such as #1C429C"),
  frictionBasis: z.enum(FRICTION_BASES),
  quoteTerms: longText,
});

export const auditItem = z.object({
  id: z.string(),
  at: instant,
  by: z.object({ id: personId, name: z.string() }).nullable(),
  /** Past tense: `quote.issued`, `price.changed`. */
  event: z.string(),
  subject: z.string(),
  details: z.record(z.string(), z.unknown()),
});

export const mailItem = z.object({
  id: z.string(),
  to: z.string(),
  subject: z.string(),
  state: z.enum(["queued", "sent", "refused", "dead"]),
  attempts: z.int(),
  lastError: z.string().nullable(),
  createdAt: instant,
  nextAttemptAt: instant.nullable(),
  sentAt: instant.nullable(),
});

export const companyEndpoints = {
  getCompany: endpoint({
    method: "get",
    path: "/companies/:company",
    access: member("company.read"),
    summary: "The company: name, brand, units",
    response: companyResponse,
  }),
  updateCompany: endpoint({
    method: "put",
    path: "/companies/:company",
    access: member("company.write"),
    summary: "Change name, brand, units, terms",
    body: companyRequest,
    response: companyResponse,
    guards: ["if-match"],
  }),
  listAudit: endpoint({
    method: "get",
    path: "/companies/:company/audit",
    access: member("audit.read"),
    summary: "Who changed what, newest first",
    query: pageQuery,
    response: pageOf(auditItem),
  }),
  listMail: endpoint({
    method: "get",
    path: "/companies/:company/mail",
    access: member("mail.read"),
    summary: "Mail waiting, sent and refused, newest first",
    query: pageQuery,
    response: pageOf(mailItem),
  }),
};
