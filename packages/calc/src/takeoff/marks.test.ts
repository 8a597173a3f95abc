import { describe, expect, it } from "vitest";
import { FITTING_LETTERS, fittingMark, markNumbers, straightLetters, straightMark } from "./marks.ts";

describe("marks", () => {
  it("skip the letters of fittings, and those that look like digits", () => {
    const letters = Array.from({ length: 60 }, (_, place) => straightLetters(place));
    for (const taken of [...Object.values(FITTING_LETTERS), "I", "O"]) {
      expect(letters.some((each) => each.includes(taken))).toBe(false);
    }
  });

  it("go on with two letters, and never repeat", () => {
    expect(straightMark(4, 0)).toBe("4A");
    expect(straightMark(4, 18)).toBe("4Y");
    expect(straightMark(4, 19)).toBe("4AA");
    expect(new Set(Array.from({ length: 2000 }, (_, place) => straightLetters(place))).size).toBe(2000);
  });

  it("keep a number that was given, and fill in the lowest that is free", () => {
    const numbers = markNumbers([{ id: "a", number: 2 }, { id: "b" }, { id: "d", number: 7 }, { id: "c", number: 7 }]);
    expect(numbers).toEqual([2, 1, 3, 7]);
  });

  it("number the second fitting of a kind", () => {
    expect([fittingMark(4, "transition", 0), fittingMark(4, "transition", 1)]).toEqual(["4T", "4T2"]);
  });
});
