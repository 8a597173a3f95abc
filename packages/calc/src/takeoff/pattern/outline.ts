/** Walls of a section walked once around, in small steps. */
import type { Section } from "../../air-system.ts";
import { innerWall, outerWall, stadiumOf } from "../surface/girth.ts";

/** Steps of a quarter turn. */
export const ARC_STEPS = 24;
const SIDE_STEPS = 16;

type Wall = ReturnType<typeof outerWall>;

/** A point of the wall: x along the width, y along the height, and how far around it lies. */
export interface WallPoint {
  readonly x: number;
  readonly y: number;
  readonly around: number;
}

/** Both walls of an annulus, one of any other section. */
export function wallsOf(section: Section): readonly Wall[] {
  const inner = innerWall(section);
  return inner ? [outerWall(section), inner] : [outerWall(section)];
}

/** Once around and back to the start, with exact distances: arcs count as arcs, not as their chords. */
export function walkAround(wall: Wall): readonly WallPoint[] {
  const points: WallPoint[] = [];
  let around = 0;
  const ring = wall.shape === "rectangular" ? null : stadiumOf(wall);
  if (!ring) {
    const { width_m, height_m } = wall as Extract<Wall, { shape: "rectangular" }>;
    const [a, b] = [width_m / 2, height_m / 2];
    const corners = [
      [-a, -b],
      [a, -b],
      [a, b],
      [-a, b],
      [-a, -b],
    ] as const;
    points.push({ x: -a, y: -b, around });
    for (let side = 0; side < 4; side++) {
      const [x0, y0] = corners[side]!;
      const [x1, y1] = corners[side + 1]!;
      const length = Math.hypot(x1 - x0, y1 - y0);
      for (let i = 1; i <= SIDE_STEPS; i++) {
        const t = i / SIDE_STEPS;
        points.push({ x: x0 + t * (x1 - x0), y: y0 + t * (y1 - y0), around: around + t * length });
      }
      around += length;
    }
    return points;
  }
  const { radius, halfFlat } = ring;
  const quarter = (Math.PI / 2) * radius;
  points.push({ x: halfFlat + radius, y: 0, around: 0 });
  for (let turn = 0; turn < 4; turn++) {
    const center = turn === 0 || turn === 3 ? halfFlat : -1 * halfFlat;
    // The flat on top comes after the first quarter, the one below after the third.
    for (let i = 1; i <= ARC_STEPS; i++) {
      const t = (turn + i / ARC_STEPS) * (Math.PI / 2);
      points.push({
        x: center + radius * Math.cos(t),
        y: radius * Math.sin(t),
        around: around + (i / ARC_STEPS) * quarter,
      });
    }
    around += quarter;
    if (halfFlat > 0 && turn % 2 === 0) {
      around += 2 * halfFlat;
      points.push({ x: -1 * center, y: turn === 0 ? radius : -1 * radius, around });
    }
  }
  return points;
}

export type Point3 = readonly [x: number, y: number, z: number];

/**
 * A ring of points of which any two, of any sections, pair off: the same number in each corner. A rectangle's corner is
 * an arc of no radius, a circle's four arcs have one center.
 */
export function pairedRing(wall: Wall, z: number, shift: { readonly x_m: number; readonly y_m: number }): Point3[] {
  const stadium = wall.shape === "rectangular" ? null : stadiumOf(wall);
  const radius = stadium ? stadium.radius : 0;
  const half = wall.shape === "rectangular" ? { x: wall.width_m / 2, y: wall.height_m / 2 } : null;
  const centerX = half ? half.x : (stadium?.halfFlat ?? 0);
  const centerY = half ? half.y : 0;
  const points: Point3[] = [];
  for (let turn = 0; turn < 4; turn++) {
    const signX = turn === 0 || turn === 3 ? 1 : -1;
    const signY = turn < 2 ? 1 : -1;
    for (let i = 0; i <= ARC_STEPS; i++) {
      const t = (turn + i / ARC_STEPS) * (Math.PI / 2);
      points.push([
        shift.x_m + signX * centerX + radius * Math.cos(t),
        shift.y_m + signY * centerY + radius * Math.sin(t),
        z,
      ]);
    }
  }
  points.push(points[0]!);
  return points;
}
