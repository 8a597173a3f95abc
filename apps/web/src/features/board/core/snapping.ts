/**
 * Where a click lands. In this order: a node, the center line of a duct (which makes a tap), 0/45/90 from the start of
 * the run, in line with another node, then the grid.
 */
import type { PlanPoint } from "./camera.ts";
import { nearestOnDuct } from "./hit-test.ts";
import type { Scene } from "./scene.ts";

export type Snap =
  | { readonly kind: "node"; readonly at: PlanPoint; readonly nodeId: string }
  | { readonly kind: "duct"; readonly at: PlanPoint; readonly segmentId: string; readonly share: number }
  | { readonly kind: "angle"; readonly at: PlanPoint; readonly angle_rad: number; readonly inLineWith: string | null }
  | { readonly kind: "grid"; readonly at: PlanPoint }
  | { readonly kind: "free"; readonly at: PlanPoint };

export interface SnapRequest {
  readonly pointer: PlanPoint;
  /** Where the run being drawn starts; null before the first click. */
  readonly anchor: PlanPoint | null;
  readonly scene: Scene;
  /** How near is near, in meters at the present zoom. */
  readonly reach_m: number;
  readonly grid_m: number;
  /** Held key that lets go of every snap. */
  readonly free: boolean;
  /** What is being dragged must not catch itself. */
  readonly ignoreNodeIds?: ReadonlySet<string>;
  readonly ignoreSegmentIds?: ReadonlySet<string>;
}

const STEP_RAD = Math.PI / 4;

export function snap(request: SnapRequest): Snap {
  const { pointer, anchor, scene, reach_m, grid_m } = request;
  if (request.free) return { kind: "free", at: pointer };
  return (
    nearestNode(request) ??
    nearestDuct(request) ??
    (anchor ? alongAngle(pointer, anchor, scene, reach_m, grid_m) : { kind: "grid", at: onGrid(pointer, grid_m) })
  );
}

function nearestNode({ pointer, scene, reach_m, ignoreNodeIds }: SnapRequest): Snap | null {
  let best: Snap | null = null;
  let bestDistance = reach_m;
  for (const node of scene.nodes) {
    if (ignoreNodeIds?.has(node.id)) continue;
    const distance = Math.hypot(pointer.x_m - node.at.x_m, pointer.y_m - node.at.y_m);
    if (distance <= bestDistance) {
      best = { kind: "node", at: node.at, nodeId: node.id };
      bestDistance = distance;
    }
  }
  return best;
}

function nearestDuct({ pointer, scene, reach_m, ignoreSegmentIds }: SnapRequest): Snap | null {
  let best: Snap | null = null;
  let bestDistance = reach_m;
  for (const duct of scene.ducts) {
    if (duct.vertical || ignoreSegmentIds?.has(duct.id)) continue;
    const near = nearestOnDuct(duct, pointer);
    if (near.share > 0 && near.share < 1 && near.distance_m <= bestDistance) {
      best = { kind: "duct", at: near.at, segmentId: duct.id, share: near.share };
      bestDistance = near.distance_m;
    }
  }
  return best;
}

/** On the ray from the anchor at the nearest multiple of 45°, its length on the grid or in line with another node. */
function alongAngle(pointer: PlanPoint, anchor: PlanPoint, scene: Scene, reach_m: number, grid_m: number): Snap {
  const dx = pointer.x_m - anchor.x_m;
  const dy = pointer.y_m - anchor.y_m;
  const angle_rad = Math.round(Math.atan2(dy, dx) / STEP_RAD) * STEP_RAD;
  const ux = Math.cos(angle_rad);
  const uy = Math.sin(angle_rad);
  const along = Math.max(0, dx * ux + dy * uy);

  let length = grid_m > 0 ? Math.round(along / grid_m) * grid_m : along;
  let inLineWith: string | null = null;
  let nearest = reach_m;
  for (const node of scene.nodes) {
    // The ray meets the node's own horizontal or vertical line here.
    for (const [unit, offset] of [
      [ux, node.at.x_m - anchor.x_m],
      [uy, node.at.y_m - anchor.y_m],
    ] as const) {
      if (Math.abs(unit) < 1e-9) continue;
      const candidate = offset / unit;
      const off = Math.abs(candidate - along);
      if (candidate > 1e-6 && off < nearest) {
        nearest = off;
        length = candidate;
        inLineWith = node.id;
      }
    }
  }
  return {
    kind: "angle",
    at: { x_m: anchor.x_m + ux * length, y_m: anchor.y_m + uy * length },
    angle_rad,
    inLineWith,
  };
}

const onGrid = (point: PlanPoint, grid_m: number): PlanPoint =>
  grid_m > 0 ? { x_m: Math.round(point.x_m / grid_m) * grid_m, y_m: Math.round(point.y_m / grid_m) * grid_m } : point;
