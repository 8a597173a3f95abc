/** A canvas with the camera that everything on it is drawn through. */
import {
  toScreen,
  visibleBounds,
  type Camera,
  type PlanPoint,
  type ScreenPoint,
  type Viewport,
} from "../core/camera.ts";
import type { Palette } from "./palette.ts";

export interface Brush {
  readonly context: CanvasRenderingContext2D;
  readonly camera: Camera;
  readonly viewport: Viewport;
  readonly palette: Palette;
  readonly at: (point: PlanPoint) => ScreenPoint;
  /** Meters to screen pixels. */
  readonly px: (meters: number) => number;
  readonly sees: (a: PlanPoint, b: PlanPoint, margin_m: number) => boolean;
}

export function brushFor(
  context: CanvasRenderingContext2D,
  camera: Camera,
  viewport: Viewport,
  palette: Palette,
): Brush {
  const seen = visibleBounds(camera, viewport);
  return {
    context,
    camera,
    viewport,
    palette,
    at: (point) => toScreen(camera, viewport, point),
    px: (meters) => meters * camera.pixelsPerMeter,
    sees: (a, b, margin) =>
      Math.max(a.x_m, b.x_m) + margin >= seen.minX_m &&
      Math.min(a.x_m, b.x_m) - margin <= seen.maxX_m &&
      Math.max(a.y_m, b.y_m) + margin >= seen.minY_m &&
      Math.min(a.y_m, b.y_m) - margin <= seen.maxY_m,
  };
}

/** A line with a dark key on both sides, so that it reads on any ground. */
export function strokeScribe({ context, palette }: Brush, width: number): void {
  context.strokeStyle = palette.scribeKey;
  context.lineWidth = width + 2;
  context.stroke();
  context.strokeStyle = palette.scribe;
  context.lineWidth = width;
  context.stroke();
}
