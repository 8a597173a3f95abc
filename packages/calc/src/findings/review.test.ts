import { describe, expect, it } from "vitest";
import { feetPerMinute, inchesOfWater, meters, pascals } from "../quantity.ts";
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
import { findingIds, solved } from "../testing/answers.ts";

const spec = (part: Partial<typeof ordinary.spec>) => ({ spec: { ...ordinary.spec, ...part } });
const design = (part: Partial<typeof ordinary.design>) => ({ design: { ...ordinary.design, ...part } });

/** Unit, tee, a near outlet to the side, a far outlet straight on. */
const branched = (near: Parameters<typeof duct>[3] = {}, rest: Parameters<typeof aSystem>[2] = {}) =>
  aSystem(
    [
      equipment("unit", [0, 0]),
      junction("tee", [10, 0]),
      outlet("near", [10, 4], 0.2, 20),
      outlet("far", [90, 0], 0.3, 60),
    ],
    [duct("unit", "tee", round(0.4)), duct("tee", "near", round(0.25), near), duct("tee", "far", round(0.25))],
    rest,
  );
const has = (system: Parameters<typeof solved>[0], id: string) => findingIds(solved(system)).includes(id);

describe("pressure at the outlets", () => {
  it("an excess without a damper asks for one; with one it is only loud", () => {
    expect(has(branched(), "damper-missing:near")).toBe(true);
    const damped = branched({ accessories: ["volume-damper"] });
    expect(has(damped, "damper-missing:near")).toBe(false);
    expect(has(damped, "outlet-over-pressured:near")).toBe(true);
  });
  it("is unequal where one path needs less than half of another", () => {
    expect(has(branched(), "paths-unequal:sys_1")).toBe(true);
    expect(has(oneDuct(round(0.3), 0.2), "paths-unequal:sys_1")).toBe(false);
  });
});

describe("pressure at the equipment", () => {
  const required = solved(branched()).requiredPressure_pa;
  const given = (share: number, safetyMargin: number) =>
    branched({}, design({ availablePressure_pa: pascals(share * required), safetyMargin }));

  it("is short of its margin between what is required and what is required with it", () => {
    expect(has(given(1.05, 0.1), "margin-short:sys_1")).toBe(true);
    expect(has(given(1.15, 0.1), "margin-short:sys_1")).toBe(false);
    expect(has(given(1.05, 0), "margin-short:sys_1")).toBe(false);
  });
  it("is told when it is more than twice what is required", () => {
    expect(has(given(2.1, 0), "reserve-large:sys_1")).toBe(true);
    expect(has(given(1.9, 0), "reserve-large:sys_1")).toBe(false);
  });
});

describe("tightness", () => {
  it("asks for the seal class that the pressure class asks for", () => {
    const sealed = (sealClass: "A" | "B" | "C" | "none", inwg: number) =>
      has(branched({}, spec({ sealClass, pressureClass_pa: inchesOfWater(inwg) })), "seal-class-low:sys_1");
    expect(sealed("C", 2)).toBe(false);
    expect(sealed("none", 2)).toBe(true);
    expect(sealed("C", 3)).toBe(true);
    expect(sealed("B", 3)).toBe(false);
    expect(sealed("B", 4)).toBe(true);
    expect(sealed("A", 10)).toBe(false);
    expect(sealed("B", -4)).toBe(true);
  });
  it("tells a share of leakage above one twentieth", () => {
    expect(has(branched({}, spec({ sealClass: "none" })), "leakage-high:sys_1")).toBe(true);
    expect(has(branched({}, spec({ sealClass: "A" })), "leakage-high:sys_1")).toBe(false);
  });
});

