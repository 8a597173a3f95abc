/** Limits that no project states: each with its source, or marked as common practice. Quantities in SI. */
import { feetPerMinute, inchesOfWater } from "../quantity.ts";

const PRACTICE = "common practice, no source";

export const practiceLimits = {
  /** More than this at an outlet's damper is heard in the room. */
  damperPressure_pa: { value: inchesOfWater(0.1), source: PRACTICE },
  /** Least over most of what the outlets require. */
  pathBalance: { value: 0.5, source: PRACTICE },
  /** Available over required. */
  pressureReserve: { value: 2, source: PRACTICE },
  leakageShare: { value: 0.05, source: PRACTICE },
  leastVelocity_m_s: { value: feetPerMinute(300), source: PRACTICE },
  flexibleSlack: { value: 0.04, source: "common practice, no source: flexible duct is pulled to its full length" },
  /** Straight duct between two fittings, in hydraulic diameters. */
  fittingSpacing: { value: 3, source: `${PRACTICE}: coefficients are measured with straight duct before the fitting` },
  /** Straight duct at the equipment, in hydraulic diameters. */
  fanConnection: { value: 2.5, source: PRACTICE },
  squareThroatVelocity_m_s: {
    value: feetPerMinute(2000),
    source: "GSA P100, Facilities Standards: no mitered elbows above 2,000 fpm",
  },
  vanedElbowVelocity_m_s: {
    value: feetPerMinute(2500),
    source: "a national laboratory's design guide: radius elbows preferred from 2,500 fpm",
  },
} as const;

export const LINING_SOURCE = `${PRACTICE}: sound of the unit is absorbed in the first duct`;
export const GROWTH_SOURCE = `${PRACTICE}: a duct is no larger than the one that feeds it`;
export const TRANSITION_SOURCE = "The construction spec's transition angle";
export const MARGIN_SOURCE = "Pressure that the equipment gives, with this system's safety margin kept";

/** The seal class that a pressure class asks for. */
export const sealClassTable = {
  source: "SMACNA HVAC Air Duct Leakage Test Manual, table 4-1; energy codes may ask for class A throughout",
  rows: [
    { upTo_pa: inchesOfWater(2), sealClass: "C" },
    { upTo_pa: inchesOfWater(3), sealClass: "B" },
    { upTo_pa: inchesOfWater(10), sealClass: "A" },
  ],
} as const;
