/** Surfaces of fittings against worked values, and against a mesh of small triangles over all sizes. */
import fc from "fast-check";
import { describe, expect, it } from "vitest";
import type { Section } from "../air-system.ts";
import { METERS_PER_INCH, inches, radians, squareMeters, type SquareMeters } from "../quantity.ts";
import { makingTable } from "../takeoff/making.table.ts";
import { capSurface, plenumSurface } from "../takeoff/surface/body.ts";
import {
  goredElbowSurface,
  radiusElbowParts,
  radiusElbowSurface,
  squareElbowSurface,
  vaneCount,
  vaneSurface,
} from "../takeoff/surface/elbow.ts";
import { ductSurface, girth, stadiumOf } from "../takeoff/surface/girth.ts";
import { collarSurface, coneSurface, shoeSurface, wallOfMain } from "../takeoff/surface/tap.ts";
import { transitionSurface } from "../takeoff/surface/transition.ts";
import { meshArea, ruledArea, type Point } from "./surface-mesh.ts";

const source = {
  work: "Own derivations with an independent triangulated mesh",
  place: "worked values G01 to G31",
  standing: "computed",
  printedTo_in2: 0.001,
} as const;

const RIGHT_ANGLE = radians(Math.PI / 2);
const rectangle = (width_in: number, height_in: number) =>
  ({ shape: "rectangular", width_m: inches(width_in), height_m: inches(height_in) }) as const;
const round = (diameter_in: number) => ({ shape: "round", diameter_m: inches(diameter_in) }) as const;
const oval = (width_in: number, height_in: number) =>
  ({ shape: "flat-oval", width_m: inches(width_in), height_m: inches(height_in) }) as const;
const squareInches = (area: SquareMeters) => area / METERS_PER_INCH ** 2;

