import { describe, expect, it } from "vitest";
import type { AirSystem } from "../air-system.ts";
import { leakage } from "../network/leakage.ts";
import {
  CUBIC_METERS_PER_SECOND_PER_CFM,
  METERS_PER_INCH,
  METERS_PER_SECOND_PER_FPM,
  PASCALS_PER_INCH_OF_WATER,
  cubicFeetPerMinute,
  degreesFahrenheit,
  feet,
  inches,
  inchesOfWater,
  meters,
  pascals,
  squareFeet,
} from "../quantity.ts";
import {
  aSystem,
  duct,
  equipment,
  flatOval,
  junction,
  ordinary,
  outlet,
  rectangular,
  round,
} from "../testing/air-system-builder.ts";
import { segmentOf, solved } from "../testing/answers.ts";
import { expectWithin } from "./expect-within.ts";
import { leakageRows } from "./rows/leakage.rows.ts";
import { workedSupply } from "./rows/worked-supply.rows.ts";

describe("leakage", () => {
  it("agrees with the class formula", () => {
    for (const [leakageClass, pressure_inwg, published] of leakageRows.rows) {
      const ours = leakage(leakageClass, squareFeet(100), inchesOfWater(pressure_inwg));
      expectWithin(ours / CUBIC_METERS_PER_SECOND_PER_CFM, published, leakageRows, [leakageClass, pressure_inwg]);
    }
  });

  it("is the same under suction", () => {
    expect(leakage(12, squareFeet(100), pascals(-250))).toBe(leakage(12, squareFeet(100), pascals(250)));
  });
});

describe("a worked supply system", () => {
  const [one, two, three, four, five] = workedSupply.rows;

  /** 0.075 lb/ft³ is reached at sea level and 69.4 °F, dry; its kinematic viscosity differs by 0.4 % from the worked one. */
  const conditions = {
    altitude_m: meters(0),
    temperature_k: degreesFahrenheit(69.36),
    relativeHumidity: 0,
    availablePressure_pa: inchesOfWater(1),
    safetyMargin: 0,
  };

  const terminal = (id: string) => {
    const path = workedSupply.paths.find((row) => row.terminal === id);
    const section = workedSupply.rows.find((row) => row.id === path?.sections.at(-1));
    if (!path || !section) throw new Error(id);
    const pressure = inchesOfWater(path.terminal_inwg);
    return outlet(id, [90, 0], cubicFeetPerMinute(section.airflow_cfm), pressure);
  };

  /** The worked example gives its own coefficients, so ours are switched off and its own are added below. */
  const plain = (length_ft: number) => ({ fitting: "none" as const, length_m: feet(length_ft) });
  const system: AirSystem = aSystem(
    [
      equipment("fan", [0, 0]),
      junction("a", [1, 0]),
      junction("b", [2, 0]),
      terminal("T3"),
      terminal("T4"),
      terminal("T5"),
    ],
    [
      duct("fan", "a", rectangular(inches(one.dims_in[0]), inches(one.dims_in[1])), {
        id: "1",
        ...plain(one.length_ft),
      }),
      duct("a", "b", rectangular(inches(two.dims_in[0]), inches(two.dims_in[1])), { id: "2", ...plain(two.length_ft) }),
      duct("a", "T3", round(inches(three.dims_in[0])), { id: "3", ...plain(three.length_ft) }),
      duct("b", "T4", flatOval(inches(four.dims_in[0]), inches(four.dims_in[1])), {
        id: "4",
        ...plain(four.length_ft),
      }),
      duct("b", "T5", round(inches(five.dims_in[0])), { id: "5", ...plain(five.length_ft) }),
    ],
    { design: conditions, spec: { ...ordinary.spec, sealClass: "A" } },
  );
  const solution = solved(system);

  const workedDynamic_pa = (id: string): number => {
    const row = workedSupply.rows.find((candidate) => candidate.id === id);
    if (!row) throw new Error(id);
    const fittings = row.fittings.map(([coefficient, of]) => coefficient * segmentOf(solution, of).velocityPressure_pa);
    return fittings.reduce((sum, loss) => sum + loss, inchesOfWater(row.component_inwg));
  };

  it("has the worked flow, velocity, friction factor and friction in each section", () => {
    for (const row of workedSupply.rows) {
      const ours = segmentOf(solution, row.id);
      expectWithin(
        ours.volumetricFlowRate_m3s / CUBIC_METERS_PER_SECOND_PER_CFM,
        row.airflow_cfm,
        { relativeTolerance: 1e-12 },
        row.id,
      );
      expectWithin(
        ours.hydraulicDiameter_m / METERS_PER_INCH,
        row.hydraulicDiameter_in,
        { relativeTolerance: 1e-8 },
        row.id,
      );
      expectWithin(
        ours.meanVelocity_m_s / METERS_PER_SECOND_PER_FPM,
        row.velocity_fpm,
        { relativeTolerance: 1e-8 },
        row.id,
      );
      expectWithin(
        ours.velocityPressure_pa / PASCALS_PER_INCH_OF_WATER,
        row.velocityPressure_inwg,
        workedSupply,
        row.id,
      );
      expectWithin(ours.darcyFrictionFactor, row.darcyFrictionFactor, workedSupply, row.id);
      expectWithin(ours.frictionLoss_pa / PASCALS_PER_INCH_OF_WATER, row.friction_inwg, workedSupply, row.id);
    }
  });

  it("loses the worked pressure on each path", () => {
    for (const path of workedSupply.paths) {
      const ours = solution.paths.find(({ outletNodeId }) => outletNodeId === path.terminal);
      const dynamic = path.sections.reduce((sum, id) => sum + workedDynamic_pa(id), 0);
      const required = (ours?.requiredPressure_pa ?? NaN) + dynamic;
      expectWithin(required / PASCALS_PER_INCH_OF_WATER, path.loss_inwg, workedSupply, path.terminal);
    }
  });

  it("needs the worked fan pressure and dampers", () => {
    const required = solution.paths.map((path) => {
      const dynamic = path.segmentIds.reduce((sum, id) => sum + workedDynamic_pa(id), 0);
      return { terminal: path.outletNodeId, inwg: (path.requiredPressure_pa + dynamic) / PASCALS_PER_INCH_OF_WATER };
    });
    const most = Math.max(...required.map(({ inwg }) => inwg));
    expectWithin(most, workedSupply.requiredPressure_inwg, workedSupply, "fan");
    for (const { terminal: id, inwg } of required) {
      const worked = workedSupply.paths.find((path) => path.terminal === id)?.damper_inwg ?? NaN;
      // A difference of two sums, each within the tolerance of the whole.
      const absoluteTolerance = workedSupply.relativeTolerance * workedSupply.requiredPressure_inwg;
      expectWithin(most - inwg, worked, { absoluteTolerance }, id);
    }
  });
});
