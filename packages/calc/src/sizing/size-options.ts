/** The standard sizes that one duct could have at equal friction, one for each shape and height. */
import type { AirSegment, AirSystem, Section } from "../air-system.ts";
import { slackFactor } from "../friction/flexible.ts";
import { darcyFrictionFactor } from "../friction/friction-factor.ts";
import { laminarEquivalentRatio } from "../friction/laminar-equivalent.ts";
import { roughnessOf } from "../friction/roughness.ts";
import { velocityPressure } from "../air/velocity-pressure.ts";
import { hydraulicDiameter, sectionArea, wettedPerimeter } from "../geometry/section.ts";
import { clearSection, linerThickness } from "../network/clear-section.ts";
import {
  metersPerSecond,
  pascalsPerMeter,
  type CubicMetersPerSecond,
  type KilogramsPerCubicMeter,
  type Meters,
  type MetersPerSecond,
  type PascalSeconds,
  type PascalsPerMeter,
} from "../quantity.ts";
import { standardCandidates } from "./candidates.ts";

type SizedSystem = Pick<AirSystem, "sizing" | "spec" | "frictionBasis">;

export interface SizeOption {
  /** As typed into the layout. */
  readonly section: Section;
  readonly meanVelocity_m_s: MetersPerSecond;
  readonly frictionRate_pa_m: PascalsPerMeter;
  readonly hydraulicDiameter_m: Meters;
  readonly perimeter_m: Meters;
}

/**
 * For each shape and each standard height, the least section that carries an airflow within the friction rate of the system's
 * sizing rule; least perimeter first. Flexible duct is round.
 *
 * Velocity limits are not applied: the answer tells the velocity, and the findings tell the limit.
 *
 * Range    standard sizes; higher than the rule's greatest height are left out, as are shapes where none carries the air
 */
export function sizeOptions(
  system: SizedSystem,
  segment: AirSegment,
  airflow: CubicMetersPerSecond,
  air: { density_kg_m3: KilogramsPerCubicMeter; viscosity_pa_s: PascalSeconds },
): readonly SizeOption[] {
  const { frictionRate_pa_m: rate, maximumHeight_m: highest } = system.sizing;
  const shapes = segment.flexible ? (["round"] as const) : (["round", "rectangular", "flat-oval"] as const);
  const options: SizeOption[] = [];
  for (const shape of shapes) {
    const leastOf = new Map<number, SizeOption>();
    // Least perimeter first, so the first that carries the air at a height is the least there.
    for (const { section, height_m } of standardCandidates[shape]) {
      const height = shape === "round" ? 0 : height_m;
      if (leastOf.has(height) || (highest !== null && height_m > highest + 1e-6)) continue;
      const option = optionOf(system, segment, section, airflow, air);
      if (option && option.frictionRate_pa_m <= rate * (1 + 1e-9)) leastOf.set(height, option);
    }
    options.push(...leastOf.values());
  }
  return options.sort((a, b) => a.perimeter_m - b.perimeter_m);
}

/** Null where the liner leaves nothing open. */
function optionOf(
  { spec, frictionBasis }: SizedSystem,
  segment: AirSegment,
  section: Section,
  airflow: CubicMetersPerSecond,
  { density_kg_m3: density, viscosity_pa_s: viscosity }: Parameters<typeof sizeOptions>[3],
): SizeOption | null {
  const clear = clearSection(section, linerThickness(segment, spec));
  if (Object.values(clear).some((side) => typeof side === "number" && !(side > 0))) return null;
  const [area, perimeter] = [sectionArea(clear), wettedPerimeter(clear)];
  const diameter = hydraulicDiameter(area, perimeter);
  const velocity = metersPerSecond(airflow / area);
  const reynoldsNumber = (density * velocity * diameter) / viscosity;
  const scale = frictionBasis === "hydraulic-diameter" ? 1 : laminarEquivalentRatio(clear);
  const factor = darcyFrictionFactor(clear, reynoldsNumber, roughnessOf(segment, spec) / diameter, scale);
  const slack = segment.flexible ? slackFactor({ slack: spec.flexibleSlack, diameter }) : 1;
  return {
    section,
    meanVelocity_m_s: velocity,
    frictionRate_pa_m: pascalsPerMeter((slack * factor * velocityPressure(density, velocity)) / diameter),
    hydraulicDiameter_m: diameter,
    perimeter_m: wettedPerimeter(section),
  };
}
