/** What lies under a point of the plan. Nodes win over ducts, since they are smaller; the nearest wins among equals. */
import type { PlanPoint } from "./camera.ts";
import type { Scene, SceneDuct } from "./scene.ts";

export type Hit = { readonly kind: "node" | "segment"; readonly id: string };

/** Nearest point of a duct's center line, and how far along it lies (0 at the end nearer the equipment). */
export function nearestOnDuct(
  duct: Pick<SceneDuct, "from" | "to">,
  point: PlanPoint,
): { at: PlanPoint; share: number; distance_m: number } {
  const dx = duct.to.x_m - duct.from.x_m;
  const dy = duct.to.y_m - duct.from.y_m;
  const length2 = dx * dx + dy * dy;
  const raw = length2 === 0 ? 0 : ((point.x_m - duct.from.x_m) * dx + (point.y_m - duct.from.y_m) * dy) / length2;
  const share = Math.min(1, Math.max(0, raw));
  const at = { x_m: duct.from.x_m + share * dx, y_m: duct.from.y_m + share * dy };
  return { at, share, distance_m: Math.hypot(point.x_m - at.x_m, point.y_m - at.y_m) };
}

/** `reach_m` is how far off a pointer may be: some pixels, in meters at the present zoom. */
export function hitTest(scene: Scene, point: PlanPoint, reach_m: number): Hit | null {
  let best: Hit | null = null;
  let bestDistance = reach_m;
  for (const node of scene.nodes) {
    const distance = Math.hypot(point.x_m - node.at.x_m, point.y_m - node.at.y_m);
    if (distance <= bestDistance) {
      best = { kind: "node", id: node.id };
      bestDistance = distance;
    }
  }
  if (best) return best;
  bestDistance = Infinity;
  for (const duct of scene.ducts) {
    const { distance_m } = nearestOnDuct(duct, point);
    if (distance_m <= Math.max(duct.width_m / 2, reach_m) && distance_m < bestDistance) {
      best = { kind: "segment", id: duct.id };
      bestDistance = distance_m;
    }
  }
  return best;
}
