import type { ErrorRequestHandler } from "express";
import { MulterError } from "multer";
import type { Logger } from "pino";
import { HttpProblem, problem } from "./problem.ts";

/** Every error leaves as a problem detail; what we did not foresee says nothing of our insides and is logged whole. */
export const sendProblems =
  (log: Logger): ErrorRequestHandler =>
  (error: unknown, request, response, next) => {
    if (response.headersSent) return next(error);
    const known = asProblem(error);
    if (known.status >= 500) log.error({ err: error, requestId: request.id }, "request failed");
    response
      .status(known.status)
      .type("application/problem+json")
      .set("cache-control", "no-store")
      .send(JSON.stringify(known.toDetail(requestId(request))));
  };

/** Made as text when the request came in. */
const requestId = (request: { id: unknown }): string => (typeof request.id === "string" ? request.id : "");

function asProblem(error: unknown): HttpProblem {
  if (error instanceof HttpProblem) return error;
  if (error instanceof MulterError)
    return error.code === "LIMIT_FILE_SIZE"
      ? problem("file-too-large", "50 MB at most.")
      : problem("not-valid", "Send one file, in the part named file.");
  const type = typeof error === "object" && error !== null && "type" in error ? String(error.type) : "";
  if (type === "entity.too.large") return problem("file-too-large", "The request is larger than is accepted here.");
  if (type.startsWith("entity.") || type.startsWith("encoding.") || type.startsWith("charset."))
    return problem("not-json", "The body is not readable JSON.");
  if (error instanceof URIError) return problem("not-found", "There is nothing at this address.");
  return problem("went-wrong", "The request could not be carried out. Nothing was changed; try again.");
}
