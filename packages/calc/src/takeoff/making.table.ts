/** How a shop makes what the drawing does not say: legs, collars, entries, gores. Common practice unless said otherwise. */
import { inches } from "../quantity.ts";

export const makingTable = {
  source: "common practice, no single source",
  /** Straight leg at the throat of a square elbow; 4 to 6 in. is usual. */
  squareThroatLeg: inches(4),
  /** From the wall of the main to the end of a tap. */
  tapCollar: inches(6),
  /** Straight part of a junction beyond the branch, to each side. */
  bodyCollar: inches(2),
  /** Entry of a shoe tap at 45°: a quarter of the branch's width, not less than this. */
  shoeEntry: { share: 0.25, least: inches(4) },
  /** A conical tap is this much wider at the main. */
  coneSpread: inches(4),
  /** Edge turned over all round an end cap. */
  capTurn: inches(1),
  /** A plenum stands out this far around the duct on it, and is this long; its opening to the unit is the duct's. */
  plenum: { margin: inches(6), length: inches(24) },
  transition: { shortest: inches(12) },
  /** Single-thickness turning vanes of 2 in. radius, 1 1/2 in. apart square to the wall. */
  vane: { radius: inches(2), spacing: inches(1.5) },
} as const;

/** Pieces of a gored elbow, both ends counted. */
export const goreTable = {
  source: "SMACNA, HVAC Duct Construction Standards, 2nd ed. 1995, table 3-1",
  rows: [
    { radiusRatio: 0.6, at90: 3, at60: 2, at45: 2 },
    { radiusRatio: 1, at90: 4, at60: 3, at45: 2 },
    { radiusRatio: 1.5, at90: 5, at60: 4, at45: 3 },
  ],
} as const;

/** Duct sealant brushed on: 0.7 US gal for 100 ft of joint, 0.4 to 1.2 seen. */
export const sealantTable = {
  source: "common practice: 0.7 gal for 100 ft of joint",
  liters_per_m: (0.7 * 3.785411784) / (100 * 0.3048),
} as const;

/** Flexible duct hangs at most this far between supports. */
export const flexibleSupport = {
  source: "flexible duct makers' practice: supports 4 ft apart",
  spacing: inches(48),
} as const;

/** A piece heavier than this is lifted with gear, not by two people. */
export const heavyPiece = { source: "common practice, no source", weight_lb: 150 } as const;
