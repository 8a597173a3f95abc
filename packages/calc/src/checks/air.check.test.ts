import { describe, it } from "vitest";
import { barometricPressure } from "../air/atmosphere.ts";
import { airDensity } from "../air/density.ts";
import { saturationPressure } from "../air/humidity.ts";
import { velocityPressure } from "../air/velocity-pressure.ts";
import { dynamicViscosity } from "../air/viscosity.ts";
import {
  METERS_PER_FOOT,
  PASCALS_PER_INCH_OF_WATER,
  degreesCelsius,
  degreesFahrenheit,
  feet,
  feetPerMinute,
  kilogramsPerCubicMeter,
  meters,
  metersPerSecond,
} from "../quantity.ts";
import { expectWithin } from "./expect-within.ts";
import { altitude, altitudeOfTheHandbook, dryDensity, saturation, viscosity } from "./rows/air.rows.ts";
import { inchPound, metric } from "./rows/velocity-pressure.rows.ts";

const POUND_PER_CUBIC_FOOT = 0.45359237 / METERS_PER_FOOT ** 3;

describe("air", () => {
  it("thins with altitude as the standard atmosphere does", () => {
    for (const [altitude_ft, pressure, density] of altitude.rows) {
      expectWithin(barometricPressure(feet(altitude_ft)), pressure, altitude, altitude_ft);
      const at70F = { altitude: feet(altitude_ft), temperature: degreesFahrenheit(70), relativeHumidity: 0 };
      expectWithin(airDensity(at70F), density, altitude, altitude_ft);
    }
  });

  it("follows the handbook's own form of the atmosphere closely", () => {
    for (const [altitude_m, pressure, density] of altitudeOfTheHandbook.rows) {
      expectWithin(barometricPressure(meters(altitude_m)), pressure, altitudeOfTheHandbook, altitude_m);
      const at20C = { altitude: meters(altitude_m), temperature: degreesCelsius(20), relativeHumidity: 0 };
      expectWithin(airDensity(at20C), density, altitudeOfTheHandbook, altitude_m);
    }
  });

  it("thins with temperature", () => {
    for (const [temperature_f, published] of dryDensity.rows) {
      const conditions = { altitude: meters(0), temperature: degreesFahrenheit(temperature_f), relativeHumidity: 0 };
      expectWithin(airDensity(conditions) / POUND_PER_CUBIC_FOOT, published, dryDensity, temperature_f);
    }
  });

  it("has the viscosity of Sutherland's law", () => {
    for (const [temperature_c, published] of viscosity.rows) {
      expectWithin(dynamicViscosity(degreesCelsius(temperature_c)), published, viscosity, temperature_c);
    }
  });

  it("holds as much water as the steam tables say", () => {
    for (const [temperature_c, published] of saturation.rows) {
      expectWithin(saturationPressure(degreesCelsius(temperature_c)), published, saturation, temperature_c);
    }
  });
});

describe("velocity pressure", () => {
  it("agrees in inches of water", () => {
    const density = kilogramsPerCubicMeter(0.075 * POUND_PER_CUBIC_FOOT);
    for (const [velocity_fpm, published] of inchPound.rows) {
      const ours = velocityPressure(density, feetPerMinute(velocity_fpm)) / PASCALS_PER_INCH_OF_WATER;
      expectWithin(ours, published, inchPound, velocity_fpm);
    }
  });

  it("agrees in pascals", () => {
    for (const [velocity, published] of metric.rows) {
      const ours = velocityPressure(kilogramsPerCubicMeter(1.204), metersPerSecond(velocity));
      expectWithin(ours, published, metric, velocity);
    }
  });
});
