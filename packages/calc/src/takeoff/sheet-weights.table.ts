/** What sheet weighs, by metal and label. A gauge number means nothing without its metal. */
import type { Material } from "../air-system.ts";
import { inches, poundsPerSquareFoot, type KilogramsPerSquareMeter, type Meters } from "../quantity.ts";

export interface Sheet {
  readonly thickness_m: Meters;
  readonly weight_kg_m2: KilogramsPerSquareMeter;
}

/** Label, nominal thickness in inches, pounds per square foot: as printed. */
type PrintedRow = readonly [label: string, thickness_in: number, weight_lb_ft2: number];

const galvanized: readonly PrintedRow[] = [
  ["30 ga", 0.0157, 0.656],
  ["28 ga", 0.0187, 0.781],
  ["26 ga", 0.0217, 0.906],
  ["24 ga", 0.0276, 1.156],
  ["22 ga", 0.0336, 1.406],
  ["20 ga", 0.0396, 1.656],
  ["18 ga", 0.0516, 2.156],
  ["16 ga", 0.0635, 2.656],
  ["14 ga", 0.0785, 3.281],
  ["12 ga", 0.1084, 4.531],
  ["10 ga", 0.1382, 5.781],
  ["8 ga", 0.1681, 6.875],
];

/** 300 series. */
const stainless: readonly PrintedRow[] = [
  ["30 ga", 0.0125, 0.525],
  ["28 ga", 0.0156, 0.656],
  ["26 ga", 0.0188, 0.788],
  ["24 ga", 0.025, 1.05],
  ["22 ga", 0.0313, 1.313],
  ["20 ga", 0.0375, 1.575],
  ["18 ga", 0.05, 2.1],
  ["16 ga", 0.0625, 2.625],
  ["14 ga", 0.0781, 3.281],
  ["12 ga", 0.1094, 4.594],
  ["10 ga", 0.1406, 5.906],
  ["8 ga", 0.1719, 7.219],
];

/** Alloy 3003-H14, ordered by decimal inch. 0.071 is not printed: 14.256 lb/ft² for an inch, the table's own basis. */
const aluminum: readonly PrintedRow[] = [
  ["0.016 in.", 0.016, 0.228],
  ["0.020 in.", 0.02, 0.285],
  ["0.024 in.", 0.024, 0.342],
  ["0.025 in.", 0.025, 0.356],
  ["0.032 in.", 0.032, 0.456],
  ["0.040 in.", 0.04, 0.57],
  ["0.050 in.", 0.05, 0.713],
  ["0.063 in.", 0.063, 0.898],
  ["0.071 in.", 0.071, 1.012],
  ["0.080 in.", 0.08, 1.14],
  ["0.090 in.", 0.09, 1.283],
  ["0.100 in.", 0.1, 1.426],
  ["0.125 in.", 0.125, 1.782],
];

/** Manufacturers' standard gauge, uncoated. */
const blackSteel: readonly PrintedRow[] = [
  ["28 ga", 0.0149, 0.625],
  ["26 ga", 0.0179, 0.75],
  ["24 ga", 0.0239, 1],
  ["22 ga", 0.0299, 1.25],
  ["20 ga", 0.0359, 1.5],
  ["18 ga", 0.0478, 2],
  ["16 ga", 0.0598, 2.5],
  ["14 ga", 0.0747, 3.125],
  ["12 ga", 0.1046, 4.375],
  ["10 ga", 0.1345, 5.625],
  ["8 ga", 0.1644, 6.875],
];

const read = (rows: readonly PrintedRow[]): ReadonlyMap<string, Sheet> =>
  new Map(
    rows.map(([label, thickness_in, weight_lb_ft2]) => [
      label,
      { thickness_m: inches(thickness_in), weight_kg_m2: poundsPerSquareFoot(weight_lb_ft2) },
    ]),
  );

export const sheetTable = {
  source:
    "SMACNA, HVAC Duct Construction Standards, Metal and Flexible, 2nd ed. 1995, appendix A, sheet weights (open legal copy)",
  /** Nominal weights, as sheet is sold; a scale may read 2 % more. Weight from G90 theory is about 3 % less. */
  basis: "nominal weight",
  metals: {
    galvanized: read(galvanized),
    stainless: read(stainless),
    aluminum: read(aluminum),
    "black-steel": read(blackSteel),
  } satisfies Record<Material, ReadonlyMap<string, Sheet>>,
} as const;

/** Null where the table has no such sheet of that metal. */
export const findSheet = (material: Material, label: string): Sheet | null =>
  sheetTable.metals[material].get(label) ?? null;

/** Labels of the sheets that a metal is sold in, thinnest first: what a schedule may ask for. */
export const sheetLabels = (material: Material): readonly string[] => [...sheetTable.metals[material].keys()];
