/** What a company's schedule asks for: gauge, reinforcement, joint, seam, length; and who said so. */
import type { ConstructionSpec, Material, Section } from "../air-system.ts";
import { meters, METERS_PER_INCH, PASCALS_PER_INCH_OF_WATER, type Meters } from "../quantity.ts";
import type {
  Construction,
  GaugeChart,
  GaugeRow,
  GaugeSchedule,
  Reinforcement,
  ScheduleShape,
} from "./gauge-schedule.ts";
import { findSheet, type Sheet } from "./sheet-weights.table.ts";

/**
 * Metric classes are printed rounded up: 250 Pa stands for 1 in. of water, 249.09 Pa. The same share everywhere, so that
 * a class typed either way finds its column.
 */
const CLASS_TOLERANCE = 1.005;
/** Typed inches and typed millimeters meet. */
const SIZE_TOLERANCE = 1e-5;
/** Coil widths are sold in whole inches and feet are rounded to millimeters: 1.524 m is 5 ft, and so is 1.525. */
const SPACING_TOLERANCE = 1.002;

export interface GaugeQuestion {
  readonly material: Material;
  readonly shape: ScheduleShape;
  /** Longest side, major axis or diameter of the sheet metal; of a piece that changes size, the larger end's. */
  readonly size_m: Meters;
  /** The other side of a rectangular piece: it has the same sheet and its own reinforcement. */
  readonly otherSize_m?: Meters;
  /** With its sign. */
  readonly pressureClass_pa: number;
  readonly construction: Construction;
  /** How far joints are apart: the section length. */
  readonly spacing_m: Meters;
}

/** Who decided, first to last: the piece's own, the system's spec, the company's schedule, the shipped one. */
export const GAUGE_DECIDERS = ["piece", "spec", "company", "shipped"] as const;
export type GaugeDecider = (typeof GAUGE_DECIDERS)[number];

/** Why a schedule has no sheet for a piece. */
export type GaugeMissing =
  | { readonly code: "no-chart" }
  | { readonly code: "class-beyond"; readonly limit_pa: number }
  | { readonly code: "spacing-beyond"; readonly limit_m: number }
  | { readonly code: "size-beyond"; readonly limit_m: number }
  | { readonly code: "not-designed" | "blank" }
  | { readonly code: "no-such-sheet"; readonly gauge: string };

export interface GaugeAnswer {
  readonly gauge: string | null;
  readonly sheet: Sheet | null;
  readonly decider: GaugeDecider | null;
  /** Name of the schedule that was read, or who overrode it. */
  readonly source: string;
  readonly reinforcement: Reinforcement;
  /** Of the other side of rectangular duct. */
  readonly otherReinforcement: Reinforcement | null;
  /** What the schedule says of them, for specs that leave it to the schedule. */
  readonly joint: string | null;
  readonly seam: string | null;
  readonly sectionLength_m: Meters | null;
  /** What the schedule asks for, where something before it decided otherwise. */
  readonly scheduled: string | null;
  readonly missing: GaugeMissing | null;
}

/** Who may decide before the schedules. */
export interface GaugeOverrides {
  readonly piece: string | null;
  readonly spec: string | null;
}

export type PieceQuestion = Pick<GaugeQuestion, "shape" | "construction" | "size_m" | "otherSize_m" | "spacing_m">;

/** Gauge of all walls of a piece by one schedule, or null where the schedule has none. */
export const findGauge = (schedule: GaugeSchedule, question: GaugeQuestion): string | null =>
  gaugeReader({ company: null, shipped: schedule }, question)(question, NO_OVERRIDES).gauge;

export const NO_OVERRIDES: GaugeOverrides = { piece: null, spec: null };

const BLANK: Reinforcement = { kind: "blank" };

/**
 * Reads the schedules for many pieces of one metal and pressure class: each chart is looked for once.
 *
 * The lowest class that holds the pressure governs, in it the closest spacing that the joints still keep, then the first
 * size that is not smaller. No row is stretched: beyond the last size of the chart there is no answer, and why is told.
 * A fitting goes by its own charts; where a schedule has none, by those of duct with a longitudinal seam, for that is how
 * a fitting is made. Where the company has any chart for a metal and shape, the shipped ones do not count for it: outside
 * of its own schedule a company is told so, not served another.
 */
