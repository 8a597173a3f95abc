/** Entries, screens and dampers, on the velocity pressure of the duct. */

export const flushBellmouth = {
  source: "Idelchik (1986), diagram 3-4, bellmouth in a wall, as reprinted by ASHRAE (2021), fitting 1-3",
  standing: "memory, but for the sharp edge",
  columns: "r/D, C",
  absoluteTolerance: 0.015,
  why: "the handbook's closed form against its own table of two digits",
  rows: [
    [0, 0.5],
    [0.01, 0.43],
    [0.02, 0.36],
    [0.03, 0.31],
    [0.04, 0.26],
    [0.05, 0.22],
    [0.06, 0.2],
    [0.08, 0.15],
    [0.1, 0.12],
    [0.12, 0.09],
    [0.16, 0.06],
    [0.2, 0.03],
  ],
} as const;

export const freeBellmouth = {
  source: "ASHRAE, Principles of HVAC, 9th ed. (2021), online supplement, fitting 1-2; Idelchik, diagram 3-4",
  standing: "found",
  columns: "r/D, C",
  absoluteTolerance: 0.045,
  why: "ours is the bellmouth in a wall; from r/D 0.1 up a free one differs by no more than this",
  rows: [
    [0.1, 0.15],
    [0.12, 0.1],
    [0.16, 0.06],
    [0.2, 0.03],
  ],
} as const;

export const plainEnds = {
  source: "ASHRAE, Principles of HVAC, 9th ed. (2021), online supplement, fitting 1-1; Idelchik (1986), diagram 3-1",
  standing: "found",
  absoluteTolerance: 0.005,
  why: "half of the last printed digit",
  flush: 0.5,
  projecting: 1,
} as const;

export const screens = {
  source: "Idelchik (1986), diagram 8-6, as in a printed duct table",
  standing: "memory",
  columns: "free area, C",
  absoluteTolerance: 0.005,
  relativeTolerance: 0.035,
  why: "two printed digits, half of the last is up to 4 % of 1.3; the row of 0.3 is printed 2.4 % under the formula",
  rows: [
    [0.3, 6.2],
    [0.4, 3.0],
    [0.5, 1.7],
    [0.55, 1.3],
    [0.6, 0.97],
    [0.65, 0.75],
    [0.7, 0.58],
    [0.75, 0.44],
    [0.8, 0.32],
    [0.9, 0.14],
    [1.0, 0],
  ],
} as const;

export const roundDamper = {
  source: "ASHRAE CD9-1, disk as wide as the duct",
  standing: "memory",
  columns: "angle in degrees, C",
  absoluteTolerance: 0.015,
  relativeTolerance: 0.005,
  why: "our open blade has 0.2, the print 0.19; the rest is half of the last printed digit",
  rows: [
    [0, 0.19],
    [10, 0.67],
    [20, 1.76],
    [30, 4.38],
    [40, 11.2],
    [50, 32.0],
    [60, 113],
    [70, 619],
  ],
} as const;

export const rectangularDamper = {
  source: "A printed duct table of one blade in a rectangular duct, after Idelchik",
  standing: "memory",
  columns: "angle in degrees, C",
  absoluteTolerance: 0.005,
  relativeTolerance: 0.15,
  why: "one jet term of common practice stands for the row; over 50° a recalled 70 at 60° lies a fifth below and is left out",
  rows: [
    [0, 0.04],
    [10, 0.33],
    [20, 1.2],
    [30, 3.3],
    [40, 9.0],
    [50, 26],
  ],
} as const;
