/**
 * Loss coefficients of taps, tees and wyes, all on the velocity pressure of the COMMON leg, the one with all the air.
 * c common, b branch, s straight on. Coefficients may be negative, where one stream drives the other: never cut at zero.
 */
import { readLinear } from "../linear-table.ts";

export const DIVERGING_SOURCE = "Idelchik, 3rd ed., ch. 7, diverging junctions, on common velocity pressure";
export const CONVERGING_SOURCE = "Idelchik, 3rd ed., ch. 7, converging junctions, on common velocity pressure";

/** How a leg leaves (or joins) the common duct. */
export interface JunctionLeg {
  /** Cosine of the angle between the leg and the common duct, both away from the equipment: 1 straight on, 0 at 90°. */
  readonly turnCosine: number;
  /** Area of the leg over the common area. */
  readonly areaRatio: number;
  /** Air of the leg over all the air. */
  readonly flowRatio: number;
}

const SMALL_BRANCH = 0.35;

function divergingBranchFactor({ areaRatio, flowRatio: q }: JunctionLeg): number {
  if (areaRatio <= SMALL_BRANCH) return q <= 0.4 ? 1.1 - 0.7 * q : 0.85;
  return q <= 0.6 ? 1 - 0.6 * q : 0.6;
}

/**
 * Branch off a duct that runs straight on at its full size.
 *
 *     C = A (1 + (Vb/Vc)² − 2 (Vb/Vc) cos α)
 *
 * Range    Ab/Ac ≤ 1, 0 < q ≤ 1; the printed factor A jumps at Ab/Ac 0.35 and at q 0.4 and 0.6, as in the source
 * Source   Idelchik, Handbook of Hydraulic Resistance, 3rd ed. (2006), tables 7-4 and 7-5
 */
export function divergingBranchCoefficient(leg: JunctionLeg): number {
  const velocityRatio = leg.flowRatio / leg.areaRatio;
  return divergingBranchFactor(leg) * (1 + velocityRatio * velocityRatio - 2 * velocityRatio * leg.turnCosine);
}

/** K of a split, by angle in degrees; 0 where nothing turns. */
const SPLIT_RECOVERY = { at: [0, 15, 30, 45, 60, 90], values: [0, 0.04, 0.16, 0.36, 0.64, 1] };

/**
 * One leg of a split whose areas add up to the common area: a wye, or a tee that ends the main.
 *
 *     C = 1 + (Vb/Vc)² − 2 (Vb/Vc) cos α − K (Vb/Vc)²
 *
 * Source   Idelchik, 3rd ed. (2006), tables 7-4 and 7-5, As + Ab = Ac
 */
export function splitLegCoefficient(leg: JunctionLeg): number {
  const velocityRatio = leg.flowRatio / leg.areaRatio;
  const recovery = readLinear(SPLIT_RECOVERY, (Math.acos(leg.turnCosine) * 180) / Math.PI);
  return 1 + (1 - recovery) * velocityRatio * velocityRatio - 2 * velocityRatio * leg.turnCosine;
}

/**
 * The duct that runs straight on past branches, at the same size. `areaRatio` and `flowRatio` are those of all branches.
 *
 *     C = τ q²,   τ = 0.4 for Ab/Ac ≤ 0.4, else 2 (2q − 1) to q = 0.5 and 0.3 (2q − 1) above
 *
 * Source   Idelchik, 3rd ed. (2006), diagram 7-20
 */
export function divergingMainCoefficient({ areaRatio, flowRatio: q }: Omit<JunctionLeg, "turnCosine">): number {
  if (areaRatio <= 0.4) return 0.4 * q * q;
  return (q <= 0.5 ? 2 : 0.3) * (2 * q - 1) * q * q;
}

/**
 * Sum over the joining streams of their momentum along the common duct, over that of the common stream.
 *
 *     M = Σ qi² (Ac/Ai) cos αi
 */
export const joiningMomentum = ({ turnCosine, areaRatio, flowRatio: q }: JunctionLeg): number =>
  ((q * q) / areaRatio) * turnCosine;

/**
 * A stream that joins others in a common duct, by the momentum balance of the junction.
 *
 *     C = 1 + (Vi/Vc)² − 2 M
 *
 * The velocity ratio is that of this stream over the common one.
 *
 * Source   Idelchik, 3rd ed. (2006), ch. 7, eq. for converging junctions; for As = Ac it is his branch formula with A = 1
 */
export const convergingLegCoefficient = (velocityRatio: number, momentum: number): number =>
  1 + velocityRatio * velocityRatio - 2 * momentum;

/** Factor A on a branch that joins a duct running straight at its full size. Source: Idelchik, tables 7-1 to 7-3. */
export function convergingBranchFactor({ areaRatio, flowRatio: q }: JunctionLeg): number {
  if (areaRatio <= SMALL_BRANCH) return 1;
  return q <= 0.4 ? 0.9 * (1 - q) : 0.55;
}
