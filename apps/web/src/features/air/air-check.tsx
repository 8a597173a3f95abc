import { formatLength, formatPressure, formatPressureChange, pascals, meters, type SolvedPath } from "@cleatwork/calc";
import { find } from "@cleatwork/layout";
import { Panel } from "../../ui/panel.tsx";
import { SeverityMark } from "../../ui/severity.tsx";
import { DataTable } from "../../ui/table/data-table.tsx";
import { useWorkspace } from "../workspace/index.ts";
import { FanPanel } from "./fan-panel.tsx";
import { FindingList } from "./finding-list.tsx";
import { degrees } from "./fix-words.ts";
import { GradeLineDock } from "./grade-line-dock.tsx";
import { SizeOptionsPanel } from "./size-options-panel.tsx";

/** What an engineer would check: findings first, then the grade line, then every path. */
export function AirCheck({ systemId }: { systemId: string }) {
  const { solutionOf, numbers } = useWorkspace();
  const solution = solutionOf(systemId);
  return (
    <main className="grid min-h-0 grow grid-cols-[380px_minmax(0,1fr)] content-start gap-3 overflow-auto p-4 max-lg:grid-cols-1">
      <h1 className="sr-only">Air check</h1>
      <FindingList systemId={systemId} />
      <div className="grid content-start gap-3">
        <Panel label="Grade line">
          <GradeLineDock systemId={systemId} />
        </Panel>
        {solution && <FanPanel solution={solution} />}
        <SizeOptionsPanel systemId={systemId} />
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
        {
          id: "damper",
          head: "Blade turned",
          align: "right",
          value: ({ damper }) => damper?.angle_rad ?? 0,
          cell: ({ damper }) =>
            damper === null ? "open" : damper.angle_rad === null ? "over 70°" : degrees(damper.angle_rad),
        },
      ]}
    />
  );
}
