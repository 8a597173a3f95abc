/** From the equipment to every outlet: what it needs, what is spare, what a damper must take up. */
import type { AirSystem } from "../air-system.ts";
import { OPEN_ENTRY_COEFFICIENT, OPEN_EXIT_COEFFICIENT } from "../fittings/ends.ts";
import { meters, pascals } from "../quantity.ts";
import { addFinding, limitSources, type FindingList } from "./findings.ts";
import type { SolvedPath } from "./solution.ts";
import type { SolvedTree } from "./solve-segments.ts";
import { NONE, type Tree } from "./tree.ts";

export interface Paths {
  readonly paths: readonly SolvedPath[];
  readonly governingOutletNodeId: string;
  readonly requiredPressure: number;
}

/**
 * Paths in the order of the outlets. The governing path needs the most pressure; of equals, the first.
 *
 * An outlet that says no pressure of its own is an open end: it takes one velocity pressure of its duct.
 */
export function tracePaths(system: AirSystem, tree: Tree, solved: SolvedTree, findings: FindingList): Paths {
  const { outlets, into, from } = tree;
  const { segments, lengthTo, frictionTo, dynamicTo } = solved;
  const openEnd = system.service === "supply" ? OPEN_EXIT_COEFFICIENT : OPEN_ENTRY_COEFFICIENT;
  const available = system.design.availablePressure_pa;

  let governing = 0;
  const outletPressure = new Float64Array(outlets.length);
  const required = new Float64Array(outlets.length);
  for (let o = 0; o < outlets.length; o++) {
    const last = into[outlets[o]!]!;
    outletPressure[o] = system.nodes[outlets[o]!]!.requiredPressure_pa ?? openEnd * segments[last]!.velocityPressure_pa;
    required[o] = frictionTo[last]! + dynamicTo[last]! + outletPressure[o]!;
    if (required[o]! > required[governing]!) governing = o;
  }

  const most = required[governing]!;
  const paths = new Array<SolvedPath>(outlets.length);
  for (let o = 0; o < outlets.length; o++) {
    const node = outlets[o]!;
    const last = into[node]!;
    const spare = available - required[o]!;
    paths[o] = {
      outletNodeId: system.nodes[node]!.id,
      segmentIds: segmentsTo(last, system, into, from),
      length_m: meters(lengthTo[last]!),
      frictionLoss_pa: pascals(frictionTo[last]!),
      dynamicLoss_pa: pascals(dynamicTo[last]!),
      outletPressure_pa: pascals(outletPressure[o]!),
      requiredPressure_pa: pascals(required[o]!),
      spare_pa: pascals(spare),
      throttle_pa: pascals(most - required[o]!),
    };
    if (spare < 0) {
      addFinding(
        findings,
        last,
        "pressure-short",
        { kind: "node", id: system.nodes[node]!.id },
        {
          value: required[o]!,
          limit: available,
          unit: "Pa",
          limitSource: limitSources.available,
        },
      );
    }
  }
  return { paths, governingOutletNodeId: system.nodes[outlets[governing]!]!.id, requiredPressure: most };
}

function segmentsTo(last: number, { segments }: AirSystem, into: Int32Array, from: Int32Array): string[] {
  let count = 0;
  for (let s = last; s !== NONE; s = into[from[s]!]!) count++;
  const ids = new Array<string>(count);
  for (let s = last; s !== NONE; s = into[from[s]!]!) ids[--count] = segments[s]!.id;
  return ids;
}
