/** Makers of typed problems: each names the segment, node or system, the field, the value and what would be accepted. */
import type { AirNode, AirSegment, AirSystem } from "../air-system.ts";
import type { SystemProblem } from "./solution.ts";

type Subject = SystemProblem["subject"];

export const segmentSubject = (segment: AirSegment): Subject => ({
  kind: "segment",
  id: segment.id,
  name: segment.name || segment.id,
});
export const nodeSubject = (node: AirNode): Subject => ({ kind: "node", id: node.id, name: node.tag || node.id });
export const systemSubject = (system: AirSystem): Subject => ({
  kind: "system",
  id: system.id,
  name: system.name || system.tag || system.id,
});

/** JSON has no NaN and no infinity; they are told in words. */
const told = (value: unknown): SystemProblem["value"] =>
  value === null || value === undefined
    ? null
    : typeof value === "number" && Number.isFinite(value)
      ? value
      : typeof value === "string"
        ? value
        : typeof value === "number"
          ? String(value)
          : JSON.stringify(value);

export const problem = (
  code: SystemProblem["code"],
  subject: Subject,
  field: string,
  value: unknown,
  limit: string,
): SystemProblem => ({ code, subject, field, value: told(value), limit });
