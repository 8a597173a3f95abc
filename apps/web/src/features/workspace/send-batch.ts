import { endpoints, type CompanySlug, type ProjectId, type SaveLayoutRequest } from "@cleatwork/contracts";
import { api } from "../../lib/http.ts";
import { HttpProblem } from "../../lib/problem.ts";
import type { SendResult } from "./core/layout-store.ts";

/** What the server says to a batch, as the store understands it. What is not certain counts as not reached. */
export async function sendBatch(
  params: { company: CompanySlug; projectId: ProjectId },
  body: SaveLayoutRequest,
): Promise<SendResult> {
  try {
    return { kind: "taken", answer: await api(endpoints.saveLayout, { params, body }) };
  } catch (error) {
    if (!(error instanceof HttpProblem)) return { kind: "unreachable" };
    if (error.code === "layout-conflict") return { kind: "conflict" };
    if (error.status === 422 || error.status === 403 || error.status === 404) {
      const first = error.errors?.[0];
      return { kind: "refused", reason: first ? `needs ${first.message}` : error.message };
    }
    return { kind: "unreachable" };
  }
}
