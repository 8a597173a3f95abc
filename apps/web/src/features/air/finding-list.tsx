import type { Finding, FindingSeverity } from "@cleatwork/calc";
import { find } from "@cleatwork/layout";
import { useId, useState, type ReactNode } from "react";
import { Link } from "react-router-dom";
import { paths } from "../../lib/paths.ts";
import { Button } from "../../ui/button.tsx";
import { EmptyState } from "../../ui/empty-state.tsx";
import { Panel, PanelHead } from "../../ui/panel.tsx";
import { SeverityText } from "../../ui/severity.tsx";
import { useWorkspace } from "../workspace/index.ts";
import { findingFigures, findingTitle, hasFixes } from "./finding-words.ts";
import { FixList } from "./fix-list.tsx";

const GROUPS: readonly { readonly severity: FindingSeverity; readonly title: string }[] = [
  { severity: "stop", title: "Stops" },
  { severity: "warn", title: "Warnings" },
  { severity: "note", title: "Notes" },
];

interface Entry {
  readonly key: string;
  readonly severity: FindingSeverity;
  readonly content: ReactNode;
}

/** Findings of a system, gravest first; each opens its ways out. */
export function FindingList({ systemId }: { systemId: string }) {
  const entries = useEntries(systemId);
  const [only, setOnly] = useState<FindingSeverity | null>(null);
  const shown = GROUPS.filter(({ severity }) => only === null || severity === only);
  return (
    <Panel live label="Findings">
      <PanelHead title="Findings" fact={`${entries.length}`}>
        {GROUPS.map(({ severity, title }) => {
          const count = entries.filter((entry) => entry.severity === severity).length;
          return (
            <Button
              key={severity}
              size="small"
              rank={only === severity ? "primary" : "plain"}
              aria-pressed={only === severity}
              disabled={count === 0}
              onClick={() => setOnly(only === severity ? null : severity)}
            >
              {title} {count}
            </Button>
          );
        })}
      </PanelHead>
      {entries.length === 0 ? (
        <EmptyState title="Nothing found">Every duct of this system is within its limits.</EmptyState>
      ) : (
        shown.map(({ severity, title }) => (
          <Group key={severity} title={title} entries={entries.filter((entry) => entry.severity === severity)} />
        ))
      )}
    </Panel>
  );
}

function Group({ title, entries }: { title: string; entries: readonly Entry[] }) {
  if (entries.length === 0) return null;
  return (
    <section>
      <h3 className="border-b border-line bg-recess px-4 py-1 text-help font-semibold text-ink-2">
        {title}, {entries.length}
      </h3>
      <ul>
        {entries.map(({ key, content }) => (
          <li key={key} className="border-b border-line px-4 py-2 last:border-b-0">
            {content}
          </li>
        ))}
      </ul>
    </section>
  );
}

function useEntries(systemId: string): readonly Entry[] {
  const { numbers, solutionOf } = useWorkspace();
  const problems = (numbers?.problems ?? []).map((problem, position): Entry => ({
    key: `problem ${position}`,
    severity: "stop",
    content: (
      <Item severity="stop" title={`${problem.subject.name || "The system"}: ${problem.field}`} id={problem.subject.id}>
        Needs {problem.limit}
        {problem.value === null ? "." : `, is ${problem.value}.`}
      </Item>
    ),
  }));
  const air = (solutionOf(systemId)?.findings ?? []).map((finding): Entry => ({
    key: finding.id,
    severity: finding.severity,
    content: <AirItem finding={finding} systemId={systemId} />,
  }));
  const takeoff = numbers?.takeoffs.find((each) => each.systemId === systemId)?.findings ?? [];
  const metal = takeoff.map((finding): Entry => ({
    key: finding.id,
    severity: finding.severity,
    content: (
      <Item severity={finding.severity} title="Metal" id={finding.segmentId}>
        {finding.message}
      </Item>
    ),
  }));
  return [...problems, ...air, ...metal];
}

function AirItem({ finding, systemId }: { finding: Finding; systemId: string }) {
  const { units, mayEdit } = useWorkspace();
  const { value, limit } = findingFigures(finding, units);
  const [isOpen, setOpen] = useState(false);
  const listId = useId();
  return (
    <>
      <Item severity={finding.severity} title={findingTitle(finding)} id={finding.subject.id}>
        <b>{value}</b>, limit {limit}
        <span className="block text-help text-ink-3">{finding.limitSource}</span>
      </Item>
      {mayEdit && hasFixes(finding) && (
        <Button
          size="small"
          className="mt-1"
          aria-expanded={isOpen}
          aria-controls={listId}
          onClick={() => setOpen(!isOpen)}
        >
          {isOpen ? "Close" : "Fixes, with what they cost"}
        </Button>
      )}
      <div id={listId}>{isOpen && <FixList finding={finding} systemId={systemId} />}</div>
    </>
  );
}

function Item({
  severity,
  title,
  id,
  children,
}: {
  severity: FindingSeverity;
  title: string;
  id: string;
  children: ReactNode;
}) {
  const { selection, numberOf, layout, company, project } = useWorkspace();
  const segment = find(layout, "segment", id);
  const node = find(layout, "node", id);
  const place = segment ? `${numberOf(id)} ${segment.name}` : node?.tag || node?.spaceName || "";
  return (
    <div onPointerEnter={() => selection.hover(id)} onPointerLeave={() => selection.hover(null)}>
      <div className="flex items-baseline gap-2">
        <SeverityText severity={severity}>{title}</SeverityText>
        <span className="ml-auto text-help text-ink-3">{place}</span>
      </div>
      <div className="mt-0.5 text-ink-2">{children}</div>
      {(segment ?? node) && (
        <Link
          to={`${paths.project(company.slug, project.id, "layout")}?at=${id}`}
          className="text-help text-dye-ink underline"
        >
          Show on the board
        </Link>
      )}
    </div>
  );
}
