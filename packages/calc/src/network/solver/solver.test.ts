/** A solver after edits against a cold solve of the same system: on trees, edits and services made by chance. */
import fc from "fast-check";
import { describe, expect, it } from "vitest";
import {
  ACCESSORY_KINDS,
  FITTING_TYPES,
  SERVICES,
  type AirNode,
  type AirSegment,
  type AirSystem,
  type Section,
} from "../../air-system.ts";
import { benchSystem } from "../../checks/many-segments.ts";
import { cubicMetersPerSecond, meters } from "../../quantity.ts";
import {
  aSystem,
  annular,
  duct,
  equipment,
  flatOval,
  junction,
  outlet,
  rectangular,
  round,
} from "../../testing/air-system-builder.ts";
import { solved } from "../../testing/answers.ts";
import { addToRange, mostOfRange, placeOfMost, valueAt } from "./most-of-range.ts";
import { createSolver, type Solver } from "./solver.ts";

const side = fc.double({ min: 0.15, max: 1.2, noNaN: true });
const anySection: fc.Arbitrary<Section> = fc.oneof(
  side.map(round),
  fc.tuple(side, side).map(([width, height]) => rectangular(width, height)),
  fc.tuple(side, side).map(([a, b]) => flatOval(Math.max(a, b), Math.min(a, b))),
  side.map((outer) => annular(outer, outer * 0.4)),
);

/** Every twig hangs on one before it; those that nothing hangs on end at outlets, every other one an open end. */
const anyTree: fc.Arbitrary<AirSystem> = fc
  .array(
    fc.record({
      section: fc.option(anySection, { nil: null }),
      x: fc.integer({ min: -3, max: 3 }),
      y: fc.integer({ min: -3, max: 3 }),
      parent: fc.nat(),
      fitting: fc.option(fc.constantFrom(...FITTING_TYPES), { nil: null, freq: 3 }),
    }),
    { minLength: 1, maxLength: 40 },
  )
  .map((twigs) => {
    const parents = twigs.map(({ parent }, index) => Math.max(0, index - (parent % 4)));
    const isInner = new Set(parents);
    const nodes: AirNode[] = [equipment("0", [0, 0])];
    const segments: AirSegment[] = [];
    twigs.forEach(({ section, x, y, fitting }, index) => {
      const id = String(index + 1);
      nodes.push(isInner.has(index + 1) ? junction(id, [x, y]) : outlet(id, [x, y], 0.1, index % 2 === 0 ? 15 : null));
      segments.push(duct(String(parents[index]), id, section, { length_m: meters(2 + (index % 5)), fitting }));
    });
    return aSystem(nodes, segments);
  });

const anyChange: fc.Arbitrary<Partial<AirSegment>> = fc.oneof(
  fc.option(anySection, { nil: null }).map((section) => ({ section, flexible: false })),
  side.map((diameter) => ({ section: round(diameter), flexible: true })),
  fc.double({ min: 0.5, max: 50, noNaN: true }).map((length) => ({ length_m: meters(length) })),
  fc.option(fc.constantFrom(...FITTING_TYPES), { nil: null }).map((fitting) => ({ fitting })),
  fc.subarray([...ACCESSORY_KINDS]).map((accessories) => ({ accessories })),
  fc.constantFrom("exit-open" as const, "entry-bellmouth" as const, null).map((mouth) => ({ mouth })),
  fc.constant({ insulation: { kind: "liner", thickness_m: meters(0.025) } as const }),
);
const anyEdit = fc.record({
  at: fc.nat(),
  change: anyChange,
  airflow: fc.option(fc.double({ min: 0.01, max: 2, noNaN: true }), { nil: null, freq: 2 }),
});

function solverOf(system: AirSystem): Solver {
  const answer = createSolver(system);
  if (!answer.ok) throw new Error(`not solved: ${JSON.stringify(answer.problems)}`);
  return answer.value;
}

function expectAsCold(solver: Solver): void {
  const cold = solved(solver.system());
  const close = (ours: number, theirs: number) =>
    expect(Math.abs(ours - theirs)).toBeLessThanOrEqual(1e-9 * Math.max(1, Math.abs(cold.requiredPressure_pa)));
  close(solver.requiredPressure_pa(), cold.requiredPressure_pa);
  for (const path of cold.paths) close(solver.requiredAt_pa(path.outletNodeId), path.requiredPressure_pa);
  close(solver.requiredAt_pa(solver.governingOutletNodeId()), cold.requiredPressure_pa);
}

