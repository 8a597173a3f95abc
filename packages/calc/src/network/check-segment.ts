/** The checks of one segment's own values: size, length, accessories. */
import {
  ACCESSORY_KINDS,
  DUCT_CLASSES,
  FITTING_TYPES,
  MOUTH_TYPES,
  type AirSegment,
  type ConstructionSpec,
  type Section,
} from "../air-system.ts";
import { isInsulation } from "./check-conditions.ts";
import { linerThickness } from "./clear-section.ts";
import { problem, segmentSubject } from "./problems.ts";
import { isIn, ranges } from "./ranges.table.ts";
import type { SystemProblem } from "./solution.ts";

/** Everything in order, cheaply: the long answer is made only when it is needed. */
export function isSegmentSound(segment: AirSegment, spec: ConstructionSpec): boolean {
  return (
    (segment.section === null || isSectionSound(segment.section, 2 * linerThickness(segment, spec))) &&
    (segment.length_m === null || isIn(ranges.length, segment.length_m)) &&
    (!segment.flexible || segment.section === null || segment.section.shape === "round") &&
    (segment.insulation === null || isInsulation(segment.insulation)) &&
    isDuctClass(segment.ductClass) &&
    (segment.fitting === null || FITTING_TYPES.includes(segment.fitting)) &&
    isDamperAngle(segment.damperAngle_rad) &&
    isMouth(segment.mouth) &&
    (segment.accessories.length === 0 || segment.accessories.every((kind) => ACCESSORY_KINDS.includes(kind)))
  );
}

const isDuctClass = (value: string): boolean => value === "main" || value === "branch" || value === "runout";

const isDamperAngle = (angle: AirSegment["damperAngle_rad"]): boolean =>
  angle === undefined || angle === null || isIn(ranges.damperAngle, angle);

const isMouth = (mouth: AirSegment["mouth"]): boolean =>
  mouth === undefined || mouth === null || MOUTH_TYPES.includes(mouth);

/** Sides in range, and air left inside liner of `lining` on both sides together. */
function isSectionSound(section: Section, lining: number): boolean {
  switch (section.shape) {
    case "round":
      return section.diameter_m > lining && isIn(ranges.side, section.diameter_m);
    case "rectangular":
      return (
        section.width_m > lining &&
        section.height_m > lining &&
        isIn(ranges.side, section.width_m) &&
        isIn(ranges.side, section.height_m)
      );
    case "flat-oval":
      return (
        section.height_m > lining &&
        section.width_m >= section.height_m &&
        isIn(ranges.side, section.width_m) &&
        isIn(ranges.side, section.height_m)
      );
    case "annular":
      return (
        section.outerDiameter_m - lining > section.innerDiameter_m &&
        isIn(ranges.side, section.outerDiameter_m) &&
        isIn(ranges.side, section.innerDiameter_m)
      );
    default:
      return false;
  }
}

/** Every problem of a segment that is not sound. */
export function problemsOfSegment(segment: AirSegment, spec: ConstructionSpec): SystemProblem[] {
  const problems: SystemProblem[] = [];
  const subject = segmentSubject(segment);
  const add = (code: SystemProblem["code"], field: string, value: unknown, limit: string) =>
    problems.push(problem(code, subject, field, value, limit));
  const lining = 2 * linerThickness(segment, spec);

  const checkSide = (field: string, value: number) => {
    if (!isIn(ranges.side, value)) {
      add(value > ranges.side.to ? "value-out-of-range" : "size-not-positive", field, value, ranges.side.words);
      return false;
    }
    if (value <= lining) {
      add("size-not-positive", field, value, `more than ${lining} m, which the liner takes`);
      return false;
    }
    return true;
  };

  const { section } = segment;
  switch (section?.shape) {
    case undefined:
      break;
    case "round":
      checkSide("section.diameter_m", section.diameter_m);
      break;
    case "rectangular":
      checkSide("section.width_m", section.width_m);
      checkSide("section.height_m", section.height_m);
      break;
    case "flat-oval":
      if (
        checkSide("section.width_m", section.width_m) &&
        checkSide("section.height_m", section.height_m) &&
        section.height_m > section.width_m
      ) {
        add(
          "flat-oval-taller-than-wide",
          "section.height_m",
          section.height_m,
          `at most its width, ${section.width_m} m`,
        );
      }
      break;
    case "annular":
      if (
        checkSide("section.outerDiameter_m", section.outerDiameter_m) &&
        (isIn(ranges.side, section.innerDiameter_m) || checkSide("section.innerDiameter_m", section.innerDiameter_m)) &&
        section.innerDiameter_m >= section.outerDiameter_m - lining
      ) {
        add(
          "inner-not-smaller-than-outer",
          "section.innerDiameter_m",
          section.innerDiameter_m,
          `less than ${section.outerDiameter_m - lining} m, the clear outer diameter`,
        );
      }
      break;
    default:
      add(
        "value-out-of-range",
        "section.shape",
        (section as Section).shape,
        "round, rectangular, flat-oval or annular",
      );
  }

  if (segment.flexible && section && section.shape !== "round") {
    add("flexible-not-round", "section.shape", section.shape, "round, as flexible duct is");
  }
  if (segment.length_m !== null && !isIn(ranges.length, segment.length_m)) {
    add(
      segment.length_m > ranges.length.to ? "value-out-of-range" : "length-not-positive",
      "length_m",
      segment.length_m,
      ranges.length.words,
    );
  }
  if (segment.insulation !== null && !isInsulation(segment.insulation)) {
    const { kind } = segment.insulation;
    const thickness = kind === "none" ? null : segment.insulation.thickness_m;
    add("value-out-of-range", "insulation.thickness_m", thickness, ranges.insulationThickness.words);
  }
  if (!isDuctClass(segment.ductClass)) {
    add("value-out-of-range", "ductClass", segment.ductClass, `one of ${DUCT_CLASSES.join(", ")}`);
  }
  if (segment.fitting !== null && !FITTING_TYPES.includes(segment.fitting)) {
    add("value-out-of-range", "fitting", segment.fitting, `one of ${FITTING_TYPES.join(", ")}`);
  }
  if (!isDamperAngle(segment.damperAngle_rad)) {
    add("value-out-of-range", "damperAngle_rad", segment.damperAngle_rad, ranges.damperAngle.words);
  }
  if (!isMouth(segment.mouth)) {
    add("value-out-of-range", "mouth", segment.mouth, `one of ${MOUTH_TYPES.join(", ")}`);
  }
  segment.accessories.forEach((kind, index) => {
    if (!ACCESSORY_KINDS.includes(kind)) {
      add("value-out-of-range", `accessories.${index}`, kind, `one of ${ACCESSORY_KINDS.join(", ")}`);
    }
  });
  return problems;
}
