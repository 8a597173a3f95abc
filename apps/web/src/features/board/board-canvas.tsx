import {
  useEffect,
  useLayoutEffect,
  useMemo,
  useRef,
  useState,
  type PointerEvent,
  type ReactNode,
  type RefObject,
} from "react";
import { boundsOf, fit, panBy, toPlan, zoomAt, type Camera, type PlanPoint, type Viewport } from "./core/camera.ts";
import { hitTest } from "./core/hit-test.ts";
import { withNodesAt } from "./core/scene.ts";
import { snap } from "./core/snapping.ts";
import { brushFor } from "./canvas/brush.ts";
import { paintBoard, type Frame, type Ghost } from "./canvas/paint-board.ts";
import { paletteOf } from "./canvas/palette.ts";
import { useTool, type ToolName } from "./use-tool.ts";
import type { DrawRunState } from "./tools/draw-run/draw-run.ts";
import type { Intent, PointerInput, World } from "./tools/tool.ts";

/** Pixels within which a pointer means a thing. */
const REACH = 8;
const WHEEL_ZOOM = 0.0015;

interface BoardCanvasProps extends Omit<Frame, "ghost"> {
  readonly tool: ToolName;
  readonly ghostWidth_m: number;
  /** The typed length of a run, once it is readable. */
  readonly lengthOf: (text: string) => number | null;
  /** Answers the new end of a placed run, so that the next can start there. */
  readonly onIntent: (intent: Intent) => { nodeId: string; at: PlanPoint } | null;
  readonly renderDrawing: (state: DrawRunState & { name: "placing" }, pointed_m: number | null) => ReactNode;
  readonly renderScale: (pixelsPerMeter: number) => ReactNode;
  /** Changes when the view should show everything again. */
  readonly fitKey: string;
  readonly label: string;
}

export function BoardCanvas(props: BoardCanvasProps) {
  const { scene, grid_m, tool, onIntent, fitKey, label } = props;
  const canvas = useRef<HTMLCanvasElement>(null);
  const [viewport, setViewport] = useState<Viewport>({ width: 0, height: 0 });
  const [camera, setCamera] = useState<Camera | null>(null);
  const panning = useRef<{ x: number; y: number } | null>(null);
  const space = useRef(false);
  const free = useRef(false);

  useSize(canvas, setViewport);

  const fitted = useRef("");
  useEffect(() => {
    if (viewport.width === 0 || fitted.current === fitKey) return;
    // The ducts when there are any: a sheet has wide margins.
    const bounds = boundsOf(scene.nodes.length > 1 ? scene.nodes.map(({ at }) => at) : underlayCorners(props.underlay));
    setCamera(fit(bounds ?? { minX_m: 0, minY_m: 0, maxX_m: 30, maxY_m: 20 }, viewport));
    fitted.current = fitKey;
  }, [fitKey, viewport, scene, props.underlay]);

  const world = useMemo<World>(
    () => ({
      nodeAt: (nodeId) => scene.nodes.find(({ id }) => id === nodeId)?.at ?? null,
      snap: (pointer, { anchor, ignoreNodeId }) =>
        snap({
          pointer,
          anchor,
          scene,
          grid_m,
          reach_m: REACH / (camera?.pixelsPerMeter ?? 1),
          free: free.current,
          ignoreNodeIds: new Set(ignoreNodeId ? [ignoreNodeId] : []),
          ignoreSegmentIds: new Set(
            ignoreNodeId
              ? scene.ducts
                  .filter((duct) => duct.fromNodeId === ignoreNodeId || duct.toNodeId === ignoreNodeId)
                  .map(({ id }) => id)
              : [],
          ),
        }),
    }),
    [scene, grid_m, camera],
  );
  const { state, send } = useTool(tool, world, onIntent);

  const moved = state.tool === "select" && state.state.name === "dragging" ? state.state : null;
  const shown = useMemo(
    () => (moved ? withNodesAt(scene, new Map([[moved.nodeId, moved.at]])) : scene),
    [scene, moved],
  );
  const ghost = ghostOf(state, props.ghostWidth_m, props.lengthOf);

  useLayoutEffect(() => {
    const element = canvas.current;
    const context = element?.getContext("2d");
    if (!element || !context || !camera || viewport.width === 0) return;
    const frame = requestAnimationFrame(() => {
      const ratio = window.devicePixelRatio || 1;
      context.setTransform(ratio, 0, 0, ratio, 0, 0);
      paintBoard(brushFor(context, camera, viewport, paletteOf(element)), { ...props, scene: shown, ghost });
    });
    return () => cancelAnimationFrame(frame);
  });

  const input = (event: PointerEvent<HTMLCanvasElement>): PointerInput | null => {
    if (!camera) return null;
    const box = event.currentTarget.getBoundingClientRect();
    const screen = { x: event.clientX - box.left, y: event.clientY - box.top };
    const plan = toPlan(camera, viewport, screen);
    free.current = event.altKey;
    return { plan, screen, hit: hitTest(scene, plan, REACH / camera.pixelsPerMeter), shift: event.shiftKey };
  };

  const drawing = state.tool === "draw-run" && state.state.name === "placing" ? state.state : null;
  const pointed_m = drawing?.snap
    ? Math.hypot(drawing.snap.at.x_m - drawing.anchor.at.x_m, drawing.snap.at.y_m - drawing.anchor.at.y_m)
    : null;

  return (
    <>
      <canvas
        ref={canvas}
        className="absolute inset-0 block size-full touch-none outline-none focus-visible:outline-2 focus-visible:outline-scribe"
        tabIndex={0}
        role="application"
        aria-label={label}
        aria-describedby="board-keys"
        data-tool={tool}
        data-snap={ghost?.snap?.kind ?? ""}
        onPointerDown={(event) => {
          event.currentTarget.focus();
          event.currentTarget.setPointerCapture(event.pointerId);
          if (event.button === 1 || space.current) {
            panning.current = { x: event.clientX, y: event.clientY };
            return;
          }
          const at = input(event);
          if (event.button === 0 && at) send({ type: "pointer-down", ...at });
        }}
        onPointerMove={(event) => {
          if (panning.current) {
            const { x, y } = panning.current;
            panning.current = { x: event.clientX, y: event.clientY };
            setCamera((current) => current && panBy(current, event.clientX - x, event.clientY - y));
            return;
          }
          const at = input(event);
          if (at) send({ type: "pointer-move", ...at });
        }}
        onPointerUp={(event) => {
          if (panning.current) {
            panning.current = null;
            return;
          }
          const at = input(event);
          if (event.button === 0 && at) send({ type: "pointer-up", ...at });
        }}
        onWheel={(event) => {
          const box = event.currentTarget.getBoundingClientRect();
          const pointer = { x: event.clientX - box.left, y: event.clientY - box.top };
          const factor = Math.exp(-event.deltaY * WHEEL_ZOOM);
          setCamera((current) => current && zoomAt(current, viewport, pointer, factor));
        }}
        onKeyDown={(event) => {
          if (event.key === " ") {
            space.current = true;
            event.preventDefault();
            return;
          }
          const view = keyedView(event.key, viewport);
          if (event.ctrlKey || event.metaKey) return;
          if (event.key === "Escape") send({ type: "cancel" });
          else if (view && tool === "select") setCamera((current) => current && view(current));
          else if (tool === "draw-run") {
            send({ type: "key", key: event.key });
            if (state.tool === "draw-run" && state.state.name === "placing") {
              // While a run is drawn the drawing box has the keyboard; nothing else may take the letters.
              event.stopPropagation();
              if (event.key === "Tab" || event.key === "Backspace") event.preventDefault();
            }
          }
        }}
        onKeyUp={(event) => {
          if (event.key === " ") space.current = false;
        }}
      />
      {drawing && props.renderDrawing(drawing, pointed_m)}
      {camera && props.renderScale(camera.pixelsPerMeter)}
    </>
  );
}

