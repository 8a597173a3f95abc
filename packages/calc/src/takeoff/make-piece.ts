/** From a length or a surface to a piece: gauge, joints, areas, weight, hours, each with its arithmetic. */
import type { ConstructionSpec, Insulation, Section } from "../air-system.ts";
import { outerPerimeter } from "../geometry/section.ts";
import { hours, kilograms, meters, squareMeters, type Meters, type SquareMeters } from "../quantity.ts";
import { longestSide, scheduleShape, straightConstruction, type GaugeQuestion, type gaugeReader } from "./gauge.ts";
import { areaArithmetic, flexibleArithmetic, weightArithmetic } from "./piece-arithmetic.ts";
import type { FittingPlan } from "./fitting-plan.ts";
import { findSheet, type Sheet } from "./sheet-weights.table.ts";
import { stretchOut } from "./stretch-out.table.ts";
import { girth } from "./surface/girth.ts";
import type { Arithmetic, Piece, ShopStandards } from "./takeoff.ts";

/** What the pieces of one segment have in common. */
export interface PieceOrigin {
  readonly systemId: string;
  readonly systemTag: string;
  readonly levelId: string;
  readonly segmentId: string;
  readonly segmentName: string;
  readonly spec: ConstructionSpec;
  readonly standards: ShopStandards;
  readonly readGauge: ReturnType<typeof gaugeReader>;
  readonly insulation: Insulation;
}

interface Metal {
  readonly mark: string;
  readonly kind: Piece["kind"];
  readonly fitting: Piece["fitting"];
  readonly section: Section;
  readonly otherSection: Section | null;
  readonly angle_rad: number;
  readonly length: Meters;
  readonly gaugeSection: Section;
  readonly construction: GaugeQuestion["construction"];
  readonly netArea: SquareMeters;
  readonly netTerms: Arithmetic["terms"];
  readonly netBasis: string;
}

export function straightPiece(origin: PieceOrigin, mark: string, section: Section, length: Meters): Piece {
  const around = girth(section);
  return metalPiece(origin, {
    mark,
    kind: "straight",
    fitting: null,
    section,
    otherSection: null,
    angle_rad: 0,
    length,
    gaugeSection: section,
    construction: straightConstruction(section, origin.spec),
    netArea: squareMeters(around * length),
    netTerms: [
      { label: "girth", value: around, unit: "m" },
      { label: "length", value: length, unit: "m" },
    ],
    netBasis: section.shape === "annular" ? "girth × length, both walls" : "girth × length",
  });
}

export const fittingPiece = (origin: PieceOrigin, mark: string, plan: FittingPlan): Piece =>
  metalPiece(origin, {
    mark,
    kind: plan.kind,
    fitting: plan.type,
    section: plan.section,
    otherSection: plan.otherSection,
    angle_rad: plan.angle,
    length: plan.length,
    gaugeSection: plan.gaugeSection,
    construction: "fitting",
    netArea: plan.netArea,
    netTerms: plan.netTerms,
    netBasis: plan.netBasis,
  });

/**
 * Fields are written out here and in `marked`, never spread: an object spread together with this many fields is an order
 * of magnitude slower, and thousands are made at each edit.
 */
