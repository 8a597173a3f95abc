import { formatLength, formatPressure, meters, pascals } from "@cleatwork/calc";
import { find } from "@cleatwork/layout";
import { SeverityText } from "../../ui/severity.tsx";
import { useWorkspace } from "../workspace/index.ts";
import { GradeLineChart } from "./grade-line-chart.tsx";

/** The grade line of one system, hovering and choosing together with the board. */
export function GradeLineDock({ systemId }: { systemId: string }) {
  const { solutionOf, units, selection, layout, numberOf, systems } = useWorkspace();
  const solution = solutionOf(systemId);
  const system = systems.find(({ id }) => id === systemId);
  if (!solution || !system)
    return <p className="p-4 text-ink-3">The grade line appears when the system can be solved.</p>;
  const outletName = (nodeId: string) => {
    const node = find(layout, "node", nodeId);
    return node?.tag || node?.spaceName || "the outlet";
  };
  const path = solution.paths.find(({ outletNodeId }) => outletNodeId === solution.governingOutletNodeId);
  const spare = path?.spare_pa ?? pascals(0);
  return (
    <div className="grid grid-cols-[180px_minmax(0,1fr)] gap-2 px-4 py-2 max-md:grid-cols-1">
      <div>
        <h2 className="text-head">Grade line</h2>
        <p className="text-help text-ink-2">
          {system.tag} to {outletName(solution.governingOutletNodeId)}
          {path && `, ${formatLength(meters(path.length_m), units).text}`}
        </p>
        <p className="text-help text-ink-3">Pressure left, {formatPressure(pascals(0), units).unit}</p>
        <div className="mt-1">
          {spare < -0.5 ? (
            <SeverityText severity="stop">short {formatPressure(pascals(0 - spare), units).value}</SeverityText>
          ) : (
            <SeverityText severity="good">spare {formatPressure(spare, units).value}</SeverityText>
          )}
        </div>
        <p className="text-help text-ink-2">
          needs {formatPressure(solution.requiredPressure_pa, units).value}, has{" "}
          {formatPressure(solution.availablePressure_pa, units).value}
        </p>
      </div>
      <GradeLineChart
        solution={solution}
        units={units}
        hoveredId={selection.hovered}
        selectedId={selection.primary}
        onHover={selection.hover}
        onSelect={(id) => selection.select(id)}
        outletName={outletName}
        segmentNumber={numberOf}
      />
    </div>
  );
}
