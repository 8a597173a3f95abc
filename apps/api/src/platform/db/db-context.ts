import type { Knex } from "knex";
import type { Clock } from "../clock.ts";
import type { Ids } from "../ids.ts";

/** What every database handle carries: where rows go, what time it is, how ids are made. */
export interface DbContext {
  readonly sql: Knex;
  readonly clock: Clock;
  readonly ids: Ids;
}
