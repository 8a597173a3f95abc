import { describe, expect, it } from "vitest";
import { FITTING_TYPES, type AirSegment, type AirSystem, type FittingType, type Section } from "../air-system.ts";
import { shippedPractice } from "../fittings/practice.table.ts";
import {
  aSystem,
  duct,
  equipment,
  junction,
  oneDuct,
  ordinary,
  outlet,
  rectangular,
  round,
} from "../testing/air-system-builder.ts";
import { refused, segmentOf, solved } from "../testing/answers.ts";
import { solve } from "./solve.ts";

const withElbow = (elbow: Partial<AirSystem["spec"]["elbow"]>): Partial<AirSystem> => ({
  spec: { ...ordinary.spec, elbow: { ...ordinary.spec.elbow, ...elbow } },
});

/** Unit to a square turn, then on to an outlet. */
const bend = (section: Section, rest: Partial<AirSegment> = {}, system: Partial<AirSystem> = {}) =>
  aSystem(
    [equipment("unit", [0, 0]), junction("turn", [10, 0]), outlet("out", [10, 5], 0.3)],
    [duct("unit", "turn", section), duct("turn", "out", section, rest)],
    system,
  );

const elbowOf = (system: AirSystem) => segmentOf(solved(system), "turn-out").fittings[0];

describe("every fitting", () => {
  it.each(FITTING_TYPES.filter((type) => type !== "none"))(
    "chosen as %s tells its loss, whose pressure it goes with, its source and its inputs",
    (fitting) => {
      const found = segmentOf(solved(bend(rectangular(0.4, 0.3), { fitting })), "turn-out").fittings.at(-1);
      expect(found?.type).toBe(fitting);
      expect(found?.loss_pa).toBe((found?.lossCoefficient ?? NaN) * (found?.velocityPressure_pa ?? NaN));
      expect(found?.source.length).toBeGreaterThan(10);
      expect(found?.inputs.every(({ value }) => Number.isFinite(value))).toBe(true);
      expect(found?.clamped).toBe(false);
    },
  );
});

describe("elbows of the spec", () => {
  it("with splitters lose less than without, and less with each", () => {
    const loss = (system: Partial<AirSystem>) =>
      elbowOf(bend(rectangular(0.4, 0.4), {}, system))?.lossCoefficient ?? NaN;
    const plain = loss(withElbow({ rectangular: "radius", radiusRatio: 0.75 }));
    const unsaid = loss(withElbow({ rectangular: "radius-splitters", radiusRatio: 0.75 }));
    const one = loss(withElbow({ rectangular: "radius-splitters", radiusRatio: 0.75, splitterCount: 1 }));
    const three = loss(withElbow({ rectangular: "radius-splitters", radiusRatio: 0.75, splitterCount: 3 }));
    expect(unsaid).toBe(one);
    expect(one).toBeLessThan(plain);
    expect(three).toBeLessThan(one);
  });

  it("with splitters and no throat are read at the edge of their range, and a finding names them", () => {
    const system = bend(rectangular(0.4, 0.4), {}, withElbow({ rectangular: "radius-splitters", radiusRatio: 0.5 }));
    expect(elbowOf(system)).toMatchObject({ type: "elbow-radius-splitters", clamped: true });
    const finding = solved(system).findings.find(({ code }) => code === "table-range-exceeded");
    expect(finding).toMatchObject({ value: 0.5, limit: 0.55, subject: { id: "turn-out" } });
    expect(finding?.limitSource).toContain("elbow radius splitters");
  });

  it("mitered and round lose as a square throat in a square duct", () => {
    const mitered = elbowOf(bend(round(0.3), {}, withElbow({ round: "mitered" })));
    const square = elbowOf(bend(rectangular(0.3, 0.3), {}, withElbow({ rectangular: "square-throat" })));
    expect(mitered?.type).toBe("elbow-mitered");
    expect(mitered?.lossCoefficient).toBe(square?.lossCoefficient);
  });

  it("with more splitters than are made are refused", () => {
    const splitterCount = 4 as unknown as 3;
    expect(refused(bend(round(0.3), {}, withElbow({ splitterCount })))[0]).toMatchObject({
      code: "value-out-of-range",
      field: "spec.elbow.splitterCount",
      value: 4,
    });
  });
});

