import { pascals, type KilogramsPerCubicMeter, type MetersPerSecond, type Pascals } from "../quantity.ts";

/**
 * Pressure that moving air would show if brought to rest.
 *
 *     Pv = ρ V² / 2
 *
 * Always from the real cross-section, never from an equivalent diameter.
 */
export const velocityPressure = (density: KilogramsPerCubicMeter, meanVelocity: MetersPerSecond): Pascals =>
  pascals(0.5 * density * meanVelocity * meanVelocity);
