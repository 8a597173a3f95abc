/** From the equipment to every outlet: what it needs, what is spare, what a damper must take up. */
import type { AirSystem } from "../air-system.ts";
import { OPEN_ENTRY_COEFFICIENT, OPEN_EXIT_COEFFICIENT } from "../fittings/ends.ts";
import { meters, pascals, type Pascals } from "../quantity.ts";
import { addFinding, limitSources, type FindingList } from "./findings.ts";
import { plainRecord, type Draft } from "./plain-record.ts";
import type { PracticeCoefficients } from "../fittings/practice.table.ts";
import { damperSetting } from "./damper-setting.ts";
import type { DamperSetting, SolvedPath } from "./solution.ts";
import type { Losses } from "./losses.ts";
import type { Friction } from "./friction.ts";
import { NONE, type Tree } from "./tree.ts";
import type { SolvedColumns } from "./write-segments.ts";

/** What each outlet needs at the equipment, in the order of the outlets. */
export interface OutletNeeds {
  readonly outletPressure: Float64Array;
  /** Losses on the way, and what the outlet itself takes. */
  readonly required: Float64Array;
  /** The outlet whose path needs the most pressure; of equals, the first. */
  readonly governing: number;
}

/**
 * An outlet that says no pressure of its own is an open end: it takes one velocity pressure of its duct, unless its segment
 * has a mouth, whose loss is among the fittings.
 */
export function findNeeds(
  system: AirSystem,
  { outlets, into }: Tree,
  { velocityPressure }: Pick<Friction, "velocityPressure">,
  { frictionTo, dynamicTo }: Pick<Losses, "frictionTo" | "dynamicTo">,
): OutletNeeds {
  const openEnd = system.service === "supply" ? OPEN_EXIT_COEFFICIENT : OPEN_ENTRY_COEFFICIENT;
  const outletPressure = new Float64Array(outlets.length);
  const required = new Float64Array(outlets.length);
  for (let o = 0; o < outlets.length; o++) {
    const last = into[outlets[o]!]!;
    const typed = system.nodes[outlets[o]!]!.requiredPressure_pa;
    const hasMouth = (system.segments[last]!.mouth ?? null) !== null;
    outletPressure[o] = typed ?? (hasMouth ? 0 : openEnd * velocityPressure[last]!);
    required[o] = frictionTo[last]! + dynamicTo[last]! + outletPressure[o]!;
  }
  return { outletPressure, required, governing: indexOfMost(required) };
}

function indexOfMost(values: Float64Array): number {
  let most = 0;
  for (let i = 1; i < values.length; i++) if (values[i]! > values[most]!) most = i;
  return most;
}

/** Paths in the order of the outlets. Walks the tree once with the way so far at hand, and copies it at each outlet. */
export function writePaths(
  { system, course, sections, friction, accessories, losses }: SolvedColumns,
  { outlets, into, order, depth }: Tree,
  needs: OutletNeeds,
  practice: PracticeCoefficients,
): readonly SolvedPath[] {
  const { nodes, segments, design } = system;
  const most = needs.required[needs.governing]!;
  const paths = new Array<SolvedPath>(outlets.length);
  const outletAfter = new Int32Array(order.length).fill(NONE);
  for (let o = 0; o < outlets.length; o++) outletAfter[into[outlets[o]!]!] = o;

  const way: string[] = [];
  const lengthTo = new Float64Array(order.length);
  for (let at = 0; at < order.length; at++) {
    const s = order[at]!;
    way[depth[s]!] = segments[s]!.id;
    lengthTo[depth[s]!] = (depth[s] === 0 ? 0 : lengthTo[depth[s]! - 1]!) + course.length[s]!;
    const o = outletAfter[s]!;
    if (o === NONE) continue;
    const segmentIds = way.slice(0, depth[s]! + 1);
    const duct = {
      segment: segments[s]!,
      section: sections.section[s]!,
      velocityPressure: friction.velocityPressure[s]!,
      accessories: accessories[s]!,
    };
    const damper = damperSetting(most - needs.required[o]!, duct, practice);
    paths[o] = new PathRecord(
      nodes[outlets[o]!]!.id,
      segmentIds,
      lengthTo[depth[s]!]!,
      losses,
      s,
      needs,
      o,
      design.availablePressure_pa,
      most,
      damper,
    );
  }
  return paths;
}

const PathRecord = plainRecord(function (
  this: Draft<SolvedPath>,
  outletNodeId: string,
  segmentIds: readonly string[],
  length: number,
  { frictionTo, dynamicTo }: Losses,
  last: number,
  { outletPressure, required }: OutletNeeds,
  outlet: number,
  available: Pascals,
  most: number,
  damper: DamperSetting | null,
) {
  this.outletNodeId = outletNodeId;
  this.segmentIds = segmentIds;
  this.length_m = meters(length);
  this.frictionLoss_pa = pascals(frictionTo[last]!);
  this.dynamicLoss_pa = pascals(dynamicTo[last]!);
  this.outletPressure_pa = pascals(outletPressure[outlet]!);
  this.requiredPressure_pa = pascals(required[outlet]!);
  this.spare_pa = pascals(available - required[outlet]!);
  this.throttle_pa = pascals(most - required[outlet]!);
  this.damper = damper;
});

export function reportShort(
  { nodes, design }: AirSystem,
  tree: Tree,
  { required }: OutletNeeds,
  findings: FindingList,
): void {
  const { outlets, into } = tree;
  const limit = design.availablePressure_pa;
  for (let o = 0; o < outlets.length; o++) {
    const value = required[o]!;
    if (value <= limit) continue;
    const subject = { kind: "node", id: nodes[outlets[o]!]!.id } as const;
    const limitSource = limitSources.available;
    addFinding(findings, into[outlets[o]!]!, "pressure-short", subject, { value, limit, unit: "Pa", limitSource });
  }
}
