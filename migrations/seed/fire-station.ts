/** The fire station's crew quarters: a small supply system, invented. */
import type { SystemRows } from "./duct-row.ts";

const diffuser = (cfm: number, space: string) => ({ cfm, need_inwg: 0.06, device: "diffuser-24x24", space });

export const fireStation: SystemRows = {
  tag: "S1",
  name: "Crew quarters supply",
  service: "supply",
  spec: "Supply, wrapped",
  equipment: { tag: "RTU-1", at: [4, 12] },
  available_inwg: 0.45,
  temperature_f: 55,
  height_ft: 9.5,
  outletPrefix: "D",
  // prettier-ignore
  rows: [
    { no: 1, after: null, name: "Drop and main", duct: "main", size: "24x14", to: [12, 12], accessories: ["flexible-connector"] },
    { no: 2, after: 1, name: "Main", duct: "main", size: "20x14", to: [26, 12] },
    { no: 3, after: 2, name: "Main", duct: "main", size: "16x12", to: [40, 12] },
    { no: 4, after: 3, name: "Main", duct: "main", size: "12x12", to: [52, 12] },
    { no: 5, after: 1, name: "Day room", duct: "branch", size: "12", to: [12, 20], accessories: ["volume-damper"] },
    { no: 6, after: 5, name: "Day room", duct: "runout", size: "10", to: [8, 20] },
    { no: 7, after: 6, name: "Day room", duct: "runout", size: "10 flex", to: [4.5, 20], outlet: diffuser(275, "Day room") },
    { no: 8, after: 5, name: "Day room", duct: "runout", size: "10", to: [16, 20] },
    { no: 9, after: 8, name: "Day room", duct: "runout", size: "10 flex", to: [19.5, 20], outlet: diffuser(275, "Day room") },
    { no: 10, after: 2, name: "Kitchen", duct: "runout", size: "8", to: [26, 6], accessories: ["volume-damper"] },
    { no: 11, after: 10, name: "Kitchen", duct: "runout", size: "8 flex", to: [26, 2], outlet: diffuser(180, "Kitchen") },
    { no: 12, after: 2, name: "Watch office", duct: "runout", size: "7", to: [26, 18], accessories: ["volume-damper"] },
    { no: 13, after: 12, name: "Watch office", duct: "runout", size: "7 flex", to: [26, 22], outlet: diffuser(120, "Watch office") },
    { no: 14, after: 3, name: "Bunk room", duct: "branch", size: "14x8 oval", to: [40, 20], accessories: ["volume-damper"] },
    { no: 15, after: 14, name: "Bunk room", duct: "runout", size: "8", to: [36.5, 20] },
    { no: 16, after: 15, name: "Bunk room", duct: "runout", size: "8 flex", to: [33, 20], outlet: diffuser(200, "Bunk room") },
    { no: 17, after: 14, name: "Bunk room", duct: "runout", size: "8", to: [43.5, 20] },
    { no: 18, after: 17, name: "Bunk room", duct: "runout", size: "8 flex", to: [47, 20], outlet: diffuser(200, "Bunk room") },
    { no: 19, after: 4, name: "Exercise room", duct: "runout", size: "9", to: [52, 6], accessories: ["volume-damper"] },
    { no: 20, after: 19, name: "Exercise room", duct: "runout", size: "9 flex", to: [52, 2.5], outlet: diffuser(240, "Exercise room") },
    { no: 21, after: 4, name: "Lockers", duct: "runout", size: "9", to: [58, 12], accessories: ["volume-damper"] },
    { no: 22, after: 21, name: "Lockers", duct: "runout", size: "9 flex", to: [62, 12], outlet: diffuser(230, "Lockers") },
  ],
};
