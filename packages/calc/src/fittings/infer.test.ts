import { describe, expect, it } from "vitest";
import type { AirSegment, FittingType, Section } from "../air-system.ts";
import { cubicMetersPerSecond, meters } from "../quantity.ts";
import {
  aSystem,
  duct,
  equipment,
  flatOval,
  junction,
  ordinary,
  outlet,
  rectangular,
  round,
} from "../testing/air-system-builder.ts";
import { fittingTypes, segmentOf, solved } from "../testing/answers.ts";

/** Unit to a node, then on to an outlet at `to`. */
const bend = (
  to: readonly [number, number, number?],
  before: Section,
  after: Section,
  rest: Partial<AirSegment> = {},
) =>
  aSystem(
    [equipment("unit", [0, 0]), junction("turn", [10, 0]), outlet("out", to, 0.3)],
    [duct("unit", "turn", before), duct("turn", "out", after, rest)],
  );

describe("where one segment follows another", () => {
  it("nothing happens straight on at the same size", () => {
    expect(fittingTypes(solved(bend([20, 0], round(0.3), round(0.3))), "turn-out")).toEqual([]);
  });

  it("a bend is an elbow of the spec's kind", () => {
    expect(fittingTypes(solved(bend([10, 5], round(0.3), round(0.3))), "turn-out")).toEqual(["elbow-smooth"]);
    expect(fittingTypes(solved(bend([10, 5], rectangular(0.4, 0.3), rectangular(0.4, 0.3))), "turn-out")).toEqual([
      "elbow-radius",
    ]);
    expect(fittingTypes(solved(bend([10, 5], flatOval(0.4, 0.3), flatOval(0.4, 0.3))), "turn-out")).toEqual([
      "elbow-smooth",
    ]);
  });

  it("a riser turns up by an elbow", () => {
    const elbow = segmentOf(solved(bend([10, 0, 4], round(0.3), round(0.3))), "turn-out").fittings[0];
    expect(elbow?.type).toBe("elbow-smooth");
    expect(elbow?.angle_rad).toBeCloseTo(Math.PI / 2, 12);
  });

  it("a rectangular bend upward turns in its height, which loses more for a flat duct", () => {
    const flat = rectangular(0.8, 0.2);
    const sideways = segmentOf(solved(bend([10, 5], flat, flat)), "turn-out").fittings[0];
    const upward = segmentOf(solved(bend([10, 0, 5], flat, flat)), "turn-out").fittings[0];
    expect(upward?.lossCoefficient).not.toBeCloseTo(sideways?.lossCoefficient ?? NaN, 3);
  });

  it("a wobble of a few degrees is no elbow", () => {
    expect(fittingTypes(solved(bend([20, 1], round(0.3), round(0.3))), "turn-out")).toEqual([]);
  });

  it("the angle of the bend is the elbow's", () => {
    const elbow = segmentOf(solved(bend([15, 5], round(0.3), round(0.3))), "turn-out").fittings[0];
    expect(elbow?.angle_rad).toBeCloseTo(Math.PI / 4, 12);
  });

  it("a change of size is a transition", () => {
    expect(fittingTypes(solved(bend([20, 0], round(0.4), round(0.3))), "turn-out")).toEqual(["transition"]);
  });

  it("a change of shape is a transition of its own kind", () => {
    expect(fittingTypes(solved(bend([20, 0], rectangular(0.4, 0.3), round(0.3))), "turn-out")).toEqual([
      "shape-transition",
    ]);
  });

  it("a change of size in a bend is a transition and an elbow", () => {
    const solution = solved(bend([10, 5], round(0.4), round(0.3)));
    expect(fittingTypes(solution, "turn-out")).toEqual(["transition", "elbow-smooth"]);
    expect(segmentOf(solution, "turn-out").fittings[1]?.upstreamSection).toEqual(round(0.3));
  });

  it("flexible duct bends by itself, and no piece is made", () => {
    const elbow = segmentOf(solved(bend([10, 5], round(0.3), round(0.3), { flexible: true })), "turn-out").fittings[0];
    expect(elbow).toMatchObject({ type: "elbow-smooth", madeHere: false });
  });

  it("twelve inches typed in inches and in millimeters are one size", () => {
    expect(fittingTypes(solved(bend([20, 0], round(12 * 0.0254), round(0.3048))), "turn-out")).toEqual([]);
  });
});

/** A trunk to a node with legs to outlets at the given points, all carrying the same air. */
const fork = (ends: readonly (readonly [number, number])[], leg: Section = round(0.2), trunk: Section = round(0.4)) =>
  aSystem(
    [
      equipment("unit", [0, 0]),
      junction("fork", [10, 0]),
      ...ends.map(([x, y], index) => outlet(`out${index}`, [x, y], 0.2)),
    ],
    [duct("unit", "fork", trunk), ...ends.map((_, index) => duct("fork", `out${index}`, leg))],
  );

const firstTypes = (system: ReturnType<typeof fork>): (FittingType | undefined)[] => {
  const solution = solved(system);
  return solution.segments.slice(1).map(({ fittings }) => fittings[0]?.type);
};