function keyedView(key: string, viewport: Viewport): ((camera: Camera) => Camera) | null {
  const center = { x: viewport.width / 2, y: viewport.height / 2 };
  switch (key) {
    case "+":
    case "=":
      return (camera) => zoomAt(camera, viewport, center, 1.25);
    case "-":
      return (camera) => zoomAt(camera, viewport, center, 0.8);
    case "ArrowLeft":
      return (camera) => panBy(camera, 60, 0);
    case "ArrowRight":
      return (camera) => panBy(camera, -60, 0);
    case "ArrowUp":
      return (camera) => panBy(camera, 0, 60);
    case "ArrowDown":
      return (camera) => panBy(camera, 0, -60);
    default:
      return null;
  }
}

function useSize(canvas: RefObject<HTMLCanvasElement | null>, onSize: (viewport: Viewport) => void) {
  useEffect(() => {
    const element = canvas.current;
    if (!element) return;
    const observer = new ResizeObserver(() => {
      const ratio = window.devicePixelRatio || 1;
      const width = element.clientWidth;
      const height = element.clientHeight;
      element.width = Math.round(width * ratio);
      element.height = Math.round(height * ratio);
      onSize({ width, height });
    });
    observer.observe(element);
    return () => observer.disconnect();
  }, [canvas, onSize]);
}

function underlayCorners(underlay: Frame["underlay"]): PlanPoint[] {
  if (!underlay) return [];
  const { x_m, y_m, width, height, metersPerPixel, rotation_rad } = underlay;
  return [
    [0, 0],
    [width, 0],
    [0, height],
    [width, height],
  ].map(([px = 0, py = 0]) => ({
    x_m: x_m + metersPerPixel * (px * Math.cos(rotation_rad) - py * Math.sin(rotation_rad)),
    y_m: y_m + metersPerPixel * (px * Math.sin(rotation_rad) + py * Math.cos(rotation_rad)),
  }));
}

function ghostOf(
  state: ReturnType<typeof useTool>["state"],
  width_m: number,
  lengthOf: (text: string) => number | null,
): Ghost | null {
  if (state.tool === "draw-run") return state.ghost(width_m, lengthOf);
  if (state.tool === "equipment" || state.tool === "outlet")
    return state.state.snap ? { anchor: null, snap: state.state.snap, end: null, width_m } : null;
  return null;
}
