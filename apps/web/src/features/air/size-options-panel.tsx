import {
  formatFrictionRate,
  formatMoneyChange,
  formatPressureChange,
  formatSize,
  formatVelocity,
  formatWeightChange,
  hours,
  kilograms,
  pascals,
  signed,
  sizeOptions,
  type SizeOption,
} from "@cleatwork/calc";
import type { ChangeSet } from "@cleatwork/contracts";
import { find, setSegments, type TrialOutcome } from "@cleatwork/layout";
import { useMemo } from "react";
import { Button } from "../../ui/button.tsx";
import { EmptyState } from "../../ui/empty-state.tsx";
import { Panel, PanelHead } from "../../ui/panel.tsx";
import { DataTable } from "../../ui/table/data-table.tsx";
import { useTrial, useWorkspace } from "../workspace/index.ts";

interface Row {
  readonly option: SizeOption;
  /** Null: the duct has this size, typed. */
  readonly set: ChangeSet | null;
  readonly outcome: TrialOutcome | null;
}

/** The sizes that the chosen duct could have at equal friction, each with what it would change. */
export function SizeOptionsPanel({ systemId }: { systemId: string }) {
  const { selection, record, numbers, solvedOf, solutionOf } = useWorkspace();
  const chosen = record(selection.primary);
  const segment = chosen?.kind === "segment" && chosen.systemId === systemId ? chosen : null;
  const system = numbers?.systems.find(({ id }) => id === systemId);
  const air = solutionOf(systemId)?.air;
  const airflow = segment ? solvedOf(segment.id)?.volumetricFlowRate_m3s : undefined;
  const built = system?.segments.find(({ id }) => id === segment?.id);

  const options = useMemo(
    () => (system && built && air && airflow !== undefined ? sizeOptions(system, built, airflow, air) : []),
    [system, built, air, airflow],
  );
  if (!segment || !system)
    return (
      <Panel label="Sizes">
        <PanelHead title="Sizes" />
        <EmptyState title="No duct chosen">
          Choose a duct on the grade line to see its sizes at equal friction.
        </EmptyState>
      </Panel>
    );
  return <Options segmentId={segment.id} options={options} rate_pa_m={system.sizing.frictionRate_pa_m} />;
}

function Options({
  segmentId,
  options,
  rate_pa_m,
}: {
  segmentId: string;
  options: readonly SizeOption[];
  rate_pa_m: SizeOption["frictionRate_pa_m"];
}) {
  const { layout, units, company, mayEdit, numberOf, run, solvedOf } = useWorkspace();
  const made = useMemo(
    () =>
      options.map((option) => {
        const label = `Size ${formatSize(option.section, units).text}`;
        const result = setSegments(layout, { ids: [segmentId], fields: { section: option.section }, label });
        return result.ok ? result.value : null;
      }),
    [options, layout, segmentId, units],
  );
  const sets = useMemo(() => made.filter((set) => set !== null), [made]);
  const outcomes = useTrial(sets);
  const rows = options.map((option, position): Row => {
    const set = made[position] ?? null;
    return { option, set, outcome: set && (outcomes[sets.indexOf(set)] ?? null) };
  });
  const change = ({ set, outcome }: Row) => (set === null ? NO_CHANGE : outcome?.ok ? outcome.change : null);
  const pressure = (row: Row) => {
    const known = change(row);
    return known && (known.systems[0]?.requiredPressure_pa ?? 0);
  };
  // The size in the layout: what the air sees may be smaller by the liner.
  const now = find(layout, "segment", segmentId)?.section ?? solvedOf(segmentId)?.section;
  const isNow = ({ set, option }: Row) =>
    set === null || (now !== undefined && formatSize(now, units).text === formatSize(option.section, units).text);

  return (
    <DataTable
      title={`Sizes for ${numberOf(segmentId)}`}
      fact={`equal friction, ${formatFrictionRate(rate_pa_m, units).text}`}
      rows={rows}
      rowId={({ option }) => formatSize(option.section, units).text}
      csvName="sizes"
      isSelected={isNow}
      empty={<EmptyState title="No standard size">None carries this air at the system’s friction rate.</EmptyState>}
      columns={[
        {
          id: "size",
          head: "Size",
          value: ({ option }) => formatSize(option.section, units).text,
          cell: (row) => (
            <>
              {formatSize(row.option.section, units).text} {isNow(row) && <b className="text-label">now</b>}
            </>
          ),
        },
        {
          id: "velocity",
          head: `Velocity, ${units === "si" ? "m/s" : "fpm"}`,
          align: "right",
          value: ({ option }) => option.meanVelocity_m_s,
          cell: ({ option }) => formatVelocity(option.meanVelocity_m_s, units).value,
          csv: { head: "velocity_m_s", value: ({ option }) => option.meanVelocity_m_s },
        },
        {
          id: "friction",
          head: `Friction, ${units === "si" ? "Pa/m" : "in.\u2009w.g./100 ft"}`,
          align: "right",
          value: ({ option }) => option.frictionRate_pa_m,
          cell: ({ option }) => formatFrictionRate(option.frictionRate_pa_m, units).value,
          csv: { head: "friction_rate_pa_m", value: ({ option }) => option.frictionRate_pa_m },
        },
        {
          id: "pressure",
          head: `Needs, ${units === "si" ? "Pa" : "in.\u2009w.g."}`,
          align: "right",
          value: pressure,
          cell: (row) => shown(pressure(row), row, (value) => formatPressureChange(pascals(value), units).value),
          csv: { head: "required_pressure_change_pa", value: pressure },
        },
        {
          id: "metal",
          head: units === "si" ? "kg" : "lb",
          align: "right",
          value: (row) => change(row)?.metal_kg ?? null,
          cell: (row) =>
            shown(change(row)?.metal_kg ?? null, row, (value) => formatWeightChange(kilograms(value), units).value),
          csv: { head: "metal_change_kg", value: (row) => change(row)?.metal_kg ?? null },
        },
        {
          id: "hours",
          head: "Hours",
          align: "right",
          value: (row) => hoursOf(change(row)),
          cell: (row) => shown(hoursOf(change(row)), row, (value) => signed(hours(value), 1)),
          csv: { head: "hours_change_h", value: (row) => hoursOf(change(row)) },
        },
        {
          id: "price",
          head: "Price",
          align: "right",
          value: (row) => change(row)?.price_minor ?? null,
          cell: (row) =>
            shown(change(row)?.price_minor ?? null, row, (value) => formatMoneyChange(value, company.currency).value),
          csv: { head: "price_change_minor", value: (row) => change(row)?.price_minor ?? null },
        },
        {
          id: "use",
          head: "",
          value: () => null,
          cell: ({ set, option }) =>
            set &&
            mayEdit && (
              <Button
                size="small"
                aria-label={`Use ${formatSize(option.section, units).text}`}
                onClick={() => run(() => ({ ok: true, value: set }))}
              >
                Use
              </Button>
            ),
        },
      ]}
    />
  );
}

const NO_CHANGE = { systems: [], metal_kg: 0, shop_h: 0, field_h: 0, price_minor: 0 } as const;

const hoursOf = (change: { readonly shop_h: number; readonly field_h: number } | null): number | null =>
  change && change.shop_h + change.field_h;

/** A change, a sign that it is being computed, or that it cannot be. */
const shown = (value: number | null, { outcome, set }: Row, words: (value: number) => string) =>
  value !== null ? words(value) : set && outcome === null ? "…" : "–";
