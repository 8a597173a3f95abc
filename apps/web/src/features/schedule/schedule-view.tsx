import { formatAirflow, formatWeight, kilograms, cubicMetersPerSecond } from "@cleatwork/calc";
import { find } from "@cleatwork/layout";
import { useVirtualizer } from "@tanstack/react-virtual";
import { useEffect, useId, useMemo, useRef, useState, type ClipboardEvent, type KeyboardEvent } from "react";
import { classNames } from "../../lib/class-names.ts";
import { Button } from "../../ui/button.tsx";
import { EmptyState } from "../../ui/empty-state.tsx";
import { KeyCap } from "../../ui/key-cap.tsx";
import { SeverityMark } from "../../ui/severity.tsx";
import { notify } from "../../ui/toast.tsx";
import { useWorkspace } from "../workspace/index.ts";
import { columnsFor, type Sheet } from "./columns.ts";
import { edit, gridStart, marked, moveBy, moveTo, stopEditing, tab, type GridState } from "./grid-state.ts";
import { ROW_HEIGHT, ScheduleLine } from "./schedule-line.tsx";
import { useScheduleEdits } from "./use-schedule-edits.ts";
import { PasteDialog } from "./paste-dialog.tsx";
import { useScheduleRows } from "./use-schedule-rows.ts";

