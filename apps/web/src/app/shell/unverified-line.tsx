import { endpoints } from "@cleatwork/contracts";
import { useMutation } from "@tanstack/react-query";
import { useSession } from "../../features/session/index.ts";
import { api } from "../../lib/http.ts";
import { Button } from "../../ui/button.tsx";
import { SeverityMark } from "../../ui/severity.tsx";

/** Until the address is confirmed, one line says so and can send the mail again. */
export function UnverifiedLine() {
  const { me } = useSession();
  const resend = useMutation({ mutationFn: () => api(endpoints.resendVerification, {}) });
  if (me.person.emailVerified) return null;
  return (
    <div
      role="status"
      className="flex flex-wrap items-center gap-2 border-b border-line-strong bg-note-tint px-4 py-1 text-ink print:hidden"
    >
      <SeverityMark severity="note" />
      <span>
        {resend.isSuccess
          ? `Sent again to ${me.person.email}.`
          : resend.isError
            ? "The mail could not be ordered. Try again in a minute."
            : `Confirm your e-mail: open the link that we sent to ${me.person.email}.`}
      </span>
      {!resend.isSuccess && (
        <Button size="small" busy={resend.isPending} onClick={() => resend.mutate()}>
          Send it again
        </Button>
      )}
    </div>
  );
}
