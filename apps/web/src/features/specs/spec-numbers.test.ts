import { inchesOfWater } from "@cleatwork/calc";
import { describe, expect, it } from "vitest";
import { degrees, parsePressureClass, percent, plainNumber } from "./spec-numbers.ts";

describe("the numbers of a spec", () => {
  it("takes a negative pressure class, for duct under suction", () => {
    for (const typed of ["-2", "−2", "- 2 in. w.g."]) {
      expect(parsePressureClass(typed, "inch-pound")).toEqual({ ok: true, value: 0 - inchesOfWater(2) });
    }
  });
  it("takes a positive one as any pressure", () => {
    expect(parsePressureClass("500", "si")).toEqual({ ok: true, value: 500 });
  });
  it("reads and shows an angle in degrees", () => {
    expect(degrees.parse("30°")).toEqual({ ok: true, value: Math.PI / 6 });
    expect(degrees.format(Math.PI / 6).text).toBe("30°");
  });
  it("reads a percentage as a share", () => expect(percent.parse("4 %")).toEqual({ ok: true, value: 0.04 }));
  it("refuses what is no number, with an example", () => {
    expect(plainNumber("× width", "1.5").parse("wide")).toEqual({
      ok: false,
      problems: [{ message: "“wide” is not a number. Type one such as 1.5." }],
    });
  });
});
