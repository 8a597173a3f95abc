import { pascalSeconds, type Kelvins, type PascalSeconds } from "../quantity.ts";

/**
 * Dynamic viscosity of air; it does not depend on pressure, and humidity changes it by less than 0.5 % in ducts.
 *
 *     μ = 1.458e-6 T^1.5 / (T + 110.4)
 *
 * Source   Sutherland's law with the constants of the U.S. Standard Atmosphere 1976, eq. 51
 *
 * @example dynamicViscosity(kelvins(288.15)) // 1.789 38e-5 Pa·s
 */
export const dynamicViscosity = (temperature: Kelvins): PascalSeconds =>
  pascalSeconds((1.458e-6 * temperature ** 1.5) / (temperature + 110.4));
