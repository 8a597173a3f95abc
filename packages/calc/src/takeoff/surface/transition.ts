/** Surface of changes of size and of shape: flats between straight edges, cones where an end is round. */
import type { Section } from "../../air-system.ts";
import { meters, squareMeters, type Meters, type Radians, type SquareMeters } from "../../quantity.ts";
import { makingTable } from "../making.table.ts";
import { CONCENTRIC, type Shift } from "../shift.ts";
import { coveredArea, innerWall, outerWall, stadiumOf } from "./girth.ts";
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
export function transitionLength(from: Section, to: Section, totalAngle: Radians, shift: Shift = CONCENTRIC): Meters {
  const a = extent(from);
  const b = extent(to);
  const lean = Math.max(
    Math.abs(a.width - b.width) / 2 + Math.abs(shift.x_m),
    Math.abs(a.height - b.height) / 2 + Math.abs(shift.y_m),
  );
  return meters(Math.max(makingTable.transition.shortest, lean / Math.tan(totalAngle / 2)));
}

/**
 * Surface of a transition between any two sections, concentric or with its center moved.
 *
 * Between straight edges that are parallel a flat; between arcs that turn alike a single-curved wall, whose strips are as
 * high as their tangents lie apart:
 *
 *     A = Σ (la + lb)/2 √(L² + g²) + Σ (ra + rb)/2 ∫ √(L² + g(t)²) dt,   g: how far the edge moves outward
 *
 * The inner wall of an annulus goes on as a cone of its own, or runs through and ends with a cap where the other end has
 * none.
 *
 * Source   geometry; checked against a fine mesh in checks/metal-fittings.check.test.ts
 */
export function transitionSurface(from: Section, to: Section, length: Meters, shift: Shift = CONCENTRIC): SquareMeters {
  const outer = wallBetween(outerWall(from), outerWall(to), length, shift);
  const innerFrom = innerWall(from);
  const innerTo = innerWall(to);
  if (innerFrom && innerTo) return squareMeters(outer + wallBetween(innerFrom, innerTo, length, shift));
  const ending = innerFrom ?? innerTo;
  if (!ending) return squareMeters(outer);
  return squareMeters(outer + Math.PI * ending.diameter_m * length + coveredArea(ending));
}

/** Centers of the corner arcs, their radius, and where the walls stand. A rectangle's corner is an arc of no radius. */
function cornersOf(wall: Rectangle | Rounded) {
  if (wall.shape === "rectangular") return { x: wall.width_m / 2, y: wall.height_m / 2, radius: 0 };
  const { radius, halfFlat } = stadiumOf(wall);
  return { x: halfFlat, y: 0, radius };
}

function wallBetween(from: Rectangle | Rounded, to: Rectangle | Rounded, length: number, shift: Shift): number {
  const a = cornersOf(from);
  const b = cornersOf(to);
  const widening = b.radius - a.radius;
  let area = 0;
  for (const side of SIDES) {
    // Top and bottom run along the width, the others along the height.
    area += (a.x + b.x) * Math.hypot(length, b.y - a.y + widening + side * shift.y_m);
    area += (a.y + b.y) * Math.hypot(length, b.x - a.x + widening + side * shift.x_m);
  }
  const meanRadius = (a.radius + b.radius) / 2;
  if (meanRadius === 0) return area;
  for (const sideX of SIDES) {
    for (const sideY of SIDES) {
      const along = b.x - a.x + sideX * shift.x_m;
      const across = b.y - a.y + sideY * shift.y_m;
      const slant = (t: number) => Math.hypot(length, widening + along * Math.cos(t) + across * Math.sin(t));
      const corner = meanRadius * integrate(slant, 0, Math.PI / 2);
      // Concentric, all four corners are alike.
      if (shift.x_m === 0 && shift.y_m === 0) return area + 4 * corner;
      area += corner;
    }
  }
  return area;
}

const SIDES = [1, -1] as const;
