/** The standard sections of a shape, least metal first: perimeter is what a shop buys and cuts. */
import type { Section, SizingRule } from "../air-system.ts";
import { sectionArea, wettedPerimeter } from "../geometry/section.ts";
import { inches, type Meters, type SquareMeters } from "../quantity.ts";
import { flatOvalWidth_in, standardDiameters, standardSizes } from "./standard-sizes.table.ts";

export interface Candidate {
  readonly section: Section;
  readonly area: SquareMeters;
  readonly perimeter: Meters;
  readonly height_m: Meters;
}

const candidate = (section: Section, height_m: Meters): Candidate => ({
  section,
  area: sectionArea(section),
  perimeter: wettedPerimeter(section),
  height_m,
});

const byMetal = (candidates: Candidate[]): readonly Candidate[] =>
  candidates.sort((a, b) => a.perimeter - b.perimeter || b.area - a.area);

function rectangles(): Candidate[] {
  const { side_in, mostAspectRatio } = standardSizes.rectangular;
  return side_in.flatMap((height_in) =>
    side_in
      .filter((width_in) => width_in >= height_in && width_in <= mostAspectRatio * height_in)
      .map((width_in) =>
        candidate({ shape: "rectangular", width_m: inches(width_in), height_m: inches(height_in) }, inches(height_in)),
      ),
  );
}

function flatOvals(): Candidate[] {
  const { height_in: heights, mostAspectRatio } = standardSizes.flatOval;
  return heights.flatMap((height_in) =>
    standardSizes.round.diameter_in
      .map((round_in) => flatOvalWidth_in({ round_in, height_in }))
      .filter((width_in) => width_in > height_in && width_in <= mostAspectRatio * height_in)
      .map((width_in) =>
        candidate({ shape: "flat-oval", width_m: inches(width_in), height_m: inches(height_in) }, inches(height_in)),
      ),
  );
}

export const standardCandidates: Readonly<Record<SizingRule["shape"], readonly Candidate[]>> = {
  round: byMetal(standardDiameters.map((diameter) => candidate({ shape: "round", diameter_m: diameter }, diameter))),
  rectangular: byMetal(rectangles()),
  "flat-oval": byMetal(flatOvals()),
};
