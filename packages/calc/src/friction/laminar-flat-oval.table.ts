import type { LinearTable } from "../linear-table.ts";

/** Laminar constant f·Re of a flat oval (two half circles and a rectangle between), on the hydraulic diameter. */
export const flatOvalLaminarTable = {
  source:
    "Poisson problem on the stadium, solved by least squares with harmonic polynomials; relative error under 1e-4. " +
    "Ends exact: 96 for parallel plates, 64 for a circle.",
  heightOverWidth: {
    at: [0, 1 / 10, 1 / 8, 1 / 6, 1 / 5, 1 / 4, 1 / 3, 1 / 2.5, 1 / 2, 1 / 1.5, 1 / 1.25, 1],
    values: [96, 87.4053, 85.5349, 82.6433, 80.5233, 77.6485, 73.621, 71.0369, 68.1089, 65.2736, 64.306, 64],
  } satisfies LinearTable,
} as const;
