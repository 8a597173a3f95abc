/** Return, exhaust and outside air of the library: invented, drawn over the plan in `plan.ts`. */
import type { SystemRows } from "../duct-row.ts";

const grille = (cfm: number, space: string) => ({ cfm, need_inwg: 0.04, device: "grille-return-24x24", space });
const exhaustGrille = (cfm: number, space: string) => ({ cfm, need_inwg: 0.04, device: "grille-exhaust-10x10", space });

export const returnAir: SystemRows = {
  tag: "R1",
  name: "Return to AH-1",
  service: "return",
  spec: "Return and exhaust, bare",
  equipment: { tag: "AH-1", at: [8, 13] },
  available_inwg: 0.28,
  temperature_f: 75,
  height_ft: 10.5,
  outletPrefix: "G",
  // prettier-ignore
  rows: [
    { no: 101, after: null, name: "Return rise", duct: "main", size: "36x18", to: [8, 24.6], accessories: ["flexible-connector"], insulation: "liner" },
    { no: 102, after: 101, name: "Return main", duct: "main", size: "36x18", to: [27, 24.6], accessories: ["fire-damper", "access-door"], insulation: "liner" },
    { no: 103, after: 102, name: "Return main", duct: "main", size: "28x18", to: [40, 24.6] },
    { no: 104, after: 103, name: "Return main", duct: "main", size: "28x18", to: [53, 24.6] },
    { no: 105, after: 104, name: "Return main", duct: "main", size: "26x18", to: [66, 24.6] },
    { no: 106, after: 105, name: "Return main", duct: "main", size: "20x12", to: [80, 24.6] },
    { no: 107, after: 106, name: "Return main", duct: "main", size: "20x12", to: [94, 24.6] },
    { no: 108, after: 107, name: "Children’s return", duct: "branch", size: "18x12", to: [94, 31], outlet: grille(850, "Children’s") },
    { no: 109, after: 102, name: "Community return", duct: "branch", size: "18x14", to: [27, 40], accessories: ["volume-damper"], outlet: grille(1250, "Community") },
    { no: 110, after: 104, name: "Lobby return", duct: "branch", size: "14x10", to: [53, 33], accessories: ["volume-damper"], outlet: grille(520, "Lobby") },
    { no: 111, after: 105, name: "Reading return", duct: "branch", size: "20x16", to: [66, 29.4], accessories: ["volume-damper"], outlet: grille(1500, "Reading") },
    { no: 112, after: 103, name: "Corridor return, west", duct: "runout", size: "16x12", to: [40, 26.2], outlet: grille(450, "Corridor") },
    { no: 113, after: 106, name: "Corridor return, east", duct: "runout", size: "16x12", to: [80, 26.2], outlet: grille(450, "Corridor") },
  ],
};

export const exhaust: SystemRows = {
  tag: "E1",
  name: "Restroom exhaust by EF-1",
  service: "exhaust",
  spec: "Return and exhaust, bare",
  equipment: { tag: "EF-1", at: [39, 33], height_ft: 16 },
  available_inwg: 0.3,
  temperature_f: 75,
  height_ft: 10.5,
  outletPrefix: "X",
  // prettier-ignore
  rows: [
    // The riser shares its shaft with the vent stack: air goes up around the pipe.
    { no: 201, after: null, name: "Exhaust riser around the vent stack", duct: "main", size: "14/4 ring", to: [39, 33], height_ft: 12, accessories: ["flexible-connector"] },
    { no: 202, after: 201, name: "Exhaust drop", duct: "main", size: "12", to: [39, 33] },
    { no: 203, after: 202, name: "Exhaust main", duct: "branch", size: "6", to: [32, 30], outlet: exhaustGrille(100, "Janitor") },
    { no: 204, after: 202, name: "Restroom", duct: "runout", size: "8", to: [36.5, 33], outlet: exhaustGrille(225, "Restroom") },
    { no: 205, after: 202, name: "Restroom", duct: "runout", size: "8", to: [41.5, 33], outlet: exhaustGrille(225, "Restroom") },
  ],
};

export const outsideAir: SystemRows = {
  tag: "O1",
  name: "Outside air to AH-1",
  service: "outside-air",
  spec: "Supply, wrapped",
  equipment: { tag: "AH-1", at: [3, 9] },
  available_inwg: 0.15,
  temperature_f: 60,
  height_ft: 10.5,
  outletPrefix: "L",
  // prettier-ignore
  rows: [
    { no: 301, after: null, name: "Outside air", duct: "main", size: "24x14", to: [1.2, 9], accessories: ["flexible-connector"] },
    { no: 302, after: 301, name: "Louver", duct: "main", size: "36x24", to: [0, 9], outlet: { cfm: 1240, need_inwg: 0.06, device: "louver-36x24", space: "North wall" } },
  ],
};
