import { describe, expect, it } from "vitest";
import { solved } from "../testing/answers.ts";
import { benchSystem } from "./many-segments.ts";
import { measureSolveRatio } from "./solve-ratio.ts";

describe("the building of many segments", () => {
  it.each([1, 2, 3, 50, 997, 5000])("has %i segments and can be solved", (count) => {
    const system = benchSystem(count);
    expect(system.segments).toHaveLength(count);
    expect(solved(system).segments).toHaveLength(count);
  });

  it("has all four shapes, flexible duct and branches", () => {
    const system = benchSystem(500);
    expect(new Set(system.segments.map(({ section }) => section?.shape)).size).toBe(4);
    expect(system.segments.some(({ flexible }) => flexible)).toBe(true);
    expect(solved(system).segments.some(({ fittings }) => fittings.some(({ type }) => type === "tap-conical"))).toBe(
      true,
    );
  });

  it("is the same every time", () => {
    expect(benchSystem(300)).toEqual(benchSystem(300));
  });

  it("is timed by the clock that is handed in", () => {
    let time = 0;
    const ratio = measureSolveRatio({ segmentCount: 60, warmUp: 1, rounds: 3, now: () => (time += 1) });
    expect(ratio).toMatchObject({ colebrook_ms: 1, solveTyped_ms: 1, overColebrook: { typed: 1, written: 1 } });
  });
});
