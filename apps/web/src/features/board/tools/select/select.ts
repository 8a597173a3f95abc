/** Select: click picks, Shift adds, a drag of a node moves it. One commit on the drop; Escape puts it back. */
import type { PlanPoint, ScreenPoint } from "../../core/camera.ts";
import type { Hit } from "../../core/hit-test.ts";
import { stay, type BoardEvent, type Step, type World } from "../tool.ts";

export type SelectState =
  | { readonly name: "idle" }
  | { readonly name: "pointing"; readonly hit: Hit | null; readonly pressedAt: ScreenPoint; readonly shift: boolean }
  | { readonly name: "dragging"; readonly nodeId: string; readonly at: PlanPoint };

export const selectIdle: SelectState = { name: "idle" };

/** A hand is not still: less than this is a click. Pixels. */
const DRAG_STARTS_AFTER = 4;

export function selectStep(state: SelectState, event: BoardEvent, world: World): Step<SelectState> {
  switch (state.name) {
    case "idle":
      return idle(event);
    case "pointing":
      return pointing(state, event, world);
    case "dragging":
      return dragging(state, event, world);
  }
}

function idle(event: BoardEvent): Step<SelectState> {
  if (event.type === "pointer-move") return stay(selectIdle, { kind: "hover", hit: event.hit });
  if (event.type === "pointer-down")
    return stay({ name: "pointing", hit: event.hit, pressedAt: event.screen, shift: event.shift });
  if (event.type === "cancel") return stay(selectIdle, { kind: "select", hit: null, add: false });
  return stay(selectIdle);
}

function pointing(state: SelectState & { name: "pointing" }, event: BoardEvent, world: World): Step<SelectState> {
  if (event.type === "pointer-up") return stay(selectIdle, { kind: "select", hit: state.hit, add: state.shift });
  if (event.type === "cancel") return stay(selectIdle);
  if (event.type === "pointer-move" && state.hit?.kind === "node") {
    const moved = Math.hypot(event.screen.x - state.pressedAt.x, event.screen.y - state.pressedAt.y);
    if (moved >= DRAG_STARTS_AFTER) {
      const nodeId = state.hit.id;
      return stay(
        { name: "dragging", nodeId, at: snapped(nodeId, event.plan, world) },
        { kind: "select", hit: state.hit, add: false },
      );
    }
  }
  return stay(state);
}

function dragging(state: SelectState & { name: "dragging" }, event: BoardEvent, world: World): Step<SelectState> {
  if (event.type === "pointer-move") return stay({ ...state, at: snapped(state.nodeId, event.plan, world) });
  if (event.type === "pointer-up") return stay(selectIdle, { kind: "move-node", nodeId: state.nodeId, to: state.at });
  if (event.type === "cancel") return stay(selectIdle);
  return stay(state);
}

const snapped = (nodeId: string, pointer: PlanPoint, world: World): PlanPoint => {
  const snap = world.snap(pointer, { anchor: null, ignoreNodeId: nodeId });
  // A node dropped on another would make a loop; it stops beside it instead.
  return snap.kind === "node" || snap.kind === "duct" ? pointer : snap.at;
};
