/** Turns rows read off a plan into layout records and one change set a system, as a person's edits would be. */
import {
  cubicFeetPerMinute,
  degreesFahrenheit,
  feet,
  feetPerMinute,
  inches,
  inchesOfWater,
  inchesOfWaterPer100Feet,
  type Insulation,
  type Limits,
  type Section,
  type SizingRule,
} from "@cleatwork/calc";
import type {
  ChangeSet,
  LayoutRecord,
  LevelId,
  NodeId,
  NodeRecord,
  SegmentRecord,
  SpecId,
  SystemId,
  SystemRecord,
} from "@cleatwork/contracts";
import type { DuctRow, SystemRows } from "./duct-row.ts";
import { newId } from "./new-id.ts";

/** The invented company's own limits. */
const limits: Limits = {
  velocity_m_s: { main: feetPerMinute(1475), branch: feetPerMinute(1180), runout: feetPerMinute(740) },
  frictionRate_pa_m: {
    main: inchesOfWaterPer100Feet(0.12),
    branch: inchesOfWaterPer100Feet(0.12),
    runout: inchesOfWaterPer100Feet(0.3),
  },
  flexibleLength_m: feet(5),
};

const sizing: SizingRule = {
  method: "equal-friction",
  frictionRate_pa_m: inchesOfWaterPer100Feet(0.08),
  shape: "rectangular",
  maximumHeight_m: inches(18),
};

export function layoutOfSystem(
  system: SystemRows,
  site: { levelId: LevelId; specId: SpecId; altitude_ft: number },
): ChangeSet {
  const systemId = newId("sys");
  const nodes = new Map<number | null, NodeRecord>();
  const records: LayoutRecord[] = [systemRecord(system, systemId, site)];

  const equipment = node(systemId, site.levelId, {
    role: "equipment",
    tag: system.equipment.tag,
    at: system.equipment.at,
    height_ft: system.equipment.height_ft ?? system.height_ft,
  });
  nodes.set(null, equipment);
  records.push(equipment);

  let outlets = 0;
  for (const [index, row] of system.rows.entries()) {
    const from = nodes.get(row.after);
    if (!from) throw new Error(`${system.tag} row ${row.no} hangs on row ${row.after}, which is not above it`);
    const to = node(systemId, site.levelId, {
      role: row.outlet ? "outlet" : "junction",
      tag: row.outlet ? `${system.outletPrefix}-${++outlets}` : "",
      at: row.to,
      height_ft: row.height_ft ?? system.height_ft,
      outlet: row.outlet,
    });
    nodes.set(row.no, to);
    records.push(to, segment(row, systemId, { from: from.id, to: to.id, ordinal: index }));
  }
  return {
    label: `Lay out ${system.tag}`,
    changes: records.map((record) => ({ id: record.id, before: null, after: record })),
  };
}

function systemRecord(system: SystemRows, id: SystemId, site: { specId: SpecId; altitude_ft: number }): SystemRecord {
  return {
    kind: "system",
    id,
    tag: system.tag,
    name: system.name,
    service: system.service,
    specId: site.specId,
    design: {
      altitude_m: feet(site.altitude_ft),
      temperature_k: degreesFahrenheit(system.temperature_f),
      relativeHumidity: 0.5,
      availablePressure_pa: inchesOfWater(system.available_inwg),
      safetyMargin: 0.1,
    },
    limits,
    sizing,
  };
}

function node(
  systemId: SystemId,
  levelId: LevelId,
  place: {
    role: NodeRecord["role"];
    tag: string;
    at: readonly [number, number];
    height_ft: number;
    outlet?: DuctRow["outlet"];
  },
): NodeRecord {
  const { outlet } = place;
  return {
    kind: "node",
    id: newId("nod"),
    systemId,
    role: place.role,
    tag: place.tag,
    levelId,
    x_m: feet(place.at[0]),
    y_m: feet(place.at[1]),
    elevation_m: feet(place.height_ft),
    airflow_m3s: outlet ? cubicFeetPerMinute(outlet.cfm) : null,
    requiredPressure_pa: outlet ? inchesOfWater(outlet.need_inwg) : null,
    deviceKey: outlet?.device ?? null,
    spaceName: outlet?.space ?? "",
  };
}

function segment(row: DuctRow, systemId: SystemId, ends: { from: NodeId; to: NodeId; ordinal: number }): SegmentRecord {
  return {
    kind: "segment",
    id: newId("seg"),
    systemId,
    name: row.name,
    fromNodeId: ends.from,
    toNodeId: ends.to,
    ordinal: ends.ordinal,
    number: row.no,
    ductClass: row.duct,
    section: sectionFrom(row.size),
    length_m: row.length_ft === undefined ? null : feet(row.length_ft),
    flexible: row.size.endsWith("flex"),
    fitting: null,
    accessories: [...(row.accessories ?? [])],
    insulation: row.insulation ? insulation[row.insulation] : null,
  };
}

const insulation = {
  none: { kind: "none" },
  liner: { kind: "liner", thickness_m: inches(1) },
} satisfies Record<string, Insulation>;

/** @example sectionFrom("18x8 oval") // flat oval, 18 in. by 8 in. */
export function sectionFrom(size: string): Section {
  const [, first, separator, second, word] = /^(\d+)(?:([x/])(\d+))?(?: (oval|flex|ring))?$/.exec(size) ?? [];
  const a = inches(Number(first));
  const b = inches(Number(second));
  if (!first) throw new Error(`"${size}" is no size`);
  if (separator === "/" && word === "ring") return { shape: "annular", outerDiameter_m: a, innerDiameter_m: b };
  if (separator === "x" && word === "oval") return { shape: "flat-oval", width_m: a, height_m: b };
  if (separator === "x" && word === undefined) return { shape: "rectangular", width_m: a, height_m: b };
  if (separator === undefined && word !== "oval" && word !== "ring") return { shape: "round", diameter_m: a };
  throw new Error(`"${size}" is no size`);
}
