/** What the bench found, beside what is expected of it. */
export interface Figure {
  readonly what: string;
  readonly figure: number;
  readonly unit: string;
  /** The most that is expected; null where a figure only informs. */
  readonly most: number | null;
  /** The least that is expected, where more is better. */
  readonly least?: number;
  readonly note?: string;
}

export const isOver = ({ figure, most, least }: Figure): boolean =>
  (most !== null && !(figure <= most)) || (least !== undefined && !(figure >= least));

/** As the table says it; empty where a figure only informs. */
function expected({ most, least, unit }: Figure): string {
  if (most !== null) return `≤ ${most} ${unit}`.trimEnd();
  return least === undefined ? "" : `≥ ${least} ${unit}`.trimEnd();
}

/** One line a figure, in columns that a person reads down. */
export function table(figures: readonly Figure[]): string {
  const rows = [
    ["what", "figure", "expected", "", ""],
    ...figures.map((each) => [
      each.what,
      `${inFigures(each.figure)} ${each.unit}`.trimEnd(),
      expected(each),
      expected(each) === "" ? "" : isOver(each) ? (each.most === null ? "UNDER" : "OVER") : "ok",
      each.note ?? "",
    ]),
  ];
  const widths = [0, 1, 2, 3].map((column) => Math.max(...rows.map((row) => row[column]?.length ?? 0)));
  return rows
    .map((row) =>
      row
        .map((cell, column) => cell.padEnd(widths[column] ?? 0))
        .join("  ")
        .trimEnd(),
    )
    .join("\n");
}

export const median = (values: readonly number[]): number =>
  [...values].sort((a, b) => a - b)[Math.floor(values.length / 2)] ?? NaN;

const inFigures = (value: number) => (Number.isInteger(value) ? String(value) : value.toPrecision(3));
