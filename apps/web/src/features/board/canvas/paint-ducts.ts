/**
 * Ducts at true width. All edges first, all bodies over them: where two ducts meet, their bodies run into each other and
 * only the outside edge is left, whatever the angle.
 */
import type { Service } from "@cleatwork/calc";
import type { Scene, SceneDuct } from "../core/scene.ts";
import type { Brush } from "./brush.ts";

/** Services differ by line pattern first, hue second. Screen pixels. */
const CENTER_LINE: Readonly<Record<Service, readonly number[]>> = {
  supply: [],
  return: [14, 6],
  exhaust: [12, 4, 2, 4],
  "outside-air": [2, 4],
};

const EDGE = 1.25;
const MIN_WIDTH_PX = 3;

export interface DuctMarks {
  readonly selected: ReadonlySet<string>;
  readonly hovered: string | null;
  readonly governing: ReadonlySet<string>;
  /** 0 to 1 and over, share of the limit; null draws no heat. */
  readonly heatOf: ((segmentId: string) => number | null) | null;
  readonly activeSystemId: string | null;
}

export function paintDucts(brush: Brush, scene: Scene, marks: DuctMarks): void {
  const shown = scene.ducts.filter((duct) => !duct.vertical && brush.sees(duct.from, duct.to, duct.width_m));
  const widthAt = widestAtNodes(scene);
  for (const duct of shown) strokeBody(brush, duct, widthOf(brush, duct) + 2 * EDGE, edgeColor(brush, duct, marks));
  paintJoints(brush, scene, widthAt, 2 * EDGE, brush.palette.ductEdge);
  for (const duct of shown) strokeBody(brush, duct, widthOf(brush, duct), bodyColor(brush, duct, marks));
  paintJoints(brush, scene, widthAt, 0, brush.palette.ductFill);
  for (const duct of shown) paintInside(brush, duct);
  paintGoverning(brush, shown, marks.governing);
  for (const duct of shown) {
    if (marks.selected.has(duct.id) || marks.hovered === duct.id) outline(brush, duct, marks.selected.has(duct.id));
  }
}

const widthOf = (brush: Brush, duct: SceneDuct) => Math.max(MIN_WIDTH_PX, brush.px(duct.width_m));

const edgeColor = (brush: Brush, duct: SceneDuct, marks: DuctMarks) =>
  marks.activeSystemId !== null && duct.systemId !== marks.activeSystemId
    ? brush.palette.dim
    : brush.palette[duct.service];

function bodyColor({ palette }: Brush, duct: SceneDuct, marks: DuctMarks): string {
  const share = marks.heatOf?.(duct.id) ?? null;
  if (share === null) return palette.ductFill;
  if (share > 1) return palette.heat5;
  if (share > 0.8) return palette.heat4;
  if (share > 0.6) return palette.heat3;
  return share > 0.4 ? palette.heat2 : palette.heat1;
}

function strokeBody(brush: Brush, duct: SceneDuct, width: number, color: string): void {
  const { context } = brush;
  trace(brush, duct);
  context.lineCap = "butt";
  context.setLineDash([]);
  context.lineWidth = width;
  context.strokeStyle = color;
  context.stroke();
}

function trace(brush: Brush, duct: SceneDuct): void {
  const from = brush.at(duct.from);
  const to = brush.at(duct.to);
  brush.context.beginPath();
  brush.context.moveTo(from.x, from.y);
  brush.context.lineTo(to.x, to.y);
}

/** The narrower of two ducts that meet end to end fills the outside of the bend. */
function widestAtNodes(scene: Scene): ReadonlyMap<string, { x_m: number; y_m: number; width_m: number }> {
  const joints = new Map<string, { x_m: number; y_m: number; width_m: number; count: number }>();
  for (const duct of scene.ducts) {
    if (duct.vertical) continue;
    for (const [nodeId, at] of [
      [duct.fromNodeId, duct.from],
      [duct.toNodeId, duct.to],
    ] as const) {
      const known = joints.get(nodeId);
      if (known) {
        known.width_m = Math.min(known.width_m, duct.width_m);
        known.count += 1;
      } else joints.set(nodeId, { ...at, width_m: duct.width_m, count: 1 });
    }
  }
  for (const [nodeId, joint] of joints) if (joint.count < 2) joints.delete(nodeId);
  return joints;
}

