/** Flat patterns against the surfaces of the pieces they make: another way, by outlines, to the same area. */
import fc from "fast-check";
import { describe, expect, it } from "vitest";
import type { AirSystem, ConstructionSpec, FittingType, Section } from "../air-system.ts";
import { METERS_PER_INCH, inches, radians } from "../quantity.ts";
import { patternArea, patternSize } from "../takeoff/pattern/flat-pattern.ts";
import { patternsOf } from "../takeoff/pattern/patterns.ts";
import type { Piece } from "../takeoff/takeoff.ts";
import { aRun, aSystem, annular, oval, plainSpec, rectangular, round, takeoffOf, type DuctOf } from "./metal-system.ts";

/** Chords for arcs, at most 3.75° each, leave out less than this. */
const STEPS = 2e-3;

const laidFlat = (piece: Piece): number | null =>
  patternsOf(piece.body)?.reduce((sum, pattern) => sum + pattern.count * patternArea(pattern), 0) ?? null;

function expectFlat(system: AirSystem): readonly Piece[] {
  const { pieces } = takeoffOf(system);
  for (const piece of pieces) {
    const area = laidFlat(piece);
    if (piece.kind === "flexible" || area === null) continue;
    expect(Math.abs(area - piece.netArea_m2) / piece.netArea_m2, `${piece.mark} ${piece.fitting ?? ""}`).toBeLessThan(
      STEPS,
    );
  }
  return pieces;
}

const typesOf = (pieces: readonly Piece[]) => new Set(pieces.map(({ fitting }) => fitting));

const inch = fc.integer({ min: 6, max: 48 });
const anySection: fc.Arbitrary<Section> = fc.oneof(
  fc.tuple(inch, inch).map(([w, h]) => rectangular(w, h)),
  inch.map(round),
  fc.tuple(fc.integer({ min: 14, max: 40 }), fc.integer({ min: 6, max: 12 })).map(([w, h]) => oval(w, h)),
  fc.tuple(fc.integer({ min: 12, max: 24 }), fc.integer({ min: 4, max: 10 })).map(([o, i]) => annular(o, i)),
);

const bend = (section: Section, y: number, spec: Partial<ConstructionSpec>, fitting: FittingType | null = null) =>
  aSystem(
    [
      { to: "corner", after: "unit", at: [40, 0], section },
      { to: "end", after: "corner", at: [60, y], section, outlet: {}, more: { fitting } },
    ],
    spec,
  );

describe("flat patterns have the area of the surface", () => {
  it("of straights, bends and transitions of any section", () => {
    const spec = fc.record({
      elbow: fc.record({
        rectangular: fc.constantFrom("radius", "radius-splitters", "square-throat", "square-throat-vanes"),
        round: fc.constantFrom("gored", "mitered"),
        radiusRatio: fc.double({ min: 0.75, max: 2, noNaN: true }),
        splitterCount: fc.constantFrom(1, 2, 3),
      }),
      transitionAlignment: fc.constantFrom("centered", "flat-bottom", "flat-top"),
    });
    fc.assert(
      fc.property(anySection, anySection, fc.integer({ min: 5, max: 40 }), spec, (first, second, y, made) => {
        expectFlat(bend(first, y, made));
        expectFlat(
          aSystem(
            [
              { to: "step", after: "unit", at: [40, 0], section: first },
              { to: "end", after: "step", at: [90, 0], section: second, outlet: {} },
            ],
            made,
          ),
        );
      }),
      { numRuns: 120 },
    );
  });

  it("of an offset", () => {
    const pieces = expectFlat(bend(rectangular(20, 14), 10, {}, "offset"));
    expect(typesOf(pieces).has("offset")).toBe(true);
  });

  it("of taps, tees, crosses and wyes on any main", () => {
    const branch = fc.constantFrom(
      { branch: { rectangular: "straight-tap", round: "straight-tap" } } as const,
      { branch: { rectangular: "shoe-tap", round: "conical-tap" } } as const,
      { branch: { rectangular: "shoe-tap", round: "saddle-tap" } } as const,
    );
    const seen = new Set<FittingType | null>();
    fc.assert(
      fc.property(
        fc.constantFrom(rectangular(48, 40), round(48), oval(60, 30)),
        fc.oneof(
          fc.tuple(fc.integer({ min: 6, max: 20 }), fc.integer({ min: 6, max: 20 })).map(([w, h]) => rectangular(w, h)),
          fc.integer({ min: 6, max: 20 }).map(round),
          fc.constant(oval(18, 8)),
          fc.constant(annular(12, 6)),
        ),
        fc.constantFrom(0, 10),
        fc.boolean(),
        branch,
        (main, side, lean, twice, spec) => {
          const legs: DuctOf[] = [{ to: "side", after: "mid", at: [40 + lean, 20], section: side, outlet: {} }];
          if (twice) legs.push({ to: "other", after: "mid", at: [40 + lean, -20], section: side, outlet: {} });
          const system = aSystem(
            [
              { to: "mid", after: "unit", at: [40, 0], section: main },
              { to: "on", after: "mid", at: [80, 0], section: main, outlet: {} },
              ...legs,
            ],
            spec,
          );
          for (const type of typesOf(expectFlat(system))) seen.add(type);
          expectFlat(
            aSystem(
              [
                { to: "mid", after: "unit", at: [40, 0], section: main },
                { to: "side", after: "mid", at: [60, 20], section: side, outlet: {} },
                { to: "other", after: "mid", at: [60, -20], section: side, outlet: {} },
              ],
              spec,
            ),
          );
        },
      ),
      { numRuns: 120 },
    );
    for (const type of ["tap-straight", "tap-shoe", "tap-conical", "tap-saddle", "cross", "wye"] as const) {
      expect(seen.has(type), type).toBe(true);
    }
  });

  it("of a plenum and of end caps", () => {
    const plenum = expectFlat(
      aSystem([
        {
          to: "end",
          after: "unit",
          at: [40, 0],
          section: rectangular(24, 12),
          outlet: {},
          more: { fitting: "plenum" },
        },
      ]),
    );
    expect(typesOf(plenum).has("plenum")).toBe(true);
    for (const section of [rectangular(24, 12), round(16), oval(26, 10)]) {
      const patterns = patternsOf({ kind: "cap", section })!;
      expect(patterns.length).toBeGreaterThan(0);
    }
  });
});

