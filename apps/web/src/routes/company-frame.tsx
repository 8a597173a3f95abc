import { useSuspenseQueries, type QueryClient } from "@tanstack/react-query";
import { useEffect, useMemo } from "react";
import { useParams, type LoaderFunctionArgs } from "react-router-dom";
import { Shell } from "../app/shell/shell.tsx";
import { goSignIn, SessionContext, sessionOf, sessionQueries } from "../features/session/index.ts";
import { isProblem, NotFoundProblem } from "../lib/problem.ts";
import { companyParam } from "../lib/route-params.ts";

/** Who and where come first: every screen inside may count on them. */
export const loader =
  (client: QueryClient) =>
  async ({ params }: LoaderFunctionArgs) => {
    const company = companyParam(params);
    try {
      await Promise.all([
        client.ensureQueryData(sessionQueries.me()),
        client.ensureQueryData(sessionQueries.company(company)),
      ]);
    } catch (error) {
      if (!isProblem(error, "signed-out")) throw error;
      goSignIn();
      // The page is being left; nothing more is drawn.
      await new Promise(() => undefined);
    }
    return null;
  };

export function Component() {
  const slug = companyParam(useParams());
  const [{ data: me }, { data: company }] = useSuspenseQueries({
    queries: [sessionQueries.me(), sessionQueries.company(slug)],
  });
  const session = useMemo(() => sessionOf(me, company), [me, company]);
  useEffect(() => localStorage.setItem("company", slug), [slug]);
  if (!session) throw new NotFoundProblem();
  return (
    <SessionContext value={session}>
      <Shell key={slug} />
    </SessionContext>
  );
}
