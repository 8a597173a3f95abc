/** The gauge that a company's schedule asks for. */
import type { ConstructionSpec, Material, Section } from "../air-system.ts";
import { meters, type Meters } from "../quantity.ts";
import type { GaugeSchedule } from "./takeoff.ts";

/**
 * Metric classes are printed rounded up: 250 Pa stands for 1 in. of water, 249.09 Pa. The same share everywhere, so that
 * a class typed either way finds its column.
 */
const CLASS_TOLERANCE = 1.005;
/** Typed inches and typed millimeters meet. */
const SIZE_TOLERANCE = 1e-5;

export interface GaugeQuestion {
  readonly material: Material;
  readonly shape: "round" | "rectangular" | "flat-oval";
  /** Longest side, major axis or diameter of the sheet metal; of a piece that changes size, the larger end's. */
  readonly size_m: Meters;
  /** With its sign. */
  readonly pressureClass_pa: number;
  readonly construction: "spiral" | "longitudinal-seam" | "fitting";
}

/**
 * Gauge of all walls of a piece, or null where the schedule has none.
 *
 * The lowest class that holds the pressure governs, then the first size that is not smaller. No row is stretched: beyond
 * the last size of the class there is no answer. A fitting goes by its own rows; where a schedule has none, by those of
 * duct with a longitudinal seam, for that is how a fitting is made.
 */
export const findGauge = (schedule: GaugeSchedule, question: GaugeQuestion): string | null =>
  gaugeReader(schedule, question)(question);

type Row = GaugeSchedule["rows"][number];

/** The same for many pieces of one metal and pressure class: each row of the schedule is looked for once. */
export function gaugeReader(
  schedule: GaugeSchedule,
  duct: Pick<GaugeQuestion, "material" | "pressureClass_pa">,
): (piece: Pick<GaugeQuestion, "shape" | "construction" | "size_m">) => string | null {
  const known = new Map<string, Row | null>();
  return ({ shape, construction, size_m }) => {
    const key = `${shape} ${construction}`;
    let row = known.get(key);
    if (row === undefined) {
      row = null;
      for (const made of constructionsFor(construction)) row ??= lowestClass(schedule, duct, shape, made);
      known.set(key, row);
    }
    return row?.sizes.find(({ upTo_m }) => size_m <= upTo_m + SIZE_TOLERANCE)?.gauge ?? null;
  };
}

const constructionsFor = (construction: GaugeQuestion["construction"]) =>
  construction === "fitting" ? (["fitting", "longitudinal-seam"] as const) : ([construction] as const);

function lowestClass(
  { rows }: GaugeSchedule,
  { material, pressureClass_pa }: Pick<GaugeQuestion, "material" | "pressureClass_pa">,
  shape: GaugeQuestion["shape"],
  construction: GaugeQuestion["construction"],
): Row | null {
  const sign = pressureClass_pa < 0 ? "negative" : "positive";
  const pressure = Math.abs(pressureClass_pa);
  let lowest: Row | null = null;
  for (const row of rows) {
    if (row.material !== material || row.shape !== shape) continue;
    if (row.pressureSign !== undefined && row.pressureSign !== sign) continue;
    if (row.construction !== undefined && row.construction !== construction) continue;
    if (pressure > row.pressureClass_pa * CLASS_TOLERANCE) continue;
    if (!lowest || row.pressureClass_pa < lowest.pressureClass_pa) lowest = row;
  }
  return lowest;
}

/** Longest side, major axis or diameter; an annulus goes by its outer wall. */
export function longestSide(section: Section): Meters {
  switch (section.shape) {
    case "round":
      return section.diameter_m;
    case "annular":
      return section.outerDiameter_m;
    case "rectangular":
    case "flat-oval":
      return meters(Math.max(section.width_m, section.height_m));
  }
}

export const scheduleShape = (section: Section): GaugeQuestion["shape"] =>
  section.shape === "annular" ? "round" : section.shape;

export const straightConstruction = (
  section: Section,
  { roundConstruction }: ConstructionSpec,
): GaugeQuestion["construction"] => (section.shape === "rectangular" ? "longitudinal-seam" : roundConstruction);
