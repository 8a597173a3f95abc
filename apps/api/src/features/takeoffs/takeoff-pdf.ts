/** The takeoff on paper, with the company's name and color: sums first, then what is counted, then every piece. */
import type { Company } from "@cleatwork/contracts";
import { Sheet, type Style } from "../../platform/pdf/sheet.ts";
import { sumRow, type Cell, type Table } from "./takeoff-tables.ts";

const INK = "#16202A";
const SOFT = "#4A5760";
const LINE = "#C9D0D4";
const small: Style = { font: "regular", size: 7.5, color: INK, gap: 0 };
const headStyle: Style = { ...small, font: "medium", color: SOFT };

export interface TakeoffPaper {
  readonly company: Pick<Company, "name" | "brandColor">;
  readonly projectName: string;
  readonly madeOn: string;
  readonly sequence: number;
  readonly paper: "LETTER" | "A4";
  readonly tables: readonly Table[];
  readonly findings: readonly string[];
}

export async function takeoffPdf(takeoff: TakeoffPaper): Promise<Buffer> {
  const sheet = new Sheet({
    title: `Takeoff, ${takeoff.projectName}`,
    author: takeoff.company.name,
    size: takeoff.paper,
  });
  const brand = /^#[0-9a-f]{6}$/i.test(takeoff.company.brandColor) ? takeoff.company.brandColor : INK;
  sheet.space(sheet.put(takeoff.company.name, { font: "bold", size: 15, color: brand }, full(sheet)) + 4);
  sheet.rule(brand, 1.5);
  sheet.space(10);
  sheet.space(sheet.put(`Takeoff: ${takeoff.projectName}`, { font: "medium", size: 13, color: INK }, full(sheet)) + 2);
  sheet.space(
    sheet.put(`${takeoff.madeOn}, layout ${takeoff.sequence}`, { ...small, size: 9, color: SOFT }, full(sheet)) + 8,
  );
  for (const finding of takeoff.findings) sheet.write(finding, { ...small, size: 8.5 });
  for (const table of takeoff.tables) drawTable(sheet, table, brand);
  sheet.space(8);
  sheet.write(
    "Net weight of metal in the pieces; waste, price and terms are elsewhere. An aid to licensed judgment: the job's specification and the adopted code govern.",
    { ...small, color: SOFT },
  );
  sheet.foot(
    (page, pages) => ({
      left: `Takeoff · ${takeoff.projectName}`,
      right: `layout ${takeoff.sequence} · page ${page} of ${pages}`,
    }),
    SOFT,
  );
  return sheet.bytes();
}

const full = (sheet: Sheet) => ({ x: sheet.left, y: sheet.y, width: sheet.width });

/** Columns that nothing stands in are left out, the others are as wide as what they hold. */
function drawTable(sheet: Sheet, table: Table, brand: string): void {
  if (table.rows.length === 0) return;
  const same = sameAll(table);
  const shown = table.head
    .map((_, column) => column)
    .filter(
      (column) =>
        !LEFT_OUT.has(table.head[column] ?? "") &&
        !same.includes(column) &&
        table.rows.some((row) => text(row[column]) !== ""),
    );
  const sums = sumRow(table);
  const weights = shown.map((column) =>
    Math.min(
      22,
      [...table.rows, sums].reduce((most, row) => Math.max(most, text(row[column]).length), table.head[column]!.length),
    ),
  );
  const total = weights.reduce((sum, weight) => sum + weight + 1.5, 0);
  const widths = weights.map((weight) => ((weight + 1.5) / total) * sheet.width);

  sheet.need(60);
  sheet.space(10);
  sheet.space(sheet.put(table.title, { font: "medium", size: 11, color: brand }, full(sheet)) + 4);
  const isNumber = table.head.map((_, column) => table.rows.some((cells) => typeof cells[column] === "number"));
  // A column with tenths anywhere shows them everywhere: figures are compared down the column.
  const digits = table.head.map((_, column) =>
    table.rows.some((cells) => typeof cells[column] === "number" && !Number.isInteger(cells[column])) ? 1 : 0,
  );
  const row = (cells: readonly Cell[], style: Style) => {
    const texts = shown.map((column) => text(cells[column], digits[column]));
    const height = Math.max(...texts.map((cell, index) => sheet.heightOf(cell, style, widths[index]! - 4)));
    if (sheet.y + height + 3 > sheet.bottom) {
      sheet.need(sheet.bottom);
      if (style !== headStyle) row(table.head, headStyle);
    }
    let x = sheet.left;
    texts.forEach((cell, index) => {
      const align = isNumber[shown[index]!] ? "right" : "left";
      sheet.put(cell, { ...style, align }, { x, y: sheet.y, width: widths[index]! - 4 });
      x += widths[index]!;
    });
    sheet.space(height + 2);
    sheet.rule(LINE, 0.4);
    sheet.space(2);
  };
  if (same.length > 0) {
    const words = same.map((column) => `${table.head[column] ?? ""} ${text(table.rows[0]?.[column])}`);
    sheet.write(`All of it: ${words.join(", ")}.`, { ...small, color: SOFT });
  }
  row(table.head, headStyle);
  for (const cells of table.rows) row(cells, small);
  row(
    sums.map((cell, column) => (column === shown[0] && cell === null ? "Total" : cell)),
    { ...small, font: "medium" },
  );
}

/** Columns of words that say the same in every row: said once above the table, where there is more than a row. */
const sameAll = ({ head, rows }: Table): readonly number[] =>
  rows.length < 2
    ? []
    : head
        .map((_, column) => column)
        .filter((column) => {
          const first = rows[0]?.[column];
          return typeof first === "string" && first !== "" && rows.every((row) => row[column] === first);
        });

/** Said in words elsewhere, or too long for paper. */
const LEFT_OUT = new Set(["Gauge by", "Seam", "Basis", "Joints"]);

const text = (cell: Cell | undefined, digits = 1): string =>
  cell === null || cell === undefined ? "" : typeof cell === "number" ? cell.toFixed(digits) : cell;
