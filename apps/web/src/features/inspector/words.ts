import type { AccessoryKind, DuctClass, FittingType } from "@cleatwork/calc";

export const classNames: Readonly<Record<DuctClass, string>> = { main: "main", branch: "branch", runout: "runout" };

export const fittingNames: Readonly<Record<FittingType, string>> = {
  "elbow-radius": "Radius elbow",
  "elbow-square-throat": "Square-throat elbow",
  "elbow-square-throat-vanes": "Square-throat elbow, vanes",
  "elbow-smooth": "Smooth elbow",
  "elbow-gored": "Gored elbow",
  "tap-straight": "Straight tap",
  "tap-shoe": "Shoe tap",
  "tap-conical": "Conical tap",
  tee: "Tee",
  wye: "Wye",
  cross: "Cross",
  transition: "Transition",
  "shape-transition": "Change of shape",
  "end-cap": "End cap",
  none: "None",
};

export const accessoryNames: Readonly<Record<AccessoryKind, string>> = {
  "volume-damper": "Volume damper",
  "fire-damper": "Fire damper",
  "flexible-connector": "Flexible connector",
  "access-door": "Access door",
};
