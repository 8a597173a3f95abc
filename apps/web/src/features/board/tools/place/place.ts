/** Tools of one click: put equipment down, make the end of a run an outlet. */
import type { Snap } from "../../core/snapping.ts";
import { stay, type BoardEvent, type Step, type World } from "../tool.ts";

export interface PlaceState {
  readonly snap: Snap | null;
}
export const placeIdle: PlaceState = { snap: null };

export function equipmentStep(state: PlaceState, event: BoardEvent, world: World): Step<PlaceState> {
  switch (event.type) {
    case "pointer-move":
      return stay({ snap: world.snap(event.plan, { anchor: null, ignoreNodeId: null }) });
    case "pointer-down":
      return stay(
        placeIdle,
        { kind: "place-equipment", at: world.snap(event.plan, { anchor: null, ignoreNodeId: null }).at },
        { kind: "leave-tool" },
      );
    case "cancel":
      return stay(placeIdle, { kind: "leave-tool" });
    default:
      return stay(state);
  }
}

export function outletStep(state: PlaceState, event: BoardEvent, world: World): Step<PlaceState> {
  switch (event.type) {
    case "pointer-move":
      return stay({ snap: world.snap(event.plan, { anchor: null, ignoreNodeId: null }) });
    case "pointer-down": {
      const snap = world.snap(event.plan, { anchor: null, ignoreNodeId: null });
      return snap.kind === "node"
        ? stay(placeIdle, { kind: "set-outlet", nodeId: snap.nodeId })
        : stay(state, { kind: "say", message: "An outlet stands at the end of a run: click that end." });
    }
    case "cancel":
      return stay(placeIdle, { kind: "leave-tool" });
    default:
      return stay(state);
  }
}
