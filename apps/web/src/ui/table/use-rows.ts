import {
  createColumnHelper,
  createSortedRowModel,
  rowSortingFeature,
  tableFeatures,
  useTable,
} from "@tanstack/react-table";
import { useMemo } from "react";
import type { TableColumn } from "./table-column.ts";
import { compare, holdsAllWords } from "./words.ts";

const features = tableFeatures({ rowSortingFeature, sortedRowModel: createSortedRowModel() });

interface Sorting {
  readonly id: string;
  readonly desc: boolean;
}

/** The rows as they are to be shown: those that hold all the typed words, in the chosen order. */
export function useRows<Row>({
  rows,
  columns,
  find,
  sort,
}: {
  rows: readonly Row[];
  columns: readonly TableColumn<Row>[];
  find: string;
  sort?: Sorting;
}) {
  const found = useMemo(
    () =>
      find.trim() === ""
        ? [...rows]
        : rows.filter((row) => holdsAllWords(columns.map((column) => column.value(row) ?? "").join(" "), find)),
    [rows, columns, find],
  );
  const helper = useMemo(() => createColumnHelper<typeof features, { row: Row }>(), []);
  const definitions = useMemo(
    () =>
      helper.columns(
        columns.map((column) =>
          helper.accessor(({ row }) => column.value(row) ?? undefined, {
            id: column.id,
            header: column.head,
            sortUndefined: "last",
            sortFn: (a, b, id) => compare(a.getValue(id), b.getValue(id)),
            sortDescFirst: false,
          }),
        ),
      ),
    [helper, columns],
  );
  const data = useMemo(() => found.map((row) => ({ row })), [found]);
  const table = useTable({
    features,
    columns: definitions,
    data,
    initialState: { sorting: sort ? [{ ...sort }] : [] },
  });
  const sorting: Sorting | undefined = table.state.sorting[0];
  return {
    shown: table.getRowModel().rows.map((row) => row.original.row),
    sorting,
    toggleSort: (id: string) => table.getColumn(id)?.toggleSorting(sorting?.id === id ? !sorting.desc : false),
  };
}
