import fc from "fast-check";
import { expect, test } from "vitest";
import { colebrookFrictionFactor } from "./colebrook.ts";
import { turbulentFactor, turbulentFactors } from "./turbulent-factors.ts";

const inputs = fc.record({
  reynoldsNumber: fc.double({ min: 4000, max: 1e7, noNaN: true }),
  relativeRoughness: fc.double({ min: 0, max: 0.05, noNaN: true }),
});

test("what is remembered is exactly what Colebrook answers, however often and in whatever order it is asked", () => {
  fc.assert(
    fc.property(
      fc.array(inputs, { minLength: 1, maxLength: 50 }),
      fc.array(fc.nat(), { maxLength: 100 }),
      (some, order) => {
        const known = turbulentFactors();
        for (const n of order) {
          const { reynoldsNumber, relativeRoughness } = some[n % some.length]!;
          const factor = turbulentFactor(known, reynoldsNumber, relativeRoughness);
          expect(factor).toBe(colebrookFrictionFactor(reynoldsNumber, relativeRoughness).value);
        }
      },
    ),
  );
});

test("two ducts that fall on one place do not take each other's factor", () => {
  const known = turbulentFactors();
  // More ducts than places: some share one.
  for (const round of [1, 2]) {
    for (let n = 0; n < 3000; n++) {
      const reynoldsNumber = 5000 + n * round;
      expect(turbulentFactor(known, reynoldsNumber, 1e-3)).toBe(colebrookFrictionFactor(reynoldsNumber, 1e-3).value);
    }
  }
});
