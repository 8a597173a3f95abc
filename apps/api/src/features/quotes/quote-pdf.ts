/** The quote as a letter on paper: what is offered, for how much, what is in it and what is not. */
import { formatMoney } from "@cleatwork/calc";
import type { Address, ClientQuote } from "@cleatwork/contracts";
import { Sheet, type Style } from "../../platform/pdf/sheet.ts";

/** What the letter is made from: the client's own view of the quote, so that no cost can reach the paper. */
export interface QuoteLetter extends ClientQuote {
  readonly clientAddress: Address;
  readonly siteAddress: Address;
  readonly recipients: readonly string[];
  readonly paper: "LETTER" | "A4";
  /** A draft says so on every page and has no record to compare. */
  readonly isDraft: boolean;
}

const INK = "#16202A";
const SOFT = "#4A5760";
const LINE = "#C9D0D4";
const plain: Style = { font: "regular", size: 10, color: INK };
const soft: Style = { ...plain, color: SOFT };
const strong: Style = { ...plain, font: "medium" };

export async function quotePdf(quote: QuoteLetter): Promise<Buffer> {
  const sheet = new Sheet({
    title: `Quote ${quote.quoteNumber}, revision ${quote.revision}, ${quote.projectName}`,
    author: quote.company.name,
    size: quote.paper,
  });
  const brand = darkEnough(quote.company.brandColor);
  head(sheet, quote, brand);
  parties(sheet, quote, brand);
  offer(sheet, quote);
  sheet.write(quote.greeting, plain);
  parts(sheet, quote);
  section(sheet, "Scope", quote.scope, brand);
  twoLists(sheet, quote, brand);
  list(sheet, "Clarifications", quote.clarifications, brand);
  list(sheet, "Addenda acknowledged", quote.addenda, brand);
  section(sheet, "Terms", quote.terms, brand);
  signature(sheet, quote, brand);
  caution(sheet);
  const record = quote.isDraft ? "DRAFT, not issued" : `Record ${recordOf(quote.snapshotHash)}`;
  sheet.foot(
    (page, pages) => ({
      left: `Quote ${quote.quoteNumber}, revision ${quote.revision} · ${quote.projectName}`,
      right: `${record} · page ${page} of ${pages}`,
    }),
    SOFT,
  );
  return sheet.bytes();
}

function head(sheet: Sheet, quote: QuoteLetter, brand: string): void {
  const { company } = quote;
  const top = sheet.y;
  const name = sheet.put(
    company.name,
    { font: "bold", size: 17, color: brand },
    { x: sheet.left, y: top, width: sheet.width * 0.55 },
  );
  const lines = [
    oneLine(company.address),
    company.phone,
    company.licenseNumber ? `License ${company.licenseNumber}` : "",
  ].filter(Boolean);
  const side = sheet.put(
    lines.join("\n"),
    { ...soft, size: 9, align: "right" },
    { x: sheet.left + sheet.width * 0.5, y: top + 2, width: sheet.width * 0.5 },
  );
  sheet.y = top + Math.max(name, side) + 8;
  sheet.rule(brand, 1.75);
  sheet.space(18);
}

function parties(sheet: Sheet, quote: QuoteLetter, brand: string): void {
  const third = sheet.width / 3;
  const columns = [
    { title: "For", lines: [quote.clientName, ...quote.recipients, oneLine(quote.clientAddress)] },
    { title: "Project", lines: [quote.projectName, oneLine(quote.siteAddress)] },
    {
      title: quote.isDraft ? "Draft" : `Quote ${quote.quoteNumber}, revision ${quote.revision}`,
      lines: [dayInWords(quote.issuedAt), `Valid through ${dayInWords(quote.validUntilOn)}`],
    },
  ];
  const heights = columns.map(({ title, lines }, index) => {
    const at = { x: sheet.left + index * third, width: third - 12 };
    let height = sheet.put(title, { font: "medium", size: 8.5, color: brand }, { ...at, y: sheet.y }) + 2;
    for (const [position, line] of lines.filter(Boolean).entries())
      height += sheet.put(line, position === 0 && index < 2 ? strong : plain, { ...at, y: sheet.y + height });
    return height;
  });
  sheet.space(Math.max(...heights) + 20);
}

function offer(sheet: Sheet, quote: QuoteLetter): void {
  const price = formatMoney(quote.price_minor, quote.currency).text;
  const title: Style = { font: "medium", size: 15, color: INK };
  const amount: Style = { font: "bold", size: 22, color: INK, align: "right" };
  const height = Math.max(sheet.heightOf(quote.title, title, sheet.width * 0.55), sheet.heightOf(price, amount));
  sheet.put(quote.title, title, {
    x: sheet.left,
    y: sheet.y + height - sheet.heightOf(quote.title, title, sheet.width * 0.55) - 2,
    width: sheet.width * 0.55,
  });
  sheet.put(price, amount, { x: sheet.left + sheet.width * 0.5, y: sheet.y, width: sheet.width * 0.5 });
  sheet.space(height + 6);
  sheet.rule(LINE);
  sheet.space(12);
}

