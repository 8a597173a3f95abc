/** One frame of the board, back to front. It reads; it changes nothing. */
import type { Anchor } from "../tools/tool.ts";
import type { PlanPoint } from "../core/camera.ts";
import type { Snap } from "../core/snapping.ts";
import type { Scene } from "../core/scene.ts";
import { strokeScribe, type Brush } from "./brush.ts";
import { paintDucts, type DuctMarks } from "./paint-ducts.ts";
import { paintGround, paintUnderlay, type PaintedUnderlay } from "./paint-ground.ts";
import { paintLabels, type LabelTexts } from "./paint-labels.ts";
import { paintNodes } from "./paint-nodes.ts";
import { paintPins, type Pin } from "./paint-pins.ts";

export interface Ghost {
  readonly anchor: Anchor | null;
  readonly snap: Snap | null;
  readonly end: PlanPoint | null;
  readonly width_m: number;
}

export interface Frame {
  readonly scene: Scene;
  readonly marks: DuctMarks;
  readonly texts: LabelTexts;
  readonly pins: readonly Pin[];
  readonly ghost: Ghost | null;
  readonly underlay: PaintedUnderlay | null;
  readonly ground: "dye" | "paper";
  readonly grid_m: number;
}

export function paintBoard(brush: Brush, frame: Frame): void {
  paintGround(brush, frame.grid_m);
  if (frame.underlay) paintUnderlay(brush, frame.underlay, frame.ground);
  paintDucts(brush, frame.scene, frame.marks);
  paintNodes(brush, frame.scene, frame.marks);
  paintLabels(brush, frame.scene, frame.texts);
  paintPins(brush, frame.pins);
  if (frame.ghost) paintGhost(brush, frame.ghost);
}

function paintGhost(brush: Brush, ghost: Ghost): void {
  const { context } = brush;
  if (ghost.anchor && ghost.end) {
    const from = brush.at(ghost.anchor.at);
    const to = brush.at(ghost.end);
    const half = Math.max(3, brush.px(ghost.width_m) / 2);
    context.save();
    context.translate(from.x, from.y);
    context.rotate(Math.atan2(to.y - from.y, to.x - from.x));
    context.beginPath();
    context.rect(0, -half, Math.hypot(to.x - from.x, to.y - from.y), 2 * half);
    context.setLineDash([6, 4]);
    strokeScribe(brush, 1.5);
    context.setLineDash([]);
    context.restore();
  }
  const at = ghost.end ?? ghost.snap?.at ?? null;
  if (at && ghost.snap) paintSnapMark(brush, at, ghost.snap.kind);
}

/** What the pointer caught, by shape: a square for a node, a diamond for a duct, a cross otherwise. */
function paintSnapMark(brush: Brush, at: PlanPoint, kind: Snap["kind"]): void {
  const { context } = brush;
  const { x, y } = brush.at(at);
  context.beginPath();
  if (kind === "node") context.rect(x - 6, y - 6, 12, 12);
  else if (kind === "duct") {
    context.moveTo(x, y - 7);
    context.lineTo(x + 7, y);
    context.lineTo(x, y + 7);
    context.lineTo(x - 7, y);
    context.closePath();
  } else {
    context.moveTo(x - 7, y);
    context.lineTo(x + 7, y);
    context.moveTo(x, y - 7);
    context.lineTo(x, y + 7);
  }
  strokeScribe(brush, 2);
}
