/**
 * What to add to the total pressure left in a segment to have the size of its static pressure.
 *
 * Under pressure (supply) static is total less velocity pressure. Under suction the gauge pressures are negative: static lies
 * farther below the room than total, by the velocity pressure.
 */
export const staticLessTotal = (isUnderPressure: boolean, velocityPressure: number): number =>
  isUnderPressure ? -velocityPressure : velocityPressure;
