/** Hardware, allowances, buying, nesting and remembering. */
import fc from "fast-check";
import { describe, expect, it } from "vitest";
import type { Section } from "../air-system.ts";
import { benchSystem } from "../checks/many-segments.ts";
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
} from "../checks/metal-system.ts";
import { demandsOf } from "../pricing/demand.ts";
import { METERS_PER_FOOT, METERS_PER_INCH, feet, inches, meters } from "../quantity.ts";
import { pinCount } from "./count-hardware.ts";
import { insulationWords } from "./insulation.ts";
import { nestPieces, packSheets, shippedStock } from "./nest.ts";
import { shippedStandards } from "./shipped-standards.ts";
import { extent } from "./surface/transition.ts";
import { createTakeoff, takeOff } from "./take-off.ts";
import type { Takeoff } from "./takeoff.ts";

const count = ({ items }: Takeoff, key: string): number =>
  items.filter((item) => item.key === key).reduce((sum, { quantity }) => sum + quantity, 0);

/** Width and height to the micrometer. */
const inchesOf = (section: Section): readonly number[] => {
  const { width, height } = extent(section);
  return [width, height].map((side) => Number((side / METERS_PER_INCH).toFixed(4)));
};

describe("hardware", () => {
  it("of a flanged joint is its gasket, eight corners, and cleats a foot apart", () => {
    const takeoff = takeoffOf(aRun(rectangular(24, 12), 10, { rectangularJoint: "flange" }));
    // Two pieces of 5 ft, each with the joint at its end nearer the equipment.
    expect(count(takeoff, "gasket") / METERS_PER_FOOT).toBeCloseTo(2 * 6, 9);
    expect(count(takeoff, "flange-corner")).toBe(2 * 8);
    expect(count(takeoff, "flange-cleat")).toBe(2 * 2 * (2 + 1));
    expect(count(takeoff, "slip-strip")).toBe(0);
  });

  it("of slip and drive is slips on the width and drives on the height", () => {
    const takeoff = takeoffOf(aRun(rectangular(24, 12), 10));
    expect(count(takeoff, "slip-strip") / METERS_PER_FOOT).toBeCloseTo(2 * 4, 9);
    expect(count(takeoff, "drive-strip") / METERS_PER_FOOT).toBeCloseTo(2 * 2, 9);
    expect(count(takeoff, "gasket")).toBe(0);
  });

  it("of round duct is a coupling a joint", () => {
    expect(count(takeoffOf(aRun(round(12), 40)), "coupling")).toBe(4);
  });

  // Own reading of the spacing rule of SMACNA 1995, S2.0 to S2.11; standing: computed.
  it.each([
    [24, 12, 60, false, 24],
    [48, 24, 56.5, false, 48],
    [24, 12, 60, true, 40],
  ] as const)("of liner %i × %i in., %f in. long: pins", (width, height, length, isFast, printed) => {
    expect(pinCount(rectangular(width, height), inches(length), isFast)).toBe(printed);
  });

  it("needs no pins where the inside is 8 in. or less", () => {
    expect(pinCount(rectangular(8, 8), inches(60), false)).toBe(0);
  });

  it("tapes the seams of wrap with a vapor barrier only", () => {
    const wrap = { insulation: { kind: "wrap", thickness_m: inches(2) } } as const;
    expect(count(takeoffOf(aRun(rectangular(24, 12), 30, wrap)), "vapor-tape")).toBe(0);
    expect(
      count(takeoffOf(aRun(rectangular(24, 12), 30, { ...wrap, vaporBarrier: true })), "vapor-tape"),
    ).toBeGreaterThan(0);
  });

  it("says every quantity's basis", () => {
    for (const { basis, quantity } of takeoffOf(benchSystem(300)).items) {
      expect(basis).not.toBe("");
      expect(quantity).toBeGreaterThan(0);
    }
  });
});

