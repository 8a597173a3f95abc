import { formatAirflow, formatSize, meters, parseLength, cubicMetersPerSecond } from "@cleatwork/calc";
import type { Drawing } from "@cleatwork/contracts";
import { find, moveNode, placeEquipment, setNodes } from "@cleatwork/layout";
import { useCallback, useEffect, useMemo, useState } from "react";
import { notify } from "../../ui/toast.tsx";
import { browserIds, useWorkspace } from "../workspace/index.ts";
import { BoardCanvas } from "./board-canvas.tsx";
import type { Pin } from "./canvas/paint-pins.ts";
import { DrawingBox } from "./drawing-box.tsx";
import { heatShare, type Heat } from "./heat.ts";
import { placeRun } from "./place-run.ts";
import { planWidth, sceneOf } from "./core/scene.ts";
import { ScaleBar } from "./scale-bar.tsx";
import { TOOL_KEYS, ToolBar } from "./tool-bar.tsx";
import type { Intent } from "./tools/tool.ts";
import { useUnderlay } from "./use-underlay.ts";
import type { ToolName } from "./use-tool.ts";

/** Duct stands at this height above the floor until it is said otherwise: over a ceiling at nine feet. Common practice. */
const USUAL_HEIGHT_M = meters(3);

interface BoardViewProps {
  readonly levelId: string;
  /** Where new equipment and runs go, and which system stands out. */
  readonly systemId: string | null;
  readonly ground: "dye" | "paper";
  readonly heat: Heat;
  readonly drawings: readonly Drawing[];
}

export function BoardView({ levelId, systemId, ground, heat, drawings }: BoardViewProps) {
  const workspace = useWorkspace();
  const { layout, numbers, selection, units, company, project, run, store, mayEdit } = workspace;
  const [tool, setTool] = useState<ToolName>("select");
  const level = find(layout, "level", levelId);
  const { painted, failed } = useUnderlay(company.slug, project.id, level?.underlay ?? null, drawings);
  useToolKeys(setTool, mayEdit);

  const scene = useMemo(
    () => sceneOf(layout.records.values(), levelId, (id) => workspace.solvedOf(id)?.section ?? null),
    [layout, levelId, workspace],
  );
  const pins = usePins(scene);
  const governing = useMemo(() => governingIds(numbers, systemId), [numbers, systemId]);

  const heatOf = useMemo(
    () =>
      heat === "off"
        ? null
        : (segmentId: string) => {
            const solved = workspace.solvedOf(segmentId);
            const segment = find(layout, "segment", segmentId);
            const system = segment && find(layout, "system", segment.systemId);
            return solved && segment && system ? heatShare(heat, solved, segment, system) : null;
          },
    [heat, workspace, layout],
  );

  const onIntent = useCallback(
    (intent: Intent): { nodeId: string; at: { x_m: number; y_m: number } } | null => {
      switch (intent.kind) {
        case "hover":
          selection.hover(intent.hit?.id ?? null);
          return null;
        case "select":
          selection.select(intent.hit?.id ?? null, { add: intent.add });
          return null;
        case "say":
          notify(intent.message);
          return null;
        case "leave-tool":
          setTool("select");
          return null;
        case "move-node":
          if (mayEdit) run((now) => moveNode(now, { id: intent.nodeId, ...intent.to }));
          return null;
        case "place-equipment":
          if (systemId === null) notify("Add a system first.", { severity: "warn" });
          else
            run((now) =>
              placeEquipment(
                now,
                {
                  systemId,
                  levelId,
                  tag: "AH",
                  x_m: meters(intent.at.x_m),
                  y_m: meters(intent.at.y_m),
                  elevation_m: USUAL_HEIGHT_M,
                },
                browserIds,
              ),
            );
          return null;
        case "set-outlet":
          run((now) => setNodes(now, { ids: [intent.nodeId], fields: { role: "outlet" }, label: "Make outlet" }));
          selection.select(intent.nodeId);
          setTool("select");
          return null;
        case "place-run": {
          const placed = placeRun(store.getState().layout, { ...intent, units }, browserIds);
          if (!placed.ok) {
            notify(placed.message, { severity: "warn" });
            return null;
          }
          const applied = store.apply(placed.value.set);
          if (!applied.ok) {
            notify(applied.message, { severity: "warn" });
            return null;
          }
          // An outlet ends the run: the next one starts elsewhere.
          return placed.value.isOutlet ? null : placed.value;
        }
      }
    },
    [selection, run, store, systemId, levelId, units, mayEdit],
  );

  const texts = useMemo(
    () => ({
      ofDuct: ({ section, id }: { section: Parameters<typeof formatSize>[0] | null; id: string }) => {
        const airflow = workspace.solvedOf(id)?.volumetricFlowRate_m3s;
        return section === null
          ? ""
          : `${formatSize(section, units).text}${airflow ? `  ${formatAirflow(airflow, units).value}` : ""}`;
      },
      ofNode: (node: { tag: string; role: string; airflow_m3s: number | null }) =>
        node.role === "outlet" && node.airflow_m3s !== null
          ? formatAirflow(cubicMetersPerSecond(node.airflow_m3s), units).value
          : node.tag,
    }),
    [workspace, units],
  );
  const selectedSection = selection.primary ? (workspace.solvedOf(selection.primary)?.section ?? null) : null;

  return (
    <div className="relative min-h-0 min-w-0 grow bg-b-ground" data-ground={ground} data-testid="board">
      <BoardCanvas
        scene={scene}
        marks={{ selected: selection.ids, hovered: selection.hovered, governing, heatOf, activeSystemId: systemId }}
        texts={texts}
        pins={pins}
        underlay={painted}
        ground={ground}
        grid_m={units === "si" ? 0.1 : 0.0762}
        tool={tool}
        ghostWidth_m={planWidth(selectedSection)}
        lengthOf={(text) => lengthOf(text, units)}
        onIntent={onIntent}
        fitKey={`${levelId} ${scene.nodes.length > 1 || painted !== null}`}
        label={`Plan of ${level?.name ?? "the level"}. The schedule shows the same ducts as a table.`}
        renderDrawing={(state, pointed_m) => <DrawingBox state={state} pointed_m={pointed_m} units={units} />}
        renderScale={(pixelsPerMeter) => <ScaleBar pixelsPerMeter={pixelsPerMeter} units={units} />}
      />
      {mayEdit && <ToolBar tool={tool} onChoose={setTool} />}
      <p id="board-keys" className="sr-only">
        V select, R run, O outlet, E equipment, plus and minus zoom, arrows pan, Escape lets go. Everything can also be
        done in the schedule.
      </p>
      {failed && (
        <p className="absolute right-3 top-3 border border-b-float-line bg-b-float px-3 py-1.5 text-b-float-ink">
          The drawing could not be shown.
        </p>
      )}
      {scene.nodes.length === 0 && (
        <p className="pointer-events-none absolute inset-x-0 top-1/3 text-center text-b-label">
          {systemId === null
            ? "Add a system to begin: its equipment is where the first run starts."
            : "Place the equipment (E), then draw runs from it (R)."}
        </p>
      )}
    </div>
  );
}

