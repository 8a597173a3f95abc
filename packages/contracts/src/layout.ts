/** The layout document on the wire: flat records by id, and the changes that edit them. */
import { ACCESSORY_KINDS, DUCT_CLASSES, FITTING_TYPES, NODE_ROLES, SERVICES, SUPPLIES } from "@cleatwork/calc";
import { z } from "zod";
import {
  damperAngleSchema,
  designSchema,
  insulationSchema,
  limitsSchema,
  markNumber,
  mouthSchema,
  sectionSchema,
  sheetLabel,
  sizingSchema,
} from "./air-system.ts";
import { drawingId, levelId, nodeId, personId, recordId, segmentId, specId, systemId } from "./ids.ts";
import { airflowSchema, metersSchema, notNegativePascalsSchema, positiveMetersSchema } from "./quantity.ts";

/** A drawing page under a level: where it lies and how large it is. */
export const underlaySchema = z.strictObject({
  drawingId,
  page: z.int().min(1).max(2000),
  /** Meters of building for one point (1/72 in.) of the page, or for one pixel of an image. */
  metersPerUnit: z.number().positive().max(1000),
  /** Where the page's top left corner lies. */
  x_m: metersSchema,
  y_m: metersSchema,
  rotation_rad: z.number().min(-Math.PI).max(Math.PI),
});

export const levelRecordSchema = z.strictObject({
  kind: z.literal("level"),
  id: levelId,
  name: z.string().min(1).max(80),
  elevation_m: metersSchema,
  underlay: underlaySchema.nullable(),
});

export const systemRecordSchema = z.strictObject({
  kind: z.literal("system"),
  id: systemId,
  tag: z.string().min(1).max(20),
  name: z.string().max(120),
  service: z.enum(SERVICES),
  specId,
  design: designSchema,
  limits: limitsSchema,
  sizing: sizingSchema,
});

export const nodeRecordSchema = z.strictObject({
  kind: z.literal("node"),
  id: nodeId,
  systemId,
  role: z.enum(NODE_ROLES),
  tag: z.string().max(40),
  levelId,
  /** Plan position: x to the right, y down the page, in meters of building. */
  x_m: metersSchema,
  y_m: metersSchema,
  /** Center line above the level. */
  elevation_m: metersSchema,
  airflow_m3s: airflowSchema.nullable(),
  requiredPressure_pa: notNegativePascalsSchema.nullable(),
  deviceKey: z.string().max(80).nullable(),
  spaceName: z.string().max(80),
});

export const segmentRecordSchema = z.strictObject({
  kind: z.literal("segment"),
  id: segmentId,
  systemId,
  name: z.string().max(80),
  /** The end nearer the equipment, whichever way the air goes. */
  fromNodeId: nodeId,
  toNodeId: nodeId,
  /** Order among the children of a node, as the estimator arranged them. */
  ordinal: z.number().min(0),
  /** What the marks of its pieces begin with: given once, never changed, so that metal keeps its name. */
  number: markNumber.optional(),
  ductClass: z.enum(DUCT_CLASSES),
  section: sectionSchema.nullable(),
  /** Null: from the positions of the nodes. */
  length_m: positiveMetersSchema.nullable(),
  flexible: z.boolean(),
  fitting: z.enum(FITTING_TYPES).nullable(),
  accessories: z.array(z.enum(ACCESSORY_KINDS)).max(20),
  damperAngle_rad: damperAngleSchema,
  mouth: mouthSchema,
  insulation: insulationSchema.nullable(),
  /** Made or bought, whatever the spec says. */
  supply: z.enum(SUPPLIES).nullable().optional(),
  /** Sheet set for this duct, whatever the schedules say. */
  gauge: sheetLabel.nullable().optional(),
});

export const layoutRecordSchema = z.discriminatedUnion("kind", [
  levelRecordSchema,
  systemRecordSchema,
  nodeRecordSchema,
  segmentRecordSchema,
]);

export type Underlay = z.infer<typeof underlaySchema>;
export type LevelRecord = z.infer<typeof levelRecordSchema>;
export type SystemRecord = z.infer<typeof systemRecordSchema>;
export type NodeRecord = z.infer<typeof nodeRecordSchema>;
export type SegmentRecord = z.infer<typeof segmentRecordSchema>;
export type LayoutRecord = z.infer<typeof layoutRecordSchema>;

export const changeSchema = z.strictObject({
  id: recordId,
  before: layoutRecordSchema.nullable(),
  after: layoutRecordSchema.nullable(),
});
export type Change = z.infer<typeof changeSchema>;

export const changeSetSchema = z.strictObject({
  /** What a person would call it: "Size 18 round". */
  label: z.string().min(1).max(120),
  changes: z.array(changeSchema).min(1).max(20_000),
});
export type ChangeSet = z.infer<typeof changeSetSchema>;

export const layoutResponse = z.object({ sequence: z.int().min(0), records: z.array(layoutRecordSchema) });
export type LayoutResponse = z.infer<typeof layoutResponse>;

export const saveLayoutRequest = z.strictObject({
  /** Made by the browser; sending a batch twice does it once. */
  batchId: z.uuid(),
  /** The sequence that the browser had seen when it made these edits. */
  baseSequence: z.int().min(0),
  sets: z.array(changeSetSchema).min(1).max(500),
});
export type SaveLayoutRequest = z.infer<typeof saveLayoutRequest>;

export const saveLayoutResponse = z.object({
  sequence: z.int(),
  /** Sequence before this batch: when it is later than the base, others have edited meanwhile. */
  previousSequence: z.int(),
});
export type SaveLayoutResponse = z.infer<typeof saveLayoutResponse>;

export const layoutChangesQuery = z.object({
  after: z.coerce.number<string>().int().min(0).default(0),
  limit: z.coerce.number<string>().int().min(1).max(500).default(200),
});

export const layoutChangesResponse = z.object({
  items: z.array(
    z.object({
      sequence: z.int(),
      by: z.object({ id: personId, name: z.string() }),
      at: z.iso.datetime(),
      label: z.string(),
      changes: z.array(changeSchema),
    }),
  ),
  next: z.int().nullable(),
});
