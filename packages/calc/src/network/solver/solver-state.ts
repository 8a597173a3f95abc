/** What a solver keeps between edits, and how an edit changes it. */
import type { AirNode, AirSegment, AirSystem } from "../../air-system.ts";
import type { PracticeCoefficients } from "../../fittings/practice.table.ts";
import { ok, type Result } from "../../result.ts";
import { findNeeds, type OutletNeeds } from "../paths.ts";
import type { Solution, SystemProblem } from "../solution.ts";
import { solve } from "../solve.ts";
import { buildTree, NONE, type Tree } from "../tree.ts";
import { addToRange, mostOfRange, type MostOfRange } from "./most-of-range.ts";
import type { Neighborhood } from "./neighborhood.ts";

export interface SolverState {
  /** Its lists are the state's own, and edited in place. */
  readonly system: AirSystem & { readonly nodes: AirNode[]; readonly segments: AirSegment[] };
  readonly tree: Tree;
  readonly segmentAt: ReadonlyMap<string, number>;
  readonly nodeAt: ReadonlyMap<string, number>;
  readonly airflow: Float64Array;
  /** Friction and fittings of each segment. */
  readonly loss: Float64Array;
  /** What the outlet takes at the end of each segment; 0 where there is none. */
  readonly outletPressure: Float64Array;
  /** The outlets beyond segment s have the places firstOutlet[s] up to endOfOutlets[s] on a walk around the tree. */
  readonly firstOutlet: Int32Array;
  readonly endOfOutlets: Int32Array;
  /** The node at each place. */
  readonly outletNode: Int32Array;
  readonly required: MostOfRange;
  /** Null since the last edit. */
  solution: Solution | null;
}

export function loadState(given: AirSystem, practice: PracticeCoefficients): Result<SolverState, SystemProblem> {
  const system = { ...given, nodes: [...given.nodes], segments: [...given.segments] };
  const answer = solve(given, practice);
  if (!answer.ok) return answer;
  const solution = answer.value;

  const tree = buildTree(system, []);
  const { outlets, into, segmentCount } = tree;
  // From the records of the segments, not of the paths: those name every segment on the way, which grows faster than the tree.
  const needs = needsOf(system, tree, solution);
  const outletPressure = new Float64Array(segmentCount);
  const requiredOf = new Float64Array(system.nodes.length);
  outlets.forEach((n, o) => {
    outletPressure[into[n]!] = needs.outletPressure[o]!;
    requiredOf[n] = needs.required[o]!;
  });
  const places = placesOfOutlets(tree);
  return ok({
    system,
    tree,
    segmentAt: new Map(system.segments.map(({ id }, s) => [id, s])),
    nodeAt: new Map(system.nodes.map(({ id }, n) => [id, n])),
    airflow: Float64Array.from(solution.segments, (segment) => segment.volumetricFlowRate_m3s),
    loss: Float64Array.from(solution.segments, (segment) => segment.totalPressureLoss_pa),
    outletPressure,
    ...places,
    required: mostOfRange(Float64Array.from(places.outletNode, (n) => requiredOf[n]!)),
    solution,
  });
}

function needsOf(system: AirSystem, tree: Tree, { segments }: Solution): OutletNeeds {
  const { order, before, segmentCount } = tree;
  const frictionTo = new Float64Array(segmentCount);
  const dynamicTo = new Float64Array(segmentCount);
  for (const s of order) {
    const parent = before[s]!;
    frictionTo[s] = segments[s]!.frictionLoss_pa + (parent === NONE ? 0 : frictionTo[parent]!);
    dynamicTo[s] = segments[s]!.dynamicLoss_pa + (parent === NONE ? 0 : dynamicTo[parent]!);
  }
  const velocityPressure = Float64Array.from(segments, (segment) => segment.velocityPressure_pa);
  return findNeeds(system, tree, { velocityPressure }, { frictionTo, dynamicTo });
}

/** A walk that finishes each branch before the next meets the outlets beyond a segment one after another. */
function placesOfOutlets({
  order,
  before,
  to,
  childStart,
  outlets,
}: Tree): Pick<SolverState, "firstOutlet" | "endOfOutlets" | "outletNode"> {
  const firstOutlet = new Int32Array(order.length);
  const endOfOutlets = new Int32Array(order.length);
  const outletNode = new Int32Array(outlets.length);
  let met = 0;
  for (const s of order) {
    const head = to[s]!;
    firstOutlet[s] = met;
    if (childStart[head] === childStart[head + 1]) outletNode[met++] = head;
    endOfOutlets[s] = met;
  }
  for (let at = order.length - 1; at >= 0; at--) {
    const s = order[at]!;
    const parent = before[s]!;
    if (parent !== NONE && endOfOutlets[s]! > endOfOutlets[parent]!) endOfOutlets[parent] = endOfOutlets[s]!;
  }
  return { firstOutlet, endOfOutlets, outletNode };
}

/** Solves the neighborhood and carries what it tells into the sums of the whole. */
export function update(
  state: SolverState,
  { system, segments, told }: Neighborhood,
  practice: PracticeCoefficients,
): Result<null, SystemProblem> {
  const answer = solve(system, practice);
  if (!answer.ok) return answer;
  const { tree, airflow, loss, outletPressure, firstOutlet, endOfOutlets, required } = state;

  answer.value.segments.forEach((solved, at) => {
    const s = segments[at]!;
    if (!told.has(s)) return;
    airflow[s] = solved.volumetricFlowRate_m3s;
    addToRange(required, firstOutlet[s]!, endOfOutlets[s]!, solved.totalPressureLoss_pa - loss[s]!);
    loss[s] = solved.totalPressureLoss_pa;
  });
  for (const path of answer.value.paths) {
    const last = tree.into[state.nodeAt.get(path.outletNodeId)!]!;
    const head = tree.to[last]!;
    if (!told.has(last) || tree.childStart[head] !== tree.childStart[head + 1]) continue;
    const place = firstOutlet[last]!;
    addToRange(required, place, place + 1, path.outletPressure_pa - outletPressure[last]!);
    outletPressure[last] = path.outletPressure_pa;
  }
  state.solution = null;
  return ok(null);
}