function metalPiece(origin: PieceOrigin, metal: Metal): Piece {
  const { spec, standards, insulation } = origin;
  const { section, netArea } = metal;
  const part = metal.kind === "straight" ? "straight" : "fitting";
  const { gauges, productivity, blankAllowance } = standards;

  const gauge = origin.readGauge({
    shape: scheduleShape(metal.gaugeSection),
    size_m: longestSide(metal.gaugeSection),
    construction: metal.construction,
  });
  // A label that no sheet of the metal answers to is as good as none: no weight is made up for it.
  const sheet = gauge === null ? null : findSheet(spec.material, gauge);

  const blankArea = squareMeters(netArea * (1 + blankAllowance[part]));
  const weight = kilograms(netArea * (sheet?.weight_kg_m2 ?? 0));
  const shopHours = hours(weight * productivity.shop_h_per_kg[part]);
  const fieldHours = hours(weight * productivity.field_h_per_kg[part] * productivity.conditionFactor);
  const outer = outerPerimeter(section);
  const outerArea = squareMeters(section.shape === "annular" ? (netArea * outer) / girth(section) : netArea);
  const wrapShare = insulation.kind === "wrap" ? 1 + stretchOut(section, insulation.thickness_m) / outer : 0;
  const insulationArea = squareMeters(outerArea * wrapShare);
  const linerArea = squareMeters(insulation.kind === "liner" ? outerArea : 0);

  const arithmetic = areaArithmetic({
    netArea,
    netTerms: metal.netTerms,
    netBasis: metal.netBasis,
    blankArea,
    blankAllowance: blankAllowance[part],
    outerArea,
    wrapShare,
    insulationArea,
    linerArea,
    standards,
  });
  if (gauge !== null && sheet) {
    for (const line of weightArithmetic({
      part,
      netArea,
      gauge,
      spec,
      sheet,
      weight,
      shopHours,
      fieldHours,
      standards,
    })) {
      arithmetic.push(line);
    }
  }

  return {
    mark: metal.mark,
    systemId: origin.systemId,
    systemTag: origin.systemTag,
    levelId: origin.levelId,
    segmentId: origin.segmentId,
    segmentName: origin.segmentName,
    kind: metal.kind,
    fitting: metal.fitting,
    section,
    otherSection: metal.otherSection,
    angle_rad: metal.angle_rad,
    length_m: metal.length,
    material: spec.material,
    gauge: sheet ? gauge : null,
    sheetThickness_m: sheet?.thickness_m ?? null,
    gaugeSource: gaugeSource(gauges.name, gauge, sheet),
    joint: jointOf(section, spec),
    seam: seamOf(section, spec, part),
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

/** The same piece under its own mark: whole sections of one segment differ in nothing else. */
export const marked = (piece: Piece, mark: string): Piece => ({
  mark,
  systemId: piece.systemId,
  systemTag: piece.systemTag,
  levelId: piece.levelId,
  segmentId: piece.segmentId,
  segmentName: piece.segmentName,
  kind: piece.kind,
  fitting: piece.fitting,
  section: piece.section,
  otherSection: piece.otherSection,
  angle_rad: piece.angle_rad,
  length_m: piece.length_m,
  material: piece.material,
  gauge: piece.gauge,
  sheetThickness_m: piece.sheetThickness_m,
  gaugeSource: piece.gaugeSource,
  joint: piece.joint,
  seam: piece.seam,
  jointCount: piece.jointCount,
  netArea_m2: piece.netArea_m2,
  blankArea_m2: piece.blankArea_m2,
  weight_kg: piece.weight_kg,
  insulationArea_m2: piece.insulationArea_m2,
  linerArea_m2: piece.linerArea_m2,
  shopHours_h: piece.shopHours_h,
  fieldHours_h: piece.fieldHours_h,
  arithmetic: piece.arithmetic,
});

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

function seamOf(section: Section, spec: ConstructionSpec, part: "straight" | "fitting"): string {
  if (section.shape === "rectangular") return RECTANGULAR_SEAMS[spec.rectangularSeam];
  return spec.roundConstruction === "spiral" && part === "straight" ? "spiral" : "longitudinal";
}

/** Bought by the length; it comes insulated and is not cut from sheet. */
export function flexiblePiece(origin: PieceOrigin, mark: string, section: Section, straight: Meters): Piece {
  const { flexibleSlack } = origin.spec;
  const { productivity } = origin.standards;
  const length = meters(straight * (1 + flexibleSlack));
  const fieldHours = hours(length * productivity.flexible_h_per_m * productivity.conditionFactor);
  return {
    mark,
    systemId: origin.systemId,
    systemTag: origin.systemTag,
    levelId: origin.levelId,
    segmentId: origin.segmentId,
    segmentName: origin.segmentName,
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
    arithmetic: [flexibleArithmetic({ straight, flexibleSlack, fieldHours, productivity })],
  };
}
