/**
 * Gauge by size, pressure class and construction, as shipped. A company replaces it with its own.
 *
 * Rectangular: the lighter gauges need the standard's reinforcement at joints 5 ft apart. Where it asks for a closer
 * spacing, or for stiffened round duct, there is no row: a size beyond its column is told, not guessed.
 */
import type { Material } from "../air-system.ts";
import { inches, inchesOfWater } from "../quantity.ts";
import type { GaugeSchedule } from "./takeoff.ts";

/** Largest side or diameter in inches, gauge; for each class in inches of water, as printed. */
interface PrintedClass {
  readonly class_inwg: number;
  readonly sizes: readonly (readonly [upTo_in: number, gauge: number])[];
}

/** The table goes on above its last row without an end; no duct is wider than this. */
const OPEN_END = 1000;

/** Tables 1-3 to 1-9, gauge in the 5 ft column, joints or reinforcement 5 ft apart. */
// prettier-ignore
const rectangularAt5ft: readonly PrintedClass[] = [
  { class_inwg: 0.5, sizes: [[54, 26], [60, 24], [84, 22], [96, 20], [108, 18]] },
  { class_inwg: 1, sizes: [[30, 26], [42, 24], [60, 22], [84, 18], [96, 16]] },
  { class_inwg: 2, sizes: [[26, 26], [30, 24], [36, 22], [48, 20], [60, 18], [72, 16]] },
  { class_inwg: 3, sizes: [[12, 26], [26, 24], [30, 22], [42, 20], [54, 18], [60, 16]] },
  { class_inwg: 4, sizes: [[12, 26], [22, 24], [30, 22], [36, 20], [48, 18], [60, 16]] },
  { class_inwg: 6, sizes: [[8, 26], [12, 24], [24, 22], [28, 20], [36, 18], [42, 16]] },
  { class_inwg: 10, sizes: [[8, 24], [12, 22], [18, 20], [28, 18], [36, 16]] },
];

/** Table 3-2A. */
// prettier-ignore
const roundSpiralPositive: readonly PrintedClass[] = [
  { class_inwg: 2, sizes: [[14, 28], [26, 26], [36, 24], [50, 22], [60, 20], [84, 18]] },
  { class_inwg: 4, sizes: [[12, 28], [16, 26], [26, 24], [36, 22], [50, 20], [84, 18]] },
  { class_inwg: 10, sizes: [[10, 28], [14, 26], [26, 24], [36, 22], [50, 20], [84, 18]] },
];
// prettier-ignore
const roundSeamPositive: readonly PrintedClass[] = [
  { class_inwg: 2, sizes: [[8, 28], [14, 26], [26, 24], [36, 22], [50, 20], [60, 18], [84, 16]] },
  { class_inwg: 4, sizes: [[8, 28], [12, 26], [18, 24], [26, 22], [50, 20], [60, 18], [84, 16]] },
  { class_inwg: 10, sizes: [[6, 28], [10, 26], [14, 24], [26, 22], [50, 20], [60, 18], [84, 16]] },
];

/** Table 3-2B, unstiffened only. */
// prettier-ignore
const roundSpiralNegative: readonly PrintedClass[] = [
  { class_inwg: 2, sizes: [[15, 28], [17, 26], [23, 24], [30, 22], [48, 20], [60, 18], [72, 16]] },
  { class_inwg: 4, sizes: [[9, 28], [13, 26], [19, 24], [24, 22], [36, 20], [48, 18]] },
  { class_inwg: 10, sizes: [[11, 26], [14, 24], [22, 22], [26, 20], [36, 18]] },
];
// prettier-ignore
const roundSeamNegative: readonly PrintedClass[] = [
  { class_inwg: 2, sizes: [[10, 28], [13, 26], [17, 24], [20, 22], [26, 20], [34, 18], [42, 16]] },
  { class_inwg: 4, sizes: [[8, 28], [10, 26], [13, 24], [16, 22], [20, 20], [26, 18], [33, 16]] },
  { class_inwg: 10, sizes: [[8, 26], [9, 24], [12, 22], [15, 20], [21, 18], [24, 16]] },
];

