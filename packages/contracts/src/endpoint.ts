/**
 * An endpoint is a row: name, method, path, who may, what goes in, what comes out. The API mounts these rows, the web
 * calls them, the OpenAPI document and the isolation test are made from them.
 */
import { z } from "zod";
import * as ids from "./ids.ts";
import type { Permission } from "./permissions.ts";

export const pathParameters = {
  company: ids.companySlug,
  personId: ids.personId,
  invitationId: ids.invitationId,
  clientId: ids.clientId,
  projectId: ids.projectId,
  drawingId: ids.drawingId,
  specId: ids.specId,
  quoteId: ids.quoteId,
  revisionId: ids.revisionId,
  linkId: ids.quoteLinkId,
  itemKey: z.string().min(1).max(120),
  token: z.string().regex(/^[A-Za-z0-9_-]{43}$/),
} as const;
export type PathParameter = keyof typeof pathParameters;

type ParameterNames<Path extends string> = Path extends `${string}:${infer Name}/${infer Rest}`
  ? Name | ParameterNames<`/${Rest}`>
  : Path extends `${string}:${infer Name}`
    ? Name
    : never;

export type PathParameters<Path extends string> = {
  readonly [N in ParameterNames<Path> & PathParameter]: z.infer<(typeof pathParameters)[N]>;
};

export type Access =
  | { readonly kind: "member"; readonly permission: Permission }
  | { readonly kind: "signed-in" }
  | { readonly kind: "open"; readonly why: string };

export const member = (permission: Permission) => ({ kind: "member", permission }) as const;
export const signedIn = { kind: "signed-in" } as const;
export const open = (why: string) => ({ kind: "open", why }) as const;

/** What guards a write beyond permission. */
export type Guard = "if-match" | "idempotency-key";

export interface Endpoint<
  Path extends string = string,
  Query extends z.ZodType = z.ZodType,
  Body extends z.ZodType = z.ZodType,
  Response extends z.ZodType = z.ZodType,
  Kind extends Access = Access,
  Answers extends "json" | "file" = "json" | "file",
> {
  readonly method: "get" | "post" | "put" | "patch" | "delete";
  /** Below `/api`. */
  readonly path: Path;
  readonly access: Kind;
  readonly summary: string;
  readonly query: Query;
  /** For `takes: "file"` the text fields beside the file. */
  readonly body: Body;
  readonly response: Response;
  readonly status: 200 | 201 | 202 | 204;
  readonly guards: readonly Guard[];
  /** "file": multipart/form-data with one part named `file`. */
  readonly takes: "json" | "file";
  /** "file": bytes with a content type; the response schema is then unused. */
  readonly answers: Answers;
}

const nothing = z.undefined();

type Row<
  Path extends string,
  Q extends z.ZodType,
  B extends z.ZodType,
  R extends z.ZodType,
  K extends Access,
  A extends "json" | "file",
> = Pick<Endpoint<Path, Q, B, R, K>, "method" | "path" | "access" | "summary"> & {
  query?: Q;
  body?: B;
  response?: R;
  status?: Endpoint["status"];
  guards?: readonly Guard[];
  takes?: Endpoint["takes"];
  answers?: A;
};

export function endpoint<
  const Path extends string,
  Q extends z.ZodType = z.ZodUndefined,
  B extends z.ZodType = z.ZodUndefined,
  R extends z.ZodType = z.ZodUndefined,
  const K extends Access = Access,
  const A extends "json" | "file" = "json",
>(row: Row<Path, Q, B, R, K, A>): Endpoint<Path, Q, B, R, K, A> {
  return {
    query: nothing as unknown as Q,
    body: nothing as unknown as B,
    response: nothing as unknown as R,
    status: row.response ? 200 : 204,
    guards: [],
    takes: "json",
    answers: "json" as A,
    ...row,
  };
}

export type QueryOf<E extends Endpoint> = z.infer<E["query"]>;
export type BodyOf<E extends Endpoint> = z.infer<E["body"]>;
export type ResponseOf<E extends Endpoint> = z.infer<E["response"]>;
export type ParamsOf<E extends Endpoint> = PathParameters<E["path"]>;
