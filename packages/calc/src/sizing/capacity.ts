import type { KilogramsPerCubicMeter, Meters, MetersPerSecond, PascalSeconds, PascalsPerMeter } from "../quantity.ts";
import { metersPerSecond } from "../quantity.ts";

/**
 * Velocity at which a duct loses exactly a friction rate in turbulent flow. No iteration: Re √f is known beforehand.
 *
 *     Re √f = Dh √(2 S ρ Dh) / μ,   V = √(2 S Dh / ρ) / √f,   1/√f = −2 log10( ε/(3.7 Dh) + 2.51/(Re √f) )
 *
 * Range    turbulent; the caller checks the answer with the full friction law
 * Source   Colebrook (1939) with Darcy and Weisbach, solved for the velocity
 */
export function velocityAtFrictionRate(duct: {
  frictionRate: PascalsPerMeter;
  hydraulicDiameter: Meters;
  roughness: Meters;
  density: KilogramsPerCubicMeter;
  viscosity: PascalSeconds;
  /** Multiplies the Reynolds number: 1 on the hydraulic diameter, `laminarEquivalentRatio` on the other basis. */
  turbulentScale: number;
}): MetersPerSecond {
  const { frictionRate, hydraulicDiameter, roughness, density, viscosity, turbulentScale } = duct;
  const shear = Math.sqrt((2 * frictionRate * hydraulicDiameter) / density);
  const reynoldsRoot = (turbulentScale * density * shear * hydraulicDiameter) / viscosity;
  return metersPerSecond(shear * -2 * Math.log10(roughness / (3.7 * hydraulicDiameter) + 2.51 / reynoldsRoot));
}
