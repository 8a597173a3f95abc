/** One person at the front door: keeps the session cookie and speaks the endpoints of the contracts. */
import {
  endpoints,
  type BodyOf,
  type EndpointName,
  type ParamsOf,
  type ProblemDetail,
  type ResponseOf,
} from "@cleatwork/contracts";
import { randomUUID } from "node:crypto";

type Endpoints = typeof endpoints;

interface Call<N extends EndpointName> {
  params: ParamsOf<Endpoints[N]>;
  body?: BodyOf<Endpoints[N]> | undefined;
  version?: number;
  file?: { name: string; mediaType: string; bytes: Uint8Array<ArrayBuffer> };
}

export class Refused extends Error {
  readonly code: string;
  constructor(name: string, problem: ProblemDetail) {
    const errors = (problem.errors ?? []).map((error) => ` ${error.pointer} ${error.message}`).join(";");
    super(`${name}: ${problem.status} ${problem.detail}${errors}`);
    this.code = problem.type.replace("/problems/", "");
  }
}

export class ApiClient {
  readonly #apiUrl: string;
  #cookie = "";

  constructor(apiUrl: string) {
    this.#apiUrl = apiUrl.replace(/\/$/, "");
  }

  async call<N extends EndpointName>(name: N, call: Call<N>): Promise<ResponseOf<Endpoints[N]>> {
    const endpoint = endpoints[name];
    const params = call.params as Record<string, string>;
    const path = endpoint.path.replace(/:(\w+)/g, (_, key: string) => encodeURIComponent(params[key] ?? ""));
    const headers: Record<string, string> = { origin: this.#apiUrl };
    if (this.#cookie) headers.cookie = this.#cookie;
    if (call.version !== undefined) headers["if-match"] = `"${call.version}"`;
    if (endpoint.guards.some((guard) => guard === "idempotency-key")) headers["idempotency-key"] = randomUUID();

    let body: string | FormData | undefined;
    if (call.file) {
      body = new FormData();
      for (const [key, value] of Object.entries(call.body as Record<string, string>)) body.append(key, value);
      body.append("file", new Blob([call.file.bytes], { type: call.file.mediaType }), call.file.name);
    } else if (call.body !== undefined) {
      headers["content-type"] = "application/json";
      body = JSON.stringify(call.body);
    }

    const response = await fetch(`${this.#apiUrl}/api${path}`, {
      method: endpoint.method.toUpperCase(),
      headers,
      ...(body === undefined ? {} : { body }),
    });
    for (const cookie of response.headers.getSetCookie()) this.#cookie = cookie.split(";")[0] ?? "";
    if (!response.ok) throw new Refused(name, (await response.json()) as ProblemDetail);
    if (response.status === 204) return undefined as ResponseOf<Endpoints[N]>;
    return (await response.json()) as ResponseOf<Endpoints[N]>;
  }
}
