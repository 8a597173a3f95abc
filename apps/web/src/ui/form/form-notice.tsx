import { HttpProblem, NetworkProblem, isProblem } from "../../lib/problem.ts";
import { Button } from "../button.tsx";
import { Notice } from "../notice.tsx";

/** What belongs to no single field: a refusal, a missing connection, someone who saved first. */
export function FormNotice({
  problem,
  stale,
  missing = 0,
}: {
  problem: Error | null;
  stale?: { takeTheirs: () => Promise<void>; keepMine: () => Promise<void> } | null;
  /** How many fields still say what they need. */
  missing?: number;
}) {
  if (stale) {
    return (
      <Notice
        severity="warn"
        title="Someone saved before you"
        actions={
          <>
            <Button size="small" onClick={() => void stale.takeTheirs()}>
              Show what they saved
            </Button>
            <Button size="small" rank="primary" onClick={() => void stale.keepMine()}>
              Save mine over it
            </Button>
          </>
        }
      >
        What you typed is still here. Showing theirs replaces it.
      </Notice>
    );
  }
  if (problem && isProblem(problem, "signed-out")) {
    return (
      <Notice
        severity="stop"
        title="You are signed out"
        actions={
          <a className="text-dye-ink underline" href="/sign-in" target="_blank" rel="noreferrer">
            Sign in in a new tab
          </a>
        }
      >
        What you typed is still here. Sign in, come back, and save again.
      </Notice>
    );
  }
  if (problem instanceof NetworkProblem) {
    return (
      <Notice severity="stop" title="Not saved: no connection">
        What you typed is still here. Save again when you are online.
      </Notice>
    );
  }
  if (problem instanceof HttpProblem) {
    return (
      <Notice severity="stop" title={problem.title}>
        {problem.detail}
        {problem.errors.map((error) => (
          <p key={error.pointer + error.code}>{error.message}</p>
        ))}
        {problem.code === "went-wrong" && problem.request && <p>Request {problem.request}</p>}
      </Notice>
    );
  }
  if (problem) return <Notice severity="stop" title={problem.message} />;
  if (missing > 0) {
    return (
      <Notice severity="stop" title={missing === 1 ? "One field needs a look" : `${missing} fields need a look`} />
    );
  }
  return null;
}
