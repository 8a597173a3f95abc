/** What happens where segments meet: the turn of each, and which legs run on, branch off or split. Geometry only. */
import type { Course } from "../network/course.ts";
import { radians, type Radians } from "../quantity.ts";
import { NONE, type Tree } from "../network/tree-shape.ts";

/** How a segment leaves the one that feeds it. */
export const leg = {
  /** From the equipment itself. */
  first: 0,
  /** The only one: straight on, or an elbow. */
  only: 1,
  /** Straight on past branches. */
  run: 2,
  /** Off a duct that runs on. */
  branch: 3,
  /** One of several where none runs on: tee, wye. */
  split: 4,
} as const;
export type Leg = (typeof leg)[keyof typeof leg];

export interface Joints {
  readonly leg: Uint8Array;
  /** Cosine of the turn from the segment before; NaN where either direction is unknown. */
  readonly turnCosine: Float64Array;
}

/** A main still runs on within this turn. */
const STRAIGHT_ON_COSINE = Math.cos((20 * Math.PI) / 180);

export function describeJoints(tree: Tree, { direction }: Course, airflow: Float64Array): Joints {
  const { segmentCount, before, into, childStart, childList } = tree;
  const legs = new Uint8Array(segmentCount);
  const turnCosine = new Float64Array(segmentCount);

  for (let s = 0; s < segmentCount; s++) {
    turnCosine[s] = before[s] === NONE ? NaN : cosineBetween(direction, before[s]!, s);
  }
  for (let n = 0; n < into.length; n++) {
    if (into[n] === NONE) continue;
    const first = childStart[n]!;
    const end = childStart[n + 1]!;
    if (end - first === 1) legs[childList[first]!] = leg.only;
    else if (end > first) markLegs(legs, turnCosine, airflow, childList, first, end);
  }
  return { leg: legs, turnCosine };
}

function cosineBetween(direction: Float64Array, a: number, b: number): number {
  const ax = direction[3 * a]!;
  const ay = direction[3 * a + 1]!;
  const az = direction[3 * a + 2]!;
  const bx = direction[3 * b]!;
  const by = direction[3 * b + 1]!;
  const bz = direction[3 * b + 2]!;
  const isUnknown = (ax === 0 && ay === 0 && az === 0) || (bx === 0 && by === 0 && bz === 0);
  return isUnknown ? NaN : Math.max(-1, Math.min(1, ax * bx + ay * by + az * bz));
}

/** The straightest leg is the run, the fuller one when two are as straight; without geometry simply the fullest. */
function markLegs(
  legs: Uint8Array,
  turnCosine: Float64Array,
  airflow: Float64Array,
  childList: Int32Array,
  first: number,
  end: number,
): void {
  let run = -1;
  let fullest = childList[first]!;
  let isDrawn = false;
  for (let c = first; c < end; c++) {
    const s = childList[c]!;
    const cosine = turnCosine[s]!;
    if (airflow[s]! > airflow[fullest]!) fullest = s;
    if (!Number.isNaN(cosine)) isDrawn = true;
    if (!(cosine >= STRAIGHT_ON_COSINE)) continue;
    const straighter = run < 0 || cosine > turnCosine[run]! + 1e-9;
    const asStraight = run >= 0 && Math.abs(cosine - turnCosine[run]!) <= 1e-9;
    if (straighter || (asStraight && airflow[s]! > airflow[run]!)) run = s;
  }
  if (!isDrawn) run = fullest;
  for (let c = first; c < end; c++) {
    const s = childList[c]!;
    legs[s] = run < 0 ? leg.split : s === run ? leg.run : leg.branch;
  }
}

/** Most turns in a building are straight or square, and need no inverse cosine. */
export const angleOfCosine = (cosine: number): Radians =>
  radians(cosine === 0 ? Math.PI / 2 : cosine === 1 ? 0 : Math.acos(cosine));
