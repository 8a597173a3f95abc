import fc from "fast-check";
import { describe, expect, it } from "vitest";
import type { AirSystem, Section } from "../air-system.ts";
import {
  aRun,
  aSystem,
  annular,
  oval,
  plainSpec,
  rectangular,
  round,
  solutionOf,
  takeoffOf,
  type DuctOf,
} from "../checks/metal-system.ts";
import { benchSystem } from "../checks/many-segments.ts";
import { METERS_PER_FOOT, METERS_PER_INCH, feet, inches, inchesOfWater, meters } from "../quantity.ts";
import { groupPieces, PIECE_GROUPINGS } from "./group-pieces.ts";
import { shippedStandards } from "./shipped-standards.ts";
import { takeOff } from "./take-off.ts";
import { sumTotals, totalsOf } from "./totals.ts";
import type { Piece, Takeoff } from "./takeoff.ts";

const straightLength = (pieces: readonly Piece[]): number =>
  pieces.filter(({ kind }) => kind === "straight").reduce((sum, { length_m }) => sum + length_m, 0);
const pieceOf = ({ pieces }: Takeoff, mark: string): Piece => {
  const piece = pieces.find((each) => each.mark === mark);
  if (!piece) throw new Error(`no ${mark} in ${pieces.map((each) => each.mark).join(" ")}`);
  return piece;
};
const count = ({ items }: Takeoff, key: string): number =>
  items.filter((item) => item.key === key).reduce((sum, { quantity }) => sum + quantity, 0);

const anySection: fc.Arbitrary<Section> = fc.oneof(
  fc.tuple(fc.integer({ min: 6, max: 48 }), fc.integer({ min: 6, max: 24 })).map(([w, h]) => rectangular(w, h)),
  fc.integer({ min: 5, max: 36 }).map(round),
  fc.tuple(fc.integer({ min: 14, max: 40 }), fc.integer({ min: 6, max: 12 })).map(([w, h]) => oval(w, h)),
  fc.tuple(fc.integer({ min: 12, max: 24 }), fc.integer({ min: 4, max: 10 })).map(([o, i]) => annular(o, i)),
);

describe("a straight run", () => {
  it("is whole sections and a short piece, marked in order", () => {
    const { pieces } = takeoffOf(aRun(rectangular(24, 12), 13));
    expect(pieces.map(({ mark }) => mark)).toEqual(["1A", "1B", "1C"]);
    expect(pieces.map(({ length_m }) => length_m / METERS_PER_FOOT)).toEqual([5, 5, expect.closeTo(3, 9)]);
  });

  it("has pieces as long as itself, whatever its section", () => {
    fc.assert(
      fc.property(anySection, fc.double({ min: 0.5, max: 200, noNaN: true }), (section, length) => {
        const { pieces } = takeoffOf(aRun(section, length));
        expect(straightLength(pieces) / METERS_PER_FOOT).toBeCloseTo(length, 3);
      }),
    );
  });

  it("cut in two by a point in between keeps its metal", () => {
    fc.assert(
      fc.property(
        anySection,
        fc.double({ min: 10, max: 100, noNaN: true }),
        fc.double({ min: 0.2, max: 0.8, noNaN: true }),
        (section, length, share) => {
          const whole = takeoffOf(aRun(section, length)).totals;
          const cut = takeoffOf(
            aSystem([
              { to: "middle", after: "unit", at: [length * share, 0], section },
              { to: "end", after: "middle", at: [length, 0], section, outlet: {} },
            ]),
          );
          // A straight that lacks less than a tenth of a millimeter of whole sections is made of whole ones: three straights here.
          const ofTheRun = (3 * 1e-4) / feet(length);
          for (const total of ["netArea_m2", "netWeight_kg", "shopHours_h"] as const)
            expect(Math.abs(cut.totals[total] / whole[total] - 1)).toBeLessThan(ofTheRun + 1e-9);
          expect(cut.totals.jointCount).toBeGreaterThanOrEqual(whole.jointCount);
          expect(count(cut, "hanger")).toBe(count(takeoffOf(aRun(section, length)), "hanger"));
        },
      ),
      { numRuns: 60 },
    );
  });

  it("has both walls of an annulus", () => {
    const { pieces, totals } = takeoffOf(aRun(annular(12, 4), 10));
    expect(totals.netArea_m2).toBeCloseTo(Math.PI * inches(16) * feet(10), 9);
    expect(pieces[0]!.jointCount).toBe(2);
    const wrapped = takeoffOf(aRun(annular(12, 4), 10, { insulation: { kind: "liner", thickness_m: inches(1) } }));
    expect(wrapped.totals.linerArea_m2).toBeCloseTo(Math.PI * inches(14) * feet(10), 9);
  });

  it("is hung by its spacing, with one more at its free end", () => {
    expect(count(takeoffOf(aRun(rectangular(24, 12), 40)), "hanger")).toBe(5 + 1);
    expect(count(takeoffOf(aRun(rectangular(24, 12), 41)), "hanger")).toBe(6 + 1);
  });

  it("is sealed at its joints, and along its seam in classes A and B", () => {
    const sealant = (sealClass: "A" | "C" | "none") =>
      count(takeoffOf(aRun(rectangular(24, 12), 10, { sealClass })), "sealant");
    const litersPerFoot = (0.7 * 3.785411784) / 100;
    expect(sealant("C")).toBeCloseTo(2 * 6 * litersPerFoot, 9);
    expect(sealant("A")).toBeCloseTo((2 * 6 + 10) * litersPerFoot, 9);
    expect(sealant("none")).toBe(0);
  });
});

