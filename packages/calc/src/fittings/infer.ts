/** Which fitting the geometry calls for. The estimator's own choice comes before, see network/solve-fittings.ts. */
import {
  MOUTH_TYPES,
  type ConstructionSpec,
  type FittingType,
  type MouthType,
  type RectangularElbow,
  type RoundElbow,
  type Section,
} from "../air-system.ts";

/** Under this a bend is how it was drawn, not an elbow. */
export const SMALLEST_TURN_COSINE = Math.cos((10 * Math.PI) / 180);
/** A leg that leaves at less than 67.5° leans along the main: a wye rather than a tap or tee. */
const WYE_OVER_COSINE = Math.cos((67.5 * Math.PI) / 180);

export const elbowType = (section: Section, { elbow }: ConstructionSpec): FittingType =>
  section.shape === "rectangular" ? RECTANGULAR_ELBOW_TYPES[elbow.rectangular] : ROUND_ELBOW_TYPES[elbow.round];

// Written out, because a name put together anew for every elbow costs more than its coefficient.
const RECTANGULAR_ELBOW_TYPES = {
  radius: "elbow-radius",
  "radius-splitters": "elbow-radius-splitters",
  "square-throat": "elbow-square-throat",
  "square-throat-vanes": "elbow-square-throat-vanes",
} as const satisfies Record<RectangularElbow, FittingType>;
const ROUND_ELBOW_TYPES = {
  smooth: "elbow-smooth",
  gored: "elbow-gored",
  mitered: "elbow-mitered",
} as const satisfies Record<RoundElbow, FittingType>;

export const tapType = (section: Section, { branch }: ConstructionSpec): FittingType =>
  TAPS[section.shape === "rectangular" ? branch.rectangular : branch.round];

const TAPS = {
  "straight-tap": "tap-straight",
  "shoe-tap": "tap-shoe",
  "conical-tap": "tap-conical",
  "saddle-tap": "tap-saddle",
} as const satisfies Record<ConstructionSpec["branch"]["rectangular" | "round"], FittingType>;

/** A branch off a duct that runs on. */
export const branchType = (
  section: Section,
  spec: ConstructionSpec,
  turnCosine: number,
  facesAnother: boolean,
): FittingType => (facesAnother ? "cross" : turnCosine > WYE_OVER_COSINE ? "wye" : tapType(section, spec));

/** The end of a duct that splits. */
export const splitType = (legCount: number, leastTurnCosine: number): FittingType =>
  legCount > 2 ? "cross" : leastTurnCosine > WYE_OVER_COSINE ? "wye" : "tee";

export const transitionType = (upstream: Section, downstream: Section): FittingType =>
  upstream.shape === downstream.shape ? "transition" : "shape-transition";

export const isMouth = (type: FittingType): type is MouthType => MOUTH_TYPES.some((mouth) => mouth === type);
export const isElbow = (type: FittingType): boolean => type.startsWith("elbow-");
export const isTransition = (type: FittingType): boolean => type === "transition" || type === "shape-transition";
export const isJunction = (type: FittingType): boolean =>
  type.startsWith("tap-") || type === "tee" || type === "wye" || type === "cross";
