import { endpoints, type ResponseOf } from "@cleatwork/contracts";
import { useMutation, useQueryClient } from "@tanstack/react-query";
import { dayText } from "../../lib/format/dates.ts";
import { api } from "../../lib/http.ts";
import { useNow } from "../../lib/use-now.ts";
import { Avatar } from "../../ui/avatar.tsx";
import { Button } from "../../ui/button.tsx";
import { SeverityText } from "../../ui/severity.tsx";
import { notify } from "../../ui/toast.tsx";
import { useSession } from "../session/index.ts";
import { peopleQueries } from "./people.queries.ts";
import { roleText } from "./roles.ts";

type Invitation = ResponseOf<typeof endpoints.listPeople>["invitations"][number];

/** Who is asked to join and has not answered. */
export function Invitations({ invitations, manages }: { invitations: readonly Invitation[]; manages: boolean }) {
  const { slug, company } = useSession();
  const cache = useQueryClient();
  const now = useNow();
  const invite = useMutation({
    mutationFn: ({ email, role }: Pick<Invitation, "email" | "role">) =>
      api(endpoints.invitePerson, { params: { company: slug }, body: { email, role } }),
    onSettled: () => cache.invalidateQueries(peopleQueries.list(slug)),
    onError: (error) => notify(error.message, { severity: "stop" }),
  });
  const takeBack = useMutation({
    mutationFn: (invitation: Invitation) =>
      api(endpoints.revokeInvitation, { params: { company: slug, invitationId: invitation.id } }),
    onSuccess: (_, invitation) =>
      notify(`The invitation of ${invitation.email} is taken back; its link no longer works.`, {
        severity: "good",
        undo: () => invite.mutate(invitation),
      }),
    onError: (error) => notify(error.message, { severity: "stop" }),
    onSettled: () => cache.invalidateQueries(peopleQueries.list(slug)),
  });
  if (invitations.length === 0) return null;
  return (
    <section aria-label="Invitations">
      <h3 className="border-y border-line bg-ground px-4 py-1 font-semibold">Invitations</h3>
      <ul>
        {invitations.map((invitation) => (
          <li key={invitation.id} className="flex flex-wrap items-center gap-3 border-b border-line-soft px-2 py-2">
            <Avatar quiet name={invitation.email} />
            <span className="min-w-0">
              <span className="block font-[560]">{invitation.email}</span>
              <span className="block text-help text-ink-3">
                {roleText[invitation.role].name}, invited by {invitation.invitedBy} on{" "}
                {dayText(invitation.createdAt, company.timeZone)}
              </span>
            </span>
            <span className="ml-auto">
              {Date.parse(invitation.expiresAt) < now ? (
                <SeverityText severity="warn">expired</SeverityText>
              ) : (
                <span className="text-help text-ink-3">ends {dayText(invitation.expiresAt, company.timeZone)}</span>
              )}
            </span>
            {manages && (
              <Button
                size="small"
                aria-label={`Take back the invitation of ${invitation.email}`}
                busy={takeBack.isPending && takeBack.variables.id === invitation.id}
                onClick={() => takeBack.mutate(invitation)}
              >
                Take back
              </Button>
            )}
          </li>
        ))}
      </ul>
    </section>
  );
}
