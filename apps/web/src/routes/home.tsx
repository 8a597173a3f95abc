import type { QueryClient } from "@tanstack/react-query";
import { redirect } from "react-router-dom";
import { goSignIn, sessionQueries } from "../features/session/index.ts";
import { isProblem } from "../lib/problem.ts";
import { paths } from "../lib/paths.ts";
import { ErrorView } from "../ui/error-view.tsx";

/** To the company that was open last on this computer, else to the first. */
export const loader = (client: QueryClient) => async () => {
  try {
    const { memberships } = await client.fetchQuery(sessionQueries.me());
    const last = localStorage.getItem("company");
    const chosen = memberships.find((one) => one.company.slug === last) ?? memberships[0];
    return chosen ? redirect(paths.home(chosen.company.slug)) : null;
  } catch (error) {
    if (!isProblem(error, "signed-out")) throw error;
    goSignIn();
    return null;
  }
};

export function Component() {
  return (
    <main className="p-4">
      <title>No company, Cleatwork</title>
      <div className="hem">
        <ErrorView screen title="You belong to no company now">
          <p>
            Your work stays with the company that you were in. Ask an owner to invite you again, or{" "}
            <a href={paths.signUp}>set up a company</a>.
          </p>
        </ErrorView>
      </div>
    </main>
  );
}
