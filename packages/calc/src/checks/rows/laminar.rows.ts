/** Laminar constants f·Re on the hydraulic diameter. */

export const rectangleExact = {
  source: "Shah and London (1978), Laminar Flow Forced Convection in Ducts, ch. VII, exact series",
  standing: "computed",
  relativeTolerance: 1e-6,
  why: "the series converges; the rows are printed to ten digits",
  rows: [
    [0.05, 89.90805238],
    [0.1, 84.67550731],
    [0.125, 82.33857625],
    [0.1666666667, 78.80880567],
    [0.25, 72.93110732],
    [0.4, 65.47240279],
    [0.5, 62.19222459],
    [0.6, 59.91984792],
    [0.75, 57.90278885],
    [0.8, 57.511192],
    [0.9, 57.04392253],
    [1.0, 56.90830754],
  ],
} as const;

export const rectanglePublished = {
  source: "White, Fluid Mechanics, table 6.4",
  standing: "found",
  absoluteTolerance: 0.014,
  why: "half of the last printed digit, but for the row at 0.75, which is printed 0.013 under the exact series; the row printed at 0.167 belongs to 1/6",
  rows: [
    [0.05, 89.91],
    [0.1, 84.68],
    [0.125, 82.34],
    [0.16666666666666666, 78.81],
    [0.25, 72.93],
    [0.4, 65.47],
    [0.5, 62.19],
    [0.75, 57.89],
    [1, 56.91],
  ],
} as const;

export const annulusExact = {
  source: "closed form of the concentric annulus",
  standing: "computed",
  relativeTolerance: 1e-6,
  why: "printed to ten digits",
  rows: [
    [1e-5, 70.08634235],
    [0.0001, 71.78068914],
    [0.001, 74.68352629],
    [0.01, 80.11295655],
    [0.05, 86.26994681],
    [0.1, 89.37184272],
    [0.2, 92.35241243],
    [0.25, 93.20709306],
    [0.4, 94.71331997],
    [0.5, 95.25016064],
    [0.6, 95.58812357],
    [0.8, 95.9205384],
    [0.9, 95.98224898],
    [0.95, 95.99579098],
    [0.99, 95.99983839],
    [1.0, 96.0],
  ],
} as const;

export const flatOvalSolved = {
  source: "Poisson problem on the stadium by least squares with harmonic polynomials",
  standing: "computed",
  relativeTolerance: 0.0001,
  why: "the author's bound on the error",
  rows: [
    [1, 64.0],
    [1.25, 64.306],
    [1.5, 65.2736],
    [2, 68.1089],
    [2.5, 71.0369],
    [3, 73.621],
    [4, 77.6485],
    [5, 80.5233],
    [6, 82.6433],
    [8, 85.5349],
    [10, 87.4053],
  ],
} as const;