function paintJoints(
  brush: Brush,
  scene: Scene,
  widthAt: ReturnType<typeof widestAtNodes>,
  extra: number,
  color: string,
): void {
  const { context } = brush;
  context.fillStyle = color;
  for (const node of scene.nodes) {
    const joint = widthAt.get(node.id);
    if (!joint || !brush.sees(joint, joint, joint.width_m)) continue;
    const { x, y } = brush.at(joint);
    context.beginPath();
    context.arc(x, y, (Math.max(MIN_WIDTH_PX, brush.px(joint.width_m)) + extra) / 2, 0, 2 * Math.PI);
    context.fill();
  }
}

/** Flexible duct shows its corrugation, other duct its service's center line; flow arrows where there is room. */
function paintInside(brush: Brush, duct: SceneDuct): void {
  const { context, palette } = brush;
  const width = widthOf(brush, duct);
  if (width < 6) return;
  trace(brush, duct);
  context.strokeStyle = palette[duct.service];
  if (duct.flexible) {
    context.lineWidth = width - 1;
    context.setLineDash([1, 4]);
    context.stroke();
    context.setLineDash([]);
    return;
  }
  if (duct.service !== "supply") {
    context.lineWidth = 1;
    context.setLineDash([...CENTER_LINE[duct.service]]);
    context.stroke();
    context.setLineDash([]);
  }
  if (duct.section?.shape === "annular") paintCore(brush, duct, duct.section.innerDiameter_m);
  paintArrow(brush, duct, width);
}

function paintCore(brush: Brush, duct: SceneDuct, innerDiameter_m: number): void {
  const inner = Math.max(2, brush.px(innerDiameter_m));
  trace(brush, duct);
  brush.context.strokeStyle = brush.palette.ground;
  brush.context.lineWidth = inner;
  brush.context.stroke();
}

function paintArrow(brush: Brush, duct: SceneDuct, width: number): void {
  const { context, palette } = brush;
  const from = brush.at(duct.from);
  const to = brush.at(duct.to);
  const length = Math.hypot(to.x - from.x, to.y - from.y);
  if (length < 64) return;
  // Return and exhaust air flows toward the equipment.
  const reversed = duct.service === "return" || duct.service === "exhaust" || duct.service === "outside-air";
  const size = Math.min(7, width / 3);
  context.save();
  context.translate(from.x + (to.x - from.x) * 0.78, from.y + (to.y - from.y) * 0.78);
  context.rotate(Math.atan2(to.y - from.y, to.x - from.x) + (reversed ? Math.PI : 0));
  context.beginPath();
  context.moveTo(-size, -size);
  context.lineTo(size * 0.4, 0);
  context.lineTo(-size, size);
  context.strokeStyle = palette.text;
  context.lineWidth = 1.5;
  context.stroke();
  context.restore();
}

function paintGoverning(brush: Brush, shown: readonly SceneDuct[], governing: ReadonlySet<string>): void {
  const { context, palette } = brush;
  for (const [color, width] of [
    [palette.scribeKey, 4],
    [palette.scribe, 2],
  ] as const) {
    context.beginPath();
    for (const duct of shown) {
      if (!governing.has(duct.id)) continue;
      const from = brush.at(duct.from);
      const to = brush.at(duct.to);
      context.moveTo(from.x, from.y);
      context.lineTo(to.x, to.y);
    }
    context.lineCap = "round";
    context.strokeStyle = color;
    context.lineWidth = width;
    context.stroke();
  }
  context.lineCap = "butt";
}

function outline(brush: Brush, duct: SceneDuct, selected: boolean): void {
  const { context, palette } = brush;
  const from = brush.at(duct.from);
  const to = brush.at(duct.to);
  const half = widthOf(brush, duct) / 2 + 3;
  context.save();
  context.translate(from.x, from.y);
  context.rotate(Math.atan2(to.y - from.y, to.x - from.x));
  context.beginPath();
  context.rect(-2, -half, Math.hypot(to.x - from.x, to.y - from.y) + 4, 2 * half);
  if (selected) {
    context.strokeStyle = palette.scribeKey;
    context.lineWidth = 4;
    context.stroke();
  }
  context.strokeStyle = selected ? palette.scribe : palette.text;
  context.lineWidth = selected ? 2 : 1;
  context.stroke();
  context.restore();
}
