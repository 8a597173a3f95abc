import { describe, expect, it } from "vitest";
import { benchSystem } from "../checks/many-segments.ts";
import { meters, pascals } from "../quantity.ts";
import {
  aSystem,
  duct,
  equipment,
  flatOval,
  junction,
  oneDuct,
  ordinary,
  outlet,
  rectangular,
  round,
} from "../testing/air-system-builder.ts";
import { findingIds, segmentOf, solved } from "../testing/answers.ts";
import { solve } from "./solve.ts";

/** Unit, tee, a near outlet to the side, a far outlet straight on. */
const branched = (rest: Parameters<typeof aSystem>[2] = {}) =>
  aSystem(
    [
      equipment("unit", [0, 0]),
      junction("tee", [10, 0]),
      outlet("near", [10, 5], 0.2, 20),
      outlet("far", [30, 0], 0.3, 20),
    ],
    [duct("unit", "tee", round(0.4)), duct("tee", "near", round(0.2)), duct("tee", "far", round(0.3))],
    rest,
  );

describe("flows", () => {
  it("add up toward the equipment", () => {
    const solution = solved(branched());
    expect(segmentOf(solution, "unit-tee").volumetricFlowRate_m3s).toBeCloseTo(0.5, 12);
    expect(segmentOf(solution, "unit-tee").outletCount).toBe(2);
    expect(solution.outletAirflow_m3s).toBeCloseTo(0.5, 12);
  });
});

describe("paths", () => {
  const solution = solved(branched());
  const [near, far] = solution.paths;

  it("run from the equipment to each outlet, in the order of the outlets", () => {
    expect(solution.paths.map(({ outletNodeId, segmentIds }) => [outletNodeId, segmentIds])).toEqual([
      ["near", ["unit-tee", "tee-near"]],
      ["far", ["unit-tee", "tee-far"]],
    ]);
  });

  it("require their losses and what the outlet needs", () => {
    for (const path of solution.paths) {
      const losses = path.segmentIds.reduce((sum, id) => sum + segmentOf(solution, id).totalPressureLoss_pa, 0);
      expect(path.requiredPressure_pa).toBeCloseTo(losses + 20, 9);
      expect(path.frictionLoss_pa + path.dynamicLoss_pa).toBeCloseTo(losses, 9);
    }
  });

  it("are governed by the one that needs the most", () => {
    expect(solution.governingOutletNodeId).toBe("near");
    expect(solution.requiredPressure_pa).toBe(near?.requiredPressure_pa);
    expect(near?.throttle_pa).toBe(0);
    expect(far?.throttle_pa).toBeCloseTo((near?.requiredPressure_pa ?? NaN) - (far?.requiredPressure_pa ?? NaN), 9);
  });

  it("leave what the equipment gives beyond their need", () => {
    expect(far?.spare_pa).toBeCloseTo(250 - (far?.requiredPressure_pa ?? NaN), 9);
    const end = segmentOf(solution, "tee-far");
    expect(end.pressureLeftLeaving_pa - 20).toBeCloseTo(far?.spare_pa ?? NaN, 9);
  });

  it("charge an outlet that names no pressure one velocity pressure, as an open end", () => {
    const system = aSystem(
      [equipment("unit", [0, 0]), outlet("out", [9, 0], 0.2, null)],
      [duct("unit", "out", round(0.2))],
    );
    const open = solved(system);
    expect(open.paths[0]?.outletPressure_pa).toBe(segmentOf(open, "unit-out").velocityPressure_pa);
  });
});

describe("pressure left", () => {
  it("of a segment begins where the one before ends", () => {
    const solution = solved(branched());
    const trunk = segmentOf(solution, "unit-tee");
    expect(trunk.pressureLeftEntering_pa).toBe(250);
    expect(segmentOf(solution, "tee-near").pressureLeftEntering_pa).toBeCloseTo(trunk.pressureLeftLeaving_pa, 9);
  });
});

describe("length", () => {
  it("comes from the positions of the nodes, levels included, when none is typed", () => {
    const levels = [...ordinary.levels, { id: "lvl_2", name: "Level 2", elevation_m: meters(4) }];
    const up = { ...outlet("out", [3, 0], 0.1), levelId: "lvl_2" };
    const solution = solved(aSystem([equipment("unit", [0, 0]), up], [duct("unit", "out", round(0.2))], { levels }));
    expect(solution.segments[0]?.length_m).toBeCloseTo(5, 12);
  });

  it("is the typed one where there is one", () => {
    expect(solved(oneDuct(round(0.2), 0.1, { length_m: meters(42) })).segments[0]?.length_m).toBe(42);
  });
});

