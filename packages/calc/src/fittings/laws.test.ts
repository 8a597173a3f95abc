import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { radians, squareMeters } from "../quantity.ts";
import { readLinear } from "../linear-table.ts";
import { radiusElbowCoefficient, smoothElbowCoefficient, squareThroatElbowCoefficient } from "./elbow.ts";
import { rectangularElbowTable } from "./elbow.table.ts";
import { flushEntryCoefficient } from "./ends.ts";
import {
  convergingLegCoefficient,
  divergingBranchCoefficient,
  divergingMainCoefficient,
  joiningMomentum,
  splitLegCoefficient,
} from "./junction.ts";
import { MOST_INPUTS, fittingLaws } from "./laws.ts";
import { shippedPractice } from "./practice.table.ts";
import { screenCoefficient } from "./screen.ts";
import { splitterElbowCoefficient } from "./splitter-elbow.ts";
import { MOST_DAMPER_ANGLE, damperAngle, damperCoefficient } from "./throttled-damper.ts";
import { contractionCoefficient, expansionCoefficient, transitionForm } from "./transition.ts";

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const angle = between(0.18, Math.PI).map(radians);

describe("elbows, for every angle and radius", () => {
  it("never gain", () => {
    fc.assert(
      fc.property(angle, between(0.55, 5), between(0.1, 10), (turn, radiusRatio, sideRatio) => {
        expect(radiusElbowCoefficient({ angle: turn, radiusRatio, sideRatio })).toBeGreaterThan(0);
        expect(squareThroatElbowCoefficient({ angle: turn, sideRatio })).toBeGreaterThan(0);
        expect(smoothElbowCoefficient({ angle: turn, radiusRatio, darcyFrictionFactor: 0.02 })).toBeGreaterThan(0);
        expect(splitterElbowCoefficient({ angle: turn, radiusRatio, splitterCount: 2 })).toBeGreaterThan(0);
      }),
    );
  });

  it("lose less with each splitter", () => {
    fc.assert(
      fc.property(angle, between(0.55, 3), between(1, 2), (turn, radiusRatio, count) => {
        const splitterCount = Math.floor(count);
        const fewer = splitterElbowCoefficient({ angle: turn, radiusRatio, splitterCount });
        const more = splitterElbowCoefficient({ angle: turn, radiusRatio, splitterCount: splitterCount + 1 });
        expect(more).toBeLessThan(fewer);
      }),
    );
  });

  it("lose no more by a wider sweep", () => {
    fc.assert(
      fc.property(angle, between(0.55, 4), between(0.01, 1), (turn, radiusRatio, wider) => {
        const tight = { angle: turn, radiusRatio, sideRatio: 1, splitterCount: 1 };
        const wide = { ...tight, radiusRatio: radiusRatio + wider };
        expect(radiusElbowCoefficient(wide)).toBeLessThanOrEqual(radiusElbowCoefficient(tight));
        expect(splitterElbowCoefficient(wide)).toBeLessThanOrEqual(splitterElbowCoefficient(tight));
      }),
    );
  });
});

describe("a linear table", () => {
  const tables = [
    rectangularElbowTable.radiusSideRatio,
    rectangularElbowTable.squareThroatSideRatio,
    rectangularElbowTable.squareThroatAngle,
  ];

  it("answers its printed figure at each row", () => {
    for (const table of tables) {
      table.at.forEach((at, row) => expect(readLinear(table, at)).toBeCloseTo(table.values[row] ?? NaN, 12));
    }
  });

  it("stays between its neighbors, so that it rises and falls only where the print does", () => {
    fc.assert(
      fc.property(fc.constantFrom(...tables), between(0, 200), (table, argument) => {
        const above = table.at.findIndex((at) => at >= argument);
        const rows = above < 0 ? table.values.slice(-1) : table.values.slice(Math.max(0, above - 1), above + 1);
        const value = readLinear(table, argument);
        expect(value).toBeGreaterThanOrEqual(Math.min(...rows) - 1e-12);
        expect(value).toBeLessThanOrEqual(Math.max(...rows) + 1e-12);
      }),
    );
  });
});

describe("transitions", () => {
  it("lose nothing between equal areas, and never gain", () => {
    fc.assert(
      fc.property(between(0.01, Math.PI).map(radians), between(1, 20), (whole, ratio) => {
        const form = transitionForm(whole);
        const step = { smaller: squareMeters(1), larger: squareMeters(ratio) };
        const equal = { smaller: squareMeters(1), larger: squareMeters(1) };
        expect(contractionCoefficient(form, step)).toBeGreaterThanOrEqual(0);
        expect(expansionCoefficient(form, step)).toBeGreaterThanOrEqual(0);
        expect(contractionCoefficient(form, equal)).toBeCloseTo(0, 12);
        expect(expansionCoefficient(form, equal)).toBe(0);
      }),
    );
  });

  it("that widen lose at most all that they slow down, and more the wider", () => {
    fc.assert(
      fc.property(between(0.01, Math.PI).map(radians), between(1, 20), between(0.01, 5), (whole, ratio, wider) => {
        const form = transitionForm(whole);
        const by = (larger: number) =>
          expansionCoefficient(form, { smaller: squareMeters(1), larger: squareMeters(larger) });
        expect(by(ratio)).toBeLessThan(1);
        expect(by(ratio + wider)).toBeGreaterThanOrEqual(by(ratio));
      }),
    );
  });
});

