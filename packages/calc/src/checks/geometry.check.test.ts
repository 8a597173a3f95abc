import { describe, it } from "vitest";
import type { Section } from "../air-system.ts";
import { equivalentDiameterOfFlatOval, equivalentDiameterOfRectangle } from "../geometry/equivalent-diameter.ts";
import { hydraulicDiameter, sectionArea, wettedPerimeter } from "../geometry/section.ts";
import { METERS_PER_INCH, inches } from "../quantity.ts";
import { annular, flatOval, rectangular, round } from "../testing/air-system-builder.ts";
import { expectWithin } from "./expect-within.ts";
import { flatOvalFormula, rectanglePrinted } from "./rows/equivalent-diameter.rows.ts";
import { sectionMeasures } from "./rows/section.rows.ts";

function sectionOf(row: (typeof sectionMeasures.rows)[number]): Section {
  switch (row.shape) {
    case "round":
      return round(inches(row.diameter_in));
    case "rectangular":
      return rectangular(inches(row.width_in), inches(row.height_in));
    case "flat-oval":
      return flatOval(inches(row.width_in), inches(row.height_in));
    case "annular":
      return annular(inches(row.outer_in), inches(row.inner_in));
  }
}

describe("cross-sections", () => {
  it("have the area, wetted perimeter and hydraulic diameter of elementary geometry", () => {
    for (const row of sectionMeasures.rows) {
      const section = sectionOf(row);
      const area = sectionArea(section);
      const perimeter = wettedPerimeter(section);
      expectWithin(area / METERS_PER_INCH ** 2, row.area_in2, sectionMeasures, row);
      expectWithin(perimeter / METERS_PER_INCH, row.perimeter_in, sectionMeasures, row);
      const ours = hydraulicDiameter(area, perimeter) / METERS_PER_INCH;
      expectWithin(ours, row.hydraulicDiameter_in, sectionMeasures, row);
    }
  });
});

describe("equivalent diameters", () => {
  it("of rectangles agree with the printed table", () => {
    for (const [width_in, height_in, printed] of rectanglePrinted.rows) {
      const ours = equivalentDiameterOfRectangle({ width: inches(width_in), height: inches(height_in) });
      const tolerance = { absoluteTolerance: rectanglePrinted.absoluteTolerance_in };
      expectWithin(ours / METERS_PER_INCH, printed, tolerance, [width_in, height_in]);
    }
  });

  it("of flat ovals agree with the formula evaluated independently", () => {
    for (const [width_in, height_in, published] of flatOvalFormula.rows) {
      const section = flatOval(inches(width_in), inches(height_in));
      const ours = equivalentDiameterOfFlatOval({ area: sectionArea(section), perimeter: wettedPerimeter(section) });
      expectWithin(ours / METERS_PER_INCH, published, flatOvalFormula, [width_in, height_in]);
    }
  });
});