describe(`fitting surfaces as worked: ${source.place}`, () => {
  const worked: readonly (readonly [id: string, fitting: string, area: () => SquareMeters, printed_in2: number])[] = [
    ["G01", "straight 24 × 12, 56.5 in.", () => ductSurface(rectangle(24, 12), inches(56.5)), 4068],
    ["G02", "radius elbow 24 × 12", () => radiusElbowSurface(rectangle(24, 12), RIGHT_ANGLE, inches(36)), 4071.504],
    [
      "G03",
      "radius elbow the hard way",
      () => radiusElbowSurface(rectangle(12, 24), RIGHT_ANGLE, inches(12)),
      1357.168,
    ],
    [
      "G05",
      "square-throat elbow, 4 in. legs",
      () => squareElbowSurface(rectangle(24, 12), RIGHT_ANGLE, inches(24)),
      2304,
    ],
    [
      "G07",
      "turning vanes",
      () => vaneSurface({ planeSide: inches(24), acrossSide: inches(12), angle: RIGHT_ANGLE }),
      565.487,
    ],
    [
      "G13",
      "transition 30 × 20 to 20 × 16",
      () => transitionSurface(rectangle(30, 20), rectangle(20, 16), inches(24)),
      2086.71,
    ],
    [
      "G09",
      "angled offset: a transition of one size with its center moved",
      () => transitionSurface(rectangle(20, 14), rectangle(20, 14), inches(36), { x_m: inches(10), y_m: 0 }),
      2486.166,
    ],
    [
      "G10",
      "ogee offset of two equal arcs, 12 in. over 48 in.",
      () => squareMeters(2 * radiusElbowSurface(rectangle(20, 14), radians(2 * Math.atan(12 / 48)), inches(51))),
      3398.344,
    ],
    ["G15", "24 × 12 to 16 round", () => transitionSurface(rectangle(24, 12), round(16), inches(18)), 1119.629],
    ["G17", "straight 14 round, 10 ft", () => ductSurface(round(14), inches(120)), 5277.876],
    ["G18", "reducer 20 to 14", () => transitionSurface(round(20), round(14), inches(12)), 660.609],
    ["G20", "gored elbow of 5 pieces", () => goredElbowSurface(round(16), RIGHT_ANGLE, inches(24), 5), 1919.698],
    ["G21", "gored elbow of 4 pieces", () => goredElbowSurface(round(10), RIGHT_ANGLE, inches(15), 4), 757.608],
    [
      "G23",
      "tap 10 on 20 round",
      () => collarSurface(round(10), wallOfMain(round(20), false), RIGHT_ANGLE, inches(6)),
      209.162,
    ],
    [
      "G25",
      "conical tap on a flat wall",
      () => coneSurface(round(10), wallOfMain(rectangle(24, 24), false), inches(6), inches(4)),
      238.43,
    ],
    [
      "G26",
      "shoe tap",
      () => shoeSurface(rectangle(12, 10), wallOfMain(rectangle(24, 24), false), inches(8), inches(4)),
      384.569,
    ],
    ["G28", "straight flat oval 26 × 10", () => ductSurface(oval(26, 10), inches(60)), 3804.956],
    [
      "G30",
      "plenum less three openings",
      () =>
        plenumSurface({ width_m: inches(48), height_m: inches(30), length_m: inches(36) }, [
          rectangle(24, 12),
          rectangle(20, 14),
          rectangle(18, 18),
        ]),
      7604,
    ],
    ["G29", "end cap 24 × 12", () => capSurface(rectangle(24, 12)), 360],
  ];

  it.each(worked)("%s %s", (_id, _fitting, area, printed_in2) => {
    // Half of the last printed digit; integrals of ours add less than that again.
    expect(Math.abs(squareInches(area()) - printed_in2)).toBeLessThan(source.printedTo_in2);
  });

  it("G02 has the cheeks, throat and heel that are cut", () => {
    const parts = radiusElbowParts({
      planeSide: inches(24),
      acrossSide: inches(12),
      angle: RIGHT_ANGLE,
      centerRadius: inches(36),
    });
    expect(squareInches(parts.cheeks)).toBeCloseTo(2714.336, 2);
    expect(squareInches(parts.throat)).toBeCloseTo(452.389, 2);
    expect(squareInches(parts.heel)).toBeCloseTo(904.779, 2);
  });

  it("G07 has 15 vanes across 24 in.", () => {
    expect(vaneCount(inches(24))).toBe(15);
  });

  it("G31 a wye is two radius elbows back to back", () => {
    const leg = radiusElbowSurface(rectangle(15, 16), RIGHT_ANGLE, inches(12 + 7.5));
    expect(Math.abs(2 * squareInches(leg) - 3798.186)).toBeLessThan(source.printedTo_in2);
  });
});

