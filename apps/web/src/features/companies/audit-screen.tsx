import { useSuspenseInfiniteQuery, useSuspenseQuery } from "@tanstack/react-query";
import { useMemo } from "react";
import { useSearchParams } from "react-router-dom";
import { momentText } from "../../lib/format/dates.ts";
import { Button } from "../../ui/button.tsx";
import { SelectField } from "../../ui/controls.tsx";
import { EmptyState } from "../../ui/empty-state.tsx";
import { DataTable } from "../../ui/table/data-table.tsx";
import type { TableColumn } from "../../ui/table/table-column.ts";
import { projectQueries } from "../projects/index.ts";
import { useSession } from "../session/index.ts";
import { detailLines, eventSubject, eventWords, type AuditItem } from "./audit-words.ts";
import { companyQueries } from "./companies.queries.ts";

/** Who changed what, newest first. Nothing here can be changed or taken out. */
export function AuditScreen() {
  const { slug, company } = useSession();
  const audit = useSuspenseInfiniteQuery(companyQueries.audit(slug));
  const [search, setSearch] = useSearchParams();
  const all = useMemo(() => audit.data.pages.flatMap((page) => page.items), [audit.data]);
  const subjects = [...new Set(all.map((item) => eventSubject(item.event)))].sort();
  const about = subjects.includes(search.get("about") ?? "") ? search.get("about") : null;
  const rows = useMemo(
    () => (about === null ? all : all.filter((item) => eventSubject(item.event) === about)),
    [all, about],
  );
  const { data: projects } = useSuspenseQuery(projectQueries.list(slug));
  const columns = useMemo(() => {
    const names = new Map(projects.items.map((project) => [project.id as string, project.name]));
    return columnsFor(company.timeZone, company.currency, (subject) => names.get(subject) ?? subject);
  }, [company, projects]);
  return (
    <main className="flex min-h-0 flex-1 flex-col p-4">
      <h1 className="sr-only">Audit of {company.name}</h1>
      <DataTable
        live
        title="Audit"
        fact={`${rows.length}${audit.hasNextPage ? " loaded" : " in all"}`}
        rows={rows}
        columns={columns}
        rowId={(item) => item.id}
        csvName="audit"
        className="min-h-0 flex-1"
        filters={
          subjects.length > 1 && (
            <SelectField
              label="About"
              hideLabel
              empty="About anything"
              value={about ?? ""}
              onChange={(event) =>
                setSearch(event.target.value ? { about: event.target.value } : {}, { replace: true })
              }
              choices={subjects.map((subject) => ({ value: subject, label: subject }))}
            />
          )
        }
        actions={
          audit.hasNextPage && (
            <Button size="small" busy={audit.isFetchingNextPage} onClick={() => void audit.fetchNextPage()}>
              Older entries
            </Button>
          )
        }
        empty={
          <EmptyState title="Nothing yet">Every change of money, price, role or quote is written down here.</EmptyState>
        }
      />
    </main>
  );
}

const columnsFor = (
  zone: string,
  currency: string,
  nameOf: (subject: string) => string,
): readonly TableColumn<AuditItem>[] => [
  {
    id: "at",
    head: "When",
    value: (item) => item.at,
    cell: (item) => momentText(item.at, zone),
    className: "whitespace-nowrap",
  },
  { id: "by", head: "Who", value: (item) => item.by?.name ?? "the system", className: "whitespace-nowrap" },
  { id: "event", head: "What", value: (item) => eventWords(item.event), className: "whitespace-nowrap font-[560]" },
  { id: "subject", head: "About", value: (item) => nameOf(item.subject) || null },
  {
    id: "details",
    head: "Details",
    value: (item) => detailLines(item.details, currency).join("; ") || null,
    cell: (item) => <Details lines={detailLines(item.details, currency)} />,
    className: "py-1! text-ink-2",
  },
];

/** Two lines, and the rest when asked for. */
function Details({ lines }: { lines: readonly string[] }) {
  const list = (some: readonly string[]) => some.map((line) => <li key={line}>{line}</li>);
  return (
    <>
      <ul>{list(lines.slice(0, 2))}</ul>
      {lines.length > 2 && (
        <details>
          <summary className="text-help text-dye-ink">{lines.length - 2} more</summary>
          <ul>{list(lines.slice(2))}</ul>
        </details>
      )}
    </>
  );
}
