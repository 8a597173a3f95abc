import type { RequestHandler } from "express";
import { problem } from "./problem.ts";

/** A request that changes something must come from our own pages: a browser always says where it comes from. */
export function checkOrigin(publicUrl: string): RequestHandler {
  const own = new URL(publicUrl).origin;
  return (request, _response, next) => {
    if (request.method === "GET" || request.method === "HEAD" || request.method === "OPTIONS") return next();
    const origin = request.get("origin");
    const site = request.get("sec-fetch-site");
    if (origin === undefined ? site === undefined || site === "same-origin" || site === "none" : origin === own)
      return next();
    next(problem("origin-refused", "Requests that change something are taken from this site's own pages only."));
  };
}