describe("fittings", () => {
  const corner = (section: Section): DuctOf[] => [
    { to: "corner", after: "unit", at: [20, 0], section },
    { to: "end", after: "corner", at: [20, 20], section, outlet: {} },
  ];

  it("an elbow takes its tangent out of both ducts", () => {
    const takeoff = takeoffOf(aSystem(corner(rectangular(24, 12))));
    const elbow = pieceOf(takeoff, "2E");
    expect(elbow.fitting).toBe("elbow-radius");
    // Center-line radius 36 in., so 36 in. from the corner each way.
    expect(straightLength(takeoff.pieces) / METERS_PER_FOOT).toBeCloseTo(40 - 6, 9);
    expect(elbow.netArea_m2 / METERS_PER_INCH ** 2).toBeCloseTo(4071.504, 2);
  });

  it("an elbow that turns up bends in the height", () => {
    const up = takeoffOf(
      aSystem([
        { to: "corner", after: "unit", at: [20, 0], section: rectangular(24, 12) },
        { to: "end", after: "corner", at: [20, 0, 20], section: rectangular(24, 12), outlet: {} },
      ]),
    );
    // The hard way of a 24 × 12: G03 turned, with a center-line radius of 18 in.
    expect(pieceOf(up, "2E").netArea_m2).toBeCloseTo(2 * inches(36) * (Math.PI / 2) * inches(18), 9);
  });

  it("vanes are metal of the elbow", () => {
    const bare = takeoffOf(
      aSystem(corner(rectangular(24, 12)), { elbow: { ...plainSpec.elbow, rectangular: "square-throat" } }),
    );
    const vaned = takeoffOf(
      aSystem(corner(rectangular(24, 12)), { elbow: { ...plainSpec.elbow, rectangular: "square-throat-vanes" } }),
    );
    const added = pieceOf(vaned, "2E").netArea_m2 - pieceOf(bare, "2E").netArea_m2;
    expect(added / METERS_PER_INCH ** 2).toBeCloseTo(565.487, 2);
  });

  it("a gored elbow has a seam, where its duct is spiral", () => {
    const takeoff = takeoffOf(aSystem(corner(round(16))));
    expect(pieceOf(takeoff, "2E").seam).toBe("longitudinal");
    expect(pieceOf(takeoff, "2A").seam).toBe("spiral");
  });

  it("a transition takes the gauge of its larger end", () => {
    const takeoff = takeoffOf(
      aSystem([
        { to: "step", after: "unit", at: [20, 0], section: rectangular(40, 12) },
        { to: "end", after: "step", at: [40, 0], section: rectangular(20, 12), outlet: {} },
      ]),
    );
    const transition = pieceOf(takeoff, "2T");
    expect(pieceOf(takeoff, "2A").gauge).toBe("26 ga");
    expect(transition.gauge).toBe("24 ga");
    expect(transition.gauge).toBe(pieceOf(takeoff, "1A").gauge);
    // 10 in. a side at 15°.
    expect(transition.length_m / METERS_PER_INCH).toBeCloseTo(10 / Math.tan(Math.PI / 12), 9);
    expect(straightLength(takeoff.pieces) + transition.length_m).toBeCloseTo(feet(40), 9);
  });

  it("a tap starts at the wall of its main", () => {
    const takeoff = takeoffOf(
      aSystem([
        { to: "tap", after: "unit", at: [20, 0], section: rectangular(24, 12) },
        { to: "end", after: "tap", at: [40, 0], section: rectangular(24, 12), outlet: {} },
        { to: "side", after: "tap", at: [20, 10], section: rectangular(12, 8), outlet: {} },
      ]),
    );
    const tap = pieceOf(takeoff, "3J");
    expect(tap.fitting).toBe("tap-straight");
    // Collar of 6 in. around 40 in.; half of the main and the collar come out of the branch.
    expect(tap.netArea_m2 / METERS_PER_INCH ** 2).toBeCloseTo(40 * 6, 6);
    const branch = takeoff.pieces.filter(({ segmentId }) => segmentId === "to-side");
    expect(straightLength(branch) / METERS_PER_INCH).toBeCloseTo(120 - 12 - 6, 6);
    // The main is not cut for it.
    expect(straightLength(takeoff.pieces.filter(({ segmentId }) => segmentId !== "to-side"))).toBeCloseTo(feet(40), 9);
  });

  it("a tee that ends its main is one piece, made once", () => {
    const takeoff = takeoffOf(
      aSystem([
        { to: "tee", after: "unit", at: [20, 0], section: rectangular(24, 12) },
        { to: "left", after: "tee", at: [20, 10], section: rectangular(12, 12), outlet: {} },
        { to: "right", after: "tee", at: [20, -10], section: rectangular(12, 12), outlet: {} },
      ]),
    );
    const made = takeoff.pieces.filter(({ kind }) => kind === "branch");
    expect(made.map(({ fitting }) => fitting)).toEqual(["tee"]);
    // Body 16 in. long around 72 in., its closed end, two collars of 2 in. less their holes.
    expect(made[0]!.netArea_m2 / METERS_PER_INCH ** 2).toBeCloseTo(72 * 16 + 24 * 12 + 2 * (48 * 2 - 144), 6);
  });

  it("flexible duct is bought by its length with its slack and weighs nothing", () => {
    const takeoff = takeoffOf(
      aSystem(
        [
          { to: "joint", after: "unit", at: [20, 0], section: round(10) },
          { to: "end", after: "joint", at: [25, 0], section: round(10), more: { flexible: true }, outlet: {} },
        ],
        { flexibleSlack: 0.1 },
      ),
    );
    const flexible = pieceOf(takeoff, "2A");
    expect(flexible.kind).toBe("flexible");
    expect(flexible.length_m).toBeCloseTo(feet(5.5), 9);
    expect(flexible.weight_kg).toBe(0);
    expect(flexible.fieldHours_h).toBeGreaterThan(0);
  });

  it("a segment too short for its fittings has no straight, and says so", () => {
    const takeoff = takeoffOf(
      aSystem([
        { to: "corner", after: "unit", at: [2, 0], section: rectangular(24, 12) },
        { to: "end", after: "corner", at: [2, 20], section: rectangular(24, 12), outlet: {} },
      ]),
    );
    expect(takeoff.pieces.some(({ segmentId, kind }) => segmentId === "to-corner" && kind === "straight")).toBe(false);
    expect(takeoff.findings.map(({ code, segmentId }) => [code, segmentId])).toEqual([
      ["fittings-fill-segment", "to-corner"],
      ["joint-below-reinforcement", "to-end"],
    ]);
  });
});