/** The same tree as on the board, as a grid for people who work from paper: everything by keyboard. */
export function ScheduleView({ systemId }: { systemId: string }) {
  const workspace = useWorkspace();
  const { layout, index, units, selection, run, mayEdit } = workspace;
  const columns = useMemo(() => columnsFor(units), [units]);
  const [folded, setFolded] = useState<ReadonlySet<string>>(new Set());
  const rows = useScheduleRows(systemId, folded);
  const [grid, setGrid] = useState<GridState>(gridStart);
  const [error, setError] = useState<string | null>(null);
  const [pasted, setPasted] = useState<string | null>(null);
  const scroller = useRef<HTMLDivElement>(null);
  const baseId = useId();
  const sheet: Sheet = { layout, index, units };
  const extent = { rows: rows.length, columns: columns.length };
  const active = rows[grid.active.row];
  const column = columns[grid.active.column];

  const virtual = useVirtualizer({
    count: rows.length,
    getScrollElement: () => scroller.current,
    estimateSize: () => ROW_HEIGHT,
    overscan: 12,
  });
  useEffect(() => {
    virtual.scrollToIndex(grid.active.row, { align: "auto" });
  }, [virtual, grid.active.row]);

  // What is chosen on the board is where the cursor stands here.
  const chosen = selection.primary;
  useEffect(() => {
    const row = rows.findIndex(({ segment }) => segment.id === chosen);
    if (row >= 0)
      setGrid((before) =>
        before.active.row === row || before.editing
          ? before
          : moveTo(before, { row, column: before.active.column }, { rows: rows.length, columns: columns.length }),
      );
  }, [chosen, rows, columns.length]);

  const go = (next: GridState) => {
    // The cell that was typed into goes away; the keys stay with the grid.
    if (grid.editing) scroller.current?.focus({ preventScroll: true });
    setGrid(next);
    setError(null);
    const id = rows[next.active.row]?.segment.id;
    if (id && id !== selection.primary) selection.select(id);
  };

  const commit = (): boolean => {
    if (!grid.editing || !active || !column?.type) return true;
    if (grid.editing.text === column.text(active, sheet)) return true;
    const typed = column.type(active, grid.editing.text, sheet);
    if (!typed.ok) {
      setError(`${typed.message} ${column.text(active, sheet) || "What stood there"} stays in force until you finish.`);
      return false;
    }
    return run(typed.command).ok;
  };

  const begin = (text?: string) => {
    if (!mayEdit || !active || !column) return;
    if (!column.type) return notify(`${column.head} is a result; it cannot be typed.`);
    setError(null);
    setGrid(edit(grid, text ?? column.text(active, sheet)));
  };

  const { fillDown, clear, addDuct, duplicate, remove } = useScheduleEdits({
    systemId,
    rows,
    columns,
    sheet,
    grid,
    setGrid,
  });

  const fold = (on: boolean) => {
    if (!active) return;
    const next = new Set(folded);
    if (on) next.add(active.segment.id);
    else next.delete(active.segment.id);
    setFolded(next);
  };

  const onKeyDown = (event: KeyboardEvent) => {
    const meta = event.ctrlKey || event.metaKey;
    const { key } = event;
    const done = () => event.preventDefault();
    if (grid.editing) {
      if (key === "Escape") go(stopEditing(grid));
      else if (key === "Enter" && commit()) go(moveBy(stopEditing(grid), event.shiftKey ? -1 : 1, 0, extent));
      else if (key === "Tab" && commit()) go(tab(stopEditing(grid), event.shiftKey, extent) ?? stopEditing(grid));
      else if (key !== "Enter" && key !== "Tab") return;
      return done();
    }
    const walk = {
      ArrowUp: [-1, 0],
      ArrowDown: [1, 0],
      ArrowLeft: [0, -1],
      ArrowRight: [0, 1],
      PageUp: [-20, 0],
      PageDown: [20, 0],
    }[key];
    if (
      walk &&
      column?.id === "name" &&
      (key === "ArrowLeft" || key === "ArrowRight") &&
      active?.foldable &&
      folded.has(active.segment.id) === (key === "ArrowRight")
    ) {
      fold(key === "ArrowLeft");
      return done();
    }
    if (walk) {
      go(moveBy(grid, walk[0] ?? 0, walk[1] ?? 0, extent, event.shiftKey));
      return done();
    }
    if (key === "Home") go(moveTo(grid, { row: meta ? 0 : grid.active.row, column: 0 }, extent));
    else if (key === "End")
      go(moveTo(grid, { row: meta ? rows.length : grid.active.row, column: columns.length }, extent));
    else if (key === "Tab") {
      const next = tab(grid, event.shiftKey, extent);
      if (!next) return;
      go(next);
    } else if (meta && key.toLowerCase() === "d") fillDown();
    else if (meta && key === "Enter") addDuct("straight", event.shiftKey ? "start" : "end");
    else if (meta && key.toLowerCase() === "b") duplicate();
    else if (meta && (key === "Delete" || key === "Backspace")) remove();
    else if (key === "Insert") addDuct("straight", "end");
    else if (key === "Enter" || key === "F2") begin();
    else if (key === "Delete" || key === "Backspace") clear();
    else if (key === "=" && column?.id === "size") clear();
    else if (key.length === 1 && !meta && !event.altKey) begin(key);
    else return;
    done();
  };

  const onCopy = (event: ClipboardEvent) => {
    if (grid.editing) return;
    const { top, bottom, left, right } = marked(grid);
    const text = rows
      .slice(top, bottom + 1)
      .map((row) =>
        columns
          .slice(left, right + 1)
          .map((each) => each.text(row, sheet))
          .join("\t"),
      )
      .join("\n");
    event.clipboardData.setData("text/plain", text);
    event.preventDefault();
  };
  const onPaste = (event: ClipboardEvent) => {
    if (grid.editing || !mayEdit) return;
    const text = event.clipboardData.getData("text/plain");
    if (text.trim() === "") return;
    event.preventDefault();
    setPasted(text);
  };

  const totals = useTotals(systemId);
  return (
    <div className="flex min-h-0 min-w-0 grow flex-col">
      {mayEdit && (
        <div
          className="flex flex-wrap items-center gap-2 border-b border-line bg-sheet px-4 py-1.5"
          role="toolbar"
          aria-label="Schedule"
        >
          <span className="text-help text-ink-2">
            Add after {active ? `segment ${active.number}` : "the equipment"}:
          </span>
          <Button size="small" rank="primary" onClick={() => addDuct("straight", "end")}>
            Straight on
          </Button>
          {(["left", "right", "up", "down"] as const).map((turn) => (
            <Button key={turn} size="small" onClick={() => addDuct(turn, "end")}>
              {turnNames[turn]}
            </Button>
          ))}
          <Button size="small" disabled={!active} onClick={() => addDuct("right", "start")}>
            Branch here
          </Button>
          <span className="grow" />
          <Button size="small" disabled={!active} onClick={duplicate}>
            Copy branch
          </Button>
          <Button size="small" disabled={!active} onClick={fillDown}>
            Fill down
          </Button>
          <Button size="small" rank="danger" disabled={!active} onClick={remove}>
            Remove
          </Button>
        </div>
      )}
      {rows.length === 0 ? (
        <div className="grow p-6" onPaste={onPaste} tabIndex={0}>
          <EmptyState title="No duct yet">
            Add the first duct from the equipment, draw it on the board, or paste rows from a spreadsheet here: name,
            class, size, length, airflow.
          </EmptyState>
        </div>
      ) : (
        <div
          ref={scroller}
          role="grid"
          aria-label="Duct schedule"
          aria-rowcount={rows.length + 1}
          aria-colcount={columns.length}
          aria-activedescendant={grid.editing ? undefined : `${baseId}-${grid.active.row}-${grid.active.column}`}
          tabIndex={0}
          className="min-h-0 grow overflow-auto outline-none"
          onKeyDown={onKeyDown}
          onCopy={onCopy}
          onPaste={onPaste}
        >
          <div
            role="row"
            aria-rowindex={1}
            className="narrow sticky top-0 z-10 flex w-max min-w-full border-b border-line-strong bg-recess text-label"
          >
            {columns.map((each) => (
              <div
                key={each.id}
                role="columnheader"
                style={{ width: each.width }}
                className={classNames(
                  "shrink-0 border-r border-line px-2 py-1.5",
                  each.align === "right" && "text-right",
                )}
              >
                {each.head}
              </div>
            ))}
          </div>
          <div className="relative w-max min-w-full" style={{ height: virtual.getTotalSize() }}>
            {virtual.getVirtualItems().map((item) => {
              const row = rows[item.index];
              return row ? (
                <ScheduleLine
                  key={row.segment.id}
                  row={row}
                  position={item.index}
                  top={item.start}
                  columns={columns}
                  sheet={sheet}
                  grid={grid}
                  baseId={baseId}
                  folded={folded.has(row.segment.id)}
                  onPick={(place, extend) => {
                    if (grid.editing && !commit()) return;
                    scroller.current?.focus();
                    go(moveTo(grid, place, extent, extend));
                  }}
                  onEdit={() => begin()}
                  onType={(text) => setGrid(edit(grid, text))}
                  onLeave={() => {
                    if (grid.editing && commit()) setGrid(stopEditing(grid));
                  }}
                  onFold={() => setFolded(toggled(folded, row.segment.id))}
                />
              ) : null;
            })}
          </div>
        </div>
      )}
      {error && (
        <p
          role="alert"
          className="flex items-center gap-2 border-t-2 border-stop bg-stop-tint px-4 py-1.5 text-stop-ink"
        >
          <SeverityMark severity="stop" /> {error}
        </p>
      )}
      <footer className="flex flex-wrap items-center gap-x-4 gap-y-1 border-t border-line-strong bg-sheet px-4 py-1.5 text-help text-ink-2">
        {keys.map(([cap, words]) => (
          <span key={cap} className="max-lg:hidden">
            <KeyCap keys={cap} /> {words}
          </span>
        ))}
        <span className="ml-auto">{totals}</span>
      </footer>
      {pasted !== null && (
        <PasteDialog
          text={pasted}
          atNodeId={
            active
              ? find(layout, "node", active.segment.toNodeId)?.role === "outlet"
                ? active.segment.fromNodeId
                : active.segment.toNodeId
              : ([...index.equipmentOf.values()].find((node) => node.systemId === systemId)?.id ?? "")
          }
          into={{ rows: rows.slice(grid.active.row), columns: columns.slice(grid.active.column), sheet }}
          onClose={() => {
            setPasted(null);
            scroller.current?.focus();
          }}
        />
      )}
    </div>
  );
}

const turnNames = { left: "Left", right: "Right", up: "Up", down: "Down" } as const;
const keys = [
  ["Enter", "edit, below"],
  ["Tab", "right"],
  ["mod D", "fill down"],
  ["mod Enter", "next duct"],
  ["mod B", "copy branch"],
  ["=", "leave to sizing"],
  ["mod V", "paste, with a preview"],
] as const;

const toggled = (set: ReadonlySet<string>, id: string) => {
  const next = new Set(set);
  if (!next.delete(id)) next.add(id);
  return next;
};

function useTotals(systemId: string): string {
  const { numbers, solutionOf, units, rowsOf } = useWorkspace();
  const solution = solutionOf(systemId);
  const takeoff = numbers?.takeoffs.find((each) => each.systemId === systemId);
  return [
    `${rowsOf(systemId).length} segments`,
    solution && `${solution.paths.length} outlets`,
    solution && formatAirflow(cubicMetersPerSecond(solution.outletAirflow_m3s), units).text,
    takeoff && formatWeight(kilograms(takeoff.totals.netWeight_kg), units).text,
  ]
    .filter(Boolean)
    .join(", ");
}
