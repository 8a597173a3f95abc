/** Velocity and friction of every segment, by its real area and its hydraulic diameter. */
import type { AirSystem } from "../air-system.ts";
import { velocityPressure as pressureOfVelocity } from "../air/velocity-pressure.ts";
import { slackFactor } from "../friction/flexible.ts";
import { darcyFrictionFactor } from "../friction/friction-factor.ts";
import { roughnessOf } from "../friction/roughness.ts";
import { meters, metersPerSecond, type KilogramsPerCubicMeter, type PascalSeconds } from "../quantity.ts";
import type { Sections } from "./sections.ts";

export interface Friction {
  readonly velocity: Float64Array;
  readonly velocityPressure: Float64Array;
  readonly reynoldsNumber: Float64Array;
  readonly darcyFrictionFactor: Float64Array;
  /** Pa/m, with the slack of flexible duct. */
  readonly frictionRate: Float64Array;
}

export function findFriction(
  { segments, spec }: AirSystem,
  airflow: Float64Array,
  { section, area, hydraulicDiameter }: Sections,
  { density, viscosity }: { density: KilogramsPerCubicMeter; viscosity: PascalSeconds },
): Friction {
  const friction: Friction = {
    velocity: new Float64Array(segments.length),
    velocityPressure: new Float64Array(segments.length),
    reynoldsNumber: new Float64Array(segments.length),
    darcyFrictionFactor: new Float64Array(segments.length),
    frictionRate: new Float64Array(segments.length),
  };
  const kinematic = viscosity / density;
  for (let s = 0; s < segments.length; s++) {
    const segment = segments[s]!;
    const diameter = hydraulicDiameter[s]!;
    const velocity = airflow[s]! / area[s]!;
    const velocityPressure = pressureOfVelocity(density, metersPerSecond(velocity));
    const reynoldsNumber = (velocity * diameter) / kinematic;
    const factor = darcyFrictionFactor(section[s]!, reynoldsNumber, roughnessOf(segment, spec) / diameter);
    const slack = segment.flexible ? slackFactor({ slack: spec.flexibleSlack, diameter: meters(diameter) }) : 1;

    friction.velocity[s] = velocity;
    friction.velocityPressure[s] = velocityPressure;
    friction.reynoldsNumber[s] = reynoldsNumber;
    friction.darcyFrictionFactor[s] = factor;
    friction.frictionRate[s] = (slack * factor * velocityPressure) / diameter;
  }
  return friction;
}