describe("insulation", () => {
  // An insulation makers' guide specification 23 07 13 (2017), table 1; standing: found.
  it("says its installed resistance, and none for a thickness that is not sold", () => {
    expect(insulationWords({ kind: "wrap", thickness_m: inches(2.2) })).toBe("Insulation wrap, 2.2 in., R-6 installed");
    expect(insulationWords({ kind: "wrap", thickness_m: inches(4) })).toBe("Insulation wrap, 4 in.");
  });

  it("of two thicknesses is asked for by thickness where the book has it, else as wrap", () => {
    const takeoff = takeoffOf(aRun(rectangular(24, 12), 30, { insulation: { kind: "wrap", thickness_m: inches(2) } }));
    const keys = (known: readonly string[]) => demandsOf([takeoff], (key) => known.includes(key)).map(({ key }) => key);
    expect(keys(["wrap:2"])).toContain("wrap:2");
    expect(keys(["wrap"])).toContain("wrap");
  });
});

describe("clear size or metal size: trap of pricing the wrong one", () => {
  const liner = { insulation: { kind: "liner", thickness_m: inches(1) } } as const;
  const pieceOf = (sizesAre: "clear-inside" | "sheet-metal") =>
    takeoffOf(aRun(rectangular(24, 12), 10, { ...liner, sizesAre })).pieces[0]!;

  // Own arithmetic on the liner rule, liner examples row 1; standing: computed.
  it("a clear 24 × 12 with 1 in. of liner is 26 × 14 of metal, 11.11 % more", () => {
    const { section, clearSection, netArea_m2, linerArea_m2 } = pieceOf("clear-inside");
    expect(inchesOf(section)).toEqual([26, 14]);
    expect(inchesOf(clearSection)).toEqual([24, 12]);
    expect(2 * (netArea_m2 / METERS_PER_FOOT ** 2)).toBeCloseTo(66.667, 2);
    expect(2 * (linerArea_m2 / METERS_PER_FOOT ** 2)).toBeCloseTo(66.667, 2);
    expect((2 * netArea_m2) / METERS_PER_FOOT ** 2 / 60 - 1).toBeCloseTo(0.1111, 4);
  });

  it("a metal 24 × 12 with 1 in. of liner leaves 22 × 10 clear, with more friction", () => {
    const { section, clearSection } = pieceOf("sheet-metal");
    expect(inchesOf(section)).toEqual([24, 12]);
    expect(inchesOf(clearSection)).toEqual([22, 10]);
    const friction = (sizesAre: "clear-inside" | "sheet-metal") =>
      solutionOf(aRun(rectangular(24, 12), 10, { ...liner, sizesAre })).segments[0]!.frictionLoss_pa;
    expect(friction("sheet-metal")).toBeGreaterThan(friction("clear-inside"));
  });
});

describe("traps", () => {
  it("net area, blank area and wrap area are three numbers", () => {
    const [piece] = takeoffOf(
      aRun(rectangular(24, 12), 5, { insulation: { kind: "wrap", thickness_m: inches(1.5) } }),
    ).pieces;
    const { netArea_m2, blankArea_m2, insulationArea_m2 } = piece!;
    expect(new Set([netArea_m2, blankArea_m2, insulationArea_m2]).size).toBe(3);
    // One seam of 1 1/4 in. and an inch at each end: 73.25 × 62 in. less the four corners that no edge has.
    expect(blankArea_m2 / METERS_PER_INCH ** 2).toBeCloseTo(72 * 60 + 1.25 * 60 + 2 * 72, 6);
  });

  it("a wrapper too long for a sheet has a second seam, and then four", () => {
    const seams = (width: number, height: number) =>
      takeoffOf(aRun(rectangular(width, height), 5)).pieces[0]!.seamLength_m / METERS_PER_FOOT;
    expect(seams(40, 19)).toBeCloseTo(5, 9);
    expect(seams(41, 19)).toBeCloseTo(10, 9);
    expect(seams(84, 40)).toBeCloseTo(20, 9);
  });

  it("the larger end of a size-changing fitting sets its gauge, on all of its walls", () => {
    const { pieces } = takeoffOf(
      aSystem([
        { to: "step", after: "unit", at: [20, 0], section: rectangular(20, 12) },
        { to: "end", after: "step", at: [40, 0], section: rectangular(40, 12), outlet: {} },
      ]),
    );
    const gauge = (kind: string, segmentId: string) =>
      pieces.find((piece) => piece.kind === kind && piece.segmentId === segmentId)!.gauge;
    expect(gauge("transition", "to-end")).toBe(gauge("straight", "to-end"));
    expect(gauge("straight", "to-end")).not.toBe(gauge("straight", "to-step"));
  });

  it("flat on the bottom takes a transition twice as long as the same one in the middle", () => {
    const lengthOf = (transitionAlignment: "centered" | "flat-bottom") =>
      takeoffOf(
        aSystem(
          [
            { to: "step", after: "unit", at: [20, 0], section: rectangular(20, 30) },
            { to: "end", after: "step", at: [40, 0], section: rectangular(20, 12), outlet: {} },
          ],
          { transitionAlignment },
        ),
      ).pieces.find(({ kind }) => kind === "transition")!.length_m;
    expect(lengthOf("flat-bottom")).toBeCloseTo(2 * lengthOf("centered"), 9);
  });
});

