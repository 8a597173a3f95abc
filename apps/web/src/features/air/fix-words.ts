import { formatSize, radians, type Fix, type FixKind, type SegmentEdit } from "@cleatwork/calc";
import type { UnitSystem } from "@cleatwork/contracts";

const verbs: Readonly<Record<FixKind, string>> = {
  "larger-duct": "Size",
  "smaller-duct": "Size",
  "squarer-duct": "Size",
  "elbow-with-vanes": "Put vanes into the elbow of",
  "radius-elbow": "Make the elbow a radius elbow on",
  "balancing-damper": "Put a balancing damper into",
  "lined-duct": "Line",
  "rigid-duct": "Make rigid",
};

/** "Size duct 12 to 28 × 12": what is done, in one breath. */
export function fixText({ kind, edits }: Fix, units: UnitSystem, numberOf: (segmentId: string) => string): string {
  return edits.map((edit) => `${verbs[kind]} duct ${numberOf(edit.segmentId)}${detail(edit, units)}`).join(", ");
}

function detail({ fields }: SegmentEdit, units: UnitSystem): string {
  if (fields.section) return ` to ${formatSize(fields.section, units).text}`;
  if (typeof fields.damperAngle_rad === "number") return `, turned ${degrees(fields.damperAngle_rad)}`;
  return "";
}

export const degrees = (angle: number): string => `${Math.round((radians(angle) * 180) / Math.PI)}°`;
