/** What is asked of a takeoff beside the live one: earlier ones to compare with, the company's ratios, files. No price. */
import { PIECE_KINDS, TAKEOFF_RATIOS, type TakeoffRatio } from "@cleatwork/calc";
import { z } from "zod";
import { sectionSchema } from "./air-system.ts";
import { instant } from "./common.ts";
import { endpoint, member } from "./endpoint.ts";
import { projectId, revisionId } from "./ids.ts";

export const EXPORT_FORMATS = ["csv", "xlsx", "pdf"] as const;

/** As much of a piece as two takeoffs are compared by. */
export const comparedPiece = z.object({
  mark: z.string(),
  systemId: z.string(),
  systemTag: z.string(),
  segmentId: z.string(),
  segmentName: z.string(),
  kind: z.enum(PIECE_KINDS),
  section: sectionSchema,
  length_m: z.number(),
  material: z.string(),
  gauge: z.string().nullable(),
  weight_kg: z.number(),
  shopHours_h: z.number(),
  fieldHours_h: z.number(),
});
export type ComparedPiece = z.infer<typeof comparedPiece>;

const ratio = z.number().nullable();

export const takeoffEndpoints = {
  getRevisionTakeoff: endpoint({
    method: "get",
    path: "/companies/:company/projects/:projectId/quotes/:quoteId/revisions/:revisionId/takeoff",
    access: member("quotes.read"),
    summary: "The pieces that an issued revision rests on",
    response: z.object({ revisionId, issuedAt: instant, pieces: z.array(comparedPiece) }),
  }),
  listTakeoffRatios: endpoint({
    method: "get",
    path: "/companies/:company/takeoff-ratios",
    access: member("quotes.read"),
    summary: "Pounds per airflow, per length, area per fitting of the latest issued quote of each project",
    response: z.object({
      items: z.array(
        z.object({
          projectId,
          projectName: z.string(),
          issuedAt: instant,
          ratios: z.object(
            Object.fromEntries(TAKEOFF_RATIOS.map((name) => [name, ratio])) as Record<TakeoffRatio, typeof ratio>,
          ),
        }),
      ),
    }),
  }),
  getTakeoffFile: endpoint({
    method: "get",
    path: "/companies/:company/projects/:projectId/takeoff/file",
    access: member("quotes.read"),
    summary: "The takeoff as it is stored now: CSV, XLSX or PDF, without prices",
    query: z.object({ format: z.enum(EXPORT_FORMATS).default("csv") }),
    answers: "file",
    status: 200,
  }),
};
