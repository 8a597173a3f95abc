/**
 * What a new spec starts with. A starting point to edit, not a requirement: the project's specification and the adopted
 * code govern. Where a value has no source, it is common practice of the trade and called so on the screen.
 */
import { feet, inches, inchesOfWater, type ConstructionSpec } from "@cleatwork/calc";

export const startingConstruction: ConstructionSpec = {
  material: "galvanized",
  pressureClass_pa: inchesOfWater(1),
  sealClass: "A",
  sectionLength_m: { rectangular: inches(60), round: feet(10), flatOval: feet(5) },
  rectangularJoint: "slip-and-drive",
  roundJoint: "slip-coupling",
  rectangularSeam: "corner-lock",
  roundConstruction: "spiral",
  insulation: { kind: "none" },
  hangerSpacing_m: { rectangular: feet(8), round: feet(10) },
  sizesAre: "clear-inside",
  elbow: { rectangular: "radius", round: "gored", radiusRatio: 1.5 },
  branch: { rectangular: "shoe-tap", round: "conical-tap" },
  transitionAngle_rad: Math.PI / 6,
  flexibleSlack: 0.04,
};
