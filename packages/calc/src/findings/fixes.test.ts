import fc from "fast-check";
import { describe, expect, it } from "vitest";
import type { AirSystem } from "../air-system.ts";
import { feetPerMinute, meters, pascals } from "../quantity.ts";
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
import { withEdits } from "./fix.ts";
import { fixesFor } from "./fixes.ts";

const fixesOf = (system: AirSystem, code: string) => {
  const solution = solved(system);
  const finding = solution.findings.find((each) => each.code === code);
  if (!finding) throw new Error(`no ${code} among ${findingIds(solution).join(", ")}`);
  return { finding, fixes: fixesFor(finding, system, solution) };
};
const limits = (velocity: number) => ({
  limits: {
    ...ordinary.limits,
    velocity_m_s: { main: feetPerMinute(velocity), branch: feetPerMinute(velocity), runout: feetPerMinute(velocity) },
  },
});

/** A main with a branch, sized by chance; what is found on it is found by chance too. */
const anySystem = fc
  .record({
    main: fc.integer({ min: 8, max: 40 }),
    width: fc.integer({ min: 6, max: 40 }),
    height: fc.integer({ min: 6, max: 16 }),
    far: fc.double({ min: 0.05, max: 1.5, noNaN: true }),
    near: fc.double({ min: 0.05, max: 0.8, noNaN: true }),
    available: fc.integer({ min: 20, max: 600 }),
    flexible: fc.boolean(),
  })
  .map(({ main, width, height, far, near, available, flexible }) =>
    aSystem(
      [
        equipment("unit", [0, 0]),
        junction("tee", [6, 0]),
        junction("turn", [30, 0]),
        outlet("near", [6, 4], near, 20),
        outlet("far", [30, 12], far, 20),
      ],
      [
        duct("unit", "tee", round(main * 0.0254)),
        duct("tee", "near", round(0.2), { flexible, ductClass: "runout" }),
        duct("tee", "turn", rectangular(width * 0.0254, height * 0.0254)),
        duct("turn", "far", rectangular(width * 0.0254, height * 0.0254)),
      ],
      {
        design: { ...ordinary.design, availablePressure_pa: pascals(available) },
        spec: { ...ordinary.spec, elbow: { ...ordinary.spec.elbow, rectangular: "square-throat" } },
      },
    ),
  );

describe("a fix", () => {
  it("does what it says: with it made, the finding is gone or nearer its limit", () => {
    fc.assert(
      fc.property(anySystem, (system) => {
        const solution = solved(system);
        for (const finding of solution.findings) {
          for (const fix of fixesFor(finding, system, solution)) {
            const after = solved(withEdits(system, fix.edits)).findings.find(({ id }) => id === finding.id);
            expect(after === undefined).toBe(fix.clears);
            if (after)
              expect(Math.abs(after.value - after.limit)).toBeLessThan(Math.abs(finding.value - finding.limit));
          }
        }
      }),
      { numRuns: 60 },
    );
  });

  it("makes the system need no more pressure than it did, where pressure is short", () => {
    fc.assert(
      fc.property(anySystem, (system) => {
        const solution = solved(system);
        for (const finding of solution.findings) {
          for (const fix of fixesFor(finding, system, solution)) {
            const after = solved(withEdits(system, fix.edits));
            const isShort = after.requiredPressure_pa > system.design.availablePressure_pa;
            const was = solution.requiredPressure_pa * (1 + 1e-5);
            if (isShort && !findingIds(solution).some((id) => id.startsWith("pressure-short")))
              expect(after.requiredPressure_pa).toBeLessThanOrEqual(was);
          }
        }
      }),
      { numRuns: 40 },
    );
  });
});

describe("a duct that is too fast", () => {
  it("gets the next standard size that is slow enough, at its own height", () => {
    const flow = 0.3 * 0.6 * 1.2 * feetPerMinute(1500);
    const { fixes } = fixesOf(
      oneDuct(rectangular(24 * 0.0254, 12 * 0.0254), flow, { system: limits(1500) }),
      "velocity-over-limit",
    );
    expect(fixes).toMatchObject([{ kind: "larger-duct", clears: true }]);
    const section = fixes[0]!.edits[0]!.fields.section!;
    if (section.shape !== "rectangular") throw new Error("the shape stays");
    expect(section.height_m).toBeCloseTo(12 * 0.0254, 9);
    expect(flow / (section.width_m * section.height_m)).toBeLessThanOrEqual(feetPerMinute(1500));
    expect(flow / ((section.width_m - 2 * 0.0254) * section.height_m)).toBeGreaterThan(feetPerMinute(1500));
  });
});

describe("an outlet with an excess", () => {
  it("gets a damper so turned that nothing is left to take up", () => {
    const system = aSystem(
      [
        equipment("unit", [0, 0]),
        junction("tee", [10, 0]),
        outlet("near", [10, 4], 0.2, 20),
        outlet("far", [90, 0], 0.3, 60),
      ],
      [duct("unit", "tee", round(0.4)), duct("tee", "near", round(0.25)), duct("tee", "far", round(0.25))],
    );
    const { fixes } = fixesOf(system, "damper-missing");
    expect(fixes).toMatchObject([{ kind: "balancing-damper", clears: true }]);
    const [near] = solved(withEdits(system, fixes[0]!.edits)).paths;
    expect(near!.throttle_pa).toBeLessThan(0.1);
  });
});

describe("a path that needs more than there is", () => {
  it("gets a larger duct where most is lost", () => {
    const system = aSystem(
      [equipment("unit", [0, 0]), junction("j", [5, 0]), outlet("far", [80, 0], 0.3, 20)],
      [duct("unit", "j", round(0.3)), duct("j", "far", round(0.25))],
      { design: { ...ordinary.design, availablePressure_pa: pascals(60) } },
    );
    const { fixes } = fixesOf(system, "pressure-short");
    expect(fixes[0]).toMatchObject({ kind: "larger-duct", edits: [{ segmentId: "j-far" }] });
  });
});

describe("flexible duct that is too long", () => {
  it("becomes rigid", () => {
    const system = oneDuct(round(0.2), 0.1, { flexible: true, length_m: meters(9) });
    expect(fixesOf(system, "flexible-too-long").fixes).toMatchObject([{ kind: "rigid-duct", clears: true }]);
  });
});

describe("what the spec decides", () => {
  it("has no fix in the layout", () => {
    const system = oneDuct(round(0.3), 0.2, { system: { spec: { ...ordinary.spec, sealClass: "none" } } });
    expect(fixesOf(system, "seal-class-low").fixes).toEqual([]);
  });
});
