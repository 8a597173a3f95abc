/** A small supply system for tests: equipment, one main, one junction, two outlets on two runouts. */
import {
  cubicFeetPerMinute,
  degreesCelsius,
  feet,
  feetPerMinute,
  inches,
  inchesOfWater,
  inchesOfWaterPer100Feet,
  meters,
  type Section,
} from "@cleatwork/calc";
import {
  makeId,
  type ChangeSet,
  type LayoutRecord,
  type LevelId,
  type NodeRecord,
  type SegmentRecord,
  type SpecId,
  type SystemRecord,
} from "@cleatwork/contracts";

const newId = <K extends string>(kind: K) =>
  makeId(kind, { now: Date.now(), random: (bytes) => crypto.getRandomValues(bytes) });

const round = (diameter: number): Section => ({ shape: "round", diameter_m: inches(diameter) });

export interface SmallSystem {
  readonly system: SystemRecord;
  readonly equipment: NodeRecord;
  readonly junction: NodeRecord;
  readonly outlets: readonly [NodeRecord, NodeRecord];
  readonly main: SegmentRecord;
  readonly runouts: readonly [SegmentRecord, SegmentRecord];
  readonly records: readonly LayoutRecord[];
}

export function aSmallSystem(levelId: LevelId, specId: SpecId, tag = "S1"): SmallSystem {
  const system: SystemRecord = {
    kind: "system",
    id: newId("sys"),
    tag,
    name: "Supply",
    service: "supply",
    specId,
    design: {
      altitude_m: meters(0),
      temperature_k: degreesCelsius(13),
      relativeHumidity: 0.5,
      availablePressure_pa: inchesOfWater(0.5),
      safetyMargin: 0,
    },
    limits: {
      velocity_m_s: { main: feetPerMinute(1500), branch: feetPerMinute(1200), runout: feetPerMinute(900) },
      frictionRate_pa_m: {
        main: inchesOfWaterPer100Feet(0.2),
        branch: inchesOfWaterPer100Feet(0.2),
        runout: inchesOfWaterPer100Feet(0.3),
      },
      flexibleLength_m: feet(5),
    },
    sizing: {
      method: "equal-friction",
      frictionRate_pa_m: inchesOfWaterPer100Feet(0.1),
      shape: "round",
      maximumHeight_m: null,
    },
  };
  const node = (role: NodeRecord["role"], x: number, y: number, name: string): NodeRecord => ({
    kind: "node",
    id: newId("nod"),
    systemId: system.id,
    role,
    tag: name,
    levelId,
    x_m: feet(x),
    y_m: feet(y),
    elevation_m: feet(10),
    airflow_m3s: role === "outlet" ? cubicFeetPerMinute(300) : null,
    requiredPressure_pa: role === "outlet" ? inchesOfWater(0.05) : null,
    deviceKey: null,
    spaceName: "",
  });
  const segment = (name: string, from: NodeRecord, to: NodeRecord, ordinal: number): SegmentRecord => ({
    kind: "segment",
    id: newId("seg"),
    systemId: system.id,
    name,
    fromNodeId: from.id,
    toNodeId: to.id,
    ordinal,
    ductClass: from.role === "equipment" ? "main" : "runout",
    section: from.role === "equipment" ? round(14) : round(10),
    length_m: null,
    flexible: false,
    fitting: null,
    accessories: [],
    insulation: null,
  });
  const equipment = node("equipment", 0, 0, "AH-1");
  const junction = node("junction", 20, 0, "");
  const outlets = [node("outlet", 40, 0, "D-1"), node("outlet", 20, 15, "D-2")] as const;
  const main = segment("Main", equipment, junction, 0);
  const runouts = [
    segment("East runout", junction, outlets[0], 1),
    segment("South runout", junction, outlets[1], 2),
  ] as const;
  return {
    system,
    equipment,
    junction,
    outlets,
    main,
    runouts,
    records: [system, equipment, junction, ...outlets, main, ...runouts],
  };
}

export const adding = (...records: readonly LayoutRecord[]): ChangeSet => ({
  label: "Add",
  changes: records.map((record) => ({ id: record.id, before: null, after: record })),
});

export const changing = <R extends LayoutRecord>(before: R, fields: Partial<R>): ChangeSet => ({
  label: "Change",
  changes: [{ id: before.id, before, after: { ...before, ...fields } }],
});

export const removing = (...records: readonly LayoutRecord[]): ChangeSet => ({
  label: "Remove",
  changes: records.map((record) => ({ id: record.id, before: record, after: null })),
});