const lengthOf = (text: string, units: Parameters<typeof parseLength>[1]): number | null => {
  if (text.trim() === "") return null;
  const parsed = parseLength(text, units);
  return parsed.ok ? parsed.value : null;
};

function governingIds(
  numbers: ReturnType<typeof useWorkspace>["numbers"],
  systemId: string | null,
): ReadonlySet<string> {
  const ids = new Set<string>();
  for (const solution of numbers?.solutions ?? []) {
    if (systemId !== null && solution.systemId !== systemId) continue;
    const path = solution.paths.find(({ outletNodeId }) => outletNodeId === solution.governingOutletNodeId);
    for (const id of path?.segmentIds ?? []) ids.add(id);
  }
  return ids;
}

/** Findings that stop or warn, at the middle of their duct or on their node. */
function usePins(scene: ReturnType<typeof sceneOf>): readonly Pin[] {
  const { numbers } = useWorkspace();
  return useMemo(() => {
    const places = new Map<string, Pin["at"]>([
      ...scene.ducts.map(({ id, from, to }): [string, Pin["at"]] => [
        id,
        { x_m: (from.x_m + to.x_m) / 2, y_m: (from.y_m + to.y_m) / 2 },
      ]),
      ...scene.nodes.map(({ id, at }): [string, Pin["at"]] => [id, at]),
    ]);
    const found = [
      ...(numbers?.solutions ?? []).flatMap(({ findings }) =>
        findings.map(({ severity, subject }) => ({ severity, id: subject.id })),
      ),
      ...(numbers?.problems ?? []).map(({ subject }) => ({ severity: "stop" as const, id: subject.id })),
    ];
    return found.flatMap(({ severity, id }) => {
      const at = places.get(id);
      return at && severity !== "note" ? [{ at, severity }] : [];
    });
  }, [scene, numbers]);
}

function useToolKeys(setTool: (tool: ToolName) => void, mayEdit: boolean) {
  useEffect(() => {
    if (!mayEdit) return;
    const onKey = (event: KeyboardEvent) => {
      const typing =
        event.target instanceof HTMLElement && event.target.matches("input, textarea, select, [role=gridcell]");
      const tool = TOOL_KEYS[event.key.toLowerCase()];
      if (tool && !typing && !event.ctrlKey && !event.metaKey && !event.altKey) setTool(tool);
    };
    window.addEventListener("keydown", onKey);
    return () => window.removeEventListener("keydown", onKey);
  }, [setTool, mayEdit]);
}
