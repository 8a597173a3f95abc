/** From a length or a surface to a piece: gauge, joints, areas, weight, hours, each with its arithmetic. */
import type { ConstructionSpec, Insulation, Section } from "../air-system.ts";
import { outerPerimeter } from "../geometry/section.ts";
import { hours, kilograms, meters, squareMeters, type Meters, type SquareMeters } from "../quantity.ts";
import { findGauge, longestSide, scheduleShape, straightConstruction, type GaugeQuestion } from "./gauge.ts";
import { findSheet, sheetTable, type Sheet } from "./sheet-weights.table.ts";
import { stretchOut, stretchOutTable } from "./stretch-out.table.ts";
import { girth } from "./surface/girth.ts";
import type { FittingPlan } from "./plan-fittings.ts";
import type { Arithmetic, Piece, ShopStandards } from "./takeoff.ts";

/** What the pieces of one segment have in common. */
export interface PieceOrigin {
  readonly systemId: string;
  readonly systemTag: string;
  readonly levelId: string;
  readonly segmentId: string;
  readonly segmentName: string;
}

/** A piece without its mark: whole sections of one segment differ in nothing else. */
export type Template = Omit<Piece, "mark">;

interface Metal {
  readonly kind: Piece["kind"];
  readonly isFitting: boolean;
  readonly section: Section;
  readonly gaugeSection: Section;
  readonly construction: GaugeQuestion["construction"];
  readonly netArea: SquareMeters;
  readonly netTerms: Arithmetic["terms"];
  readonly netBasis: string;
  readonly form: Pick<Piece, "fitting" | "otherSection" | "angle_rad" | "length_m">;
}

const term = (label: string, value: number, unit: string) => ({ label, value, unit });

export function straightPiece(
  origin: PieceOrigin,
  spec: ConstructionSpec,
  standards: ShopStandards,
  insulation: Insulation,
  section: Section,
  length: Meters,
): Template {
  const around = girth(section);
  return metalPiece(origin, spec, standards, insulation, {
    kind: "straight",
    isFitting: false,
    section,
    gaugeSection: section,
    construction: straightConstruction(section, spec),
    netArea: squareMeters(around * length),
    netTerms: [term("girth", around, "m"), term("length", length, "m")],
    netBasis: section.shape === "annular" ? "girth × length, both walls" : "girth × length",
    form: { fitting: null, otherSection: null, angle_rad: 0, length_m: length },
  });
}

export function fittingPiece(
  origin: PieceOrigin,
  spec: ConstructionSpec,
  standards: ShopStandards,
  insulation: Insulation,
  plan: FittingPlan,
): Template {
  return metalPiece(origin, spec, standards, insulation, {
    ...plan,
    isFitting: true,
    construction: "fitting",
    form: {
      fitting: plan.type,
      otherSection: plan.otherSection,
      angle_rad: plan.angle,
      length_m: plan.length,
    },
  });
}

