/** What people type, into SI. What cannot be read is a problem that says what was typed and what is taken. */
import type { Section } from "../air-system.ts";
import {
  CUBIC_METERS_PER_SECOND_PER_CFM,
  METERS_PER_FOOT,
  METERS_PER_INCH,
  METERS_PER_SECOND_PER_FPM,
  PASCALS_PER_INCH_OF_WATER,
  cubicMetersPerSecond,
  degreesCelsius,
  degreesFahrenheit,
  meters,
  metersPerSecond,
  pascals,
  pascalsPerMeter,
  type CubicMetersPerSecond,
  type Kelvins,
  type Meters,
  type MetersPerSecond,
  type Pascals,
  type PascalsPerMeter,
} from "../quantity.ts";
import { fail, ok, type Result } from "../result.ts";
import type { UnitSystem } from "./unit-system.ts";

export interface TypedProblem {
  readonly code: "not-readable" | "one-side" | "not-positive";
  readonly typed: string;
  /** A short sentence: what is wrong, and what to type instead. */
  readonly message: string;
}
type Typed<T> = Result<T, TypedProblem>;

const VULGAR: Readonly<Record<string, number>> = {
  "½": 1 / 2,
  "¼": 1 / 4,
  "¾": 3 / 4,
  "⅛": 1 / 8,
  "⅜": 3 / 8,
  "⅝": 5 / 8,
  "⅞": 7 / 8,
};

const tidy = (typed: string): string =>
  typed
    .trim()
    .toLowerCase()
    .replace(/[\u2212\u2013]/g, "-")
    .replace(/[\u2018\u2019\u2032]/g, "'")
    .replace(/[\u201c\u201d\u2033]|''/g, '"')
    .replace(/[\u00a0\u2009]/g, " ")
    .replace(/×/g, "x");

const notReadable = (typed: string, example: string): Typed<never> =>
  fail({ code: "not-readable", typed, message: `\u201c${typed.trim()}\u201d cannot be read. Type ${example}.` });

/** "6", "6.5", "1,320", "6 1/2", "1/2", "6½". */
export function parseNumber(text: string): number | null {
  const value = text.trim().replace(/(\d),(?=\d{3}(\D|$))/g, "$1");
  if (/^-?(\d+\.?\d*|\.\d+)$/.test(value)) return Number(value);
  const fraction = /^(-)?(?:(\d+)[ -]+)?(\d+)\/(\d+)$/.exec(value);
  if (fraction) {
    const [, minus, whole = "0", top, bottom] = fraction;
    const sum = Number(whole) + Number(top) / Number(bottom);
    return Number.isFinite(sum) ? (minus ? -sum : sum) : null;
  }
  const vulgar = /^(-)?(\d*) ?([½¼¾⅛⅜⅝⅞])$/.exec(value);
  if (vulgar) {
    const [, minus, whole = "", sign = ""] = vulgar;
    const sum = Number(whole || "0") + (VULGAR[sign] ?? 0);
    return minus ? -sum : sum;
  }
  return null;
}

/**
 * A length. Feet when nothing is said (inch-pound) or meters (SI, or millimeters when it is a whole number of 100 or
 * more).
 *
 * @example parseLength("12'6", "inch-pound") // 3.81 m; also 12'6", 12-6, 150", 12.5, 3.81 m, 3810 mm
 */
