/** What every segment loses, what is left on the way, and what leaks: columns, each from the equipment outward. */
import type { AirSystem } from "../air-system.ts";
import { outerPerimeter } from "../geometry/section.ts";
import { pascals, squareMeters } from "../quantity.ts";
import type { Course } from "./course.ts";
import type { FittingColumns } from "./fitting-columns.ts";
import type { Friction } from "./friction.ts";
import { leakage } from "./leakage.ts";
import type { Sections } from "./sections.ts";
import type { SolvedAccessory } from "./solution.ts";
import type { Traits } from "./traits.ts";
import { NONE, type Tree } from "./tree-shape.ts";

export interface Losses {
  readonly frictionLoss: Float64Array;
  readonly dynamicLoss: Float64Array;
  /** Sums from the equipment to the far end of each segment. */
  readonly frictionTo: Float64Array;
  readonly dynamicTo: Float64Array;
  /** Total pressure left of the available at either end. */
  readonly entering: Float64Array;
  readonly leaving: Float64Array;
}

export function sumLosses(
  { design }: AirSystem,
  { order, before, segmentCount }: Tree,
  { length }: Course,
  { frictionRate }: Friction,
  fittings: FittingColumns,
  accessories: readonly (readonly SolvedAccessory[])[],
): Losses {
  const losses: Losses = {
    frictionLoss: new Float64Array(segmentCount),
    dynamicLoss: new Float64Array(segmentCount),
    frictionTo: new Float64Array(segmentCount),
    dynamicTo: new Float64Array(segmentCount),
    entering: new Float64Array(segmentCount),
    leaving: new Float64Array(segmentCount),
  };
  for (let s = 0; s < segmentCount; s++) {
    losses.frictionLoss[s] = frictionRate[s]! * length[s]!;
    losses.dynamicLoss[s] = dynamicLossOf(fittings, s) + accessoryLossOf(accessories[s]!);
  }
  addUp(losses, order, before, design.availablePressure_pa);
  return losses;
}

function dynamicLossOf({ start, lossCoefficient, velocityPressure }: FittingColumns, s: number): number {
  let sum = 0;
  for (let f = start[s]!; f < start[s + 1]!; f++) sum += lossCoefficient[f]! * velocityPressure[f]!;
  return sum;
}

function accessoryLossOf(accessories: readonly SolvedAccessory[]): number {
  let sum = 0;
  for (let a = 0; a < accessories.length; a++) sum += accessories[a]!.loss_pa;
  return sum;
}

function addUp(losses: Losses, order: Int32Array, before: Int32Array, available: number): void {
  const { frictionLoss, dynamicLoss, frictionTo, dynamicTo, entering, leaving } = losses;
  for (let at = 0; at < order.length; at++) {
    const s = order[at]!;
    const parent = before[s]!;
    const isFirst = parent === NONE;
    frictionTo[s] = (isFirst ? 0 : frictionTo[parent]!) + frictionLoss[s]!;
    dynamicTo[s] = (isFirst ? 0 : dynamicTo[parent]!) + dynamicLoss[s]!;
    entering[s] = isFirst ? available : leaving[parent]!;
    leaving[s] = entering[s] - frictionLoss[s]! - dynamicLoss[s]!;
  }
}

/**
 * What to add to the total pressure left in a segment to have the size of its static pressure.
 *
 * Under pressure (supply) static is total less velocity pressure. Under suction the gauge pressures are negative: static lies
 * farther below the room than total, by the velocity pressure.
 */
export const staticLessTotal = (isUnderPressure: boolean, velocityPressure: number): number =>
  isUnderPressure ? -velocityPressure : velocityPressure;

interface LeakingColumns {
  readonly system: AirSystem;
  readonly sections: Sections;
  readonly traits: Traits;
  readonly course: Course;
  readonly friction: Friction;
  readonly losses: Losses;
}

/** Air through the walls of each segment, at its mean static pressure. */
export function findLeakage({
  system,
  sections: { section, perimeter },
  traits,
  course: { length },
  friction: { velocityPressure },
  losses: { entering, leaving },
}: LeakingColumns): Float64Array {
  const leaks = new Float64Array(length.length);
  const isUnderPressure = system.service === "supply";
  for (let s = 0; s < leaks.length; s++) {
    const meanTotal = (entering[s]! + leaving[s]!) / 2;
    const staticPressure = meanTotal + staticLessTotal(isUnderPressure, velocityPressure[s]!);
    const outer = section[s]!.shape === "annular" ? outerPerimeter(section[s]!) : perimeter[s]!;
    leaks[s] = leakage(traits.leakageClass[s]!, squareMeters(outer * length[s]!), pascals(staticPressure));
  }
  return leaks;
}
