/** How many statements one request sends to the database: round trips decide the throughput. */
import { AsyncLocalStorage } from "node:async_hooks";

interface Count {
  queries: number;
}
const counts = new AsyncLocalStorage<Count>();

export const countQuery = (): void => {
  const count = counts.getStore();
  if (count) count.queries += 1;
};

export const queriesSoFar = (): number => counts.getStore()?.queries ?? 0;
export const withQueryCount = <T>(work: () => T): T => counts.run({ queries: 0 }, work);
