/** Mounts the endpoint table: one pipeline for every route, in the order of the checks. */
import { pathParameters, roleMay, type Endpoint, type PathParameter, type PersonId } from "@cleatwork/contracts";
import { Router, type Request, type RequestHandler, type Response } from "express";
import multer from "multer";
import { queriesSoFar, withQueryCount } from "../db/query-count.ts";
import type { Caller, Sessions } from "../sessions/sessions.ts";
import { onlyOnce } from "./idempotency.ts";
import { limiterFor } from "./limits.ts";
import { parse } from "./parse.ts";
import { problem } from "./problem.ts";
import type { Deps, FileAnswer } from "./route.ts";
import { sendFile } from "./send-file.ts";

/** As the table sees a handler: what each wants exactly is checked where the feature defines it. */
export type AnyHandler = (context: never) => Promise<unknown>;

const MAX_UPLOAD_BYTES = 50 * 2 ** 20;

export function mount(
  table: Readonly<Record<string, Endpoint>>,
  handlers: Readonly<Record<string, AnyHandler>>,
  deps: Deps,
  sessions: Sessions,
): Router {
  const router = Router({ caseSensitive: true });
  for (const [name, row] of Object.entries(table)) {
    const handler = handlers[name];
    if (!handler) throw new Error(`endpoint ${name} has no handler`);
    const chain: RequestHandler[] = [];
    const limiter = limiterFor(name, deps.config);
    if (limiter) chain.push(limiter);
    chain.push((request, response) =>
      withQueryCount(() => answer(name, row, handler, deps, sessions, request, response)),
    );
    router[row.method](row.path, ...chain);
  }
  return router;
}

const upload: RequestHandler = multer({
  storage: multer.memoryStorage(),
  // Browsers send file names as UTF-8; without this they arrive as Latin-1.
  defParamCharset: "utf8",
  limits: { fileSize: MAX_UPLOAD_BYTES, files: 1, fields: 20, fieldSize: 64 * 1024 },
}).single("file");

const received = (request: Request, response: Response): Promise<void> =>
  new Promise((resolve, reject) => {
    void upload(request, response, (error: unknown) => {
      if (error instanceof Error) reject(error);
      else resolve();
    });
  });

async function answer(
  name: string,
  row: Endpoint,
  handler: AnyHandler,
  deps: Deps,
  sessions: Sessions,
  request: Request,
  response: Response,
): Promise<void> {
  const caller = await callerOf(row, sessions, request, response);
  const params = parseParams(request.params);
  const member = memberOf(row, caller, params["company"], deps);
  // Only who may send a file is listened to: a stranger's megabytes are never held.
  if (row.takes === "file") await received(request, response);
  const query = row.query.type === "undefined" ? undefined : parse(row.query, request.query, "/query");
  const body = row.body.type === "undefined" ? undefined : parse(row.body, bodyOf(row, request), "");
  const version = row.guards.includes("if-match") ? versionOf(request) : 0;

  const context = {
    ...member,
    ...(caller ? { person: caller.person, memberships: caller.memberships } : {}),
    params,
    query,
    body,
    version,
    deps,
    request: {
      id: request.id,
      ip: request.ip ?? "",
      userAgent: request.get("user-agent")?.slice(0, 300) ?? "",
      file: request.file ? { bytes: request.file.buffer, name: request.file.originalname } : null,
    },
    session: {
      start: async (personId: PersonId) => {
        await sessions.end(request.headers.cookie ?? "");
        const agent = request.get("user-agent") ?? null;
        response.append("set-cookie", await sessions.start(personId, { ip: request.ip ?? null, userAgent: agent }));
      },
      end: async () => {
        response.append("set-cookie", await sessions.end(request.headers.cookie ?? ""));
      },
    },
  };

  const work = () => (handler as (context: unknown) => Promise<unknown>)(context);
  const result =
    row.guards.includes("idempotency-key") && member && caller
      ? await onlyOnce(
          {
            tenant: member.tenant,
            personId: caller.person.id,
            key: request.get("idempotency-key"),
            endpoint: name,
            request: { params, body },
            status: row.status,
          },
          work,
        )
      : await work();

  if (deps.config.environment !== "production") response.set("x-db-queries", String(queriesSoFar()));
  if (row.answers === "file") return sendFile(response, result as FileAnswer);
  response.set("cache-control", "no-store");
  if (row.response.type === "undefined") return void response.status(204).end();
  // Answers pass through their contract: what it does not name never leaves.
  const sent = row.response.parse(result);
  if (typeof sent === "object" && sent !== null && "version" in sent) response.set("etag", `"${String(sent.version)}"`);
  response.status(row.status).json(sent);
}

async function callerOf(
  row: Endpoint,
  sessions: Sessions,
  request: Request,
  response: Response,
): Promise<Caller | null> {
  if (row.access.kind === "open") return null;
  const caller = await sessions.read(request.headers.cookie ?? "");
  if (!caller) throw problem("signed-out", "Sign in, then try again.");
  if (caller.freshCookie) response.append("set-cookie", caller.freshCookie);
  return caller;
}

/** Only a membership makes a company's database. A company one does not belong to is not there. */
function memberOf(row: Endpoint, caller: Caller | null, slug: string | undefined, deps: Deps) {
  if (row.access.kind !== "member") return null;
  const company = caller?.memberships.find((membership) => membership.slug === slug);
  if (!company) throw problem("not-found", "There is no such company among yours.");
  if (!roleMay(company.role, row.access.permission))
    throw problem(
      "role-may-not",
      `As ${company.role} you may not do this. An owner of ${company.name} can change that.`,
    );
  return { tenant: deps.db.tenant(company.organizationId), company, role: company.role };
}

function parseParams(raw: Request["params"]): Record<string, string> {
  const params: Record<string, string> = {};
  for (const [name, value] of Object.entries(raw)) {
    const parsed = pathParameters[name as PathParameter].safeParse(value);
    // An address that cannot name anything is like one that names nothing.
    if (!parsed.success) throw problem("not-found", "There is nothing at this address.");
    params[name] = parsed.data;
  }
  return params;
}

function bodyOf(row: Endpoint, request: Request): unknown {
  if (row.takes === "file") return { ...(request.body as Record<string, unknown> | undefined) };
  if (request.body === undefined) throw problem("not-json", "Send the request's body as application/json.");
  return request.body as unknown;
}

function versionOf(request: Request): number {
  const header = request.get("if-match");
  if (header === undefined) throw problem("version-missing", "Send If-Match with the version that you have seen.");
  const version = Number(/^(?:W\/)?"(\d{1,9})"$/.exec(header)?.[1]);
  if (!Number.isInteger(version)) throw problem("stale", "The version in If-Match is none that was ever given out.");
  return version;
}
