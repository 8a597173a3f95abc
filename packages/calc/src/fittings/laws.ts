/** Every way a coefficient is found: where it comes from, which velocity pressure it goes with, and what was looked up. */
import { RADIUS_ELBOW_SOURCE, SMOOTH_ELBOW_SOURCE, SQUARE_THROAT_SOURCE } from "./elbow.ts";
import { ENTRY_SOURCE, EXIT_SOURCE } from "./ends.ts";
import { CONVERGING_SOURCE, DIVERGING_SOURCE } from "./junction.ts";
import { SPLITTER_ELBOW_SOURCE } from "./splitter-elbow.ts";
import { CONTRACTION_SOURCE, EXPANSION_SOURCE } from "./transition.ts";

/**
 * Section whose velocity pressure the coefficient is multiplied by: the segment's own, that of the leg with all the air, or
 * that of the smaller end.
 */
export const REFERENCE_SECTIONS = ["own", "common", "smaller"] as const;
export type ReferenceSection = (typeof REFERENCE_SECTIONS)[number];

/** What a coefficient was looked up by. Ratios are plain numbers, angles in radians. */
export const FITTING_INPUTS = [
  "radius-ratio",
  "side-ratio",
  "friction-factor",
  "piece-count",
  "splitter-count",
  "curve-ratio",
  "one-elbow",
  "area-ratio",
  "transition-angle",
  "branch-area-ratio",
  "flow-ratio",
  "branch-flow-ratio",
  "velocity-ratio",
  "momentum-ratio",
  "practice-factor",
  "edge-radius-ratio",
  "damper-angle",
  "free-area",
] as const;
export type FittingInputName = (typeof FITTING_INPUTS)[number];

export interface FittingLaw {
  readonly source: string;
  /** A coefficient of practice is in it: who set that is told behind the source. */
  readonly byPractice?: true;
  readonly reference: ReferenceSection;
  /** At most MOST_INPUTS, beside the angle of the turn, which every fitting tells. */
  readonly inputs: readonly FittingInputName[];
}

export const MOST_INPUTS = 3;

const LAWS = {
  smoothElbow: { source: SMOOTH_ELBOW_SOURCE, reference: "own", inputs: ["radius-ratio", "friction-factor"] },
  goredElbow: {
    source: "Smooth elbow times a factor by its pieces",
    byPractice: true,
    reference: "own",
    inputs: ["radius-ratio", "friction-factor", "piece-count"],
  },
  radiusElbow: { source: RADIUS_ELBOW_SOURCE, reference: "own", inputs: ["radius-ratio", "side-ratio"] },
  splitterElbow: {
    source: SPLITTER_ELBOW_SOURCE,
    reference: "own",
    inputs: ["radius-ratio", "splitter-count", "curve-ratio"],
  },
  squareThroat: { source: SQUARE_THROAT_SOURCE, reference: "own", inputs: ["side-ratio"] },
  vanedElbow: {
    source: "Square throat with vanes, by its angle",
    byPractice: true,
    reference: "own",
    inputs: ["practice-factor"],
  },
  offset: {
    source: "Two of the system's elbows, each as if alone",
    byPractice: true,
    reference: "own",
    inputs: ["one-elbow"],
  },
  contraction: { source: CONTRACTION_SOURCE, reference: "smaller", inputs: ["area-ratio", "transition-angle"] },
  expansion: { source: EXPANSION_SOURCE, reference: "smaller", inputs: ["area-ratio", "transition-angle"] },
  shapeChange: {
    source: "Least loss of a change of shape",
    byPractice: true,
    reference: "smaller",
    inputs: ["area-ratio", "transition-angle", "practice-factor"],
  },
  divergingBranch: {
    source: DIVERGING_SOURCE,
    reference: "common",
    inputs: ["area-ratio", "flow-ratio", "velocity-ratio"],
  },
  easedTap: {
    source: "Idelchik's straight tap times a factor",
    byPractice: true,
    reference: "common",
    inputs: ["area-ratio", "flow-ratio", "practice-factor"],
  },
  divergingMain: { source: DIVERGING_SOURCE, reference: "common", inputs: ["branch-area-ratio", "branch-flow-ratio"] },
  convergingBranch: {
    source: CONVERGING_SOURCE,
    reference: "common",
    inputs: ["area-ratio", "flow-ratio", "momentum-ratio"],
  },
  convergingMain: { source: CONVERGING_SOURCE, reference: "common", inputs: ["flow-ratio", "momentum-ratio"] },
  entry: { source: ENTRY_SOURCE, reference: "own", inputs: ["edge-radius-ratio"] },
  plainEntry: { source: ENTRY_SOURCE, reference: "own", inputs: [] },
  exit: { source: EXIT_SOURCE, reference: "own", inputs: [] },
  endCap: { source: "No air passes an end cap", reference: "own", inputs: [] },
} as const satisfies Record<string, FittingLaw>;

export type FittingLawName = keyof typeof LAWS;

/** In the order of their places. */
export const fittingLaws: readonly FittingLaw[] = Object.values(LAWS);

/** What each law tells as its source, in the same order. */
export const lawSources = (practiceSource: string): readonly string[] =>
  fittingLaws.map(({ source, byPractice }) => (byPractice ? `${source}: ${practiceSource}` : source));

/** Place of each law in the list: what columns store. */
export const lawAt = Object.fromEntries(Object.keys(LAWS).map((name, place) => [name, place])) as Readonly<
  Record<FittingLawName, number>
>;