describe("allowances", () => {
  const offsets = { allowances: [{ of: "offsets", share: 0.05 }] } as const;

  it("for offsets are a line of their own, with metal and hours", () => {
    const bare = takeoffOf(aRun(rectangular(24, 12), 40));
    const allowed = takeoffOf(aRun(rectangular(24, 12), 40, offsets));
    const lines = allowed.items.filter(({ kind }) => kind === "allowance");
    expect(lines.map(({ key }) => key)).toEqual(["allowance:offsets:metal:galvanized:26 ga"]);
    const blankWeight = bare.pieces.reduce(
      (sum, piece) => sum + (piece.weight_kg * piece.blankArea_m2) / piece.netArea_m2,
      0,
    );
    expect(lines[0]!.quantity).toBeCloseTo(0.05 * blankWeight, 9);
    expect(allowed.totals.shopHours_h).toBeCloseTo(1.05 * bare.totals.shopHours_h, 9);
    expect(allowed.totals.netWeight_kg).toBeCloseTo(bare.totals.netWeight_kg, 9);
  });

  it("are priced as their sheet on a line of their own", () => {
    const demands = demandsOf([takeoffOf(aRun(rectangular(24, 12), 40, offsets))], () => true);
    const own = demands.find(({ key }) => key.startsWith("allowance:"));
    expect(own?.priceKey).toBe("metal:galvanized:26 ga");
    expect(demands.filter(({ priceKey }) => priceKey === "metal:galvanized:26 ga")).toHaveLength(2);
  });

  it.each(["hangers", "sealant", "joints"] as const)("for %s that are counted too are a finding", (of) => {
    const codes = takeoffOf(aRun(rectangular(24, 12), 40, { allowances: [{ of, share: 0.1 }] })).findings;
    expect(codes.map(({ code }) => code)).toContain("carried-and-counted");
  });

  it("for offsets that no plan shows are none, until one is drawn", () => {
    const codes = (fitting: "offset" | null) =>
      takeoffOf(
        aSystem(
          [
            { to: "corner", after: "unit", at: [20, 0], section: rectangular(20, 14) },
            { to: "end", after: "corner", at: [60, 8], section: rectangular(20, 14), outlet: {}, more: { fitting } },
          ],
          offsets,
        ),
      ).findings.map(({ code }) => code);
    expect(codes(null)).not.toContain("carried-and-counted");
    expect(codes("offset")).toContain("carried-and-counted");
  });
});

