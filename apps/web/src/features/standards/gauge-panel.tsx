import {
  MATERIALS,
  SCHEDULE_SHAPES,
  sheetLabels,
  shippedStandards,
  type CompanyStandards,
  type GaugeRow,
  type Material,
  type ScheduleShape,
} from "@cleatwork/calc";
import { chartKey, gaugeChartSchema } from "@cleatwork/contracts";
import { useState } from "react";
import { Button, IconButton } from "../../ui/button.tsx";
import { SelectField } from "../../ui/controls.tsx";
import { PlusIcon, TrashIcon } from "../../ui/icons/icon.tsx";
import { Panel, PanelBody, PanelHead } from "../../ui/panel.tsx";
import { useSession } from "../session/index.ts";
import {
  chartLabel,
  readGauge,
  readReinforcement,
  readSize,
  readSizeOrNone,
  reinforcementText,
  sizeText,
} from "./cells.ts";
import { GridCell } from "./grid-cell.tsx";
import { chartsOf, copyCharts, dropCharts, replaceChart, startChart, withSize } from "./standards-draft.ts";

const materialWords: Readonly<Record<Material, string>> = {
  galvanized: "Galvanized steel",
  stainless: "Stainless steel",
  aluminum: "Aluminum",
  "black-steel": "Black steel",
};
const shapeWords: Readonly<Record<ScheduleShape, string>> = {
  round: "Round",
  rectangular: "Rectangular",
  "flat-oval": "Flat oval",
};
const JOINTS = ["slip-and-drive", "standing-s", "flange"];
const SEAMS = ["corner-lock", "button-lock"];

export interface PanelProps {
  readonly document: CompanyStandards;
  readonly onChange: (document: CompanyStandards) => void;
  readonly onUnclear: (name: string, unclear: boolean) => void;
  readonly mayWrite: boolean;
}

