import type { endpoints, ResponseOf } from "@cleatwork/contracts";
import { useSuspenseInfiniteQuery } from "@tanstack/react-query";
import { useMemo } from "react";
import { awayText, momentText } from "../../lib/format/dates.ts";
import { useNow } from "../../lib/use-now.ts";
import { Button } from "../../ui/button.tsx";
import { EmptyState } from "../../ui/empty-state.tsx";
import { Notice } from "../../ui/notice.tsx";
import { SeverityText, type Severity } from "../../ui/severity.tsx";
import { DataTable, type RowGroup } from "../../ui/table/data-table.tsx";
import type { TableColumn } from "../../ui/table/table-column.ts";
import { useSession } from "../session/index.ts";
import { companyQueries } from "./companies.queries.ts";

type Mail = ResponseOf<typeof endpoints.listMail>["items"][number];

const states: Record<Mail["state"], { readonly words: string; readonly severity: Severity }> = {
  queued: { words: "waiting", severity: "note" },
  sent: { words: "sent", severity: "good" },
  refused: { words: "refused", severity: "stop" },
  dead: { words: "given up", severity: "stop" },
};

const groups: readonly RowGroup<Mail>[] = [
  { id: "failed", label: "Not delivered", has: (mail) => mail.state === "refused" || mail.state === "dead" },
  { id: "waiting", label: "Waiting to go out", has: (mail) => mail.state === "queued" },
  { id: "sent", label: "Sent", has: (mail) => mail.state === "sent" },
];

/** Every mail of the company: what waits, what went, what did not arrive and why. */
export function MailScreen() {
  const { slug, company } = useSession();
  const mail = useSuspenseInfiniteQuery(companyQueries.mail(slug));
  const now = useNow();
  const rows = useMemo(() => mail.data.pages.flatMap((page) => page.items), [mail.data]);
  const columns = useMemo(() => columnsFor(company.timeZone, now), [company.timeZone, now]);
  const lost = rows.filter((row) => row.state === "refused" || row.state === "dead").length;
  return (
    <main className="flex min-h-0 flex-1 flex-col gap-4 p-4">
      <h1 className="sr-only">Mail of {company.name}</h1>
      {lost > 0 && (
        <Notice severity="stop" title={`${lost} ${lost === 1 ? "mail was" : "mails were"} not delivered`}>
          Check the address with the recipient, correct it at the client or the invitation, and send again from there.
        </Notice>
      )}
      <DataTable
        live
        title="Mail"
        fact={`${rows.length}${mail.hasNextPage ? " and more" : " in all"}`}
        rows={rows}
        columns={columns}
        rowId={(row) => row.id}
        groups={groups}
        csvName="mail"
        className="min-h-0 flex-1"
        actions={
          mail.hasNextPage && (
            <Button size="small" busy={mail.isFetchingNextPage} onClick={() => void mail.fetchNextPage()}>
              Older ones
            </Button>
          )
        }
        empty={
          <EmptyState title="No mail yet">
            Invitations and quotes that go out stand here, with what became of them.
          </EmptyState>
        }
      />
    </main>
  );
}

const columnsFor = (zone: string, now: number): readonly TableColumn<Mail>[] => [
  { id: "subject", head: "Subject", value: (mail) => mail.subject, className: "font-[560]" },
  { id: "to", head: "To", value: (mail) => mail.to },
  {
    id: "state",
    head: "State",
    value: (mail) => states[mail.state].words,
    cell: (mail) => <SeverityText severity={states[mail.state].severity}>{states[mail.state].words}</SeverityText>,
  },
  { id: "tries", head: "Tries", align: "right", value: (mail) => mail.attempts },
  {
    id: "next",
    head: "Next try",
    value: (mail) => (mail.state === "queued" ? mail.nextAttemptAt : null),
    cell: (mail) => (mail.state === "queued" && mail.nextAttemptAt ? awayText(mail.nextAttemptAt, now) : null),
  },
  { id: "why", head: "What the mail server said", value: (mail) => mail.lastError, className: "text-ink-2" },
  {
    id: "when",
    head: "Ordered",
    align: "right",
    value: (mail) => mail.createdAt,
    cell: (mail) => momentText(mail.createdAt, zone),
  },
];