describe("fitting surfaces against a mesh", () => {
  const side = fc.double({ min: 4, max: 60, noNaN: true });
  const length = fc.double({ min: 6, max: 60, noNaN: true });
  const section: fc.Arbitrary<Exclude<Section, { shape: "annular" }>> = fc.oneof(
    fc.tuple(side, side).map(([width, height]) => rectangle(width, height)),
    side.map(round),
    fc.tuple(side, side).map(([a, b]) => oval(Math.max(a, b), Math.min(a, b))),
  );

  it("any two sections make a transition of the mesh's area", () => {
    fc.assert(
      fc.property(section, section, length, (from, to, long) => {
        const exact = transitionSurface(from, to, inches(long));
        expect(Math.abs(exact - transitionMesh(from, to, inches(long))) / exact).toBeLessThan(2e-3);
      }),
      { numRuns: 200 },
    );
  });

  it("any two sections make an eccentric transition of the mesh's area", () => {
    const move = fc.double({ min: -20, max: 20, noNaN: true });
    fc.assert(
      fc.property(section, section, length, move, move, (from, to, long, x, y) => {
        const shift = { x_m: inches(x), y_m: inches(y) };
        const exact = transitionSurface(from, to, inches(long), shift);
        expect(Math.abs(exact - eccentricMesh(from, to, inches(long), shift)) / exact).toBeLessThan(2e-3);
      }),
      { numRuns: 100 },
    );
  });

  it("a transition is the same from either end", () => {
    fc.assert(
      fc.property(section, section, length, (from, to, long) => {
        const there = transitionSurface(from, to, inches(long));
        expect(transitionSurface(to, from, inches(long))).toBeCloseTo(there, 9);
      }),
    );
  });

  it("a transition that changes nothing is straight duct", () => {
    fc.assert(
      fc.property(section, length, (same, long) => {
        expect(transitionSurface(same, same, inches(long))).toBeCloseTo(ductSurface(same, inches(long)), 9);
      }),
    );
  });

  it("a smooth elbow is a turned girth", () => {
    fc.assert(
      fc.property(
        side,
        fc.double({ min: 0.2, max: 3, noNaN: true }),
        fc.double({ min: 0.8, max: 3, noNaN: true }),
        (diameter, angle, ratio) => {
          const center = ratio * inches(diameter);
          const radius = inches(diameter) / 2;
          const mesh = meshArea(
            (u, v) => {
              const around = 2 * Math.PI * u;
              const out = center + radius * Math.cos(around);
              return [out * Math.cos(angle * v), out * Math.sin(angle * v), radius * Math.sin(around)];
            },
            { u: 96, v: 96 },
          );
          const exact = radiusElbowSurface(round(diameter), radians(angle), inches(ratio * diameter));
          expect(Math.abs(exact - mesh) / exact).toBeLessThan(2e-3);
        },
      ),
      { numRuns: 40 },
    );
  });

  it("gores come down to the smooth elbow as their number grows", () => {
    const smooth = radiusElbowSurface(round(16), RIGHT_ANGLE, inches(24));
    expect(goredElbowSurface(round(16), RIGHT_ANGLE, inches(24), 5)).toBeGreaterThan(smooth);
    expect(goredElbowSurface(round(16), RIGHT_ANGLE, inches(24), 400)).toBeCloseTo(smooth, 5);
  });

  it("a tap on a round main is trimmed by its wall, whatever its shape", () => {
    fc.assert(
      fc.property(section, fc.double({ min: 1.1, max: 4, noNaN: true }), length, (branch, larger, long) => {
        const main = round((larger * acrossMain(branch)) / METERS_PER_INCH);
        const wall = wallOfMain(main, false);
        const exact = collarSurface(branch, wall, RIGHT_ANGLE, inches(long));
        const radius = main.diameter_m / 2;
        const end = radius + inches(long);
        const edge = outlineOf(branch);
        const mesh = ruledArea(
          (t) => [edge(t)[0], edge(t)[1], Math.sqrt(radius ** 2 - edge(t)[1] ** 2)],
          (t) => [edge(t)[0], edge(t)[1], end],
          2000,
        );
        expect(Math.abs(exact - mesh) / exact).toBeLessThan(2e-3);
      }),
      { numRuns: 100 },
    );
  });

  it("a slanted collar on a round main is trimmed by its wall", () => {
    fc.assert(
      fc.property(
        side,
        fc.double({ min: 1.2, max: 4, noNaN: true }),
        fc.double({ min: 0.5, max: 1.57, noNaN: true }),
        (diameter, larger, angle) => {
          const main = round(larger * diameter);
          const collar = inches(10 + diameter / 2 / Math.tan(angle));
          const exact = collarSurface(round(diameter), wallOfMain(main, false), radians(angle), collar);
          const radius = main.diameter_m / 2;
          const own = inches(diameter) / 2;
          // The branch's axis leans along the main: points of its wall lie on lines along that axis.
          const axis: Point = [Math.cos(angle), 0, Math.sin(angle)];
          const end = radius / Math.sin(angle) + collar;
          const rim = (t: number): Point => {
            const phi = 2 * Math.PI * t;
            return [-own * Math.cos(phi) * Math.sin(angle), own * Math.sin(phi), own * Math.cos(phi) * Math.cos(angle)];
          };
          const along = (p: Point, by: number): Point => [p[0] + by * axis[0], p[1], p[2] + by * axis[2]];
          const mesh = ruledArea(
            (t) => {
              const p = rim(t);
              return along(p, (Math.sqrt(radius ** 2 - p[1] ** 2) - p[2]) / axis[2]);
            },
            (t) => along(rim(t), end),
            1000,
          );
          expect(Math.abs(exact - mesh) / exact).toBeLessThan(2e-3);
        },
      ),
      { numRuns: 60 },
    );
  });

  it("a conical tap on a round main is trimmed by its wall", () => {
    fc.assert(
      fc.property(side, fc.double({ min: 1.5, max: 4, noNaN: true }), (diameter, larger) => {
        const spread = makingTable.coneSpread;
        const height = makingTable.tapCollar;
        const base = inches(diameter) / 2 + spread / 2;
        const radius = larger * base;
        const wall = { distance: inches(radius / METERS_PER_INCH), radius: inches(radius / METERS_PER_INCH) };
        const exact = coneSurface(round(diameter), wall, height, spread);
        const end = radius + height;
        const slope = spread / 2 / height;
        const ringAt = (z: number) => inches(diameter) / 2 + slope * (end - z);
        // Where the cone's wall dips into the main: coming down from its end, then by halving.
        const isOutside = (phi: number, z: number) => (ringAt(z) * Math.cos(phi)) ** 2 + z ** 2 > radius ** 2;
        const trim = (phi: number) => {
          let above = end;
          while (above > 0 && isOutside(phi, above - end / 200)) above -= end / 200;
          let below = above - end / 200;
          for (let i = 0; i < 40; i++) {
            const middle = (above + below) / 2;
            if (isOutside(phi, middle)) above = middle;
            else below = middle;
          }
          return above;
        };
        const point = (phi: number, z: number): Point => [ringAt(z) * Math.cos(phi), ringAt(z) * Math.sin(phi), z];
        const mesh = ruledArea(
          (t) => point(2 * Math.PI * t, trim(2 * Math.PI * t)),
          (t) => point(2 * Math.PI * t, end),
          400,
        );
        expect(Math.abs(exact - mesh) / exact).toBeLessThan(2e-3);
      }),
      { numRuns: 30 },
    );
  });
});

