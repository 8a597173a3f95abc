/** The one call of the sign-in page, without schemas: the page must open light. The server checks what it answers. */
import type { Me, ProblemDetail } from "@cleatwork/contracts";

export type SignInAnswer =
  | { readonly kind: "in"; readonly me: Me }
  | { readonly kind: "wrong" }
  | { readonly kind: "refused"; readonly problem: Pick<ProblemDetail, "title" | "detail" | "errors"> }
  | { readonly kind: "no-connection" };

export async function signIn(email: string, password: string): Promise<SignInAnswer> {
  let response: Response;
  try {
    response = await fetch("/api/open/sign-in", {
      method: "POST",
      credentials: "same-origin",
      headers: { "content-type": "application/json" },
      body: JSON.stringify({ email, password }),
    });
  } catch {
    return { kind: "no-connection" };
  }
  const body = (await response.json().catch(() => null)) as unknown;
  if (response.ok) return { kind: "in", me: body as Me };
  const problem = body as ProblemDetail | null;
  if (problem?.type === "/problems/credentials-wrong") return { kind: "wrong" };
  return {
    kind: "refused",
    problem: problem ?? {
      title: "Something went wrong on our side",
      detail: `The server answered ${response.status}.`,
    },
  };
}
