/** Small systems for checks of the takeoff: say what matters, the rest is ordinary. */
import type { AirNode, AirSegment, AirSystem, ConstructionSpec, Section } from "../air-system.ts";
import { solve } from "../network/solve.ts";
import type { Solution } from "../network/solution.ts";
import {
  cubicFeetPerMinute,
  degreesFahrenheit,
  feet,
  feetPerMinute,
  inches,
  inchesOfWater,
  inchesOfWaterPer100Feet,
  meters,
  pascals,
} from "../quantity.ts";
import { shippedStandards } from "../takeoff/shipped-standards.ts";
import { takeOff } from "../takeoff/take-off.ts";
import type { ShopStandards, Takeoff } from "../takeoff/takeoff.ts";

export const rectangular = (width_in: number, height_in: number): Section => ({
  shape: "rectangular",
  width_m: inches(width_in),
  height_m: inches(height_in),
});
export const round = (diameter_in: number): Section => ({ shape: "round", diameter_m: inches(diameter_in) });
export const oval = (width_in: number, height_in: number): Section => ({
  shape: "flat-oval",
  width_m: inches(width_in),
  height_m: inches(height_in),
});
export const annular = (outer_in: number, inner_in: number): Section => ({
  shape: "annular",
  outerDiameter_m: inches(outer_in),
  innerDiameter_m: inches(inner_in),
});

export const plainSpec: ConstructionSpec = {
  material: "galvanized",
  pressureClass_pa: inchesOfWater(1),
  sealClass: "A",
  sectionLength_m: { rectangular: feet(5), round: feet(10), flatOval: feet(10) },
  rectangularJoint: "slip-and-drive",
  roundJoint: "slip-coupling",
  rectangularSeam: "corner-lock",
  roundConstruction: "spiral",
  insulation: { kind: "none" },
  hangerSpacing_m: { rectangular: feet(8), round: feet(10) },
  sizesAre: "clear-inside",
  elbow: { rectangular: "radius", round: "gored", radiusRatio: 1.5 },
  branch: { rectangular: "straight-tap", round: "straight-tap" },
  transitionAngle_rad: Math.PI / 6,
  flexibleSlack: 0,
};

/** A duct from one named point to another; points are in feet. `after` names the point that the run comes from. */
export interface DuctOf {
  readonly to: string;
  readonly after: string;
  readonly at: readonly [x_ft: number, y_ft: number, z_ft?: number];
  readonly section: Section;
  readonly more?: Partial<AirSegment>;
  /** Makes the far end an outlet. */
  readonly outlet?: Partial<AirNode>;
}

/** From equipment "unit" at the origin. */
export function aSystem(ducts: readonly DuctOf[], spec: Partial<ConstructionSpec> = {}): AirSystem {
  const node = (id: string, at: DuctOf["at"], more: Partial<AirNode>): AirNode => ({
    id,
    role: "junction",
    tag: id,
    levelId: "level",
    x_m: feet(at[0]),
    y_m: feet(at[1]),
    elevation_m: feet(at[2] ?? 0),
    airflow_m3s: null,
    requiredPressure_pa: null,
    deviceKey: null,
    spaceName: "",
    ...more,
  });
  return {
    schema: "cleatwork.air-system/1",
    id: "system",
    tag: "S1",
    name: "Supply",
    service: "supply",
    design: {
      altitude_m: meters(0),
      temperature_k: degreesFahrenheit(70),
      relativeHumidity: 0,
      availablePressure_pa: pascals(500),
      safetyMargin: 0,
    },
    limits: {
      velocity_m_s: { main: feetPerMinute(2000), branch: feetPerMinute(2000), runout: feetPerMinute(2000) },
      frictionRate_pa_m: {
        main: inchesOfWaterPer100Feet(1),
        branch: inchesOfWaterPer100Feet(1),
        runout: inchesOfWaterPer100Feet(1),
      },
      flexibleLength_m: feet(10),
    },
    sizing: {
      method: "equal-friction",
      frictionRate_pa_m: inchesOfWaterPer100Feet(0.1),
      shape: "rectangular",
      maximumHeight_m: null,
    },
    frictionBasis: "hydraulic-diameter",
    spec: { ...plainSpec, ...spec },
    levels: [{ id: "level", name: "Level 1", elevation_m: meters(0) }],
    nodes: [
      node("unit", [0, 0], { role: "equipment" }),
      ...ducts.map(({ to, at, outlet }) =>
        node(to, at, outlet ? { role: "outlet", airflow_m3s: cubicFeetPerMinute(400), ...outlet } : {}),
      ),
    ],
    segments: ducts.map(({ to, after, section, more }) => ({
      id: `to-${to}`,
      name: to,
      fromNodeId: after,
      toNodeId: to,
      ductClass: "main",
      section,
      length_m: null,
      flexible: false,
      fitting: null,
      accessories: [],
      insulation: null,
      ...more,
    })),
  };
}

/** One straight run to one outlet. */
export const aRun = (section: Section, length_ft: number, spec: Partial<ConstructionSpec> = {}): AirSystem =>
  aSystem([{ to: "end", after: "unit", at: [length_ft, 0], section, outlet: {} }], spec);

export function solutionOf(system: AirSystem): Solution {
  const solved = solve(system);
  if (!solved.ok) throw new Error(JSON.stringify(solved.problems));
  return solved.value;
}

export const takeoffOf = (system: AirSystem, standards: ShopStandards = shippedStandards): Takeoff =>
  takeOff({ system, standards }, solutionOf(system));