describe("an offset", () => {
  const shifted = (fitting: FittingType | null) =>
    aSystem(
      [equipment("unit", [0, 0]), junction("a", [5, 0]), junction("b", [6, 1]), outlet("out", [11, 1], 0.3)],
      [duct("unit", "a", round(0.3)), duct("a", "b", round(0.3), { fitting }), duct("b", "out", round(0.3))],
    );

  it("drawn as two turns loses what its two elbows lose, and the second is not counted again", () => {
    const elbows = solved(shifted(null));
    const offset = solved(shifted("offset"));
    expect(segmentOf(offset, "b-out").fittings).toEqual([]);
    const two = segmentOf(elbows, "a-b").dynamicLoss_pa + segmentOf(elbows, "b-out").dynamicLoss_pa;
    expect(segmentOf(offset, "a-b").dynamicLoss_pa).toBeCloseTo(two, 9);
  });

  it("in a straight run turns by the angle of practice", () => {
    const solution = solved(oneDuct(round(0.3), 0.3, { fitting: "offset" }));
    expect(segmentOf(solution, "unit-out").fittings[0]?.angle_rad).toBe(shippedPractice.offsetAngle_rad);
  });
});

describe("a mouth", () => {
  const at = (service: AirSystem["service"], rest: Partial<AirSegment>) => {
    const system = oneDuct(round(0.3), 0.3, { ...rest, system: { service } });
    const nodes = system.nodes.map((node) => ({ ...node, requiredPressure_pa: null }));
    return solved({ ...system, nodes });
  };

  it.each([
    ["supply", { fitting: "entry-bellmouth" }, 0.0436],
    ["supply", { fitting: "entry-flush" }, 0.5],
    ["supply", { fitting: "plenum" }, 0.5],
    ["supply", { fitting: "entry-projecting" }, 1],
    ["return", { fitting: "plenum" }, 1],
    ["supply", { mouth: "exit-open" }, 1],
    ["exhaust", { mouth: "entry-bellmouth" }, 0.0436],
    ["exhaust", { mouth: "entry-flush" }, 0.5],
    ["outside-air", { mouth: "entry-projecting" }, 1],
  ] as const)("of %s air at %o loses %f velocity pressures", (service, rest, coefficient) => {
    const { fittings, velocityPressure_pa } = segmentOf(at(service, rest), "unit-out");
    expect(fittings).toHaveLength(1);
    expect(fittings[0]?.lossCoefficient).toBeCloseTo(coefficient, 4);
    expect(fittings[0]?.velocityPressure_pa).toBe(velocityPressure_pa);
  });

  it("at the outlet belongs to the outlet's node, and takes the place of the plain open end", () => {
    const open = at("exhaust", {});
    const flush = at("exhaust", { mouth: "entry-flush" });
    const { velocityPressure_pa, fittings } = segmentOf(flush, "unit-out");
    expect(fittings[0]?.nodeId).toBe("out");
    expect(flush.paths[0]?.outletPressure_pa).toBe(0);
    expect(open.requiredPressure_pa - flush.requiredPressure_pa).toBeCloseTo(0.5 * velocityPressure_pa, 9);
  });

  it("of a kind that there is not is refused", () => {
    const mouth = "entry-trumpet" as unknown as "plenum";
    expect(refused(oneDuct(round(0.3), 0.3, { mouth }))[0]).toMatchObject({
      field: "mouth",
      code: "value-out-of-range",
    });
  });
});

