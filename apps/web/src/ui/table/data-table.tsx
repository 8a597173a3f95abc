import { useVirtualizer } from "@tanstack/react-virtual";
import { Fragment, useId, useMemo, useRef, useState, type ReactNode } from "react";
import { classNames } from "../../lib/class-names.ts";
import { csvText, downloadText } from "../../lib/format/csv.ts";
import { Button } from "../button.tsx";
import { DownloadIcon, SearchIcon } from "../icons/icon.tsx";
import { PanelHead } from "../panel.tsx";
import type { TableColumn } from "./table-column.ts";
import { useRows } from "./use-rows.ts";

export interface RowGroup<Row> {
  readonly id: string;
  readonly label: string;
  readonly has: (row: Row) => boolean;
  readonly fact?: (rows: readonly Row[]) => ReactNode;
}

const ROW_HEIGHT = 32;
/** Below this many rows everything is drawn, so that the browser's own find works. */
const VIRTUAL_FROM = 300;

/**
 * Rows that sort by a press on their heading, are found by typing, and leave as CSV. Long ones draw only what is in view.
 */
export function DataTable<Row>({
  title,
  fact,
  rows,
  columns,
  rowId,
  groups,
  sort,
  csvName,
  findLabel = "Find in the table",
  onOpen,
  openLabel,
  isSelected,
  actions,
  filters,
  empty,
  live,
  className,
}: {
  readonly title: string;
  readonly fact?: ReactNode;
  readonly rows: readonly Row[];
  readonly columns: readonly TableColumn<Row>[];
  readonly rowId: (row: Row) => string;
  readonly groups?: readonly RowGroup<Row>[];
  readonly sort?: { readonly id: string; readonly desc: boolean };
  readonly csvName: string;
  readonly findLabel?: string;
  /** A press anywhere on the row. The first cell is a button that does the same, for keys and readers. */
  readonly onOpen?: (row: Row) => void;
  readonly openLabel?: (row: Row) => string;
  readonly isSelected?: (row: Row) => boolean;
  readonly actions?: ReactNode;
  readonly filters?: ReactNode;
  readonly empty: ReactNode;
  readonly live?: boolean;
  readonly className?: string;
}) {
  const [find, setFind] = useState("");
  const { shown, sorting, toggleSort } = useRows({ rows, columns, find, ...(sort ? { sort } : {}) });
  const scroller = useRef<HTMLDivElement>(null);
  const findId = useId();

  const lines = useMemo(() => linesOf(shown, groups), [shown, groups]);
  const virtual = lines.length > VIRTUAL_FROM;
  const virtualizer = useVirtualizer({
    count: virtual ? lines.length : 0,
    getScrollElement: () => scroller.current,
    estimateSize: () => ROW_HEIGHT,
    overscan: 12,
  });
  const windowed = virtualizer.getVirtualItems();
  const drawn = virtual ? windowed.map((item) => lines[item.index]).filter((line) => line !== undefined) : lines;
  const above = virtual ? (windowed[0]?.start ?? 0) : 0;
  const below = virtual ? virtualizer.getTotalSize() - (windowed.at(-1)?.end ?? 0) : 0;

  const exportCsv = () => {
    const heads = columns.map((column) => column.csv?.head ?? column.head);
    const body = lines.flatMap((line) =>
      line.kind === "row" ? [columns.map((column) => (column.csv?.value ?? column.value)(line.row))] : [],
    );
    downloadText(`${csvName}.csv`, csvText([heads, ...body]));
  };

  return (
    <section aria-label={title} className={classNames("hem flex min-h-0 flex-col", live && "hem-live", className)}>
      <PanelHead title={title} fact={fact}>
        {filters}
        {rows.length > 0 && (
          <>
            <div className="relative">
              <label htmlFor={findId} className="sr-only">
                {findLabel}
              </label>
              <SearchIcon className="pointer-events-none absolute left-2 top-1.5 text-ink-3" />
              <input
                id={findId}
                type="search"
                value={find}
                placeholder="Find"
                onChange={(event) => setFind(event.target.value)}
                className="h-7 w-40 rounded-edge border border-line-strong bg-sheet-hi pl-7 pr-2 text-help placeholder:text-ink-3"
              />
            </div>
            <Button size="small" onClick={exportCsv}>
              <DownloadIcon />
              CSV
            </Button>
          </>
        )}
        {actions}
      </PanelHead>
      {rows.length === 0 ? (
        empty
      ) : (
        <div ref={scroller} className="min-h-0 flex-1 overflow-auto" tabIndex={-1}>
          <table className="grid-table" aria-rowcount={lines.length + 1}>
            <thead className="sticky top-0 z-10">
              <tr>
                {columns.map((column) => (
                  <HeadCell
                    key={column.id}
                    column={column}
                    sorted={sorting?.id === column.id ? (sorting.desc ? "descending" : "ascending") : null}
                    onToggle={() => toggleSort(column.id)}
                  />
                ))}
              </tr>
            </thead>
            <tbody>
              {above > 0 && <Spacer height={above} columns={columns.length} />}
              {drawn.map((line) =>
                line.kind === "group" ? (
                  <tr key={`group ${line.group.id}`} data-group="">
                    <th colSpan={columns.length} scope="colgroup">
                      {line.group.label}
                      <span className="ml-2 font-normal text-ink-3">
                        {line.group.fact ? line.group.fact(line.rows) : line.rows.length}
                      </span>
                    </th>
                  </tr>
                ) : (
                  <BodyRow
                    key={rowId(line.row)}
                    row={line.row}
                    columns={columns}
                    selected={isSelected?.(line.row) ?? false}
                    {...(onOpen ? { onOpen } : {})}
                    {...(openLabel ? { openLabel } : {})}
                  />
                ),
              )}
              {below > 0 && <Spacer height={below} columns={columns.length} />}
            </tbody>
          </table>
          {shown.length === 0 && (
            <p role="status" className="p-4 text-ink-2">
              Nothing here matches “{find}”.{" "}
              <Button size="small" onClick={() => setFind("")}>
                Show all
              </Button>
            </p>
          )}
        </div>
      )}
    </section>
  );
}

