import { pascals, type Kelvins, type Pascals } from "../quantity.ts";

const FREEZING_K = 273.16;

const overIce = (t: number): number =>
  -5.6745359e3 / t +
  6.3925247 -
  9.677843e-3 * t +
  6.2215701e-7 * t ** 2 +
  2.0747825e-9 * t ** 3 -
  9.484024e-13 * t ** 4 +
  4.1635019 * Math.log(t);

const overWater = (t: number): number =>
  -5.8002206e3 / t +
  1.3914993 -
  4.8640239e-2 * t +
  4.1764768e-5 * t ** 2 -
  1.4452093e-8 * t ** 3 +
  6.5459673 * Math.log(t);

/**
 * Pressure of water vapor in saturated air, over ice below the triple point and over water above it.
 *
 *     ln p = C1/T + C2 + C3 T + C4 T² + C5 T³ + C6 T⁴ + C7 ln T
 *
 * Range    173 K to 473 K
 * Source   Hyland, R. W., Wexler, A. (1983), ASHRAE Trans. 89(2A), 500–519; constants recalled, held
 *          against steam tables in checks/air.check.test.ts
 *
 * @example saturationPressure(degreesCelsius(20)) // 2 338.8 Pa
 */
export const saturationPressure = (temperature: Kelvins): Pascals =>
  pascals(Math.exp(temperature < FREEZING_K ? overIce(temperature) : overWater(temperature)));
