import type { LinearTable } from "../linear-table.ts";

/** Effect of the side ratio and the angle on rectangular elbows: relations of the handbook, not a printed duct table. */
export const rectangularElbowTable = {
  source: "Idelchik, I. E., Handbook of Hydraulic Resistance, 3rd ed., diagrams 6-1 and 6-5; recalled",
  checkedAgainst: "printed tables of radius and mitered elbows, checks/fittings.check.test.ts",
  /** Side ratio H/W, H across the plane of the bend. */
  range: { sideRatio: { from: 0.25, to: 8 } },
  radiusSideRatio: {
    at: [0.25, 0.5, 0.75, 1, 1.5, 2, 3, 4, 5, 6, 8],
    values: [1.3, 1.17, 1.09, 1, 0.9, 0.85, 0.85, 0.9, 0.95, 0.98, 1],
  } satisfies LinearTable,
  squareThroatSideRatio: {
    at: [0.25, 0.5, 0.75, 1, 1.5, 2, 3, 4, 5, 6, 8],
    values: [1.1, 1.07, 1.04, 1, 0.95, 0.9, 0.83, 0.78, 0.75, 0.72, 0.7],
  } satisfies LinearTable,
  /** Factor on Weisbach's miter formula, by angle in degrees. */
  squareThroatAngle: {
    at: [20, 30, 45, 60, 75, 90, 180],
    values: [2.5, 2.22, 1.87, 1.5, 1.28, 1.2, 1.2],
  } satisfies LinearTable,
} as const;
