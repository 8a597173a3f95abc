/** The fittings of all segments as columns, in the order of the segments; records are written from them at the end. */
import type { AirSystem, FittingType } from "../air-system.ts";
import { RADIUS_ELBOW_SOURCE, SMOOTH_ELBOW_SOURCE, SQUARE_THROAT_SOURCE } from "../fittings/elbow.ts";
import { ENDS_SOURCE } from "../fittings/ends.ts";
import { CONVERGING_SOURCE, DIVERGING_SOURCE } from "../fittings/junction.ts";
import { PRACTICE_SOURCE } from "../fittings/practice.table.ts";
import { CONTRACTION_SOURCE, EXPANSION_SOURCE } from "../fittings/transition.ts";
import { pascals } from "../quantity.ts";
import { plainRecord, type Draft } from "./plain-record.ts";
import type { Sections } from "./sections.ts";
import type { SolvedFitting } from "./solution.ts";
import { NONE } from "./tree-shape.ts";

/** Passing a branch, a change of size, an elbow: no segment has more. */
const MOST_FITTINGS = 3;

export interface FittingColumns {
  /** Fittings of segment s are those from start[s] up to start[s + 1]. */
  readonly start: Int32Array;
  readonly type: FittingType[];
  readonly isChosen: Uint8Array;
  readonly madeHere: Uint8Array;
  /** Place in the list of sources. */
  readonly source: Uint8Array;
  /** Segment whose section is on the equipment's side; NONE at the equipment. */
  readonly upstream: Int32Array;
  readonly angle: Float64Array;
  readonly lossCoefficient: Float64Array;
  readonly velocityPressure: Float64Array;
}

export const fittingColumns = (segmentCount: number): FittingColumns => ({
  start: new Int32Array(segmentCount + 1),
  type: new Array<FittingType>(MOST_FITTINGS * segmentCount),
  isChosen: new Uint8Array(MOST_FITTINGS * segmentCount),
  madeHere: new Uint8Array(MOST_FITTINGS * segmentCount),
  source: new Uint8Array(MOST_FITTINGS * segmentCount),
  upstream: new Int32Array(MOST_FITTINGS * segmentCount),
  angle: new Float64Array(MOST_FITTINGS * segmentCount),
  lossCoefficient: new Float64Array(MOST_FITTINGS * segmentCount),
  velocityPressure: new Float64Array(MOST_FITTINGS * segmentCount),
});

const SOURCES = [
  SMOOTH_ELBOW_SOURCE,
  RADIUS_ELBOW_SOURCE,
  SQUARE_THROAT_SOURCE,
  CONTRACTION_SOURCE,
  EXPANSION_SOURCE,
  DIVERGING_SOURCE,
  CONVERGING_SOURCE,
  ENDS_SOURCE,
  PRACTICE_SOURCE,
  `Smooth elbow times a factor: ${PRACTICE_SOURCE}`,
  `Idelchik's straight tap times a factor: ${PRACTICE_SOURCE}`,
  "No air passes an end cap",
] as const;

/** Places in the list above. */
export const from = {
  smoothElbow: 0,
  radiusElbow: 1,
  squareThroat: 2,
  contraction: 3,
  expansion: 4,
  diverging: 5,
  converging: 6,
  ends: 7,
  practice: 8,
  goredFactor: 9,
  easedTapFactor: 10,
  endCap: 11,
} as const;
export type FittingSource = (typeof from)[keyof typeof from];

/**
 * Adds a fitting to segment s, which must be the last one that has any; answers its place, where the caller then writes
 * angle, coefficient and velocity pressure.
 */
export function openFitting(
  columns: FittingColumns,
  s: number,
  type: FittingType,
  isChosen: boolean,
  madeHere: boolean,
  upstream: number,
  source: FittingSource,
): number {
  const at = columns.start[s + 1]!++;
  columns.type[at] = type;
  columns.isChosen[at] = isChosen ? 1 : 0;
  columns.madeHere[at] = madeHere ? 1 : 0;
  columns.source[at] = source;
  columns.upstream[at] = upstream;
  return at;
}

const NO_FITTINGS: readonly SolvedFitting[] = [];

/** Writes out the fittings of one segment. `scratch` is room that is used again and again. */
export function fittingsOf(
  system: AirSystem,
  sections: Sections,
  columns: FittingColumns,
  s: number,
  scratch: SolvedFitting[],
): readonly SolvedFitting[] {
  const start = columns.start[s]!;
  const count = columns.start[s + 1]! - start;
  if (count === 0) return NO_FITTINGS;
  const nodeId = system.segments[s]!.fromNodeId;
  for (let f = 0; f < count; f++) scratch[f] = new FittingRecord(sections, columns, start + f, nodeId);
  // A copy rather than a literal, for the reason told in plain-record.ts.
  return scratch.slice(0, count);
}

const FittingRecord = plainRecord(function (
  this: Draft<SolvedFitting>,
  { section }: Sections,
  columns: FittingColumns,
  at: number,
  nodeId: string,
) {
  const upstream = columns.upstream[at]!;
  this.type = columns.type[at]!;
  this.basis = columns.isChosen[at] === 1 ? "chosen" : "inferred";
  this.nodeId = nodeId;
  this.angle_rad = columns.angle[at]!;
  this.upstreamSection = upstream === NONE ? null : section[upstream]!;
  this.lossCoefficient = columns.lossCoefficient[at]!;
  this.velocityPressure_pa = pascals(columns.velocityPressure[at]!);
  this.loss_pa = pascals(columns.lossCoefficient[at]! * columns.velocityPressure[at]!);
  this.source = SOURCES[columns.source[at]!]!;
  this.madeHere = columns.madeHere[at] === 1;
});
