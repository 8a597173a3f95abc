/** What the legs of each junction come to together, so that no leg has to ask all the others. One pass. */
import { NONE, type Tree } from "../network/tree-shape.ts";
import { leg, type Joints } from "./joints.ts";
import { joiningMomentum } from "./junction.ts";

/** Every array is indexed by the segment that feeds the junction, which is also its common leg. */
export interface JunctionSums {
  readonly legCount: Int32Array;
  readonly branchCount: Int32Array;
  /** The fullest branch, or leg of a split: it makes the piece where one piece serves several. */
  readonly fullest: Int32Array;
  readonly branchArea: Float64Array;
  readonly branchFlow: Float64Array;
  /** Σ q² (Ac/A) cos α over all legs. */
  readonly momentum: Float64Array;
  /** Cosine of the leg that turns least. */
  readonly leastTurnCosine: Float64Array;
}

export function sumJunctions(tree: Tree, joints: Joints, airflow: Float64Array, area: Float64Array): JunctionSums {
  const { segmentCount, before } = tree;
  const sums: JunctionSums = {
    legCount: new Int32Array(segmentCount),
    branchCount: new Int32Array(segmentCount),
    fullest: new Int32Array(segmentCount).fill(NONE),
    branchArea: new Float64Array(segmentCount),
    branchFlow: new Float64Array(segmentCount),
    momentum: new Float64Array(segmentCount),
    leastTurnCosine: new Float64Array(segmentCount).fill(-1),
  };
  for (let s = 0; s < segmentCount; s++) {
    const common = before[s]!;
    if (common === NONE) continue;
    sums.legCount[common]!++;
    const kind = joints.leg[s];
    if (kind === leg.only) continue;

    const isRun = kind === leg.run;
    const cosine = legCosine(joints, s);
    sums.momentum[common]! += joiningMomentum({
      turnCosine: cosine,
      // The run passes at its full size; a change of its size is a transition after the junction.
      areaRatio: isRun ? 1 : area[s]! / area[common]!,
      flowRatio: airflow[s]! / airflow[common]!,
    });
    if (isRun) continue;

    sums.branchCount[common]!++;
    sums.branchArea[common]! += area[s]!;
    sums.branchFlow[common]! += airflow[s]!;
    const fullest = sums.fullest[common]!;
    if (fullest === NONE || airflow[s]! > airflow[fullest]!) sums.fullest[common] = s;
    if (cosine > sums.leastTurnCosine[common]!) sums.leastTurnCosine[common] = cosine;
  }
  return sums;
}

/** Cosine of a leg's turn; a right angle where it was not drawn, straight for a run. */
export function legCosine(joints: Joints, s: number): number {
  const cosine = joints.turnCosine[s]!;
  if (joints.leg[s] === leg.run) return 1;
  return Number.isNaN(cosine) ? 0 : cosine;
}