describe("junctions", () => {
  const cross = (spec = {}) =>
    takeoffOf(
      aSystem(
        [
          { to: "mid", after: "unit", at: [20, 0], section: rectangular(24, 12) },
          { to: "on", after: "mid", at: [40, 0], section: rectangular(24, 12), outlet: {} },
          { to: "left", after: "mid", at: [20, 10], section: rectangular(12, 8), outlet: {} },
          { to: "right", after: "mid", at: [20, -10], section: rectangular(12, 8), outlet: {} },
        ],
        spec,
      ),
    );

  it("a cross takes a piece of its main and is made once", () => {
    const takeoff = cross();
    const made = takeoff.pieces.filter(({ kind }) => kind === "branch");
    expect(made.map(({ fitting }) => fitting)).toEqual(["cross"]);
    const [body] = made;
    expect(body!.length_m / METERS_PER_INCH).toBeCloseTo(16, 9);
    expect(body!.netArea_m2 / METERS_PER_INCH ** 2).toBeCloseTo(72 * 16 + 2 * (40 * 2 - 96), 6);
    const main = takeoff.pieces.filter(({ segmentId }) => segmentId === "to-mid" || segmentId === "to-on");
    expect(straightLength(main) / METERS_PER_INCH).toBeCloseTo(480 - 16, 6);
  });

  it("a wye that ends its main has the legs of two elbows", () => {
    const takeoff = takeoffOf(
      aSystem([
        { to: "wye", after: "unit", at: [20, 0], section: rectangular(24, 12) },
        { to: "left", after: "wye", at: [30, 10], section: rectangular(12, 12), outlet: {} },
        { to: "right", after: "wye", at: [30, -10], section: rectangular(12, 12), outlet: {} },
      ]),
    );
    const made = takeoff.pieces.filter(({ kind }) => kind === "branch");
    expect(made.map(({ fitting }) => fitting)).toEqual(["wye"]);
    expect(made[0]!.netArea_m2 / METERS_PER_INCH ** 2).toBeCloseTo(2 * 48 * (Math.PI / 4) * 18, 6);
  });

  it("a lateral is long enough to clear its main", () => {
    const takeoff = takeoffOf(
      aSystem([
        { to: "tap", after: "unit", at: [20, 0], section: round(20) },
        { to: "on", after: "tap", at: [40, 0], section: round(20), outlet: {} },
        { to: "side", after: "tap", at: [30, 10], section: round(10), outlet: {} },
      ]),
    );
    const lateral = pieceOf(takeoff, "3J");
    expect(lateral.fitting).toBe("wye");
    expect(lateral.length_m / METERS_PER_INCH).toBeCloseTo(6 + 5, 6);
  });

  it.each([
    ["shoe-tap", "conical-tap", "tap-shoe", rectangular(12, 10)],
    ["straight-tap", "conical-tap", "tap-conical", round(10)],
  ] as const)("the spec's %s and %s make a %s", (rectangularTap, roundTap, fitting, section) => {
    const branch = (spec: { rectangular: "straight-tap" | "shoe-tap"; round: "straight-tap" | "conical-tap" }) =>
      pieceOf(
        takeoffOf(
          aSystem(
            [
              { to: "tap", after: "unit", at: [20, 0], section: rectangular(24, 12) },
              { to: "on", after: "tap", at: [40, 0], section: rectangular(24, 12), outlet: {} },
              { to: "side", after: "tap", at: [20, 10], section, outlet: {} },
            ],
            { branch: spec },
          ),
        ),
        "3J",
      );
    const eased = branch({ rectangular: rectangularTap, round: roundTap });
    expect(eased.fitting).toBe(fitting);
    const straight = branch({ rectangular: "straight-tap", round: "straight-tap" });
    expect(straight.fitting).toBe("tap-straight");
    expect(eased.netArea_m2).toBeGreaterThan(straight.netArea_m2);
  });
});

