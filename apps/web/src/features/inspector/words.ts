import type {
  AccessoryKind,
  DuctClass,
  FittingInputName,
  FittingType,
  MouthType,
  ReferenceSection,
} from "@cleatwork/calc";

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
  "tap-shoe": "Shoe tap",
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

/** The fitting choices of a segment, in the order that an estimator looks for them. */
export const fittingGroups: readonly { readonly label: string; readonly types: readonly FittingType[] }[] = [
  {
    label: "Elbows, rectangular",
    types: ["elbow-radius", "elbow-radius-splitters", "elbow-square-throat-vanes", "elbow-square-throat"],
  },
  { label: "Elbows, round", types: ["elbow-smooth", "elbow-gored", "elbow-mitered"] },
  { label: "Offsets and transitions", types: ["offset", "transition", "shape-transition"] },
  { label: "Taps", types: ["tap-straight", "tap-shoe", "tap-conical", "tap-saddle"] },
  { label: "Tees, wyes, crosses", types: ["tee", "wye", "cross"] },
  {
    label: "At the equipment",
    types: ["plenum", "entry-bellmouth", "entry-flush", "entry-projecting", "exit-open"],
  },
  { label: "Closed or nothing", types: ["end-cap", "none"] },
];

/** At an outlet the plain open end is what is meant by nothing. */
export const mouthNames: Readonly<Record<MouthType, string>> = {
  "exit-open": "Open exit",
  plenum: "Plenum, flush with its wall",
  "entry-bellmouth": "Bellmouth entry",
  "entry-flush": "Flush entry",
  "entry-projecting": "Projecting entry",
};

export const referenceNames: Readonly<Record<ReferenceSection, string>> = {
  own: "this duct",
  common: "the duct with all the air",
  smaller: "the smaller end",
};

export const fittingInputNames: Readonly<Record<FittingInputName, string>> = {
  "radius-ratio": "radius over width",
  "side-ratio": "side across the bend over side in it",
  "friction-factor": "friction factor",
  "piece-count": "pieces",
  "splitter-count": "splitters",
  "curve-ratio": "curve ratio",
  "one-elbow": "one elbow",
  "area-ratio": "area ratio",
  "transition-angle": "whole angle, rad",
  "branch-area-ratio": "area of the branches over the main's",
  "flow-ratio": "air of this leg over all",
  "branch-flow-ratio": "air of the branches over all",
  "velocity-ratio": "velocity ratio",
  "momentum-ratio": "momentum along the main over the main's",
  "practice-factor": "factor of practice",
  "edge-radius-ratio": "edge radius over diameter",
  "damper-angle": "blade from open, rad",
  "free-area": "free area",
};
