import { shippedEdges } from "./edges.table.ts";
import { shippedGauges } from "./gauge-schedule.table.ts";
import { shippedProductivity } from "./productivity.table.ts";
import type { ShopStandards } from "./takeoff.ts";

/** What a new company starts with. */
export const shippedStandards: ShopStandards = {
  gauges: shippedGauges,
  companyGauges: null,
  productivity: shippedProductivity,
  edges: shippedEdges,
};