describe("hours", () => {
  it("in the field follow the conditions, in the shop they do not", () => {
    const system = aSystem([
      {
        to: "joint",
        after: "unit",
        at: [20, 0],
        section: round(10),
        more: { accessories: ["volume-damper"] },
      },
      {
        to: "end",
        after: "joint",
        at: [25, 0],
        section: round(10),
        more: { flexible: true },
        outlet: { deviceKey: "diffuser-24x24" },
      },
    ]);
    const { productivity } = shippedStandards;
    const hard = takeoffOf(system, { ...shippedStandards, productivity: { ...productivity, conditionFactor: 1.5 } });
    const easy = takeoffOf(system);
    expect(hard.totals.shopHours_h).toBe(easy.totals.shopHours_h);
    hard.pieces.forEach((piece, at) => {
      expect(piece.fieldHours_h).toBeCloseTo(1.5 * easy.pieces[at]!.fieldHours_h, 9);
    });
    hard.items.forEach((item, at) => {
      expect(item.fieldHours_h).toBeCloseTo(1.5 * easy.items[at]!.fieldHours_h, 9);
    });
    expect(hard.totals.fieldHours_h).toBeGreaterThan(0);
  });
});

describe("outside the schedule", () => {
  it.each([
    ["a size", aRun(rectangular(100, 12), 10)],
    ["a pressure", aRun(rectangular(24, 12), 10, { pressureClass_pa: inchesOfWater(12) })],
    ["a metal", aRun(rectangular(24, 12), 10, { material: "aluminum" })],
  ])("%s gives no gauge, no weight and a stop", (_what, system) => {
    const { pieces, findings, totals } = takeoffOf(system);
    expect(pieces.every(({ gauge, weight_kg }) => gauge === null && weight_kg === 0)).toBe(true);
    expect(totals.netArea_m2).toBeGreaterThan(0);
    expect(findings.map(({ code, severity }) => [code, severity])).toEqual([["gauge-not-in-schedule", "stop"]]);
  });

  it("a schedule that names a sheet nobody knows gives none either", () => {
    const rows = shippedStandards.gauges.rows.map((row) => ({
      ...row,
      sizes: row.sizes.map((size) => ({ ...size, gauge: "24.5 ga" })),
    }));
    const odd = { ...shippedStandards, gauges: { ...shippedStandards.gauges, rows } };
    const { pieces, findings } = takeoffOf(aRun(rectangular(24, 12), 10), odd);
    expect(pieces[0]!.gauge).toBeNull();
    expect(findings[0]?.severity).toBe("stop");
  });
});

