import type { ProjectItem } from "@cleatwork/contracts";
import { useSuspenseQuery } from "@tanstack/react-query";
import { useMemo } from "react";
import { Link, useNavigate } from "react-router-dom";
import { dueText, zoneName } from "../../lib/format/dates.ts";
import { moneyText } from "../../lib/format/money.ts";
import { paths } from "../../lib/paths.ts";
import { useNow } from "../../lib/use-now.ts";
import { useActions } from "../../ui/actions/registry.ts";
import { EmptyState } from "../../ui/empty-state.tsx";
import { PlusIcon } from "../../ui/icons/icon.tsx";
import { LinkButton } from "../../ui/link-button.tsx";
import { SeverityText } from "../../ui/severity.tsx";
import { DataTable, type RowGroup } from "../../ui/table/data-table.tsx";
import type { TableColumn } from "../../ui/table/table-column.ts";
import { useSession } from "../session/index.ts";
import { BidRuler } from "./bid-ruler.tsx";
import { urgency } from "./due.ts";
import { standing } from "./project-words.ts";
import { projectQueries } from "./projects.queries.ts";

/** The pipeline: what must be bid, what is with clients, what was won. */
export function ProjectsScreen() {
  const { slug, company, may } = useSession();
  const { data } = useSuspenseQuery(projectQueries.list(slug));
  const now = useNow();
  const navigate = useNavigate();
  const columns = useMemo(() => columnsFor(slug, now), [slug, now]);
  const mayWrite = may("projects.write");
  useActions(
    mayWrite
      ? [
          {
            id: "n project",
            label: "New project",
            group: "Make",
            keys: "n",
            run: () => void navigate(paths.newProject(slug)),
          },
        ]
      : [],
  );
  const add = mayWrite && (
    <LinkButton size="small" rank="primary" to={paths.newProject(slug)}>
      <PlusIcon />
      New project
    </LinkButton>
  );

  return (
    <main className="flex min-h-0 flex-1 flex-col gap-4 overflow-auto p-4">
      {data.items.length > 0 && (
        <div className="shrink-0">
          <BidRuler projects={data.items} company={slug} zone={company.timeZone} now={now} actions={add} />
        </div>
      )}
      <DataTable
        className="min-h-80 flex-1"
        title="All projects"
        fact={`${data.items.length} in all`}
        rows={data.items}
        columns={columns}
        rowId={(project) => project.id}
        groups={groups}
        sort={{ id: "due", desc: false }}
        csvName="projects"
        findLabel="Find a project"
        empty={
          <EmptyState title="No projects yet" actions={add}>
            A project starts with a client and a bid date. Then lay its air systems out over a drawing, or type them in
            from a paper takeoff.
          </EmptyState>
        }
      />
    </main>
  );
}

const money = (rows: readonly ProjectItem[]) => {
  const priced = rows.filter((row) => row.price_minor !== null);
  const sum = priced.reduce((total, row) => total + (row.price_minor ?? 0), 0);
  const count = `${rows.length} ${rows.length === 1 ? "project" : "projects"}`;
  return priced.length > 0 ? `${count}, ${moneyText(sum, priced[0]?.currency ?? "USD", { cents: false })}` : count;
};

const groups: readonly RowGroup<ProjectItem>[] = [
  { id: "bidding", label: "To bid", has: (project) => project.state === "bidding", fact: money },
  { id: "quoted", label: "With the client", has: (project) => project.state === "quoted", fact: money },
  { id: "won", label: "Won", has: (project) => project.state === "won", fact: money },
  { id: "lost", label: "Lost", has: (project) => project.state === "lost", fact: money },
];

const columnsFor = (slug: Parameters<typeof paths.projects>[0], now: number): readonly TableColumn<ProjectItem>[] => [
  {
    id: "name",
    head: "Project",
    value: (project) => project.name,
    cell: (project) => (
      <Link to={paths.project(slug, project.id)} className="font-[560] text-ink no-underline hover:underline">
        {project.name}
      </Link>
    ),
  },
  { id: "number", head: "No.", value: (project) => project.number || null, className: "whitespace-nowrap text-ink-2" },
  { id: "client", head: "Client", value: (project) => project.clientName },
  {
    id: "due",
    head: "Bid due",
    value: (project) => project.dueAt,
    cell: (project) => {
      if (!project.dueAt) return <span className="text-ink-3">no date</span>;
      const pressing = urgency(project, now);
      return (
        <span className="flex items-center gap-2 whitespace-nowrap">
          {dueText(project.dueAt, project.dueZone)}{" "}
          <span className="text-ink-3">{zoneName(project.dueZone, project.dueAt)}</span>
          {pressing && <SeverityText severity={pressing.severity}>{pressing.words}</SeverityText>}
        </span>
      );
    },
  },
  { id: "state", head: "State", value: standing },
  { id: "segments", head: "Segments", align: "right", value: (project) => project.segmentCount || null },
  {
    id: "price",
    head: "Quoted price",
    align: "right",
    value: (project) => project.price_minor,
    cell: (project) =>
      project.price_minor === null ? null : (
        <b className="font-[620]">{moneyText(project.price_minor, project.currency)}</b>
      ),
    csv: {
      head: "Quoted price",
      value: (project) => (project.price_minor === null ? null : project.price_minor / 100),
    },
  },
  {
    id: "actions",
    head: "",
    value: () => null,
    className: "w-20 text-right",
    cell: (project) => (
      <Link
        to={paths.project(slug, project.id, "setup")}
        aria-label={`Setup of ${project.name}`}
        className="text-help text-dye-ink underline underline-offset-3"
      >
        Setup
      </Link>
    ),
  },
];
