/** How each kind of cell is read and shown: in the company's units on the screen, SI in the document. Pure. */
import {
  decimal,
  inchesOfWater,
  KILOGRAMS_PER_POUND,
  METERS_PER_FOOT,
  METERS_PER_INCH,
  parseNumber,
  parseThickness,
  sheetLabels,
  type GaugeChart,
  type HoursPer,
  type Material,
  type Meters,
  type Reinforcement,
} from "@cleatwork/calc";
import type { UnitSystem } from "@cleatwork/contracts";

export type Read<T> = { readonly ok: true; readonly value: T } | { readonly ok: false; readonly allowed: string };

const tidyNumber = (value: number, digits: number) => String(Number(value.toFixed(digits)));

export const sizeText = (size: number | null | undefined, units: UnitSystem): string =>
  size === null || size === undefined
    ? ""
    : units === "si"
      ? tidyNumber(size * 1000, 0)
      : tidyNumber(size / METERS_PER_INCH, 3);

export function readSize(text: string, units: UnitSystem): Read<Meters> {
  const read = parseThickness(text, units);
  return read.ok
    ? read
    : { ok: false, allowed: units === "si" ? "millimeters such as 600" : "inches such as 24 or 6 1/2" };
}

export const readSizeOrNone = (text: string, units: UnitSystem): Read<Meters | null> =>
  text.trim() === "" ? { ok: true, value: null } : readSize(text, units);

/** "24", "24 ga", "24ga"; ".05", "0.050 in." for aluminum: a sheet that the metal is sold in. Nothing: no sheet. */
export function readGauge(text: string, material: Material): Read<string | null> {
  const typed = text.trim().toLowerCase();
  if (typed === "") return { ok: true, value: null };
  const labels = sheetLabels(material);
  const number = Number(typed.replace(/\s*(ga\.?|gauge|in\.?|")$/, ""));
  const label = labels.find((each) => each === typed || Number.parseFloat(each) === number);
  return label === undefined
    ? { ok: false, allowed: `of ${material}: ${labels.join(", ")}` }
    : { ok: true, value: label };
}

export const reinforcementText = (reinforcement: Reinforcement): string => {
  switch (reinforcement.kind) {
    case "required":
      return reinforcement.grade;
    case "not-required":
      return "not required";
    case "not-designed":
      return "not designed";
    case "blank":
      return "";
  }
};

/** A grade needs its spacing: that of before, else the chart's. */
export function readReinforcement(
  text: string,
  before: Reinforcement,
  chart: Pick<GaugeChart, "spacing_m">,
): Read<Reinforcement> {
  const typed = text.trim();
  if (typed === "" || /^blank$/i.test(typed)) return { ok: true, value: { kind: "blank" } };
  if (/^(not required|nr|none)$/i.test(typed)) return { ok: true, value: { kind: "not-required" } };
  if (/^(not designed|nd)$/i.test(typed)) return { ok: true, value: { kind: "not-designed" } };
  if (typed.length > 40) return { ok: false, allowed: "a grade, “not required”, “not designed”, or nothing for blank" };
  const spacing_m = before.kind === "required" ? before.spacing_m : (chart.spacing_m ?? null);
  return { ok: true, value: { kind: "required", grade: typed.length === 1 ? typed.toUpperCase() : typed, spacing_m } };
}

const HOURS_FACTOR: Readonly<Record<HoursPer, number>> = {
  weight: KILOGRAMS_PER_POUND,
  length: METERS_PER_FOOT,
  piece: 1,
};
const HOURS_UNITS: Readonly<Record<HoursPer, { readonly us: string; readonly si: string }>> = {
  weight: { us: "h/lb", si: "h/kg" },
  length: { us: "h/ft", si: "h/m" },
  piece: { us: "h each", si: "h each" },
};
const factorOf = (per: HoursPer, units: UnitSystem) => (units === "si" ? 1 : HOURS_FACTOR[per]);

export const hoursUnit = (per: HoursPer, units: UnitSystem): string => HOURS_UNITS[per][units === "si" ? "si" : "us"];
export const hoursText = (hours_h: number, per: HoursPer, units: UnitSystem): string =>
  decimal(hours_h * factorOf(per, units), 4);

export function readNumber(text: string, allowed: string, limits: { min: number; max: number }): Read<number> {
  const value = parseNumber(text);
  return value === null || value < limits.min || value > limits.max ? { ok: false, allowed } : { ok: true, value };
}

export function readHours(text: string, per: HoursPer, units: UnitSystem): Read<number> {
  const read = readNumber(text, "hours from 0 to 1000", { min: 0, max: 1000 });
  return read.ok ? { ok: true, value: read.value / factorOf(per, units) } : read;
}

/** A chart by what tells it from its neighbors. */
export function chartLabel(chart: Omit<GaugeChart, "sizes">, units: UnitSystem): string {
  const pressure =
    units === "si"
      ? `${chart.pressureClass_pa.toFixed(0)} Pa`
      : `${tidyNumber(chart.pressureClass_pa / inchesOfWater(1), 2)} in. w.g.`;
  const spacing = chart.spacing_m === undefined ? [] : [`joints ${spacingText(chart.spacing_m, units)}`];
  const sign =
    chart.pressureSign === undefined ? "" : chart.pressureSign === "negative" ? "suction, to " : "pressure, to ";
  return [`${sign}${pressure}`, ...(chart.construction ? [chart.construction.replace("-", " ")] : []), ...spacing].join(
    ", ",
  );
}

const spacingText = (spacing: number, units: UnitSystem): string =>
  units === "si" ? `${tidyNumber(spacing * 1000, 0)} mm` : `${tidyNumber(spacing / METERS_PER_FOOT, 2)} ft`;