export function parseLength(typed: string, units: UnitSystem): Typed<Meters> {
  const text = tidy(typed);
  const wrong = () => notReadable(typed, units === "si" ? "3.8 or 3800 or 12'6\"" : '12\'6" or 12-6 or 12.5 or 150"');
  const metric = /^(.+?) ?(mm|cm|m)$/.exec(text);
  if (metric) {
    const value = parseNumber(metric[1] ?? "");
    const factor = { mm: 0.001, cm: 0.01, m: 1 }[metric[2] ?? ""] ?? 1;
    return value === null ? wrong() : positive(typed, value * factor, meters);
  }
  const imperial = /^(?:(.+?) ?(?:'|ft\.?|feet)[ -]*)?(?:(.+?) ?(?:"|in\.?|inch|inches)?)?$/.exec(text);
  const marked = /['"]|ft|in|feet/.test(text);
  if (marked && imperial) {
    const feet = imperial[1] === undefined ? 0 : parseNumber(imperial[1]);
    const inches = imperial[2] === undefined ? 0 : parseNumber(imperial[2]);
    return feet === null || inches === null
      ? wrong()
      : positive(typed, feet * METERS_PER_FOOT + inches * METERS_PER_INCH, meters);
  }
  const dashed = /^(\d+)-(\d+(?:\.\d+)?|\d+ \d+\/\d+|\d+\/\d+|\d*[½¼¾⅛⅜⅝⅞])$/.exec(text);
  if (dashed && units === "inch-pound") {
    const inches = parseNumber(dashed[2] ?? "");
    return inches === null
      ? wrong()
      : positive(typed, Number(dashed[1]) * METERS_PER_FOOT + inches * METERS_PER_INCH, meters);
  }
  const plain = parseNumber(text);
  if (plain === null) return wrong();
  if (units === "inch-pound") return positive(typed, plain * METERS_PER_FOOT, meters);
  return positive(typed, Number.isInteger(plain) && plain >= 100 ? plain / 1000 : plain, meters);
}

/** A small dimension, inches or millimeters when nothing is said. */
export function parseThickness(typed: string, units: UnitSystem): Typed<Meters> {
  const text = tidy(typed);
  const unit = /^(.+?) ?(mm|cm|m|"|in\.?)$/.exec(text);
  const value = parseNumber(unit?.[1] ?? text);
  if (value === null) return notReadable(typed, units === "si" ? '25 or 1"' : "1 1/2 or 40 mm");
  const factor =
    { mm: 0.001, cm: 0.01, m: 1 }[unit?.[2] ?? ""] ?? (unit || units === "inch-pound" ? METERS_PER_INCH : 0.001);
  return positive(typed, value * factor, meters);
}

/**
 * A size: `24x12` rectangular, `14ø`, `14o`, `14 round` round, `20x10fo` or `20x10 oval` flat oval, `12/8` annular (outer
 * and inner diameter). Inches, or millimeters when SI or when so said. A bare number is round where `bare` says so.
 *
 * @example parseSize("24x12", "inch-pound")
 */
export function parseSize(typed: string, units: UnitSystem, bare: "round" | "refuse" = "refuse"): Typed<Section> {
  let text = tidy(typed);
  const metric = /mm$/.test(text) || units === "si";
  text = text.replace(/ ?(mm|in\.?|")$/, "").replace(/"/g, "");
  const scale = metric && !/in\.?$|"$/.test(tidy(typed)) ? 0.001 : METERS_PER_INCH;
  const side = (part: string | undefined): Meters | null => {
    const value = part === undefined ? null : parseNumber(part);
    return value === null ? null : meters(value * scale);
  };
  const wrong = () =>
    notReadable(typed, "24x12 for rectangular, 14ø for round, 20x10fo for flat oval, 12/8 for annular");
  const zero = (): Typed<never> =>
    fail({
      code: "not-positive",
      typed,
      message: `\u201c${typed.trim()}\u201d has a side of nothing. Every side is more than zero.`,
    });

  const round =
    /^(.+?) ?(?:ø|Ø|o|⌀|r|rd|round|dia\.?)$/.exec(text) ??
    (bare === "round" && parseNumber(text) !== null ? [text, text] : null);
  const annular = /^([\d.]+) ?(?:ø|o)? ?\/ ?([\d.]+) ?(?:ø|o)?$/.exec(text);
  const sides = /^([^x]+)x([^x]*?)(?: ?(fo|oval|flat oval|f))?$/.exec(text);

  if (sides) {
    const width = side(sides[1]);
    if ((sides[2] ?? "").trim() === "" && width !== null)
      return fail({
        code: "one-side",
        typed,
        message: `\u201c${typed.trim()}\u201d has one side. Type 14x12 for rectangular, 14ø for round.`,
      });
    const height = side(sides[2]);
    if (width === null || height === null) return wrong();
    if (!(width > 0 && height > 0)) return zero();
    return ok({ shape: sides[3] ? "flat-oval" : "rectangular", width_m: width, height_m: height });
  }
  if (annular) {
    const outer = side(annular[1]);
    const inner = side(annular[2]);
    if (outer === null || inner === null) return wrong();
    return outer > 0 && inner > 0 ? ok({ shape: "annular", outerDiameter_m: outer, innerDiameter_m: inner }) : zero();
  }
  if (round) {
    const diameter = side(round[1]);
    if (diameter === null) return wrong();
    return diameter > 0 ? ok({ shape: "round", diameter_m: diameter }) : zero();
  }
  return parseNumber(text) !== null
    ? fail({
        code: "one-side",
        typed,
        message: `\u201c${typed.trim()}\u201d has one side. Type 14x12 for rectangular, 14ø for round.`,
      })
    : wrong();
}

/** `1200`, `1200 cfm`, `570 L/s`, `0.57 m3/s`. */
export const parseAirflow = (typed: string, units: UnitSystem): Typed<CubicMetersPerSecond> =>
  withUnit(typed, cubicMetersPerSecond, units === "si" ? "570 or 1200 cfm" : "1200 or 570 L/s", {
    "": units === "si" ? 0.001 : CUBIC_METERS_PER_SECOND_PER_CFM,
    cfm: CUBIC_METERS_PER_SECOND_PER_CFM,
    c: CUBIC_METERS_PER_SECOND_PER_CFM,
    "l/s": 0.001,
    "m3/s": 1,
    "m³/s": 1,
    "m3/h": 1 / 3600,
    "m³/h": 1 / 3600,
  });

/** `0.08`, `0.08 in. w.g.`, `20 Pa`. */
export const parsePressure = (typed: string, units: UnitSystem): Typed<Pascals> =>
  withUnit(typed, pascals, units === "si" ? "20 or 0.08 in." : "0.08 or 20 Pa", {
    "": units === "si" ? 1 : PASCALS_PER_INCH_OF_WATER,
    pa: 1,
    in: PASCALS_PER_INCH_OF_WATER,
    inwg: PASCALS_PER_INCH_OF_WATER,
    inwc: PASCALS_PER_INCH_OF_WATER,
    '"': PASCALS_PER_INCH_OF_WATER,
  });

export const parseVelocity = (typed: string, units: UnitSystem): Typed<MetersPerSecond> =>
  withUnit(typed, metersPerSecond, units === "si" ? "7.5 or 1500 fpm" : "1500 or 7.5 m/s", {
    "": units === "si" ? 1 : METERS_PER_SECOND_PER_FPM,
    fpm: METERS_PER_SECOND_PER_FPM,
    "m/s": 1,
  });

/** Per 100 ft of duct, or per meter. */
export const parseFrictionRate = (typed: string, units: UnitSystem): Typed<PascalsPerMeter> =>
  withUnit(typed, pascalsPerMeter, units === "si" ? "0.8 or 0.1 in." : "0.08 or 0.65 Pa/m", {
    "": units === "si" ? 1 : PASCALS_PER_INCH_OF_WATER / (100 * METERS_PER_FOOT),
    "pa/m": 1,
    in: PASCALS_PER_INCH_OF_WATER / (100 * METERS_PER_FOOT),
    "in/100ft": PASCALS_PER_INCH_OF_WATER / (100 * METERS_PER_FOOT),
    "inwg/100ft": PASCALS_PER_INCH_OF_WATER / (100 * METERS_PER_FOOT),
  });

export function parseTemperature(typed: string, units: UnitSystem): Typed<Kelvins> {
  const match = /^(-?[\d.,]+) ?°? ?(c|f)?$/.exec(tidy(typed));
  const value = match ? parseNumber(match[1] ?? "") : null;
  if (value === null) return notReadable(typed, units === "si" ? "13 or 55 F" : "55 or 13 C");
  return ok((match?.[2] ?? (units === "si" ? "c" : "f")) === "c" ? degreesCelsius(value) : degreesFahrenheit(value));
}

function withUnit<Q extends number>(
  typed: string,
  make: (value: number) => Q,
  example: string,
  factors: Readonly<Record<string, number>>,
): Typed<Q> {
  const match = /^(-?[\d.,]+(?: \d+\/\d+)?) ?(.*)$/.exec(tidy(typed));
  const value = match ? parseNumber(match[1] ?? "") : null;
  const factor = factors[(match?.[2] ?? "").replace(/[. ]/g, "")];
  return value === null || factor === undefined ? notReadable(typed, example) : positive(typed, value * factor, make);
}

function positive<Q extends number>(typed: string, value: number, make: (value: number) => Q): Typed<Q> {
  return value >= 0 && Number.isFinite(value)
    ? ok(make(value))
    : fail({ code: "not-positive", typed, message: `\u201c${typed.trim()}\u201d is less than nothing.` });
}
