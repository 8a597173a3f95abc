/** Systems for tests: say what matters, the rest is ordinary. Positions in meters, airflow in m³/s, pressures in Pa. */
import type { AirNode, AirSegment, AirSystem, Section } from "../air-system.ts";
import { cubicMetersPerSecond, kelvins, meters, metersPerSecond, pascals, pascalsPerMeter } from "../quantity.ts";

type At = readonly [x: number, y: number, z?: number];

export const round = (diameter: number): Section => ({ shape: "round", diameter_m: meters(diameter) });
export const rectangular = (width: number, height: number): Section => ({
  shape: "rectangular",
  width_m: meters(width),
  height_m: meters(height),
});
export const flatOval = (width: number, height: number): Section => ({
  shape: "flat-oval",
  width_m: meters(width),
  height_m: meters(height),
});
export const annular = (outer: number, inner: number): Section => ({
  shape: "annular",
  outerDiameter_m: meters(outer),
  innerDiameter_m: meters(inner),
});

const aNode = (id: string, [x, y, z = 0]: At): Omit<AirNode, "role" | "airflow_m3s" | "requiredPressure_pa"> => ({
  id,
  tag: id,
  levelId: "lvl_1",
  x_m: meters(x),
  y_m: meters(y),
  elevation_m: meters(z),
  deviceKey: null,
  spaceName: "",
});

export const equipment = (id: string, at: At): AirNode => ({
  ...aNode(id, at),
  role: "equipment",
  airflow_m3s: null,
  requiredPressure_pa: null,
});
export const junction = (id: string, at: At): AirNode => ({
  ...aNode(id, at),
  role: "junction",
  airflow_m3s: null,
  requiredPressure_pa: null,
});
export const outlet = (id: string, at: At, airflow: number, requiredPressure: number | null = 0): AirNode => ({
  ...aNode(id, at),
  role: "outlet",
  airflow_m3s: cubicMetersPerSecond(airflow),
  requiredPressure_pa: requiredPressure === null ? null : pascals(requiredPressure),
});

/** From one node to another, named by both: "unit-tee". */
export const duct = (
  fromNodeId: string,
  toNodeId: string,
  section: Section | null,
  rest: Partial<AirSegment> = {},
): AirSegment => ({
  id: `${fromNodeId}-${toNodeId}`,
  name: `${fromNodeId}-${toNodeId}`,
  fromNodeId,
  toNodeId,
  ductClass: "main",
  section,
  length_m: null,
  flexible: false,
  fitting: null,
  accessories: [],
  insulation: null,
  ...rest,
});

export function aSystem(
  nodes: readonly AirNode[],
  segments: readonly AirSegment[],
  rest: Partial<Omit<AirSystem, "nodes" | "segments">> = {},
): AirSystem {
  return { ...ordinary, nodes, segments, ...rest };
}

/** One duct from the unit to an outlet. */
export const oneDuct = (
  section: Section | null,
  airflow: number,
  rest: Partial<AirSegment> & { system?: Partial<AirSystem>; length?: number } = {},
): AirSystem => {
  const { system = {}, length = 10, ...segment } = rest;
  return aSystem(
    [equipment("unit", [0, 0]), outlet("out", [length, 0], airflow)],
    [duct("unit", "out", section, segment)],
    system,
  );
};

export const ordinary: Omit<AirSystem, "nodes" | "segments"> = {
  schema: "cleatwork.air-system/1",
  id: "sys_1",
  tag: "S1",
  name: "Test system",
  service: "supply",
  design: {
    altitude_m: meters(0),
    temperature_k: kelvins(293.15),
    relativeHumidity: 0,
    availablePressure_pa: pascals(250),
    safetyMargin: 0,
  },
  limits: {
    velocity_m_s: { main: metersPerSecond(12), branch: metersPerSecond(10), runout: metersPerSecond(6) },
    frictionRate_pa_m: { main: pascalsPerMeter(10), branch: pascalsPerMeter(10), runout: pascalsPerMeter(10) },
    flexibleLength_m: meters(2),
  },
  sizing: { method: "equal-friction", frictionRate_pa_m: pascalsPerMeter(0.8), shape: "round", maximumHeight_m: null },
  frictionBasis: "hydraulic-diameter",
  spec: {
    material: "galvanized",
    pressureClass_pa: pascals(500),
    sealClass: "B",
    sectionLength_m: { rectangular: meters(1.5), round: meters(3), flatOval: meters(3) },
    rectangularJoint: "flange",
    roundJoint: "slip-coupling",
    rectangularSeam: "corner-lock",
    roundConstruction: "spiral",
    insulation: { kind: "none" },
    hangerSpacing_m: { rectangular: meters(2.4), round: meters(3) },
    sizesAre: "clear-inside",
    elbow: { rectangular: "radius", round: "smooth", radiusRatio: 1.5 },
    branch: { rectangular: "straight-tap", round: "straight-tap" },
    transitionAngle_rad: Math.PI / 6,
    flexibleSlack: 0,
  },
  levels: [{ id: "lvl_1", name: "Level 1", elevation_m: meters(0) }],
};
