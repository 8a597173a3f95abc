/** Leakage of duct walls. */

export const leakageRows = {
  source: "SMACNA HVAC Air Duct Leakage Test Manual, F = CL P^0.65, in cfm per 100 ft²",
  standing: "class table found, exponent recalled",
  relativeTolerance: 1e-6,
  why: "closed form",
  rows: [
    [3, 0.1, 0.671616342],
    [3, 2, 4.70750459],
    [3, 6, 9.61434202],
    [4, 0.5, 2.54912125],
    [4, 3, 8.16937453],
    [4, 10, 17.8673437],
    [6, 1, 6.0],
    [6, 4, 14.773733],
    [12, 0.1, 2.68646537],
    [12, 2, 18.8300183],
    [12, 6, 38.4573681],
    [24, 0.5, 15.2947275],
    [24, 3, 49.0162472],
    [24, 10, 107.204062],
    [30, 1, 30.0],
    [30, 4, 73.8686648],
    [48, 0.1, 10.7458615],
    [48, 2, 75.3200734],
    [48, 6, 153.829472],
  ],
} as const;