describe("where a segment branches", () => {
  it("a leg to the side of a main that runs on is a tap, which the main feels too", () => {
    const solution = solved(
      fork([
        [20, 0],
        [10, 5],
      ]),
    );
    expect(fittingTypes(solution, "fork-out1")).toEqual(["tap-straight"]);
    expect(fittingTypes(solution, "fork-out0")).toEqual(["tap-straight", "transition"]);
  });

  it("the piece of a tap is made once, by the branch", () => {
    const solution = solved(
      fork([
        [20, 0],
        [10, 5],
      ]),
    );
    expect(segmentOf(solution, "fork-out1").fittings.map(({ madeHere }) => madeHere)).toEqual([true]);
    expect(segmentOf(solution, "fork-out0").fittings.map(({ madeHere }) => madeHere)).toEqual([false, true]);
  });

  it("two taps opposite each other are one cross", () => {
    const system = fork([
      [20, 0],
      [10, 5],
      [10, -5],
    ]);
    expect(firstTypes(system)).toEqual(["cross", "cross", "cross"]);
    const made = solved(system)
      .segments.flatMap(({ fittings }) => fittings)
      .filter(({ type, madeHere }) => type === "cross" && madeHere);
    expect(made).toHaveLength(1);
  });

  it("a main that ends between two legs is a tee, made once", () => {
    const system = fork([
      [10, 5],
      [10, -5],
    ]);
    expect(firstTypes(system)).toEqual(["tee", "tee"]);
    expect(solved(system).segments.flatMap(({ fittings }) => fittings.map(({ madeHere }) => madeHere))).toEqual([
      true,
      false,
    ]);
  });

  it("legs that lean forward are a wye", () => {
    expect(
      firstTypes(
        fork([
          [15, 5],
          [15, -5],
        ]),
      ),
    ).toEqual(["wye", "wye"]);
    expect(
      firstTypes(
        fork([
          [20, 0],
          [15, 5],
        ]),
      ),
    ).toEqual(["wye", "wye"]);
  });

  it("of two legs as straight, the fuller is the main", () => {
    const system = fork([
      [20, 0],
      [20, 0.1],
    ]);
    const nodes = system.nodes.map((node) =>
      node.id === "out1" ? { ...node, y_m: meters(0), airflow_m3s: cubicMetersPerSecond(0.5) } : node,
    );
    const solution = solved({ ...system, nodes });
    expect(segmentOf(solution, "fork-out1").fittings[0]?.madeHere).toBe(false);
  });

  it("without positions the fullest leg is the main and the others are taps at a right angle", () => {
    const system = fork([
      [10, 0],
      [10, 0],
    ]);
    const nodes = system.nodes.map((node) =>
      node.id === "out1" ? { ...node, airflow_m3s: cubicMetersPerSecond(0.1) } : node,
    );
    const segments = system.segments.map((segment) => ({ ...segment, length_m: meters(5) }));
    const solution = solved({ ...system, nodes, segments });
    expect(segmentOf(solution, "fork-out1").fittings[0]).toMatchObject({ type: "tap-straight", madeHere: true });
    expect(segmentOf(solution, "fork-out1").fittings[0]?.angle_rad).toBeCloseTo(Math.PI / 2, 12);
  });

  it("the tap is of the spec's kind for the branch's shape", () => {
    const branch = { rectangular: "shoe-tap", round: "conical-tap" } as const;
    const spec = { ...ordinary.spec, branch };
    expect(
      firstTypes({
        ...fork([
          [20, 0],
          [10, 5],
        ]),
        spec,
      })[1],
    ).toBe("tap-conical");
    expect(
      firstTypes({
        ...fork(
          [
            [20, 0],
            [10, 5],
          ],
          rectangular(0.3, 0.2),
        ),
        spec,
      })[1],
    ).toBe("tap-shoe");
  });
});

describe("the estimator's choice", () => {
  const chosen = (fitting: FittingType) => solved(bend([10, 5], round(0.3), round(0.3), { fitting }));

  it("replaces the inferred kind at the drawn angle", () => {
    expect(segmentOf(chosen("elbow-gored"), "turn-out").fittings[0]).toMatchObject({
      type: "elbow-gored",
      basis: "chosen",
    });
  });

  it("of none loses nothing", () => {
    expect(segmentOf(chosen("none"), "turn-out").dynamicLoss_pa).toBe(0);
  });

  it("of an elbow on a straight run is taken at a right angle", () => {
    const solution = solved(bend([20, 0], round(0.3), round(0.3), { fitting: "elbow-smooth" }));
    expect(segmentOf(solution, "turn-out").fittings[0]?.angle_rad).toBeCloseTo(Math.PI / 2, 12);
  });

  it("for the main leaves the loss of passing a tap", () => {
    const system = fork([
      [20, 0],
      [10, 5],
    ]);
    const segments = system.segments.map((segment) =>
      segment.id === "fork-out0" ? { ...segment, fitting: "elbow-gored" as const } : segment,
    );
    expect(fittingTypes(solved({ ...system, segments }), "fork-out0")).toEqual([
      "tap-straight",
      "transition",
      "elbow-gored",
    ]);
  });

  it("of a tap names what the main passes as well", () => {
    const system = fork([
      [20, 0],
      [10, 5],
    ]);
    const segments = system.segments.map((segment) =>
      segment.id === "fork-out1" ? { ...segment, fitting: "tap-conical" as const } : segment,
    );
    const solution = solved({ ...system, segments });
    expect(fittingTypes(solution, "fork-out0")[0]).toBe("tap-conical");
    expect(segmentOf(solution, "fork-out1").fittings[0]?.source).toContain("common practice");
  });

  it("at the equipment is an opening or an elbow", () => {
    const system = bend([20, 0], round(0.3), round(0.3));
    const at = (fitting: FittingType) =>
      segmentOf(
        solved({
          ...system,
          segments: system.segments.map((segment, index) => (index === 0 ? { ...segment, fitting } : segment)),
        }),
        "unit-turn",
      );
    expect(at("tap-straight").fittings[0]).toMatchObject({ lossCoefficient: 0.5, upstreamSection: null });
    expect(at("elbow-smooth").fittings[0]).toMatchObject({ type: "elbow-smooth", upstreamSection: null });
    expect(at("end-cap").dynamicLoss_pa).toBe(0);
  });
});