/** Across the main's axis, of a branch that leaves sideways. */
const acrossMain = (branch: Exclude<Section, { shape: "annular" }>): number =>
  branch.shape === "round" ? branch.diameter_m : branch.height_m;

/** Once around, as x along the width and y along the height, at even steps of each part. */
function outlineOf(section: Exclude<Section, { shape: "annular" }>): (t: number) => readonly [number, number] {
  if (section.shape === "rectangular") {
    const [a, b] = [section.width_m / 2, section.height_m / 2];
    const corners = [
      [a, b],
      [-a, b],
      [-a, -b],
      [a, -b],
      [a, b],
    ] as const;
    return (t) => {
      const at = Math.min(3, Math.floor(4 * t));
      const share = 4 * t - at;
      const [p, q] = [corners[at]!, corners[at + 1]!];
      return [p[0] + share * (q[0] - p[0]), p[1] + share * (q[1] - p[1])];
    };
  }
  const { radius, halfFlat } = stadiumOf(section);
  // Four parts: half circle, flat, half circle, flat.
  return (t) => {
    const at = Math.min(3, Math.floor(4 * t));
    const share = 4 * t - at;
    const turn = Math.PI * (share - 0.5);
    return [
      [halfFlat + radius * Math.cos(turn), radius * Math.sin(turn)],
      [halfFlat - 2 * halfFlat * share, radius],
      [-1 * halfFlat - radius * Math.cos(turn), -1 * radius * Math.sin(turn)],
      [-1 * halfFlat + 2 * halfFlat * share, -1 * radius],
    ][at] as [number, number];
  };
}

/**
 * The walls of a transition in one quarter, twice mirrored: each straight edge to the other end's nearest point, each arc
 * to the other end's arc or corner by the same turn.
 */
