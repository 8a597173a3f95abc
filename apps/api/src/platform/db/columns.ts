/** How columns read and write: MariaDB's JSON, instants and days, and ours. */

/** mysql2 parses what it knows to be JSON; a joined or aggregated column may still be text. */
export const fromJson = <T>(value: unknown): T => (typeof value === "string" ? JSON.parse(value) : value) as T;

/** DATETIME(3) in UTC. */
export type InstantColumn = Date | string;
export const instantFromColumn = (value: InstantColumn): string =>
  (value instanceof Date ? value : new Date(`${value.replace(" ", "T")}Z`)).toISOString();
export const instantOrNull = (value: InstantColumn | null): string | null =>
  value === null ? null : instantFromColumn(value);

/** DATE, which the driver gives as midnight UTC. */
export type DayColumn = Date | string;
export const dayFromColumn = (value: DayColumn): string =>
  value instanceof Date ? value.toISOString().slice(0, 10) : value.slice(0, 10);
