import type { FrictionBasis } from "@cleatwork/calc";
import type { Address, Company, CompanySlug, OrganizationId, PersonId, UnitSystem } from "@cleatwork/contracts";
import { fromJson, instantFromColumn, instantOrNull } from "../../platform/db/columns.ts";
import { ask, type Question } from "../../platform/db/question.ts";
import type { TenantDb } from "../../platform/db/tenant-db.ts";

interface CompanyRow {
  id: OrganizationId;
  slug: CompanySlug;
  name: string;
  unit_system: UnitSystem;
  currency: string;
  time_zone: string;
  address: unknown;
  phone: string;
  license_number: string;
  brand_color: string;
  friction_basis: FrictionBasis;
  quote_terms: string;
  version: number;
}
interface AuditRow {
  id: string;
  at: Date;
  person_id: PersonId | null;
  person_name: string | null;
  event: string;
  subject: string;
  details: unknown;
}
interface MailRow {
  id: string;
  recipient: string;
  subject: string;
  state: "queued" | "sent" | "refused" | "dead";
  attempts: number;
  last_error: string | null;
  created_at: Date;
  next_attempt_at: Date;
  sent_at: Date | null;
}

export type CompanyFields = Omit<Company, "id" | "slug" | "currency" | "version">;

interface PageRequest {
  readonly limit: number;
  readonly after?: string | undefined;
}

export const companyQuestion = (db: TenantDb): Question<Company> => ({
  from: db.organization(),
  columns: Object.fromEntries(COMPANY_COLUMNS.map((column) => [column, `organizations.${column}`])),
  order: "organizations.id",
  read: ([row]: readonly CompanyRow[]) => companyFromRow(row!),
});

const COMPANY_COLUMNS = [
  "id",
  "slug",
  "name",
  "unit_system",
  "currency",
  "time_zone",
  "address",
  "phone",
  "license_number",
  "brand_color",
  "friction_basis",
  "quote_terms",
  "version",
] as const satisfies readonly (keyof CompanyRow)[];

export const companiesRepository = (db: TenantDb) => ({
  get: (): Promise<Company> => ask(companyQuestion(db)),

  async lockVersion(): Promise<number> {
    const row: { version: number } = await db.organization().forUpdate().first("version");
    return row.version;
  },

  async update(fields: CompanyFields, version: number): Promise<void> {
    await db.organization().update({
      name: fields.name,
      unit_system: fields.unitSystem,
      time_zone: fields.timeZone,
      address: JSON.stringify(fields.address),
      phone: fields.phone,
      license_number: fields.licenseNumber,
      brand_color: fields.brandColor,
      friction_basis: fields.frictionBasis,
      quote_terms: fields.quoteTerms,
      version,
    });
  },

  /** Ids sort by time, so the id is the cursor. One more is read to see whether there is a next page. */
  async listAudit({ limit, after }: PageRequest) {
    const rows: AuditRow[] = await db
      .from("audit_entries", "a")
      .leftJoin("people as p", "p.id", "a.person_id")
      .modify((query) => void (after ? query.where("a.id", "<", after) : query))
      .orderBy("a.id", "desc")
      .limit(limit + 1)
      .select("a.id", "a.at", "a.person_id", "a.event", "a.subject", "a.details", {
        person_name: "p.name",
      });
    return pageOf(rows, limit, (row) => ({
      id: row.id,
      at: instantFromColumn(row.at),
      by: row.person_id && row.person_name ? { id: row.person_id, name: row.person_name } : null,
      event: row.event,
      subject: row.subject,
      details: fromJson<Record<string, unknown>>(row.details),
    }));
  },

  async listMail({ limit, after }: PageRequest) {
    const rows: MailRow[] = await db
      .outbox()
      .modify((query) => void (after ? query.where("id", "<", after) : query))
      .orderBy("id", "desc")
      .limit(limit + 1)
      .select(
        "id",
        "recipient",
        "subject",
        "state",
        "attempts",
        "last_error",
        "created_at",
        "next_attempt_at",
        "sent_at",
      );
    return pageOf(rows, limit, (row) => ({
      id: row.id,
      to: row.recipient,
      subject: row.subject,
      state: row.state,
      attempts: row.attempts,
      lastError: row.last_error,
      createdAt: instantFromColumn(row.created_at),
      nextAttemptAt: row.state === "queued" ? instantFromColumn(row.next_attempt_at) : null,
      sentAt: instantOrNull(row.sent_at),
    }));
  },
});

function pageOf<R extends { id: string }, T>(rows: readonly R[], limit: number, map: (row: R) => T) {
  const shown = rows.slice(0, limit);
  return { items: shown.map(map), next: rows.length > limit ? (shown.at(-1)?.id ?? null) : null };
}

const companyFromRow = (row: CompanyRow): Company => ({
  id: row.id,
  slug: row.slug,
  name: row.name,
  unitSystem: row.unit_system,
  currency: row.currency,
  timeZone: row.time_zone,
  address: fromJson<Address>(row.address),
  phone: row.phone,
  licenseNumber: row.license_number,
  brandColor: row.brand_color,
  frictionBasis: row.friction_basis,
  quoteTerms: row.quote_terms,
  version: row.version,
});