describe("accessories", () => {
  const damped = (damperAngle_rad: number | null, section: Section = round(0.3)) =>
    solved(oneDuct(section, 0.3, { accessories: ["volume-damper"], damperAngle_rad }));

  it("a damper without an angle is open", () => {
    const [damper] = segmentOf(damped(null), "unit-out").accessories;
    expect(damper).toMatchObject({ lossCoefficient: 0.2, inputs: [], clamped: false });
  });

  it("a damper at 30° is throttled, and says by how much", () => {
    const [damper] = segmentOf(damped(Math.PI / 6), "unit-out").accessories;
    expect(damper?.lossCoefficient).toBeCloseTo(4.38, 2);
    expect(damper?.inputs).toEqual([{ name: "damper-angle", value: Math.PI / 6 }]);
  });

  it("a damper nearly shut is read at 70°, and a finding names it", () => {
    const solution = damped(1.4);
    expect(segmentOf(solution, "unit-out").accessories[0]?.clamped).toBe(true);
    const finding = solution.findings.find(({ code }) => code === "table-range-exceeded");
    expect(finding).toMatchObject({ value: 1.4, unit: "rad" });
    expect(finding?.limitSource).toContain("volume damper");
  });

  it("an angle without a damper changes nothing", () => {
    const plain = solved(oneDuct(round(0.3), 0.3));
    const turned = solved(oneDuct(round(0.3), 0.3, { damperAngle_rad: 0.5 }));
    expect(turned.requiredPressure_pa).toBe(plain.requiredPressure_pa);
  });

  it("an angle past a quarter turn is refused", () => {
    expect(refused(oneDuct(round(0.3), 0.3, { damperAngle_rad: 2 }))[0]).toMatchObject({
      field: "damperAngle_rad",
      value: 2,
    });
  });

  it("a company's own coefficients take the place of the shipped ones", () => {
    const own = { ...shippedPractice, source: "our readings", fireDamper: 0.3, screenFreeArea: 1 };
    const answer = solve(oneDuct(round(0.3), 0.3, { accessories: ["fire-damper", "screen"] }), own);
    if (!answer.ok) throw new Error("refused");
    expect(segmentOf(answer.value, "unit-out").accessories.map(({ lossCoefficient }) => lossCoefficient)).toEqual([
      0.3, 0,
    ]);
  });
});

it("what rests on a company's coefficient tells the company's source, and only that", () => {
  const own = { ...shippedPractice, source: "our readings of 2025", vanedElbow: 0.15 };
  const spec = { ...ordinary.spec, elbow: { ...ordinary.spec.elbow, rectangular: "square-throat-vanes" as const } };
  const answer = solve(bend(rectangular(0.4, 0.3), {}, { spec }), own);
  if (!answer.ok) throw new Error("refused");
  const [elbow] = segmentOf(answer.value, "turn-out").fittings;
  expect(elbow).toMatchObject({ lossCoefficient: 0.15, inputs: [{ name: "practice-factor", value: 0.15 }] });
  expect(elbow?.source).toBe("Square throat with vanes, by its angle: our readings of 2025");

  const plain = solve(bend(rectangular(0.4, 0.3)), own);
  if (!plain.ok) throw new Error("refused");
  expect(segmentOf(plain.value, "turn-out").fittings[0]?.source).not.toContain("our readings");
});

describe("a branch wider than its main", () => {
  it("is read as one of the main's own size, and a finding names it", () => {
    const system = aSystem(
      [equipment("unit", [0, 0]), junction("tap", [5, 0]), outlet("on", [10, 0], 0.3), outlet("off", [5, 5], 0.2)],
      [duct("unit", "tap", round(0.3)), duct("tap", "on", round(0.3)), duct("tap", "off", round(0.4))],
    );
    const solution = solved(system);
    const tap = segmentOf(solution, "tap-off").fittings[0];
    expect(tap?.clamped).toBe(true);
    expect(tap?.inputs[0]).toEqual({ name: "area-ratio", value: 1 });
    expect(solution.findings.find(({ code }) => code === "table-range-exceeded")?.limitSource).toContain(
      "tap straight",
    );
  });
});
