/** The lines of arithmetic behind a piece, in SI, for a person who opens it. */
import type { ConstructionSpec } from "../air-system.ts";
import type { Hours, Kilograms, Meters, SquareMeters } from "../quantity.ts";
import { sheetTable, type Sheet } from "./sheet-weights.table.ts";
import { stretchOutTable } from "./stretch-out.table.ts";
import type { Arithmetic, ProductivityTable, ShopStandards } from "./takeoff.ts";

const SHEET_BASIS = `${sheetTable.source}; ${sheetTable.basis}`;

export function areaArithmetic(areas: {
  readonly netArea: SquareMeters;
  readonly netTerms: Arithmetic["terms"];
  readonly netBasis: string;
  readonly blankArea: SquareMeters;
  readonly blankAllowance: number;
  readonly outerArea: SquareMeters;
  readonly wrapShare: number;
  readonly insulationArea: SquareMeters;
  readonly linerArea: SquareMeters;
  readonly standards: ShopStandards;
}): Arithmetic[] {
  const { netArea, blankArea, outerArea } = areas;
  const lines: Arithmetic[] = [
    { quantity: "net-area", terms: areas.netTerms, result: netArea, unit: "m²", basis: areas.netBasis },
    {
      quantity: "blank-area",
      terms: [
        { label: "net area", value: netArea, unit: "m²" },
        { label: "with seams, joints, laps", value: 1 + areas.blankAllowance, unit: "×" },
      ],
      result: blankArea,
      unit: "m²",
      basis: areas.standards.allowanceSource,
    },
  ];
  if (areas.insulationArea > 0) {
    lines.push({
      quantity: "insulation-area",
      terms: [
        { label: "outside surface", value: outerArea, unit: "m²" },
        { label: "wrap cut wider than the girth, overlap included", value: areas.wrapShare, unit: "×" },
      ],
      result: areas.insulationArea,
      unit: "m²",
      basis: stretchOutTable.source,
    });
  }
  if (areas.linerArea > 0) {
    lines.push({
      quantity: "liner-area",
      terms: [{ label: "outer wall of the metal", value: outerArea, unit: "m²" }],
      result: areas.linerArea,
      unit: "m²",
      basis: "liner measured on the metal's girth; common practice",
    });
  }
  return lines;
}

export function weightArithmetic(piece: {
  readonly part: "straight" | "fitting";
  readonly netArea: SquareMeters;
  readonly gauge: string;
  readonly spec: ConstructionSpec;
  readonly sheet: Sheet;
  readonly weight: Kilograms;
  readonly shopHours: Hours;
  readonly fieldHours: Hours;
  readonly standards: ShopStandards;
}): Arithmetic[] {
  const { part, weight, sheet, standards } = piece;
  const { productivity } = standards;
  return [
    {
      quantity: "weight",
      terms: [
        { label: "net area", value: piece.netArea, unit: "m²" },
        { label: `${piece.gauge} ${piece.spec.material}`, value: sheet.weight_kg_m2, unit: "kg/m²" },
      ],
      result: weight,
      unit: "kg",
      basis: SHEET_BASIS,
    },
    {
      quantity: "shop-hours",
      terms: [
        { label: "weight", value: weight, unit: "kg" },
        { label: "hours", value: productivity.shop_h_per_kg[part], unit: "h/kg" },
      ],
      result: piece.shopHours,
      unit: "h",
      basis: productivity.source,
    },
    {
      quantity: "field-hours",
      terms: [
        { label: "weight", value: weight, unit: "kg" },
        { label: "hours", value: productivity.field_h_per_kg[part], unit: "h/kg" },
        { label: "conditions", value: productivity.conditionFactor, unit: "×" },
      ],
      result: piece.fieldHours,
      unit: "h",
      basis: productivity.source,
    },
  ];
}

export const flexibleArithmetic = (piece: {
  readonly straight: Meters;
  readonly flexibleSlack: number;
  readonly fieldHours: Hours;
  readonly productivity: ProductivityTable;
}): Arithmetic => ({
  quantity: "field-hours",
  terms: [
    { label: "center line", value: piece.straight, unit: "m" },
    { label: "slack", value: 1 + piece.flexibleSlack, unit: "×" },
    { label: "hours", value: piece.productivity.flexible_h_per_m, unit: "h/m" },
    { label: "conditions", value: piece.productivity.conditionFactor, unit: "×" },
  ],
  result: piece.fieldHours,
  unit: "h",
  basis: piece.productivity.source,
});
