/** Sizes along the ducts, tags and airflows at the nodes; the widest ducts and the outlets speak first. */
import { LabelField, uprightTurn, type LabelBox } from "../core/labels.ts";
import type { Scene, SceneDuct, SceneNode } from "../core/scene.ts";
import type { Brush } from "./brush.ts";

const FONT = "'Archivo Variable', system-ui, sans-serif";
const TEXT_HEIGHT = 14;

export interface LabelTexts {
  readonly ofDuct: (duct: SceneDuct) => string;
  readonly ofNode: (node: SceneNode) => string;
}

export function paintLabels(brush: Brush, scene: Scene, texts: LabelTexts): void {
  const { context } = brush;
  const field = new LabelField();
  context.textAlign = "center";
  context.textBaseline = "middle";
  context.lineJoin = "round";

  context.font = `600 12px ${FONT}`;
  for (const node of scene.nodes) {
    if (node.role === "junction" || !brush.sees(node.at, node.at, 2)) continue;
    const text = texts.ofNode(node);
    if (text === "" || (node.role === "outlet" && brush.camera.pixelsPerMeter < 12)) continue;
    const { x, y } = brush.at(node.at);
    const half = node.role === "equipment" ? Math.max(8, brush.px(0.7)) : Math.min(14, Math.max(4, brush.px(0.3)));
    const width = context.measureText(text).width + 6;
    for (const offset of [-half - 10, half + 10]) {
      if (write(brush, field, text, { x, y: y + offset, width, height: TEXT_HEIGHT, turn: 0 })) break;
    }
  }

  const ducts = scene.ducts
    .filter((duct) => !duct.vertical && brush.sees(duct.from, duct.to, duct.width_m))
    .sort((a, b) => b.width_m - a.width_m);
  context.font = `560 12px ${FONT}`;
  for (const duct of ducts) labelDuct(brush, field, duct, texts.ofDuct(duct));
}

function labelDuct(brush: Brush, field: LabelField, duct: SceneDuct, text: string): void {
  const from = brush.at(duct.from);
  const to = brush.at(duct.to);
  const length = Math.hypot(to.x - from.x, to.y - from.y);
  const width = brush.context.measureText(text).width + 8;
  if (text === "" || width > length) return;
  const turn = uprightTurn(Math.atan2(to.y - from.y, to.x - from.x));
  const bodyWidth = brush.px(duct.width_m);
  // Inside when the duct is wide enough, beside it otherwise.
  const off = bodyWidth >= TEXT_HEIGHT + 4 ? 0 : bodyWidth / 2 + TEXT_HEIGHT / 2 + 1;
  for (const share of [0.45, 0.3, 0.6]) {
    const x = from.x + (to.x - from.x) * share + Math.sin(turn) * off;
    const y = from.y + (to.y - from.y) * share - Math.cos(turn) * off;
    if (write(brush, field, text, { x, y, width, height: TEXT_HEIGHT, turn })) return;
  }
}

function write(brush: Brush, field: LabelField, text: string, box: LabelBox): boolean {
  if (!field.place(box)) return false;
  const { context, palette } = brush;
  context.save();
  context.translate(box.x, box.y);
  context.rotate(box.turn);
  context.strokeStyle = palette.textHalo;
  context.lineWidth = 3;
  context.strokeText(text, 0, 0);
  context.fillStyle = palette.text;
  context.fillText(text, 0, 0);
  context.restore();
  return true;
}
