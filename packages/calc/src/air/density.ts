import { kilogramsPerCubicMeter, type Kelvins, type KilogramsPerCubicMeter, type Meters } from "../quantity.ts";
import { barometricPressure } from "./atmosphere.ts";
import { saturationPressure } from "./humidity.ts";

/** J/(kg·K). Source: ASHRAE Handbook Fundamentals, ch. 1. */
const GAS_CONSTANT_OF_DRY_AIR = 287.042;
const GAS_CONSTANT_OF_WATER_VAPOR = 461.524;

export interface AirConditions {
  readonly altitude: Meters;
  readonly temperature: Kelvins;
  /** 0 to 1. */
  readonly relativeHumidity: number;
}

/**
 * Mass of a cubic meter of moist air at barometric pressure, each gas by its partial pressure.
 *
 *     ρ = (p − φ ps) / (Ra T) + φ ps / (Rw T)
 *
 * The static pressure in the duct is left out: 1 in. of water changes the density by 0.25 %.
 *
 * Source   ASHRAE Handbook Fundamentals, ch. 1, perfect gas relations
 *
 * @example airDensity({ altitude: meters(0), temperature: degreesFahrenheit(70), relativeHumidity: 0 }) // 1.199 6 kg/m³
 */
export function airDensity({ altitude, temperature, relativeHumidity }: AirConditions): KilogramsPerCubicMeter {
  const vaporPressure = relativeHumidity * saturationPressure(temperature);
  const dryPressure = barometricPressure(altitude) - vaporPressure;
  return kilogramsPerCubicMeter(
    dryPressure / (GAS_CONSTANT_OF_DRY_AIR * temperature) + vaporPressure / (GAS_CONSTANT_OF_WATER_VAPOR * temperature),
  );
}
