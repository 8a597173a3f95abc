/** What is counted and not cut: hangers, sealant, dampers and doors, devices at the outlets. */
import type { AccessoryKind, Section, SheetReference } from "../air-system.ts";
import { leg } from "../fittings/joints.ts";
import { hours, METERS_PER_INCH } from "../quantity.ts";
import { segmentBefore, type Frame } from "./frame.ts";
import { flexibleSupport, sealantTable } from "./making.table.ts";
import { girth } from "./surface/girth.ts";
import type { CountedItem, Piece } from "./takeoff.ts";

/** A count that falls on a whole number must not be pushed over it by the last digit. */
const roundUp = (value: number): number => Math.ceil(value - 1e-9);

/** Level where a segment is hung: that of its far end. */
export const levelOf = ({ system, tree }: Frame, s: number): string => system.nodes[tree.to[s]!]!.levelId;

/** The sheet that a segment was measured from: that of the same level. */
export const sheetOf = (frame: Frame, s: number): SheetReference | null =>
  frame.sheetOfLevel.get(levelOf(frame, s)) ?? null;

/**
 * Hangers of each segment: one a spacing along a run from its start, one at each elbow, one at a free end.
 *
 * Spacing is carried through from one segment of a run to the next, so that a run cut in two is hung as before. Flexible
 * duct is held by its ends and between them.
 *
 * Source   SMACNA 1995, section 4 (a support within 2 ft of each elbow); the count is common practice
 */
export function countHangers(frame: Frame, madeElbows: readonly number[]): CountedItem[] {
  const { system, solution, tree, joints, metal } = frame;
  const { spec } = system;
  const { hanger_h_each, conditionFactor } = frame.standards.productivity;
  const startOfRun = new Float64Array(system.segments.length);
  const counts = new Int32Array(system.segments.length);

  for (const s of tree.order) {
    const segment = system.segments[s]!;
    const { length_m } = solution.segments[s]!;
    if (segment.flexible) {
      counts[s] = Math.max(0, roundUp(length_m / flexibleSupport.spacing) - 1);
      continue;
    }
    const before = segmentBefore(frame, s);
    const kind = joints.leg[s];
    const goesOn = before !== null && !system.segments[before]!.flexible && (kind === leg.only || kind === leg.run);
    const start = goesOn ? startOfRun[before]! + solution.segments[before]!.length_m : 0;
    startOfRun[s] = start;
    const spacing = spec.hangerSpacing_m[metal[s]!.shape === "rectangular" ? "rectangular" : "round"];
    const isEnd = tree.childStart[tree.to[s]!] === tree.childStart[tree.to[s]! + 1];
    counts[s] =
      roundUp((start + length_m) / spacing) - roundUp(start / spacing) + (madeElbows[s] ?? 0) + (isEnd ? 1 : 0);
  }

  const items: CountedItem[] = [];
  for (let s = 0; s < counts.length; s++) {
    const quantity = counts[s]!;
    if (quantity === 0) continue;
    const { flexible, id } = system.segments[s]!;
    items.push({
      key: "hanger",
      kind: "hanger",
      description: flexible ? "Hanger, flexible duct" : "Hanger",
      systemId: system.id,
      levelId: levelOf(frame, s),
      segmentId: id,
      nodeId: null,
      section: metal[s]!,
      quantity,
      unit: "ea",
      // Holding flexible duct is part of its hours by length.
      fieldHours_h: hours(flexible ? 0 : quantity * hanger_h_each * conditionFactor),
      basis: flexible ? flexibleSupport.source : "spec's spacing along the run, one more at elbows and free ends",
    });
  }
  return items;
}

/** Sealant of a segment: joints in every seal class, seams too in A and B. Spiral seams need none. */
export function countSealant(frame: Frame, s: number, pieces: readonly Piece[]): CountedItem | null {
  const { system, metal } = frame;
  const { sealClass } = system.spec;
  if (sealClass === "none") return null;
  let sealed = 0;
  for (const piece of pieces) {
    if (piece.kind === "flexible") continue;
    sealed += girth(piece.otherSection ?? piece.section);
    if (sealClass !== "C") sealed += piece.seamLength_m;
  }
  if (sealed === 0) return null;
  return {
    key: "sealant",
    kind: "sealant",
    description: "Duct sealant",
    systemId: system.id,
    levelId: levelOf(frame, s),
    segmentId: system.segments[s]!.id,
    nodeId: null,
    section: metal[s]!,
    quantity: sealed * sealantTable.liters_per_m,
    unit: "L",
    fieldHours_h: hours(0),
    basis: `${sealantTable.source}, ${sealClass === "C" ? "joints" : "joints and seams"}; its hours are in those by weight`,
  };
}

const ACCESSORY_NAMES: Readonly<Record<AccessoryKind, string>> = {
  "volume-damper": "Volume damper",
  "fire-damper": "Fire damper",
  "smoke-damper": "Smoke damper",
  "flexible-connector": "Flexible connector",
  "access-door": "Access door",
  screen: "Screen",
};

/** Whole inches where they are, else tenths: how the price book names a size. */
export function sizeKey(section: Section): string {
  const inch = (side: number) => String(Math.round((side / METERS_PER_INCH) * 10) / 10);
  switch (section.shape) {
    case "round":
      return inch(section.diameter_m);
    case "rectangular":
      return `${inch(section.width_m)}x${inch(section.height_m)}`;
    case "flat-oval":
      return `${inch(section.width_m)}x${inch(section.height_m)} oval`;
    case "annular":
      return `${inch(section.outerDiameter_m)}/${inch(section.innerDiameter_m)}`;
  }
}

export function countAccessories(frame: Frame, s: number): CountedItem[] {
  const { system, metal } = frame;
  const { accessory_h_each, conditionFactor } = frame.standards.productivity;
  const { accessories, id } = system.segments[s]!;
  return accessories.map((kind) => ({
    key: `${kind}:${sizeKey(metal[s]!)}`,
    kind: "accessory",
    description: ACCESSORY_NAMES[kind],
    systemId: system.id,
    levelId: levelOf(frame, s),
    segmentId: id,
    nodeId: null,
    section: metal[s]!,
    quantity: 1,
    unit: "ea",
    fieldHours_h: hours(accessory_h_each[kind] * conditionFactor),
    basis: "as drawn",
  }));
}

export function countDevices({ system, standards }: Frame): CountedItem[] {
  const { device_h_each, conditionFactor } = standards.productivity;
  return system.nodes.flatMap((node) =>
    node.role !== "outlet" || node.deviceKey === null
      ? []
      : [
          {
            key: node.deviceKey,
            kind: "device" as const,
            description: node.deviceKey.replaceAll("-", " "),
            systemId: system.id,
            levelId: node.levelId,
            segmentId: null,
            nodeId: node.id,
            section: null,
            quantity: 1,
            unit: "ea" as const,
            fieldHours_h: hours(device_h_each * conditionFactor),
            basis: "one at its outlet",
          },
        ],
  );
}
