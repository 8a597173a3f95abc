import { z } from "zod";
import { address, calendarDate, instant, name, shortText, timeZone, unitSystem, version } from "./common.ts";
import { endpoint, member } from "./endpoint.ts";
import { clientId, contactId, drawingId, projectId } from "./ids.ts";
import { metersSchema } from "./quantity.ts";

export const PROJECT_STATES = ["bidding", "quoted", "won", "lost"] as const;

export const projectRequest = z.strictObject({
  name,
  number: z.string().trim().max(40),
  clientId,
  contactId: contactId.nullable(),
  siteAddress: address,
  altitude_m: metersSchema,
  /** The bid's day and hour, and the zone it is meant in. */
  dueAt: instant.nullable(),
  dueZone: timeZone,
  unitSystem,
});
export const projectResponse = projectRequest.extend({
  id: projectId,
  clientName: z.string(),
  state: z.enum(PROJECT_STATES),
  createdAt: instant,
  version,
});
export type Project = z.infer<typeof projectResponse>;

export const projectItem = z.object({
  id: projectId,
  name: z.string(),
  number: z.string(),
  clientName: z.string(),
  state: z.enum(PROJECT_STATES),
  dueAt: instant.nullable(),
  dueZone: z.string(),
  segmentCount: z.int(),
  /** Of the latest issued revision; null before the first. */
  price_minor: z.int().nullable(),
  currency: z.string(),
  quoteState: z.string().nullable(),
});
export type ProjectItem = z.infer<typeof projectItem>;

export const drawingFields = z.strictObject({
  sheetNumber: z.string().trim().min(1, "a sheet number such as M-101").max(40),
  title: shortText,
  revision: z.string().trim().max(20),
  datedOn: calendarDate,
});
export const drawingResponse = z.object({
  id: drawingId,
  ...drawingFields.shape,
  fileName: z.string(),
  mediaType: z.enum(["application/pdf", "image/png", "image/jpeg"]),
  byteCount: z.int(),
  /** Pages of a PDF; 1 for an image. */
  pageCount: z.int(),
  uploadedAt: instant,
  uploadedBy: z.string(),
});
export type Drawing = z.infer<typeof drawingResponse>;

export const projectEndpoints = {
  listProjects: endpoint({
    method: "get",
    path: "/companies/:company/projects",
    access: member("projects.read"),
    summary: "Projects by bid date",
    response: z.object({ items: z.array(projectItem) }),
  }),
  createProject: endpoint({
    method: "post",
    path: "/companies/:company/projects",
    access: member("projects.write"),
    summary: "Start a project",
    body: projectRequest,
    response: projectResponse,
    status: 201,
    guards: ["idempotency-key"],
  }),
  getProject: endpoint({
    method: "get",
    path: "/companies/:company/projects/:projectId",
    access: member("projects.read"),
    summary: "One project",
    response: projectResponse,
  }),
  updateProject: endpoint({
    method: "put",
    path: "/companies/:company/projects/:projectId",
    access: member("projects.write"),
    summary: "Change a project",
    body: projectRequest,
    response: projectResponse,
    guards: ["if-match"],
  }),
  listDrawings: endpoint({
    method: "get",
    path: "/companies/:company/projects/:projectId/drawings",
    access: member("drawings.read"),
    summary: "Drawings by sheet and revision",
    response: z.object({ items: z.array(drawingResponse) }),
  }),
  uploadDrawing: endpoint({
    method: "post",
    path: "/companies/:company/projects/:projectId/drawings",
    access: member("drawings.write"),
    summary: "Upload a PDF, PNG or JPEG; the type is told by content",
    body: drawingFields,
    response: drawingResponse,
    status: 201,
    takes: "file",
  }),
  getDrawingFile: endpoint({
    method: "get",
    path: "/companies/:company/projects/:projectId/drawings/:drawingId/file",
    access: member("drawings.read"),
    summary: "The drawing's bytes",
    answers: "file",
    status: 200,
  }),
  deleteDrawing: endpoint({
    method: "delete",
    path: "/companies/:company/projects/:projectId/drawings/:drawingId",
    access: member("drawings.write"),
    summary: "Take a drawing out",
  }),
};