describe("lined duct", () => {
  const liner = { kind: "liner", thickness_m: meters(0.025) } as const;

  it("is solved on its clear inside where drawings show the metal", () => {
    const spec = { ...ordinary.spec, sizesAre: "sheet-metal" } as const;
    const solution = solved(oneDuct(rectangular(0.5, 0.3), 0.4, { insulation: liner, system: { spec } }));
    expect(solution.segments[0]?.section).toEqual({
      shape: "rectangular",
      width_m: expect.closeTo(0.45, 12) as number,
      height_m: expect.closeTo(0.25, 12) as number,
    });
  });

  it("keeps its size where drawings show the clear inside, and loses more than bare metal", () => {
    const bare = solved(oneDuct(rectangular(0.5, 0.3), 0.4)).segments[0];
    const lined = solved(oneDuct(rectangular(0.5, 0.3), 0.4, { insulation: liner })).segments[0];
    expect(lined?.section).toEqual(bare?.section);
    expect(lined?.frictionLoss_pa).toBeGreaterThan(1.2 * (bare?.frictionLoss_pa ?? NaN));
  });
});

describe("service", () => {
  it("changes junctions from diverging to converging", () => {
    const supply = segmentOf(solved(branched()), "tee-near").fittings[0];
    const exhaust = segmentOf(solved(branched({ service: "exhaust" })), "tee-near").fittings[0];
    expect(supply?.source).toContain("diverging");
    expect(exhaust?.source).toContain("converging");
    expect(exhaust?.loss_pa).not.toBeCloseTo(supply?.loss_pa ?? NaN, 3);
  });

  it.each(["return", "exhaust", "outside-air"] as const)(
    "%s gives flows, paths and pressures like supply",
    (service) => {
      const solution = solved(branched({ service }));
      expect(solution.paths).toHaveLength(2);
      expect(segmentOf(solution, "unit-tee").volumetricFlowRate_m3s).toBeCloseTo(0.5, 12);
    },
  );

  it("turns a contraction into an expansion when the air comes back", () => {
    const narrowing = (service: "supply" | "return") =>
      aSystem(
        [equipment("unit", [0, 0]), junction("a", [5, 0]), outlet("out", [10, 0], 0.3)],
        [duct("unit", "a", round(0.4)), duct("a", "out", round(0.3))],
        { service },
      );
    const contraction = segmentOf(solved(narrowing("supply")), "a-out").fittings[0];
    const expansion = segmentOf(solved(narrowing("return")), "a-out").fittings[0];
    expect(expansion?.velocityPressure_pa).toBeCloseTo(contraction?.velocityPressure_pa ?? NaN, 12);
    expect(expansion?.loss_pa).toBeGreaterThan(2 * (contraction?.loss_pa ?? NaN));
  });
});

describe("leakage", () => {
  it("is told beside the outlets' air and falls with a tighter seal class", () => {
    const leaks = (["none", "C", "B", "A"] as const).map(
      (sealClass) => solved(branched({ spec: { ...ordinary.spec, sealClass } })).leakage_m3s,
    );
    expect(leaks).toEqual([...leaks].sort((a, b) => b - a));
    expect(new Set(leaks).size).toBe(4);
  });

  it("sums over the segments", () => {
    const solution = solved(branched());
    const sum = solution.segments.reduce((total, { leakage_m3s }) => total + leakage_m3s, 0);
    expect(solution.leakage_m3s).toBeCloseTo(sum, 12);
  });
});

