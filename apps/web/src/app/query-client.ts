import { QueryClient } from "@tanstack/react-query";
import { HttpProblem } from "../lib/problem.ts";

/** A refusal stays a refusal; only a missing connection or a failing server is worth a second try. */
export const makeQueryClient = () =>
  new QueryClient({
    defaultOptions: {
      queries: {
        staleTime: 15_000,
        retry: (count, error) => count < 2 && !(error instanceof HttpProblem && error.status < 500),
        retryDelay: (attempt) => Math.min(4_000, 500 * 2 ** attempt),
      },
      mutations: { retry: false },
    },
  });
