/** Height of the wall's texture, with the joints as built. Where a range is printed, the value is our pick inside it. */
import type { Material } from "../air-system.ts";
import { METERS_PER_FOOT, meters, type Meters } from "../quantity.ts";

interface RoughnessRow {
  readonly value: Meters;
  readonly range_ft: readonly [number, number];
  readonly standing: "found" | "memory";
}

const row = (
  value_ft: number,
  range_ft: readonly [number, number],
  standing: RoughnessRow["standing"],
): RoughnessRow => ({
  value: meters(value_ft * METERS_PER_FOOT),
  range_ft,
  standing,
});

export const roughnessTable = {
  source: "ASHRAE Handbook Fundamentals 2021, ch. 21, table 1, as reproduced on a public reference page (single facts)",
  /** 0.0003 ft is also what current friction charts for galvanized duct are drawn for. */
  metal: {
    galvanized: row(0.0003, [0.0002, 0.0005], "found"),
    /** Sheet as smooth as galvanized, joints alike: no row of its own is printed. */
    stainless: row(0.0003, [0.00015, 0.0004], "memory"),
    aluminum: row(0.00015, [0.00012, 0.0002], "found"),
    "black-steel": row(0.00015, [0.00015, 0.00015], "found"),
  } satisfies Record<Material, RoughnessRow>,
  /** Non-metallic with wire, pulled tight; slack is a factor of its own, see flexible.ts. */
  flexible: row(0.003, [0.0003, 0.003], "found"),
  /** Fibrous liner with a facing on the air side. */
  liner: row(0.005, [0.005, 0.005], "memory"),
} as const;
