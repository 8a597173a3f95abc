/** Equipment, outlets and the joints between, as signs of the trade: a cased box, a crossed square, a small dot. */
import type { Scene, SceneNode } from "../core/scene.ts";
import type { Brush } from "./brush.ts";

const OUTLET_SIZE_M = 0.6;
const EQUIPMENT_SIZE_M = 1.4;

export interface NodeMarks {
  readonly selected: ReadonlySet<string>;
  readonly hovered: string | null;
}

export function paintNodes(brush: Brush, scene: Scene, marks: NodeMarks): void {
  for (const node of scene.nodes) {
    if (!brush.sees(node.at, node.at, EQUIPMENT_SIZE_M)) continue;
    const half = signSize(brush, node) / 2;
    if (half > 0) paintSign(brush, node, half);
    if (marks.selected.has(node.id) || marks.hovered === node.id) ring(brush, node, half, marks.selected.has(node.id));
  }
  paintRisers(brush, scene);
}

function signSize(brush: Brush, node: SceneNode): number {
  if (node.role === "equipment") return Math.max(16, brush.px(EQUIPMENT_SIZE_M));
  if (node.role === "outlet") return Math.max(8, Math.min(brush.px(OUTLET_SIZE_M), 28));
  return brush.camera.pixelsPerMeter > 40 ? 4 : 0;
}

function paintSign(brush: Brush, node: SceneNode, half: number): void {
  const { context, palette } = brush;
  const { x, y } = brush.at(node.at);
  context.lineWidth = 1.5;
  context.strokeStyle = palette[node.service];
  context.fillStyle = palette.ground;
  context.beginPath();
  if (node.role === "junction") {
    context.arc(x, y, half, 0, 2 * Math.PI);
    context.fill();
    context.stroke();
    return;
  }
  context.rect(x - half, y - half, 2 * half, 2 * half);
  context.fill();
  context.stroke();
  context.beginPath();
  if (node.role === "outlet") {
    const inner = half * 0.6;
    context.rect(x - inner, y - inner, 2 * inner, 2 * inner);
    context.moveTo(x - half, y - half);
    context.lineTo(x + half, y + half);
    context.moveTo(x + half, y - half);
    context.lineTo(x - half, y + half);
  } else {
    context.arc(x, y, half * 0.55, 0, 2 * Math.PI);
    context.moveTo(x - half * 0.55, y);
    context.lineTo(x + half * 0.55, y);
    context.moveTo(x, y - half * 0.55);
    context.lineTo(x, y + half * 0.55);
  }
  context.lineWidth = 1;
  context.stroke();
}

function ring(brush: Brush, node: SceneNode, half: number, selected: boolean): void {
  const { context, palette } = brush;
  const { x, y } = brush.at(node.at);
  const reach = Math.max(half, 4) + 4;
  context.beginPath();
  context.rect(x - reach, y - reach, 2 * reach, 2 * reach);
  if (selected) {
    context.strokeStyle = palette.scribeKey;
    context.lineWidth = 4;
    context.stroke();
  }
  context.strokeStyle = selected ? palette.scribe : palette.text;
  context.lineWidth = selected ? 2 : 1;
  context.stroke();
}

/** A riser seen from above: its section, with the diagonal that says it goes through the floor. */
function paintRisers(brush: Brush, scene: Scene): void {
  const { context, palette } = brush;
  for (const duct of scene.ducts) {
    if (!duct.vertical || !brush.sees(duct.from, duct.from, duct.width_m)) continue;
    const { x, y } = brush.at(duct.from);
    const half = Math.max(5, brush.px(duct.width_m) / 2);
    context.strokeStyle = palette[duct.service];
    context.lineWidth = 1.5;
    context.beginPath();
    if (duct.section?.shape === "round" || duct.section?.shape === "annular") context.arc(x, y, half, 0, 2 * Math.PI);
    else context.rect(x - half, y - half, 2 * half, 2 * half);
    context.moveTo(x - half * 0.7, y + half * 0.7);
    context.lineTo(x + half * 0.7, y - half * 0.7);
    context.stroke();
  }
}
