/** What a person should know about how the schedules were applied. */
import type { Frame } from "./frame.ts";
import { findSheet } from "./sheet-weights.table.ts";
import type { Piece, TakeoffFinding } from "./takeoff.ts";

/** Thinner than the schedule's sheet, by thickness: gauge numbers of two metals do not compare. */
export function isLighterThanScheduled(piece: Piece): boolean {
  if (piece.material === "flexible" || piece.scheduledGauge === null || piece.sheetThickness_m === null) return false;
  const asked = findSheet(piece.material, piece.scheduledGauge);
  return asked !== null && piece.sheetThickness_m < asked.thickness_m;
}

/** Marks of the pieces that the table of hours does not hold. Nothing is made up for them. */
export function missingHours(pieces: readonly Piece[]): {
  readonly shop_h: readonly string[];
  readonly field_h: readonly string[];
} {
  const without = (quantity: "shop-hours" | "field-hours", wanted: (piece: Piece) => boolean) =>
    pieces
      .filter((piece) => wanted(piece) && !piece.arithmetic.some((line) => line.quantity === quantity))
      .map(({ mark }) => mark);
  return {
    shop_h: without("shop-hours", ({ gauge, supply }) => gauge !== null && supply === "made"),
    field_h: without("field-hours", ({ kind, gauge }) => kind === "flexible" || gauge !== null),
  };
}

/** Heaviest grade that a joint carries by itself; found in two contractors' shop packets. */
const CARRIED: Readonly<Record<string, string>> = { "slip and drive": "A", "standing S": "C", flange: "K" };
const NAMED = 6;

/**
 * Duct whose joints are lighter than the reinforcement that its gauge needs at them. One finding a system: it is a
 * matter of the spec, not of one duct.
 */
export function checkJoints(frame: Frame, pieces: readonly Piece[], findings: TakeoffFinding[]): void {
  const weak = new Map<string, Piece>();
  for (const piece of pieces) {
    if (piece.kind !== "straight" || piece.section.shape !== "rectangular") continue;
    if (piece.reinforcement.kind !== "required" || weak.has(piece.segmentId)) continue;
    const carried = CARRIED[piece.joint];
    if (carried !== undefined && piece.reinforcement.grade.charAt(0) > carried) weak.set(piece.segmentId, piece);
  }
  const [first] = weak.values();
  if (!first || first.reinforcement.kind !== "required") return;
  const grades = new Set<string>();
  for (const { reinforcement } of weak.values())
    if (reinforcement.kind === "required") grades.add(reinforcement.grade.charAt(0));
  const marks = [...weak.values()].map(({ mark }) => mark);
  const rest = marks.length - NAMED;
  findings.push({
    id: `${frame.system.id}:joint-below-reinforcement`,
    code: "joint-below-reinforcement",
    severity: "note",
    segmentId: first.segmentId,
    message: `${marks.slice(0, NAMED).join(", ")}${rest > 0 ? ` and ${rest} more ducts` : ""}: their gauge wants reinforcement of grade ${[...grades].sort().join(", ")} at the joints; ${first.joint} carries grade ${CARRIED[first.joint] ?? ""}. Count bars or angles, join otherwise, or go heavier`,
  });
}