export function gaugeReader(
  schedules: { readonly company: GaugeSchedule | null; readonly shipped: GaugeSchedule },
  duct: Pick<GaugeQuestion, "material" | "pressureClass_pa">,
): (piece: PieceQuestion, overrides: GaugeOverrides) => GaugeAnswer {
  const known = new Map<string, ChartFound>();
  const chartFor = ({ shape, construction, spacing_m }: PieceQuestion): ChartFound => {
    const key = `${shape} ${construction} ${spacing_m}`;
    let found = known.get(key);
    if (!found) known.set(key, (found = findChart(schedules, { ...duct, shape, construction, spacing_m })));
    return found;
  };

  return (piece, overrides) => {
    const found = chartFor(piece);
    const row = found.chart ? rowFor(found.chart, piece.size_m) : null;
    const scheduled = row?.gauge ?? null;
    const chosen = overrides.piece ?? overrides.spec;
    const gauge = chosen ?? scheduled;
    const sheet = gauge === null ? null : findSheet(duct.material, gauge);
    const otherRow = found.chart && piece.otherSize_m !== undefined ? rowFor(found.chart, piece.otherSize_m) : null;
    return {
      gauge: sheet ? gauge : null,
      sheet,
      decider: !sheet ? null : overrides.piece !== null ? "piece" : overrides.spec !== null ? "spec" : found.decider,
      source: overrides.piece !== null ? PIECE_SOURCE : overrides.spec !== null ? SPEC_SOURCE : found.schedule.name,
      reinforcement: stiffened(row, sheet, duct.material),
      otherReinforcement: piece.otherSize_m === undefined ? null : stiffened(otherRow, sheet, duct.material),
      joint: row?.joint ?? null,
      seam: row?.seam ?? null,
      sectionLength_m: row?.sectionLength_m ?? null,
      scheduled,
      missing: sheet ? null : missingOf(found, row, gauge),
    };
  };
}

const PIECE_SOURCE = "set for this duct";
const SPEC_SOURCE = "asked for by the spec";

interface ChartFound {
  readonly schedule: GaugeSchedule;
  readonly decider: "company" | "shipped";
  readonly chart: GaugeChart | null;
  readonly missing: GaugeMissing | null;
}

type ChartQuestion = Omit<GaugeQuestion, "size_m" | "otherSize_m">;

function findChart(
  { company, shipped }: { readonly company: GaugeSchedule | null; readonly shipped: GaugeSchedule },
  question: ChartQuestion,
): ChartFound {
  const isOurs = ({ material, shape }: GaugeChart) => material === question.material && shape === question.shape;
  const decider = company?.rows.some(isOurs) ? "company" : "shipped";
  const schedule = decider === "company" && company ? company : shipped;
  const charts = schedule.rows.filter(isOurs);
  let missing: GaugeMissing = { code: "no-chart" };
  for (const construction of constructionsFor(question.construction)) {
    const found = lowestChart(charts, question, construction);
    if (found.chart) return { schedule, decider, chart: found.chart, missing: null };
    if (found.missing.code !== "no-chart") missing = found.missing;
  }
  return { schedule, decider, chart: null, missing };
}

const constructionsFor = (construction: Construction) =>
  construction === "fitting" ? (["fitting", "longitudinal-seam"] as const) : ([construction] as const);

function lowestChart(
  charts: readonly GaugeChart[],
  { pressureClass_pa, spacing_m }: ChartQuestion,
  construction: Construction,
): { readonly chart: GaugeChart; readonly missing: null } | { readonly chart: null; readonly missing: GaugeMissing } {
  const sign = pressureClass_pa < 0 ? "negative" : "positive";
  const pressure = Math.abs(pressureClass_pa);
  const made = charts.filter(
    (chart) =>
      (chart.pressureSign === undefined || chart.pressureSign === sign) &&
      (chart.construction === undefined || chart.construction === construction),
  );
  if (made.length === 0) return { chart: null, missing: { code: "no-chart" } };
  const strong = made.filter((chart) => pressure <= chart.pressureClass_pa * CLASS_TOLERANCE);
  if (strong.length === 0) {
    const limit_pa = Math.max(...made.map((chart) => chart.pressureClass_pa));
    return { chart: null, missing: { code: "class-beyond", limit_pa } };
  }
  const lowest = Math.min(...strong.map((chart) => chart.pressureClass_pa));
  const ofClass = strong.filter((chart) => chart.pressureClass_pa === lowest);
  let closest: GaugeChart | null = null;
  for (const chart of ofClass) {
    const reach = chart.spacing_m ?? Infinity;
    if (spacing_m > reach * SPACING_TOLERANCE) continue;
    if (!closest || reach < (closest.spacing_m ?? Infinity)) closest = chart;
  }
  if (closest) return { chart: closest, missing: null };
  const limit_m = Math.max(...ofClass.map((chart) => chart.spacing_m ?? 0));
  return { chart: null, missing: { code: "spacing-beyond", limit_m } };
}

