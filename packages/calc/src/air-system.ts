/**
 * The air system: what `solve` and `takeOff` read. Plain JSON, versioned, published as a schema in the contracts; the
 * export and import format. Field names carry the SI unit after an underscore, because types end here.
 */
import type { CubicMetersPerSecond, Kelvins, Meters, MetersPerSecond, Pascals, PascalsPerMeter } from "./quantity.ts";

export const AIR_SYSTEM_SCHEMA = "cleatwork.air-system/1";

export const SERVICES = ["supply", "return", "exhaust", "outside-air"] as const;
export type Service = (typeof SERVICES)[number];

export const DUCT_CLASSES = ["main", "branch", "runout"] as const;
/** Where a segment stands in the tree; velocity and friction limits go by it. */
export type DuctClass = (typeof DUCT_CLASSES)[number];

export const SHAPES = ["round", "rectangular", "flat-oval", "annular"] as const;
export type Shape = (typeof SHAPES)[number];

/** A cross-section. Width is the plan dimension and is said first. */
export type Section =
  | { readonly shape: "round"; readonly diameter_m: Meters }
  | { readonly shape: "rectangular"; readonly width_m: Meters; readonly height_m: Meters }
  /** `width` is the overall major axis, `height` the minor axis. */
  | { readonly shape: "flat-oval"; readonly width_m: Meters; readonly height_m: Meters }
  /** Air flows between two concentric round ducts. */
  | { readonly shape: "annular"; readonly outerDiameter_m: Meters; readonly innerDiameter_m: Meters };

export const MATERIALS = ["galvanized", "stainless", "aluminum", "black-steel"] as const;
export type Material = (typeof MATERIALS)[number];

export const SEAL_CLASSES = ["A", "B", "C", "none"] as const;
export type SealClass = (typeof SEAL_CLASSES)[number];

export type Insulation =
  | { readonly kind: "none" }
  | { readonly kind: "wrap"; readonly thickness_m: Meters }
  | { readonly kind: "liner"; readonly thickness_m: Meters };

export const RECTANGULAR_ELBOWS = ["radius", "radius-splitters", "square-throat-vanes", "square-throat"] as const;
export type RectangularElbow = (typeof RECTANGULAR_ELBOWS)[number];
export const ROUND_ELBOWS = ["smooth", "gored", "mitered"] as const;
export type RoundElbow = (typeof ROUND_ELBOWS)[number];
export const SPLITTER_COUNTS = [1, 2, 3] as const;
export type SplitterCount = (typeof SPLITTER_COUNTS)[number];
export const RECTANGULAR_BRANCHES = ["straight-tap", "shoe-tap"] as const;
export type RectangularBranch = (typeof RECTANGULAR_BRANCHES)[number];
export const ROUND_BRANCHES = ["straight-tap", "conical-tap", "saddle-tap"] as const;
export type RoundBranch = (typeof ROUND_BRANCHES)[number];

export const TRANSITION_ALIGNMENTS = ["centered", "flat-bottom", "flat-top"] as const;
export type TransitionAlignment = (typeof TRANSITION_ALIGNMENTS)[number];

export const BOUGHT_KINDS = ["round-duct", "round-fittings", "oval-duct", "oval-fittings"] as const;
export type BoughtKind = (typeof BOUGHT_KINDS)[number];
export const SUPPLIES = ["made", "bought"] as const;
export type Supply = (typeof SUPPLIES)[number];

export const ALLOWANCES_OF = ["offsets", "hangers", "sealant", "joints", "waste"] as const;
export type AllowanceOf = (typeof ALLOWANCES_OF)[number];
/** A share of the straight duct for offsets, of all metal for the rest: 0.05 is 5 %. */
export interface Allowance {
  readonly of: AllowanceOf;
  readonly share: number;
}

