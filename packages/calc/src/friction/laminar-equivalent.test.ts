import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { annular, oneDuct, rectangular, round } from "../testing/air-system-builder.ts";
import { solved } from "../testing/answers.ts";
import { frictionRateOnBasis } from "../network/friction.ts";
import { laminarEquivalentRatio } from "./laminar-equivalent.ts";

describe("the laminar-equivalent diameter", () => {
  it("of a circle is its hydraulic diameter", () => expect(laminarEquivalentRatio(round(0.3))).toBe(1));

  // Jones, O. C. (1976), J. Fluids Eng. 98: his own fit for rectangles, 2/3 + 11/24 a (2 − a), said to hold within 2 %.
  it.each([1, 0.8, 0.5, 0.25, 0.1])("of a rectangle of side ratio %d is Jones's fit within 2 %%", (a) => {
    const fit = 2 / 3 + (11 / 24) * a * (2 - a);
    expect(Math.abs(laminarEquivalentRatio(rectangular(1, a)) / fit - 1)).toBeLessThan(0.02);
  });

  it("of a thin annulus goes to that of parallel plates, two thirds", () => {
    expect(laminarEquivalentRatio(annular(1, 0.9999))).toBeCloseTo(2 / 3, 6);
  });
});

describe("the friction basis", () => {
  const onBasis = (
    frictionBasis: "hydraulic-diameter" | "laminar-equivalent-diameter",
    section = rectangular(1, 0.2),
  ) => oneDuct(section, 0.8, { system: { frictionBasis } });

  it("changes nothing for round duct", () => {
    const [a, b] = [onBasis("hydraulic-diameter", round(0.4)), onBasis("laminar-equivalent-diameter", round(0.4))];
    expect(solved(a).requiredPressure_pa).toBe(solved(b).requiredPressure_pa);
  });

  it("loses a little more in a flat duct on the laminar-equivalent diameter", () => {
    const hydraulic = solved(onBasis("hydraulic-diameter")).segments[0]!;
    const equivalent = solved(onBasis("laminar-equivalent-diameter")).segments[0]!;
    const more = equivalent.frictionRate_pa_m / hydraulic.frictionRate_pa_m;
    expect(more).toBeGreaterThan(1.01);
    expect(more).toBeLessThan(1.1);
    expect(equivalent.reynoldsNumber).toBe(hydraulic.reynoldsNumber);
  });

  it("can be asked for the other: what it tells is what a solve on it finds", () => {
    const system = onBasis("hydraulic-diameter");
    const told = frictionRateOnBasis(system, solved(system).segments[0]!, "laminar-equivalent-diameter");
    const found = solved(onBasis("laminar-equivalent-diameter")).segments[0]!.frictionRate_pa_m;
    expect(told / found).toBeCloseTo(1, 12);
  });

  it("is continuous from laminar to turbulent flow on both", () => {
    fc.assert(
      fc.property(fc.constantFrom(2000, 4000), fc.double({ min: 0.1, max: 1, noNaN: true }), (edge, ratio) => {
        const rate = (reynolds: number) => {
          const section = rectangular(0.5, 0.5 * ratio);
          const system = oneDuct(section, 0.001, { system: { frictionBasis: "laminar-equivalent-diameter" } });
          const { reynoldsNumber } = solved(system).segments[0]!;
          const scaled = oneDuct(section, (0.001 * reynolds) / reynoldsNumber, {
            system: { frictionBasis: "laminar-equivalent-diameter" },
          });
          return solved(scaled).segments[0]!.frictionRate_pa_m;
        };
        expect(rate(edge * 1.00001) / rate(edge * 0.99999)).toBeCloseTo(1, 3);
      }),
      { numRuns: 30 },
    );
  });
});
