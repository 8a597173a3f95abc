import type { AirSegment, ConstructionSpec } from "../air-system.ts";
import { isLined } from "../network/clear-section.ts";
import type { Meters } from "../quantity.ts";
import { roughnessTable } from "./roughness.table.ts";

/** Absolute roughness of what the air touches: flexible, liner, or the metal. Joints are counted in. */
export const roughnessOf = (segment: AirSegment, spec: ConstructionSpec): Meters =>
  segment.flexible
    ? roughnessTable.flexible.value
    : isLined(segment, spec)
      ? roughnessTable.liner.value
      : roughnessTable.metal[spec.material].value;
