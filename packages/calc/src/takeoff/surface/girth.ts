/** Outline of a sheet-metal section as straight sides and round ends, so that one formula serves every shape. */
import type { Section } from "../../air-system.ts";
import { sectionArea, wettedPerimeter } from "../../geometry/section.ts";
import { meters, squareMeters, type Meters, type SquareMeters } from "../../quantity.ts";

/** Metal around a section: both walls of an annulus. */
export const girth = (section: Section): Meters => wettedPerimeter(section);

/** What a cap or an opening covers: of an annulus the whole of the outer circle, for its inner duct ends there too. */
export const coveredArea = (section: Section): SquareMeters =>
  section.shape === "annular"
    ? sectionArea({ shape: "round", diameter_m: section.outerDiameter_m })
    : sectionArea(section);

/** Two half circles of this radius, their centers this far from the axis along the width. Round: no distance. */
export interface Stadium {
  readonly radius: Meters;
  readonly halfFlat: Meters;
}

/** A flat oval lies: its width is the major axis, as `solve` insists. */
export function stadiumOf(section: Exclude<Section, { shape: "rectangular" }>): Stadium {
  switch (section.shape) {
    case "round":
      return { radius: meters(section.diameter_m / 2), halfFlat: meters(0) };
    case "annular":
      return { radius: meters(section.outerDiameter_m / 2), halfFlat: meters(0) };
    case "flat-oval":
      return { radius: meters(section.height_m / 2), halfFlat: meters((section.width_m - section.height_m) / 2) };
  }
}

export const outerWall = (section: Section): Exclude<Section, { shape: "annular" }> =>
  section.shape === "annular" ? { shape: "round", diameter_m: section.outerDiameter_m } : section;

/** The wall inside an annulus, or none. */
export const innerWall = (section: Section): Extract<Section, { shape: "round" }> | null =>
  section.shape === "annular" ? { shape: "round", diameter_m: section.innerDiameter_m } : null;

/** Length of a wall of constant section along its center line. Exact for straight, mitered and radius pieces. */
export const ductSurface = (section: Section, centerLine: Meters): SquareMeters =>
  squareMeters(girth(section) * centerLine);