/** Size → gauge, reinforcement, joint, seam, length: one chart at a time. */
export function GaugePanel({ document, onChange, onUnclear, mayWrite }: PanelProps) {
  const units = useSession().company.unitSystem;
  const [material, setMaterial] = useState<Material>("galvanized");
  const [shape, setShape] = useState<ScheduleShape>("rectangular");
  const [key, setKey] = useState("");
  const { owner, charts } = chartsOf(document, material, shape);
  const chart =
    charts.find((each) => chartKey(each) === key) ?? charts.find(({ spacing_m }) => spacing_m === 1.524) ?? charts[0];
  const edits = mayWrite && owner === "company";
  const schedule = owner === "company" && document.gauges ? document.gauges : shippedStandards.gauges;
  const issues = chart ? (gaugeChartSchema.safeParse(chart).error?.issues ?? []) : [];
  const problemOf = (row: number, field: string) =>
    issues.find(({ path }) => path[0] === "sizes" && path[1] === row && path[2] === field)?.message;
  const unit = units === "si" ? "mm" : "in.";

  return (
    <Panel live label="Gauges and construction">
      <PanelHead title="Gauges and construction" fact={owner === "company" ? "ours" : `shipped, ${schedule.standing}`}>
        <SelectField
          label="Metal"
          hideLabel
          value={material}
          onChange={(event) => setMaterial(event.target.value as Material)}
          choices={MATERIALS.map((value) => ({ value, label: materialWords[value] }))}
        />
        <SelectField
          label="Shape"
          hideLabel
          value={shape}
          onChange={(event) => setShape(event.target.value as ScheduleShape)}
          choices={SCHEDULE_SHAPES.map((value) => ({ value, label: shapeWords[value] }))}
        />
        {chart && (
          <SelectField
            label="Chart"
            hideLabel
            value={chartKey(chart)}
            onChange={(event) => setKey(event.target.value)}
            choices={charts.map((each) => ({ value: chartKey(each), label: chartLabel(each, units) }))}
          />
        )}
        {mayWrite &&
          (owner === "shipped" ? (
            <Button size="small" disabled={!chart} onClick={() => onChange(copyCharts(document, material, shape))}>
              Copy to ours
            </Button>
          ) : (
            <Button size="small" onClick={() => onChange(dropCharts(document, material, shape))}>
              Back to shipped
            </Button>
          ))}
      </PanelHead>
      {!chart ? (
        <PanelBody className="text-ink-2">
          No chart is shipped for {shapeWords[shape].toLowerCase()} duct of {material}: such duct is told as outside the
          schedule until the spec or the duct names its sheet.
          {mayWrite && (
            <div className="mt-2">
              <Button size="small" onClick={() => onChange(startChart(document, material, shape))}>
                <PlusIcon />
                Start a chart to 2 in. w.g.
              </Button>
            </div>
          )}
        </PanelBody>
      ) : (
        <div className="overflow-x-auto">
          <datalist id="gauge-choices">
            {sheetLabels(material).map((label) => (
              <option key={label} value={label} />
            ))}
          </datalist>
          <datalist id="joint-choices">
            {JOINTS.map((joint) => (
              <option key={joint} value={joint} />
            ))}
          </datalist>
          <datalist id="seam-choices">
            {SEAMS.map((seam) => (
              <option key={seam} value={seam} />
            ))}
          </datalist>
          <table className="grid-table">
            <thead>
              <tr>
                <th>Up to, {unit}</th>
                <th>Gauge</th>
                <th>Reinforcement</th>
                <th>Every, {unit}</th>
                <th>Without from</th>
                <th>Joint</th>
                <th>Seam</th>
                <th>Piece length, {unit}</th>
                <th>
                  <span className="sr-only">Row</span>
                </th>
              </tr>
            </thead>
            <tbody>
              {chart.sizes.map((size, row) => {
                const at = `up to ${sizeText(size.upTo_m, units)} ${unit}`;
                const set = (more: Partial<GaugeRow>) =>
                  onChange(replaceChart(document, chart, withSize(chart, row, { ...size, ...more })));
                const cell = { onUnclear, disabled: !edits };
                const stiff = size.reinforcement;
                return (
                  <tr key={row} data-hover>
                    <GridCell
                      {...cell}
                      column="size"
                      name={`Size, row ${row + 1}`}
                      text={sizeText(size.upTo_m, units)}
                      read={(text) => readSize(text, units)}
                      onChange={(upTo_m) => set({ upTo_m })}
                      problem={problemOf(row, "upTo_m")}
                    />
                    <GridCell
                      {...cell}
                      column="gauge"
                      name={`Gauge, ${at}`}
                      text={size.gauge ?? ""}
                      read={(text) => readGauge(text, material)}
                      onChange={(gauge) => set({ gauge })}
                      problem={problemOf(row, "gauge")}
                      choices={sheetLabels(material)}
                    />
                    <GridCell
                      {...cell}
                      wide
                      column="reinforcement"
                      name={`Reinforcement, ${at}`}
                      text={reinforcementText(stiff)}
                      read={(text) => readReinforcement(text, stiff, chart)}
                      onChange={(reinforcement) => set({ reinforcement })}
                      problem={problemOf(row, "reinforcement")}
                    />
                    <GridCell
                      {...cell}
                      disabled={!edits || stiff.kind !== "required"}
                      column="spacing"
                      name={`Spacing, ${at}`}
                      text={stiff.kind === "required" ? sizeText(stiff.spacing_m, units) : ""}
                      read={(text) => readSizeOrNone(text, units)}
                      onChange={(spacing_m) => {
                        if (stiff.kind === "required") set({ reinforcement: { ...stiff, spacing_m } });
                      }}
                    />
                    <GridCell
                      {...cell}
                      column="unreinforced"
                      name={`Gauge without reinforcement, ${at}`}
                      text={size.unreinforcedGauge ?? ""}
                      read={(text) => readGauge(text, material)}
                      onChange={(unreinforcedGauge) => set({ unreinforcedGauge })}
                      problem={problemOf(row, "unreinforcedGauge")}
                    />
                    <GridCell
                      {...cell}
                      column="joint"
                      name={`Joint, ${at}`}
                      text={size.joint ?? ""}
                      read={(text) => readWord(text)}
                      onChange={(joint) => set({ joint })}
                      choices={JOINTS}
                    />
                    <GridCell
                      {...cell}
                      column="seam"
                      name={`Seam, ${at}`}
                      text={size.seam ?? ""}
                      read={(text) => readWord(text)}
                      onChange={(seam) => set({ seam })}
                      choices={SEAMS}
                    />
                    <GridCell
                      {...cell}
                      column="length"
                      name={`Piece length, ${at}`}
                      text={sizeText(size.sectionLength_m, units)}
                      read={(text) => readSizeOrNone(text, units)}
                      onChange={(sectionLength_m) => set({ sectionLength_m })}
                      problem={problemOf(row, "sectionLength_m")}
                    />
                    <td>
                      {edits && chart.sizes.length > 1 && (
                        <IconButton
                          label={`Take the row ${at} out`}
                          onClick={() =>
                            onChange(
                              replaceChart(document, chart, {
                                ...chart,
                                sizes: chart.sizes.filter((_, index) => index !== row),
                              }),
                            )
                          }
                        >
                          <TrashIcon />
                        </IconButton>
                      )}
                    </td>
                  </tr>
                );
              })}
            </tbody>
          </table>
        </div>
      )}
      <PanelBody className="grid gap-2 text-help text-ink-3">
        {edits && chart && (
          <div>
            <Button size="small" onClick={() => onChange(replaceChart(document, chart, withNewSize(chart)))}>
              <PlusIcon />
              Size
            </Button>
          </div>
        )}
        <p>
          {schedule.source}. An empty gauge with “not designed” or an empty reinforcement is no sheet: such duct is a
          finding. Joints, seams and lengths count for specs that leave them to the schedule.
        </p>
      </PanelBody>
    </Panel>
  );
}

const readWord = (text: string) => {
  const word = text.trim();
  return word.length > 40
    ? { ok: false as const, allowed: "40 characters at most" }
    : { ok: true as const, value: word === "" ? null : word };
};

/** A row past the last, one inch larger, with its sheet: to be changed at once. */
function withNewSize(chart: Parameters<typeof withSize>[0]): typeof chart {
  const last = chart.sizes.at(-1);
  if (!last) return chart;
  return { ...chart, sizes: [...chart.sizes, { ...last, upTo_m: (last.upTo_m + 0.0254) as typeof last.upTo_m }] };
}
