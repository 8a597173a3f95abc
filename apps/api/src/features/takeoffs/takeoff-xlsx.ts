import ExcelJs from "exceljs";
import { sumRow, type Table } from "./takeoff-tables.ts";

/** One sheet for each table: a frozen head, filters, and a last row of sums. Text stays text: no cell is a formula. */
export async function takeoffXlsx(tables: readonly Table[], facts: { author: string; now: Date }): Promise<Buffer> {
  const book = new ExcelJs.Workbook();
  book.creator = facts.author;
  book.created = facts.now;
  book.modified = facts.now;
  for (const table of tables) {
    const sheet = book.addWorksheet(table.title, { views: [{ state: "frozen", ySplit: 1 }] });
    sheet.addRow([...table.head]).font = { bold: true };
    for (const row of table.rows) sheet.addRow([...row]);
    sheet.addRow([...sumRow(table)]).font = { bold: true };
    sheet.autoFilter = { from: { row: 1, column: 1 }, to: { row: 1 + table.rows.length, column: table.head.length } };
    table.head.forEach((head, column) => {
      const longest = table.rows.reduce((most, row) => Math.max(most, String(row[column] ?? "").length), head.length);
      sheet.getColumn(column + 1).width = Math.min(48, longest + 2);
    });
  }
  return Buffer.from(await book.xlsx.writeBuffer());
}
