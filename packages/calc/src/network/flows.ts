import type { AirSystem } from "../air-system.ts";
import { NONE, type Tree } from "./tree.ts";

export interface Flows {
  /** m³/s through each segment, whichever way it goes. */
  readonly airflow: Float64Array;
  /** Outlets that each segment serves. */
  readonly outletCount: Int32Array;
}

/** What each segment carries: the air of the outlets beyond it. One pass, farthest segments first. */
export function addUpFlows({ nodes }: AirSystem, { order, before, into, segmentCount, outlets }: Tree): Flows {
  const airflow = new Float64Array(segmentCount);
  const outletCount = new Int32Array(segmentCount);
  for (const n of outlets) {
    const s = into[n]!;
    airflow[s]! += nodes[n]!.airflow_m3s!;
    outletCount[s]! += 1;
  }
  for (let at = segmentCount - 1; at >= 0; at--) {
    const s = order[at]!;
    const parent = before[s]!;
    if (parent === NONE) continue;
    airflow[parent]! += airflow[s]!;
    outletCount[parent]! += outletCount[s]!;
  }
  return { airflow, outletCount };
}
