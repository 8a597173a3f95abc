/** Someone at the front door of the API: speaks its endpoints by name, over real HTTP. */
import {
  endpoints,
  problemDetail,
  type BodyOf,
  type CompanySlug,
  type EndpointName,
  type ParamsOf,
  type PersonId,
  type ProblemDetail,
  type QueryOf,
  type ResponseOf,
} from "@cleatwork/contracts";
import { randomUUID } from "node:crypto";

type Endpoints = typeof endpoints;

export interface TestCall<N extends EndpointName> {
  /** The company is filled in unless it is named. */
  readonly params?: Partial<ParamsOf<Endpoints[N]>>;
  readonly query?: Partial<QueryOf<Endpoints[N]>>;
  readonly body?: BodyOf<Endpoints[N]>;
  readonly version?: number;
  /** Each call has its own unless one is given. */
  readonly idempotencyKey?: string;
  readonly file?: { readonly bytes: Uint8Array<ArrayBuffer>; readonly name: string; readonly mediaType?: string };
  /** Sends a form even without a file. */
  readonly form?: boolean;
  readonly headers?: Readonly<Record<string, string>>;
}

export interface Answered {
  readonly status: number;
  readonly headers: Headers;
  readonly bytes: Buffer;
}

export class TestPerson {
  constructor(
    private readonly server: { readonly url: string; readonly publicUrl: string },
    readonly company: CompanySlug,
    readonly id: PersonId,
    readonly name: string,
    readonly email: string,
    public cookie: string,
  ) {}

  /** The answer, parsed by its contract; a refusal fails the test. */
  async ok<N extends EndpointName>(name: N, call: TestCall<N> = {}): Promise<ResponseOf<Endpoints[N]>> {
    const { status, bytes } = await this.send(name, call);
    if (status >= 400) throw new Error(`${name} was refused: ${bytes.toString("utf8")}`);
    if (status === 204) return undefined as ResponseOf<Endpoints[N]>;
    return endpoints[name].response.parse(JSON.parse(bytes.toString("utf8"))) as ResponseOf<Endpoints[N]>;
  }

  /** The problem; an answer fails the test. */
  async refused<N extends EndpointName>(name: N, call: TestCall<N> = {}): Promise<ProblemDetail> {
    const { status, headers, bytes } = await this.send(name, call);
    if (status < 400) throw new Error(`${name} was not refused: ${status}`);
    if (!headers.get("content-type")?.startsWith("application/problem+json"))
      throw new Error(`${name} answered ${status} without a problem detail`);
    return problemDetail.parse(JSON.parse(bytes.toString("utf8")));
  }

  download<N extends EndpointName>(name: N, call: TestCall<N> = {}): Promise<Answered> {
    return this.send(name, call);
  }

  /** Whatever is answered, a refusal too. */
  async send<N extends EndpointName>(name: N, call: TestCall<N> = {}): Promise<Answered> {
    const endpoint = endpoints[name];
    const response = await fetch(`${this.server.url}/api${this.pathOf(name, call)}`, {
      method: endpoint.method.toUpperCase(),
      headers: { ...this.headersOf(name, call), ...call.headers },
      body: bodyOf(call),
    });
    for (const cookie of response.headers.getSetCookie()) this.cookie = cookie.split(";")[0] ?? "";
    return { status: response.status, headers: response.headers, bytes: Buffer.from(await response.arrayBuffer()) };
  }

  private pathOf<N extends EndpointName>(name: N, call: TestCall<N>): string {
    const params: Record<string, string> = {
      company: this.company,
      ...(call.params as Record<string, string> | undefined),
    };
    const path = endpoints[name].path.replace(/:(\w+)/g, (_, key: string) => encodeURIComponent(params[key] ?? ""));
    const search = new URLSearchParams(
      Object.entries(call.query ?? {}).map(([key, value]): [string, string] => [key, String(value)]),
    );
    return `${path}${search.size > 0 ? `?${search.toString()}` : ""}`;
  }

  private headersOf<N extends EndpointName>(name: N, call: TestCall<N>): Record<string, string> {
    const headers: Record<string, string> = { origin: this.server.publicUrl };
    if (this.cookie) headers["cookie"] = this.cookie;
    if (call.version !== undefined) headers["if-match"] = `"${call.version}"`;
    if (endpoints[name].guards.some((guard) => guard === "idempotency-key"))
      headers["idempotency-key"] = call.idempotencyKey ?? randomUUID();
    if (call.body !== undefined && !call.file && !call.form) headers["content-type"] = "application/json";
    return headers;
  }
}

function bodyOf(call: TestCall<EndpointName>): string | FormData | null {
  if (!call.file && !call.form) return call.body === undefined ? null : JSON.stringify(call.body);
  const form = new FormData();
  for (const [key, value] of Object.entries((call.body ?? {}) as Record<string, string>)) form.append(key, value);
  const { file } = call;
  if (file)
    form.append("file", new Blob([file.bytes], { type: file.mediaType ?? "application/octet-stream" }), file.name);
  return form;
}
