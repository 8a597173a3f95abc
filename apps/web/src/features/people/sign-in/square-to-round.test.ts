import { describe, expect, it } from "vitest";
import { squareToRound } from "./square-to-round.ts";

const pattern = squareToRound({ width: 24, depth: 18, diameter: 16, height: 14 });
const flat = (line: (typeof pattern.bends)[number]) => Math.hypot(line.to.x - line.from.x, line.to.y - line.from.y);

describe("the pattern of a square-to-round", () => {
  it("keeps every true length when it is laid flat", () => {
    for (const line of [...pattern.bends, ...pattern.sides]) expect(flat(line)).toBeCloseTo(line.length, 9);
  });
  it("has the sides of the rectangle around its outer edge", () => {
    const total = pattern.sides.slice(0, 5).reduce((sum, side) => sum + side.length, 0);
    expect(total).toBeCloseTo(2 * (24 + 18), 9);
  });
  it("has the seam as long as the slope of the short side", () => {
    // From the middle of the 24 in. side (9 in. from the axis) to the ring (8 in. from it), 14 in. up.
    expect(pattern.sides.at(-1)?.length).toBeCloseTo(Math.hypot(1, 14), 9);
  });
  it("mirrors left and right", () => {
    const sum = pattern.outline.reduce((total, point) => total + point.x, 0);
    expect(sum).toBeCloseTo(0, 9);
  });
});
