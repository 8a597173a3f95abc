/** What the shop and the site see. No field here may hold a price, a rate, a margin or an amount of money. */
import { MATERIALS, PIECE_KINDS, SERVICES } from "@cleatwork/calc";
import { z } from "zod";
import { insulationSchema, sectionSchema } from "./air-system.ts";
import { instant, unitSystem } from "./common.ts";
import { endpoint, member } from "./endpoint.ts";
import { approvedTakeoffId, projectId } from "./ids.ts";

export const fieldProjectItem = z.object({
  projectId,
  projectName: z.string(),
  siteCity: z.string(),
  approvedAt: instant,
  pieceCount: z.int(),
  weight_kg: z.number(),
});

export const fieldPiece = z.object({
  mark: z.string(),
  systemId: z.string(),
  levelId: z.string(),
  segmentName: z.string(),
  kind: z.enum(PIECE_KINDS),
  fitting: z.string().nullable(),
  section: sectionSchema,
  otherSection: sectionSchema.nullable(),
  angle_rad: z.number(),
  length_m: z.number(),
  material: z.enum([...MATERIALS, "flexible"]),
  gauge: z.string().nullable(),
  joint: z.string(),
  seam: z.string(),
  weight_kg: z.number(),
});
export type FieldPiece = z.infer<typeof fieldPiece>;

export const fieldItem = z.object({
  kind: z.enum(["hanger", "sealant", "hardware", "accessory", "device"]),
  description: z.string(),
  systemId: z.string(),
  levelId: z.string(),
  quantity: z.number(),
  unit: z.enum(["ea", "L", "m"]),
});

export const fieldTakeoffResponse = z.object({
  id: approvedTakeoffId,
  projectId,
  projectName: z.string(),
  unitSystem,
  approvedAt: instant,
  quoteNumber: z.string(),
  revision: z.int(),
  snapshotHash: z.string(),
  levels: z.array(z.object({ id: z.string(), name: z.string(), elevation_m: z.number() })),
  systems: z.array(
    z.object({
      id: z.string(),
      tag: z.string(),
      name: z.string(),
      service: z.enum(SERVICES),
      sealClass: z.string(),
      insulation: insulationSchema,
    }),
  ),
  pieces: z.array(fieldPiece),
  items: z.array(fieldItem),
});
export type FieldTakeoff = z.infer<typeof fieldTakeoffResponse>;

export const fieldEndpoints = {
  listFieldProjects: endpoint({
    method: "get",
    path: "/companies/:company/field",
    access: member("field.read"),
    summary: "Projects with an approved takeoff",
    response: z.object({ items: z.array(fieldProjectItem) }),
  }),
  getFieldTakeoff: endpoint({
    method: "get",
    path: "/companies/:company/field/:projectId",
    access: member("field.read"),
    summary: "The approved takeoff: what to make and hang",
    response: fieldTakeoffResponse,
  }),
};
