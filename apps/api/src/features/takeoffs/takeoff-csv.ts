import Papa from "papaparse";
import type { Table } from "./takeoff-tables.ts";

/** The pieces, one a line. Text that a spreadsheet would run as a formula is marked as text. */
export const takeoffCsv = ({ head, rows }: Table): Buffer =>
  Buffer.from(
    `\ufeff${Papa.unparse({ fields: [...head], data: rows.map((row) => [...row]) }, { escapeFormulae: true, newline: "\r\n" })}\r\n`,
    "utf8",
  );
