/**
 * The construction spec a new company starts with, so that a first layout can be taken off on the first day. It is a
 * starting point to edit, not a requirement: the project's specification and the adopted code govern. Each value says
 * where it comes from; "practice" is common practice of the trade with no single source behind it.
 */
import { feet, inches, inchesOfWater, type ConstructionSpec } from "@cleatwork/calc";

export const DEFAULT_SPEC_NAME = "House standard (common practice, check against the job)";

export const defaultConstruction: ConstructionSpec = {
  /** Practice: commercial comfort air. */
  material: "galvanized",
  /** Practice: low-pressure duct beyond terminal units and on small units; 1 in. w.g. */
  pressureClass_pa: inchesOfWater(1),
  /** Energy codes since about 2010 ask that joints, seams and penetrations be sealed (from memory of ASHRAE 90.1). */
  sealClass: "A",
  /** Practice: 60 in. coil, 10 ft spiral; flat oval longitudinal seam 5 ft. */
  sectionLength_m: { rectangular: inches(60), round: feet(10), flatOval: feet(5) },
  /** Practice at this pressure class. */
  rectangularJoint: "slip-and-drive",
  roundJoint: "slip-coupling",
  rectangularSeam: "corner-lock",
  roundConstruction: "spiral",
  /** None until the job says so: insulation that nobody asked for would be priced unseen, and shows as missing here. */
  insulation: { kind: "none" },
  /**
   * Ordinary spacing is 8 or 10 ft; round at most 12 ft: SMACNA, HVAC Duct Construction Standards, 2nd ed. 1995, S4.2
   * and table 4-2 (published as incorporated by reference in the US Code of Federal Regulations).
   */
  hangerSpacing_m: { rectangular: feet(8), round: feet(10) },
  sizesAre: "clear-inside",
  /** Practice: center-line radius 1.5 times the width. */
  elbow: { rectangular: "radius", round: "gored", radiusRatio: 1.5 },
  branch: { rectangular: "shoe-tap", round: "conical-tap" },
  /** Practice: 15 degrees a side. */
  transitionAngle_rad: Math.PI / 6,
  /** Practice: pulled reasonably tight, 4 % slack. */
  flexibleSlack: 0.04,
};
