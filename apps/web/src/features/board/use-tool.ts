import { useCallback, useRef, useState } from "react";
import type { PlanPoint } from "./core/camera.ts";
import type { Ghost } from "./canvas/paint-board.ts";
import { drawRunIdle, drawRunStep, runEnd, type DrawRunState } from "./tools/draw-run/draw-run.ts";
import { equipmentStep, outletStep, placeIdle, type PlaceState } from "./tools/place/place.ts";
import { selectIdle, selectStep, type SelectState } from "./tools/select/select.ts";
import type { BoardEvent, Intent, Step, World } from "./tools/tool.ts";

export const TOOLS = ["select", "draw-run", "outlet", "equipment"] as const;
export type ToolName = (typeof TOOLS)[number];

type ToolState =
  | { readonly tool: "select"; readonly state: SelectState }
  | {
      readonly tool: "draw-run";
      readonly state: DrawRunState;
      readonly ghost: (width_m: number, lengthOf: (text: string) => number | null) => Ghost | null;
    }
  | { readonly tool: "outlet" | "equipment"; readonly state: PlaceState };

const starts: Readonly<Record<ToolName, ToolState>> = {
  select: { tool: "select", state: selectIdle },
  "draw-run": drawRun(drawRunIdle),
  outlet: { tool: "outlet", state: placeIdle },
  equipment: { tool: "equipment", state: placeIdle },
};

/** Runs the chosen tool: events in, state and intents out. A change of tool starts the other one afresh. */
export function useTool(
  tool: ToolName,
  world: World,
  onIntent: (intent: Intent) => { nodeId: string; at: PlanPoint } | null,
): { state: ToolState; send: (event: BoardEvent) => void } {
  const [state, setState] = useState<ToolState>(starts[tool]);
  const latest = useRef(state);
  const present = state.tool === tool ? state : starts[tool];

  const send = useCallback(
    (event: BoardEvent) => {
      const before = latest.current.tool === tool ? latest.current : starts[tool];
      const { state: after, intents } = stepOf(before, event, world);
      latest.current = after;
      for (const intent of intents) {
        const placed = onIntent(intent);
        if (placed) latest.current = stepOf(latest.current, { type: "placed", ...placed }, world).state;
      }
      setState(latest.current);
    },
    [tool, world, onIntent],
  );
  return { state: present, send };
}

function stepOf(state: ToolState, event: BoardEvent, world: World): Step<ToolState> {
  switch (state.tool) {
    case "select": {
      const next = selectStep(state.state, event, world);
      return { state: { tool: "select", state: next.state }, intents: next.intents };
    }
    case "draw-run": {
      const next = drawRunStep(state.state, event, world);
      return { state: drawRun(next.state), intents: next.intents };
    }
    case "outlet": {
      const next = outletStep(state.state, event, world);
      return { state: { tool: "outlet", state: next.state }, intents: next.intents };
    }
    case "equipment": {
      const next = equipmentStep(state.state, event, world);
      return { state: { tool: "equipment", state: next.state }, intents: next.intents };
    }
  }
}

function drawRun(state: DrawRunState): ToolState & { tool: "draw-run" } {
  return {
    tool: "draw-run",
    state,
    ghost: (width_m, lengthOf) => {
      if (state.name === "idle") return state.snap ? { anchor: null, snap: state.snap, end: null, width_m } : null;
      const end = state.snap ? runEnd(state.anchor, state.snap, lengthOf(state.draft.length)) : null;
      return { anchor: state.anchor, snap: state.snap, end, width_m };
    },
  };
}
