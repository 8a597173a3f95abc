/** The one client of the API: it knows it by the endpoint table alone, parses answers and throws typed problems. */
import type { BodyOf, Endpoint, ParamsOf, QueryOf, ResponseOf } from "@cleatwork/contracts";
import { AnswerProblem, NetworkProblem, problemFrom } from "./problem.ts";

type Wanted<Key extends string, Value> = undefined extends Value
  ? { readonly [K in Key]?: Value }
  : { readonly [K in Key]: Value };

export type Call<E extends Endpoint> = (keyof ParamsOf<E> extends never
  ? { readonly params?: ParamsOf<E> }
  : { readonly params: ParamsOf<E> }) &
  Wanted<"body", BodyOf<E>> & {
    readonly query?: Partial<QueryOf<E>>;
    /** What was read, for endpoints that want If-Match. */
    readonly version?: number;
    /** Give one to make a second try harmless; otherwise each call gets its own. */
    readonly idempotencyKey?: string;
    readonly file?: File;
    readonly signal?: AbortSignal;
  };

type Given = {
  params?: Readonly<Record<string, string>>;
  query?: Readonly<Record<string, unknown>>;
  body?: unknown;
  version?: number;
  idempotencyKey?: string;
  file?: File;
  signal?: AbortSignal;
};

export const newIdempotencyKey = (): string => crypto.randomUUID();

export async function api<E extends Endpoint>(endpoint: E, call: Call<E>): Promise<ResponseOf<E>> {
  const given = call as Given;
  const response = await send(endpoint, given);
  if (endpoint.status === 204) return undefined as ResponseOf<E>;
  const parsed = endpoint.response.safeParse(await response.json().catch(() => undefined));
  if (!parsed.success) throw new AnswerProblem(`${endpoint.method} ${endpoint.path}`, { cause: parsed.error });
  return parsed.data as ResponseOf<E>;
}

/** Bytes, for endpoints that answer a file. */
export async function apiFile<E extends Endpoint>(endpoint: E, call: Call<E>): Promise<Blob> {
  return (await send(endpoint, call)).blob();
}

/** The address of an endpoint that a link or an image can point to. */
export function apiUrl<E extends Endpoint>(endpoint: E, params: ParamsOf<E>): string {
  return urlOf(endpoint, { params: params });
}

async function send(endpoint: Endpoint, given: Given): Promise<Response> {
  const url = urlOf(endpoint, given);
  const init: RequestInit = {
    method: endpoint.method.toUpperCase(),
    credentials: "same-origin",
    headers: headersOf(endpoint, given),
    ...bodyOf(endpoint, given),
    ...(given.signal ? { signal: given.signal } : {}),
  };
  let response: Response;
  try {
    response = await fetch(url, init);
  } catch (error) {
    if (given.signal?.aborted) throw error;
    throw new NetworkProblem({ cause: error });
  }
  if (!response.ok) throw await problemFrom(response);
  return response;
}

function urlOf(endpoint: Endpoint, given: Given): string {
  const path = endpoint.path.replace(/:(\w+)/g, (_, name: string) => {
    const value = given.params?.[name];
    if (value === undefined) throw new Error(`${endpoint.path} wants ${name}`);
    return encodeURIComponent(value);
  });
  const search = new URLSearchParams();
  for (const [key, value] of Object.entries(given.query ?? {})) {
    if (typeof value === "string" || typeof value === "number") search.set(key, String(value));
  }
  return `/api${path}${search.size > 0 ? `?${search}` : ""}`;
}

function headersOf(endpoint: Endpoint, given: Given): Headers {
  const headers = new Headers({ accept: "application/json, application/problem+json" });
  if (given.body !== undefined && endpoint.takes === "json") headers.set("content-type", "application/json");
  if (endpoint.guards.includes("if-match")) {
    if (given.version === undefined) throw new Error(`${endpoint.path} wants the version that was read`);
    headers.set("if-match", `"${given.version}"`);
  }
  if (endpoint.guards.includes("idempotency-key")) {
    headers.set("idempotency-key", given.idempotencyKey ?? newIdempotencyKey());
  }
  return headers;
}

function bodyOf(endpoint: Endpoint, given: Given): { body?: BodyInit } {
  if (endpoint.takes === "json") return given.body === undefined ? {} : { body: JSON.stringify(given.body) };
  const form = new FormData();
  for (const [key, value] of Object.entries((given.body ?? {}) as Record<string, string>)) form.set(key, value);
  // The file last: what reads the stream knows the fields by then.
  if (given.file) form.set("file", given.file, given.file.name);
  return { body: form };
}
