import type { ConstructionSpec, Material, SealClass, SplitterCount } from "@cleatwork/calc";
import type { Choice } from "../../ui/controls.tsx";

const choices = <V extends string>(words: Record<V, string>): readonly Choice[] =>
  Object.entries<string>(words).map(([value, label]) => ({ value, label }));

const materials: Record<Material, string> = {
  galvanized: "Galvanized steel",
  stainless: "Stainless steel",
  aluminum: "Aluminum",
  "black-steel": "Black steel",
};

export const materialWord = (material: Material): string => materials[material];

export const specChoices = {
  material: choices(materials),
  sealClass: choices<SealClass>({
    A: "A: joints, seams and penetrations",
    B: "B: joints and seams",
    C: "C: joints only",
    none: "Not sealed",
  }),
  rectangularJoint: choices<ConstructionSpec["rectangularJoint"]>({
    "slip-and-drive": "Slip and drive",
    flange: "Flange",
    "standing-s": "Standing S",
  }),
  roundJoint: choices<ConstructionSpec["roundJoint"]>({ "slip-coupling": "Slip coupling", flange: "Flange" }),
  rectangularSeam: choices<ConstructionSpec["rectangularSeam"]>({
    "corner-lock": "Corner lock",
    "button-lock": "Button lock",
  }),
  roundConstruction: choices<ConstructionSpec["roundConstruction"]>({
    spiral: "Spiral",
    "longitudinal-seam": "Longitudinal seam",
  }),
  insulation: choices<ConstructionSpec["insulation"]["kind"]>({
    none: "None",
    wrap: "Wrap outside",
    liner: "Liner inside",
  }),
  sizesAre: choices<ConstructionSpec["sizesAre"]>({
    "clear-inside": "The clear inside",
    "sheet-metal": "The sheet metal",
  }),
  elbowRectangular: choices<ConstructionSpec["elbow"]["rectangular"]>({
    radius: "Radius",
    "radius-splitters": "Radius, with splitters",
    "square-throat-vanes": "Square throat, with vanes",
    "square-throat": "Square throat, no vanes",
  }),
  splitterCount: choices<`${SplitterCount}`>({ 1: "One", 2: "Two", 3: "Three" }),
  elbowRound: choices<ConstructionSpec["elbow"]["round"]>({
    smooth: "Smooth",
    gored: "Gored",
    mitered: "Mitered",
  }),
  branchRectangular: choices<ConstructionSpec["branch"]["rectangular"]>({
    "straight-tap": "Straight tap",
    "shoe-tap": "Shoe tap, 45° entry",
  }),
  branchRound: choices<ConstructionSpec["branch"]["round"]>({
    "straight-tap": "Straight tap",
    "conical-tap": "Conical tap",
    "saddle-tap": "Saddle tap",
  }),
} as const;
