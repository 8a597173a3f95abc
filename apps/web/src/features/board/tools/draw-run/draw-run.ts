/** Run: click where it starts, click where it ends, and go on from there. Typing fills the drawing box meanwhile. */
import type { PlanPoint } from "../../core/camera.ts";
import type { Snap } from "../../core/snapping.ts";
import { stay, type Anchor, type BoardEvent, type RunDraft, type Step, type World } from "../tool.ts";

export const DRAFT_FIELDS = ["length", "size", "airflow"] as const;
export type DraftField = (typeof DRAFT_FIELDS)[number];

export type DrawRunState =
  | { readonly name: "idle"; readonly snap: Snap | null; readonly kept: RunDraft }
  | {
      readonly name: "placing";
      readonly anchor: Anchor;
      readonly snap: Snap | null;
      readonly draft: RunDraft;
      readonly field: DraftField;
    };

const empty: RunDraft = { length: "", size: "", airflow: "" };
export const drawRunIdle: DrawRunState = { name: "idle", snap: null, kept: empty };

export function drawRunStep(state: DrawRunState, event: BoardEvent, world: World): Step<DrawRunState> {
  return state.name === "idle" ? idle(state, event, world) : placing(state, event, world);
}

function idle(state: DrawRunState & { name: "idle" }, event: BoardEvent, world: World): Step<DrawRunState> {
  switch (event.type) {
    case "pointer-move":
      return stay({ ...state, snap: world.snap(event.plan, { anchor: null, ignoreNodeId: null }) });
    case "pointer-down": {
      const anchor = anchorOf(world.snap(event.plan, { anchor: null, ignoreNodeId: null }));
      return anchor
        ? stay({ name: "placing", anchor, snap: null, draft: { ...empty, size: state.kept.size }, field: "length" })
        : stay(state, { kind: "say", message: "Start a run at equipment, a joint or on a duct." });
    }
    case "cancel":
      return stay(drawRunIdle, { kind: "leave-tool" });
    default:
      return stay(state);
  }
}

function placing(state: DrawRunState & { name: "placing" }, event: BoardEvent, world: World): Step<DrawRunState> {
  switch (event.type) {
    case "pointer-move":
      return stay({ ...state, snap: snapFrom(state.anchor, event.plan, world) });
    case "pointer-down":
      return place({ ...state, snap: snapFrom(state.anchor, event.plan, world) });
    case "placed":
      // The next length starts where this one ended; the size is said once, the airflow belonged to the outlet.
      return stay({
        name: "placing",
        anchor: { kind: "node", nodeId: event.nodeId, at: event.at },
        snap: null,
        draft: { ...empty, size: state.draft.size },
        field: "length",
      });
    case "key":
      return typed(state, event.key);
    case "cancel":
      return stay({ name: "idle", snap: null, kept: state.draft });
    case "pointer-up":
      return stay(state);
  }
}

function place(state: DrawRunState & { name: "placing" }): Step<DrawRunState> {
  if (!state.snap) return stay(state);
  return stay(state, { kind: "place-run", anchor: state.anchor, to: state.snap, draft: state.draft });
}

function typed(state: DrawRunState & { name: "placing" }, key: string): Step<DrawRunState> {
  const text = state.draft[state.field];
  if (key === "Enter") return place(state);
  if (key === "Tab") {
    const next = DRAFT_FIELDS[(DRAFT_FIELDS.indexOf(state.field) + 1) % DRAFT_FIELDS.length] ?? "length";
    return stay({ ...state, field: next });
  }
  if (key === "Backspace") return stay({ ...state, draft: { ...state.draft, [state.field]: text.slice(0, -1) } });
  if (key.length === 1) return stay({ ...state, draft: { ...state.draft, [state.field]: text + key } });
  return stay(state);
}

const snapFrom = (anchor: Anchor, pointer: PlanPoint, world: World): Snap =>
  world.snap(pointer, { anchor: anchor.at, ignoreNodeId: anchor.kind === "node" ? anchor.nodeId : null });

function anchorOf(snap: Snap): Anchor | null {
  if (snap.kind === "node") return { kind: "node", nodeId: snap.nodeId, at: snap.at };
  if (snap.kind === "duct") return { kind: "duct", segmentId: snap.segmentId, share: snap.share, at: snap.at };
  return null;
}

/** Where the run will end: as pointed, or the typed length along the pointed direction. */
export function runEnd(anchor: Anchor, snap: Snap, length_m: number | null): PlanPoint {
  if (length_m === null) return snap.at;
  const dx = snap.at.x_m - anchor.at.x_m;
  const dy = snap.at.y_m - anchor.at.y_m;
  const distance = Math.hypot(dx, dy);
  if (distance === 0) return { x_m: anchor.at.x_m + length_m, y_m: anchor.at.y_m };
  return { x_m: anchor.at.x_m + (dx / distance) * length_m, y_m: anchor.at.y_m + (dy / distance) * length_m };
}
