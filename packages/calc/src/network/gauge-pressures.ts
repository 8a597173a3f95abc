import type { Service } from "../air-system.ts";
import { pascals, type Pascals } from "../quantity.ts";
import type { Friction } from "./friction.ts";
import type { Losses } from "./losses.ts";
import type { SolvedSegment } from "./solution.ts";

export type GaugePressures = Pick<
  SolvedSegment,
  "totalPressureEntering_pa" | "totalPressureLeaving_pa" | "staticPressureEntering_pa" | "staticPressureLeaving_pa"
>;

/**
 * Pressures in segment s against the room, when the fan makes exactly what the governing path requires.
 *
 *     TP = ± (required − losses on the way),   SP = TP − VP
 *
 * Plus in supply, which the fan pushes; minus in the others, which it pulls: there static pressure lies below total. Entering is
 * past the fittings at the segment's beginning, so that both ends stand in the same duct.
 */
export function gaugePressures(
  s: number,
  service: Service,
  requiredPressure: number,
  { frictionTo, dynamicTo, frictionLoss }: Losses,
  { velocityPressure }: Friction,
): GaugePressures {
  const sign = service === "supply" ? 1 : -1;
  const left = requiredPressure - frictionTo[s]! - dynamicTo[s]!;
  const leaving = pascals(sign * left);
  const entering = pascals(sign * (left + frictionLoss[s]!));
  const toStatic = (total: Pascals) => pascals(total - velocityPressure[s]!);
  return {
    totalPressureEntering_pa: entering,
    totalPressureLeaving_pa: leaving,
    staticPressureEntering_pa: toStatic(entering),
    staticPressureLeaving_pa: toStatic(leaving),
  };
}