function transitionMesh(
  from: Exclude<Section, { shape: "annular" }>,
  to: Exclude<Section, { shape: "annular" }>,
  long: number,
): number {
  const [a, b] = [quarterOf(from), quarterOf(to)];
  const flat = (
    p: readonly [number, number],
    q: readonly [number, number],
    ends: readonly [readonly [number, number], readonly [number, number]],
  ) =>
    ruledArea(
      (t) => [p[0] + t * (q[0] - p[0]), p[1] + t * (q[1] - p[1]), 0],
      (t) => [ends[0][0] + t * (ends[1][0] - ends[0][0]), ends[0][1] + t * (ends[1][1] - ends[0][1]), long],
      8,
    );
  const top = flat(
    [0, a.top],
    [a.center[0], a.top],
    [
      [0, b.top],
      [b.center[0], b.top],
    ],
  );
  const right = flat(
    [a.right, 0],
    [a.right, a.center[1]],
    [
      [b.right, 0],
      [b.right, b.center[1]],
    ],
  );
  const corner = ruledArea(
    (t) => [
      a.center[0] + a.radius * Math.cos((t * Math.PI) / 2),
      a.center[1] + a.radius * Math.sin((t * Math.PI) / 2),
      0,
    ],
    (t) => [
      b.center[0] + b.radius * Math.cos((t * Math.PI) / 2),
      b.center[1] + b.radius * Math.sin((t * Math.PI) / 2),
      long,
    ],
    400,
  );
  return 4 * (top + right + corner);
}

/**
 * The same with the far end moved: all four quarters, each arc to the arc of the same turn, with the flats between them
 * coming of themselves, for one ring of points runs through all of it.
 */
function eccentricMesh(
  from: Exclude<Section, { shape: "annular" }>,
  to: Exclude<Section, { shape: "annular" }>,
  long: number,
  shift: { readonly x_m: number; readonly y_m: number },
): number {
  const rings = [quarterOf(from), quarterOf(to)].map(({ center, radius }, end) =>
    [0, 1, 2, 3].flatMap((turn) => {
      const [signX, signY] = [turn === 0 || turn === 3 ? 1 : -1, turn < 2 ? 1 : -1];
      return Array.from({ length: 101 }, (_, i): Point => {
        const t = ((turn + i / 100) * Math.PI) / 2;
        return [
          end * shift.x_m + signX * center[0] + radius * Math.cos(t),
          end * shift.y_m + signY * center[1] + radius * Math.sin(t),
          end * long,
        ];
      });
    }),
  );
  const [near, far] = rings as [Point[], Point[]];
  const at = (ring: Point[], i: number) => ring[i % ring.length]!;
  let area = 0;
  for (let i = 0; i < near.length; i++) {
    const between =
      (ring: Point[]) =>
      (t: number): Point => {
        const [p, q] = [at(ring, i), at(ring, i + 1)];
        return [p[0] + t * (q[0] - p[0]), p[1] + t * (q[1] - p[1]), p[2] + t * (q[2] - p[2])];
      };
    area += ruledArea(between(near), between(far), 1);
  }
  return area;
}

/** A rectangle's corner is an arc of no radius. */
function quarterOf(section: Exclude<Section, { shape: "annular" }>) {
  if (section.shape === "rectangular") {
    const [x, y] = [section.width_m / 2, section.height_m / 2];
    return { center: [x, y], radius: 0, top: y, right: x } as const;
  }
  const { radius, halfFlat } = stadiumOf(section);
  return { center: [halfFlat, 0], radius, top: radius, right: halfFlat + radius } as const;
}

it("girth is what a section's outline measures", () => {
  const outline = outlineOf(oval(26, 10));
  let measured = 0;
  for (let i = 0; i < 4000; i++) {
    const [p, q] = [outline(i / 4000), outline((i + 1) / 4000)];
    measured += Math.hypot(q[0] - p[0], q[1] - p[1]);
  }
  expect(measured).toBeCloseTo(girth(oval(26, 10)), 5);
});
