import type { OrganizationId } from "@cleatwork/contracts";
import type { Knex } from "knex";
import type { DbContext } from "./db-context.ts";
import type { SystemTable, TenantTable } from "./tables.ts";
import { tenantDb, type TenantDb } from "./tenant-db.ts";
import { inTransaction } from "./transaction.ts";

type Row = Record<string, unknown>;

/** Above all companies: signing in, founding a company, links that say who someone is, the post, sweeps. */
export interface SystemDb {
  from(table: SystemTable | TenantTable, alias?: string): Knex.QueryBuilder;
  insert(table: SystemTable | TenantTable, row: Row): Promise<void>;
  raw(sql: string): Knex.Raw;
  /** Inside the same transaction, one company: for a row that a token or a job has named. */
  tenantOf(organizationId: OrganizationId): TenantDb;
  /** Writes a mail that belongs to no company into the outbox. */
  enqueue(row: Row): Promise<void>;
  transaction<T>(work: (tx: SystemDb) => Promise<T>): Promise<T>;
  now(): Date;
  newId<K extends string>(kind: K): string;
}

export function systemDb(context: DbContext): SystemDb {
  const { sql, clock, ids } = context;
  return {
    from: (table, alias) => sql(alias ? { [alias]: table } : table),
    insert: async (table, row) => {
      await sql(table).insert(row);
    },
    raw: (text) => sql.raw(text),
    tenantOf: (organizationId) => tenantDb(context, organizationId),
    enqueue: async (row) => {
      await sql("outbox").insert(row).onConflict("unique_key").ignore();
    },
    transaction: (work) =>
      sql.isTransaction ? work(systemDb(context)) : inTransaction(sql, (tx) => work(systemDb({ ...context, sql: tx }))),
    now: () => clock.now(),
    newId: (kind) => ids.make(kind),
  };
}
