/**
 * Gauge, reinforcement and joint by size, pressure class and construction, as shipped. A company's own stands before it.
 *
 * Rectangular: every spacing that the standard prints. Cells that it leaves blank or calls not designed stay so: a size
 * beyond its column is told, not guessed. Table 3-2B ends here before the two cells on which copies disagree.
 */
import type { Material } from "../air-system.ts";
import { feet, inches, inchesOfWater } from "../quantity.ts";
import type { GaugeChart, GaugeRow, GaugeSchedule, Reinforcement } from "./gauge-schedule.ts";
import { rectangularReinforcement, SPACINGS_FT } from "./rectangular-reinforcement.table.ts";

/** Largest side or diameter in inches, gauge; for each class in inches of water, as printed. */
interface PrintedClass {
  readonly class_inwg: number;
  /** A ring after the gauge where the duct is stiffened: its angle and how many feet apart. */
  readonly sizes: readonly (readonly [upTo_in: number, gauge: number, ring?: string])[];
}

/** The table goes on above its last row without an end; no duct is wider than this. */
const OPEN_END = 1000;

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

/** Table 3-2B. Rings: A 1 × 1 × 1/8 in. angle, B 1 1/4 × 1 1/4 × 3/16, F 2 × 2 × 1/4; then feet apart. */
// prettier-ignore
const roundSpiralNegative: readonly PrintedClass[] = [
  { class_inwg: 2, sizes: [[15, 28], [17, 26], [23, 24], [30, 22], [48, 20], [60, 18], [72, 16]] },
  { class_inwg: 4, sizes: [[9, 28], [13, 26], [19, 24], [24, 22], [36, 20], [48, 18], [72, 18, "F6"]] },
  { class_inwg: 10, sizes: [[11, 26], [14, 24], [22, 22], [26, 20], [36, 18], [42, 18, "F12"], [48, 18, "F6"]] },
];
// prettier-ignore
const roundSeamNegative: readonly PrintedClass[] = [
  { class_inwg: 2, sizes: [[10, 28], [13, 26], [17, 24], [20, 22], [26, 20], [34, 18], [42, 16], [48, 18, "A6"], [60, 18, "B4"]] },
  { class_inwg: 4, sizes: [[8, 28], [10, 26], [13, 24], [16, 22], [20, 20], [26, 18], [33, 16], [36, 20, "A6"], [48, 18, "B6"]] },
  { class_inwg: 10, sizes: [[8, 26], [9, 24], [12, 22], [15, 20], [21, 18], [24, 16], [26, 18, "A4"], [29, 16, "A4"], [36, 16, "B4"]] },
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

type ChartKind = Omit<GaugeChart, "material" | "pressureClass_pa" | "sizes">;

const NOT_REQUIRED: Reinforcement = { kind: "not-required" };
const BLANK: Reinforcement = { kind: "blank" };

const ring = (mark: string): Reinforcement => ({
  kind: "required",
  grade: `ring ${mark.charAt(0)}`,
  spacing_m: feet(Number(mark.slice(1))),
});

const inGauge = (
  materials: readonly Material[],
  kind: ChartKind,
  classes: readonly PrintedClass[],
  unstiffened: Reinforcement,
): readonly GaugeChart[] =>
  materials.flatMap((material) =>
    classes.map(({ class_inwg, sizes }) => ({
      ...kind,
      material,
      pressureClass_pa: inchesOfWater(class_inwg),
      sizes: sizes.map(([upTo_in, gauge, stiffened]) => ({
        upTo_m: inches(upTo_in),
        gauge: `${gauge} ga`,
        reinforcement: stiffened === undefined ? unstiffened : ring(stiffened),
      })),
    })),
  );

const inThickness = (
  kind: ChartKind,
  sizes: readonly (readonly [upTo_in: number, thickness_in: number])[],
): GaugeChart => ({
  ...kind,
  material: "aluminum",
  pressureClass_pa: inchesOfWater(2),
  sizes: sizes.map(([upTo_in, thickness_in]) => ({
    upTo_m: inches(upTo_in),
    gauge: `${thickness_in.toFixed(3)} in.`,
    reinforcement: NOT_REQUIRED,
  })),
});

/** One chart for each class and printed spacing. */
const rectangular = (material: Material): readonly GaugeChart[] =>
  rectangularReinforcement.flatMap(({ class_inwg, rows }) =>
    SPACINGS_FT.map((spacing_ft, column) => ({
      material,
      shape: "rectangular" as const,
      pressureClass_pa: inchesOfWater(class_inwg),
      spacing_m: feet(spacing_ft),
      sizes: rows.map(([upTo_in, unreinforced, cells]) =>
        rectangularRow(upTo_in, unreinforced, cells.split(" ")[column]!, spacing_ft),
      ),
    })),
  );

/**
 * A printed cell read. Where it is blank or asks for none, the sheet that needs none governs, if there is one.
 *
 * The joint by grade is what shops use: A a flat drive, B and C a standing S, D and up a flange; found in two contractors'
 * shop packets that restate the standard's figures 1-4 and 1-5.
 */
function rectangularRow(upTo_in: number, unreinforced: number | null, cell: string, spacing_ft: number): GaugeRow {
  const upTo_m = inches(upTo_in);
  const unreinforcedGauge = unreinforced === null ? null : `${unreinforced} ga`;
  const printed = /^([A-L])(t?)-(\d+)([A-L]?)$/.exec(cell);
  if (!printed) {
    if (cell === "ND") return { upTo_m, gauge: null, reinforcement: { kind: "not-designed" }, unreinforcedGauge };
    if (unreinforcedGauge === null) return { upTo_m, gauge: null, reinforcement: BLANK, unreinforcedGauge };
    return {
      upTo_m,
      gauge: unreinforcedGauge,
      reinforcement: NOT_REQUIRED,
      unreinforcedGauge,
      joint: "slip-and-drive",
    };
  }
  const [, letter = "", rod, gauge, tied] = printed;
  const grade = rod ? `${letter} with tie rod` : tied ? `${letter}, or ${tied} with tie rod` : letter;
  return {
    upTo_m,
    gauge: `${gauge} ga`,
    reinforcement: { kind: "required", grade, spacing_m: feet(spacing_ft) },
    unreinforcedGauge,
    joint: letter === "A" ? "slip-and-drive" : letter === "B" || letter === "C" ? "standing-s" : "flange",
  };
}

/** The standard gives stainless round duct the galvanized gauges. For the rest of these: common practice, no source. */
const STEELS: readonly Material[] = ["galvanized", "stainless", "black-steel"];

const round = (
  pressureSign: "positive" | "negative",
  construction: "spiral" | "longitudinal-seam",
  classes: readonly PrintedClass[],
) => inGauge(STEELS, { shape: "round", pressureSign, construction }, classes, NOT_REQUIRED);

/** How the flat sides are stiffened, the table leaves to the one of rectangular duct: blank here. */
const oval = (construction: "spiral" | "longitudinal-seam" | "fitting", classes: readonly PrintedClass[]) =>
  inGauge(STEELS, { shape: "flat-oval", pressureSign: "positive", construction }, classes, BLANK);

export const shippedGauges: GaugeSchedule = {
  name: "Shipped schedule",
  source:
    "SMACNA, HVAC Duct Construction Standards, Metal and Flexible, 2nd ed. 1995 (open legal copy), tables 1-3 to 1-9, 3-2 to 3-4; rectangular stainless and black steel by the galvanized gauges, common practice",
  standing: "found",
  rows: [
    ...STEELS.flatMap(rectangular),
    ...round("positive", "spiral", roundSpiralPositive),
    ...round("positive", "longitudinal-seam", roundSeamPositive),
    ...round("negative", "spiral", roundSpiralNegative),
    ...round("negative", "longitudinal-seam", roundSeamNegative),
    ...oval("spiral", ovalSpiral),
    ...oval("longitudinal-seam", ovalSeam),
    ...oval("fitting", ovalFitting),
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
