import { endpoints } from "@cleatwork/contracts";
import { useQuery } from "@tanstack/react-query";
import { api } from "../../lib/http.ts";
import { HttpProblem } from "../../lib/problem.ts";
import { LinkButton } from "../../ui/link-button.tsx";
import { Notice } from "../../ui/notice.tsx";
import { Skeleton } from "../../ui/skeleton.tsx";

/** Confirms as soon as it opens: opening the link is the confirmation. */
export function VerifyEmail({ token }: { token: string }) {
  // A query, not a mutation in an effect: it runs once for a token, however often the page draws.
  const confirmed = useQuery({
    queryKey: ["verify-email", token],
    queryFn: () => api(endpoints.verifyEmail, { body: { token } }).then(() => true),
    enabled: token !== "",
    staleTime: Infinity,
    retry: false,
  });
  if (token === "") return <LinkBroken detail="The link has lost its end. Copy all of it from the e-mail." />;
  if (confirmed.isPending) return <Skeleton lines={2} label="Confirming your e-mail" />;
  if (confirmed.isError) {
    return (
      <LinkBroken
        detail={
          confirmed.error instanceof HttpProblem
            ? confirmed.error.detail
            : "There is no connection right now. Load the page again."
        }
      />
    );
  }
  return (
    <>
      <Notice severity="good" title="Your e-mail is confirmed" />
      <LinkButton rank="primary" to="/" reloadDocument className="mt-4 h-11! w-full">
        Go on
      </LinkButton>
    </>
  );
}

function LinkBroken({ detail }: { detail: string }) {
  return (
    <>
      <Notice severity="stop" title="This link does not work">
        {detail} If your e-mail is not confirmed yet, sign in and have the mail sent again.
      </Notice>
      <LinkButton to="/" reloadDocument className="mt-4 h-11! w-full">
        To the start
      </LinkButton>
    </>
  );
}
