/** Fan, gauge pressures and damper settings: hand figures, and laws on trees made by chance. */
import { describe, expect, it } from "vitest";
import { radians } from "../quantity.ts";
import { damperCoefficient } from "../fittings/throttled-damper.ts";
import { shippedPractice } from "../fittings/practice.table.ts";
import { aSystem, duct, equipment, junction, ordinary, outlet, round } from "../testing/air-system-builder.ts";
import { segmentOf, solved } from "../testing/answers.ts";

const twoOutlets = (rest: Parameters<typeof aSystem>[2] = {}) =>
  aSystem(
    [
      equipment("unit", [0, 0]),
      junction("tee", [10, 0]),
      outlet("near", [10, 4], 0.2, 20),
      outlet("far", [40, 0], 0.3, 20),
    ],
    [duct("unit", "tee", round(0.4)), duct("tee", "near", round(0.25)), duct("tee", "far", round(0.3))],
    rest,
  );
const withMargin = (safetyMargin: number) => ({ design: { ...ordinary.design, safetyMargin } });

describe("the fan", () => {
  it("moves what the outlets take and what leaks", () => {
    const { fan, leakage_m3s } = solved(twoOutlets());
    expect(leakage_m3s).toBeGreaterThan(0);
    expect(fan.airflow_m3s).toBeCloseTo(0.5 + leakage_m3s, 12);
  });

  it("makes what is required and the margin on top, which changes no other number", () => {
    const bare = solved(twoOutlets(withMargin(0)));
    const safe = solved(twoOutlets(withMargin(0.1)));
    expect(safe.fan.marginPressure_pa).toBeCloseTo(0.1 * bare.requiredPressure_pa, 12);
    expect(safe.fan.totalPressure_pa).toBeCloseTo(1.1 * bare.requiredPressure_pa, 12);
    expect(safe.requiredPressure_pa).toBe(bare.requiredPressure_pa);
    expect(safe.paths).toEqual(bare.paths);
    expect(safe.segments).toEqual(bare.segments);
  });

  it("is rated static by the velocity pressure of the duct that leaves it", () => {
    const solution = solved(twoOutlets(withMargin(0.1)));
    const first = segmentOf(solution, "unit-tee");
    expect(solution.fan.velocityPressure_pa).toBe(first.velocityPressure_pa);
    expect(solution.fan.staticPressure_pa).toBeCloseTo(solution.fan.totalPressure_pa - first.velocityPressure_pa, 12);
  });

  it("has a margin from 0 to 0.5", () => {
    expect(() => solved(twoOutlets(withMargin(0.6)))).toThrow(/safetyMargin/);
  });
});

describe("gauge pressures", () => {
  const signs = { supply: 1, return: -1, exhaust: -1, "outside-air": -1 } as const;

  it.each(["supply", "return", "exhaust", "outside-air"] as const)(
    "of %s lie on the fan's side of the room, and fall to what the governing outlet needs",
    (service) => {
      const solution = solved(twoOutlets({ service }));
      const governing = solution.paths.find(({ outletNodeId }) => outletNodeId === solution.governingOutletNodeId)!;
      const last = segmentOf(solution, governing.segmentIds.at(-1)!);
      expect(last.totalPressureLeaving_pa).toBeCloseTo(signs[service] * governing.outletPressure_pa, 9);
      for (const segment of solution.segments) {
        expect(signs[service] * segment.totalPressureEntering_pa).toBeGreaterThan(
          signs[service] * segment.totalPressureLeaving_pa,
        );
      }
    },
  );

  it.each(["supply", "return"] as const)("of %s: total is static and velocity pressure, at both ends", (service) => {
    for (const segment of solved(twoOutlets({ service })).segments) {
      const velocityPressure = segment.velocityPressure_pa;
      expect(segment.staticPressureEntering_pa + velocityPressure).toBeCloseTo(segment.totalPressureEntering_pa, 9);
      expect(segment.staticPressureLeaving_pa + velocityPressure).toBeCloseTo(segment.totalPressureLeaving_pa, 9);
    }
  });

  it("fall from one segment into the next by the fittings between them", () => {
    const solution = solved(twoOutlets());
    const before = segmentOf(solution, "unit-tee");
    for (const id of ["tee-near", "tee-far"]) {
      const after = segmentOf(solution, id);
      expect(before.totalPressureLeaving_pa - after.totalPressureEntering_pa).toBeCloseTo(after.dynamicLoss_pa, 9);
    }
  });
});

describe("a damper setting", () => {
  const nearPath = (system: ReturnType<typeof twoOutlets>) =>
    solved(system).paths.find(({ outletNodeId }) => outletNodeId === "near")!;

  it("takes up the excess: with the blade so turned, both outlets need the same", () => {
    const open = twoOutlets();
    const { damper } = nearPath(open);
    expect(damper).toMatchObject({ segmentId: "tee-near", isThere: false });
    const segments = open.segments.map((segment) =>
      segment.id === "tee-near"
        ? { ...segment, accessories: ["volume-damper" as const], damperAngle_rad: damper!.angle_rad! }
        : segment,
    );
    const { paths } = solved({ ...open, segments });
    expect(paths[0]!.requiredPressure_pa).toBeCloseTo(paths[1]!.requiredPressure_pa, 6);
    expect(paths.every((path) => path.damper === null)).toBe(true);
  });

  it("gives the coefficient that its angle has", () => {
    const { damper } = nearPath(twoOutlets());
    const coefficient = damperCoefficient(shippedPractice.damper.other, radians(damper!.angle_rad!));
    expect(coefficient).toBeCloseTo(damper!.lossCoefficient, 9);
  });

  it("is not told for the governing outlet, which has nothing to take up", () => {
    const solution = solved(twoOutlets());
    const governing = solution.paths.find(({ outletNodeId }) => outletNodeId === solution.governingOutletNodeId);
    expect(governing!.damper).toBeNull();
  });

  it("has no angle where no turn of the blade takes up so much", () => {
    const system = twoOutlets();
    const nodes = system.nodes.map((node) =>
      node.id === "far" ? { ...node, requiredPressure_pa: 20_000 as typeof node.requiredPressure_pa } : node,
    );
    expect(nearPath({ ...system, nodes }).damper).toMatchObject({ angle_rad: null });
  });
});