function metalPiece(
  origin: PieceOrigin,
  spec: ConstructionSpec,
  standards: ShopStandards,
  insulation: Insulation,
  metal: Metal,
): Template {
  const { section, netArea, isFitting } = metal;
  const part = isFitting ? "fitting" : "straight";
  const { gauges, productivity, blankAllowance, allowanceSource } = standards;

  const gauge = findGauge(gauges, {
    material: spec.material,
    shape: scheduleShape(metal.gaugeSection),
    size_m: longestSide(metal.gaugeSection),
    pressureClass_pa: spec.pressureClass_pa,
    construction: metal.construction,
  });
  // A label that no sheet of the metal answers to is as good as none: no weight is made up for it.
  const sheet = gauge === null ? null : findSheet(spec.material, gauge);

  const allowance = blankAllowance[part];
  const blankArea = squareMeters(netArea * (1 + allowance));
  const weight = kilograms(netArea * (sheet?.weight_kg_m2 ?? 0));
  const shopRate = productivity.shop_h_per_kg[part];
  const fieldRate = productivity.field_h_per_kg[part];
  const shopHours = hours(weight * shopRate);
  const fieldHours = hours(weight * fieldRate * productivity.conditionFactor);
  const outer = outerPerimeter(section);
  const outerArea = section.shape === "annular" ? (netArea * outer) / girth(section) : netArea;

  const arithmetic: Arithmetic[] = [
    { quantity: "net-area", terms: metal.netTerms, result: netArea, unit: "m²", basis: metal.netBasis },
    {
      quantity: "blank-area",
      terms: [term("net area", netArea, "m²"), term("with seams, joints, laps", 1 + allowance, "×")],
      result: blankArea,
      unit: "m²",
      basis: allowanceSource,
    },
  ];
  if (sheet) {
    arithmetic.push(
      {
        quantity: "weight",
        terms: [term("net area", netArea, "m²"), term(`${gauge} ${spec.material}`, sheet.weight_kg_m2, "kg/m²")],
        result: weight,
        unit: "kg",
        basis: `${sheetTable.source}; ${sheetTable.basis}`,
      },
      {
        quantity: "shop-hours",
        terms: [term("weight", weight, "kg"), term("hours", shopRate, "h/kg")],
        result: shopHours,
        unit: "h",
        basis: `${productivity.name}: ${productivity.source}`,
      },
      {
        quantity: "field-hours",
        terms: [
          term("weight", weight, "kg"),
          term("hours", fieldRate, "h/kg"),
          term("conditions", productivity.conditionFactor, "×"),
        ],
        result: fieldHours,
        unit: "h",
        basis: `${productivity.name}: ${productivity.source}`,
      },
    );
  }

  let insulationArea = squareMeters(0);
  if (insulation.kind === "wrap") {
    const added = stretchOut(section, insulation.thickness_m);
    insulationArea = squareMeters(outerArea * (1 + added / outer));
    arithmetic.push({
      quantity: "insulation-area",
      terms: [
        term("outside surface", outerArea, "m²"),
        term("wrap cut wider than the girth, overlap included", 1 + added / outer, "×"),
      ],
      result: insulationArea,
      unit: "m²",
      basis: stretchOutTable.source,
    });
  }
  let linerArea = squareMeters(0);
  if (insulation.kind === "liner") {
    linerArea = squareMeters(outerArea);
    arithmetic.push({
      quantity: "liner-area",
      terms: [term("outer wall of the metal", outerArea, "m²")],
      result: linerArea,
      unit: "m²",
      basis: "liner measured on the metal's girth; common practice",
    });
  }

  return {
    ...origin,
    kind: metal.kind,
    ...metal.form,
    section,
    material: spec.material,
    gauge: sheet ? gauge : null,
    sheetThickness_m: sheet?.thickness_m ?? null,
    gaugeSource: gaugeSource(gauges.name, gauge, sheet),
    joint: jointOf(section, spec),
    seam: seamOf(section, spec, isFitting),
    jointCount: section.shape === "annular" ? 2 : 1,
    netArea_m2: netArea,
    blankArea_m2: blankArea,
    weight_kg: weight,
    insulationArea_m2: insulationArea,
    linerArea_m2: linerArea,
    shopHours_h: shopHours,
    fieldHours_h: fieldHours,
    arithmetic,
  };
}

function gaugeSource(schedule: string, gauge: string | null, sheet: Sheet | null): string {
  if (gauge === null) return `${schedule}: no row for this size, pressure class and metal`;
  return sheet ? schedule : `${schedule}: ${gauge}, for which no sheet weight is known`;
}

const RECTANGULAR_JOINTS = {
  "slip-and-drive": "slip and drive",
  flange: "flange",
  "standing-s": "standing S",
} as const;
const ROUND_JOINTS = { "slip-coupling": "slip coupling", flange: "flange" } as const;
const RECTANGULAR_SEAMS = { "corner-lock": "corner lock", "button-lock": "button lock" } as const;

const jointOf = (section: Section, spec: ConstructionSpec): string =>
  section.shape === "rectangular" ? RECTANGULAR_JOINTS[spec.rectangularJoint] : ROUND_JOINTS[spec.roundJoint];

function seamOf(section: Section, spec: ConstructionSpec, isFitting: boolean): string {
  if (section.shape === "rectangular") return RECTANGULAR_SEAMS[spec.rectangularSeam];
  return spec.roundConstruction === "spiral" && !isFitting ? "spiral" : "longitudinal";
}

/** Bought by the length; it comes insulated and is not cut from sheet. */
export function flexiblePiece(
  origin: PieceOrigin,
  { flexibleSlack }: ConstructionSpec,
  { productivity }: ShopStandards,
  section: Section,
  straight: Meters,
): Template {
  const length = meters(straight * (1 + flexibleSlack));
  const fieldHours = hours(length * productivity.flexible_h_per_m * productivity.conditionFactor);
  return {
    ...origin,
    kind: "flexible",
    fitting: null,
    section,
    otherSection: null,
    angle_rad: 0,
    length_m: length,
    material: "flexible",
    gauge: null,
    sheetThickness_m: null,
    gaugeSource: "",
    joint: "band and tape",
    seam: "",
    jointCount: 1,
    netArea_m2: squareMeters(0),
    blankArea_m2: squareMeters(0),
    weight_kg: kilograms(0),
    insulationArea_m2: squareMeters(0),
    linerArea_m2: squareMeters(0),
    shopHours_h: hours(0),
    fieldHours_h: fieldHours,
    arithmetic: [
      {
        quantity: "field-hours",
        terms: [
          term("center line", straight, "m"),
          term("slack", 1 + flexibleSlack, "×"),
          term("hours", productivity.flexible_h_per_m, "h/m"),
          term("conditions", productivity.conditionFactor, "×"),
        ],
        result: fieldHours,
        unit: "h",
        basis: `${productivity.name}: ${productivity.source}`,
      },
    ],
  };
}
