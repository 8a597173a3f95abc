import { expect, test } from "vitest";
import { takeoffCsv } from "./takeoff-csv.ts";

test("text that a spreadsheet would run is written as text, and numbers stay numbers", () => {
  const rows = [
    ["=HYPERLINK(1)", -2.5],
    ["+1", 3],
    ["plain, with comma", null],
  ];
  const text = takeoffCsv({ title: "Pieces", head: ["Run", "Length, ft"], rows, summed: [] }).toString("utf8");
  expect(text).toBe(`\ufeffRun,"Length, ft"\r\n"'=HYPERLINK(1)",-2.5\r\n"'+1",3\r\n"plain, with comma",\r\n`);
});