type LineOf<Row> =
  | { readonly kind: "group"; readonly group: RowGroup<Row>; readonly rows: readonly Row[] }
  | { readonly kind: "row"; readonly row: Row };

function linesOf<Row>(rows: readonly Row[], groups: readonly RowGroup<Row>[] | undefined): readonly LineOf<Row>[] {
  const asLine = (row: Row): LineOf<Row> => ({ kind: "row", row });
  if (!groups) return rows.map(asLine);
  return groups.flatMap((group): LineOf<Row>[] => {
    const inside = rows.filter((row) => group.has(row));
    return inside.length === 0 ? [] : [{ kind: "group", group, rows: inside }, ...inside.map(asLine)];
  });
}

function HeadCell<Row>({
  column,
  sorted,
  onToggle,
}: {
  column: TableColumn<Row>;
  sorted: "ascending" | "descending" | null;
  onToggle: () => void;
}) {
  if (!column.head) {
    return (
      <th>
        <span className="sr-only">Actions</span>
      </th>
    );
  }
  const arrow = (
    <svg width={8} height={5} viewBox="0 0 8 5" aria-hidden className={sorted ? "fill-ink" : "fill-transparent"}>
      <path d={sorted === "ascending" ? "M4 0l4 5H0z" : "M4 5L0 0h8z"} />
    </svg>
  );
  return (
    <th
      scope="col"
      {...(sorted ? { "aria-sort": sorted } : {})}
      className={classNames(column.align && "num", column.className)}
    >
      <button
        type="button"
        onClick={onToggle}
        className={classNames("inline-flex h-8 items-center gap-1 hover:text-ink", sorted && "font-[680] text-ink")}
      >
        {column.align && arrow}
        {column.head}
        {!column.align && arrow}
      </button>
    </th>
  );
}

function BodyRow<Row>({
  row,
  columns,
  selected,
  onOpen,
  openLabel,
}: {
  row: Row;
  columns: readonly TableColumn<Row>[];
  selected: boolean;
  onOpen?: (row: Row) => void;
  openLabel?: (row: Row) => string;
}) {
  return (
    <tr
      data-hover=""
      {...(selected ? { "data-selected": "" } : {})}
      className={onOpen ? "cursor-pointer" : undefined}
      onClick={(event) => {
        // A control in the row is its own; so is text that is being selected.
        if ((event.target as Element).closest("a,button,input,select,label,[role=menuitem]")) return;
        if (window.getSelection()?.type === "Range") return;
        onOpen?.(row);
      }}
    >
      {columns.map((column, index) => {
        const content = column.cell ? column.cell(row) : column.value(row);
        return (
          <td
            key={column.id}
            className={classNames(
              index === 0 ? "min-w-36" : "max-md:whitespace-nowrap",
              column.align && "num whitespace-nowrap",
              column.className,
            )}
          >
            {index === 0 && onOpen ? (
              <button
                type="button"
                className="text-left font-[560] text-ink hover:underline"
                {...(openLabel ? { "aria-label": openLabel(row) } : {})}
                onClick={() => onOpen(row)}
              >
                {content}
              </button>
            ) : (
              <Fragment>{content}</Fragment>
            )}
          </td>
        );
      })}
    </tr>
  );
}

const Spacer = ({ height, columns }: { height: number; columns: number }) => (
  <tr aria-hidden>
    <td colSpan={columns} style={{ height, padding: 0, border: 0 }} />
  </tr>
);
