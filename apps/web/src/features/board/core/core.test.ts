import * as fc from "fast-check";
import { describe, expect, it } from "vitest";
import { fit, toPlan, toScreen, zoomAt, type Camera, type Viewport } from "./camera.ts";
import { hitTest } from "./hit-test.ts";
import { LabelField, uprightTurn } from "./labels.ts";
import type { Scene, SceneDuct } from "./scene.ts";
import { withNodesAt } from "./scene.ts";
import { snap } from "./snapping.ts";

const viewport: Viewport = { width: 1000, height: 600 };
const cameras = fc.record({
  x_m: fc.double({ min: -500, max: 500, noNaN: true }),
  y_m: fc.double({ min: -500, max: 500, noNaN: true }),
  pixelsPerMeter: fc.double({ min: 1, max: 400, noNaN: true }),
});
const pointers = fc.record({
  x: fc.double({ min: 0, max: 1000, noNaN: true }),
  y: fc.double({ min: 0, max: 600, noNaN: true }),
});

const duct = (id: string, from: [number, number], to: [number, number], width_m = 0.4): SceneDuct => ({
  id,
  systemId: "sys",
  service: "supply",
  ductClass: "main",
  from: { x_m: from[0], y_m: from[1] },
  to: { x_m: to[0], y_m: to[1] },
  fromNodeId: `${id}-from`,
  toNodeId: `${id}-to`,
  section: null,
  width_m,
  flexible: false,
  vertical: false,
});
const scene: Scene = {
  ducts: [duct("a", [0, 0], [10, 0]), duct("b", [10, 0], [10, 8], 0.2)],
  nodes: [
    {
      id: "n0",
      systemId: "sys",
      service: "supply",
      role: "equipment",
      tag: "AH-1",
      at: { x_m: 0, y_m: 0 },
      airflow_m3s: null,
    },
    {
      id: "n1",
      systemId: "sys",
      service: "supply",
      role: "outlet",
      tag: "D-1",
      at: { x_m: 10, y_m: 8 },
      airflow_m3s: 0.1,
    },
  ],
};
const request = { scene, reach_m: 0.2, grid_m: 0.1, free: false };

describe("camera", () => {
  it("takes a point to the screen and back", () => {
    fc.assert(
      fc.property(cameras, pointers, (camera, pointer) => {
        const back = toScreen(camera, viewport, toPlan(camera, viewport, pointer));
        expect(back.x).toBeCloseTo(pointer.x, 6);
        expect(back.y).toBeCloseTo(pointer.y, 6);
      }),
    );
  });

  it("keeps the plan point under the pointer while zooming", () => {
    fc.assert(
      fc.property(
        cameras,
        pointers,
        fc.double({ min: 0.5, max: 2, noNaN: true }),
        (camera: Camera, pointer, factor) => {
          const before = toPlan(camera, viewport, pointer);
          const after = toPlan(zoomAt(camera, viewport, pointer, factor), viewport, pointer);
          expect(after.x_m).toBeCloseTo(before.x_m, 6);
          expect(after.y_m).toBeCloseTo(before.y_m, 6);
        },
      ),
    );
  });

  it("fits bounds inside the margin", () => {
    const camera = fit({ minX_m: 0, minY_m: 0, maxX_m: 40, maxY_m: 10 }, viewport, 50);
    expect(toScreen(camera, viewport, { x_m: 0, y_m: 0 }).x).toBeCloseTo(50);
    expect(toScreen(camera, viewport, { x_m: 40, y_m: 10 }).x).toBeCloseTo(950);
  });
});

describe("hit test", () => {
  it("finds a duct within its true width", () => {
    expect(hitTest(scene, { x_m: 5, y_m: 0.19 }, 0.05)).toEqual({ kind: "segment", id: "a" });
    expect(hitTest(scene, { x_m: 5, y_m: 0.21 }, 0.05)).toBeNull();
  });

  it("prefers a node to the duct under it", () => {
    expect(hitTest(scene, { x_m: 0.05, y_m: 0 }, 0.1)).toEqual({ kind: "node", id: "n0" });
  });
});

describe("snapping", () => {
  it("catches a node first", () => {
    expect(snap({ ...request, pointer: { x_m: 9.9, y_m: 7.95 }, anchor: null })).toMatchObject({
      kind: "node",
      nodeId: "n1",
    });
  });

  it("catches the center line of a duct, where a tap would be", () => {
    expect(snap({ ...request, pointer: { x_m: 4, y_m: 0.15 }, anchor: { x_m: 4, y_m: 5 } })).toMatchObject({
      kind: "duct",
      segmentId: "a",
      share: 0.4,
    });
  });

  it("holds a run to multiples of 45 degrees from its start", () => {
    fc.assert(
      fc.property(
        fc.double({ min: 20, max: 40, noNaN: true }),
        fc.double({ min: 20, max: 40, noNaN: true }),
        (x_m, y_m) => {
          const anchor = { x_m: 30, y_m: 30 };
          const { at } = snap({ ...request, scene: { ducts: [], nodes: [] }, pointer: { x_m, y_m }, anchor });
          const dx = Math.abs(at.x_m - anchor.x_m);
          const dy = Math.abs(at.y_m - anchor.y_m);
          expect(Math.min(dx, dy, Math.abs(dx - dy))).toBeLessThan(1e-9);
        },
      ),
    );
  });

  it("ends a run in line with another node", () => {
    const found = snap({ ...request, pointer: { x_m: 20.1, y_m: 8.1 }, anchor: { x_m: 20, y_m: 3 } });
    expect(found).toMatchObject({ kind: "angle", inLineWith: "n1" });
    expect(found.at.y_m).toBeCloseTo(8, 9);
  });

  it("lets go of everything when held free", () => {
    const pointer = { x_m: 9.93, y_m: 7.97 };
    expect(snap({ ...request, free: true, pointer, anchor: null })).toEqual({ kind: "free", at: pointer });
  });
});

describe("labels", () => {
  it("never lets two placed labels overlap", () => {
    const box = fc.record({
      x: fc.double({ min: 0, max: 800, noNaN: true }),
      y: fc.double({ min: 0, max: 500, noNaN: true }),
      width: fc.double({ min: 10, max: 120, noNaN: true }),
      height: fc.constant(14),
      turn: fc.constant(0),
    });
    fc.assert(
      fc.property(fc.array(box, { maxLength: 60 }), (boxes) => {
        const field = new LabelField();
        const placed = boxes.filter((candidate) => field.place(candidate));
        for (const [i, a] of placed.entries()) {
          for (const b of placed.slice(i + 1)) {
            const apart = Math.abs(a.x - b.x) >= (a.width + b.width) / 2 || Math.abs(a.y - b.y) >= 14;
            expect(apart).toBe(true);
          }
        }
      }),
    );
  });

  it("keeps text upright", () => {
    fc.assert(
      fc.property(fc.double({ min: -10, max: 10, noNaN: true }), (angle) => {
        const turn = uprightTurn(angle);
        expect(turn).toBeGreaterThanOrEqual(-Math.PI / 2 - 1e-6);
        expect(turn).toBeLessThan(Math.PI / 2);
      }),
    );
  });
});

describe("drag preview", () => {
  it("moves a node with the ends of its ducts and leaves the rest as it was", () => {
    const moved = withNodesAt(scene, new Map([["a-to", { x_m: 10, y_m: 1 }]]));
    expect(moved.ducts[0]?.to).toEqual({ x_m: 10, y_m: 1 });
    expect(moved.ducts[1]).toBe(scene.ducts[1]);
  });
});
