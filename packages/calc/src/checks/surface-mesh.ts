/** Area of a surface by small flat triangles: another way to the same number, for checks. Knows no formula of ours. */
export type Point = readonly [x: number, y: number, z: number];

function triangle(a: Point, b: Point, c: Point): number {
  const u = [b[0] - a[0], b[1] - a[1], b[2] - a[2]] as const;
  const v = [c[0] - a[0], c[1] - a[1], c[2] - a[2]] as const;
  return Math.hypot(u[1] * v[2] - u[2] * v[1], u[2] * v[0] - u[0] * v[2], u[0] * v[1] - u[1] * v[0]) / 2;
}

/** Of a surface given by two parameters from 0 to 1. */
export function meshArea(
  at: (u: number, v: number) => Point,
  steps: { readonly u: number; readonly v: number },
): number {
  let area = 0;
  for (let i = 0; i < steps.u; i++) {
    for (let j = 0; j < steps.v; j++) {
      const a = at(i / steps.u, j / steps.v);
      const b = at((i + 1) / steps.u, j / steps.v);
      const c = at((i + 1) / steps.u, (j + 1) / steps.v);
      const d = at(i / steps.u, (j + 1) / steps.v);
      area += triangle(a, b, c) + triangle(a, c, d);
    }
  }
  return area;
}

/** Straight lines from one edge to the other, edge points paired by one parameter. */
export const ruledArea = (from: (t: number) => Point, to: (t: number) => Point, steps: number): number =>
  meshArea(
    (u, v) => {
      const a = from(u);
      const b = to(u);
      return [a[0] + v * (b[0] - a[0]), a[1] + v * (b[1] - a[1]), a[2] + v * (b[2] - a[2])];
    },
    { u: steps, v: 4 },
  );
