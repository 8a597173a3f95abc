/**
 * The full pattern of a square-to-round by triangulation, seam on the short line: the picture beside the sign-in form is
 * computed, like every other drawing here. Lengths in inches, before allowance.
 */
interface Solid {
  readonly x: number;
  readonly y: number;
  readonly z: number;
}
export interface Flat {
  readonly x: number;
  readonly y: number;
}
export interface Line {
  readonly from: Flat;
  readonly to: Flat;
  readonly length: number;
}

export interface Pattern {
  /** Around the sheet, in order. */
  readonly outline: readonly Flat[];
  readonly bends: readonly Line[];
  readonly sides: readonly Line[];
}

const distance = (a: Solid, b: Solid) => Math.hypot(a.x - b.x, a.y - b.y, a.z - b.z);

/** The third corner of a triangle, to the right of the way from p to q. */
function third(p: Flat, q: Flat, fromP: number, fromQ: number): Flat {
  const base = Math.hypot(q.x - p.x, q.y - p.y);
  const along = (fromP ** 2 - fromQ ** 2 + base ** 2) / (2 * base);
  const across = Math.sqrt(Math.max(0, fromP ** 2 - along ** 2));
  const ux = (q.x - p.x) / base;
  const uy = (q.y - p.y) / base;
  return { x: p.x + along * ux + across * uy, y: p.y + along * uy - across * ux };
}

export function squareToRound(size: { width: number; depth: number; diameter: number; height: number }): Pattern {
  const { width, depth, diameter, height } = size;
  const front: Solid = { x: width / 2, y: -depth / 2, z: 0 };
  const back: Solid = { x: width / 2, y: depth / 2, z: 0 };
  const seam: Solid = { x: 0, y: depth / 2, z: 0 };
  const ring = Array.from({ length: 9 }, (_, i): Solid => {
    const angle = -Math.PI / 2 + (i * Math.PI) / 8;
    return { x: (diameter / 2) * Math.cos(angle), y: (diameter / 2) * Math.sin(angle), z: height };
  });

  // The right half, from the middle of the long side to the seam; the left half is its mirror.
  const corner1: Flat = { x: width / 2, y: 0 };
  const start = ring[0] as Solid;
  const flatRing: Flat[] = [{ x: 0, y: -Math.sqrt(distance(start, front) ** 2 - (width / 2) ** 2) }];
  const bends: Line[] = [];
  const walk = (corner: Solid, at: Flat, from: number, to: number) => {
    for (let i = from; i <= to; i++) {
      const here = ring[i] as Solid;
      if (i > from) {
        const before = flatRing[i - 1] as Flat;
        const next = third(before, at, distance(ring[i - 1] as Solid, here), distance(corner, here));
        // The next point of the ring lies on the far side of the line from the last one to the corner.
        flatRing[i] = mirrored(before, at, next);
      }
      bends.push({ from: at, to: flatRing[i] as Flat, length: distance(corner, here) });
    }
  };
  const mirrored = (p: Flat, q: Flat, point: Flat): Flat => {
    const side = (q.x - p.x) * (point.y - p.y) - (q.y - p.y) * (point.x - p.x);
    if (side <= 0) return point;
    const base = (q.x - p.x) ** 2 + (q.y - p.y) ** 2;
    const t = ((point.x - p.x) * (q.x - p.x) + (point.y - p.y) * (q.y - p.y)) / base;
    return { x: 2 * (p.x + t * (q.x - p.x)) - point.x, y: 2 * (p.y + t * (q.y - p.y)) - point.y };
  };
  walk(front, corner1, 0, 4);
  const middle = flatRing[4] as Flat;
  const corner2 = third(middle, corner1, distance(ring[4] as Solid, back), distance(front, back));
  const outer2 = mirrored(middle, corner1, corner2);
  walk(back, outer2, 4, 8);
  const last = flatRing[8] as Flat;
  const seamLength = distance(ring[8] as Solid, seam);
  const seamEnd = mirrored(last, outer2, third(last, outer2, seamLength, width / 2));

  const mirror = (p: Flat): Flat => ({ x: -p.x, y: p.y });
  const both = (line: Line): Line[] => [line, { from: mirror(line.from), to: mirror(line.to), length: line.length }];
  const right = [corner1, outer2, seamEnd, ...flatRing.slice(1).reverse()];
  return {
    outline: [...right, flatRing[0] as Flat, ...right.slice().reverse().map(mirror)],
    bends: bends.flatMap(both),
    sides: [
      { from: mirror(corner1), to: corner1, length: width },
      ...both({ from: corner1, to: outer2, length: depth }),
      ...both({ from: outer2, to: seamEnd, length: width / 2 }),
      ...both({ from: seamEnd, to: last, length: seamLength }),
    ],
  };
}