describe("flat patterns as a shop knows them", () => {
  it("a wrapper of 24 × 12 is 72 in. around, with three folds", () => {
    const [straight] = takeoffOf(aRun(rectangular(24, 12), 5)).pieces;
    const [wrapper, ...others] = patternsOf(straight!.body)!;
    expect(others).toEqual([]);
    expect(patternSize(wrapper!).width_m / METERS_PER_INCH).toBeCloseTo(72, 9);
    expect(wrapper!.folds.map(([[x]]) => Math.round(x / METERS_PER_INCH))).toEqual([24, 36, 60]);
  });

  // Closed forms: a frustum unrolls to a ring sector of angle 2π (r1 − r2) / slant.
  it("a reducer unrolls to the sector of its cone", () => {
    const pattern = patternsOf({
      kind: "transition",
      from: round(20),
      to: round(14),
      length_m: inches(12),
      shift: { x_m: 0, y_m: 0 },
    })![0]!;
    const slant = Math.hypot(12, 3);
    const angle = (2 * Math.PI * 3) / slant;
    const [first, last] = [pattern.outline[0]!, pattern.outline[pattern.outline.length / 2 - 1]!];
    const chord = Math.hypot(first[0] - last[0], first[1] - last[1]) / METERS_PER_INCH;
    // Slant to the tip is 10 / 3 of the slant height.
    expect(chord).toBeCloseTo(2 * ((10 / 3) * slant) * Math.sin(angle / 2), 1);
  });

  it("a gored elbow of N pieces has 2 (N − 1) half gores: trap of counting N gores", () => {
    const pieces = takeoffOf(bend(round(16), 20, { elbow: { ...plainSpec.elbow, radiusRatio: 1.5 } })).pieces;
    const elbow = pieces.find(({ fitting }) => fitting === "elbow-gored")!;
    if (elbow.body.kind !== "gored-elbow") throw new Error("a gored elbow");
    const halves = patternsOf(elbow.body)!.reduce((sum, { name, count }) => sum + count * (name === "gore" ? 2 : 1), 0);
    expect(halves).toBe(2 * (elbow.body.pieceCount - 1));
  });

  it("G20's middle gore is 12.730 in. at the heel and 6.365 in. at the throat", () => {
    const patterns = patternsOf({
      kind: "gored-elbow",
      pieceCount: 5,
      bend: {
        section: round(16),
        planeSide_m: inches(16),
        acrossSide_m: inches(16),
        angle_rad: radians(Math.PI / 2),
        centerRadius_m: inches(24),
      },
    })!;
    const gore = patterns.find(({ name }) => name === "gore")!;
    expect(gore.count).toBe(3);
    const half = gore.outline.length / 2;
    const heights = gore.outline.slice(0, half).map(([, y]) => (-2 * y) / METERS_PER_INCH);
    // Own derivation with an independent mesh, row G20; standing: computed.
    expect(Math.max(...heights)).toBeCloseTo(12.7304, 3);
    expect(Math.min(...heights)).toBeCloseTo(6.3652, 3);
  });

  it("a smooth round elbow is formed, not cut", () => {
    const { pieces } = takeoffOf(bend(round(16), 20, { elbow: { ...plainSpec.elbow, round: "smooth" } }));
    expect(patternsOf(pieces.find(({ fitting }) => fitting === "elbow-smooth")!.body)).toBeNull();
  });
});