describe("findings", () => {
  /** Without those that are about how the system is built and balanced. */
  const ofLimits = (solution: Parameters<typeof findingIds>[0]) =>
    findingIds(solution).filter((id) => LIMIT_CODES.some((code) => id.startsWith(code)));
  const LIMIT_CODES = [
    "velocity-over",
    "friction-over",
    "pressure-short",
    "flexible-too-long",
    "flow-",
    "aspect-",
    "table-",
    "pressure-class",
    "size-",
  ];

  it("name limit and source, and are told worst first, then in the order of the system", () => {
    const slow = { ...ordinary.limits.velocity_m_s, main: 1 as typeof ordinary.limits.velocity_m_s.main };
    const design = { ...ordinary.design, availablePressure_pa: pascals(30) };
    const solution = solved(branched({ design, limits: { ...ordinary.limits, velocity_m_s: slow } }));
    expect(ofLimits(solution)).toEqual([
      "pressure-short:near",
      "pressure-short:far",
      "velocity-over-limit:unit-tee",
      "velocity-over-limit:tee-near",
      "velocity-over-limit:tee-far",
    ]);
    expect(solution.findings[2]).toMatchObject({ severity: "warn", limit: 1, unit: "m/s" });
    expect(solution.findings[2]?.limitSource).toContain("velocity limit for a main");
  });

  it("mark flexible duct that is too long", () => {
    expect(ofLimits(solved(oneDuct(round(0.25), 0.1, { flexible: true })))).toEqual(["flexible-too-long:unit-out"]);
  });

  it("mark flow that is neither laminar nor turbulent", () => {
    expect(ofLimits(solved(oneDuct(round(0.3), 0.01)))).toEqual(["flow-transitional:unit-out"]);
  });

  it("mark a duct flatter than four to one", () => {
    expect(ofLimits(solved(oneDuct(flatOval(1.01, 0.25), 0.5)))).toEqual(["aspect-ratio-high:unit-out"]);
    expect(ofLimits(solved(oneDuct(rectangular(1, 0.25), 0.5)))).toEqual([]);
  });

  it("mark static pressure above the pressure class", () => {
    const spec = { ...ordinary.spec, pressureClass_pa: pascals(-125) };
    expect(ofLimits(solved(oneDuct(round(0.3), 0.3, { system: { spec } })))).toEqual([
      "pressure-class-exceeded:unit-out",
    ]);
  });

  it("are none for a sound system: lined, balanced, with a fan that fits", () => {
    const spec = { ...ordinary.spec, insulation: { kind: "liner" as const, thickness_m: meters(0.025) } };
    const design = { ...ordinary.design, availablePressure_pa: pascals(100) };
    const sound = branched({ spec, design });
    const nodes = sound.nodes.map((node) => (node.id === "far" ? { ...node, requiredPressure_pa: pascals(40) } : node));
    expect(solved({ ...sound, nodes }).findings).toEqual([]);
  });
});

describe("accessories", () => {
  it("lose pressure beside the fittings", () => {
    const plain = solved(oneDuct(round(0.2), 0.2)).segments[0];
    const damped = solved(oneDuct(round(0.2), 0.2, { accessories: ["volume-damper", "access-door"] })).segments[0];
    expect(damped?.accessories.map(({ kind, lossCoefficient }) => [kind, lossCoefficient])).toEqual([
      ["volume-damper", 0.2],
      ["access-door", 0],
    ]);
    expect(damped?.dynamicLoss_pa).toBeCloseTo(0.2 * (plain?.velocityPressure_pa ?? NaN), 9);
  });
});

describe("flexible duct", () => {
  it("loses more when it is left slack", () => {
    const at = (flexibleSlack: number) =>
      solved(oneDuct(round(0.2), 0.1, { flexible: true, system: { spec: { ...ordinary.spec, flexibleSlack } } }));
    expect(at(0.15).requiredPressure_pa).toBeGreaterThan(3 * at(0).requiredPressure_pa);
  });

  it("outside the fitted range of slack is marked", () => {
    const spec = { ...ordinary.spec, flexibleSlack: 0.5 };
    const solution = solved(oneDuct(round(0.2), 0.1, { flexible: true, length: 1, system: { spec } }));
    expect(findingIds(solution)).toContain("table-range-exceeded:unit-out");
  });
});

describe("the answer", () => {
  it("is plain data: the same after JSON and after a structured clone, records included", () => {
    const answer = solve(benchSystem(40));
    if (!answer.ok) throw new Error("the system is sound");
    const cloned = structuredClone(answer.value);
    expect(cloned.segments).toHaveLength(40);
    expect(cloned.paths.length).toBeGreaterThan(5);
    expect(JSON.parse(JSON.stringify(answer.value))).toEqual(JSON.parse(JSON.stringify(cloned)));
    expect(cloned).toEqual({ ...answer.value });
  });

  it("hands out the same records each time they are read", () => {
    const answer = solve(benchSystem(40));
    if (!answer.ok) throw new Error("the system is sound");
    expect(answer.value.segments).toBe(answer.value.segments);
    expect(answer.value.paths).toBe(answer.value.paths);
  });
});
