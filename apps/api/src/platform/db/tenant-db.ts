import type { OrganizationId } from "@cleatwork/contracts";
import type { Knex } from "knex";
import type { DbContext } from "./db-context.ts";
import { askTogether, type Question } from "./question.ts";
import type { TenantTable } from "./tables.ts";
import { inTransaction } from "./transaction.ts";

type Row = Record<string, unknown>;

/**
 * One company's database. Every query is narrowed to the company and every insert filled in with it, so that a query
 * over another company's rows cannot be written.
 */
export interface TenantDb {
  readonly organizationId: OrganizationId;
  /** Join along composite keys: `{ "p.organization_id": "q.organization_id", "p.id": "q.project_id" }`. */
  from(table: TenantTable, alias?: string): Knex.QueryBuilder;
  insert(table: TenantTable, rows: Row | readonly Row[]): Promise<void>;
  /** Several questions in one statement: one round trip, and all answers of one moment. */
  askTogether<Q extends Readonly<Record<string, Question<unknown>>>>(questions: Q): ReturnType<typeof askTogether<Q>>;
  /** The company's own row. */
  organization(): Knex.QueryBuilder;
  /** Mail of this company. */
  outbox(): Knex.QueryBuilder;
  /** Writes a mail of this company into the outbox. */
  enqueue(row: Row): Promise<void>;
  /** One transaction; inside another one it is that one. A deadlock is tried again, so the work must bear repeating. */
  transaction<T>(work: (tx: TenantDb) => Promise<T>): Promise<T>;
  now(): Date;
  newId<K extends string>(kind: K): string;
}

export function tenantDb(context: DbContext, organizationId: OrganizationId): TenantDb {
  const { sql, clock, ids } = context;
  return {
    organizationId,
    from: (table, alias) =>
      sql(alias ? { [alias]: table } : table).where(`${alias ?? table}.organization_id`, organizationId),
    insert: async (table, rows) => {
      const list = Array.isArray(rows) ? (rows as readonly Row[]) : [rows as Row];
      await sql(table).insert(list.map((row) => ({ ...row, organization_id: organizationId })));
    },
    askTogether: (questions) => askTogether(sql, questions),
    organization: () => sql("organizations").where("organizations.id", organizationId),
    outbox: () => sql("outbox").where("outbox.organization_id", organizationId),
    enqueue: async (row) => {
      await sql("outbox")
        .insert({ ...row, organization_id: organizationId })
        .onConflict("unique_key")
        .ignore();
    },
    transaction: (work) =>
      sql.isTransaction
        ? work(tenantDb(context, organizationId))
        : inTransaction(sql, (tx) => work(tenantDb({ ...context, sql: tx }, organizationId))),
    now: () => clock.now(),
    newId: (kind) => ids.make(kind),
  };
}
