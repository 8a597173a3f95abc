/** From a length or a surface to a piece: gauge, joints, areas, weight, hours, each with its arithmetic. */
import type { ConstructionSpec, Insulation, Section, SheetReference, Supply } from "../air-system.ts";
import { outerPerimeter } from "../geometry/section.ts";
import { hours, kilograms, meters, squareMeters, type Meters, type SquareMeters } from "../quantity.ts";
import {
  longestSide,
  missingWords,
  pieceQuestion,
  scheduleShape,
  straightConstruction,
  type GaugeAnswer,
  type GaugeQuestion,
  type gaugeReader,
} from "./gauge.ts";
import { clearSection } from "../network/clear-section.ts";
import { blankOf } from "./blank.ts";
import type { Body } from "./body.ts";
import { areaArithmetic, hoursArithmetic, weightArithmetic } from "./piece-arithmetic.ts";
import type { FittingPlan } from "./fitting-plan.ts";
import { hoursOf, type hoursReader } from "./productivity.ts";
import { stretchOut } from "./stretch-out.table.ts";
import { girth } from "./surface/girth.ts";
import type { Arithmetic, Piece, ShopStandards } from "./takeoff.ts";

/** What the pieces of one segment have in common. */
export interface PieceOrigin {
  readonly systemId: string;
  readonly systemTag: string;
  readonly levelId: string;
  readonly sheet: SheetReference | null;
  readonly segmentId: string;
  readonly segmentName: string;
  readonly spec: ConstructionSpec;
  readonly standards: ShopStandards;
  readonly readGauge: ReturnType<typeof gaugeReader>;
  readonly readHours: ReturnType<typeof hoursReader>;
  /** The sheet that the layout sets for this duct, whatever the schedules say. */
  readonly gaugeOverride: string | null;
  /** Made or bought, as the layout sets it for this duct. */
  readonly supply: Supply | null;
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
  readonly body: Body;
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
    body: { kind: "straight", section, length_m: length },
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
    body: plan.body,
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
  const { productivity, edges } = standards;

  const answer = origin.readGauge(pieceQuestion(metal.gaugeSection, metal.construction, spec), {
    piece: origin.gaugeOverride,
    spec: spec.gauge ?? null,
  });
  // A label that no sheet of the metal answers to is as good as none: no weight is made up for it.
  const { gauge, sheet } = answer;

  const supply = origin.supply ?? supplyOf(section, part, spec);
  const blank = blankOf(metal.body, { netArea, length: metal.length, spec, edges });
  const blankArea = blank.area;
  const weight = kilograms(netArea * (sheet?.weight_kg_m2 ?? 0));
  const work = {
    kind: metal.kind,
    shape: scheduleShape(metal.gaugeSection),
    material: spec.material,
    size_m: longestSide(metal.gaugeSection),
  };
  // What is bought takes no hours in the shop.
  const shopRow = sheet && supply === "made" ? origin.readHours({ place: "shop", ...work }) : null;
  const fieldRow = sheet ? origin.readHours({ place: "field", ...work }) : null;
  const measure = { weight, length: metal.length };
  const shopHours = hoursOf(shopRow, measure, productivity.conditionFactor);
  const fieldHours = hoursOf(fieldRow, measure, productivity.conditionFactor);
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
    blankTerms: blank.terms,
    outerArea,
    wrapShare,
    insulationArea,
    linerArea,
    standards,
  });
  if (gauge !== null && sheet) {
    arithmetic.push(weightArithmetic({ netArea, gauge, spec, sheet, weight }));
    if (shopRow) arithmetic.push(hoursArithmetic(shopRow, measure, productivity, shopHours));
    if (fieldRow) arithmetic.push(hoursArithmetic(fieldRow, measure, productivity, fieldHours));
  }

  return {
    mark: metal.mark,
    systemId: origin.systemId,
    systemTag: origin.systemTag,
    levelId: origin.levelId,
    sheet: origin.sheet,
    segmentId: origin.segmentId,
    segmentName: origin.segmentName,
    kind: metal.kind,
    fitting: metal.fitting,
    section,
    clearSection: clearOf(section, insulation),
    otherSection: metal.otherSection,
    angle_rad: metal.angle_rad,
    length_m: metal.length,
    body: metal.body,
    material: spec.material,
    supply,
    insulation,
    gauge,
    sheetThickness_m: sheet?.thickness_m ?? null,
    gaugeSource: gaugeSource(answer),
    gaugeDecider: answer.decider,
    scheduledGauge: answer.scheduled,
    reinforcement: answer.reinforcement,
    otherReinforcement: answer.otherReinforcement,
    joint: jointOf(section, spec, answer),
    seam: seamOf(section, spec, part, answer),
    jointCount: section.shape === "annular" ? 2 : 1,
    ends: blank.ends,
    seamLength_m: blank.seamLength,
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
  sheet: piece.sheet,
  segmentId: piece.segmentId,
  segmentName: piece.segmentName,
  kind: piece.kind,
  fitting: piece.fitting,
  section: piece.section,
  clearSection: piece.clearSection,
  otherSection: piece.otherSection,
  angle_rad: piece.angle_rad,
  length_m: piece.length_m,
  body: piece.body,
  material: piece.material,
  supply: piece.supply,
  insulation: piece.insulation,
  gauge: piece.gauge,
  sheetThickness_m: piece.sheetThickness_m,
  gaugeSource: piece.gaugeSource,
  gaugeDecider: piece.gaugeDecider,
  scheduledGauge: piece.scheduledGauge,
  reinforcement: piece.reinforcement,
  otherReinforcement: piece.otherReinforcement,
  joint: piece.joint,
  seam: piece.seam,
  jointCount: piece.jointCount,
  ends: piece.ends,
  seamLength_m: piece.seamLength_m,
  netArea_m2: piece.netArea_m2,
  blankArea_m2: piece.blankArea_m2,
  weight_kg: piece.weight_kg,
  insulationArea_m2: piece.insulationArea_m2,
  linerArea_m2: piece.linerArea_m2,
  shopHours_h: piece.shopHours_h,
  fieldHours_h: piece.fieldHours_h,
  arithmetic: piece.arithmetic,
});