const rowFor = ({ sizes }: GaugeChart, size: Meters): GaugeRow | null =>
  sizes.find(({ upTo_m }) => size <= upTo_m + SIZE_TOLERANCE) ?? null;

/** A side needs no reinforcement where the sheet of the piece is one that does without at that size. */
function stiffened(row: GaugeRow | null, sheet: Sheet | null, material: Material): Reinforcement {
  if (!row) return BLANK;
  if (row.reinforcement.kind === "required" && sheet && row.unreinforcedGauge) {
    const enough = findSheet(material, row.unreinforcedGauge);
    if (enough && sheet.thickness_m >= enough.thickness_m) return { kind: "not-required" };
  }
  return row.reinforcement;
}

function missingOf(found: ChartFound, row: GaugeRow | null, gauge: string | null): GaugeMissing {
  if (gauge !== null) return { code: "no-such-sheet", gauge };
  if (!found.chart) return found.missing ?? { code: "no-chart" };
  if (!row) return { code: "size-beyond", limit_m: found.chart.sizes.at(-1)?.upTo_m ?? 0 };
  return { code: row.reinforcement.kind === "not-designed" ? "not-designed" : "blank" };
}

/** Why a schedule has no sheet, with its limit. Lengths in both units: people of either read it. */
export function missingWords(missing: GaugeMissing): string {
  switch (missing.code) {
    case "no-chart":
      return "no chart for this metal, shape, sign of the pressure and way of making it";
    case "class-beyond":
      return `pressure class beyond its last, ${(missing.limit_pa / PASCALS_PER_INCH_OF_WATER).toFixed(1)} in. of water (${missing.limit_pa.toFixed(0)} Pa)`;
    case "spacing-beyond":
      return `joints farther apart than its widest spacing, ${lengthWords(missing.limit_m)}`;
    case "size-beyond":
      return `size past its last, ${lengthWords(missing.limit_m)}`;
    case "not-designed":
      return "printed as not designed for this size and spacing; joints closer together may hold it";
    case "blank":
      return "its cell for this size is blank";
    case "no-such-sheet":
      return `${missing.gauge}, for which no sheet weight of this metal is known`;
  }
}

const lengthWords = (length_m: number): string =>
  `${Number((length_m / METERS_PER_INCH).toFixed(2))} in. (${(1000 * length_m).toFixed(0)} mm)`;

/** Longest side, major axis or diameter; an annulus goes by its outer wall. */
export function longestSide(section: Section): Meters {
  switch (section.shape) {
    case "round":
      return section.diameter_m;
    case "annular":
      return section.outerDiameter_m;
    case "rectangular":
    case "flat-oval":
      return meters(Math.max(section.width_m, section.height_m));
  }
}

/** The other side of rectangular duct; no other shape has one of its own. */
const shorterSide = (section: Section): { readonly otherSize_m?: Meters } =>
  section.shape === "rectangular" ? { otherSize_m: meters(Math.min(section.width_m, section.height_m)) } : {};

export const scheduleShape = (section: Section): ScheduleShape =>
  section.shape === "annular" ? "round" : section.shape;

export const straightConstruction = (section: Section, { roundConstruction }: ConstructionSpec): Construction =>
  section.shape === "rectangular" ? "longitudinal-seam" : roundConstruction;

/** How a section is asked for. */
export const pieceQuestion = (section: Section, construction: Construction, spec: ConstructionSpec): PieceQuestion => ({
  shape: scheduleShape(section),
  construction,
  size_m: longestSide(section),
  ...shorterSide(section),
  spacing_m:
    spec.sectionLength_m[
      section.shape === "flat-oval" ? "flatOval" : section.shape === "rectangular" ? "rectangular" : "round"
    ],
});
