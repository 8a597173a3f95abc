import { shippedGauges } from "./gauge-schedule.table.ts";
import { shippedProductivity } from "./productivity.table.ts";
import type { ShopStandards } from "./takeoff.ts";

/**
 * What a new company starts with.
 *
 * The allowance is sheet in the blank that is not in the piece: for 24 × 12 in. duct of 5 ft, two corner seams of 1 1/4 in.
 * and 1 in. at each end make 7 %; fittings have more seam for their area. Drop from cutting is not in it: that is the
 * waste of the price.
 */
export const shippedStandards: ShopStandards = {
  gauges: shippedGauges,
  companyGauges: null,
  productivity: shippedProductivity,
  blankAllowance: { straight: 0.07, fitting: 0.12 },
  allowanceSource: "common practice: 1 1/4 in. a corner seam, 1 in. a slip or drive edge; no single source",
};
