/** The lines of arithmetic behind a piece, in SI, for a person who opens it. */
import type { ConstructionSpec } from "../air-system.ts";
import type { Hours, Kilograms, Meters, SquareMeters } from "../quantity.ts";
import { sheetTable, type Sheet } from "./sheet-weights.table.ts";
import { hoursBasis, type HoursRow, type ProductivityTable } from "./productivity.ts";
import { stretchOutTable } from "./stretch-out.table.ts";
import type { Arithmetic, ShopStandards } from "./takeoff.ts";

const SHEET_BASIS = `${sheetTable.source}; ${sheetTable.basis}`;

export function areaArithmetic(areas: {
  readonly netArea: SquareMeters;
  readonly netTerms: Arithmetic["terms"];
  readonly netBasis: string;
  readonly blankArea: SquareMeters;
  readonly blankTerms: Arithmetic["terms"];
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
      terms: areas.blankTerms,
      result: blankArea,
      unit: "m²",
      basis: areas.standards.edges.source,
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

export const weightArithmetic = (piece: {
  readonly netArea: SquareMeters;
  readonly gauge: string;
  readonly spec: ConstructionSpec;
  readonly sheet: Sheet;
  readonly weight: Kilograms;
}): Arithmetic => ({
  quantity: "weight",
  terms: [
    { label: "net area", value: piece.netArea, unit: "m²" },
    { label: `${piece.gauge} ${piece.spec.material}`, value: piece.sheet.weight_kg_m2, unit: "kg/m²" },
  ],
  result: piece.weight,
  unit: "kg",
  basis: SHEET_BASIS,
});

export function hoursArithmetic(
  row: HoursRow,
  measure: { readonly weight: Kilograms; readonly length: Meters },
  { name, conditionFactor }: ProductivityTable,
  result: Hours,
): Arithmetic {
  const { label, value, unit, hoursUnit } = hoursBasis(row, measure);
  const terms = [
    { label, value, unit },
    { label: "hours", value: row.hours_h, unit: hoursUnit },
  ];
  if (row.place === "field") terms.push({ label: "conditions", value: conditionFactor, unit: "×" });
  return {
    quantity: row.place === "shop" ? "shop-hours" : "field-hours",
    terms,
    result,
    unit: "h",
    basis: `${name}, ${row.standing}${row.note === "" ? "" : `: ${row.note}`}`,
  };
}
