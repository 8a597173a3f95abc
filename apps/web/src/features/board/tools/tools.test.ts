import { describe, expect, it } from "vitest";
import { drawRunIdle, drawRunStep, runEnd, type DrawRunState } from "./draw-run/draw-run.ts";
import { outletStep, placeIdle } from "./place/place.ts";
import { selectIdle, selectStep, type SelectState } from "./select/select.ts";
import type { BoardEvent, Intent, PointerInput, Step, World } from "./tool.ts";

const world: World = {
  nodeAt: () => null,
  snap: (pointer) =>
    pointer.x_m === 0
      ? { kind: "node", at: pointer, nodeId: "start" }
      : pointer.x_m === 1
        ? { kind: "duct", at: pointer, segmentId: "main", share: 0.5 }
        : { kind: "grid", at: { x_m: Math.round(pointer.x_m), y_m: Math.round(pointer.y_m) } },
};
const at = (x_m: number, y_m: number, extra: Partial<PointerInput> = {}): PointerInput => ({
  plan: { x_m, y_m },
  screen: { x: x_m * 100, y: y_m * 100 },
  hit: null,
  shift: false,
  ...extra,
});

function run<State>(
  step: (state: State, event: BoardEvent, world: World) => Step<State>,
  start: State,
  events: BoardEvent[],
): { state: State; intents: Intent[] } {
  let state = start;
  const intents: Intent[] = [];
  for (const event of events) {
    const next = step(state, event, world);
    state = next.state;
    intents.push(...next.intents);
  }
  return { state, intents };
}

describe("select", () => {
  const hit = { kind: "node", id: "n1" } as const;

  it("picks what was clicked", () => {
    const { intents } = run<SelectState>(selectStep, selectIdle, [
      { type: "pointer-down", ...at(5, 5, { hit }) },
      { type: "pointer-up", ...at(5, 5, { hit }) },
    ]);
    expect(intents).toEqual([{ kind: "select", hit, add: false }]);
  });

  it("moves a dragged node once, on the drop", () => {
    const { intents } = run<SelectState>(selectStep, selectIdle, [
      { type: "pointer-down", ...at(5, 5, { hit }) },
      { type: "pointer-move", ...at(6.2, 5) },
      { type: "pointer-move", ...at(7.4, 5.1) },
      { type: "pointer-up", ...at(7.4, 5.1) },
    ]);
    expect(intents.filter((intent) => intent.kind === "move-node")).toEqual([
      { kind: "move-node", nodeId: "n1", to: { x_m: 7, y_m: 5 } },
    ]);
  });

  it("forgets the drag when it is cancelled", () => {
    const { state, intents } = run<SelectState>(selectStep, selectIdle, [
      { type: "pointer-down", ...at(5, 5, { hit }) },
      { type: "pointer-move", ...at(7, 5) },
      { type: "cancel" },
    ]);
    expect(state).toEqual(selectIdle);
    expect(intents.some((intent) => intent.kind === "move-node")).toBe(false);
  });

  it("takes a trembling hand for a click", () => {
    const { intents } = run<SelectState>(selectStep, selectIdle, [
      { type: "pointer-down", ...at(5, 5, { hit }) },
      { type: "pointer-move", ...at(5.02, 5) },
      { type: "pointer-up", ...at(5.02, 5) },
    ]);
    expect(intents).toEqual([{ kind: "select", hit, add: false }]);
  });
});

describe("draw run", () => {
  it("will not start in the air", () => {
    const { state, intents } = run<DrawRunState>(drawRunStep, drawRunIdle, [{ type: "pointer-down", ...at(5, 5) }]);
    expect(state.name).toBe("idle");
    expect(intents).toMatchObject([{ kind: "say" }]);
  });

  it("places from click to click and goes on from the new end", () => {
    const { state, intents } = run<DrawRunState>(drawRunStep, drawRunIdle, [
      { type: "pointer-down", ...at(0, 0) },
      { type: "pointer-move", ...at(6, 0) },
      { type: "pointer-down", ...at(6, 0) },
      { type: "placed", nodeId: "end", at: { x_m: 6, y_m: 0 } },
    ]);
    expect(intents).toMatchObject([{ kind: "place-run", anchor: { kind: "node", nodeId: "start" } }]);
    expect(state).toMatchObject({ name: "placing", anchor: { nodeId: "end" } });
  });

  it("starts a tap on a duct", () => {
    const { state } = run<DrawRunState>(drawRunStep, drawRunIdle, [{ type: "pointer-down", ...at(1, 3) }]);
    expect(state).toMatchObject({ anchor: { kind: "duct", segmentId: "main", share: 0.5 } });
  });

  it("types a length and a size, places with Enter, keeps the size for the next", () => {
    const keys = ["1", "2", "'", "Tab", "2", "4", "x", "1", "2", "Enter"];
    const { state, intents } = run<DrawRunState>(drawRunStep, drawRunIdle, [
      { type: "pointer-down", ...at(0, 0) },
      { type: "pointer-move", ...at(6, 0) },
      ...keys.map((key): BoardEvent => ({ type: "key", key })),
      { type: "placed", nodeId: "end", at: { x_m: 6, y_m: 0 } },
    ]);
    expect(intents).toMatchObject([{ kind: "place-run", draft: { length: "12'", size: "24x12", airflow: "" } }]);
    expect(state).toMatchObject({ draft: { length: "", size: "24x12" }, field: "length" });
  });

  it("drops the run on Escape, and leaves the tool on the second", () => {
    const { state, intents } = run<DrawRunState>(drawRunStep, drawRunIdle, [
      { type: "pointer-down", ...at(0, 0) },
      { type: "cancel" },
      { type: "cancel" },
    ]);
    expect(state).toEqual(drawRunIdle);
    expect(intents).toEqual([{ kind: "leave-tool" }]);
  });

  it("ends at the typed length in the pointed direction", () => {
    const end = runEnd(
      { kind: "node", nodeId: "n", at: { x_m: 1, y_m: 1 } },
      { kind: "free", at: { x_m: 4, y_m: 5 } },
      10,
    );
    expect(end).toEqual({ x_m: 7, y_m: 9 });
  });
});

describe("outlet", () => {
  it("stands at the end of a run only", () => {
    expect(outletStep(placeIdle, { type: "pointer-down", ...at(0, 2) }, world).intents).toEqual([
      { kind: "set-outlet", nodeId: "start" },
    ]);
    expect(outletStep(placeIdle, { type: "pointer-down", ...at(5, 2) }, world).intents).toMatchObject([
      { kind: "say" },
    ]);
  });
});
