/** A block from a spreadsheet, read before anything is changed: each cell with what it means, or why it cannot be read. */
import {
  DUCT_CLASSES,
  formatAirflow,
  formatLength,
  formatSize,
  inchesOfWater,
  parseAirflow,
  parseLength,
  parseSize,
  type DuctClass,
  type Section,
} from "@cleatwork/calc";
import type { UnitSystem } from "@cleatwork/contracts";
import type { PastedRow } from "@cleatwork/layout";

export const PASTE_COLUMNS = ["name", "class", "size", "length", "airflow"] as const;
export type PasteColumn = (typeof PASTE_COLUMNS)[number];

export interface ReadCell {
  readonly typed: string;
  /** As it is understood. */
  readonly shown: string;
  readonly error: string | null;
}

export interface ReadRow {
  readonly cells: Readonly<Record<PasteColumn, ReadCell>>;
  /** Null while a cell is in error. */
  readonly row: PastedRow | null;
}

/** Tab-separated lines as spreadsheets copy them; quoted cells may hold line breaks. */
export function cellsOf(text: string): string[][] {
  const rows: string[][] = [[]];
  let cell = "";
  let quoted = false;
  for (let at = 0; at < text.length; at++) {
    const sign = text[at];
    if (quoted) {
      if (sign === '"' && text[at + 1] === '"') {
        cell += '"';
        at += 1;
      } else if (sign === '"') quoted = false;
      else cell += sign;
    } else if (sign === '"' && cell === "" && text.slice(at + 1).search(/"(\t|\r?\n|$)/) >= 0) quoted = true;
    else if (sign === "\t") {
      rows.at(-1)?.push(cell);
      cell = "";
    } else if (sign === "\n") {
      rows.at(-1)?.push(cell.replace(/\r$/, ""));
      rows.push([]);
      cell = "";
    } else cell += sign;
  }
  rows.at(-1)?.push(cell.replace(/\r$/, ""));
  return rows.filter((row) => row.some((each) => each.trim() !== ""));
}

const HEADINGS: Readonly<Record<PasteColumn, RegExp>> = {
  name: /name|segment|duct|run/i,
  class: /class/i,
  size: /size/i,
  length: /length|len/i,
  airflow: /air|cfm|flow|l\/s/i,
};

/** By the headings in the first row when there are any, else in the order name, class, size, length, airflow. */
export function columnsOf(rows: readonly (readonly string[])[]): {
  readonly order: readonly (PasteColumn | null)[];
  readonly hasHead: boolean;
} {
  const first = rows[0] ?? [];
  const named = first.map((cell) => PASTE_COLUMNS.find((column) => HEADINGS[column].test(cell)) ?? null);
  const hasHead = named.filter((column) => column !== null).length >= 2 && !first.some((cell) => /\d/.test(cell));
  return { order: hasHead ? named : PASTE_COLUMNS, hasHead };
}

export function readBlock(text: string, units: UnitSystem): ReadRow[] {
  const rows = cellsOf(text);
  const { order, hasHead } = columnsOf(rows);
  return (hasHead ? rows.slice(1) : rows).map((cells, index) => {
    const typed = (column: PasteColumn) => cells[order.indexOf(column)]?.trim() ?? "";
    return readRow(
      {
        name: typed("name"),
        class: typed("class"),
        size: typed("size"),
        length: typed("length"),
        airflow: typed("airflow"),
      },
      index,
      units,
    );
  });
}

function readRow(typed: Readonly<Record<PasteColumn, string>>, index: number, units: UnitSystem): ReadRow {
  const flexible = /\s?flex(ible)?$/i.test(typed.size);
  const size = typed.size === "" ? null : parseSize(typed.size.replace(/\s?flex(ible)?$/i, ""), units, "round");
  const length = typed.length === "" ? null : parseLength(typed.length, units);
  const airflow = typed.airflow === "" ? null : parseAirflow(typed.airflow, units);
  const ductClass = classOf(typed.class);
  const cells: Record<PasteColumn, ReadCell> = {
    name: { typed: typed.name, shown: typed.name, error: null },
    class: {
      typed: typed.class,
      shown: ductClass ?? "",
      error: ductClass === undefined ? "Type main, branch or runout." : null,
    },
    size: {
      typed: typed.size,
      shown: size?.ok ? `${formatSize(size.value, units).text}${flexible ? " flex" : ""}` : "to sizing",
      error: errorOf(size),
    },
    length: {
      typed: typed.length,
      shown: length?.ok ? formatLength(length.value, units).text : "",
      error:
        length === null
          ? "A length is needed."
          : (errorOf(length) ?? (length.ok && !(length.value > 0) ? "A duct is longer than nothing." : null)),
    },
    airflow: {
      typed: typed.airflow,
      shown: airflow?.ok ? formatAirflow(airflow.value, units).text : "goes on",
      error: errorOf(airflow),
    },
  };
  if (Object.values(cells).some(({ error }) => error !== null) || !length?.ok) return { cells, row: null };
  const section: Section | null = size?.ok ? size.value : null;
  return {
    cells,
    row: {
      after: index === 0 ? null : index - 1,
      to: { kind: "length", length_m: length.value, turn: "straight" },
      duct: { name: typed.name.slice(0, 80), section, flexible, ...(ductClass ? { ductClass } : {}) },
      outlet: airflow?.ok
        ? {
            airflow_m3s: airflow.value,
            requiredPressure_pa: inchesOfWater(0.05),
            deviceKey: null,
            spaceName: "",
            tag: "",
          }
        : null,
    },
  };
}

/** Rows follow one another; what comes after an outlet hangs where the outlet's own duct hangs. */
export function chained(rows: readonly PastedRow[]): PastedRow[] {
  let trunk: number | null = null;
  return rows.map((row, index) => {
    const after = trunk;
    if (!row.outlet) trunk = index;
    return { ...row, after, to: row.outlet && after !== null ? { ...row.to, turn: "right" as const } : row.to };
  });
}

const errorOf = (parsed: { ok: boolean; problems?: readonly { message: string }[] } | null): string | null =>
  parsed && !parsed.ok ? (parsed.problems?.[0]?.message ?? "This cannot be read.") : null;

/** Undefined where something else was typed; null where nothing was. */
function classOf(typed: string): DuctClass | null | undefined {
  if (typed === "") return null;
  return DUCT_CLASSES.find((each) => each.startsWith(typed.toLowerCase()));
}
