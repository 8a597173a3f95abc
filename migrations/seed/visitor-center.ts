/** The visitor center's exhibit hall: exposed spiral, invented. Won, and in the shop. */
import type { SystemRows } from "./duct-row.ts";

const side = (cfm: number) => ({ cfm, need_inwg: 0.06, device: "side-outlet-24x8", space: "Exhibit hall" });
const diffuser = (cfm: number, space: string) => ({ cfm, need_inwg: 0.06, device: "diffuser-24x24", space });

export const visitorCenter: SystemRows = {
  tag: "S1",
  name: "Exhibit hall supply",
  service: "supply",
  spec: "Supply, exposed",
  equipment: { tag: "AH-1", at: [0, 10] },
  available_inwg: 0.4,
  temperature_f: 57,
  height_ft: 14,
  outletPrefix: "D",
  // prettier-ignore
  rows: [
    { no: 1, after: null, name: "Spiral main", duct: "main", size: "20", to: [10, 10], accessories: ["flexible-connector"] },
    { no: 2, after: 1, name: "Spiral main", duct: "main", size: "18", to: [20, 10] },
    { no: 3, after: 2, name: "Spiral main", duct: "main", size: "16", to: [30, 10] },
    { no: 4, after: 3, name: "Spiral main", duct: "main", size: "14", to: [40, 10] },
    { no: 5, after: 4, name: "Spiral main", duct: "main", size: "12", to: [50, 10] },
    { no: 6, after: 1, name: "Outlet", duct: "runout", size: "24x8", to: [10, 11.5], outlet: side(280) },
    { no: 7, after: 2, name: "Outlet", duct: "runout", size: "24x8", to: [20, 11.5], outlet: side(280) },
    { no: 8, after: 3, name: "Outlet", duct: "runout", size: "24x8", to: [30, 11.5], outlet: side(280) },
    { no: 9, after: 4, name: "Outlet", duct: "runout", size: "24x8", to: [40, 11.5], outlet: side(280) },
    { no: 10, after: 5, name: "Outlet", duct: "runout", size: "24x8", to: [50, 11.5], outlet: side(280) },
    { no: 11, after: 2, name: "Desk branch", duct: "branch", size: "10", to: [20, 2], accessories: ["volume-damper"] },
    { no: 12, after: 11, name: "Desk", duct: "runout", size: "8", to: [17, 2] },
    { no: 13, after: 12, name: "Desk", duct: "runout", size: "8 flex", to: [13.5, 2], outlet: diffuser(160, "Desk") },
    { no: 14, after: 11, name: "Shop", duct: "runout", size: "8", to: [23, 2] },
    { no: 15, after: 14, name: "Shop", duct: "runout", size: "8 flex", to: [26.5, 2], outlet: diffuser(160, "Shop") },
  ],
};
