/** Quantities in a person's units. One function for each kind, so that a pressure cannot be shown as a length. */
import {
  CUBIC_METERS_PER_SECOND_PER_CFM,
  KILOGRAMS_PER_POUND,
  METERS_PER_FOOT,
  METERS_PER_INCH,
  METERS_PER_SECOND_PER_FPM,
  PASCALS_PER_INCH_OF_WATER,
  kilograms,
  type CubicMetersPerSecond,
  type Hours,
  type Kelvins,
  type Kilograms,
  type Meters,
  type MetersPerSecond,
  type Pascals,
  type PascalsPerMeter,
  type SquareMeters,
} from "../quantity.ts";
import type { CountedItem } from "../takeoff/takeoff.ts";
import { decimal, shown, signed, type Shown, type UnitSystem } from "./unit-system.ts";

export const formatAirflow = (value: CubicMetersPerSecond, units: UnitSystem): Shown =>
  units === "si"
    ? shown(decimal(value * 1000, 0), "L/s")
    : shown(decimal(value / CUBIC_METERS_PER_SECOND_PER_CFM, 0), "cfm");

export const formatVelocity = (value: MetersPerSecond, units: UnitSystem): Shown =>
  units === "si" ? shown(decimal(value, 1), "m/s") : shown(decimal(value / METERS_PER_SECOND_PER_FPM, 0), "fpm");

export const formatPressure = (value: Pascals, units: UnitSystem): Shown =>
  units === "si"
    ? shown(decimal(value, 0), "Pa")
    : shown(decimal(value / PASCALS_PER_INCH_OF_WATER, 3), "in.\u2009w.g.");

/** A difference of pressure, with its sign. */
export const formatPressureChange = (value: Pascals, units: UnitSystem): Shown =>
  units === "si" ? shown(signed(value, 0), "Pa") : shown(signed(value / PASCALS_PER_INCH_OF_WATER, 3), "in.\u2009w.g.");

export const formatFrictionRate = (value: PascalsPerMeter, units: UnitSystem): Shown =>
  units === "si"
    ? shown(decimal(value, 2), "Pa/m")
    : shown(decimal((value * 100 * METERS_PER_FOOT) / PASCALS_PER_INCH_OF_WATER, 3), "in.\u2009w.g./100 ft");

export const formatWeight = (value: Kilograms, units: UnitSystem): Shown =>
  units === "si" ? shown(decimal(value, 1), "kg") : shown(decimal(value / KILOGRAMS_PER_POUND, 1), "lb");

export const formatWeightChange = (value: Kilograms, units: UnitSystem): Shown =>
  units === "si" ? shown(signed(value, 1), "kg") : shown(signed(value / KILOGRAMS_PER_POUND, 1), "lb");

export const formatArea = (value: SquareMeters, units: UnitSystem): Shown =>
  units === "si" ? shown(decimal(value, 2), "m\u00b2") : shown(decimal(value / METERS_PER_FOOT ** 2, 1), "ft\u00b2");

/** US liquid gallon; exact by definition. */
const LITERS_PER_GALLON = 3.785411784;

/** A counted thing: pieces are only a number, what is measured comes in a person's units. */
export function formatCounted(quantity: number, unit: CountedItem["unit"], units: UnitSystem): Shown {
  const isSi = units === "si";
  switch (unit) {
    case "ea":
      return shown(Number.isInteger(quantity) ? decimal(quantity, 0) : decimal(quantity, 1), "");
    case "L":
      return isSi ? shown(decimal(quantity, 1), "L") : shown(decimal(quantity / LITERS_PER_GALLON, 1), "gal");
    case "m":
      return isSi ? shown(decimal(quantity, 1), "m") : shown(decimal(quantity / METERS_PER_FOOT, 0), "ft");
    case "kg":
      return formatWeight(kilograms(quantity), units);
  }
}

export const formatHours = (value: Hours, _units: UnitSystem): Shown => shown(decimal(value, 1), "h");