/** What a company writes once and reuses: how duct of a system is built. */
export interface ConstructionSpec {
  readonly material: Material;
  /** Static pressure the duct is built for; positive for supply, negative where the duct is under suction. */
  readonly pressureClass_pa: Pascals;
  readonly sealClass: SealClass;
  /** Length of a straight piece as made, by shape; the last piece of a run is shorter. */
  readonly sectionLength_m: { readonly rectangular: Meters; readonly round: Meters; readonly flatOval: Meters };
  readonly rectangularJoint: "slip-and-drive" | "flange" | "standing-s";
  readonly roundJoint: "slip-coupling" | "flange";
  readonly rectangularSeam: "corner-lock" | "button-lock";
  readonly roundConstruction: "spiral" | "longitudinal-seam";
  readonly insulation: Insulation;
  readonly hangerSpacing_m: { readonly rectangular: Meters; readonly round: Meters };
  /** Drawing sizes are the clear inside or the sheet metal. Differs only where there is liner. */
  readonly sizesAre: "clear-inside" | "sheet-metal";
  readonly elbow: {
    readonly rectangular: RectangularElbow;
    readonly round: RoundElbow;
    /** Center-line radius over width (rectangular) or diameter (round). */
    readonly radiusRatio: number;
    /** Splitters in each radius elbow that has them; one where it is not said. */
    readonly splitterCount?: SplitterCount | undefined;
  };
  readonly branch: {
    readonly rectangular: RectangularBranch;
    readonly round: RoundBranch;
  };
  /** Total angle of a transition. */
  readonly transitionAngle_rad: number;
  /** Which wall of a transition runs straight through; none where it is not said: the center does. */
  readonly transitionAlignment?: TransitionAlignment | undefined;
  /** How far flexible duct is left slack: 0 is pulled tight, 0.3 is 30 % too long. Adds loss. */
  readonly flexibleSlack: number;
  /** What is bought by size and not made; where it is not said, all sheet metal is made. */
  readonly bought?: readonly BoughtKind[] | undefined;
  /** What plans do not show, carried as a share of the metal. */
  readonly allowances?: readonly Allowance[] | undefined;
  /** Wrap is faced and its seams are taped. */
  readonly vaporBarrier?: boolean | undefined;
  /** Sheet that the job asks for whatever a schedule says, such as "24 ga"; null or absent: the schedule's. */
  readonly gauge?: string | null | undefined;
  /** Joints, seams and section lengths of rectangular duct are the gauge schedule's where it names them. */
  readonly constructionFromSchedule?: boolean | undefined;
}

export interface DesignConditions {
  readonly altitude_m: Meters;
  readonly temperature_k: Kelvins;
  /** 0 to 1. */
  readonly relativeHumidity: number;
  /** What the unit gives this duct system, outside the casing. */
  readonly availablePressure_pa: Pascals;
  /** Share of the required pressure that the fan is chosen with on top; told apart from every other number. */
  readonly safetyMargin: number;
}

export interface Limits {
  readonly velocity_m_s: Readonly<Record<DuctClass, MetersPerSecond>>;
  readonly frictionRate_pa_m: Readonly<Record<DuctClass, PascalsPerMeter>>;
  readonly flexibleLength_m: Meters;
}

export const FRICTION_BASES = ["hydraulic-diameter", "laminar-equivalent-diameter"] as const;
/** The diameter in the Reynolds number of turbulent friction; they differ only in ducts that are not round. */
export type FrictionBasis = (typeof FRICTION_BASES)[number];

export interface SizingRule {
  readonly method: "equal-friction" | "velocity";
  readonly frictionRate_pa_m: PascalsPerMeter;
  readonly shape: "round" | "rectangular" | "flat-oval";
  /** Rectangular and flat oval stay under this height; null where there is room. */
  readonly maximumHeight_m: Meters | null;
}

/** The drawing that a level was measured from, as its title block says. */
export interface SheetReference {
  readonly sheetNumber: string;
  readonly revision: string;
}

export interface Level {
  readonly id: string;
  readonly name: string;
  readonly elevation_m: Meters;
  /** Null or absent: drawn without a sheet under it. */
  readonly sheet?: SheetReference | null | undefined;
}

export const NODE_ROLES = ["equipment", "junction", "outlet"] as const;
export type NodeRole = (typeof NODE_ROLES)[number];

