/** The ground: a quiet grid that gives scale where there is no drawing, and a bar that says how long a length is. */
import type { Brush } from "./brush.ts";

export function paintGround(brush: Brush, grid_m: number): void {
  const { context, palette, viewport } = brush;
  context.fillStyle = palette.ground;
  context.fillRect(0, 0, viewport.width, viewport.height);
  let step = grid_m;
  while (brush.px(step) < 24) step *= 5;
  const origin = brush.at({ x_m: 0, y_m: 0 });
  const size = brush.px(step);
  context.beginPath();
  for (let x = origin.x % size; x < viewport.width; x += size) {
    context.moveTo(Math.round(x) + 0.5, 0);
    context.lineTo(Math.round(x) + 0.5, viewport.height);
  }
  for (let y = origin.y % size; y < viewport.height; y += size) {
    context.moveTo(0, Math.round(y) + 0.5);
    context.lineTo(viewport.width, Math.round(y) + 0.5);
  }
  context.strokeStyle = palette.grid;
  context.lineWidth = 1;
  context.globalAlpha = 0.22;
  context.stroke();
  context.globalAlpha = 1;
}

export interface PaintedUnderlay {
  readonly image: CanvasImageSource;
  readonly width: number;
  readonly height: number;
  /** Meters for one pixel of the image. */
  readonly metersPerPixel: number;
  readonly x_m: number;
  readonly y_m: number;
  readonly rotation_rad: number;
}

/** The drawing page: as it is on paper, tinted into the ground on dye. */
export function paintUnderlay(brush: Brush, underlay: PaintedUnderlay, ground: "dye" | "paper"): void {
  const { context } = brush;
  const { x, y } = brush.at(underlay);
  const scale = brush.px(underlay.metersPerPixel);
  context.save();
  context.translate(x, y);
  context.rotate(underlay.rotation_rad);
  context.scale(scale, scale);
  if (ground === "dye") {
    context.filter = "invert(1) grayscale(1)";
    context.globalCompositeOperation = "screen";
    context.globalAlpha = 0.75;
  } else {
    context.globalCompositeOperation = "multiply";
    context.globalAlpha = 0.8;
  }
  context.drawImage(underlay.image, 0, 0, underlay.width, underlay.height);
  context.restore();
}

/** A round length of about 100 pixels. */
export function scaleBarLength(pixelsPerUnit: number): number {
  const raw = 110 / pixelsPerUnit;
  const power = 10 ** Math.floor(Math.log10(raw));
  const rounded = [5, 2, 1].find((factor) => factor * power <= raw) ?? 1;
  return rounded * power;
}
