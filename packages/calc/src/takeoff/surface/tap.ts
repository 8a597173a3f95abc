/** Surface of branches that sit on a main: collars, cones and shoes, trimmed where the main's wall is round. */
import type { Section } from "../../air-system.ts";
import { meters, radians, squareMeters, type Meters, type Radians, type SquareMeters } from "../../quantity.ts";
import { makingTable } from "../making.table.ts";
import { girth, outerWall, stadiumOf } from "./girth.ts";
import { integrate } from "./integrate.ts";

/** How far the main's wall stands from its center line, and how it bends away from the branch. Flat: no radius. */
export interface MainWall {
  readonly distance: Meters;
  readonly radius: Meters | null;
}

/** `vertical`: the branch leaves up or down. A flat oval is met on its flat from above and on its round end from the side. */
export function wallOfMain(main: Section, vertical: boolean): MainWall {
  const wall = outerWall(main);
  switch (wall.shape) {
    case "round":
      return { distance: meters(wall.diameter_m / 2), radius: meters(wall.diameter_m / 2) };
    case "rectangular":
      return { distance: meters((vertical ? wall.height_m : wall.width_m) / 2), radius: null };
    case "flat-oval": {
      const { radius } = stadiumOf(wall);
      return { distance: meters((vertical ? wall.height_m : wall.width_m) / 2), radius: vertical ? null : radius };
    }
  }
}

/**
 * Collar from the main's wall, at any angle to it.
 *
 *     flat wall   A = P L                       the oblique cut goes through the girth's center
 *     round wall  A = P T − ∮ √(R² − x²) ds / sin φ,   T = R / sin φ + L
 *
 * For a round collar that is 2 π r T − 4 r R E(r²/R²) / sin φ. Where the collar is as wide as the main, it meets the
 * main's middle.
 *
 * Source   geometry
 */
export function collarSurface(branch: Section, wall: MainWall, angle: Radians, length: Meters): SquareMeters {
  const around = girth(branch);
  if (wall.radius === null) return squareMeters(around * length);
  const sine = Math.sin(angle);
  const radius = wall.radius;
  const toWall = radius / sine + length;
  return squareMeters(around * toWall - aroundGirth(branch, (x) => rise(radius, x)) / sine);
}

/** Height of a round main's wall over its center line, that far from its middle. */
export const rise = (radius: number, x: number): number => Math.sqrt(Math.max(0, radius * radius - x * x));

/** ∮ f(x) ds, x across the main's axis: the height of a branch that leaves sideways. */
function aroundGirth(branch: Section, of: (x: number) => number): number {
  if (branch.shape === "annular") {
    return aroundGirth(outerWall(branch), of) + aroundGirth({ shape: "round", diameter_m: branch.innerDiameter_m }, of);
  }
  if (branch.shape === "rectangular") {
    const half = branch.height_m / 2;
    return 2 * integrate(of, -1 * half, half) + 2 * branch.width_m * of(half);
  }
  const { radius, halfFlat } = stadiumOf(branch);
  const ends = 4 * radius * integrate((t) => of(radius * Math.sin(t)), 0, Math.PI / 2);
  return ends + 4 * halfFlat * of(radius);
}

/**
 * Conical tap: wider at the main by the table's spread. On a round main the cone is trimmed by the main's wall.
 *
 *     A = ∮ ∫ r(z) √(1 + k²) dz dφ,   r(z) = rt + k (T − z)
 *
 * Source   geometry; on a flat wall the frustum π (r1 + r2) √(h² + (r1 − r2)²)
 */
export function coneSurface(branch: Section, wall: MainWall, height: Meters, spread: Meters): SquareMeters {
  const { top, base, k, end, trimmedAt } = coneProfile(branch, wall, height, spread);
  if (wall.radius === null) return squareMeters(Math.PI * (top + base) * Math.hypot(height, base - top));
  // From the trimmed edge at z0 to the end: ∫ (top + k (end − z)) dz.
  const stripe = (phi: number) => {
    const depth = end - trimmedAt(phi);
    return top * depth + (k * depth * depth) / 2;
  };
  return squareMeters(4 * Math.hypot(1, k) * integrate(stripe, 0, Math.PI / 2, 64));
}

/** The cone's wall by height over the main's center line, or over a flat wall: how wide it is, and where it begins. */
export function coneProfile(branch: Section, wall: MainWall, height: Meters, spread: Meters) {
  const { radius: top } = stadiumOf(roundOf(branch));
  const base = top + spread / 2;
  const k = (base - top) / height;
  const main = wall.radius;
  const end = (main ?? 0) + height;
  return {
    top,
    base,
    k,
    end,
    radiusAt: (z: number): number => top + k * (end - z),
    /** At a turn around its axis, from across the main. */
    trimmedAt: (phi: number): number => (main === null ? 0 : trimmed({ main, top, end, k, cosine: Math.cos(phi) })),
  };
}

/** Where the cone's wall meets the main: (r(z) cos φ)² + z² = R². A cone wider than its main ends at the middle. */
function trimmed(cone: { main: number; top: number; end: number; k: number; cosine: number }): number {
  const { main, top, end, k, cosine } = cone;
  const square = cosine * cosine;
  const base = top + k * end;
  const a = 1 + k * k * square;
  const b = -2 * base * k * square;
  const c = base * base * square - main * main;
  const discriminant = b * b - 4 * a * c;
  return discriminant <= 0 ? 0 : Math.max(0, (-b + Math.sqrt(discriminant)) / (2 * a));
}

/** The round duct that a cone can only be: of an oval the circle of the same girth. */
const roundOf = (branch: Section): Extract<Section, { shape: "round" }> =>
  branch.shape === "round" ? branch : { shape: "round", diameter_m: meters(girth(outerWall(branch)) / Math.PI) };

export const shoeEntry = (widthAlongMain: Meters): Meters =>
  meters(Math.max(makingTable.shoeEntry.least, makingTable.shoeEntry.share * widthAlongMain));

/**
 * Shoe tap: a collar with a 45° entry on one side, on a flat wall.
 *
 *     A = 2 Wb L + e² + 2 Hb L + Hb e (√2 − 1)
 *
 * Wb lies along the main. On a round main the wall's drop comes on top, as for a collar.
 *
 * Range    e ≤ L
 * Source   geometry
 */
export function shoeSurface(
  branch: Extract<Section, { shape: "rectangular" }>,
  wall: MainWall,
  length: Meters,
  entry: Meters,
): SquareMeters {
  const { width_m: along, height_m: across } = branch;
  const flat = 2 * along * length + entry * entry + 2 * across * length + across * entry * (Math.SQRT2 - 1);
  const drop = collarSurface(branch, wall, RIGHT_ANGLE, length) - girth(branch) * length;
  return squareMeters(flat + drop);
}

const RIGHT_ANGLE = radians(Math.PI / 2);
