/** One column of a table: rising arguments and their values. */
export interface LinearTable {
  readonly at: readonly number[];
  readonly values: readonly number[];
}

/** Value between the printed rows, linear; outside the table the end row, and the caller says so. */
export function readLinear({ at, values }: LinearTable, argument: number): number {
  let below = 0;
  while (below < at.length - 2 && argument > (at[below + 1] ?? Infinity)) below++;
  const x0 = at[below] ?? 0;
  const x1 = at[below + 1] ?? x0;
  const y0 = values[below] ?? 0;
  const y1 = values[below + 1] ?? y0;
  const share = Math.min(1, Math.max(0, (argument - x0) / (x1 - x0)));
  return y0 + share * (y1 - y0);
}