/** Table 3-4 by major dimension; the standard has it for duct under pressure. */
// prettier-ignore
const ovalSpiral: readonly PrintedClass[] = [
  { class_inwg: 10, sizes: [[24, 24], [48, 22], [70, 20], [OPEN_END, 18]] },
];
// prettier-ignore
const ovalSeam: readonly PrintedClass[] = [
  { class_inwg: 10, sizes: [[36, 20], [60, 18], [OPEN_END, 16]] },
];
// prettier-ignore
const ovalFitting: readonly PrintedClass[] = [
  { class_inwg: 10, sizes: [[36, 20], [60, 18], [OPEN_END, 16]] },
];

/** Table 3-3, 2 in. of water at most; thickness in inches. Rectangular aluminum is not shipped. */
// prettier-ignore
const aluminumRound = {
  spiralPositive: [[8, 0.025], [14, 0.025], [26, 0.032], [36, 0.04], [50, 0.05], [60, 0.063]],
  seamPositive: [[8, 0.032], [14, 0.032], [26, 0.04], [36, 0.05], [50, 0.063], [60, 0.071], [84, 0.09]],
  spiralNegative: [[8, 0.025], [14, 0.032], [26, 0.04], [36, 0.05], [50, 0.063]],
  seamNegative: [[8, 0.04], [14, 0.04], [26, 0.05], [36, 0.063], [50, 0.071], [60, 0.09]],
} as const;

type Row = GaugeSchedule["rows"][number];
type RowKind = Omit<Row, "material" | "pressureClass_pa" | "sizes">;

const inGauge = (materials: readonly Material[], kind: RowKind, classes: readonly PrintedClass[]): readonly Row[] =>
  materials.flatMap((material) =>
    classes.map(({ class_inwg, sizes }) => ({
      ...kind,
      material,
      pressureClass_pa: inchesOfWater(class_inwg),
      sizes: sizes.map(([upTo_in, gauge]) => ({ upTo_m: inches(upTo_in), gauge: `${gauge} ga` })),
    })),
  );

const inThickness = (kind: RowKind, sizes: readonly (readonly [upTo_in: number, thickness_in: number])[]): Row => ({
  ...kind,
  material: "aluminum",
  pressureClass_pa: inchesOfWater(2),
  sizes: sizes.map(([upTo_in, thickness_in]) => ({
    upTo_m: inches(upTo_in),
    gauge: `${thickness_in.toFixed(3)} in.`,
  })),
});

/** The standard gives stainless round duct the galvanized gauges. For the rest of these: common practice, no source. */
const STEELS: readonly Material[] = ["galvanized", "stainless", "black-steel"];

export const shippedGauges: GaugeSchedule = {
  name: "Shipped schedule, joints 5 ft apart",
  source:
    "SMACNA, HVAC Duct Construction Standards, Metal and Flexible, 2nd ed. 1995 (open legal copy), tables 1-3 to 1-9, 3-2 to 3-4; stainless and black steel by the galvanized gauges",
  rows: [
    ...inGauge(STEELS, { shape: "rectangular" }, rectangularAt5ft),
    ...inGauge(STEELS, { shape: "round", pressureSign: "positive", construction: "spiral" }, roundSpiralPositive),
    ...inGauge(
      STEELS,
      { shape: "round", pressureSign: "positive", construction: "longitudinal-seam" },
      roundSeamPositive,
    ),
    ...inGauge(STEELS, { shape: "round", pressureSign: "negative", construction: "spiral" }, roundSpiralNegative),
    ...inGauge(
      STEELS,
      { shape: "round", pressureSign: "negative", construction: "longitudinal-seam" },
      roundSeamNegative,
    ),
    ...inGauge(STEELS, { shape: "flat-oval", pressureSign: "positive", construction: "spiral" }, ovalSpiral),
    ...inGauge(STEELS, { shape: "flat-oval", pressureSign: "positive", construction: "longitudinal-seam" }, ovalSeam),
    ...inGauge(STEELS, { shape: "flat-oval", pressureSign: "positive", construction: "fitting" }, ovalFitting),
    inThickness({ shape: "round", pressureSign: "positive", construction: "spiral" }, aluminumRound.spiralPositive),
    inThickness(
      { shape: "round", pressureSign: "positive", construction: "longitudinal-seam" },
      aluminumRound.seamPositive,
    ),
    inThickness({ shape: "round", pressureSign: "negative", construction: "spiral" }, aluminumRound.spiralNegative),
    inThickness(
      { shape: "round", pressureSign: "negative", construction: "longitudinal-seam" },
      aluminumRound.seamNegative,
    ),
  ],
};
