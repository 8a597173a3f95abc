/** Heat views: how near each duct is to its limit. */
import type { SolvedSegment } from "@cleatwork/calc";
import type { SegmentRecord, SystemRecord } from "@cleatwork/contracts";

export const HEATS = ["off", "velocity", "friction"] as const;
export type Heat = (typeof HEATS)[number];

/** Share of the limit, 1 at the limit. */
export function heatShare(
  heat: Heat,
  solved: SolvedSegment,
  segment: SegmentRecord,
  system: SystemRecord,
): number | null {
  switch (heat) {
    case "off":
      return null;
    case "velocity":
      return solved.meanVelocity_m_s / system.limits.velocity_m_s[segment.ductClass];
    case "friction":
      return solved.frictionRate_pa_m / system.limits.frictionRate_pa_m[segment.ductClass];
  }
}
