/** The fittings of all segments as columns, in the order of the segments; records are written from them at the end. */
import { FITTING_TYPES, type AirSystem, type FittingType } from "../air-system.ts";
import {
  MOST_INPUTS,
  fittingLaws,
  lawAt,
  lawSources,
  type FittingInputName,
  type FittingLaw,
  type FittingLawName,
} from "../fittings/laws.ts";
import { pascals } from "../quantity.ts";
import { plainRecord, type Draft } from "./plain-record.ts";
import type { Sections } from "./sections.ts";
import type { FittingInput, SolvedFitting } from "./solution.ts";
import { NONE } from "./tree-shape.ts";

export interface FittingColumns {
  /** What each law tells as its source. */
  readonly sources: readonly string[];
  /** Fittings of segment s are those from start[s] up to start[s + 1]. */
  readonly start: Int32Array;
  /** Place in FITTING_TYPES. From here on columns are exchanged for longer ones as they fill: read them after adding. */
  type: Uint8Array;
  isChosen: Uint8Array;
  madeHere: Uint8Array;
  /** At the end farther from the equipment. */
  isFarEnd: Uint8Array;
  /** Read at the edge of its table. */
  isClamped: Uint8Array;
  /** Place in the list of laws. */
  law: Uint8Array;
  /** What was looked up, in the order that the law names. */
  input: Float64Array;
  /** Segment whose section is on the equipment's side; NONE at the equipment. */
  upstream: Int32Array;
  angle: Float64Array;
  lossCoefficient: Float64Array;
  velocityPressure: Float64Array;
}

/** Room for three fittings on two segments, which few systems outgrow: room that is never used costs as much to clear. */
export function fittingColumns(segmentCount: number, practiceSource: string): FittingColumns {
  const room = segmentCount + (segmentCount >> 1) + 8;
  return {
    sources: lawSources(practiceSource),
    start: new Int32Array(segmentCount + 1),
    type: new Uint8Array(room),
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

function makeRoom(columns: FittingColumns): void {
  columns.type = longer(columns.type, Uint8Array);
  columns.isChosen = longer(columns.isChosen, Uint8Array);
  columns.madeHere = longer(columns.madeHere, Uint8Array);
  columns.isFarEnd = longer(columns.isFarEnd, Uint8Array);
  columns.isClamped = longer(columns.isClamped, Uint8Array);
  columns.law = longer(columns.law, Uint8Array);
  columns.input = longer(columns.input, Float64Array);
  columns.upstream = longer(columns.upstream, Int32Array);
  columns.angle = longer(columns.angle, Float64Array);
  columns.lossCoefficient = longer(columns.lossCoefficient, Float64Array);
  columns.velocityPressure = longer(columns.velocityPressure, Float64Array);
}

function longer<C extends Uint8Array | Int32Array | Float64Array>(column: C, Column: new (length: number) => C): C {
  const twice = new Column(2 * column.length);
  twice.set(column);
  return twice;
}

const typeAt = Object.fromEntries(FITTING_TYPES.map((type, place) => [type, place])) as Readonly<
  Record<FittingType, number>
>;

export const typeOfFitting = (columns: FittingColumns, at: number): FittingType => FITTING_TYPES[columns.type[at]!]!;

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
  if (at === columns.type.length) makeRoom(columns);
  columns.type[at] = typeAt[type];
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

const NO_INPUTS: readonly FittingInput[] = [];
const inputScratch: FittingInput[] = [];

function inputsOf({ inputs }: FittingLaw, column: Float64Array, first: number): readonly FittingInput[] {
  if (inputs.length === 0) return NO_INPUTS;
  for (let place = 0; place < inputs.length; place++) {
    inputScratch[place] = new InputRecord(inputs[place]!, column[first + place]!);
  }
  return inputScratch.slice(0, inputs.length);
}

const InputRecord = plainRecord(function (this: Draft<FittingInput>, name: FittingInputName, value: number) {
  this.name = name;
  this.value = value;
});

const FittingRecord = plainRecord(function (
  this: Draft<SolvedFitting>,
  { section }: Sections,
  columns: FittingColumns,
  at: number,
  nodeId: string,
) {
  const upstream = columns.upstream[at]!;
  const law = fittingLaws[columns.law[at]!]!;
  this.type = typeOfFitting(columns, at);
  this.basis = columns.isChosen[at] === 1 ? "chosen" : "inferred";
  this.nodeId = nodeId;
  this.angle_rad = columns.angle[at]!;
  this.upstreamSection = upstream === NONE ? null : section[upstream]!;
  this.lossCoefficient = columns.lossCoefficient[at]!;
  this.reference = law.reference;
  this.velocityPressure_pa = pascals(columns.velocityPressure[at]!);
  this.loss_pa = pascals(columns.lossCoefficient[at]! * columns.velocityPressure[at]!);
  this.source = columns.sources[columns.law[at]!]!;
  this.inputs = inputsOf(law, columns.input, MOST_INPUTS * at);
  this.clamped = columns.isClamped[at] === 1;
  this.madeHere = columns.madeHere[at] === 1;
});
