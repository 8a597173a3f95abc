import knex from "knex";
import type { OrganizationId } from "@cleatwork/contracts";
import type { Clock } from "../clock.ts";
import type { Ids } from "../ids.ts";
import type { DbContext } from "./db-context.ts";
import { countQuery } from "./query-count.ts";
import { systemDb, type SystemDb } from "./system-db.ts";
import { tenantDb, type TenantDb } from "./tenant-db.ts";

/** The one door to MariaDB. A company's data comes through `tenant`, which only a membership or a private link may ask for. */
export interface Database {
  tenant(organizationId: OrganizationId): TenantDb;
  /** For the few tasks above companies; the reason is for the reader. */
  system(reason: string): SystemDb;
  /** Answers when the database does. */
  ping(): Promise<void>;
  close(): Promise<void>;
}

export function openDatabase(url: string, parts: { clock: Clock; ids: Ids; poolSize: number }): Database {
  const { hostname, port, username, password, pathname } = new URL(url);
  const sql = knex({
    client: "mysql2",
    connection: {
      host: hostname,
      port: Number(port || 3306),
      user: decodeURIComponent(username),
      password: decodeURIComponent(password),
      database: pathname.slice(1),
      timezone: "Z",
      charset: "utf8mb4",
      supportBigNumbers: true,
    },
    pool: { min: 0, max: parts.poolSize },
  });
  sql.on("query", countQuery);
  const context: DbContext = { sql, clock: parts.clock, ids: parts.ids };
  return {
    tenant: (organizationId) => tenantDb(context, organizationId),
    system: () => systemDb(context),
    ping: async () => {
      await sql.raw("SELECT 1");
    },
    close: () => sql.destroy(),
  };
}
