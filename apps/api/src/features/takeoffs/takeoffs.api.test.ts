import ExcelJs from "exceljs";
import { describe, expect, test } from "vitest";
import { anIssuedQuote } from "../../testing/a-quotable-project.ts";
import { foundCompany, type TestCompany } from "../../testing/found-company.ts";

const PRICES = /price|cost|margin|markup|_minor|_micro|\$/i;

async function anIssuedProject() {
  const company = await foundCompany();
  const issued = await anIssuedQuote(company);
  const revision = issued.quote.revisions[0];
  if (!revision) throw new Error("an issued quote has a revision");
  return { company, issued, at: { ...issued.params, quoteId: issued.quote.id, revisionId: revision.id } };
}

const fileOf = async ({ estimator }: TestCompany, params: object, format: "csv" | "xlsx" | "pdf") => {
  const { status, bytes } = await estimator.send("getTakeoffFile", { params: params, query: { format } });
  expect(status).toBe(200);
  return bytes;
};

describe("the takeoff as a file", () => {
  test("CSV has a line for each piece, and no price", async () => {
    const { company, issued, at } = await anIssuedProject();
    const text = (await fileOf(company, issued.params, "csv")).toString("utf8");
    const { pieces } = await company.estimator.ok("getRevisionTakeoff", { params: at });
    expect(text.trim().split("\r\n")).toHaveLength(1 + pieces.length);
    expect(text).toContain(pieces[0]?.mark ?? "never");
    expect(text).not.toMatch(PRICES);
  });

  test("XLSX has sheets of sums, pieces and counted things, with the same weight in each", async () => {
    const { company, issued } = await anIssuedProject();
    const book = new ExcelJs.Workbook();
    await book.xlsx.load((await fileOf(company, issued.params, "xlsx")) as never);
    expect(book.worksheets.map(({ name }) => name)).toEqual(["Sums", "Pieces", "Counted"]);
    const lastOf = (name: string, head: string) => {
      const sheet = book.getWorksheet(name)!;
      const column = (sheet.getRow(1).values as unknown[]).indexOf(head);
      return Number(sheet.getRow(sheet.rowCount).getCell(column).value);
    };
    expect(lastOf("Sums", "Weight, lb")).toBeGreaterThan(0);
    expect(lastOf("Sums", "Weight, lb")).toBeCloseTo(lastOf("Pieces", "Weight, lb"), 1);
  });

  test("PDF is one", async () => {
    const { company, issued } = await anIssuedProject();
    const bytes = await fileOf(company, issued.params, "pdf");
    expect(bytes.subarray(0, 5).toString("latin1")).toBe("%PDF-");
    expect(bytes.length).toBeGreaterThan(5000);
  });

  test("is not for a foreman, nor for another company", async () => {
    const { company, issued } = await anIssuedProject();
    const { status } = await company.foreman.send("getTakeoffFile", { params: issued.params });
    expect(status).toBe(403);
    const other = await foundCompany();
    expect((await other.estimator.send("getTakeoffFile", { params: issued.params })).status).toBe(404);
  });
});

describe("an issued takeoff", () => {
  test("is read without a price, and stays as it was issued", async () => {
    const { company, at } = await anIssuedProject();
    const read = await company.estimator.ok("getRevisionTakeoff", { params: at });
    expect(read.pieces.length).toBeGreaterThan(0);
    expect(JSON.stringify(read)).not.toMatch(PRICES);
  });

  test("gives the company's own ratios, one for each project, and no other company's", async () => {
    const { company, issued, at } = await anIssuedProject();
    const { items } = await company.estimator.ok("listTakeoffRatios");
    expect(items.map(({ projectId }) => projectId)).toEqual([issued.project.id]);
    const { pieces } = await company.estimator.ok("getRevisionTakeoff", { params: at });
    const weight = pieces.reduce((sum, { weight_kg }) => sum + weight_kg, 0);
    const length = pieces.reduce((sum, { kind, length_m }) => sum + (kind === "straight" ? length_m : 0), 0);
    expect(items[0]?.ratios.metalPerLength_kg_per_m).toBeCloseTo(weight / length, 9);
    expect(items[0]?.ratios.metalPerAirflow_kg_per_m3s).toBeGreaterThan(0);
    expect((await (await foundCompany()).estimator.ok("listTakeoffRatios")).items).toEqual([]);
  });
});
