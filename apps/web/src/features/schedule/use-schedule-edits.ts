import { meters, METERS_PER_FOOT } from "@cleatwork/calc";
import type { ChangeSet } from "@cleatwork/contracts";
import {
  applyChangeSet,
  copyBranch,
  extendRun,
  find,
  merge,
  removeBranches,
  type CommandResult,
  type Layout,
  type Turn,
} from "@cleatwork/layout";
import type { Dispatch, SetStateAction } from "react";
import { notify } from "../../ui/toast.tsx";
import { browserIds, useWorkspace } from "../workspace/index.ts";
import type { ScheduleColumn, ScheduleRow, Sheet } from "./columns.ts";
import { marked, type GridState } from "./grid-state.ts";

/** A new duct is this long until its length is said. */
const NEW_LENGTH_M = meters(10 * METERS_PER_FOOT);

/** What can be done with the row under the cursor and the cells that are marked; each is one step of undo. */
export function useScheduleEdits({
  systemId,
  rows,
  columns,
  sheet,
  grid,
  setGrid,
}: {
  systemId: string;
  rows: readonly ScheduleRow[];
  columns: readonly ScheduleColumn[];
  sheet: Sheet;
  grid: GridState;
  setGrid: Dispatch<SetStateAction<GridState>>;
}) {
  const { layout, index, selection, run, store, mayEdit } = useWorkspace();
  const active = rows[grid.active.row];

  const applyAll = (label: string, commands: readonly ((now: Layout) => CommandResult)[]) => {
    let now = store.getState().layout;
    const sets: ChangeSet[] = [];
    for (const command of commands) {
      const result = command(now);
      if (!result.ok) {
        if (result.problems[0]?.code === "nothing-changes") continue;
        return notify(result.problems[0]?.message ?? "", { severity: "warn" });
      }
      const applied = applyChangeSet(now, result.value);
      if (!applied.ok) return;
      now = applied.value;
      sets.push(result.value);
    }
    if (sets.length > 0) store.apply(merge(label, sets));
  };

  const fillDown = () => {
    const { top, bottom, left, right } = marked(grid);
    const source = rows[top];
    if (!source || bottom === top) return notify("Mark the cells to fill first: Shift and the arrows.");
    const commands = rows.slice(top + 1, bottom + 1).flatMap((row) =>
      columns.slice(left, right + 1).flatMap((each) => {
        const typed = each.type?.(row, each.text(source, sheet), sheet);
        return typed?.ok ? [typed.command] : [];
      }),
    );
    applyAll("Fill down", commands);
  };

  const clear = () => {
    const { top, bottom, left, right } = marked(grid);
    const commands = rows.slice(top, bottom + 1).flatMap((row) =>
      columns.slice(left, right + 1).flatMap((each) => {
        const typed = each.id === "length" || each.id === "class" ? undefined : each.type?.(row, "", sheet);
        return typed?.ok ? [typed.command] : [];
      }),
    );
    applyAll("Clear", commands);
  };

  const addDuct = (turn: Turn, from: "end" | "start") => {
    if (!mayEdit) return;
    const equipment = [...index.equipmentOf.values()].find((node) => node.systemId === systemId);
    const end = active && find(layout, "node", active.segment.toNodeId);
    const fromNodeId = !active
      ? equipment?.id
      : from === "start" || end?.role === "outlet"
        ? active.segment.fromNodeId
        : active.segment.toNodeId;
    if (!fromNodeId) return notify("Place the equipment on the board first.");
    const result = extendRun(
      store.getState().layout,
      {
        fromNodeId,
        to: { kind: "length", length_m: NEW_LENGTH_M, turn: from === "start" && turn === "straight" ? "right" : turn },
        duct: from === "start" ? { ductClass: "branch" } : {},
        outlet: null,
      },
      browserIds,
    );
    if (!result.ok) return notify(result.problems[0]?.message ?? "", { severity: "warn" });
    store.apply(result.value);
    const added = result.value.changes.find(({ after }) => after?.kind === "segment");
    if (added) selection.select(added.id);
    setGrid((before) => ({
      ...before,
      active: { ...before.active, column: columns.findIndex(({ id }) => id === "length") },
      anchor: before.active,
      editing: null,
    }));
  };

  const duplicate = () => {
    if (!active) return;
    const from = find(layout, "node", active.segment.fromNodeId);
    const to = find(layout, "node", active.segment.toNodeId);
    const upright = from && to && Math.abs(to.y_m - from.y_m) >= Math.abs(to.x_m - from.x_m);
    run((now) =>
      copyBranch(
        now,
        {
          segmentId: active.segment.id,
          toNodeId: active.segment.fromNodeId,
          mirror: upright ? "up-down" : "left-right",
        },
        browserIds,
      ),
    );
  };

  const remove = () => {
    const { top, bottom } = marked(grid);
    const ids = rows.slice(top, bottom + 1).map(({ segment }) => segment.id);
    if (ids.length === 0) return;
    const answer = run((now) => removeBranches(now, { segmentIds: ids.filter((id) => now.records.has(id)) }));
    if (answer.ok)
      notify(ids.length === 1 ? "Duct removed, with what hung on it." : "Ducts removed, with what hung on them.", {
        undo: () => store.undo(),
      });
  };

  return { fillDown, clear, addDuct, duplicate, remove };
}
