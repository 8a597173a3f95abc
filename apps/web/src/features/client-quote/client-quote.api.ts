/** The few calls of the client's page, by hand and light: the schemas stay on the server, which checks every answer. */
import type { ClientQuote, ProblemDetail } from "@cleatwork/contracts";

export type Answer<T> =
  { readonly ok: true; readonly value: T } | { readonly ok: false; readonly problem: ProblemDetail };

export interface AcceptForm {
  readonly name: string;
  readonly title: string;
  readonly poNumber: string;
  readonly consent: boolean;
}
export interface DeclineForm {
  readonly name: string;
  readonly reason: string;
}

const path = (token: string) => `/api/open/quotes/${encodeURIComponent(token)}`;

export const readQuote = (token: string, signal: AbortSignal) => call(path(token), { signal });

export const acceptQuote = (token: string, form: AcceptForm & { snapshotHash: string }) =>
  call(`${path(token)}/accept`, post(form));

export const declineQuote = (token: string, form: DeclineForm) => call(`${path(token)}/decline`, post(form));

const post = (body: unknown): RequestInit => ({
  method: "POST",
  headers: { "content-type": "application/json" },
  body: JSON.stringify(body),
});

async function call(url: string, init: RequestInit): Promise<Answer<ClientQuote>> {
  try {
    const response = await fetch(url, { ...init, cache: "no-store" });
    const body = (await response.json()) as unknown;
    return response.ok ? { ok: true, value: body as ClientQuote } : { ok: false, problem: body as ProblemDetail };
  } catch {
    return {
      ok: false,
      problem: {
        type: "/problems/went-wrong",
        title: "The page could not reach us",
        status: 0,
        detail: "Check the connection and try again. Nothing you typed is lost.",
        instance: "",
      },
    };
  }
}
