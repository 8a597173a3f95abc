/** What an uploaded file is, told by its content: never by its name or the browser's word. */
import { inflateSync } from "node:zlib";
import { fileTypeFromBuffer } from "file-type";

export const DRAWING_MEDIA_TYPES = ["application/pdf", "image/png", "image/jpeg"] as const;
export type DrawingMediaType = (typeof DRAWING_MEDIA_TYPES)[number];

export type DrawingFile =
  | { readonly accepted: true; readonly mediaType: DrawingMediaType; readonly pageCount: number }
  | { readonly accepted: false; readonly reason: "empty" | "other-type" | "damaged"; readonly found: string };

/** Largest text inflated from one object stream; page trees are small, a bomb is not. */
const INFLATED_LIMIT_BYTES = 16 * 1024 * 1024;
const PAGE_LIMIT = 10_000;

export async function inspectDrawing(bytes: Buffer): Promise<DrawingFile> {
  if (bytes.length === 0) return { accepted: false, reason: "empty", found: "an empty file" };
  const type = await fileTypeFromBuffer(bytes);
  const mediaType = DRAWING_MEDIA_TYPES.find((accepted) => accepted === type?.mime);
  if (!mediaType) return { accepted: false, reason: "other-type", found: type?.mime ?? "an unknown type" };
  if (mediaType !== "application/pdf") return { accepted: true, mediaType, pageCount: 1 };

  const pageCount = pdfPageCount(bytes);
  return pageCount === null
    ? { accepted: false, reason: "damaged", found: mediaType }
    : { accepted: true, mediaType, pageCount };
}

/**
 * Pages of a PDF, read from the largest `/Count` of its page tree; null when the file has no end mark or no page.
 * Not a full reader: it looks at the plain text and at compressed object streams (ISO 32000-1, 7.5.7 and 7.7.3.2). An
 * encrypted file hides its object streams and counts as one page; the viewer will tell more.
 */
export function pdfPageCount(bytes: Buffer): number | null {
  const text = bytes.toString("latin1");
  if (!text.slice(-2048).includes("%%EOF")) return null;

  let pages = 0;
  let largestCount = 0;
  for (const part of [text, ...objectStreams(text, bytes)]) {
    for (const match of part.matchAll(/\/Type\s*\/Pages\b/g)) {
      const around = dictionaryAround(part, match.index);
      const count = Number(/\/Count\s+(\d{1,6})\b/.exec(around)?.[1] ?? 0);
      largestCount = Math.max(largestCount, count);
    }
    pages += [...part.matchAll(/\/Type\s*\/Page\b(?!s)/g)].length;
  }
  const found = Math.min(largestCount || pages, PAGE_LIMIT);
  if (found > 0) return found;
  return /\/Encrypt\b/.test(text) ? 1 : null;
}

function* objectStreams(text: string, bytes: Buffer): Generator<string> {
  for (const match of text.matchAll(/\/Type\s*\/ObjStm\b/g)) {
    const marker = /stream\r?\n/g;
    marker.lastIndex = match.index;
    const start = marker.exec(text);
    if (!start || start.index - match.index > 1000) continue;
    const end = text.indexOf("endstream", start.index);
    if (end < 0) continue;
    try {
      yield inflateSync(bytes.subarray(start.index + start[0].length, end), {
        maxOutputLength: INFLATED_LIMIT_BYTES,
      }).toString("latin1");
    } catch {
      // Encrypted, damaged or too large: this stream tells nothing.
    }
  }
}

/** The innermost `<< … >>` around a place, as far as nesting allows to tell. */
function dictionaryAround(text: string, at: number): string {
  const start = Math.max(text.lastIndexOf("obj", at), text.lastIndexOf("<<", at), 0);
  const end = text.indexOf(">>", at);
  return text.slice(start, end < 0 ? at + 500 : end);
}
