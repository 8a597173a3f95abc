/** A way out of a finding, as edits of segments. Plain data. */
import type { AirSegment, AirSystem } from "../air-system.ts";

export const FIX_KINDS = [
  "larger-duct",
  "smaller-duct",
  "squarer-duct",
  "elbow-with-vanes",
  "radius-elbow",
  "balancing-damper",
  "lined-duct",
  "rigid-duct",
] as const;
export type FixKind = (typeof FIX_KINDS)[number];

export interface SegmentEdit {
  readonly segmentId: string;
  readonly fields: Partial<
    Pick<AirSegment, "section" | "fitting" | "accessories" | "damperAngle_rad" | "flexible" | "insulation">
  >;
}

export interface Fix {
  readonly kind: FixKind;
  readonly edits: readonly SegmentEdit[];
  /** The finding goes; otherwise it only becomes smaller. */
  readonly clears: boolean;
}

/** The system with the edits made. */
export function withEdits(system: AirSystem, edits: readonly SegmentEdit[]): AirSystem {
  const fieldsOf = new Map(edits.map(({ segmentId, fields }) => [segmentId, fields]));
  return {
    ...system,
    segments: system.segments.map((segment) => {
      const fields = fieldsOf.get(segment.id);
      return fields ? { ...segment, ...fields } : segment;
    }),
  };
}
