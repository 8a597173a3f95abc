/** Rules of thumb over a whole takeoff, held against the company's own jobs: a missed floor shows here first. */
import { CUBIC_METERS_PER_SECOND_PER_CFM, KILOGRAMS_PER_POUND, METERS_PER_FOOT } from "../quantity.ts";
import type { Piece } from "./takeoff.ts";

export const TAKEOFF_RATIOS = ["metalPerAirflow_kg_per_m3s", "metalPerLength_kg_per_m", "areaPerFitting_m2"] as const;
export type TakeoffRatio = (typeof TAKEOFF_RATIOS)[number];

/** Null where there is nothing to divide by. */
export type TakeoffRatios = Readonly<Record<TakeoffRatio, number | null>>;

type Counted = Pick<Piece, "kind" | "length_m" | "weight_kg" | "netArea_m2">;

/**
 * Net metal by the air it carries, net metal by the length of straight made duct, net area by fitting.
 *
 * Flexible duct is in none of them: it is bought. `airflow_m3s` is the sum over the systems' outlets.
 */
export function ratiosOf(pieces: readonly Counted[], airflow_m3s: number): TakeoffRatios {
  let weight = 0;
  let straight = 0;
  let fittingArea = 0;
  let fittings = 0;
  for (const { kind, length_m, weight_kg, netArea_m2 } of pieces) {
    weight += weight_kg;
    if (kind === "straight") straight += length_m;
    else if (kind !== "flexible") {
      fittings++;
      fittingArea += netArea_m2;
    }
  }
  const per = (sum: number, by: number) => (by > 0 && sum > 0 ? sum / by : null);
  return {
    metalPerAirflow_kg_per_m3s: per(weight, airflow_m3s),
    metalPerLength_kg_per_m: per(weight, straight),
    areaPerFitting_m2: per(fittingArea, fittings),
  };
}

export interface RatioCheck {
  readonly ratio: TakeoffRatio;
  readonly value: number;
  /** Median of the company's own jobs. */
  readonly usual: number;
  readonly jobs: number;
  /** Value over usual. */
  readonly times: number;
  readonly isFarOff: boolean;
}

/**
 * Each ratio beside the median of the company's other jobs. Far off is more than 1 + tolerance times it, or less than the
 * same share of it: half again too much and two thirds are as far. A ratio without a job to compare with is left out.
 */
export function checkRatios(
  now: TakeoffRatios,
  history: readonly TakeoffRatios[],
  tolerance: number,
): readonly RatioCheck[] {
  return TAKEOFF_RATIOS.flatMap((ratio) => {
    const value = now[ratio];
    const known = history.map((job) => job[ratio]).filter((each) => each !== null);
    if (value === null || known.length === 0) return [];
    const usual = median(known);
    const times = value / usual;
    const isFarOff = times > 1 + tolerance || times < 1 / (1 + tolerance);
    return [{ ratio, value, usual, jobs: known.length, times, isFarOff }];
  });
}

function median(values: readonly number[]): number {
  const sorted = [...values].sort((a, b) => a - b);
  const middle = Math.floor(sorted.length / 2);
  return sorted.length % 2 === 1 ? sorted[middle]! : (sorted[middle - 1]! + sorted[middle]!) / 2;
}

/** The same in the trade's units: lb per cfm, lb per foot, ft² per fitting. */
export const US_RATIO: Readonly<Record<TakeoffRatio, { readonly unit: string; readonly factor: number }>> = {
  metalPerAirflow_kg_per_m3s: { unit: "lb/cfm", factor: CUBIC_METERS_PER_SECOND_PER_CFM / KILOGRAMS_PER_POUND },
  metalPerLength_kg_per_m: { unit: "lb/ft", factor: METERS_PER_FOOT / KILOGRAMS_PER_POUND },
  areaPerFitting_m2: { unit: "ft² each", factor: 1 / METERS_PER_FOOT ** 2 },
};
