/** Surface of concentric changes of size and of shape: flats between straight edges, cones where an end is round. */
import type { Section } from "../../air-system.ts";
import { meters, squareMeters, type Meters, type Radians, type SquareMeters } from "../../quantity.ts";
import { makingTable } from "../making.table.ts";
import { coveredArea, innerWall, outerWall, stadiumOf, type Stadium } from "./girth.ts";
import { integrate } from "./integrate.ts";

type Rectangle = Extract<Section, { shape: "rectangular" }>;
type Rounded = Exclude<Section, { shape: "rectangular" | "annular" }>;

/** Width and height over all. */
export function extent(section: Section): { readonly width: number; readonly height: number } {
  const wall = outerWall(section);
  return wall.shape === "round"
    ? { width: wall.diameter_m, height: wall.diameter_m }
    : { width: wall.width_m, height: wall.height_m };
}

/** Long enough that no wall leans by more than half the total angle, and to handle. */
export function transitionLength(from: Section, to: Section, totalAngle: Radians): Meters {
  const a = extent(from);
  const b = extent(to);
  const change = Math.max(Math.abs(a.width - b.width), Math.abs(a.height - b.height));
  return meters(Math.max(makingTable.transition.shortest, change / 2 / Math.tan(totalAngle / 2)));
}

/**
 * Surface of a concentric transition between any two sections.
 *
 * The inner wall of an annulus goes on as a cone of its own, or runs through and ends with a cap where the other end has
 * none.
 *
 * Source   geometry; checked against a fine mesh in checks/metal-fittings.check.test.ts
 */
export function transitionSurface(from: Section, to: Section, length: Meters): SquareMeters {
  const outer = wallBetween(outerWall(from), outerWall(to), length);
  const innerFrom = innerWall(from);
  const innerTo = innerWall(to);
  if (innerFrom && innerTo) return squareMeters(outer + wallBetween(innerFrom, innerTo, length));
  const ending = innerFrom ?? innerTo;
  if (!ending) return squareMeters(outer);
  return squareMeters(outer + Math.PI * ending.diameter_m * length + coveredArea(ending));
}

function wallBetween(from: Rectangle | Rounded, to: Rectangle | Rounded, length: number): number {
  if (from.shape === "rectangular") {
    return to.shape === "rectangular"
      ? betweenRectangles(from, to, length)
      : rectangleToStadium(from, stadiumOf(to), length);
  }
  return to.shape === "rectangular"
    ? rectangleToStadium(to, stadiumOf(from), length)
    : betweenStadiums(stadiumOf(from), stadiumOf(to), length);
}

/** Four trapezoids. */
function betweenRectangles(from: Rectangle, to: Rectangle, length: number): number {
  const topSlant = Math.hypot(length, (from.height_m - to.height_m) / 2);
  const sideSlant = Math.hypot(length, (from.width_m - to.width_m) / 2);
  return (from.width_m + to.width_m) * topSlant + (from.height_m + to.height_m) * sideSlant;
}

/** Two flats and two halves of a slanted cone; a round end has no flat. */
function betweenStadiums(from: Stadium, to: Stadium, length: number): number {
  const shift = to.halfFlat - from.halfFlat;
  const widening = to.radius - from.radius;
  const flats = 2 * (from.halfFlat + to.halfFlat) * Math.hypot(length, widening);
  const slant = (t: number) => Math.hypot(length, widening + shift * Math.cos(t));
  // Both halves, each twice from the flat to its middle.
  const ends = 4 * ((from.radius + to.radius) / 2) * integrate(slant, 0, Math.PI / 2);
  return flats + ends;
}

/** In each corner of the rectangle a quarter of a slanted cone with its tip there; between them flats. */
function rectangleToStadium({ width_m, height_m }: Rectangle, end: Stadium, length: number): number {
  const { radius, halfFlat } = end;

  // The long sides run to the oval's flat, the short ones to the middle of its round end.
  const longSides = (width_m + 2 * halfFlat) * Math.hypot(length, height_m / 2 - radius);
  const shortSides = height_m * Math.hypot(length, width_m / 2 - halfFlat - radius);
  const cornerAlong = width_m / 2 - halfFlat;
  const cornerAcross = height_m / 2;
  const fromTip = (t: number) => Math.hypot(length, radius - cornerAlong * Math.cos(t) - cornerAcross * Math.sin(t));
  const corners = 4 * (radius / 2) * integrate(fromTip, 0, Math.PI / 2);
  return longSides + shortSides + corners;
}
