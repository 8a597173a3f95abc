/** Someone of the demo company at the front door, who also sees what a request cost. */
import { endpoints, type BodyOf, type EndpointName, type ResponseOf } from "@cleatwork/contracts";
import type { SignIn, WholeStack } from "@cleatwork/local-stack/stack";

type Endpoints = typeof endpoints;
export interface Answer<N extends EndpointName> {
  readonly body: ResponseOf<Endpoints[N]>;
  readonly databaseRoundTrips: number;
  readonly taken_ms: number;
}
export interface Member {
  readonly company: string;
  call<N extends EndpointName>(
    name: N,
    parameters?: Readonly<Record<string, string>>,
    body?: BodyOf<Endpoints[N]>,
  ): Promise<Answer<N>>;
}

export async function signIn(stack: WholeStack, { email, password }: SignIn): Promise<Member> {
  let cookie = "";
  let company = "";
  const call: Member["call"] = async (name, parameters = {}, body) => {
    const { method, path, answers } = endpoints[name];
    const filled = path.replace(/:(\w+)/g, (_, key: string) => parameters[key] ?? company);
    const began = performance.now();
    const response = await fetch(`${stack.publicUrl}/api${filled}`, {
      method: method.toUpperCase(),
      headers: {
        origin: stack.publicUrl,
        cookie,
        ...(body === undefined ? {} : { "content-type": "application/json" }),
      },
      ...(body === undefined ? {} : { body: JSON.stringify(body) }),
    });
    const bytes = await response.arrayBuffer();
    const taken_ms = performance.now() - began;
    const text = new TextDecoder().decode(bytes);
    if (!response.ok) throw new Error(`${name} answered ${response.status}: ${text}`);
    const [session] = response.headers.getSetCookie();
    if (session) cookie = session.split(";")[0] ?? "";
    return {
      body: (answers === "json" && text ? JSON.parse(text) : undefined) as ResponseOf<Endpoints[typeof name]>,
      databaseRoundTrips: Number(response.headers.get("x-db-queries") ?? NaN),
      taken_ms,
    };
  };
  const { body } = await call("signIn", {}, { email, password });
  company = body.memberships[0]?.company.slug ?? "";
  return { company, call };
}