describe("junctions", () => {
  /** Between the flow ratios where the source itself steps. */
  const smooth = fc.constantFrom([0.02, 0.39] as const, [0.42, 0.48] as const, [0.62, 0.97] as const);

  it("a branch off a running duct never gains", () => {
    fc.assert(
      fc.property(between(-1, 0.95), between(0.02, 1), between(0.001, 1), (turnCosine, areaRatio, flowRatio) => {
        expect(divergingBranchCoefficient({ turnCosine, areaRatio, flowRatio })).toBeGreaterThanOrEqual(0);
      }),
    );
  });

  it("a running duct gains only where its branches are wide and take less than half, and then by under 0.08", () => {
    fc.assert(
      fc.property(between(0.02, 1), between(0.001, 1), (areaRatio, flowRatio) => {
        const main = divergingMainCoefficient({ areaRatio, flowRatio });
        if (areaRatio <= 0.4 || flowRatio >= 0.5) expect(main).toBeGreaterThanOrEqual(0);
        expect(main).toBeGreaterThan(-0.08);
      }),
    );
  });

  it("change little where the air changes little, between the steps of the source", () => {
    fc.assert(
      fc.property(
        smooth,
        between(0, 1),
        between(0.05, 1),
        between(-0.2, 0.9),
        ([low, high], share, areaRatio, cosine) => {
          const flowRatio = low + share * (high - low);
          const step = 1e-6;
          const legs = [flowRatio, flowRatio + step].map((q) => ({ turnCosine: cosine, areaRatio, flowRatio: q }));
          const jump = (of: (typeof legs)[number][], law: (leg: (typeof legs)[number]) => number) =>
            Math.abs(law(of[1]!) - law(of[0]!));
          // The steepest of them grows as 2 (Ac/Ab)² q.
          const allowed = step * (20 + 4 / areaRatio ** 2);
          expect(jump(legs, divergingBranchCoefficient)).toBeLessThan(allowed);
          expect(jump(legs, divergingMainCoefficient)).toBeLessThan(allowed);
          expect(jump(legs, splitLegCoefficient)).toBeLessThan(allowed);
        },
      ),
    );
  });

  it("a stream that joins alone and straight on loses nothing", () => {
    const momentum = joiningMomentum({ turnCosine: 1, areaRatio: 1, flowRatio: 1 });
    expect(convergingLegCoefficient(1, momentum)).toBe(0);
  });

  it("joining streams lose the same whichever is named first", () => {
    fc.assert(
      fc.property(between(0.05, 0.95), between(0.1, 1), between(0.1, 1), between(-0.9, 0.9), (q, a, b, cosine) => {
        const one = { turnCosine: cosine, areaRatio: a, flowRatio: q };
        const other = { turnCosine: -cosine, areaRatio: b, flowRatio: 1 - q };
        expect(joiningMomentum(one) + joiningMomentum(other)).toBe(joiningMomentum(other) + joiningMomentum(one));
      }),
    );
  });

  it("joining streams lose energy together, never gain it, where they join without a turn back", () => {
    fc.assert(
      fc.property(between(0.02, 0.98), between(0.1, 1), between(0, 1), (q, areaRatio, turnCosine) => {
        const branch = { turnCosine, areaRatio, flowRatio: q };
        const momentum = joiningMomentum(branch) + joiningMomentum({ turnCosine: 1, areaRatio: 1, flowRatio: 1 - q });
        const power =
          q * convergingLegCoefficient(q / areaRatio, momentum) + (1 - q) * convergingLegCoefficient(1 - q, momentum);
        expect(power).toBeGreaterThanOrEqual(-1e-9);
      }),
    );
  });
});

describe("ends, screens and dampers", () => {
  it("a rounder edge and a freer screen lose less", () => {
    fc.assert(
      fc.property(between(0, 0.5), between(0.001, 0.1), between(0.1, 0.9), (edge, more, free) => {
        expect(flushEntryCoefficient(edge + more)).toBeLessThan(flushEntryCoefficient(edge));
        expect(screenCoefficient(free + more)).toBeLessThan(screenCoefficient(free));
      }),
    );
  });

  it("a damper loses more the farther it is closed, and its angle is found again from what it loses", () => {
    const blade = fc.constantFrom(shippedPractice.damper.rectangular, shippedPractice.damper.other);
    fc.assert(
      fc.property(blade, between(0, MOST_DAMPER_ANGLE - 0.01), between(0.001, 0.01), (one, turned, more) => {
        const coefficient = damperCoefficient(one, radians(turned));
        expect(damperCoefficient(one, radians(turned + more))).toBeGreaterThan(coefficient);
        expect(damperAngle(one, coefficient)).toBeCloseTo(turned, 6);
      }),
    );
  });

  it("a damper asked for less than it loses open stays open, and for more than it can is not set at all", () => {
    const { other } = shippedPractice.damper;
    expect(damperAngle(other, 0.1)).toBe(0);
    expect(damperAngle(other, 1e4)).toBeNull();
    expect(damperCoefficient(other, radians(1.5))).toBe(damperCoefficient(other, MOST_DAMPER_ANGLE));
  });
});

it("every law says its source and names no more inputs than there is room for", () => {
  for (const { source, inputs } of fittingLaws) {
    expect(source.length).toBeGreaterThan(10);
    expect(inputs.length).toBeLessThanOrEqual(MOST_INPUTS);
  }
});
