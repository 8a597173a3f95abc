/**
 * Numbers that carry their unit in the type. SI base units throughout; inch-pound makers convert on the way in, with
 * factors that are exact by definition. Arithmetic drops the brand; the maker puts it back where a formula ends.
 */
declare const unit: unique symbol;
export type Quantity<U extends string> = number & { readonly [unit]: U };

export type Meters = Quantity<"m">;
export type SquareMeters = Quantity<"m²">;
export type CubicMetersPerSecond = Quantity<"m³/s">;
export type MetersPerSecond = Quantity<"m/s">;
export type Pascals = Quantity<"Pa">;
export type PascalsPerMeter = Quantity<"Pa/m">;
export type Kelvins = Quantity<"K">;
export type Kilograms = Quantity<"kg">;
export type KilogramsPerCubicMeter = Quantity<"kg/m³">;
export type KilogramsPerSquareMeter = Quantity<"kg/m²">;
export type PascalSeconds = Quantity<"Pa·s">;
export type Hours = Quantity<"h">;
export type Radians = Quantity<"rad">;

export const meters = (value: number) => value as Meters;
export const squareMeters = (value: number) => value as SquareMeters;
export const cubicMetersPerSecond = (value: number) => value as CubicMetersPerSecond;
export const metersPerSecond = (value: number) => value as MetersPerSecond;
export const pascals = (value: number) => value as Pascals;
export const pascalsPerMeter = (value: number) => value as PascalsPerMeter;
export const kelvins = (value: number) => value as Kelvins;
export const kilograms = (value: number) => value as Kilograms;
export const kilogramsPerCubicMeter = (value: number) => value as KilogramsPerCubicMeter;
export const kilogramsPerSquareMeter = (value: number) => value as KilogramsPerSquareMeter;
export const pascalSeconds = (value: number) => value as PascalSeconds;
export const hours = (value: number) => value as Hours;
export const radians = (value: number) => value as Radians;

/** Exact: the international inch. */
export const METERS_PER_INCH = 0.0254;
/** Exact: 12 inches. */
export const METERS_PER_FOOT = 0.3048;
/** Exact: 0.3048³ ÷ 60. */
export const CUBIC_METERS_PER_SECOND_PER_CFM = 0.3048 ** 3 / 60;
/** Exact: 0.3048 ÷ 60. */
export const METERS_PER_SECOND_PER_FPM = 0.3048 / 60;
/** Conventional inch of water at 4 °C, g = 9.80665 m/s²: 249.08891 Pa (NIST SP 811, appendix B.8). */
export const PASCALS_PER_INCH_OF_WATER = 249.08891;
/** Exact: the international avoirdupois pound. */
export const KILOGRAMS_PER_POUND = 0.45359237;

export const inches = (value: number) => meters(value * METERS_PER_INCH);
export const feet = (value: number) => meters(value * METERS_PER_FOOT);
export const squareFeet = (value: number) => squareMeters(value * METERS_PER_FOOT ** 2);
export const cubicFeetPerMinute = (value: number) => cubicMetersPerSecond(value * CUBIC_METERS_PER_SECOND_PER_CFM);
export const feetPerMinute = (value: number) => metersPerSecond(value * METERS_PER_SECOND_PER_FPM);
export const inchesOfWater = (value: number) => pascals(value * PASCALS_PER_INCH_OF_WATER);
/** Inches of water per 100 ft of duct, the trade's friction rate. */
export const inchesOfWaterPer100Feet = (value: number) =>
  pascalsPerMeter((value * PASCALS_PER_INCH_OF_WATER) / (100 * METERS_PER_FOOT));
export const pounds = (value: number) => kilograms(value * KILOGRAMS_PER_POUND);
export const poundsPerSquareFoot = (value: number) =>
  kilogramsPerSquareMeter((value * KILOGRAMS_PER_POUND) / METERS_PER_FOOT ** 2);
export const degreesFahrenheit = (value: number) => kelvins(((value - 32) * 5) / 9 + 273.15);
export const degreesCelsius = (value: number) => kelvins(value + 273.15);
