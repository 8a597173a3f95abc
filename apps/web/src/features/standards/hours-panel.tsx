import {
  HOURS_KINDS,
  HOURS_PER,
  HOURS_PLACES,
  MATERIALS,
  SCHEDULE_SHAPES,
  shippedStandards,
  type CompanyHours,
  type HoursRow,
} from "@cleatwork/calc";
import { Button, IconButton } from "../../ui/button.tsx";
import { PlusIcon, TrashIcon } from "../../ui/icons/icon.tsx";
import { Panel, PanelBody, PanelHead } from "../../ui/panel.tsx";
import { useSession } from "../session/index.ts";
import { hoursText, hoursUnit, readHours, readNumber, readSizeOrNone, sizeText } from "./cells.ts";
import type { PanelProps } from "./gauge-panel.tsx";
import { GridCell } from "./grid-cell.tsx";
import { copyHours, withCondition, withHoursRow } from "./standards-draft.ts";

/** Hours by place, kind, shape, metal and size; by pound, foot or piece. */
export function HoursPanel({ document, onChange, onUnclear, mayWrite }: PanelProps) {
  const units = useSession().company.unitSystem;
  const hours = document.hours ?? shippedStandards.productivity;
  const edits = mayWrite && document.hours !== null;
  const set = (next: CompanyHours) => onChange({ ...document, hours: next });
  const own = document.hours;
  const change = (index: number, row: HoursRow) => {
    if (own) set(withHoursRow(own, index, { ...row, standing: "own" }));
  };
  return (
    <Panel live label="Hours">
      <PanelHead title="Hours" fact={own ? "ours" : `shipped, ${shippedStandards.productivity.source}`}>
        {mayWrite &&
          (own ? (
            <Button size="small" onClick={() => onChange({ ...document, hours: null })}>
              Back to shipped
            </Button>
          ) : (
            <Button size="small" onClick={() => onChange(copyHours(document))}>
              Copy to ours
            </Button>
          ))}
      </PanelHead>
      <div className="overflow-x-auto">
        <table className="grid-table">
          <thead>
            <tr>
              <th>Where</th>
              <th>Kind</th>
              <th>Shape</th>
              <th>Metal</th>
              <th>Up to, {units === "si" ? "mm" : "in."}</th>
              <th>By</th>
              <th>Hours</th>
              <th>Unit</th>
              <th>Standing</th>
              <th>Note</th>
              <th>
                <span className="sr-only">Row</span>
              </th>
            </tr>
          </thead>
          <tbody>
            {hours.rows.map((row, index) => {
              const at = `${row.place} ${row.kind}, row ${index + 1}`;
              const cell = { onUnclear, disabled: !edits };
              return (
                <tr key={index} data-hover>
                  <Pick
                    name={`Where, ${at}`}
                    value={row.place}
                    values={HOURS_PLACES}
                    disabled={!edits}
                    onPick={(place) => change(index, { ...row, place })}
                  />
                  <Pick
                    name={`Kind, ${at}`}
                    value={row.kind}
                    values={HOURS_KINDS}
                    disabled={!edits}
                    onPick={(kind) => change(index, { ...row, kind })}
                  />
                  <Pick
                    name={`Shape, ${at}`}
                    value={row.shape}
                    values={[null, ...SCHEDULE_SHAPES]}
                    disabled={!edits}
                    onPick={(shape) => change(index, { ...row, shape })}
                  />
                  <Pick
                    name={`Metal, ${at}`}
                    value={row.material}
                    values={[null, ...MATERIALS]}
                    disabled={!edits}
                    onPick={(material) => change(index, { ...row, material })}
                  />
                  <GridCell
                    {...cell}
                    column="hours-size"
                    name={`Size, ${at}`}
                    text={sizeText(row.upTo_m, units)}
                    read={(text) => readSizeOrNone(text, units)}
                    onChange={(upTo_m) => change(index, { ...row, upTo_m })}
                  />
                  <Pick
                    name={`By, ${at}`}
                    value={row.per}
                    values={HOURS_PER}
                    disabled={!edits}
                    onPick={(per) => change(index, { ...row, per })}
                  />
                  <GridCell
                    {...cell}
                    column="hours"
                    name={`Hours, ${at}`}
                    text={hoursText(row.hours_h, row.per, units)}
                    read={(text) => readHours(text, row.per, units)}
                    onChange={(hours_h) => change(index, { ...row, hours_h })}
                  />
                  <td className="text-ink-2">{hoursUnit(row.per, units)}</td>
                  <td className="text-ink-2">{row.standing}</td>
                  <td className="text-ink-3">{row.note}</td>
                  <td>
                    {own && edits && (
                      <IconButton
                        label={`Take ${at} out`}
                        onClick={() => set({ ...own, rows: own.rows.filter((_, each) => each !== index) })}
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
      <PanelBody className="grid gap-2 text-help text-ink-3">
        {own && edits && (
          <div>
            <Button size="small" onClick={() => set({ ...own, rows: [...own.rows, NEW_ROW] })}>
              <PlusIcon />
              Row
            </Button>
          </div>
        )}
        <p>
          A row that names the metal goes before one that does not, the kind before any fitting, then the shape; of
          these the first size that is not smaller. A piece without a row has no hours, and a finding says so.
        </p>
      </PanelBody>
      <Conditions {...{ document, onChange, onUnclear, mayWrite }} />
    </Panel>
  );
}

const NEW_ROW: HoursRow = {
  place: "field",
  kind: "straight",
  shape: null,
  material: null,
  upTo_m: null,
  per: "weight",
  hours_h: 0,
  standing: "own",
  note: "",
};

function Conditions({ document, onChange, onUnclear, mayWrite }: PanelProps) {
  const own = document.hours;
  const conditions = (own ?? shippedStandards.productivity).conditions;
  const edits = mayWrite && own !== null;
  return (
    <>
      <PanelHead title="Conditions" fact="multiply field hours; picked for a project" level={3} />
      <div className="overflow-x-auto">
        <table className="grid-table">
          <thead>
            <tr>
              <th>Condition</th>
              <th>Times</th>
              <th>Standing</th>
            </tr>
          </thead>
          <tbody>
            {conditions.map((condition, index) => (
              <tr key={index} data-hover>
                <td>{condition.name}</td>
                <GridCell
                  column="condition"
                  name={`Factor of ${condition.name}`}
                  disabled={!edits}
                  onUnclear={onUnclear}
                  text={String(condition.factor)}
                  read={(text) => readNumber(text.replace(/^[×x]\s*/, ""), "0.1 to 10", { min: 0.1, max: 10 })}
                  onChange={(factor) => {
                    if (own)
                      onChange({
                        ...document,
                        hours: withCondition(own, index, { ...condition, factor, standing: "own" }),
                      });
                  }}
                />
                <td className="text-ink-2">{condition.standing}</td>
              </tr>
            ))}
          </tbody>
        </table>
      </div>
    </>
  );
}

function Pick<V extends string | null>({
  name,
  value,
  values,
  disabled,
  onPick,
}: {
  name: string;
  value: V;
  values: readonly V[];
  disabled: boolean;
  onPick: (value: V) => void;
}) {
  return (
    <td className="p-0!">
      <select
        aria-label={name}
        disabled={disabled}
        value={values.indexOf(value)}
        onChange={(event) => {
          const picked = values[Number(event.target.value)];
          if (picked !== undefined) onPick(picked);
        }}
        className="h-7 rounded-edge border border-transparent bg-transparent px-1 hover:border-line-strong focus:bg-sheet-hi disabled:text-ink-2"
      >
        {values.map((each, index) => (
          <option key={index} value={index}>
            {each ?? "any"}
          </option>
        ))}
      </select>
    </td>
  );
}