function parts(sheet: Sheet, quote: QuoteLetter): void {
  if (quote.parts.length === 0) return;
  sheet.space(8);
  for (const part of quote.parts) {
    sheet.need(24);
    sheet.put(part.name, strong, { x: sheet.left, y: sheet.y, width: sheet.width * 0.7 });
    sheet.put(
      formatMoney(part.price_minor, quote.currency).text,
      { ...plain, align: "right" },
      { x: sheet.left, y: sheet.y, width: sheet.width },
    );
    sheet.space(17);
    sheet.rule(LINE, 0.5);
    sheet.space(6);
  }
  sheet.need(30);
  sheet.space(-6);
  sheet.rule(INK, 1.25);
  sheet.space(7);
  const total: Style = { font: "bold", size: 11, color: INK };
  sheet.put("Price", total, { x: sheet.left, y: sheet.y, width: sheet.width / 2 });
  sheet.put(
    formatMoney(quote.price_minor, quote.currency).text,
    { ...total, align: "right" },
    { x: sheet.left, y: sheet.y, width: sheet.width },
  );
  sheet.space(24);
}

function section(sheet: Sheet, title: string, text: string, brand: string): void {
  if (text.trim() === "") return;
  heading(sheet, title, brand);
  sheet.write(text, plain);
}

function heading(sheet: Sheet, title: string, brand: string): void {
  sheet.need(48);
  sheet.space(8);
  sheet.space(
    sheet.put(title, { font: "medium", size: 11, color: brand }, { x: sheet.left, y: sheet.y, width: sheet.width }) + 4,
  );
}

/** What is in beside what is not, as long as both fit on the page; one below the other when they do not. */
function twoLists(sheet: Sheet, quote: QuoteLetter, brand: string): void {
  const half = (sheet.width - 24) / 2;
  const heightOf = (lines: readonly string[], width: number) =>
    lines.reduce((sum, line) => sum + sheet.heightOf(line, plain, width - 14) + 4, 24);
  const height = Math.max(heightOf(quote.inclusions, half), heightOf(quote.exclusions, half));
  if (quote.inclusions.length === 0 || quote.exclusions.length === 0 || height > sheet.bottom - 80) {
    list(sheet, "Included", quote.inclusions, brand, "+");
    list(sheet, "Not included", quote.exclusions, brand, "–");
    return;
  }
  sheet.need(height + 12);
  sheet.space(10);
  const top = sheet.y;
  for (const [index, [title, lines, mark]] of (
    [
      ["Included", quote.inclusions, "+"],
      ["Not included", quote.exclusions, "–"],
    ] as const
  ).entries()) {
    const x = sheet.left + index * (half + 24);
    let y = top + sheet.put(title, { font: "medium", size: 11, color: brand }, { x, y: top, width: half }) + 4;
    for (const line of lines) {
      sheet.put(mark, { ...strong, color: brand }, { x, y, width: 12 });
      y += sheet.put(line, plain, { x: x + 14, y, width: half - 14 }) + 4;
    }
  }
  sheet.y = top + height;
}

function list(sheet: Sheet, title: string, lines: readonly string[], brand: string, mark = "·"): void {
  if (lines.length === 0) return;
  heading(sheet, title, brand);
  for (const line of lines) {
    const height = sheet.heightOf(line, plain, sheet.width - 14);
    sheet.need(height);
    sheet.put(mark, { ...strong, color: brand }, { x: sheet.left, y: sheet.y, width: 12 });
    sheet.put(line, plain, { x: sheet.left + 14, y: sheet.y, width: sheet.width - 14 });
    sheet.space(height + 4);
  }
}

function signature(sheet: Sheet, quote: QuoteLetter, brand: string): void {
  sheet.need(110);
  sheet.space(22);
  const half = (sheet.width - 24) / 2;
  const top = sheet.y;
  sheet.put(`${quote.estimator.name}, estimator\n${quote.estimator.email}\n${quote.company.phone}`, plain, {
    x: sheet.left,
    y: top,
    width: half,
  });
  const x = sheet.left + half + 24;
  sheet.put("Accepted for the client", { font: "medium", size: 8.5, color: brand }, { x, y: top, width: half });
  for (const [index, label] of ["Name and title", "Date and purchase order"].entries()) {
    const y = top + 34 + index * 34;
    sheet.doc
      .moveTo(x, y)
      .lineTo(x + half, y)
      .lineWidth(0.5)
      .strokeColor(INK)
      .stroke();
    sheet.put(label, { ...soft, size: 8 }, { x, y: y + 3, width: half });
  }
  sheet.y = top + 90;
}

function caution(sheet: Sheet): void {
  const text =
    "Sizing and construction results are an aid to licensed judgment. The adopted code, the project specification and the authority having jurisdiction govern.";
  const style: Style = { ...soft, size: 8 };
  sheet.need(sheet.heightOf(text, style) + 8);
  sheet.space(8);
  sheet.write(text, style);
}

const oneLine = ({ line1, line2, city, region, postalCode }: Address): string =>
  [line1, line2, city, [region, postalCode].filter(Boolean).join(" ")].filter(Boolean).join(", ");

const dayInWords = (day: string): string =>
  new Intl.DateTimeFormat("en-US", { dateStyle: "long", timeZone: "UTC" }).format(
    new Date(`${day.slice(0, 10)}T00:00:00Z`),
  );

export const recordOf = (hash: string): string => (hash.slice(0, 12).toUpperCase().match(/.{4}/g) ?? []).join(" ");

/** A pale brand color cannot be read on paper: text falls back to ink below 3 to 1 (WCAG 2.2, 1.4.11). */
function darkEnough(color: string): string {
  const channel = (at: number) => {
    const value = Number.parseInt(color.slice(at, at + 2), 16) / 255;
    return value <= 0.04045 ? value / 12.92 : ((value + 0.055) / 1.055) ** 2.4;
  };
  const luminance = 0.2126 * channel(1) + 0.7152 * channel(3) + 0.0722 * channel(5);
  return 1.05 / (luminance + 0.05) >= 3 ? color : INK;
}
