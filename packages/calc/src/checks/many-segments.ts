/** A made-up building of any size, the same every time: for timing, and for tests that need many segments. */
import type { AirNode, AirSegment, AirSystem, DuctClass, Section } from "../air-system.ts";
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

const ZONES_ON_A_FLOOR = 12;
const TAPS_ON_A_ZONE = 8;

/**
 * A riser with a floor at each landing; on each floor a main with zone branches to one side, on each branch taps to outlets.
 * All four shapes; a runout in three is flexible. Sizes are typed, or all left to the rule. Floors are alike, as in most
 * buildings, unless no two outlets shall have the same airflow.
 */
export function benchSystem(
  segmentCount: number,
  sizes: "typed" | "by-rule" = "typed",
  floors: "alike" | "all-different" = "alike",
): AirSystem {
  const nodes: AirNode[] = [];
  const segments: AirSegment[] = [];

  const addNode = (role: AirNode["role"], x: number, y: number, z: number, airflow_cfm: number | null): AirNode => {
    const node = aNode(nodes.length, role, [x, y, z], airflow_cfm);
    nodes.push(node);
    return node;
  };
  const addSegment = (from: AirNode, to: AirNode, ductClass: DuctClass, section: Section, flexible = false) => {
    segments.push({
      id: `seg_${segments.length}`,
      name: `${segments.length + 1}`,
      fromNodeId: from.id,
      toNodeId: to.id,
      ductClass,
      section: sizes === "typed" ? section : null,
      length_m: null,
      flexible,
      fitting: null,
      accessories: [],
      insulation: null,
    });
    return to;
  };
  const addOutlet = (from: AirNode, x: number, y: number, z: number) => {
    const turn = segments.length % 3;
    const airflow = 120 + 20 * (segments.length % 7) + (floors === "alike" ? 0 : segments.length / segmentCount);
    const section = turn === 1 ? annularOf(12, 4) : roundOf(8 + (segments.length % 2));
    addSegment(from, addNode("outlet", x, y, z, airflow), "runout", section, turn === 0);
  };

  const riserSection = roundOf(riserDiameter_in(segmentCount));
  let riser = addNode("equipment", 0, 0, 0, null);
  for (let floor = 1; segments.length < segmentCount; floor++) {
    const height = 4 * floor;
    riser = addSegment(riser, addNode("junction", 0, 0, height, null), "main", riserSection);
    let main = riser;
    for (let zone = 1; zone <= ZONES_ON_A_FLOOR && segments.length + 2 <= segmentCount; zone++) {
      const x = 6 * zone;
      main = addSegment(main, addNode("junction", x, 0, height, null), "main", rectangleOf(54 - 4 * (zone >> 1), 20));
      let branch = main;
      for (let tap = 1; tap <= TAPS_ON_A_ZONE && segments.length + 2 <= segmentCount; tap++) {
        const y = 4 * tap;
        const width = 26 - 2 * (tap >> 1);
        const section = zone % 2 === 0 ? rectangleOf(width, 12) : flatOvalOf(width, 10);
        branch = addSegment(branch, addNode("junction", x, y, height, null), "branch", section);
        addOutlet(branch, x + 2, y, height);
      }
      // A branch ends at an outlet, never in the air.
      if (segments.length < segmentCount) addOutlet(branch, x, branch.y_m + 3, height);
    }
    if (segments.length < segmentCount) addOutlet(main, main.x_m + 3, 0, height);
  }
  return { ...benchFrame, nodes: closed(nodes, segments), segments };
}

function aNode(
  index: number,
  role: AirNode["role"],
  [x, y, z]: readonly [number, number, number],
  airflow_cfm: number | null,
): AirNode {
  return {
    id: `nod_${index}`,
    role,
    tag: role === "outlet" ? `D-${index}` : "",
    levelId: "lvl_1",
    x_m: meters(x),
    y_m: meters(y),
    elevation_m: meters(z),
    airflow_m3s: airflow_cfm === null ? null : cubicFeetPerMinute(airflow_cfm),
    requiredPressure_pa: role === "outlet" ? inchesOfWater(0.08) : null,
    deviceKey: null,
    spaceName: "",
  };
}

/** Where the count cut a run short, its last junction becomes an outlet. */
function closed(nodes: readonly AirNode[], segments: readonly AirSegment[]): AirNode[] {
  const tails = new Set(segments.map(({ fromNodeId }) => fromNodeId));
  return nodes.map((node, index) =>
    node.role === "junction" && !tails.has(node.id)
      ? aNode(index, "outlet", [node.x_m, node.y_m, node.elevation_m], 200)
      : node,
  );
}

/** Wide enough that air gets up a taller building too, or what is timed is the writing of a finding for every outlet. */
const riserDiameter_in = (segmentCount: number): number => 60 * Math.max(1, segmentCount / 5_000) ** 0.6;

const roundOf = (diameter_in: number): Section => ({ shape: "round", diameter_m: inches(diameter_in) });
const rectangleOf = (width_in: number, height_in: number): Section => ({
  shape: "rectangular",
  width_m: inches(width_in),
  height_m: inches(height_in),
});
const flatOvalOf = (width_in: number, height_in: number): Section => ({
  shape: "flat-oval",
  width_m: inches(width_in),
  height_m: inches(height_in),
});
const annularOf = (outer_in: number, inner_in: number): Section => ({
  shape: "annular",
  outerDiameter_m: inches(outer_in),
  innerDiameter_m: inches(inner_in),
});

const benchFrame: Omit<AirSystem, "nodes" | "segments"> = {
  schema: "cleatwork.air-system/1",
  id: "sys_many",
  tag: "S9",
  name: "Many segments",
  service: "supply",
  design: {
    altitude_m: feet(600),
    temperature_k: degreesFahrenheit(55),
    relativeHumidity: 0.9,
    availablePressure_pa: pascals(1e4),
    safetyMargin: 0,
  },
  limits: {
    velocity_m_s: { main: feetPerMinute(20_000), branch: feetPerMinute(5_000), runout: feetPerMinute(2_000) },
    frictionRate_pa_m: {
      main: inchesOfWaterPer100Feet(20),
      branch: inchesOfWaterPer100Feet(5),
      runout: inchesOfWaterPer100Feet(5),
    },
    flexibleLength_m: feet(10),
  },
  sizing: {
    method: "equal-friction",
    frictionRate_pa_m: inchesOfWaterPer100Feet(0.1),
    shape: "rectangular",
    maximumHeight_m: inches(24),
  },
  frictionBasis: "hydraulic-diameter",
  spec: {
    material: "galvanized",
    pressureClass_pa: pascals(1e4),
    sealClass: "B",
    sectionLength_m: { rectangular: feet(5), round: feet(10), flatOval: feet(10) },
    rectangularJoint: "flange",
    roundJoint: "slip-coupling",
    rectangularSeam: "corner-lock",
    roundConstruction: "spiral",
    insulation: { kind: "none" },
    hangerSpacing_m: { rectangular: feet(8), round: feet(10) },
    sizesAre: "clear-inside",
    elbow: { rectangular: "radius", round: "gored", radiusRatio: 1.5 },
    branch: { rectangular: "shoe-tap", round: "conical-tap" },
    transitionAngle_rad: Math.PI / 6,
    flexibleSlack: 0.04,
  },
  levels: [{ id: "lvl_1", name: "Level 1", elevation_m: meters(0) }],
};
