import {
  formatArea,
  formatHours,
  formatLength,
  formatSize,
  formatWeight,
  hours,
  kilograms,
  meters,
  squareMeters,
} from "@cleatwork/calc";
import { find } from "@cleatwork/layout";
import { Fragment, useMemo, useState } from "react";
import { Link } from "react-router-dom";
import { useQuery } from "@tanstack/react-query";
import { paths } from "../../lib/paths.ts";
import { classNames } from "../../lib/class-names.ts";
import { EmptyState } from "../../ui/empty-state.tsx";
import { Panel, PanelBody, PanelHead } from "../../ui/panel.tsx";
import { ScreenSkeleton } from "../../ui/skeleton.tsx";
import { Toggle } from "../../ui/toggle.tsx";
import { useWorkspace, workspaceQueries } from "../workspace/index.ts";
import { PieceArithmetic } from "./arithmetic.tsx";
import { ComparePanel } from "./compare-panel.tsx";
import { ConditionsPanel } from "./conditions-panel.tsx";
import { ExportButtons } from "./export-buttons.tsx";
import { GaugeChoice } from "./gauge-choice.tsx";
import { RatiosPanel } from "./ratios-panel.tsx";
import { Counted, MetalByGauge } from "./takeoff-sides.tsx";
import { groupsOf, sumOf, type Group, type Grouping, type Line, type Sums } from "./takeoff-rows.ts";

/** Every piece, counted: totals that open to sizes, sizes that open to pieces and their arithmetic. */
export function TakeoffScreen() {
  const { numbers, layout, units, company } = useWorkspace();
  const { data: specs } = useQuery(workspaceQueries.specs(company.slug));
  const [by, setBy] = useState<Grouping>("system");
  const [closed, setClosed] = useState<ReadonlySet<string>>(new Set());
  const [openLine, setOpenLine] = useState<string | null>(null);
  const groups = useMemo(
    () =>
      groupsOf(numbers?.takeoffs ?? [], by, {
        units,
        system: (id) => {
          const system = find(layout, "system", id);
          return system ? `${system.tag} ${system.name}` : "";
        },
        level: (id) => find(layout, "level", id)?.name ?? "",
        spec: (systemId) => {
          const specId = find(layout, "system", systemId)?.specId;
          return specs?.items.find(({ id }) => id === specId)?.name ?? "";
        },
      }),
    [numbers, by, units, layout, specs],
  );
  if (!numbers) return <ScreenSkeleton />;
  const all = sumOf(numbers.takeoffs.flatMap(({ pieces }) => pieces));

  return (
    <main className="grid min-h-0 grow grid-cols-[minmax(0,1fr)_320px] content-start gap-3 overflow-auto p-4 max-lg:grid-cols-1">
      <h1 className="sr-only">Takeoff</h1>
      <Panel live label="Takeoff">
        <PanelHead title="Takeoff" fact={`${all.count} pieces`}>
          <Toggle
            label="Grouped by"
            value={by}
            onChange={setBy}
            choices={[
              { value: "system", label: "System" },
              { value: "level", label: "Level" },
              { value: "kind", label: "Type" },
              { value: "size", label: "Size" },
              { value: "gauge", label: "Gauge" },
              { value: "spec", label: "Spec" },
            ]}
          />
          <ExportButtons />
        </PanelHead>
        {groups.length === 0 ? (
          <EmptyState title="Nothing to count yet">
            Draw a run, and its pieces, joints, hangers and hours appear here.
          </EmptyState>
        ) : (
          <div className="overflow-x-auto">
            <table className="grid-table">
              <thead>
                <tr>
                  <th>Item</th>
                  <th className="num">Size</th>
                  <th>ga</th>
                  <th className="num">Pieces</th>
                  <th className="num">Length</th>
                  <th className="num">Net</th>
                  <th className="num">Blank</th>
                  <th className="num">Weight</th>
                  <th className="num">Joints</th>
                  <th className="num">Shop, h</th>
                  <th className="num">Field, h</th>
                </tr>
              </thead>
              <tbody>
                {groups.map((group) => (
                  <GroupRows
                    key={group.key}
                    group={group}
                    open={!closed.has(group.key)}
                    openLine={openLine}
                    onToggle={() => setClosed(toggled(closed, group.key))}
                    onLine={(key) => setOpenLine(openLine === key ? null : key)}
                  />
                ))}
                <tr data-total>
                  <td>All systems</td>
                  <td />
                  <td />
                  <SumCells sums={all} />
                </tr>
              </tbody>
            </table>
          </div>
        )}
        <PanelBody className="text-help text-ink-3">
          Weight is net metal. Gauges and hours come from the schedules named at each number; those marked common
          practice are defaults to replace by your own.
        </PanelBody>
      </Panel>
      <div className="grid content-start gap-3">
        <RatiosPanel />
        <ComparePanel />
        <MetalByGauge />
        <Counted />
        <ConditionsPanel />
      </div>
    </main>
  );
}

