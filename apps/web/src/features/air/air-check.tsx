import {
  formatLength,
  formatPressure,
  formatPressureChange,
  pascals,
  meters,
  type Finding,
  type SolvedPath,
} from "@cleatwork/calc";
import { find } from "@cleatwork/layout";
import { Link } from "react-router-dom";
import { paths } from "../../lib/paths.ts";
import { EmptyState } from "../../ui/empty-state.tsx";
import { Panel, PanelHead } from "../../ui/panel.tsx";
import { SeverityMark, SeverityText } from "../../ui/severity.tsx";
import { DataTable } from "../../ui/table/data-table.tsx";
import { useWorkspace } from "../workspace/index.ts";
import { findingFigures, findingTitle } from "./finding-words.ts";
import { GradeLineDock } from "./grade-line-dock.tsx";

/** What an engineer would check: findings first, then the grade line, then every path. */
export function AirCheck({ systemId }: { systemId: string }) {
  const { solutionOf, numbers } = useWorkspace();
  const solution = solutionOf(systemId);
  return (
    <main className="grid min-h-0 grow grid-cols-[380px_minmax(0,1fr)] content-start gap-3 overflow-auto p-4 max-lg:grid-cols-1">
      <h1 className="sr-only">Air check</h1>
      <Findings systemId={systemId} />
      <div className="grid content-start gap-3">
        <Panel label="Grade line">
          <GradeLineDock systemId={systemId} />
        </Panel>
        {solution && <Paths paths={solution.paths} governing={solution.governingOutletNodeId} />}
      </div>
      {numbers === null && (
        <p className="sr-only" role="status">
          Computing
        </p>
      )}
      <p className="col-span-full text-help text-ink-3">
        Velocity, friction and pressure are an aid to licensed judgment; the adopted code, the project specification and
        the authority having jurisdiction govern. Fire, smoke and ceiling dampers, grease and hazardous exhaust,
        combustion and make-up air, seismic bracing: have a licensed professional decide.
      </p>
    </main>
  );
}

function Findings({ systemId }: { systemId: string }) {
  const { numbers, solutionOf } = useWorkspace();
  const findings = solutionOf(systemId)?.findings ?? [];
  const takeoff = numbers?.takeoffs.find((each) => each.systemId === systemId)?.findings ?? [];
  const problems = numbers?.problems ?? [];
  return (
    <Panel live label="Findings">
      <PanelHead title="Findings" fact={`${findings.length + takeoff.length + problems.length}`} />
      {findings.length + takeoff.length + problems.length === 0 ? (
        <EmptyState title="Nothing found">Every duct of this system is within its limits.</EmptyState>
      ) : (
        <ul>
          {problems.map((problem, position) => (
            <Item
              key={position}
              severity="stop"
              title={`${problem.subject.name || "The system"}: ${problem.field}`}
              id={problem.subject.id}
            >
              Needs {problem.limit}
              {problem.value === null ? "." : `, is ${problem.value}.`}
            </Item>
          ))}
          {findings.map((finding) => (
            <FindingItem key={finding.id} finding={finding} />
          ))}
          {takeoff.map((finding) => (
            <Item key={finding.id} severity={finding.severity} title="Metal" id={finding.segmentId}>
              {finding.message}
            </Item>
          ))}
        </ul>
      )}
    </Panel>
  );
}

function FindingItem({ finding }: { finding: Finding }) {
  const { units } = useWorkspace();
  const { value, limit } = findingFigures(finding, units);
  return (
    <Item severity={finding.severity} title={findingTitle(finding)} id={finding.subject.id}>
      <b>{value}</b>, limit {limit}
      <span className="block text-help text-ink-3">{finding.limitSource}</span>
    </Item>
  );
}

function Item({
  severity,
  title,
  id,
  children,
}: {
  severity: "stop" | "warn" | "note";
  title: string;
  id: string;
  children: React.ReactNode;
}) {
  const { selection, numberOf, layout, company, project } = useWorkspace();
  const segment = find(layout, "segment", id);
  const node = find(layout, "node", id);
  const place = segment ? `${numberOf(id)} ${segment.name}` : node?.tag || node?.spaceName || "";
  return (
    <li
      className="border-b border-line px-4 py-2 last:border-b-0"
      onPointerEnter={() => selection.hover(id)}
      onPointerLeave={() => selection.hover(null)}
    >
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
    </li>
  );
}

function Paths({ paths: rows, governing }: { paths: readonly SolvedPath[]; governing: string }) {
  const { layout, units } = useWorkspace();
  const name = (id: string) => {
    const node = find(layout, "node", id);
    return [node?.tag, node?.spaceName].filter(Boolean).join(", ") || "Outlet";
  };
  return (
    <DataTable
      title="Paths"
      fact={`${rows.length} outlets`}
      rows={rows}
      rowId={({ outletNodeId }) => outletNodeId}
      csvName="paths"
      sort={{ id: "spare", desc: false }}
      empty="No path yet."
      columns={[
        {
          id: "outlet",
          head: "Outlet",
          value: ({ outletNodeId }) => name(outletNodeId),
          cell: ({ outletNodeId }) => (
            <span className="inline-flex items-center gap-1.5">
              {name(outletNodeId)}
              {outletNodeId === governing && <b className="text-label">governs</b>}
            </span>
          ),
        },
        {
          id: "length",
          head: "Length",
          align: "right",
          value: ({ length_m }) => length_m,
          cell: ({ length_m }) => formatLength(meters(length_m), units).text,
        },
        {
          id: "friction",
          head: "Friction",
          align: "right",
          value: ({ frictionLoss_pa }) => frictionLoss_pa,
          cell: ({ frictionLoss_pa }) => formatPressure(frictionLoss_pa, units).value,
        },
        {
          id: "dynamic",
          head: "Fittings",
          align: "right",
          value: ({ dynamicLoss_pa }) => dynamicLoss_pa,
          cell: ({ dynamicLoss_pa }) => formatPressure(dynamicLoss_pa, units).value,
        },
        {
          id: "outletPressure",
          head: "Outlet",
          align: "right",
          value: ({ outletPressure_pa }) => outletPressure_pa,
          cell: ({ outletPressure_pa }) => formatPressure(outletPressure_pa, units).value,
        },
        {
          id: "required",
          head: "Needs",
          align: "right",
          value: ({ requiredPressure_pa }) => requiredPressure_pa,
          cell: ({ requiredPressure_pa }) => <b>{formatPressure(requiredPressure_pa, units).value}</b>,
        },
        {
          id: "spare",
          head: "Spare",
          align: "right",
          value: ({ spare_pa }) => spare_pa,
          cell: ({ spare_pa }) => (
            <span className="inline-flex items-center justify-end gap-1">
              {spare_pa < -0.5 && <SeverityMark severity="stop" label="Short" />}
              {formatPressureChange(spare_pa, units).value}
            </span>
          ),
        },
        {
          id: "throttle",
          head: "Damper takes up",
          align: "right",
          value: ({ throttle_pa }) => throttle_pa,
          cell: ({ throttle_pa }) => formatPressure(pascals(throttle_pa), units).value,
        },
      ]}
    />
  );
}