describe("a duct", () => {
  it("is slow under 300 fpm, unless it is a runout", () => {
    const flow = 1.4 * Math.PI * 0.25 * 0.4 ** 2;
    expect(feetPerMinute(300)).toBeGreaterThan(1.4);
    expect(findingIds(solved(oneDuct(round(0.4), flow))).some((id) => id.startsWith("velocity-low"))).toBe(true);
    const runout = oneDuct(round(0.4), flow, { ductClass: "runout" });
    expect(findingIds(solved(runout)).some((id) => id.startsWith("velocity-low"))).toBe(false);
  });
  it("is told when it is larger than the one that feeds it", () => {
    const system = aSystem(
      [equipment("unit", [0, 0]), junction("j", [10, 0]), outlet("out", [20, 0], 0.3, 20)],
      [duct("unit", "j", round(0.3)), duct("j", "out", round(0.35))],
    );
    expect(has(system, "duct-grows:j-out")).toBe(true);
    expect(has(branched(), "duct-grows:tee-far")).toBe(false);
  });
  it("is lined where it leaves the unit, in supply and return", () => {
    expect(has(branched(), "unlined-near-equipment:unit-tee")).toBe(true);
    expect(has(branched({}, { service: "exhaust" }), "unlined-near-equipment:unit-tee")).toBe(false);
    const lined = branched({}, spec({ insulation: { kind: "liner", thickness_m: meters(0.025) } }));
    expect(has(lined, "unlined-near-equipment:unit-tee")).toBe(false);
  });
  it("hangs slack only where there is flexible duct", () => {
    const slack = spec({ flexibleSlack: 0.1 });
    expect(has(branched({ flexible: true }, slack), "flexible-slack:sys_1")).toBe(true);
    expect(has(branched({}, slack), "flexible-slack:sys_1")).toBe(false);
    expect(has(branched({ flexible: true }, spec({ flexibleSlack: 0.04 })), "flexible-slack:sys_1")).toBe(false);
  });
});

describe("a fitting", () => {
  /** A run with one turn after `first` meters and a second after `second`. */
  const bent = (first: number, second: number, flow: number, rest: Parameters<typeof aSystem>[2] = {}) =>
    aSystem(
      [
        equipment("unit", [0, 0]),
        junction("a", [first, 0]),
        junction("b", [first, second]),
        outlet("out", [first + 20, second], flow, 20),
      ],
      [
        duct("unit", "a", rectangular(0.5, 0.5)),
        duct("a", "b", rectangular(0.5, 0.5)),
        duct("b", "out", rectangular(0.5, 0.5)),
      ],
      rest,
    );
  const squareThroat = spec({ elbow: { ...ordinary.spec.elbow, rectangular: "square-throat" } });

  it("turns too sharply when it is square in the throat and the air faster than 2,000 fpm", () => {
    expect(has(bent(20, 20, 0.25 * feetPerMinute(2050), squareThroat), "elbow-too-sharp:a-b")).toBe(true);
    expect(has(bent(20, 20, 0.25 * feetPerMinute(1950), squareThroat), "elbow-too-sharp:a-b")).toBe(false);
  });
  it("stands too close after another within three hydraulic diameters", () => {
    expect(has(bent(20, 1.4, 1), "fittings-too-close:a-b")).toBe(true);
    expect(has(bent(20, 1.6, 1), "fittings-too-close:a-b")).toBe(false);
  });
  it("stands too close to the fan within two and a half", () => {
    expect(has(bent(1.2, 20, 1), "turn-near-equipment:unit-a")).toBe(true);
    expect(has(bent(1.3, 20, 1), "turn-near-equipment:unit-a")).toBe(false);
  });
  it("changes size abruptly where its duct is shorter than the spec's angle needs", () => {
    const system = (length: number) =>
      aSystem(
        [equipment("unit", [0, 0]), junction("j", [10, 0]), outlet("out", [10 + length, 0], 0.5, 20)],
        [duct("unit", "j", rectangular(0.9, 0.4)), duct("j", "out", rectangular(0.5, 0.4))],
        spec({ transitionAngle_rad: Math.PI / 6 }),
      );
    // (0.9 − 0.5) / 2 / tan 15° = 0.746 m
    expect(has(system(0.7), "transition-abrupt:j-out")).toBe(true);
    expect(has(system(0.8), "transition-abrupt:j-out")).toBe(false);
  });
});