describe("buy or make", () => {
  const bought = { bought: ["round-duct", "round-fittings"] } as const;
  const corner = (spec = {}) =>
    takeoffOf(
      aSystem(
        [
          { to: "corner", after: "unit", at: [20, 0], section: round(11) },
          { to: "end", after: "corner", at: [20, 20], section: round(11), outlet: {} },
        ],
        spec,
      ),
    );
  const keysOf = (takeoff: Takeoff, book: readonly string[]) =>
    demandsOf([takeoff], (key) => book.includes(key)).map(({ key }) => key);

  it("bought duct and fittings have no shop hours and no sheet to price", () => {
    const takeoff = corner(bought);
    expect(takeoff.totals.shopHours_h).toBe(0);
    expect(takeoff.totals.fieldHours_h).toBeCloseTo(corner().totals.fieldHours_h, 9);
    expect(takeoff.findings.map(({ code }) => code)).not.toContain("hours-not-in-table");
    expect(keysOf(takeoff, []).filter((key) => key.startsWith("metal:"))).toEqual([]);
  });

  it("go by their size, else by the next band of the book", () => {
    expect(keysOf(corner(bought), [])).toEqual(expect.arrayContaining(["spiral:11", "elbow-gored-90:11"]));
    const bands = ["spiral:to 10", "spiral:to 12", "spiral:to 16", "elbow-gored-90:to 14"];
    expect(keysOf(corner(bought), bands)).toEqual(expect.arrayContaining(["spiral:to 12", "elbow-gored-90:to 14"]));
    expect(keysOf(corner(bought), ["spiral:11", ...bands])).toContain("spiral:11");
  });

  it("one duct may be made where the spec buys, and rectangular duct is made", () => {
    const one = takeoffOf(
      aSystem(
        [{ to: "end", after: "unit", at: [20, 0], section: round(11), outlet: {}, more: { supply: "made" } }],
        bought,
      ),
    );
    expect(one.pieces.every(({ supply }) => supply === "made")).toBe(true);
    expect(takeoffOf(aRun(rectangular(24, 12), 10, bought)).pieces[0]!.supply).toBe("made");
  });

  it("fire and smoke dampers are always marked for review", () => {
    for (const kind of ["fire-damper", "smoke-damper"] as const) {
      const { findings } = takeoffOf(
        aSystem([
          { to: "end", after: "unit", at: [20, 0], section: round(11), outlet: {}, more: { accessories: [kind] } },
        ]),
      );
      expect(findings.map(({ code }) => code)).toContain("accessory-needs-review");
    }
  });
});

describe("nesting", () => {
  // Own arithmetic on a simple grid without kerf; standing: computed.
  it.each([
    [60, 120, 37.25, 60, 3],
    [48, 120, 26, 28, 4],
    [60, 120, 18, 26, 12],
  ])("on a %i × %i in. sheet blanks of %f × %f in. come %i to a sheet", (width, length, a, b, each) => {
    const blanks = Array.from({ length: 5 * each }, () => ({ width: a, length: b, area: a * b }));
    const sheet = { width_m: width, length_m: length };
    expect(packSheets(blanks, sheet)).toBe(5);
    expect(packSheets([...blanks, blanks[0]!], sheet)).toBe(6);
  });

  it("cuts wrappers across the coil and says how much of it is used", () => {
    const [nested, ...others] = nestPieces(takeoffOf(aRun(rectangular(24, 12), 20)).pieces, shippedStock);
    expect(others).toEqual([]);
    expect(nested!.sheets).toBe(0);
    expect(nested!.coil).toHaveLength(1);
    expect(nested!.coil[0]!.width_m).toBeCloseTo(inches(60), 9);
    // Four wrappers of 72 in., a seam of 1 1/4 in., and their ends' edges spread along them.
    expect(nested!.coil[0]!.length_m / METERS_PER_INCH).toBeCloseTo(4 * (72 + 1.25 + (2 * 72) / 60), 6);
    expect(nested!.utilization).toBeCloseTo(1, 9);
  });

  it("never uses more than there is, nor less stock than blanks", () => {
    const any = fc.record({
      width: fc.double({ min: 2, max: 60, noNaN: true }),
      length: fc.double({ min: 2, max: 60, noNaN: true }),
    });
    fc.assert(
      fc.property(fc.array(any, { minLength: 1, maxLength: 80 }), (sizes) => {
        const blanks = sizes.map(({ width, length }) => ({ width, length, area: width * length }));
        const area = blanks.reduce((sum, blank) => sum + blank.area, 0);
        const sheets = packSheets(blanks, { width_m: 60, length_m: 120 });
        expect(sheets * 60 * 120).toBeGreaterThanOrEqual(area - 1e-6);
        expect(sheets).toBeLessThanOrEqual(blanks.length);
      }),
    );
  });
});

