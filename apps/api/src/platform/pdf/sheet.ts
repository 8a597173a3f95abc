/** A page to write on from the top down, in points: text that breaks, rules, two columns, and a foot on every page. */
import PDFDocument from "pdfkit";
import { fontFiles, FONTS, type FontName } from "./fonts.ts";

export interface Style {
  readonly font: FontName;
  readonly size: number;
  readonly color: string;
  readonly align?: "left" | "right" | "center";
  /** Space between lines, over the font's own. */
  readonly gap?: number;
}

const MARGIN = { x: 56, top: 52, bottom: 64 };

export class Sheet {
  readonly doc: PDFKit.PDFDocument;
  readonly left = MARGIN.x;
  readonly width: number;
  y = MARGIN.top;
  private readonly chunks: Buffer[] = [];
  private readonly ended: Promise<void>;

  constructor(info: { title: string; author: string; size: "LETTER" | "A4" }) {
    this.doc = new PDFDocument({
      size: info.size,
      bufferPages: true,
      margins: { left: MARGIN.x, right: MARGIN.x, top: MARGIN.top, bottom: MARGIN.bottom },
      info: { Title: info.title, Author: info.author, Creator: "Cleatwork", Producer: "Cleatwork" },
      pdfVersion: "1.7",
      lang: "en-US",
      tagged: true,
      displayTitle: true,
    });
    const fonts = fontFiles();
    for (const name of FONTS) this.doc.registerFont(name, fonts[name]);
    this.width = this.doc.page.width - 2 * MARGIN.x;
    this.doc.on("data", (chunk: Buffer) => this.chunks.push(chunk));
    this.ended = new Promise((resolve, reject) => {
      this.doc.once("end", resolve);
      this.doc.once("error", reject);
    });
  }

  get bottom(): number {
    return this.doc.page.height - MARGIN.bottom;
  }

  /** A new page when less than this is left. */
  need(height: number): void {
    if (this.y + height <= this.bottom) return;
    this.doc.addPage();
    this.y = MARGIN.top;
  }

  space(height: number): void {
    this.y += height;
  }

  heightOf(text: string, style: Style, width = this.width): number {
    return this.doc
      .font(style.font)
      .fontSize(style.size)
      .heightOfString(text, { width, lineGap: style.gap ?? 2 });
  }

  /** Text in a column, broken over lines; does not move `y`. Answers its height. */
  put(text: string, style: Style, at: { x: number; y: number; width: number }): number {
    const height = this.heightOf(text, style, at.width);
    this.doc.font(style.font).fontSize(style.size).fillColor(style.color);
    this.doc.text(text, at.x, at.y, {
      width: at.width,
      align: style.align ?? "left",
      lineGap: style.gap ?? 2,
      features: ["tnum"],
    });
    return height;
  }

  /** Paragraphs over the whole width, each kept on one page where it fits. */
  write(text: string, style: Style): void {
    for (const paragraph of text.split(/\n+/).filter((part) => part.trim() !== "")) {
      this.need(this.heightOf(paragraph, style));
      this.y += this.put(paragraph, style, { x: this.left, y: this.y, width: this.width }) + 4;
    }
  }

  rule(color: string, thickness = 0.75): void {
    this.doc
      .moveTo(this.left, this.y)
      .lineTo(this.left + this.width, this.y)
      .lineWidth(thickness)
      .strokeColor(color)
      .stroke();
  }

  /** Writes on every page after the last is made, since only then the number of pages is known. */
  foot(words: (page: number, pages: number) => { left: string; right: string }, color: string): void {
    const { start, count } = this.doc.bufferedPageRange();
    for (let page = start; page < start + count; page++) {
      this.doc.switchToPage(page);
      // Below the margin pdfkit would begin a new page.
      this.doc.page.margins.bottom = 0;
      const y = this.doc.page.height - 44;
      this.doc
        .moveTo(this.left, y - 8)
        .lineTo(this.left + this.width, y - 8)
        .lineWidth(0.5)
        .strokeColor("#C9D0D4")
        .stroke();
      const { left, right } = words(page - start + 1, count);
      const style: Style = { font: "regular", size: 8, color };
      this.put(left, style, { x: this.left, y, width: this.width / 2 });
      this.put(right, { ...style, align: "right" }, { x: this.left + this.width / 2, y, width: this.width / 2 });
    }
  }

  async bytes(): Promise<Buffer> {
    this.doc.end();
    await this.ended;
    return Buffer.concat(this.chunks);
  }
}
