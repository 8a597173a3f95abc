import type { Solution, SolvedPath, SolvedSegment } from "@cleatwork/calc";
import { describe, expect, it } from "vitest";
import { axisSteps, gradeLineOf, polyline } from "./grade-line.ts";

const segment = (segmentId: string, length_m: number, dynamicLoss_pa: number, frictionLoss_pa: number) =>
  ({ segmentId, length_m, dynamicLoss_pa, frictionLoss_pa }) as SolvedSegment;
const path = { outletNodeId: "out", segmentIds: ["a", "b"], outletPressure_pa: 10 } as unknown as SolvedPath;
const solution = {
  segments: [segment("a", 5, 3, 2), segment("b", 7, 4, 6), segment("c", 1, 1, 1)],
  availablePressure_pa: 100,
} as unknown as Solution;

describe("grade line", () => {
  const line = gradeLineOf(solution, path);

  it("starts at what the unit gives", () => {
    expect(polyline(line)[0]).toEqual({ distance_m: 0, pressureLeft_pa: 100 });
  });

  it("ends where every loss of the path is taken off", () => {
    expect(line.arrives_pa).toBe(100 - 3 - 2 - 4 - 6);
    expect(line.total_m).toBe(12);
  });

  it("drops a fitting at one place and straight duct along its length", () => {
    expect(line.stretches[1]).toEqual({
      segmentId: "b",
      start: { distance_m: 5, pressureLeft_pa: 95 },
      afterFittings: { distance_m: 5, pressureLeft_pa: 91 },
      end: { distance_m: 12, pressureLeft_pa: 85 },
    });
  });
});

describe("axis", () => {
  it("steps in round numbers and covers the maximum", () => {
    expect(axisSteps(0.41, 4)).toEqual([0, 0.2, 0.4, 0.6000000000000001]);
    expect(axisSteps(95, 4)).toEqual([0, 50, 100]);
  });
});
