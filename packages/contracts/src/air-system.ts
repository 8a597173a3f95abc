/** The published schema of an air system: the export and import format, and what every stage of the calculation reads. */
import {
  ACCESSORY_KINDS,
  AIR_SYSTEM_SCHEMA,
  ALLOWANCES_OF,
  BOUGHT_KINDS,
  DUCT_CLASSES,
  FRICTION_BASES,
  FITTING_TYPES,
  MATERIALS,
  MOUTH_TYPES,
  NODE_ROLES,
  RECTANGULAR_BRANCHES,
  RECTANGULAR_ELBOWS,
  ROUND_BRANCHES,
  ROUND_ELBOWS,
  SEAL_CLASSES,
  SERVICES,
  SUPPLIES,
  TRANSITION_ALIGNMENTS,
  SPLITTER_COUNTS,
  type AirNode,
  type AirSegment,
  type AirSystem,
  type ConstructionSpec,
  type DesignConditions,
  type Insulation,
  type Level,
  type Limits,
  type Section,
  type SizingRule,
} from "@cleatwork/calc";
import { z } from "zod";
import {
  airflowSchema,
  frictionRateSchema,
  kelvinsSchema,
  metersSchema,
  notNegativePascalsSchema,
  pascalsSchema,
  positiveMetersSchema,
  velocitySchema,
} from "./quantity.ts";

export const sectionSchema: z.ZodType<Section, Section> = z.discriminatedUnion("shape", [
  z.strictObject({ shape: z.literal("round"), diameter_m: positiveMetersSchema }),
  z.strictObject({ shape: z.literal("rectangular"), width_m: positiveMetersSchema, height_m: positiveMetersSchema }),
  z.strictObject({ shape: z.literal("flat-oval"), width_m: positiveMetersSchema, height_m: positiveMetersSchema }),
  z.strictObject({
    shape: z.literal("annular"),
    outerDiameter_m: positiveMetersSchema,
    innerDiameter_m: positiveMetersSchema,
  }),
]);

export const insulationSchema: z.ZodType<Insulation, Insulation> = z.discriminatedUnion("kind", [
  z.strictObject({ kind: z.literal("none") }),
  z.strictObject({ kind: z.literal("wrap"), thickness_m: positiveMetersSchema }),
  z.strictObject({ kind: z.literal("liner"), thickness_m: positiveMetersSchema }),
]);

/** "24 ga" or "0.050 in.": a sheet of some metal. Whether the metal has such a sheet, the takeoff says. */
export const sheetLabel = z.string().trim().min(1).max(20);

export const constructionSpecSchema: z.ZodType<ConstructionSpec, ConstructionSpec> = z.strictObject({
  material: z.enum(MATERIALS),
  pressureClass_pa: pascalsSchema,
  sealClass: z.enum(SEAL_CLASSES),
  sectionLength_m: z.strictObject({
    rectangular: positiveMetersSchema,
    round: positiveMetersSchema,
    flatOval: positiveMetersSchema,
  }),
  rectangularJoint: z.enum(["slip-and-drive", "flange", "standing-s"]),
  roundJoint: z.enum(["slip-coupling", "flange"]),
  rectangularSeam: z.enum(["corner-lock", "button-lock"]),
  roundConstruction: z.enum(["spiral", "longitudinal-seam"]),
  insulation: insulationSchema,
  hangerSpacing_m: z.strictObject({ rectangular: positiveMetersSchema, round: positiveMetersSchema }),
  sizesAre: z.enum(["clear-inside", "sheet-metal"]),
  elbow: z.strictObject({
    rectangular: z.enum(RECTANGULAR_ELBOWS),
    round: z.enum(ROUND_ELBOWS),
    radiusRatio: z.number().min(0.5).max(5),
    splitterCount: z.literal(SPLITTER_COUNTS).optional(),
  }),
  branch: z.strictObject({
    rectangular: z.enum(RECTANGULAR_BRANCHES),
    round: z.enum(ROUND_BRANCHES),
  }),
  transitionAngle_rad: z.number().positive().max(Math.PI),
  transitionAlignment: z.enum(TRANSITION_ALIGNMENTS).optional(),
  flexibleSlack: z.number().min(0).max(0.5),
  bought: z.array(z.enum(BOUGHT_KINDS)).max(BOUGHT_KINDS.length).optional(),
  allowances: z
    .array(z.strictObject({ of: z.enum(ALLOWANCES_OF), share: z.number().min(0).max(1) }))
    .max(ALLOWANCES_OF.length)
    .optional(),
  vaporBarrier: z.boolean().optional(),
  gauge: sheetLabel.nullable().optional(),
  constructionFromSchedule: z.boolean().optional(),
});