export interface AirNode {
  readonly id: string;
  readonly role: NodeRole;
  /** "AH-1", "D-12"; may be empty for a junction. */
  readonly tag: string;
  readonly levelId: string;
  readonly x_m: Meters;
  readonly y_m: Meters;
  /** Above the level. */
  readonly elevation_m: Meters;
  /** Outlets only: the air it must give or take. */
  readonly airflow_m3s: CubicMetersPerSecond | null;
  /** Outlets only: the total pressure it needs at its own connection. */
  readonly requiredPressure_pa: Pascals | null;
  /** Outlets only: key of the bought device in the price book, such as "diffuser-24x24"; null when none is priced. */
  readonly deviceKey: string | null;
  readonly spaceName: string;
}

export const FITTING_TYPES = [
  "elbow-radius",
  "elbow-radius-splitters",
  "elbow-square-throat",
  "elbow-square-throat-vanes",
  "elbow-smooth",
  "elbow-gored",
  "elbow-mitered",
  /** Two equal elbows that turn away and back. */
  "offset",
  "tap-straight",
  /** Rectangular, with an entry at 45°. */
  "tap-shoe",
  "tap-conical",
  /** Round, on a plate bent to the main. */
  "tap-saddle",
  "tee",
  "wye",
  "cross",
  "transition",
  /** Rectangular, round, flat oval or annular into another of them. */
  "shape-transition",
  "entry-bellmouth",
  "entry-flush",
  "entry-projecting",
  "exit-open",
  "plenum",
  "end-cap",
  "none",
] as const;
export type FittingType = (typeof FITTING_TYPES)[number];

/** Where a duct begins or ends in a room, outdoors or in a box. */
export const MOUTH_TYPES = [
  "entry-bellmouth",
  "entry-flush",
  "entry-projecting",
  "exit-open",
  "plenum",
] as const satisfies readonly FittingType[];
export type MouthType = (typeof MOUTH_TYPES)[number];

export const ACCESSORY_KINDS = [
  "volume-damper",
  "fire-damper",
  "smoke-damper",
  "flexible-connector",
  "access-door",
  "screen",
] as const;
export type AccessoryKind = (typeof ACCESSORY_KINDS)[number];

export interface AirSegment {
  readonly id: string;
  readonly name: string;
  /** What its marks begin with, for as long as it lives. Null or absent: the lowest that no other segment has. */
  readonly number?: number | null | undefined;
  /** The end nearer the equipment, whichever way the air goes. */
  readonly fromNodeId: string;
  readonly toNodeId: string;
  readonly ductClass: DuctClass;
  /** Null: left to the sizing rule. */
  readonly section: Section | null;
  /** Null: taken from the positions of the nodes. */
  readonly length_m: Meters | null;
  readonly flexible: boolean;
  /** Null: inferred from geometry. The fitting at the end nearer the equipment. */
  readonly fitting: FittingType | null;
  readonly accessories: readonly AccessoryKind[];
  /** How far the blade of its volume damper is turned from open; nothing is open. */
  readonly damperAngle_rad?: number | null | undefined;
  /** Outlets only: the form of the duct's end, whose loss is added. Nothing, and no pressure of its own: a plain open end. */
  readonly mouth?: MouthType | null | undefined;
  /** Null: the spec's. */
  readonly insulation: Insulation | null;
  /** Made or bought, whatever the spec says; null or absent: the spec's. */
  readonly supply?: Supply | null | undefined;
  /** Sheet set for this duct by hand, such as "20 ga"; null or absent: the spec's, then the schedule's. */
  readonly gauge?: string | null | undefined;
}

export interface AirSystem {
  readonly schema: typeof AIR_SYSTEM_SCHEMA;
  readonly id: string;
  /** "S1". */
  readonly tag: string;
  readonly name: string;
  readonly service: Service;
  readonly design: DesignConditions;
  readonly limits: Limits;
  readonly sizing: SizingRule;
  readonly frictionBasis: FrictionBasis;
  readonly spec: ConstructionSpec;
  readonly levels: readonly Level[];
  readonly nodes: readonly AirNode[];
  readonly segments: readonly AirSegment[];
}
