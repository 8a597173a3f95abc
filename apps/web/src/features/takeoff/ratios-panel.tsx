import { checkRatios, decimal, ratiosOf, US_RATIO, type RatioCheck, type TakeoffRatio } from "@cleatwork/calc";
import { useQuery } from "@tanstack/react-query";
import { Panel, PanelBody, PanelHead } from "../../ui/panel.tsx";
import { SeverityText } from "../../ui/severity.tsx";
import { useWorkspace } from "../workspace/index.ts";
import { takeoffQueries } from "./takeoff.queries.ts";

const names: Readonly<Record<TakeoffRatio, string>> = {
  metalPerAirflow_kg_per_m3s: "Metal by air",
  metalPerLength_kg_per_m: "Metal by length",
  areaPerFitting_m2: "Area of a fitting",
};
const SI_UNITS: Readonly<Record<TakeoffRatio, string>> = {
  metalPerAirflow_kg_per_m3s: "kg per m³/s",
  metalPerLength_kg_per_m: "kg/m",
  areaPerFitting_m2: "m² each",
};

/** Totals held against the company's own issued quotes: a missed floor or a doubled system shows here first. */
export function RatiosPanel() {
  const { company, project, numbers, units, standards } = useWorkspace();
  const { data } = useQuery(takeoffQueries.ratios(company.slug));
  if (!numbers) return null;
  const pieces = numbers.takeoffs.flatMap((takeoff) => takeoff.pieces);
  const airflow = numbers.solutions.reduce((sum, { outletAirflow_m3s }) => sum + outletAirflow_m3s, 0);
  const now = ratiosOf(pieces, airflow);
  const others = (data?.items ?? []).filter(({ projectId }) => projectId !== project.id).map(({ ratios }) => ratios);
  const checks = checkRatios(now, others, standards.ratioTolerance);
  const text = (ratio: TakeoffRatio, value: number) =>
    units === "si"
      ? `${decimal(value, 2)} ${SI_UNITS[ratio]}`
      : `${decimal(value * US_RATIO[ratio].factor, 2)} ${US_RATIO[ratio].unit}`;
  const rows = (Object.keys(names) as TakeoffRatio[]).flatMap((ratio) => {
    const value = now[ratio];
    return value === null ? [] : [{ ratio, value, check: checks.find((each) => each.ratio === ratio) ?? null }];
  });
  return (
    <Panel label="Totals checks">
      <PanelHead
        title="Totals checks"
        fact={others.length === 0 ? "no other job issued yet" : "against our own jobs"}
      />
      {rows.length === 0 ? (
        <PanelBody className="text-ink-3">Nothing to hold against anything yet.</PanelBody>
      ) : (
        <dl className="px-4 py-2">
          {rows.map(({ ratio, value, check }) => (
            <div
              key={ratio}
              className="grid grid-cols-[1fr_auto] gap-x-3 border-b border-line-soft py-1 last:border-b-0"
            >
              <dt>{names[ratio]}</dt>
              <dd className="text-right font-semibold">{text(ratio, value)}</dd>
              {check && (
                <dd className="col-span-2">
                  <Verdict check={check} usual={text(ratio, check.usual)} />
                </dd>
              )}
            </div>
          ))}
        </dl>
      )}
    </Panel>
  );
}

function Verdict({ check, usual }: { check: RatioCheck; usual: string }) {
  const words = `usual ${usual}, ${check.jobs} ${check.jobs === 1 ? "job" : "jobs"}`;
  if (!check.isFarOff) return <span className="text-help text-ink-3">{words}</span>;
  return (
    <SeverityText severity="warn">
      {decimal(check.times, 1)} times; {words}: look for a missed floor, a doubled system, a wrong gauge
    </SeverityText>
  );
}
