import { describe, expect, it } from "vitest";
import { colebrookFrictionFactor } from "../friction/colebrook.ts";
import { darcyFrictionFactor } from "../friction/friction-factor.ts";
import {
  laminarConstantOfAnnulus,
  laminarConstantOfFlatOval,
  laminarConstantOfRectangle,
} from "../friction/laminar.ts";
import {
  PASCALS_PER_INCH_OF_WATER,
  METERS_PER_FOOT,
  METERS_PER_SECOND_PER_FPM,
  cubicFeetPerMinute,
  feet,
  inches,
  inchesOfWaterPer100Feet,
  kilogramsPerCubicMeter,
  metersPerSecond,
  pascalSeconds,
  type Meters,
} from "../quantity.ts";
import { velocityAtFrictionRate } from "../sizing/capacity.ts";
import { velocityPressure } from "../air/velocity-pressure.ts";
import { round } from "../testing/air-system-builder.ts";
import { expectWithin } from "./expect-within.ts";
import { colebrookGrid } from "./rows/colebrook.rows.ts";
import { equalFrictionDiameters } from "./rows/equal-friction.rows.ts";
import { publishedPoints } from "./rows/friction-point.rows.ts";
import { annulusExact, flatOvalSolved, rectangleExact, rectanglePublished } from "./rows/laminar.rows.ts";

/** 0.075 lb/ft³ exactly, and the kinematic viscosity that Re = 8.56 D V implies; both of the published friction charts. */
const standardDensity = kilogramsPerCubicMeter((0.075 * 0.45359237) / METERS_PER_FOOT ** 3);
const standardViscosity = pascalSeconds(1.5074e-5 * standardDensity);
const chartRoughness = feet(0.0003);

function frictionRate_inwg_100ft(airflow_cfm: number, diameter: Meters): number {
  const velocity = metersPerSecond(cubicFeetPerMinute(airflow_cfm) / ((Math.PI / 4) * diameter ** 2));
  const reynoldsNumber = (standardDensity * velocity * diameter) / standardViscosity;
  const factor = darcyFrictionFactor(round(diameter), reynoldsNumber, chartRoughness / diameter);
  const rate = (factor * velocityPressure(standardDensity, velocity)) / diameter;
  return (rate / PASCALS_PER_INCH_OF_WATER) * 100 * METERS_PER_FOOT;
}

describe("turbulent friction factor", () => {
  it("agrees with high-precision solutions of the same equation over its whole range", () => {
    expect(colebrookGrid.rows.length).toBeGreaterThan(160);
    for (const [reynolds, roughness, published] of colebrookGrid.rows) {
      expectWithin(colebrookFrictionFactor(reynolds, roughness).value, published, colebrookGrid, [reynolds, roughness]);
    }
  });

  it("leaves nothing of the equation, and needs few rounds", () => {
    for (const [reynolds, roughness] of colebrookGrid.rows) {
      const { value, residual, iterations } = colebrookFrictionFactor(reynolds, roughness);
      const x = 1 / Math.sqrt(value);
      const right = -2 * Math.log10(roughness / 3.7 + (2.51 * x) / reynolds);
      expect(Math.abs(x - right) / x).toBeLessThan(1e-12);
      expect(Math.abs(residual)).toBeLessThan(1e-6);
      expect(iterations).toBeLessThanOrEqual(5);
    }
  });
});

describe("laminar constants", () => {
  it("of rectangles agree with the exact series", () => {
    for (const [sideRatio, published] of rectangleExact.rows) {
      expectWithin(laminarConstantOfRectangle(sideRatio), published, rectangleExact, sideRatio);
    }
  });

  it("of rectangles agree with a printed table", () => {
    for (const [sideRatio, published] of rectanglePublished.rows) {
      expectWithin(laminarConstantOfRectangle(sideRatio), published, rectanglePublished, sideRatio);
    }
  });

  it("of annuli agree with the closed form", () => {
    for (const [diameterRatio, published] of annulusExact.rows) {
      expectWithin(laminarConstantOfAnnulus(diameterRatio), published, annulusExact, diameterRatio);
    }
  });

  it("of flat ovals agree with a numerical solution", () => {
    for (const [widthOverHeight, published] of flatOvalSolved.rows) {
      expectWithin(laminarConstantOfFlatOval(1 / widthOverHeight), published, flatOvalSolved, widthOverHeight);
    }
  });

  // Two-digit readings of common practice, no source; the exact value stands beside each.
  it.each([
    ["annulus at a diameter ratio of 0.1", laminarConstantOfAnnulus(0.1), 89, 89.37],
    ["annulus toward 1", laminarConstantOfAnnulus(0.9999), 96, 96],
    ["rectangle at a side ratio of 0.1", laminarConstantOfRectangle(0.1), 84, 84.68],
    ["square", laminarConstantOfRectangle(1), 56, 56.91],
  ])("of an %s read as in common practice", (_, ours, read, exact) => {
    // A reading of two digits may be cut instead of rounded: one unit of the second digit.
    expect(Math.abs(ours - read)).toBeLessThan(1);
    expect(ours).toBeCloseTo(exact, 2);
  });
});

describe("friction rate of round galvanized duct", () => {
  it("agrees with published points", () => {
    for (const row of publishedPoints.rows) {
      const ours = frictionRate_inwg_100ft(row.airflow_cfm, inches(row.diameter_in));
      expectWithin(ours, row.printed_inwg_100ft, { relativeTolerance: row.tolerance }, row);
    }
  });

  it("is exactly 0.1 in. of water per 100 ft in the diameters that another solver found for it", () => {
    for (const [airflow_cfm, diameter_in, velocity_fpm] of equalFrictionDiameters.rows) {
      const diameter = inches(diameter_in);
      // Loss goes with the fifth power of the diameter.
      const tolerance = { relativeTolerance: 5 * equalFrictionDiameters.relativeTolerance };
      expectWithin(frictionRate_inwg_100ft(airflow_cfm, diameter), 0.1, tolerance, diameter_in);

      const velocity = velocityAtFrictionRate({
        frictionRate: inchesOfWaterPer100Feet(0.1),
        hydraulicDiameter: diameter,
        roughness: chartRoughness,
        turbulentScale: 1,
        density: standardDensity,
        viscosity: standardViscosity,
      });
      expectWithin(velocity / METERS_PER_SECOND_PER_FPM, velocity_fpm, { relativeTolerance: 0.003 }, diameter_in);
    }
  });
});
