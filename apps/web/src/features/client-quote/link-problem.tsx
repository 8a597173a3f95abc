import type { ProblemDetail } from "@cleatwork/contracts";

/** A link that does not open a quote says why, and what to do next; it never says whose quote it was. */
export function LinkProblem({ problem }: { problem: ProblemDetail }) {
  const offline = problem.status === 0;
  return (
    <div className="letter-page" data-theme="light">
      <title>Quote link</title>
      <div className="letter-columns">
        <main className="letter letter-problem">
          <h1 className="letter-title">{offline ? problem.title : headline(problem.status)}</h1>
          <p>{problem.detail}</p>
          <p className="letter-sub">The person who sent you the quote can send a new link.</p>
          {offline && (
            <button type="button" className="letter-button" onClick={() => window.location.reload()}>
              Try again
            </button>
          )}
        </main>
      </div>
    </div>
  );
}

const headline = (status: number) =>
  status === 429
    ? "Too many tries"
    : status === 410
      ? "This link is no longer valid"
      : "There is no quote at this address";
