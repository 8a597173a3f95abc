import type { Response } from "express";
import { pipeline } from "node:stream/promises";
import type { FileAnswer } from "./route.ts";

/** Someone else's bytes: never sniffed, never allowed to run anything, named for the person who saves them. */
export async function sendFile(response: Response, file: FileAnswer): Promise<void> {
  const plainName = file.fileName.replace(/[^\w.() -]/g, "_");
  response.status(200).set({
    "content-type": file.mediaType,
    "content-disposition": `${file.inline ? "inline" : "attachment"}; filename="${plainName}"; filename*=UTF-8''${encodeURIComponent(file.fileName)}`,
    "content-security-policy": "default-src 'none'; style-src 'unsafe-inline'; sandbox",
    "x-content-type-options": "nosniff",
    "cache-control": "private, no-cache",
  });
  if (Buffer.isBuffer(file.bytes)) response.end(file.bytes);
  else await pipeline(file.bytes, response);
}
