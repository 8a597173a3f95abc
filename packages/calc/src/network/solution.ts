/** What `solve` answers: plain JSON, one entry for each segment and node, in the order of the air system. */
import type { FittingInputName, ReferenceSection } from "../fittings/laws.ts";
import type { AccessoryKind, FittingType, Section } from "../air-system.ts";
import type {
  CubicMetersPerSecond,
  KilogramsPerCubicMeter,
  Meters,
  MetersPerSecond,
  Pascals,
  PascalSeconds,
  PascalsPerMeter,
  SquareMeters,
} from "../quantity.ts";

export type FlowRegime = "laminar" | "transitional" | "turbulent";

/** What a coefficient was looked up by. */
export interface FittingInput {
  readonly name: FittingInputName;
  /** A ratio, a count, or an angle in radians. */
  readonly value: number;
}

/** A fitting, as inferred or chosen, at the end of a segment nearer the equipment or, for a mouth, at its outlet. */
export interface SolvedFitting {
  readonly type: FittingType;
  /** Chosen by the estimator, or inferred from geometry. */
  readonly basis: "inferred" | "chosen";
  readonly nodeId: string;
  /** Turn of an elbow or branch. */
  readonly angle_rad: number;
  /** The section on the equipment's side of the fitting; null for a fitting at the equipment itself. */
  readonly upstreamSection: Section | null;
  readonly lossCoefficient: number;
  /** Whose velocity pressure the coefficient goes with, and that pressure. */
  readonly reference: ReferenceSection;
  readonly velocityPressure_pa: Pascals;
  readonly loss_pa: Pascals;
  /** Where the coefficient comes from, in a few words. */
  readonly source: string;
  readonly inputs: readonly FittingInput[];
  /** An input lay outside the table, and the nearest row was read. */
  readonly clamped: boolean;
  /**
   * The piece is made for this segment. False where a segment only feels the loss of a piece that is counted elsewhere: the
   * main running past a tap, the second leg of a tee.
   */
  readonly madeHere: boolean;
}

/** A damper or the like in the segment, on its own velocity pressure. */
export interface SolvedAccessory {
  readonly kind: AccessoryKind;
  readonly lossCoefficient: number;
  readonly loss_pa: Pascals;
  readonly source: string;
  readonly inputs: readonly FittingInput[];
  readonly clamped: boolean;
}

export interface SolvedSegment {
  readonly segmentId: string;
  /** As typed, or as the sizing rule chose. Clear inside, what the air sees. */
  readonly section: Section;
  readonly sized: "typed" | "by-rule";
  readonly volumetricFlowRate_m3s: CubicMetersPerSecond;
  readonly length_m: Meters;
  readonly area_m2: SquareMeters;
  readonly hydraulicDiameter_m: Meters;
  readonly equivalentDiameter_m: Meters;
  readonly meanVelocity_m_s: MetersPerSecond;
  readonly velocityPressure_pa: Pascals;
  readonly reynoldsNumber: number;
  readonly regime: FlowRegime;
  readonly darcyFrictionFactor: number;
  readonly frictionRate_pa_m: PascalsPerMeter;
  readonly frictionLoss_pa: Pascals;
  readonly fittings: readonly SolvedFitting[];
  readonly accessories: readonly SolvedAccessory[];
  /** Fittings and accessories. */
  readonly dynamicLoss_pa: Pascals;
  /** Friction plus dynamic loss. */
  readonly totalPressureLoss_pa: Pascals;
  readonly leakage_m3s: CubicMetersPerSecond;
  /** Number of outlets that this segment serves. */
  readonly outletCount: number;
  /** Total pressure left of the available, at the end nearer the equipment and at the far end. */
  readonly pressureLeftEntering_pa: Pascals;
  readonly pressureLeftLeaving_pa: Pascals;
  /**
   * Gauge pressures in this duct against the room, when the fan makes what is required: at the end nearer the equipment, past
   * its fittings, and at the far end. Above zero under pressure, below zero under suction; static is total less velocity
   * pressure in both.
   */
  readonly totalPressureEntering_pa: Pascals;
  readonly totalPressureLeaving_pa: Pascals;
  readonly staticPressureEntering_pa: Pascals;
  readonly staticPressureLeaving_pa: Pascals;
}

