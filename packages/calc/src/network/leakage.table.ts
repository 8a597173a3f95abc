/** Leakage class: cfm through 100 ft² of duct wall at 1 in. of water, by seal class. Lower is tighter. */
import type { SealClass } from "../air-system.ts";

export const leakageClassTable = {
  source: "SMACNA HVAC Air Duct Leakage Test Manual, table 4-1 (single facts); unsealed round recalled",
  exponent: 0.65,
  rows: {
    A: { rectangular: 6, round: 3, flexible: 12 },
    B: { rectangular: 12, round: 6, flexible: 12 },
    C: { rectangular: 24, round: 12, flexible: 12 },
    none: { rectangular: 48, round: 30, flexible: 30 },
  } satisfies Record<SealClass, { rectangular: number; round: number; flexible: number }>,
} as const;
