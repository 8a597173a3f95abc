import type { z } from "zod";
import { problem, type ProblemErrors } from "./problem.ts";

/** Parses what was sent, or refuses it with every field, what was typed, and what is allowed. */
export function parse<S extends z.ZodType>(schema: S, input: unknown, where: "" | "/query"): z.infer<S> {
  const parsed = schema.safeParse(input, { reportInput: true });
  if (parsed.success) return parsed.data;
  throw problem("not-valid", "Look at the fields named below.", errorsOf(parsed.error, where));
}

/** Values of such fields are never sent back. */
const SECRET = /password|token/i;

export function errorsOf(error: z.ZodError, where = ""): ProblemErrors {
  return error.issues.flatMap((issue) => {
    if (issue.code === "unrecognized_keys")
      return issue.keys.map((key) => ({
        pointer: pointerOf(where, [...issue.path, key]),
        code: "unknown-field",
        message: "this field is not known here",
      }));
    const pointer = pointerOf(where, issue.path);
    return [
      {
        pointer,
        code: issue.code.replaceAll("_", "-"),
        message: issue.message,
        ...(issue.input === undefined || SECRET.test(pointer) || typeof issue.input === "object"
          ? {}
          : { value: issue.input }),
      },
    ];
  });
}

const pointerOf = (where: string, path: readonly PropertyKey[]): string =>
  where + path.map((part) => `/${String(part).replaceAll("~", "~0").replaceAll("/", "~1")}`).join("");
