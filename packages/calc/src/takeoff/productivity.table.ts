/** Hours as shipped: a place to start. A company's own history beats every row of it. */
import { KILOGRAMS_PER_POUND, METERS_PER_FOOT } from "../quantity.ts";
import type { ProductivityTable } from "./takeoff.ts";

const poundsPerHour = (pounds: number): number => 1 / (pounds * KILOGRAMS_PER_POUND);

export const shippedProductivity: ProductivityTable = {
  name: "Shipped hours",
  source: "common practice, no single source; set your own",
  // Hand shop, lock-formed: 30 to 65 lb an hour. Fittings: 20 to 50 cut by plasma, 10 to 28 gored round.
  shop_h_per_kg: { straight: poundsPerHour(45), fitting: poundsPerHour(24) },
  // Rectangular and spiral on new, open floors to 12 ft, joints and ordinary sealing with it, hangers apart.
  field_h_per_kg: { straight: poundsPerHour(25), fitting: poundsPerHour(22) },
  flexible_h_per_m: 0.11 / METERS_PER_FOOT,
  hanger_h_each: 0.35,
  device_h_each: 0.8,
  accessory_h_each: { "volume-damper": 0.4, "fire-damper": 2.5, "flexible-connector": 1.5, "access-door": 0.7 },
  conditionFactor: 1,
};
