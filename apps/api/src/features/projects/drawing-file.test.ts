import PDFDocument from "pdfkit";
import { deflateSync } from "node:zlib";
import { describe, expect, test } from "vitest";
import { inspectDrawing, pdfPageCount } from "./drawing-file.ts";

function pdf(pages: number): Promise<Buffer> {
  const doc = new PDFDocument({ size: "A4", autoFirstPage: false });
  const chunks: Buffer[] = [];
  doc.on("data", (chunk: Buffer) => chunks.push(chunk));
  for (let page = 1; page <= pages; page++) doc.addPage().text(`Sheet ${page}`);
  doc.end();
  return new Promise((resolve) => doc.on("end", () => resolve(Buffer.concat(chunks))));
}

/** The smallest PNG there is: one pixel. */
const png = Buffer.from(
  "iVBORw0KGgoAAAANSUhEUgAAAAEAAAABCAYAAAAfFcSJAAAADUlEQVR42mNk+M9QDwADhgGAWjR9awAAAABJRU5ErkJggg==",
  "base64",
);

describe("what an uploaded file is", () => {
  test("a PDF tells its pages", async () => {
    expect(await inspectDrawing(await pdf(7))).toEqual({
      accepted: true,
      mediaType: "application/pdf",
      pageCount: 7,
    });
  });

  test("a PDF that keeps its page tree in a compressed object stream tells its pages", () => {
    const tree = deflateSync(Buffer.from("1 0 2 60 << /Type /Pages /Kids [2 0 R] /Count 12 >> << /Type /Page >>"));
    const file = Buffer.concat([
      Buffer.from("%PDF-1.7\n3 0 obj << /Type /ObjStm /N 2 /First 9 /Filter /FlateDecode >>\nstream\n"),
      tree,
      Buffer.from("\nendstream\nendobj\nstartxref\n0\n%%EOF\n"),
    ]);
    expect(pdfPageCount(file)).toBe(12);
  });

  test("an image is one page", async () => {
    expect(await inspectDrawing(png)).toEqual({ accepted: true, mediaType: "image/png", pageCount: 1 });
  });

  test("a PDF that was cut off is refused", async () => {
    const whole = await pdf(2);
    expect(await inspectDrawing(whole.subarray(0, whole.length - 2000))).toMatchObject({
      accepted: false,
      reason: "damaged",
    });
  });

  test("a page of script is refused, whatever its name", async () => {
    expect(await inspectDrawing(Buffer.from("<html><script>alert(1)</script></html>"))).toMatchObject({
      accepted: false,
      reason: "other-type",
    });
  });

  test("an SVG is refused, because it can carry script", async () => {
    const svg = Buffer.from('<?xml version="1.0"?><svg xmlns="http://www.w3.org/2000/svg"><script/></svg>');
    expect(await inspectDrawing(svg)).toMatchObject({ accepted: false, reason: "other-type" });
  });

  test("an empty file is refused", async () => {
    expect(await inspectDrawing(Buffer.alloc(0))).toMatchObject({ accepted: false, reason: "empty" });
  });
});
