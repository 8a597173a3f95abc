/** The network for tests: answers in order, and what was asked. */
import { vi } from "vitest";

export interface Asked {
  readonly url: string;
  readonly method: string;
  readonly headers: Headers;
  readonly body: unknown;
}

type Answer = { status: number; body?: unknown } | "no connection";

export function answerWith(...answers: Answer[]): Asked[] {
  const asked: Asked[] = [];
  vi.stubGlobal("fetch", (url: string, init: RequestInit = {}) => {
    const answer = answers[Math.min(asked.length, answers.length - 1)];
    asked.push({
      url,
      method: init.method ?? "GET",
      headers: new Headers(init.headers),
      body: typeof init.body === "string" ? (JSON.parse(init.body) as unknown) : init.body,
    });
    if (!answer || answer === "no connection") return Promise.reject(new TypeError("Failed to fetch"));
    return Promise.resolve(
      new Response(answer.body === undefined ? null : JSON.stringify(answer.body), { status: answer.status }),
    );
  });
  return asked;
}

export const problemBody = (
  code: string,
  status: number,
  errors?: { pointer: string; code: string; message: string; value?: unknown }[],
) => ({
  type: `/problems/${code}`,
  title: code,
  status,
  detail: `${code} it is.`,
  instance: "/requests/req_1",
  ...(errors ? { errors } : {}),
});