describe("counted things", () => {
  it("a piece too heavy for two people is noted", () => {
    const { findings } = takeoffOf(aRun(round(60), 10));
    expect(findings.map(({ code, severity }) => [code, severity])).toEqual([["piece-too-heavy", "note"]]);
  });

  it("dampers carry their size, fire dampers are marked for review", () => {
    const takeoff = takeoffOf(
      aSystem([
        {
          to: "end",
          after: "unit",
          at: [20, 0],
          section: rectangular(24, 12),
          more: { accessories: ["volume-damper", "fire-damper"] },
          outlet: { deviceKey: "grille-24x12" },
        },
      ]),
    );
    expect(count(takeoff, "volume-damper:24x12")).toBe(1);
    expect(count(takeoff, "grille-24x12")).toBe(1);
    expect(takeoff.findings.map(({ code }) => code)).toEqual(["accessory-needs-review", "joint-below-reinforcement"]);
  });
});

describe("a whole building", () => {
  const system = { ...benchSystem(300), spec: { ...benchSystem(1).spec, pressureClass_pa: inchesOfWater(1) } };
  const takeoff = takeoffOf(system);

  it("has a mark for every piece, each once", () => {
    expect(new Set(takeoff.pieces.map(({ mark }) => mark)).size).toBe(takeoff.pieces.length);
  });

  it("has totals that are sums, however it is grouped", () => {
    const all = totalsOf(takeoff.pieces, []);
    for (const by of PIECE_GROUPINGS) {
      const groups = groupPieces(takeoff.pieces, by);
      const sum = sumTotals(groups);
      expect(sum.pieceCount).toBe(all.pieceCount);
      expect(sum.netWeight_kg).toBeCloseTo(all.netWeight_kg, 6);
      expect(sum.fieldHours_h).toBeCloseTo(all.fieldHours_h, 6);
    }
    const itemHours = takeoff.items.reduce((hours, { fieldHours_h }) => hours + fieldHours_h, 0);
    expect(takeoff.totals.fieldHours_h).toBeCloseTo(all.fieldHours_h + itemHours, 6);
  });

  it("has arithmetic that comes to what it says", () => {
    for (const { arithmetic } of takeoff.pieces) {
      for (const { quantity, terms, result } of arithmetic) {
        // Surfaces put together from parts add up, all else multiplies.
        const isSum =
          (quantity === "net-area" || quantity === "blank-area") && terms.every(({ unit }) => unit === "m²");
        const isVaned = quantity === "net-area" && terms.length === 3 && terms[2]!.unit === "m²";
        const product = (some: typeof terms) => some.reduce((sofar, { value }) => sofar * value, 1);
        const came = isSum
          ? terms.reduce((sum, { value }) => sum + value, 0)
          : isVaned
            ? product(terms.slice(0, 2)) + terms[2]!.value
            : product(terms);
        expect(came).toBeCloseTo(result, 9);
      }
    }
  });

  it("is the same every time, and plain JSON", () => {
    expect(JSON.parse(JSON.stringify(takeoff))).toEqual(takeoff);
    expect(takeoffOf(system)).toEqual(takeoff);
  });

  it("refuses a solution of something else", () => {
    const other = solutionOf(aRun(round(10), 10));
    expect(() => takeOff({ system, standards: shippedStandards }, other)).toThrow("was not made from");
  });

  it("takes no more straight than the segments are long", () => {
    const solution = solutionOf(system);
    const lengthOf = new Map(solution.segments.map(({ segmentId, length_m }) => [segmentId, length_m]));
    for (const [segmentId, length] of lengthOf) {
      const own = takeoff.pieces.filter((piece) => piece.segmentId === segmentId);
      expect(straightLength(own)).toBeLessThanOrEqual(meters(length + 1e-6));
    }
  });
});