const NOT_INSULATED: Insulation = { kind: "none" };

/** Rectangular duct is made; of round and oval the spec says what is bought. */
function supplyOf(section: Section, part: "straight" | "fitting", { bought }: ConstructionSpec): Supply {
  if (!bought || section.shape === "rectangular") return "made";
  const shape = section.shape === "flat-oval" ? "oval" : "round";
  return bought.includes(`${shape}-${part === "straight" ? "duct" : "fittings"}`) ? "bought" : "made";
}

/** What the air sees: inside of the liner. */
const clearOf = (section: Section, insulation: Insulation): Section =>
  insulation.kind === "liner" ? clearSection(section, insulation.thickness_m) : section;

const gaugeSource = ({ source, missing }: GaugeAnswer): string =>
  missing === null ? source : `${source}: ${missingWords(missing)}`;

const RECTANGULAR_JOINTS = {
  "slip-and-drive": "slip and drive",
  flange: "flange",
  "standing-s": "standing S",
} as const;
const ROUND_JOINTS = { "slip-coupling": "slip coupling", flange: "flange" } as const;
const RECTANGULAR_SEAMS = { "corner-lock": "corner lock", "button-lock": "button lock" } as const;

const jointOf = (section: Section, spec: ConstructionSpec, scheduled: Pick<GaugeAnswer, "joint">): string => {
  if (section.shape !== "rectangular") return ROUND_JOINTS[spec.roundJoint];
  const joint = spec.constructionFromSchedule ? scheduled.joint : null;
  return joint === null ? RECTANGULAR_JOINTS[spec.rectangularJoint] : (wordOf(RECTANGULAR_JOINTS, joint) ?? joint);
};

function seamOf(
  section: Section,
  spec: ConstructionSpec,
  part: "straight" | "fitting",
  scheduled: Pick<GaugeAnswer, "seam">,
): string {
  if (section.shape === "rectangular") {
    const seam = spec.constructionFromSchedule ? scheduled.seam : null;
    return seam === null ? RECTANGULAR_SEAMS[spec.rectangularSeam] : (wordOf(RECTANGULAR_SEAMS, seam) ?? seam);
  }
  return spec.roundConstruction === "spiral" && part === "straight" ? "spiral" : "longitudinal";
}

const wordOf = (words: Readonly<Record<string, string>>, key: string): string | undefined => words[key];

/** Bought by the length; it comes insulated and is not cut from sheet. */
export function flexiblePiece(origin: PieceOrigin, mark: string, section: Section, straight: Meters): Piece {
  const { productivity } = origin.standards;
  const length = meters(straight * (1 + origin.spec.flexibleSlack));
  const row = origin.readHours({
    place: "field",
    kind: "flexible",
    shape: scheduleShape(section),
    material: "flexible",
    size_m: longestSide(section),
  });
  const measure = { weight: kilograms(0), length };
  const fieldHours = hoursOf(row, measure, productivity.conditionFactor);
  return {
    mark,
    systemId: origin.systemId,
    systemTag: origin.systemTag,
    levelId: origin.levelId,
    sheet: origin.sheet,
    segmentId: origin.segmentId,
    segmentName: origin.segmentName,
    kind: "flexible",
    fitting: null,
    section,
    clearSection: section,
    otherSection: null,
    angle_rad: 0,
    length_m: length,
    body: { kind: "straight", section, length_m: length },
    material: "flexible",
    supply: "bought",
    insulation: NOT_INSULATED,
    gauge: null,
    sheetThickness_m: null,
    gaugeSource: "",
    gaugeDecider: null,
    scheduledGauge: null,
    reinforcement: { kind: "not-required" },
    otherReinforcement: null,
    joint: "band and tape",
    seam: "",
    jointCount: 1,
    ends: [section, section],
    seamLength_m: meters(0),
    netArea_m2: squareMeters(0),
    blankArea_m2: squareMeters(0),
    weight_kg: kilograms(0),
    insulationArea_m2: squareMeters(0),
    linerArea_m2: squareMeters(0),
    shopHours_h: hours(0),
    fieldHours_h: fieldHours,
    arithmetic: row ? [hoursArithmetic(row, measure, productivity, fieldHours)] : [],
  };
}
