/** Doors that a stranger may knock on are counted by address, and say how long to wait. */
import { rateLimit } from "express-rate-limit";
import type { RequestHandler } from "express";
import type { EndpointName } from "@cleatwork/contracts";
import type { Config } from "../../config.ts";
import { problem } from "./problem.ts";

const MINUTE_MS = 60_000;

/** Tries from one address within the window. */
const LIMITS: Partial<Record<EndpointName, { tries: number; window_ms: number }>> = {
  signUp: { tries: 10, window_ms: 60 * MINUTE_MS },
  signIn: { tries: 20, window_ms: 10 * MINUTE_MS },
  requestPasswordReset: { tries: 10, window_ms: 60 * MINUTE_MS },
  resetPassword: { tries: 20, window_ms: 60 * MINUTE_MS },
  verifyEmail: { tries: 30, window_ms: 60 * MINUTE_MS },
  getInvitation: { tries: 60, window_ms: 10 * MINUTE_MS },
  acceptInvitation: { tries: 20, window_ms: 10 * MINUTE_MS },
  getClientQuote: { tries: 120, window_ms: 10 * MINUTE_MS },
  getClientQuotePdf: { tries: 60, window_ms: 10 * MINUTE_MS },
  acceptQuote: { tries: 20, window_ms: 10 * MINUTE_MS },
  declineQuote: { tries: 20, window_ms: 10 * MINUTE_MS },
};

export function limiterFor(name: string, config: Config): RequestHandler | null {
  const limit = LIMITS[name as EndpointName];
  if (!limit) return null;
  return rateLimit({
    windowMs: limit.window_ms,
    limit: Math.ceil(limit.tries * config.rateLimitFactor),
    standardHeaders: "draft-8",
    legacyHeaders: false,
    handler: (_request, response, next) => {
      const seconds = Number(response.getHeader("retry-after") ?? limit.window_ms / 1000);
      next(problem("too-many-requests", `Try again in ${Math.ceil(seconds / 60)} minutes.`));
    },
  });
}
