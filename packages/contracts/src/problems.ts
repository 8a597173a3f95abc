/** Every problem the API can answer with (RFC 9457): code, status, title. The web handles them in an exhaustive switch. */
import { z } from "zod";

export const PROBLEMS = {
  "not-valid": { status: 422, title: "Some of what was sent cannot be used" },
  "not-json": { status: 400, title: "The request is not readable" },
  "signed-out": { status: 401, title: "Sign in to go on" },
  "credentials-wrong": { status: 401, title: "This e-mail and password do not go together" },
  "origin-refused": { status: 403, title: "The request came from another site" },
  "role-may-not": { status: 403, title: "Your role does not allow this" },
  "not-found": { status: 404, title: "There is nothing here" },
  "method-not-allowed": { status: 405, title: "This address does not take that method" },
  "wrong-state": { status: 409, title: "This is not possible in the present state" },
  "email-taken": { status: 409, title: "There is an account with this e-mail" },
  "still-running": { status: 409, title: "The same request is still being worked on" },
  "layout-conflict": { status: 409, title: "Someone else changed the same thing" },
  "link-not-valid": { status: 410, title: "This link is no longer valid" },
  stale: { status: 412, title: "Someone saved before you" },
  "file-too-large": { status: 413, title: "The file is too large" },
  "file-type-refused": { status: 415, title: "This type of file is not accepted" },
  "layout-refused": { status: 422, title: "The layout cannot be saved as it is" },
  "cannot-be-computed": { status: 422, title: "The numbers cannot be computed yet" },
  "idempotency-mismatch": { status: 422, title: "This key was used for another request" },
  "version-missing": { status: 428, title: "The request does not say which version it builds on" },
  "too-many-requests": { status: 429, title: "Too many tries; wait a little" },
  "went-wrong": { status: 500, title: "Something went wrong on our side" },
} as const satisfies Record<string, { status: number; title: string }>;

export type ProblemCode = keyof typeof PROBLEMS;

export const problemDetail = z.object({
  type: z.string().regex(/^\/problems\/[a-z-]+$/),
  title: z.string(),
  status: z.int(),
  detail: z.string(),
  instance: z.string(),
  errors: z
    .array(
      z.object({
        /** JSON pointer into the body, such as `/lines/3/quantity`; empty for the whole. */
        pointer: z.string(),
        code: z.string(),
        /** What is allowed, in words. */
        message: z.string(),
        value: z.unknown().optional(),
      }),
    )
    .optional(),
});
export type ProblemDetail = z.infer<typeof problemDetail>;
