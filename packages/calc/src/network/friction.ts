/** Velocity and friction of every segment, by its real area and its hydraulic diameter. */
import type { AirSystem, FrictionBasis, Section } from "../air-system.ts";
import { velocityPressure as pressureOfVelocity } from "../air/velocity-pressure.ts";
import { slackFactor } from "../friction/flexible.ts";
import { TURBULENT_FROM_REYNOLDS, darcyFrictionFactor } from "../friction/friction-factor.ts";
import { laminarEquivalentRatio } from "../friction/laminar-equivalent.ts";
import { roughnessOf } from "../friction/roughness.ts";
import { turbulentFactor, turbulentFactors } from "../friction/turbulent-factors.ts";
import {
  meters,
  metersPerSecond,
  pascalsPerMeter,
  type KilogramsPerCubicMeter,
  type PascalSeconds,
  type PascalsPerMeter,
} from "../quantity.ts";
import type { Sections } from "./sections.ts";
import type { SolvedSegment } from "./solution.ts";
import type { Traits } from "./traits.ts";

export interface Friction {
  readonly velocity: Float64Array;
  readonly velocityPressure: Float64Array;
  readonly reynoldsNumber: Float64Array;
  readonly darcyFrictionFactor: Float64Array;
  /** Pa/m, with the slack of flexible duct. */
  readonly frictionRate: Float64Array;
}

export function findFriction(
  { spec, frictionBasis }: AirSystem,
  airflow: Float64Array,
  sections: Sections,
  traits: Traits,
  air: { density: KilogramsPerCubicMeter; viscosity: PascalSeconds },
): Friction {
  const count = airflow.length;
  const friction: Friction = {
    velocity: new Float64Array(count),
    velocityPressure: new Float64Array(count),
    reynoldsNumber: new Float64Array(count),
    darcyFrictionFactor: new Float64Array(count),
    frictionRate: new Float64Array(count),
  };
  const relativeRoughness = new Float64Array(count);
  fillVelocities(friction, airflow, sections, air.density, air.viscosity / air.density);
  fillRoughness(traits.roughness, sections.hydraulicDiameter, relativeRoughness);
  if (frictionBasis === "hydraulic-diameter")
    fillFactors(sections.section, friction.reynoldsNumber, relativeRoughness, friction.darcyFrictionFactor);
  else
    fillEquivalentFactors(sections.section, friction.reynoldsNumber, relativeRoughness, friction.darcyFrictionFactor);
  fillRates(traits.isFlexible, spec.flexibleSlack, sections.hydraulicDiameter, friction);
  return friction;
}

// Short loops, for the reason told in sections.ts.

function fillVelocities(
  { velocity, velocityPressure, reynoldsNumber }: Friction,
  airflow: Float64Array,
  { area, hydraulicDiameter }: Sections,
  density: KilogramsPerCubicMeter,
  kinematicViscosity: number,
): void {
  for (let s = 0; s < airflow.length; s++) {
    velocity[s] = airflow[s]! / area[s]!;
    velocityPressure[s] = pressureOfVelocity(density, metersPerSecond(velocity[s]!));
    reynoldsNumber[s] = (velocity[s]! * hydraulicDiameter[s]!) / kinematicViscosity;
  }
}

function fillRoughness(roughness: Float64Array, diameter: Float64Array, relativeRoughness: Float64Array): void {
  for (let s = 0; s < diameter.length; s++) relativeRoughness[s] = roughness[s]! / diameter[s]!;
}

function fillFactors(
  section: readonly Section[],
  reynoldsNumber: Float64Array,
  relativeRoughness: Float64Array,
  factor: Float64Array,
): void {
  const known = turbulentFactors();
  for (let s = 0; s < factor.length; s++) {
    factor[s] =
      reynoldsNumber[s]! >= TURBULENT_FROM_REYNOLDS
        ? turbulentFactor(known, reynoldsNumber[s]!, relativeRoughness[s]!)
        : darcyFrictionFactor(section[s]!, reynoldsNumber[s]!, relativeRoughness[s]!);
  }
}

/** The same on the laminar-equivalent diameter. */
function fillEquivalentFactors(
  section: readonly Section[],
  reynoldsNumber: Float64Array,
  relativeRoughness: Float64Array,
  factor: Float64Array,
): void {
  for (let s = 0; s < factor.length; s++) {
    const scale = laminarEquivalentRatio(section[s]!);
    factor[s] = darcyFrictionFactor(section[s]!, reynoldsNumber[s]!, relativeRoughness[s]!, scale);
  }
}

/** The friction rate that a solved segment would have on a basis, for comparison with the one it was solved on. */
export function frictionRateOnBasis(system: AirSystem, solved: SolvedSegment, basis: FrictionBasis): PascalsPerMeter {
  const segment = system.segments.find(({ id }) => id === solved.segmentId)!;
  const relativeRoughness = roughnessOf(segment, system.spec) / solved.hydraulicDiameter_m;
  const scale = basis === "hydraulic-diameter" ? 1 : laminarEquivalentRatio(solved.section);
  const factor = darcyFrictionFactor(solved.section, solved.reynoldsNumber, relativeRoughness, scale);
  return pascalsPerMeter((solved.frictionRate_pa_m * factor) / solved.darcyFrictionFactor);
}

function fillRates(isFlexible: Uint8Array, flexibleSlack: number, diameter: Float64Array, friction: Friction): void {
  const { darcyFrictionFactor: factor, velocityPressure, frictionRate } = friction;
  for (let s = 0; s < diameter.length; s++) {
    const slack = isFlexible[s] === 1 ? slackFactor({ slack: flexibleSlack, diameter: meters(diameter[s]!) }) : 1;
    frictionRate[s] = (slack * factor[s]! * velocityPressure[s]!) / diameter[s]!;
  }
}
