/** Hours as shipped: a place to start. A company's own history beats every row of it. */
import type { Material } from "../air-system.ts";
import { inches, KILOGRAMS_PER_POUND, METERS_PER_FOOT } from "../quantity.ts";
import type { HoursKind, HoursPlace, HoursRow, ProductivityTable, WorkCondition } from "./productivity.ts";
import type { ScheduleShape } from "./gauge-schedule.ts";

interface Kind {
  readonly place: HoursPlace;
  readonly kind: HoursKind;
  readonly shape?: ScheduleShape;
  readonly material?: Material;
}

const row = (
  { place, kind, shape, material }: Kind,
  upTo_in: number | null,
  rest: Pick<HoursRow, "per" | "hours_h" | "note">,
): HoursRow => ({
  place,
  kind,
  shape: shape ?? null,
  material: material ?? null,
  upTo_m: upTo_in === null ? null : inches(upTo_in),
  ...rest,
  standing: "common practice",
});

/** Pounds one person makes or hangs in an hour. */
const byPound = (kind: Kind, poundsPerHour: number, note: string, upTo_in: number | null = null): HoursRow =>
  row(kind, upTo_in, { per: "weight", hours_h: 1 / (poundsPerHour * KILOGRAMS_PER_POUND), note });

/** Feet one person hangs in an hour. */
const byFoot = (kind: Kind, feetPerHour: number, note: string, upTo_in: number | null = null): HoursRow =>
  row(kind, upTo_in, { per: "length", hours_h: 1 / (feetPerHour * METERS_PER_FOOT), note });

const SHOP: readonly HoursRow[] = [
  byPound({ place: "shop", kind: "straight" }, 45, "hand shop, lock-formed: 30 to 65 lb an hour"),
  byPound({ place: "shop", kind: "straight", shape: "round" }, 180, "spiral, own machine: 120 to 300 lb an hour"),
  byPound({ place: "shop", kind: "fitting" }, 32, "cut by plasma: 20 to 50 lb an hour"),
  byPound({ place: "shop", kind: "fitting", shape: "round" }, 16, "gored and tapped: 10 to 28 lb an hour"),
  byPound({ place: "shop", kind: "fitting", shape: "flat-oval" }, 14, "8 to 22 lb an hour"),
  ...(["straight", "fitting"] as const).flatMap((kind) => [
    byPound({ place: "shop", kind, material: "black-steel" }, 12, "16 ga, welded: 8 to 20 lb an hour"),
    byPound({ place: "shop", kind, material: "stainless" }, 8, "welded: 5 to 12 lb an hour"),
    byPound({ place: "shop", kind, material: "aluminum" }, 18, "12 to 28 lb an hour"),
  ]),
];

const OPEN_FLOOR = "new, open floor, duct at 10 to 12 ft, joints and ordinary sealing with it";

/** Rectangular by its longest side: small duct is slow by the pound. */
const fieldByPound = (kind: "straight" | "fitting"): readonly HoursRow[] => [
  byPound({ place: "field", kind }, 15, `${OPEN_FLOOR}: 10 to 22 lb an hour`, 12),
  byPound({ place: "field", kind }, 22, `${OPEN_FLOOR}: 16 to 30 lb an hour`, 30),
  byPound({ place: "field", kind }, 28, `${OPEN_FLOOR}: 20 to 38 lb an hour`, 54),
  byPound({ place: "field", kind }, 32, `${OPEN_FLOOR}: 22 to 42 lb an hour`, 84),
  byPound({ place: "field", kind }, 30, `${OPEN_FLOOR}: 20 to 42 lb an hour`),
];

const FIELD: readonly HoursRow[] = [
  ...fieldByPound("straight"),
  ...fieldByPound("fitting"),
  byFoot({ place: "field", kind: "straight", shape: "round" }, 10, "spiral: 7 to 14 ft an hour", 8),
  byFoot({ place: "field", kind: "straight", shape: "round" }, 7, "spiral: 5 to 10 ft an hour", 14),
  byFoot({ place: "field", kind: "straight", shape: "round" }, 5, "spiral: 3.5 to 7 ft an hour", 20),
  byFoot({ place: "field", kind: "straight", shape: "round" }, 3.5, "spiral: 2.5 to 5 ft an hour", 30),
  byFoot({ place: "field", kind: "straight", shape: "round" }, 2.2, "spiral: 1.5 to 3.2 ft an hour", 48),
  byPound({ place: "field", kind: "straight", shape: "round" }, 30, "past 48 in. as heavy duct: 20 to 42 lb an hour"),
  row({ place: "field", kind: "flexible" }, null, {
    per: "length",
    hours_h: 0.11 / METERS_PER_FOOT,
    note: "pulled, banded and taped; its device apart",
  }),
];

/** Multiply them only where their causes are independent; each is shown by name. */
const CONDITIONS: readonly WorkCondition[] = (
  [
    ["Duct over 10 to 15 ft", 1.1],
    ["Duct over 15 to 20 ft", 1.2],
    ["Duct over 20 to 25 ft", 1.3],
    ["Duct over 25 to 30 ft", 1.4],
    ["Duct over 30 to 40 ft", 1.55],
    ["Congested ceiling", 1.2],
    ["Renovation, vacant", 1.25],
    ["Renovation, occupied, off hours", 1.45],
    ["Hospital or clean area", 1.5],
    ["Riser or shaft", 1.3],
    ["Mechanical room", 1.25],
    ["Repeated floors after the third", 0.92],
  ] as const
).map(([name, factor]) => ({ name, factor, standing: "common practice" }));

export const shippedProductivity: ProductivityTable = {
  name: "Shipped hours",
  source: "common practice, no single source; set your own",
  rows: [...SHOP, ...FIELD],
  hanger_h_each: 0.35,
  device_h_each: 0.8,
  accessory_h_each: {
    "volume-damper": 0.4,
    "fire-damper": 2.5,
    "smoke-damper": 3,
    "flexible-connector": 1.5,
    "access-door": 0.7,
    screen: 0.3,
  },
  conditions: CONDITIONS,
  conditionFactor: 1,
};
