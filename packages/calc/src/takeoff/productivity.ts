/** What a table of hours is made of, and how a piece finds its row. */
import type { AccessoryKind, Material } from "../air-system.ts";
import type { Hours, Kilograms, Meters } from "../quantity.ts";
import { hours } from "../quantity.ts";
import type { ScheduleShape, Standing } from "./gauge-schedule.ts";

export const HOURS_PLACES = ["shop", "field"] as const;
export type HoursPlace = (typeof HOURS_PLACES)[number];

/** What the hours are for: a kilogram of net metal, a meter of center line, a piece. */
export const HOURS_PER = ["weight", "length", "piece"] as const;
export type HoursPer = (typeof HOURS_PER)[number];

/** A kind of piece, or any fitting. */
export const HOURS_KINDS = ["straight", "flexible", "fitting", "elbow", "transition", "branch", "end-cap"] as const;
export type HoursKind = (typeof HOURS_KINDS)[number];

export interface HoursRow {
  readonly place: HoursPlace;
  readonly kind: HoursKind;
  /** Null: any. */
  readonly shape: ScheduleShape | null;
  /** Null: any. */
  readonly material: Material | null;
  /** Longest side or diameter up to and including this; null: any. */
  readonly upTo_m: Meters | null;
  readonly per: HoursPer;
  /** Hours for one of it. */
  readonly hours_h: number;
  readonly standing: Standing;
  readonly note: string;
}

/** What makes field work slower, by name; a project picks what holds for it. */
export interface WorkCondition {
  readonly name: string;
  readonly factor: number;
  readonly standing: Standing;
}

/** Company-owned; shipped as a place to start. */
export interface ProductivityTable {
  readonly name: string;
  readonly source: string;
  readonly rows: readonly HoursRow[];
  readonly hanger_h_each: number;
  readonly device_h_each: number;
  readonly accessory_h_each: Readonly<Record<AccessoryKind, number>>;
  readonly conditions: readonly WorkCondition[];
  /** Multiplies field hours: the project's conditions together. */
  readonly conditionFactor: number;
}

export interface HoursQuestion {
  readonly place: HoursPlace;
  /** A piece's kind; one that no row names goes by the rows of any fitting. */
  readonly kind: string;
  readonly shape: ScheduleShape;
  readonly material: Material | "flexible";
  readonly size_m: Meters;
}

/** Typed inches and typed millimeters meet. */
const SIZE_TOLERANCE = 1e-5;

/**
 * Finds the row of a piece, or null where the table has none.
 *
 * A row that names the metal goes before one for any metal, one for the very kind before one for any fitting, one that
 * names the shape before one for any shape; among equals the first size that is not smaller.
 */
export function hoursReader({ rows }: ProductivityTable): (question: HoursQuestion) => HoursRow | null {
  const known = new Map<string, readonly HoursRow[]>();
  return ({ place, kind, shape, material, size_m }) => {
    const key = `${place} ${kind} ${shape} ${material}`;
    let ranked = known.get(key);
    if (!ranked) {
      ranked = rows
        .filter(
          (row) =>
            row.place === place &&
            (row.kind === kind || (row.kind === "fitting" && kind !== "straight" && kind !== "flexible")) &&
            (row.shape === null || row.shape === shape) &&
            (row.material === null || row.material === material),
        )
        .sort((a, b) => rank(a) - rank(b) || (a.upTo_m ?? Infinity) - (b.upTo_m ?? Infinity));
      known.set(key, ranked);
    }
    return ranked.find(({ upTo_m }) => upTo_m === null || size_m <= upTo_m + SIZE_TOLERANCE) ?? null;
  };
}

const rank = (row: HoursRow): number =>
  (row.material === null ? 4 : 0) + (row.kind === "fitting" ? 2 : 0) + (row.shape === null ? 1 : 0);

/** How much of what the row counts is in a piece. */
export function hoursBasis(
  row: HoursRow,
  piece: { readonly weight: Kilograms; readonly length: Meters },
): { readonly label: string; readonly value: number; readonly unit: string; readonly hoursUnit: string } {
  switch (row.per) {
    case "weight":
      return { label: "weight", value: piece.weight, unit: "kg", hoursUnit: "h/kg" };
    case "length":
      return { label: "length", value: piece.length, unit: "m", hoursUnit: "h/m" };
    case "piece":
      return { label: "piece", value: 1, unit: "", hoursUnit: "h" };
  }
}

export const hoursOf = (
  row: HoursRow | null,
  piece: { readonly weight: Kilograms; readonly length: Meters },
  conditionFactor: number,
): Hours => hours(row ? hoursBasis(row, piece).value * row.hours_h * (row.place === "field" ? conditionFactor : 1) : 0);