describe("what is decided before the schedule", () => {
  const gaugesOf = (system: AirSystem) =>
    takeoffOf(system).pieces.map(({ gauge, gaugeDecider }) => [gauge, gaugeDecider]);

  it("a spec's sheet is used for every piece, and each says so", () => {
    const system = aRun(rectangular(12, 12), 3, { gauge: "22 ga" });
    expect(gaugesOf(system)).toContainEqual(["22 ga", "spec"]);
    expect(takeoffOf(system).pieces[0]).toMatchObject({
      scheduledGauge: "26 ga",
      gaugeSource: "asked for by the spec",
    });
  });

  it("a duct's own sheet goes before the spec's", () => {
    const system = aRun(rectangular(12, 12), 3, { gauge: "22 ga" });
    const own = { ...system, segments: system.segments.map((segment) => ({ ...segment, gauge: "18 ga" })) };
    expect(gaugesOf(own)).toContainEqual(["18 ga", "piece"]);
  });

  it("sheet lighter than the schedule's is pointed out", () => {
    const { findings } = takeoffOf(aRun(rectangular(40, 12), 3, { gauge: "26 ga", rectangularJoint: "flange" }));
    expect(findings.map(({ code, severity }) => [code, severity])).toEqual([["gauge-lighter-than-schedule", "warn"]]);
  });

  it("a spec that leaves joints to the schedule gets those of its grade", () => {
    const system = aRun(rectangular(54, 18), 3, { constructionFromSchedule: true });
    expect(
      takeoffOf(system)
        .pieces.filter(({ kind }) => kind === "straight")
        .map(({ joint }) => joint),
    ).toContain("flange");
    expect(takeoffOf(system).findings.map(({ code }) => code)).not.toContain("joint-below-reinforcement");
  });

  it("a schedule that says how long pieces are made has them cut so, where the spec leaves it", () => {
    const rows = shippedStandards.gauges.rows.map((chart) => ({
      ...chart,
      sizes: chart.sizes.map((size) => ({ ...size, sectionLength_m: inches(40) })),
    }));
    const standards = { ...shippedStandards, gauges: { ...shippedStandards.gauges, rows } };
    const lengthOf = (system: AirSystem) => takeoffOf(system, standards).pieces[0]?.length_m;
    expect(lengthOf(aRun(rectangular(24, 12), 10, { constructionFromSchedule: true }))).toBeCloseTo(inches(40), 9);
    expect(lengthOf(aRun(rectangular(24, 12), 10))).toBeCloseTo(inches(60), 9);
  });

  it("hours that the table does not hold are nothing, and are told", () => {
    const { productivity } = shippedStandards;
    const rows = productivity.rows.filter(({ place }) => place === "field");
    const { findings, totals } = takeoffOf(aRun(round(10), 10), {
      ...shippedStandards,
      productivity: { ...productivity, rows },
    });
    expect(totals.shopHours_h).toBe(0);
    expect(findings.map(({ code, severity }) => [code, severity])).toEqual([["hours-not-in-table", "warn"]]);
  });
});
