/** From rings of points in space to an outline on the flat. */
import type { FlatPoint } from "./flat-pattern.ts";
import type { Point3, WallPoint } from "./outline.ts";

/**
 * The wall of a straight duct that is cut at both ends: unrolled along its girth, from `low` to `high` at each point.
 * Exact but for the steps.
 */
export function unrolled(
  points: readonly WallPoint[],
  low: (p: WallPoint) => number,
  high: (p: WallPoint) => number,
): FlatPoint[] {
  const bottom = points.map((p): FlatPoint => [p.around, low(p)]);
  const top = points.map((p): FlatPoint => [p.around, high(p)]);
  return [...bottom, ...top.toReversed()];
}

/**
 * The wall between two rings whose points pair off, laid flat triangle by triangle: each next point lies where its
 * distances from the last two put it. Exact for flats and single-curved walls as the steps grow finer.
 */
export function triangulated(from: readonly Point3[], to: readonly Point3[]): FlatPoint[] {
  let a: FlatPoint = [0, 0];
  let b: FlatPoint = [0, distance(from[0]!, to[0]!)];
  const low: FlatPoint[] = [a];
  const high: FlatPoint[] = [b];
  for (let i = 0; i + 1 < from.length; i++) {
    const [a0, b0, a1, b1] = [from[i]!, to[i]!, from[i + 1]!, to[i + 1]!];
    a = apex(a, b, distance(a0, a1), distance(b0, a1));
    b = apex(a, b, distance(a1, b1), distance(b0, b1));
    low.push(a);
    high.push(b);
  }
  return [...low, ...high.toReversed()];
}

const distance = (p: Point3, q: Point3): number => Math.hypot(p[0] - q[0], p[1] - q[1], p[2] - q[2]);

/** The point that far from p and that far from q, to the right of the way from p to q. */
function apex(p: FlatPoint, q: FlatPoint, fromP: number, fromQ: number): FlatPoint {
  const [dx, dy] = [q[0] - p[0], q[1] - p[1]];
  const base = Math.hypot(dx, dy);
  if (base === 0) return [p[0] + fromP, p[1]];
  const along = (fromP * fromP - fromQ * fromQ + base * base) / (2 * base);
  const across = Math.sqrt(Math.max(0, fromP * fromP - along * along));
  return [p[0] + (dx * along + dy * across) / base, p[1] + (dy * along - dx * across) / base];
}
