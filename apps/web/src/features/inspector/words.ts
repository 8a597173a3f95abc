import type { AccessoryKind, DuctClass, FittingType } from "@cleatwork/calc";

export const classNames: Readonly<Record<DuctClass, string>> = { main: "main", branch: "branch", runout: "runout" };

export const fittingNames: Readonly<Record<FittingType, string>> = {
  "elbow-radius": "Radius elbow",
  "elbow-radius-splitters": "Radius elbow, splitters",
  "elbow-square-throat": "Square-throat elbow",
  "elbow-square-throat-vanes": "Square-throat elbow, vanes",
  "elbow-smooth": "Smooth elbow",
  "elbow-gored": "Gored elbow",
  "elbow-mitered": "Mitered round elbow",
  offset: "Offset",
  "tap-straight": "Straight tap",
  "tap-shoe": "Shoe tap, 45° entry",
  "tap-conical": "Conical tap",
  "tap-saddle": "Saddle tap",
  tee: "Tee",
  wye: "Wye",
  cross: "Cross",
  transition: "Transition",
  "shape-transition": "Change of shape",
  "entry-bellmouth": "Bellmouth entry",
  "entry-flush": "Flush entry",
  "entry-projecting": "Projecting entry",
  "exit-open": "Open exit",
  plenum: "Plenum",
  "end-cap": "End cap",
  none: "None",
};

export const accessoryNames: Readonly<Record<AccessoryKind, string>> = {
  "volume-damper": "Volume damper",
  "fire-damper": "Fire damper",
  "smoke-damper": "Smoke damper",
  "flexible-connector": "Flexible connector",
  "access-door": "Access door",
  screen: "Screen",
};
