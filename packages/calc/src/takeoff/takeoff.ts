/** What `takeOff` answers: pieces with their arithmetic, and the quantities that are not pieces. Plain JSON. */
import type { AirSystem, FittingType, Insulation, Material, Section, SheetReference, Supply } from "../air-system.ts";
import type { Body } from "./body.ts";
import type { EdgeTable } from "./edges.table.ts";
import type { GaugeDecider } from "./gauge.ts";
import type { GaugeSchedule, Reinforcement } from "./gauge-schedule.ts";
import type { ProductivityTable } from "./productivity.ts";
import type { Hours, Kilograms, Meters, SquareMeters } from "../quantity.ts";

export const PIECE_KINDS = ["straight", "flexible", "elbow", "transition", "branch", "end-cap"] as const;
export type PieceKind = (typeof PIECE_KINDS)[number];

/** One line of arithmetic a person can follow: "2 × (32 + 18) in. × 60 in. = 41.7 ft²" is built by the screen from this. */
export interface Arithmetic {
  readonly quantity:
    "net-area" | "blank-area" | "weight" | "shop-hours" | "field-hours" | "insulation-area" | "liner-area";
  /** Named factors in the order they multiply or add, in SI; `label` is a short phrase in plain words. */
  readonly terms: readonly { readonly label: string; readonly value: number; readonly unit: string }[];
  readonly result: number;
  readonly unit: string;
  /** Schedule, table or practice it rests on. */
  readonly basis: string;
}

export interface Piece {
  /** Segment number and letter, such as "4C". Unique in the system; an edit elsewhere does not change it. */
  readonly mark: string;
  readonly systemId: string;
  readonly systemTag: string;
  readonly levelId: string;
  /** The drawing that it was measured from; null where the level has none under it. */
  readonly sheet: SheetReference | null;
  readonly segmentId: string;
  readonly segmentName: string;
  readonly kind: PieceKind;
  readonly fitting: FittingType | null;
  /** Sheet-metal size. */
  readonly section: Section;
  /** Clear inside of its liner; the same where there is none. */
  readonly clearSection: Section;
  /** The other end of a transition or shape change, or the branch of a tap. */
  readonly otherSection: Section | null;
  readonly angle_rad: number;
  readonly length_m: Meters;
  /** Its form, from which `patternsOf` lays its walls flat. */
  readonly body: Body;
  readonly material: Material | "flexible";
  /** Made by the shop, or bought by its size from the price book. Flexible duct is always bought. */
  readonly supply: Supply;
  /** What the insulation is; its areas are 0 where there is none. */
  readonly insulation: Insulation;
  /** "24 ga" as the schedule says; null for flexible duct. */
  readonly gauge: string | null;
  readonly sheetThickness_m: Meters | null;
  readonly gaugeSource: string;
  /** Who decided the gauge; null where there is none. */
  readonly gaugeDecider: GaugeDecider | null;
  /** What the schedule asks for; differs from the gauge where something before it decided. */
  readonly scheduledGauge: string | null;
  /** Of the longer side; the shorter has its own in rectangular duct. */
  readonly reinforcement: Reinforcement;
  readonly otherReinforcement: Reinforcement | null;
  readonly joint: string;
  readonly seam: string;
  readonly jointCount: number;
  /** Sections at its ends, each with an edge for the joint. */
  readonly ends: readonly Section[];
  /** Along the piece and between its gores; none where it is spiral. */
  readonly seamLength_m: Meters;
  readonly netArea_m2: SquareMeters;
  readonly blankArea_m2: SquareMeters;
  readonly weight_kg: Kilograms;
  readonly insulationArea_m2: SquareMeters;
  readonly linerArea_m2: SquareMeters;
  readonly shopHours_h: Hours;
  readonly fieldHours_h: Hours;
  readonly arithmetic: readonly Arithmetic[];
}

/** Counted things that are not metal pieces: hangers, sealant, dampers, devices… */
export interface CountedItem {
  /** Price book key, such as "hanger-strap", "sealant", "volume-damper", or a device key. */
  readonly key: string;
  readonly kind: "hanger" | "sealant" | "hardware" | "accessory" | "device" | "allowance";
  readonly description: string;
  readonly systemId: string;
  readonly levelId: string;
  readonly segmentId: string | null;
  readonly nodeId: string | null;
  readonly section: Section | null;
  readonly quantity: number;
  readonly unit: "ea" | "L" | "m" | "kg";
  /** Absent where it is none. */
  readonly shopHours_h?: Hours;
  readonly fieldHours_h: Hours;
  readonly basis: string;
}

export interface TakeoffFinding {
  readonly id: string;
  readonly code:
    | "gauge-not-in-schedule"
    | "gauge-lighter-than-schedule"
    | "joint-below-reinforcement"
    | "hours-not-in-table"
    | "carried-and-counted"
    | "accessory-needs-review"
    | "piece-too-heavy"
    | "fittings-fill-segment";
  readonly severity: "stop" | "warn" | "note";
  readonly segmentId: string;
  readonly message: string;
}

export interface TakeoffTotals {
  readonly pieceCount: number;
  readonly netWeight_kg: Kilograms;
  readonly netArea_m2: SquareMeters;
  readonly blankArea_m2: SquareMeters;
  readonly jointCount: number;
  readonly insulationArea_m2: SquareMeters;
  readonly linerArea_m2: SquareMeters;
  readonly shopHours_h: Hours;
  readonly fieldHours_h: Hours;
}

export interface Takeoff {
  readonly systemId: string;
  readonly pieces: readonly Piece[];
  readonly items: readonly CountedItem[];
  readonly totals: TakeoffTotals;
  readonly findings: readonly TakeoffFinding[];
}

export interface ShopStandards {
  /** The shipped schedule. */
  readonly gauges: GaugeSchedule;
  /** The company's own charts; for a metal and shape that it has any of, these alone count. */
  readonly companyGauges: GaugeSchedule | null;
  readonly productivity: ProductivityTable;
  /** What seams and joints take beyond the net outline. */
  readonly edges: EdgeTable;
}

export type TakeoffInput = { readonly system: AirSystem; readonly standards: ShopStandards };
