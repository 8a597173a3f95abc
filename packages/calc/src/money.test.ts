import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { allocate, divideRounded, lineAmount, percentOf, roundTo, sumMinor } from "./money.ts";

describe("rounding", () => {
  it("goes half away from zero, both ways", () => {
    expect([5n, -5n, 15n, -15n, 4n, -4n].map((n) => divideRounded(n, 10n))).toEqual([1n, -1n, 2n, -2n, 0n, 0n]);
  });

  it("reads a number as it is printed", () => {
    expect(roundTo(1.005, 2)).toBe(1.01);
    expect(roundTo(-1.005, 2)).toBe(-1.01);
    expect(roundTo(0.05, 1)).toBe(0.1);
    expect(roundTo(-0.04, 1)).toBe(0);
    expect(roundTo(1100, 1)).toBe(1100);
  });

  it("is within half a unit and stays where it is", () => {
    fc.assert(
      fc.property(
        fc.double({ min: -1e6, max: 1e6, noNaN: true }),
        fc.integer({ min: 0, max: 4 }),
        (value, decimals) => {
          const rounded = roundTo(value, decimals);
          expect(Math.abs(rounded - value)).toBeLessThanOrEqual(0.5 * 10 ** -decimals * (1 + 1e-9));
          expect(roundTo(rounded, decimals)).toBe(rounded);
        },
      ),
    );
  });

  it("refuses what is no number", () => {
    expect(() => roundTo(NaN, 1)).toThrow(RangeError);
    expect(() => roundTo(Infinity, 1)).toThrow(RangeError);
  });
});

describe("a line", () => {
  it("rounds a half cent up", () => {
    expect(lineAmount({ quantity: 0.5, unitPrice_micro: 10_000 })).toBe(1);
    expect(lineAmount({ quantity: -0.5, unitPrice_micro: 10_000 })).toBe(-1);
  });

  it("costs no less when its unit price is higher", () => {
    const price = fc.integer({ min: 0, max: 5_000_000_000 });
    fc.assert(
      fc.property(fc.double({ min: 0, max: 1e5, noNaN: true }), price, price, (quantity, a, b) => {
        const [low, high] = [Math.min(a, b), Math.max(a, b)];
        expect(lineAmount({ quantity, unitPrice_micro: low })).toBeLessThanOrEqual(
          lineAmount({ quantity, unitPrice_micro: high }),
        );
      }),
    );
  });

  it("is exact where floating cents are not", () => {
    // 1.005 × 1.00 is 1.00499… in binary.
    expect(lineAmount({ quantity: 1.005, unitPrice_micro: 1_000_000 })).toBe(101);
  });
});

describe("a percentage", () => {
  it("rounds once, half away from zero", () => {
    expect(percentOf(50, 100)).toBe(1);
    expect(percentOf(-50, 100)).toBe(-1);
    expect(percentOf(49, 100)).toBe(0);
  });
});

describe("a split", () => {
  const weights = fc.array(fc.oneof(fc.constant(0), fc.double({ min: 1e-6, max: 1e6, noNaN: true })), {
    minLength: 1,
    maxLength: 40,
  });
  const amount = fc.integer({ min: -1e12, max: 1e12 });

  it("adds up to what was split", () => {
    fc.assert(
      fc.property(amount, weights, (whole, by) => {
        expect(sumMinor(allocate(whole, by))).toBe(whole);
      }),
    );
  });

  it("gives each part its share to within a unit", () => {
    fc.assert(
      fc.property(fc.integer({ min: -1e9, max: 1e9 }), weights, (whole, by) => {
        const total = by.reduce((sum, weight) => sum + weight, 0);
        allocate(whole, by).forEach((part, at) => {
          const share = total > 0 ? by[at]! / total : 1 / by.length;
          expect(Math.abs(part - whole * share)).toBeLessThan(1 + 1e-3);
        });
      }),
    );
  });

  it("gives leftover cents to the largest remainders, the earlier first", () => {
    expect(allocate(100, [1, 1, 1])).toEqual([34, 33, 33]);
    expect(allocate(101, [2, 1, 1])).toEqual([51, 25, 25]);
    expect(allocate(-100, [1, 1, 1])).toEqual([-34, -33, -33]);
  });

  it("splits evenly where nothing has weight", () => {
    expect(allocate(5, [0, 0])).toEqual([3, 2]);
  });

  it("needs somewhere to go", () => {
    expect(() => allocate(1, [])).toThrow(RangeError);
    expect(allocate(0, [])).toEqual([]);
    expect(() => allocate(1, [-1])).toThrow(RangeError);
  });
});
