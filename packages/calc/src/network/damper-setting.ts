import type { AirSegment, Section } from "../air-system.ts";
import type { PracticeCoefficients } from "../fittings/practice.table.ts";
import { DAMPER_SOURCE, damperAngle } from "../fittings/throttled-damper.ts";
import type { DamperSetting, SolvedAccessory } from "./solution.ts";

/** Less than this is within what any balancing can find: 0.1 Pa. */
const NOTHING_TO_TAKE_UP_PA = 0.1;

/**
 * How far a volume damper in the segment is turned to take up an excess of total pressure on top of what it takes already.
 *
 *     C = C as it stands + excess ÷ velocity pressure
 */
export function damperSetting(
  excess_pa: number,
  duct: { segment: AirSegment; section: Section; velocityPressure: number; accessories: readonly SolvedAccessory[] },
  practice: PracticeCoefficients,
): DamperSetting | null {
  if (!(excess_pa > NOTHING_TO_TAKE_UP_PA)) return null;
  const blade = practice.damper[duct.section.shape === "rectangular" ? "rectangular" : "other"];
  const standing = duct.accessories.find(({ kind }) => kind === "volume-damper");
  // A damper that is put in brings the loss of its open blade along, and has that much less to take up.
  const lossCoefficient = (standing?.lossCoefficient ?? 0) + excess_pa / duct.velocityPressure;
  return {
    segmentId: duct.segment.id,
    isThere: standing !== undefined,
    lossCoefficient,
    angle_rad: damperAngle(blade, lossCoefficient),
    source: DAMPER_SOURCE,
  };
}
