/** The part of a system that one edit can touch, cut out as a small system of its own. */
import type { AirNode, AirSegment, AirSystem } from "../../air-system.ts";
import { cubicMetersPerSecond, pascals } from "../../quantity.ts";
import { NONE, type Tree } from "../tree-shape.ts";

export interface Neighborhood {
  readonly system: AirSystem;
  /** Index in the whole system of each segment of the small one. */
  readonly segments: readonly number[];
  /** Segments whose losses the small system tells as the whole one would; the others only stand around them. */
  readonly told: ReadonlySet<number>;
}

/** A turn and an offset look at the segment before the one before. */
const SEGMENTS_ABOVE = 3;

/**
 * What an edit of a segment's own values touches: the fittings at its two ends, which are its own, its siblings' and its
 * children's, and those of the segment before it.
 */
export function aroundSegment(system: AirSystem, tree: Tree, airflow: Float64Array, s: number): Neighborhood {
  const above = wayUp(tree, s, SEGMENTS_ABOVE);
  const told = new Set([s, ...childrenOfNode(tree, tree.to[s]!)]);
  const parent = tree.before[s]!;
  if (parent !== NONE) {
    told.add(parent);
    for (const sibling of childrenOfNode(tree, tree.from[s]!)) told.add(sibling);
  }
  return cutOut(system, tree, airflow, above, told);
}

/** What another airflow at an outlet touches: the whole way to the equipment, and what leaves it on the way. */
export function aroundPath(system: AirSystem, tree: Tree, airflow: Float64Array, last: number): Neighborhood {
  const way = wayUp(tree, last, tree.segmentCount);
  const told = new Set(way);
  for (const s of way) {
    if (tree.before[s] !== NONE) for (const sibling of childrenOfNode(tree, tree.from[s]!)) told.add(sibling);
  }
  return cutOut(system, tree, airflow, way, told);
}

/** The segment and up to `most` above it. */
function wayUp({ before }: Tree, s: number, most: number): number[] {
  const way = [s];
  for (let above = before[s]!; above !== NONE && way.length <= most; above = before[above]!) way.push(above);
  return way;
}

const childrenOfNode = ({ childStart, childList }: Tree, n: number): Int32Array =>
  childList.subarray(childStart[n], childStart[n + 1]);

/**
 * The way with all that leaves it, and what goes on from the told ones. It begins at the topmost segment of the way, whose
 * near end stands in for the equipment; where a duct is cut off, an outlet takes the air that the duct carries.
 */
function cutOut(
  system: AirSystem,
  tree: Tree,
  airflow: Float64Array,
  way: readonly number[],
  told: ReadonlySet<number>,
): Neighborhood {
  const included = new Set<number>([...way, ...told]);
  const top = way.at(-1)!;
  for (const s of way) if (s !== top) for (const sibling of childrenOfNode(tree, tree.from[s]!)) included.add(sibling);
  for (const s of told) for (const child of childrenOfNode(tree, tree.to[s]!)) included.add(child);

  // In the order of the whole system: of equal legs, the first decides.
  const indexes = [...included].sort((a, b) => a - b);
  const nodes: AirNode[] = [asEquipment(system.nodes[tree.from[top]!]!)];
  const segments: AirSegment[] = [];
  for (const s of indexes) {
    const head = tree.to[s]!;
    const isCut = tree.childStart[head] !== tree.childStart[head + 1] && !goesOn(tree, included, head);
    const segment = system.segments[s]!;
    // A mouth is only at the last segment's end, and this one is not the last.
    segments.push(isCut && segment.mouth ? { ...segment, mouth: null } : segment);
    nodes.push(isCut ? asOutlet(system.nodes[head]!, airflow[s]!) : system.nodes[head]!);
  }
  return { system: { ...system, nodes, segments }, segments: indexes, told };
}

const goesOn = (tree: Tree, included: ReadonlySet<number>, node: number): boolean =>
  childrenOfNode(tree, node).some((child) => included.has(child));

const asEquipment = (node: AirNode): AirNode => ({
  ...node,
  role: "equipment",
  airflow_m3s: null,
  requiredPressure_pa: null,
});

const asOutlet = (node: AirNode, airflow: number): AirNode => ({
  ...node,
  role: "outlet",
  airflow_m3s: cubicMetersPerSecond(airflow),
  requiredPressure_pa: pascals(0),
});
