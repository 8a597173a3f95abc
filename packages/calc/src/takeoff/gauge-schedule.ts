/** What a gauge schedule is made of. Plain JSON: a company edits it, the contracts check it, the takeoff reads it. */
import type { Material } from "../air-system.ts";
import type { Meters } from "../quantity.ts";

/** How far a value can be trusted: seen in its source, worked out, habit of the trade, a company's own. */
export const STANDINGS = ["found", "computed", "common practice", "own"] as const;
export type Standing = (typeof STANDINGS)[number];

export const SCHEDULE_SHAPES = ["round", "rectangular", "flat-oval"] as const;
export type ScheduleShape = (typeof SCHEDULE_SHAPES)[number];

export const CONSTRUCTIONS = ["spiral", "longitudinal-seam", "fitting"] as const;
export type Construction = (typeof CONSTRUCTIONS)[number];

/**
 * What stiffens the sheet. Four answers that must not be taken for one another: none is required; this grade at this
 * spacing; the table says that nothing was designed for the size; the table says nothing.
 */
export type Reinforcement =
  | { readonly kind: "not-required" }
  | { readonly kind: "required"; readonly grade: string; readonly spacing_m: Meters | null }
  | { readonly kind: "not-designed" }
  | { readonly kind: "blank" };

/** A row: sizes up to and including `upTo_m` (longest side, major axis or diameter). */
export interface GaugeRow {
  readonly upTo_m: Meters;
  /** Null where the size is blank or not designed; `reinforcement` says which. */
  readonly gauge: string | null;
  readonly reinforcement: Reinforcement;
  /** Sheet from which this side needs no reinforcement; null or absent: not known. */
  readonly unreinforcedGauge?: string | null | undefined;
  /** How it is joined, seamed and cut, where the schedule says so; used by specs that leave it to the schedule. */
  readonly joint?: string | null | undefined;
  readonly seam?: string | null | undefined;
  readonly sectionLength_m?: Meters | null | undefined;
}

/** One chart: a metal, a shape, a pressure class. */
export interface GaugeChart {
  readonly material: Material;
  readonly shape: ScheduleShape;
  /** Largest absolute pressure class these rows hold for. */
  readonly pressureClass_pa: number;
  /** Absent: for duct under pressure and under suction alike. Suction needs heavier round duct. */
  readonly pressureSign?: "positive" | "negative" | undefined;
  /** Absent: however it is made. */
  readonly construction?: Construction | undefined;
  /** Joints or reinforcement at most this far apart; absent: at any spacing. */
  readonly spacing_m?: Meters | undefined;
  readonly sizes: readonly GaugeRow[];
}

/** Shipped with sourced defaults; a company's own stands before it. */
export interface GaugeSchedule {
  readonly name: string;
  readonly source: string;
  readonly standing: Standing;
  readonly rows: readonly GaugeChart[];
}
