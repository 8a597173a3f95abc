/** What joins, lines and wraps a piece beside its metal: how much of it by piece. Common practice unless said otherwise. */
import { inches } from "../quantity.ts";

export const hardwareTable = {
  flange: {
    source:
      "common practice: a corner in each of the four corners of both flanges, cleats 12 in. apart (6 to 12 in. seen)",
    cornersPerJoint: 8,
    cleatSpacing: inches(12),
  },
  slip: { source: "common practice: slips on the wide sides, drives on the others, as long as the sides" },
  coupling: { source: "common practice: one inside coupling at each joint of straight round duct" },
  /** Interior widths and distances of mechanical fasteners. */
  pins: {
    source: "SMACNA, HVAC Duct Construction Standards, 2nd ed. 1995, S2.0 to S2.11",
    noneUpTo: inches(8),
    fromJoint: inches(3),
    fromCorner: inches(6),
    fastOver_m_s: 2500 * 0.00508,
    slow: { along: inches(18), around: inches(12) },
    fast: { along: inches(16), around: inches(6) },
  },
  adhesive: {
    source: "common practice: 1 gal for 100 ft² of liner, 0.7 to 1.5 seen",
    liters_per_m2: 3.785411784 / 9.290304,
  },
  tape: { source: "common practice: 0.35 ft of tape for 1 ft² of faced wrap", m_per_m2: (0.35 * 0.3048) / 0.09290304 },
} as const;

/**
 * Installed resistance of glass-fiber wrap of 0.75 lb/ft³, pressed to three quarters of its thickness; liner of 1.5 lb/ft³.
 * Wrap: an insulation makers' guide specification 23 07 13 (2017), table 1, found. Liner: from memory; a maker's sheet beats it.
 */
export const resistanceTable = {
  wrap: [
    { thickness_in: 1.5, r: 4.2 },
    { thickness_in: 2, r: 5.6 },
    { thickness_in: 2.2, r: 6 },
    { thickness_in: 3, r: 8.3 },
  ],
  liner: [
    { thickness_in: 0.5, r: 2.1 },
    { thickness_in: 1, r: 4.2 },
    { thickness_in: 1.5, r: 6 },
    { thickness_in: 2, r: 8 },
  ],
} as const;