describe("a takeoff that remembers", () => {
  const standards = shippedStandards;
  const system = benchSystem(200);

  it("answers as a fresh one does, whatever was edited", () => {
    fc.assert(
      fc.property(
        fc.array(fc.record({ at: fc.nat(39), to: fc.constantFrom("longer", "wider", "named", "lined", "gauged") }), {
          minLength: 1,
          maxLength: 4,
        }),
        (edits) => {
          const again = createTakeoff();
          let now = benchSystem(40);
          again({ system: now, standards }, solutionOf(now));
          for (const { at, to } of edits) {
            now = {
              ...now,
              segments: now.segments.map((segment, s) => {
                if (s !== at) return { ...segment };
                switch (to) {
                  case "longer":
                    return { ...segment, length_m: meters(20) };
                  case "wider":
                    return { ...segment, section: round(30) };
                  case "named":
                    return { ...segment, name: "other" };
                  case "lined":
                    return { ...segment, insulation: { kind: "liner", thickness_m: inches(1) } };
                  case "gauged":
                    return { ...segment, gauge: "16 ga" };
                }
              }),
            };
            const solution = solutionOf(now);
            expect(again({ system: now, standards }, solution)).toEqual(takeOff({ system: now, standards }, solution));
          }
        },
      ),
      { numRuns: 6 },
    );
  });

  it("makes anew only what an edit touches", () => {
    const again = createTakeoff();
    const before = again({ system, standards }, solutionOf(system));
    const edited = {
      ...system,
      segments: system.segments.map((segment, s) => (s === 50 ? { ...segment, name: "other" } : segment)),
    };
    const after = again({ system: edited, standards }, solutionOf(edited));
    const known = new Set(before.pieces);
    const fresh = after.pieces.filter((piece) => !known.has(piece));
    expect(fresh.length).toBeGreaterThan(0);
    expect(new Set(fresh.map(({ segmentId }) => segmentId))).toEqual(new Set([system.segments[50]!.id]));
  });

  it("keeps nothing where the spec has changed", () => {
    const again = createTakeoff();
    again({ system, standards }, solutionOf(system));
    const other = { ...system, spec: { ...system.spec, sealClass: "C" as const } };
    const solution = solutionOf(other);
    expect(again({ system: other, standards }, solution)).toEqual(takeOff({ system: other, standards }, solution));
  });

  it("tells the sheet a level was measured from on every piece of it", () => {
    const sheet = { sheetNumber: "M-201", revision: "2" };
    const measured = { ...system, levels: system.levels.map((level) => ({ ...level, sheet })) };
    for (const piece of takeoffOf(measured).pieces) expect(piece.sheet).toEqual(sheet);
    for (const piece of takeoffOf(system).pieces) expect(piece.sheet).toBeNull();
  });

  it("keeps its marks when another duct goes, where each has its number", () => {
    const numbered = { ...system, segments: system.segments.map((segment, s) => ({ ...segment, number: s + 1 })) };
    const outlets = new Set(numbered.nodes.filter(({ role }) => role === "outlet").map(({ id }) => id));
    const gone = numbered.segments.findIndex(({ toNodeId }, s) => s > 100 && outlets.has(toNodeId));
    const leaf = numbered.segments[gone]!;
    const without = {
      ...numbered,
      nodes: numbered.nodes.filter(({ id }) => id !== leaf.toNodeId),
      segments: numbered.segments.filter(({ id }) => id !== leaf.id),
    };
    const marksOf = (takeoff: Takeoff) => new Map(takeoff.pieces.map(({ mark, segmentId }) => [`${mark}`, segmentId]));
    const before = marksOf(takeoffOf(numbered));
    for (const [mark, segmentId] of marksOf(takeoffOf(without))) expect(before.get(mark)).toBe(segmentId);
  });
});

it("shapes of every kind are laid out, hung and joined without a gap", () => {
  for (const section of [rectangular(24, 12), round(14), oval(26, 10), annular(12, 4)]) {
    const takeoff = takeoffOf(aRun(section, 40, { ...plainSpec }));
    expect(takeoff.pieces.reduce((sum, { length_m }) => sum + length_m, 0)).toBeCloseTo(feet(40), 6);
    expect(count(takeoff, "hanger")).toBeGreaterThan(0);
  }
});
