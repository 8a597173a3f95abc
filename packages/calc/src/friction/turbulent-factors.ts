/** Turbulent friction factors of many segments: what was computed once is not computed again. */
import { colebrookFrictionFactor } from "./colebrook.ts";

/** The last inputs that fell on each place, and their answer. */
export interface TurbulentFactors {
  readonly reynoldsNumber: Float64Array;
  readonly relativeRoughness: Float64Array;
  readonly factor: Float64Array;
  /** The same eight bytes as a number and as bits. */
  readonly number: Float64Array;
  readonly bits: Int32Array;
}

const PLACES = 1024;

export function turbulentFactors(): TurbulentFactors {
  const bytes = new ArrayBuffer(16);
  return {
    // No input is NaN, so an empty place never matches.
    reynoldsNumber: new Float64Array(PLACES).fill(NaN),
    relativeRoughness: new Float64Array(PLACES),
    factor: new Float64Array(PLACES),
    number: new Float64Array(bytes),
    bits: new Int32Array(bytes),
  };
}

/**
 * Colebrook's factor. A building repeats itself, floor over floor and outlet beside outlet, and an evaluation costs ten times
 * as much as finding the same two numbers again. Exactly what `colebrookFrictionFactor` answers, in any order of asking.
 */
export function turbulentFactor(known: TurbulentFactors, reynoldsNumber: number, relativeRoughness: number): number {
  const place = placeOf(known, reynoldsNumber, relativeRoughness);
  if (known.reynoldsNumber[place] === reynoldsNumber && known.relativeRoughness[place] === relativeRoughness)
    return known.factor[place]!;
  const factor = colebrookFrictionFactor(reynoldsNumber, relativeRoughness).value;
  known.reynoldsNumber[place] = reynoldsNumber;
  known.relativeRoughness[place] = relativeRoughness;
  known.factor[place] = factor;
  return factor;
}

function placeOf({ number, bits }: TurbulentFactors, reynoldsNumber: number, relativeRoughness: number): number {
  number[0] = reynoldsNumber;
  number[1] = relativeRoughness;
  const mixed = Math.imul(bits[0]! ^ bits[1]! ^ bits[2]! ^ (bits[3]! << 7), 0x9e3779b1);
  return (mixed >>> 16) & (PLACES - 1);
}
