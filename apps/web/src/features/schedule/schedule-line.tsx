import { find } from "@cleatwork/layout";
import { classNames } from "../../lib/class-names.ts";
import { LimitBar } from "../../ui/figure.tsx";
import { SeverityMark } from "../../ui/severity.tsx";
import { useWorkspace } from "../workspace/index.ts";
import type { ScheduleColumn, ScheduleRow, Sheet } from "./columns.ts";
import { isMarked, type GridState } from "./grid-state.ts";

export const ROW_HEIGHT = 24;

/** One duct as a row: its cells, the one being typed into, its mark when something is found. */
export function ScheduleLine(props: {
  row: ScheduleRow;
  position: number;
  top: number;
  columns: readonly ScheduleColumn[];
  sheet: Sheet;
  grid: GridState;
  baseId: string;
  folded: boolean;
  onPick: (place: { row: number; column: number }, extend: boolean) => void;
  onEdit: () => void;
  onType: (text: string) => void;
  onLeave: () => void;
  onFold: () => void;
}) {
  const { row, position, grid, sheet } = props;
  const { selection } = useWorkspace();
  return (
    <div
      role="row"
      aria-rowindex={position + 2}
      aria-selected={selection.ids.has(row.segment.id)}
      className={classNames(
        "absolute inset-x-0 flex border-b border-line-soft",
        selection.ids.has(row.segment.id) ? "bg-dye-tint" : selection.hovered === row.segment.id && "bg-dye-tint-2",
      )}
      style={{ height: ROW_HEIGHT, transform: `translateY(${props.top}px)` }}
      onPointerEnter={() => selection.hover(row.segment.id)}
      onPointerLeave={() => selection.hover(null)}
    >
      {props.columns.map((column, place) => {
        const isActive = grid.active.row === position && grid.active.column === place;
        const typing = isActive && grid.editing !== null;
        return (
          <div
            key={column.id}
            id={`${props.baseId}-${position}-${place}`}
            role="gridcell"
            aria-colindex={place + 1}
            aria-readonly={column.type === undefined}
            style={{ width: column.width, ...(column.id === "name" ? { paddingLeft: 8 + row.depth * 14 } : {}) }}
            className={classNames(
              "flex shrink-0 items-center overflow-hidden whitespace-nowrap border-r border-line-soft px-2",
              column.align === "right" && "justify-end",
              column.id === "fittings" && "narrow text-ink-2",
              column.id === "size" && row.segment.section && "font-bold",
              isMarked(grid, { row: position, column: place }) && !isActive && "bg-dye-tint",
              isActive && "outline-2 -outline-offset-2 outline-dye",
              over(column.id, row, sheet) && "font-semibold text-warn-ink",
            )}
            onPointerDown={(event) => {
              if (typing) return;
              event.preventDefault();
              props.onPick({ row: position, column: place }, event.shiftKey);
            }}
            onDoubleClick={props.onEdit}
          >
            {typing ? (
              <input
                autoFocus
                aria-label={`${column.head} of segment ${row.number}`}
                value={grid.editing?.text ?? ""}
                onChange={(event) => props.onType(event.target.value)}
                onBlur={props.onLeave}
                className={classNames(
                  "w-full bg-sheet-hi text-ink outline-none",
                  column.align === "right" && "text-right",
                )}
              />
            ) : column.id === "share" ? (
              <Share row={row} sheet={sheet} />
            ) : column.id === "name" ? (
              <>
                {row.foldable && (
                  <button
                    type="button"
                    tabIndex={-1}
                    aria-label={props.folded ? "Unfold" : "Fold"}
                    className="-ml-3 w-3 shrink-0 text-ink-3"
                    onClick={props.onFold}
                  >
                    {props.folded ? "+" : "–"}
                  </button>
                )}
                {column.text(row, sheet) || <span className="text-ink-3">unnamed</span>}
                <RowMark id={row.segment.id} />
              </>
            ) : (
              column.text(row, sheet)
            )}
          </div>
        );
      })}
    </div>
  );
}

function limitsOf(row: ScheduleRow, sheet: Sheet) {
  return find(sheet.layout, "system", row.segment.systemId)?.limits;
}

function over(columnId: string, row: ScheduleRow, sheet: Sheet): boolean {
  const limits = limitsOf(row, sheet);
  if (!limits || !row.solved) return false;
  if (columnId === "velocity") return row.solved.meanVelocity_m_s > limits.velocity_m_s[row.segment.ductClass];
  if (columnId === "friction") return row.solved.frictionRate_pa_m > limits.frictionRate_pa_m[row.segment.ductClass];
  return false;
}

function Share({ row, sheet }: { row: ScheduleRow; sheet: Sheet }) {
  const limits = limitsOf(row, sheet);
  if (!limits || !row.solved) return null;
  const share = row.solved.meanVelocity_m_s / limits.velocity_m_s[row.segment.ductClass];
  return <LimitBar share={share} label={`${Math.round(share * 100)} % of the velocity limit`} />;
}

function RowMark({ id }: { id: string }) {
  const { numbers } = useWorkspace();
  const found = [...(numbers?.solutions ?? [])].flatMap(({ findings }) =>
    findings.filter(({ subject }) => subject.id === id),
  );
  const worst = numbers?.problems.some(({ subject }) => subject.id === id)
    ? "stop"
    : (found.find(({ severity }) => severity === "stop") ?? found.find(({ severity }) => severity === "warn"))
        ?.severity;
  return worst ? (
    <span className="ml-1">
      <SeverityMark severity={worst} label={worst === "stop" ? "Stop" : "Warning"} />
    </span>
  ) : null;
}