const toggled = (set: ReadonlySet<string>, key: string) => {
  const next = new Set(set);
  if (!next.delete(key)) next.add(key);
  return next;
};

function GroupRows({
  group,
  open,
  openLine,
  onToggle,
  onLine,
}: {
  group: Group;
  open: boolean;
  openLine: string | null;
  onToggle: () => void;
  onLine: (key: string) => void;
}) {
  return (
    <>
      <tr data-group>
        <td>
          <button type="button" aria-expanded={open} onClick={onToggle} className="font-semibold">
            <span aria-hidden>{open ? "– " : "+ "}</span>
            {group.label}
          </button>
        </td>
        <td />
        <td />
        <SumCells sums={group.sums} />
      </tr>
      {open &&
        group.lines.map((line) => (
          <Fragment key={line.key}>
            <tr data-hover data-selected={openLine === line.key ? "" : undefined}>
              <td className="pl-6!">
                <button
                  type="button"
                  aria-expanded={openLine === line.key}
                  onClick={() => onLine(line.key)}
                  className="text-left underline-offset-2 hover:underline"
                >
                  {line.label || "Pieces"}
                </button>
              </td>
              <td className="num">{line.size}</td>
              <td>{line.gauge}</td>
              <SumCells sums={line.sums} />
            </tr>
            {openLine === line.key && (
              <tr>
                <td colSpan={11} className="border-l-4 border-dye bg-sheet-hi p-3!">
                  <Opened line={line} />
                </td>
              </tr>
            )}
          </Fragment>
        ))}
    </>
  );
}

function Opened({ line }: { line: Line }) {
  const { units, selection, company, project } = useWorkspace();
  const [mark, setMark] = useState(line.pieces[0]?.mark ?? "");
  const piece = line.pieces.find((each) => each.mark === mark) ?? line.pieces[0];
  if (!piece) return null;
  return (
    <div className="grid gap-2">
      <div className="flex flex-wrap gap-1" role="group" aria-label="Pieces">
        {line.pieces.map((each) => (
          <button
            key={`${each.systemId} ${each.mark}`}
            type="button"
            aria-pressed={each === piece}
            className={classNames(
              "border px-1.5 py-0.5 font-semibold",
              each === piece ? "border-dye bg-dye-tint" : "border-line",
            )}
            onClick={() => {
              setMark(each.mark);
              selection.select(each.segmentId);
            }}
          >
            {each.mark}
          </button>
        ))}
      </div>
      <p>
        <b>{piece.mark}</b>, {piece.segmentName || "unnamed duct"}: {formatSize(piece.section, units).text}
        {piece.length_m > 0 && `, ${formatLength(meters(piece.length_m), units).text}`}
        {piece.gauge && `, ${piece.gauge} ${piece.material}`}
        {piece.joint && `, ${piece.joint}`}
        {piece.seam && `, ${piece.seam}`}
      </p>
      <PieceArithmetic piece={piece} units={units} />
      <GaugeChoice piece={piece} />
      <p>
        <Link to={`${paths.project(company.slug, project.id)}?at=${piece.segmentId}`}>Show on the board</Link>
      </p>
    </div>
  );
}

function SumCells({ sums }: { sums: Sums }) {
  const { units } = useWorkspace();
  return (
    <>
      <td className="num">{sums.count}</td>
      <td className="num">{sums.length_m > 0 ? formatLength(meters(sums.length_m), units).text : ""}</td>
      <td className="num">{formatArea(squareMeters(sums.netArea_m2), units).value}</td>
      <td className="num">{formatArea(squareMeters(sums.blankArea_m2), units).value}</td>
      <td className="num">{formatWeight(kilograms(sums.weight_kg), units).value}</td>
      <td className="num">{sums.joints}</td>
      <td className="num">{formatHours(hours(sums.shop_h), units).value}</td>
      <td className="num">{formatHours(hours(sums.field_h), units).value}</td>
    </>
  );
}
