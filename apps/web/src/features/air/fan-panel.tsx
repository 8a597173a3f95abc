import { formatAirflow, formatPressure, type Solution } from "@cleatwork/calc";
import { percentText } from "../../lib/format/percent.ts";
import { Panel, PanelHead } from "../../ui/panel.tsx";
import { useWorkspace } from "../workspace/index.ts";

/** What the equipment's fan must do for this system, with the margin told apart. */
export function FanPanel({ solution }: { solution: Solution }) {
  const { units } = useWorkspace();
  const { fan, outletAirflow_m3s, leakage_m3s } = solution;
  const share = percentText(Math.round((leakage_m3s / outletAirflow_m3s) * 10_000));
  const figures = [
    [
      "Air to move",
      formatAirflow(fan.airflow_m3s, units).text,
      `${formatAirflow(leakage_m3s, units).text} of it leaks, ${share}`,
    ],
    ["Required pressure", formatPressure(fan.requiredPressure_pa, units).text, "governing path"],
    [
      "Safety margin",
      formatPressure(fan.marginPressure_pa, units).text,
      percentText(Math.round(fan.safetyMargin * 10_000)),
    ],
    ["Fan total pressure", formatPressure(fan.totalPressure_pa, units).text, "required and margin"],
    [
      "Fan static pressure",
      formatPressure(fan.staticPressure_pa, units).text,
      `less ${formatPressure(fan.velocityPressure_pa, units).value} velocity pressure`,
    ],
  ] as const;
  return (
    <Panel label="Fan">
      <PanelHead title="Fan" fact="for this duct system; coils, filters and the unit's own losses are not in it" />
      <dl className="grid grid-cols-5 gap-x-4 gap-y-2 p-4 max-lg:grid-cols-2">
        {figures.map(([label, text, aside]) => (
          <div key={label}>
            <dt className="text-help text-ink-3">{label}</dt>
            <dd className="text-head tabular-nums">{text}</dd>
            <dd className="text-help text-ink-3">{aside}</dd>
          </div>
        ))}
      </dl>
    </Panel>
  );
}