export interface SolvedPath {
  readonly outletNodeId: string;
  /** From the equipment to the outlet. */
  readonly segmentIds: readonly string[];
  readonly length_m: Meters;
  readonly frictionLoss_pa: Pascals;
  readonly dynamicLoss_pa: Pascals;
  readonly outletPressure_pa: Pascals;
  /** Losses plus what the outlet itself needs. */
  readonly requiredPressure_pa: Pascals;
  /** Available less required; negative means the outlet is short of air. */
  readonly spare_pa: Pascals;
  /** What a damper must take up so that this outlet gets its design flow when the governing path does. */
  readonly throttle_pa: Pascals;
  /** How a damper in the last segment takes that up; null where there is nothing to take up. */
  readonly damper: DamperSetting | null;
}

export interface DamperSetting {
  readonly segmentId: string;
  /** The segment has a volume damper; otherwise one would have to be put in. */
  readonly isThere: boolean;
  /** Of the damper alone, as set, on the velocity pressure of the segment. */
  readonly lossCoefficient: number;
  /** Turn of the blade from open; null where even the farthest turn that a formula holds for takes up less. */
  readonly angle_rad: number | null;
  readonly source: string;
}

/** What the equipment's fan must do for this duct system. */
export interface FanDuty {
  /** The outlets' air and all leakage. */
  readonly airflow_m3s: CubicMetersPerSecond;
  /** What the governing path needs, without any margin. */
  readonly requiredPressure_pa: Pascals;
  readonly safetyMargin: number;
  readonly marginPressure_pa: Pascals;
  /** Required and margin together. */
  readonly totalPressure_pa: Pascals;
  /** In the duct at the fan; of several ducts, where it is greatest. */
  readonly velocityPressure_pa: Pascals;
  /** Total less velocity pressure, as fans are rated. */
  readonly staticPressure_pa: Pascals;
}

export type FindingSeverity = "stop" | "warn" | "note";

export const FINDING_CODES = [
  "velocity-over-limit",
  "friction-over-limit",
  "pressure-short",
  "flexible-too-long",
  "flow-transitional",
  "aspect-ratio-high",
  "table-range-exceeded",
  "pressure-class-exceeded",
  "size-not-found",
  "outlet-over-pressured",
  "damper-missing",
  "paths-unequal",
  "margin-short",
  "reserve-large",
  "leakage-high",
  "seal-class-low",
  "velocity-low",
  "duct-grows",
  "unlined-near-equipment",
  "flexible-slack",
  "elbow-too-sharp",
  "transition-abrupt",
  "fittings-too-close",
  "turn-near-equipment",
] as const;
export type FindingCode = (typeof FINDING_CODES)[number];

/** Something an engineer would want to know: what, by how much, against which limit and whose. */
export interface Finding {
  readonly id: string;
  readonly code: FindingCode;
  readonly severity: FindingSeverity;
  readonly subject: { readonly kind: "segment" | "node" | "system"; readonly id: string };
  readonly value: number;
  readonly limit: number;
  /** SI unit of value and limit, as in "m/s", "Pa", "Pa/m", "m", "m²", "rad", "1"; or what is counted, as in "diameters". */
  readonly unit: string;
  readonly limitSource: string;
}

export interface Solution {
  readonly systemId: string;
  readonly air: { readonly density_kg_m3: KilogramsPerCubicMeter; readonly viscosity_pa_s: PascalSeconds };
  readonly segments: readonly SolvedSegment[];
  readonly paths: readonly SolvedPath[];
  readonly governingOutletNodeId: string;
  readonly requiredPressure_pa: Pascals;
  readonly availablePressure_pa: Pascals;
  readonly outletAirflow_m3s: CubicMetersPerSecond;
  readonly leakage_m3s: CubicMetersPerSecond;
  readonly fan: FanDuty;
  readonly findings: readonly Finding[];
}

/** Why a system cannot be solved. Every problem is reported, not the first. */
export type SystemProblem = {
  readonly code:
    | "no-equipment"
    | "several-equipment"
    | "no-outlet"
    | "node-unknown"
    | "node-orphaned"
    | "segment-loops"
    | "node-has-two-parents"
    | "duplicate-id"
    | "outlet-without-airflow"
    | "outlet-with-children"
    | "dead-end-without-outlet"
    | "size-not-positive"
    | "length-not-positive"
    | "inner-not-smaller-than-outer"
    | "flat-oval-taller-than-wide"
    | "flexible-not-round"
    | "value-out-of-range";
  /** The segment, node or system. */
  readonly subject: { readonly kind: "segment" | "node" | "system"; readonly id: string; readonly name: string };
  readonly field: string;
  readonly value: number | string | null;
  /** What would be accepted, in words. */
  readonly limit: string;
};
