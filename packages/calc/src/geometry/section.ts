/** What the air sees of a cross-section. All walls that touch the air count: an annulus has two. */
import type { Section } from "../air-system.ts";
import { meters, squareMeters, type Meters, type SquareMeters } from "../quantity.ts";

const QUARTER_PI = Math.PI / 4;

/** Area through which the air flows. The width of a flat oval is its overall width. */
export function sectionArea(section: Section): SquareMeters {
  switch (section.shape) {
    case "round":
      return squareMeters(QUARTER_PI * section.diameter_m * section.diameter_m);
    case "rectangular":
      return squareMeters(section.width_m * section.height_m);
    case "flat-oval":
      return squareMeters(
        QUARTER_PI * section.height_m * section.height_m + section.height_m * (section.width_m - section.height_m),
      );
    case "annular":
      return squareMeters(
        QUARTER_PI *
          (section.outerDiameter_m - section.innerDiameter_m) *
          (section.outerDiameter_m + section.innerDiameter_m),
      );
  }
}

/** Length of wall that the air touches. Both walls of an annulus. */
export function wettedPerimeter(section: Section): Meters {
  switch (section.shape) {
    case "round":
      return meters(Math.PI * section.diameter_m);
    case "rectangular":
      return meters(2 * (section.width_m + section.height_m));
    case "flat-oval":
      return meters(Math.PI * section.height_m + 2 * (section.width_m - section.height_m));
    case "annular":
      return meters(Math.PI * (section.outerDiameter_m + section.innerDiameter_m));
  }
}

/**
 * Diameter on which friction and the Reynolds number are taken.
 *
 *     Dh = 4 A / P
 *
 * For an annulus this is outer less inner diameter. Not the equivalent diameter, which carries the same flow rate.
 *
 * Source   ASHRAE Handbook Fundamentals, duct design; elementary geometry
 */
export const hydraulicDiameter = (area: SquareMeters, perimeter: Meters): Meters => meters((4 * area) / perimeter);

/** Perimeter of the wall between the duct and the room, where leakage goes out: of an annulus the outer one only. */
export const outerPerimeter = (section: Section): Meters =>
  section.shape === "annular" ? meters(Math.PI * section.outerDiameter_m) : wettedPerimeter(section);

/** Longer side over shorter; 1 for round and annular. */
export const aspectRatio = (section: Section): number =>
  section.shape === "rectangular" || section.shape === "flat-oval"
    ? Math.max(section.width_m, section.height_m) / Math.min(section.width_m, section.height_m)
    : 1;

/** Same shape and size to a hundredth of a millimeter: typed inches and typed millimeters meet. */
export function isSameSection(a: Section, b: Section): boolean {
  if (a === b) return true;
  switch (a.shape) {
    case "round":
      return b.shape === "round" && near(a.diameter_m, b.diameter_m);
    case "rectangular":
    case "flat-oval":
      return b.shape === a.shape && near(a.width_m, b.width_m) && near(a.height_m, b.height_m);
    case "annular":
      return (
        b.shape === "annular" &&
        near(a.outerDiameter_m, b.outerDiameter_m) &&
        near(a.innerDiameter_m, b.innerDiameter_m)
      );
  }
}

const near = (left: number, right: number): boolean => Math.abs(left - right) < 1e-5;
