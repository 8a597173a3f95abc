/** Where the board looks: the plan point at the middle of the viewport, and how large a meter is drawn. */
export interface Camera {
  readonly x_m: number;
  readonly y_m: number;
  readonly pixelsPerMeter: number;
}

/** In CSS pixels. */
export interface Viewport {
  readonly width: number;
  readonly height: number;
}

export interface PlanPoint {
  readonly x_m: number;
  readonly y_m: number;
}

export interface ScreenPoint {
  readonly x: number;
  readonly y: number;
}

export interface Bounds {
  readonly minX_m: number;
  readonly minY_m: number;
  readonly maxX_m: number;
  readonly maxY_m: number;
}

/** From a whole site on a phone to a single joint. */
const MIN_PIXELS_PER_METER = 0.5;
const MAX_PIXELS_PER_METER = 800;

export const toScreen = (camera: Camera, viewport: Viewport, point: PlanPoint): ScreenPoint => ({
  x: (point.x_m - camera.x_m) * camera.pixelsPerMeter + viewport.width / 2,
  y: (point.y_m - camera.y_m) * camera.pixelsPerMeter + viewport.height / 2,
});

export const toPlan = (camera: Camera, viewport: Viewport, point: ScreenPoint): PlanPoint => ({
  x_m: (point.x - viewport.width / 2) / camera.pixelsPerMeter + camera.x_m,
  y_m: (point.y - viewport.height / 2) / camera.pixelsPerMeter + camera.y_m,
});

/** Zooms so that the plan point under the pointer stays under it. */
export function zoomAt(camera: Camera, viewport: Viewport, pointer: ScreenPoint, factor: number): Camera {
  const pixelsPerMeter = Math.min(MAX_PIXELS_PER_METER, Math.max(MIN_PIXELS_PER_METER, camera.pixelsPerMeter * factor));
  const held = toPlan(camera, viewport, pointer);
  return {
    x_m: held.x_m - (pointer.x - viewport.width / 2) / pixelsPerMeter,
    y_m: held.y_m - (pointer.y - viewport.height / 2) / pixelsPerMeter,
    pixelsPerMeter,
  };
}

export const panBy = (camera: Camera, dx: number, dy: number): Camera => ({
  ...camera,
  x_m: camera.x_m - dx / camera.pixelsPerMeter,
  y_m: camera.y_m - dy / camera.pixelsPerMeter,
});

/** Shows all of the bounds with a margin around. */
export function fit(bounds: Bounds, viewport: Viewport, margin = 48): Camera {
  const width = Math.max(bounds.maxX_m - bounds.minX_m, 1);
  const height = Math.max(bounds.maxY_m - bounds.minY_m, 1);
  const pixelsPerMeter = Math.min(
    Math.max(viewport.width - 2 * margin, 50) / width,
    Math.max(viewport.height - 2 * margin, 50) / height,
    MAX_PIXELS_PER_METER,
  );
  return {
    x_m: (bounds.minX_m + bounds.maxX_m) / 2,
    y_m: (bounds.minY_m + bounds.maxY_m) / 2,
    pixelsPerMeter: Math.max(pixelsPerMeter, MIN_PIXELS_PER_METER),
  };
}

export function boundsOf(points: Iterable<PlanPoint>): Bounds | null {
  let minX = Infinity;
  let minY = Infinity;
  let maxX = -Infinity;
  let maxY = -Infinity;
  for (const { x_m, y_m } of points) {
    minX = Math.min(minX, x_m);
    maxX = Math.max(maxX, x_m);
    minY = Math.min(minY, y_m);
    maxY = Math.max(maxY, y_m);
  }
  return minX === Infinity ? null : { minX_m: minX, minY_m: minY, maxX_m: maxX, maxY_m: maxY };
}

/** The part of the plan on screen, for leaving out what cannot be seen. */
export function visibleBounds(camera: Camera, viewport: Viewport): Bounds {
  const topLeft = toPlan(camera, viewport, { x: 0, y: 0 });
  const bottomRight = toPlan(camera, viewport, { x: viewport.width, y: viewport.height });
  return { minX_m: topLeft.x_m, minY_m: topLeft.y_m, maxX_m: bottomRight.x_m, maxY_m: bottomRight.y_m };
}