export const designSchema: z.ZodType<DesignConditions, DesignConditions> = z.strictObject({
  altitude_m: metersSchema,
  temperature_k: kelvinsSchema,
  relativeHumidity: z.number().min(0).max(1),
  availablePressure_pa: notNegativePascalsSchema,
  safetyMargin: z.number().min(0).max(0.5),
});

const perClass = <S extends z.ZodType>(value: S) =>
  z.strictObject({ main: value, branch: value, runout: value } satisfies Record<(typeof DUCT_CLASSES)[number], S>);

export const limitsSchema = z.strictObject({
  velocity_m_s: perClass(velocitySchema),
  frictionRate_pa_m: perClass(frictionRateSchema),
  flexibleLength_m: positiveMetersSchema,
}) satisfies z.ZodType<Limits>;

export const sizingSchema: z.ZodType<SizingRule, SizingRule> = z.strictObject({
  method: z.enum(["equal-friction", "velocity"]),
  frictionRate_pa_m: frictionRateSchema,
  shape: z.enum(["round", "rectangular", "flat-oval"]),
  maximumHeight_m: positiveMetersSchema.nullable(),
});

const text = (max: number) => z.string().max(max);

const levelSchema: z.ZodType<Level, Level> = z.strictObject({
  id: text(64),
  name: text(80),
  elevation_m: metersSchema,
  sheet: z
    .strictObject({ sheetNumber: text(40), revision: text(20) })
    .nullable()
    .optional(),
});

const airNodeSchema: z.ZodType<AirNode, AirNode> = z.strictObject({
  id: text(64),
  role: z.enum(NODE_ROLES),
  tag: text(40),
  levelId: text(64),
  x_m: metersSchema,
  y_m: metersSchema,
  elevation_m: metersSchema,
  airflow_m3s: airflowSchema.nullable(),
  requiredPressure_pa: notNegativePascalsSchema.nullable(),
  deviceKey: text(80).nullable(),
  spaceName: text(80),
});

/** From open; the same bound as the table of throttled dampers. */
export const damperAngleSchema = z
  .number()
  .min(0)
  .max(Math.PI / 2)
  .nullable()
  .optional();
export const mouthSchema = z.enum(MOUTH_TYPES).nullable().optional();

/** Of a segment, as its marks begin. */
export const markNumber = z.int().min(1).max(1_000_000);

const airSegmentSchema: z.ZodType<AirSegment, AirSegment> = z.strictObject({
  id: text(64),
  name: text(80),
  number: markNumber.nullable().optional(),
  fromNodeId: text(64),
  toNodeId: text(64),
  ductClass: z.enum(DUCT_CLASSES),
  section: sectionSchema.nullable(),
  length_m: positiveMetersSchema.nullable(),
  flexible: z.boolean(),
  fitting: z.enum(FITTING_TYPES).nullable(),
  accessories: z.array(z.enum(ACCESSORY_KINDS)).max(20),
  damperAngle_rad: damperAngleSchema,
  mouth: mouthSchema,
  insulation: insulationSchema.nullable(),
  supply: z.enum(SUPPLIES).nullable().optional(),
  gauge: sheetLabel.nullable().optional(),
});

export const airSystemSchema: z.ZodType<AirSystem, AirSystem> = z.strictObject({
  schema: z.literal(AIR_SYSTEM_SCHEMA),
  id: text(64),
  tag: text(20),
  name: text(120),
  service: z.enum(SERVICES),
  design: designSchema,
  limits: limitsSchema,
  sizing: sizingSchema,
  frictionBasis: z.enum(FRICTION_BASES),
  spec: constructionSpecSchema,
  levels: z.array(levelSchema).max(500),
  nodes: z.array(airNodeSchema).max(20_000),
  segments: z.array(airSegmentSchema).max(20_000),
});
