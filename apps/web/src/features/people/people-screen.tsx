import { ROLES, endpoints, type ResponseOf, type Role } from "@cleatwork/contracts";
import { useMutation, useQueryClient, useSuspenseQuery } from "@tanstack/react-query";
import { useState } from "react";
import { awayText, dayText } from "../../lib/format/dates.ts";
import { csvText, downloadText } from "../../lib/format/csv.ts";
import { api } from "../../lib/http.ts";
import { useNow } from "../../lib/use-now.ts";
import { useActions } from "../../ui/actions/registry.ts";
import { Avatar } from "../../ui/avatar.tsx";
import { Button, IconButton } from "../../ui/button.tsx";
import { ConfirmByName } from "../../ui/confirm-dialog.tsx";
import { SelectField } from "../../ui/controls.tsx";
import { DownloadIcon, PlusIcon, TrashIcon } from "../../ui/icons/icon.tsx";
import { Panel, PanelHead } from "../../ui/panel.tsx";
import { notify } from "../../ui/toast.tsx";
import { useSession } from "../session/index.ts";
import { Invitations } from "./invitations.tsx";
import { InviteDialog } from "./invite-dialog.tsx";
import { peopleQueries } from "./people.queries.ts";
import { roleText } from "./roles.ts";

type Member = ResponseOf<typeof endpoints.listPeople>["people"][number];

/** Who works here, as what, and who is invited. */
export function PeopleScreen() {
  const { slug, company, may, me } = useSession();
  const { data } = useSuspenseQuery(peopleQueries.list(slug));
  const [inviting, setInviting] = useState(false);
  const [removing, setRemoving] = useState<Member | null>(null);
  const manages = may("people.manage");
  const { changeRole, remove } = useMemberChanges(() => setRemoving(null));
  useActions(
    manages ? [{ id: "invite", label: "Invite someone", group: "Make", keys: "n", run: () => setInviting(true) }] : [],
  );

  return (
    <main className="grid min-h-0 flex-1 content-start items-start gap-4 overflow-auto p-4 xl:grid-cols-[minmax(0,1fr)_20rem]">
      <h1 className="sr-only">People of {company.name}</h1>
      <Panel live label="People">
        <PanelHead title="People" fact={`${data.people.length} working, ${data.invitations.length} invited`}>
          <Button size="small" onClick={() => downloadText("people.csv", peopleCsv(data.people))}>
            <DownloadIcon />
            CSV
          </Button>
          {manages && (
            <Button size="small" rank="primary" onClick={() => setInviting(true)}>
              <PlusIcon />
              Invite
            </Button>
          )}
        </PanelHead>
        <div className="overflow-x-auto">
          <table className="grid-table">
            <thead>
              <tr>
                <th scope="col">Name</th>
                <th scope="col">Role</th>
                <th scope="col" className="max-lg:hidden">
                  Since
                </th>
                <th scope="col" className="num">
                  Last sign-in
                </th>
                <th>
                  <span className="sr-only">Actions</span>
                </th>
              </tr>
            </thead>
            <tbody>
              {data.people.map((person) => (
                <MemberRow
                  key={person.id}
                  person={person}
                  self={person.id === me.person.id}
                  zone={company.timeZone}
                  manages={manages}
                  onRole={(role) => changeRole.mutate({ person, role })}
                  onRemove={() => setRemoving(person)}
                />
              ))}
            </tbody>
          </table>
        </div>
        <Invitations invitations={data.invitations} manages={manages} />
      </Panel>
      <Panel>
        <PanelHead title="Roles" />
        <dl className="grid gap-4 p-4">
          {ROLES.map((role) => (
            <div key={role}>
              <dt className="font-semibold">{roleText[role].name}</dt>
              <dd className="text-ink-2">{roleText[role].sees}</dd>
            </div>
          ))}
        </dl>
      </Panel>
      <InviteDialog open={inviting} onOpenChange={setInviting} />
      {removing && (
        <ConfirmByName
          open
          onOpenChange={(open) => {
            if (!open) setRemoving(null);
          }}
          title={`Remove ${removing.name}`}
          name={removing.name}
          consequence={`${removing.name} can no longer open ${company.name}. Everything they made stays, under their name.`}
          action="Remove"
          busy={remove.isPending}
          onConfirm={() => remove.mutate(removing)}
        />
      )}
    </main>
  );
}

function useMemberChanges(onRemoved: () => void) {
  const { slug } = useSession();
  const cache = useQueryClient();
  const refresh = () => cache.invalidateQueries(peopleQueries.list(slug));
  const failed = (error: Error) => notify(error.message, { severity: "stop" });
  const changeRole = useMutation({
    mutationFn: ({ person, role }: { person: Member; role: Role }) =>
      api(endpoints.changeRole, { params: { company: slug, personId: person.id }, body: { role } }),
    onSuccess: (_, { person, role }) => {
      notify(`${person.name} is ${roleText[role].name.toLowerCase()} now.`, {
        severity: "good",
        undo: () => changeRole.mutate({ person: { ...person, role }, role: person.role }),
      });
    },
    onError: failed,
    onSettled: refresh,
  });
  const remove = useMutation({
    mutationFn: (person: Member) => api(endpoints.removePerson, { params: { company: slug, personId: person.id } }),
    onSuccess: async (_, person) => {
      onRemoved();
      notify(`${person.name} is removed.`, { severity: "good" });
      await refresh();
    },
    onError: failed,
  });
  return { changeRole, remove };
}

function MemberRow({
  person,
  self,
  zone,
  manages,
  onRole,
  onRemove,
}: {
  person: Member;
  self: boolean;
  zone: string;
  manages: boolean;
  onRole: (role: Role) => void;
  onRemove: () => void;
}) {
  const now = useNow();
  return (
    <tr data-hover="">
      <td className="py-1.5!">
        <span className="flex items-center gap-3">
          <Avatar name={person.name} />
          <span>
            <span className="block font-[560]">
              {person.name}
              {self && <span className="font-normal text-ink-3"> (you)</span>}
            </span>
            <span className="block text-help text-ink-3">{person.email}</span>
          </span>
        </span>
      </td>
      <td className="w-36 min-w-32">
        {manages ? (
          <SelectField
            label={`Role of ${person.name}`}
            hideLabel
            value={person.role}
            onChange={(event) => onRole(event.target.value as Role)}
            choices={ROLES.map((role) => ({ value: role, label: roleText[role].name }))}
          />
        ) : (
          roleText[person.role].name
        )}
      </td>
      <td className="whitespace-nowrap text-ink-2 max-lg:hidden">{dayText(person.joinedAt, zone)}</td>
      <td className="num whitespace-nowrap">{person.lastSeenAt ? awayText(person.lastSeenAt, now) : "never"}</td>
      <td className="w-12">
        {manages && (
          <IconButton label={`Remove ${person.name}`} onClick={onRemove}>
            <TrashIcon />
          </IconButton>
        )}
      </td>
    </tr>
  );
}

const peopleCsv = (people: readonly Member[]) =>
  csvText([
    ["Name", "E-mail", "Role", "Since", "Last sign-in"],
    ...people.map((one) => [one.name, one.email, one.role, one.joinedAt, one.lastSeenAt]),
  ]);
