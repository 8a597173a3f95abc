import type { AccessoryKind, AirSystem, Section } from "../air-system.ts";
import type { PracticeCoefficients } from "../fittings/practice.table.ts";
import { SCREEN_SOURCE, screenCoefficient } from "../fittings/screen.ts";
import { DAMPER_SOURCE, MOST_DAMPER_ANGLE, damperCoefficient } from "../fittings/throttled-damper.ts";
import { pascals, radians } from "../quantity.ts";
import { addFinding, type FindingList } from "./findings.ts";
import type { Friction } from "./friction.ts";
import type { Sections } from "./sections.ts";
import type { FittingInput, SolvedAccessory } from "./solution.ts";

const NO_ACCESSORIES: readonly SolvedAccessory[] = [];
const NO_INPUTS: readonly FittingInput[] = [];

/** Dampers and the like of every segment, each on the velocity pressure of the segment. */
export function findAccessories(
  { segments }: AirSystem,
  { section }: Sections,
  { velocityPressure }: Friction,
  practice: PracticeCoefficients,
  findings: FindingList,
): readonly (readonly SolvedAccessory[])[] {
  const all = new Array<readonly SolvedAccessory[]>(segments.length);
  for (let s = 0; s < segments.length; s++) {
    const { accessories, damperAngle_rad } = segments[s]!;
    if (accessories.length === 0) {
      all[s] = NO_ACCESSORIES;
      continue;
    }
    const angle = damperAngle_rad ?? 0;
    all[s] = accessories.map((kind) => {
      const { lossCoefficient, source, inputs } = loseAt(kind, section[s]!, angle, practice);
      const clamped = kind === "volume-damper" && angle > MOST_DAMPER_ANGLE;
      return {
        kind,
        lossCoefficient,
        loss_pa: pascals(lossCoefficient * velocityPressure[s]!),
        source,
        inputs,
        clamped,
      };
    });
    if (angle <= MOST_DAMPER_ANGLE || !accessories.includes("volume-damper")) continue;
    addFinding(
      findings,
      s,
      "table-range-exceeded",
      { kind: "segment", id: segments[s]!.id },
      { value: angle, limit: MOST_DAMPER_ANGLE, unit: "rad", limitSource: `volume damper: ${DAMPER_SOURCE}` },
    );
  }
  return all;
}

function loseAt(
  kind: AccessoryKind,
  section: Section,
  angle: number,
  practice: PracticeCoefficients,
): Pick<SolvedAccessory, "lossCoefficient" | "source" | "inputs"> {
  const byPractice = (lossCoefficient: number) => ({ lossCoefficient, source: practice.source, inputs: NO_INPUTS });
  switch (kind) {
    case "volume-damper": {
      const blade = practice.damper[section.shape === "rectangular" ? "rectangular" : "other"];
      if (angle === 0) return byPractice(blade.open);
      return {
        lossCoefficient: damperCoefficient(blade, radians(angle)),
        source: DAMPER_SOURCE,
        inputs: [{ name: "damper-angle", value: Math.min(angle, MOST_DAMPER_ANGLE) }],
      };
    }
    case "screen":
      return {
        lossCoefficient: screenCoefficient(practice.screenFreeArea),
        source: SCREEN_SOURCE,
        inputs: [{ name: "free-area", value: practice.screenFreeArea }],
      };
    case "fire-damper":
      return byPractice(practice.fireDamper);
    case "smoke-damper":
      return byPractice(practice.smokeDamper);
    case "flexible-connector":
      return byPractice(practice.flexibleConnector);
    case "access-door":
      return byPractice(practice.accessDoor);
  }
}