export const formatTemperature = (value: Kelvins, units: UnitSystem): Shown =>
  units === "si"
    ? shown(decimal(value - 273.15, 0), "\u00b0C")
    : shown(decimal((value - 273.15) * 1.8 + 32, 0), "\u00b0F");

/** Elevation and altitude: feet with a decimal, or meters. */
export const formatElevation = (value: Meters, units: UnitSystem): Shown =>
  units === "si" ? shown(decimal(value, 2), "m") : shown(decimal(value / METERS_PER_FOOT, 1), "ft");

/** A thin dimension, such as liner or wrap: inches with a fraction, or millimeters. */
export const formatThickness = (value: Meters, units: UnitSystem): Shown =>
  units === "si" ? shown(decimal(value * 1000, 0), "mm") : shown(fractionOf(value / METERS_PER_INCH, 16), "in.");

/** "12\u2032-6\u00bd\u2033" to the eighth of an inch, or "3.81 m". */
export function formatLength(value: Meters, units: UnitSystem): Shown {
  if (units === "si") return shown(decimal(value, 2), "m");
  const eighths = Math.round((Math.abs(value) / METERS_PER_INCH) * 8);
  const feet = Math.floor(eighths / 96);
  const inches = fractionOf((eighths - feet * 96) / 8, 8);
  const sign = value < 0 && eighths > 0 ? "\u2212" : "";
  return shown(`${sign}${feet}\u2032-${inches}\u2033`, "");
}

const FRACTIONS: Readonly<Record<string, string>> = {
  "1/2": "\u00bd",
  "1/4": "\u00bc",
  "3/4": "\u00be",
  "1/8": "\u215b",
  "3/8": "\u215c",
  "5/8": "\u215d",
  "7/8": "\u215e",
};

/** "6\u00bd", "7", "3/16": inches as a tape measure shows them. */
export function fractionOf(inches: number, denominator: 8 | 16): string {
  const parts = Math.round(Math.abs(inches) * denominator);
  const whole = Math.floor(parts / denominator);
  const sign = inches < 0 && parts > 0 ? "\u2212" : "";
  let top = parts - whole * denominator;
  if (top === 0) return `${sign}${whole}`;
  let bottom: number = denominator;
  while (top % 2 === 0) {
    top /= 2;
    bottom /= 2;
  }
  const fraction = FRACTIONS[`${top}/${bottom}`] ?? `${whole > 0 ? " " : ""}${top}/${bottom}`;
  return `${sign}${whole > 0 ? whole : ""}${fraction}`;
}

/** "$66,120.62". Whole cents in, so what is printed is what is added. */
export function formatMoney(minor: number, currency: string): Shown {
  const negative = minor < 0 ? "\u2212" : "";
  return shown(`${negative}${symbolOf(currency)}${decimal(Math.abs(minor) / 100, 2)}`, "");
}

export function formatMoneyChange(minor: number, currency: string): Shown {
  return minor > 0 ? shown(`+${formatMoney(minor, currency).value}`, "") : formatMoney(minor, currency);
}

/** "$1.0625": a unit price keeps what is finer than a cent, and shows cents at least. */
export function formatUnitPrice(micro: number, currency: string): Shown {
  const digits = micro % 10_000 === 0 ? 2 : micro % 100 === 0 ? 4 : 6;
  return shown(`${symbolOf(currency)}${decimal(micro / 1_000_000, digits)}`, "");
}

const symbolOf = (currency: string): string =>
  ({ USD: "$", CAD: "C$", EUR: "\u20ac", GBP: "\u00a3", AUD: "A$" })[currency] ?? `${currency} `;

/** Basis points as percent: 1,215 is "12.15 %", 1,400 is "14.0 %". */
export const formatShare = (basisPoints: number): Shown =>
  shown(decimal(basisPoints / 100, basisPoints % 10 === 0 ? 1 : 2), "%");
