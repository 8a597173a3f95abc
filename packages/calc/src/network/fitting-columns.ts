/** The fittings of all segments as columns, in the order of the segments; records are written from them at the end. */
import type { AirSystem, FittingType } from "../air-system.ts";
import { MOST_INPUTS, fittingLaws, lawAt, type FittingLawName } from "../fittings/laws.ts";
import { pascals } from "../quantity.ts";
import { plainRecord, type Draft } from "./plain-record.ts";
import type { Sections } from "./sections.ts";
import type { SolvedFitting } from "./solution.ts";
import { NONE } from "./tree-shape.ts";

/** Passing a branch, a change of size, an elbow, a mouth at the far end: no segment has more. */
const MOST_FITTINGS = 4;

export interface FittingColumns {
  /** Fittings of segment s are those from start[s] up to start[s + 1]. */
  readonly start: Int32Array;
  readonly type: FittingType[];
  readonly isChosen: Uint8Array;
  readonly madeHere: Uint8Array;
  /** At the end farther from the equipment. */
  readonly isFarEnd: Uint8Array;
  /** Read at the edge of its table. */
  readonly isClamped: Uint8Array;
  /** Place in the list of laws. */
  readonly law: Uint8Array;
  /** What was looked up, in the order that the law names. */
  readonly input: Float64Array;
  /** Segment whose section is on the equipment's side; NONE at the equipment. */
  readonly upstream: Int32Array;
  readonly angle: Float64Array;
  readonly lossCoefficient: Float64Array;
  readonly velocityPressure: Float64Array;
}

export function fittingColumns(segmentCount: number): FittingColumns {
  const room = MOST_FITTINGS * segmentCount;
  return {
    start: new Int32Array(segmentCount + 1),
    type: new Array<FittingType>(room),
    isChosen: new Uint8Array(room),
    madeHere: new Uint8Array(room),
    isFarEnd: new Uint8Array(room),
    isClamped: new Uint8Array(room),
    law: new Uint8Array(room),
    input: new Float64Array(MOST_INPUTS * room),
    upstream: new Int32Array(room),
    angle: new Float64Array(room),
    lossCoefficient: new Float64Array(room),
    velocityPressure: new Float64Array(room),
  };
}

/**
 * Adds a fitting to segment s, which must be the last one that has any; answers its place, where the caller then writes
 * what it loses.
 */
export function openFitting(
  columns: FittingColumns,
  s: number,
  type: FittingType,
  isChosen: boolean,
  madeHere: boolean,
  upstream: number,
): number {
  const at = columns.start[s + 1]!++;
  columns.type[at] = type;
  columns.isChosen[at] = isChosen ? 1 : 0;
  columns.madeHere[at] = madeHere ? 1 : 0;
  columns.upstream[at] = upstream;
  return at;
}

/** The law of a fitting and what it was looked up by. */
export function writeLaw(columns: FittingColumns, at: number, law: FittingLawName, a = 0, b = 0, c = 0): void {
  columns.law[at] = lawAt[law];
  const first = MOST_INPUTS * at;
  columns.input[first] = a;
  columns.input[first + 1] = b;
  columns.input[first + 2] = c;
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
  const { fromNodeId, toNodeId } = system.segments[s]!;
  for (let f = 0; f < count; f++) {
    const nodeId = columns.isFarEnd[start + f] === 1 ? toNodeId : fromNodeId;
    scratch[f] = new FittingRecord(sections, columns, start + f, nodeId);
  }
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
  const law = fittingLaws[columns.law[at]!]!;
  this.type = columns.type[at]!;
  this.basis = columns.isChosen[at] === 1 ? "chosen" : "inferred";
  this.nodeId = nodeId;
  this.angle_rad = columns.angle[at]!;
  this.upstreamSection = upstream === NONE ? null : section[upstream]!;
  this.lossCoefficient = columns.lossCoefficient[at]!;
  this.reference = law.reference;
  this.velocityPressure_pa = pascals(columns.velocityPressure[at]!);
  this.loss_pa = pascals(columns.lossCoefficient[at]! * columns.velocityPressure[at]!);
  this.source = law.source;
  this.inputs = law.inputs.map((name, place) => ({ name, value: columns.input[MOST_INPUTS * at + place]! }));
  this.clamped = columns.isClamped[at] === 1;
  this.madeHere = columns.madeHere[at] === 1;
});