describe("a solver", () => {
  it("after any edits says what a cold solve says", () => {
    fc.assert(
      fc.property(
        anyTree,
        fc.constantFrom(...SERVICES),
        fc.array(anyEdit, { minLength: 1, maxLength: 12 }),
        (tree, service, edits) => {
          const solver = solverOf({ ...tree, service });
          for (const { at, change, airflow } of edits) {
            const { nodes, segments } = solver.system();
            const outlets = nodes.filter(({ role }) => role === "outlet");
            const answer =
              airflow === null
                ? solver.replaceSegment({ ...segments[at % segments.length]!, ...change })
                : solver.setAirflow(outlets[at % outlets.length]!.id, cubicMetersPerSecond(airflow));
            expect(answer.ok).toBe(true);
          }
          expectAsCold(solver);
        },
      ),
      { numRuns: 80 },
    );
  });

  it("holds in a building, edit after edit", () => {
    const solver = solverOf(benchSystem(600));
    for (let turn = 0; turn < 200; turn++) {
      const { nodes, segments } = solver.system();
      const segment = segments[(turn * 37) % segments.length]!;
      solver.replaceSegment({ ...segment, length_m: meters(1 + (turn % 9)), flexible: false, section: round(0.5) });
      const node = nodes[(turn * 53) % nodes.length]!;
      if (node.role === "outlet") solver.setAirflow(node.id, cubicMetersPerSecond(0.05 + 0.01 * (turn % 5)));
    }
    expectAsCold(solver);
  });

  it("refuses an edit as a solve does, and stays as it was", () => {
    const solver = solverOf(benchSystem(50));
    const before = solver.requiredPressure_pa();
    const [segment] = solver.system().segments;
    const answer = solver.replaceSegment({ ...segment!, section: round(-1) });
    expect(answer).toMatchObject({
      ok: false,
      problems: [{ code: "size-not-positive", subject: { id: segment!.id } }],
    });
    expect(solver.requiredPressure_pa()).toBe(before);
    expectAsCold(solver);
  });

  it("solves anew when a segment is tied to another node", () => {
    const system = aSystem(
      [equipment("u", [0, 0]), junction("a", [5, 0]), outlet("b", [9, 0], 0.2), outlet("c", [5, 5], 0.1)],
      [duct("u", "a", round(0.4)), duct("a", "b", round(0.3)), duct("a", "c", round(0.2))],
    );
    const solver = solverOf(system);
    expect(solver.replaceSegment({ ...system.segments[2]!, fromNodeId: "u" }).ok).toBe(true);
    expectAsCold(solver);
    const circle = solver.replaceSegment({ ...system.segments[0]!, fromNodeId: "b" });
    expect(circle.ok).toBe(false);
    expectAsCold(solver);
  });

  it("hands out a whole solution that later edits do not change", () => {
    const solver = solverOf(benchSystem(60));
    const [segment] = solver.system().segments;
    solver.replaceSegment({ ...segment!, length_m: meters(9) });
    const solution = solver.solution();
    solver.replaceSegment({ ...segment!, length_m: meters(3) });
    expect(solution.segments[0]?.length_m).toBe(9);
    expect(solver.solution().segments[0]?.length_m).toBe(3);
  });
});

describe("the most of a range", () => {
  it("is that of plain sums", () => {
    const value = fc.integer({ min: -100, max: 100 });
    const change = fc.record({ from: fc.nat(), to: fc.nat(), amount: value });
    fc.assert(
      fc.property(fc.array(value, { minLength: 1, maxLength: 40 }), fc.array(change), (values, changes) => {
        const plain = [...values];
        const row = mostOfRange(Float64Array.from(values));
        for (const { from, to, amount } of changes) {
          const [low, high] = [from % plain.length, to % (plain.length + 1)];
          for (let at = low; at < high; at++) plain[at]! += amount;
          addToRange(row, low, high, amount);
        }
        expect(plain.map((_, at) => valueAt(row, at))).toEqual(plain);
        expect(placeOfMost(row)).toBe(plain.indexOf(Math.max(...plain)));
      }),
    );
  });
});
