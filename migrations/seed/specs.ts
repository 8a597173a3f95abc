/** The demo company's own construction specs. Figures are invented company practice, not requirements. */
import { feet, inches, inchesOfWater, type ConstructionSpec } from "@cleatwork/calc";

const base: ConstructionSpec = {
  material: "galvanized",
  pressureClass_pa: inchesOfWater(1),
  sealClass: "A",
  sectionLength_m: { rectangular: inches(59), round: feet(10), flatOval: feet(10) },
  rectangularJoint: "slip-and-drive",
  roundJoint: "slip-coupling",
  rectangularSeam: "corner-lock",
  roundConstruction: "spiral",
  insulation: { kind: "none" },
  hangerSpacing_m: { rectangular: feet(8), round: feet(10) },
  sizesAre: "clear-inside",
  elbow: { rectangular: "square-throat-vanes", round: "gored", radiusRatio: 1.5 },
  branch: { rectangular: "shoe-tap", round: "conical-tap" },
  transitionAngle_rad: Math.PI / 6,
  flexibleSlack: 0.04,
};

export const specs: readonly { name: string; construction: ConstructionSpec }[] = [
  { name: "Supply, wrapped", construction: { ...base, insulation: { kind: "wrap", thickness_m: inches(1.5) } } },
  { name: "Supply, exposed", construction: base },
  {
    name: "Return and exhaust, bare",
    construction: { ...base, pressureClass_pa: inchesOfWater(-1), elbow: { ...base.elbow, rectangular: "radius" } },
  },
];
