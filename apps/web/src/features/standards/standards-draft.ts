/** The document being edited, with what was before it: undo until it is saved. Pure. */
import {
  inches,
  inchesOfWater,
  shippedStandards,
  type CompanyHours,
  type CompanyStandards,
  type GaugeChart,
  type GaugeRow,
  type HoursRow,
  type Material,
  type ScheduleShape,
  type WorkCondition,
} from "@cleatwork/calc";

export interface Draft {
  readonly saved: CompanyStandards;
  readonly now: CompanyStandards;
  readonly before: readonly CompanyStandards[];
  readonly undone: readonly CompanyStandards[];
}

export type DraftAction =
  | { readonly kind: "set"; readonly document: CompanyStandards }
  | { readonly kind: "undo" | "redo" | "discard" }
  | { readonly kind: "saved"; readonly document: CompanyStandards };

export const draftOf = (saved: CompanyStandards): Draft => ({ saved, now: saved, before: [], undone: [] });

export function draftAfter(draft: Draft, action: DraftAction): Draft {
  switch (action.kind) {
    case "set":
      return { ...draft, now: action.document, before: [...draft.before, draft.now], undone: [] };
    case "undo": {
      const last = draft.before.at(-1);
      if (!last) return draft;
      return { ...draft, now: last, before: draft.before.slice(0, -1), undone: [...draft.undone, draft.now] };
    }
    case "redo": {
      const next = draft.undone.at(-1);
      if (!next) return draft;
      return { ...draft, now: next, before: [...draft.before, draft.now], undone: draft.undone.slice(0, -1) };
    }
    case "discard":
      return draftOf(draft.saved);
    case "saved":
      return draftOf(action.document);
  }
}

export const isChanged = ({ saved, now }: Draft): boolean => JSON.stringify(saved) !== JSON.stringify(now);

const OUR_GAUGES = { name: "Our gauge schedule", source: "our shop", standing: "own", rows: [] } as const;

/** The company's charts of a metal and shape; where it has none, the shipped ones, which cannot be edited. */
export function chartsOf(
  document: CompanyStandards,
  material: Material,
  shape: ScheduleShape,
): { readonly owner: "company" | "shipped"; readonly charts: readonly GaugeChart[] } {
  const isOf = (chart: GaugeChart) => chart.material === material && chart.shape === shape;
  const own = document.gauges?.rows.filter(isOf) ?? [];
  return own.length > 0
    ? { owner: "company", charts: own }
    : { owner: "shipped", charts: shippedStandards.gauges.rows.filter(isOf) };
}

/** All shipped charts of a metal and shape become the company's: a part of them would leave holes that are told as such. */
export function copyCharts(document: CompanyStandards, material: Material, shape: ScheduleShape): CompanyStandards {
  const gauges = document.gauges ?? OUR_GAUGES;
  const copied = shippedStandards.gauges.rows.filter((chart) => chart.material === material && chart.shape === shape);
  return { ...document, gauges: { ...gauges, rows: [...gauges.rows, ...copied] } };
}

/** Where nothing is shipped either: one chart to 2 in. of water with one blank size, to be filled in. */
export function startChart(document: CompanyStandards, material: Material, shape: ScheduleShape): CompanyStandards {
  const gauges = document.gauges ?? OUR_GAUGES;
  const chart: GaugeChart = {
    material,
    shape,
    pressureClass_pa: inchesOfWater(2),
    sizes: [{ upTo_m: inches(12), gauge: null, reinforcement: { kind: "blank" } }],
  };
  return { ...document, gauges: { ...gauges, rows: [...gauges.rows, chart] } };
}

export function dropCharts(document: CompanyStandards, material: Material, shape: ScheduleShape): CompanyStandards {
  if (!document.gauges) return document;
  const rows = document.gauges.rows.filter((chart) => chart.material !== material || chart.shape !== shape);
  return { ...document, gauges: rows.length === 0 ? null : { ...document.gauges, rows } };
}

export const replaceChart = (document: CompanyStandards, old: GaugeChart, chart: GaugeChart): CompanyStandards =>
  document.gauges
    ? {
        ...document,
        gauges: { ...document.gauges, rows: document.gauges.rows.map((each) => (each === old ? chart : each)) },
      }
    : document;

export const withSize = (chart: GaugeChart, index: number, size: GaugeRow): GaugeChart => ({
  ...chart,
  sizes: chart.sizes.map((each, at) => (at === index ? size : each)),
});

/** The shipped hours without the project's factor: what a company starts its own from. */
export const copyHours = (document: CompanyStandards): CompanyStandards => {
  const { conditionFactor: _factor, ...hours } = shippedStandards.productivity;
  return { ...document, hours: { ...hours, name: "Our hours", source: "our shop" } };
};

export const withHoursRow = (hours: CompanyHours, index: number, row: HoursRow): CompanyHours => ({
  ...hours,
  rows: hours.rows.map((each, at) => (at === index ? row : each)),
});

export const withCondition = (hours: CompanyHours, index: number, condition: WorkCondition): CompanyHours => ({
  ...hours,
  conditions: hours.conditions.map((each, at) => (at === index ? condition : each)),
});
