import { pascals, type Meters, type Pascals } from "../quantity.ts";

/**
 * Barometric pressure of the standard atmosphere at an altitude.
 *
 *     p = 101 325 (1 − 2.255 77e-5 z)^5.2559     z in m
 *
 * Range    −500 m to 11 000 m (the troposphere); the entrance of `solve` refuses more
 * Source   U.S. Standard Atmosphere 1976, in the form of the ASHRAE Handbook Fundamentals, ch. 1, eq. 3
 *
 * @example barometricPressure(meters(1000)) // 89 874.5 Pa
 */
export const barometricPressure = (altitude: Meters): Pascals =>
  pascals(101_325 * (1 - 2.25577e-5 * altitude) ** 5.2559);
