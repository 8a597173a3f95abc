import { useQueryErrorResetBoundary } from "@tanstack/react-query";
import { useEffect } from "react";
import { isRouteErrorResponse, useRouteError } from "react-router-dom";
import { goSignIn } from "../features/session/index.ts";
import { HttpProblem, NetworkProblem, NotFoundProblem, isProblem } from "../lib/problem.ts";
import { Button } from "../ui/button.tsx";
import { ErrorView, NoPermission } from "../ui/error-view.tsx";
import { LinkButton } from "../ui/link-button.tsx";

/** Whatever kept a screen from opening, in words, with a way on. */
export function RouteError() {
  const error = useRouteError();
  const { reset } = useQueryErrorResetBoundary();
  const signedOut = isProblem(error, "signed-out");
  useEffect(() => {
    if (signedOut) goSignIn();
  }, [signedOut]);
  useEffect(() => reset, [reset]);

  const again = (
    <Button
      rank="primary"
      onClick={() => {
        window.location.reload();
      }}
    >
      Try again
    </Button>
  );

  if (signedOut) return null;
  if (
    error instanceof NotFoundProblem ||
    (isRouteErrorResponse(error) && error.status === 404) ||
    isProblem(error, "not-found")
  )
    return <NothingHere />;
  if (isProblem(error, "role-may-not")) {
    return (
      <Frame title="Not for your role">
        <NoPermission screen title="Your role does not open this page">
          <p>{error.detail}</p>
        </NoPermission>
      </Frame>
    );
  }
  if (error instanceof NetworkProblem) {
    return (
      <Frame title="No connection">
        <ErrorView screen title="No connection" actions={again}>
          <p>This page could not be fetched. What you saved before is safe.</p>
        </ErrorView>
      </Frame>
    );
  }
  if (error instanceof HttpProblem) {
    return (
      <Frame title={error.title}>
        <ErrorView screen title={error.title} actions={again} reference={error.request}>
          <p>{error.detail}</p>
        </ErrorView>
      </Frame>
    );
  }
  return (
    <Frame title="This page stopped">
      <ErrorView screen title="This page stopped" actions={again}>
        <p>{error instanceof Error ? error.message : "Something went wrong here, not on the server."}</p>
      </ErrorView>
    </Frame>
  );
}

export function NothingHere() {
  return (
    <Frame title="Not found">
      <div className="max-w-xl p-4">
        <h1 className="text-title">There is nothing at this address</h1>
        <p className="mt-1 text-ink-2">
          The link may be old or cut short, or what it pointed to belongs to another company.
        </p>
        <LinkButton to="/" rank="primary" className="mt-3">
          To the start
        </LinkButton>
      </div>
    </Frame>
  );
}

function Frame({ title, children }: { title: string; children: React.ReactNode }) {
  return (
    <main className="p-4">
      <title>{`${title}, Cleatwork`}</title>
      <div className="hem">{children}</div>
    </main>
  );
}
