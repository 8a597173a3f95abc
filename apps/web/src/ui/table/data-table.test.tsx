import { fireEvent, render, screen, within } from "@testing-library/react";
import { describe, expect, it, vi } from "vitest";
import { DataTable } from "./data-table.tsx";
import type { TableColumn } from "./table-column.ts";

interface Row {
  readonly id: string;
  readonly name: string;
  readonly pounds: number | null;
}
const rows: readonly Row[] = [
  { id: "1", name: "M-10 main", pounds: 9.5 },
  { id: "2", name: "M-9 branch", pounds: 120 },
  { id: "3", name: "Café riser", pounds: null },
];
const columns: readonly TableColumn<Row>[] = [
  { id: "name", head: "Name", value: (row) => row.name },
  { id: "pounds", head: "Pounds", align: "right", value: (row) => row.pounds },
];
const table = (props: Partial<Parameters<typeof DataTable<Row>>[0]> = {}) =>
  render(
    <DataTable
      title="Pieces"
      rows={rows}
      columns={columns}
      rowId={(row) => row.id}
      csvName="pieces"
      empty="None."
      {...props}
    />,
  );
const names = () =>
  screen
    .getAllByRole("row")
    .slice(1)
    .map((row) => within(row).getAllByRole("cell")[0]?.textContent);

describe("a table", () => {
  it("sorts numbers by size with the missing ones last, whichever way", () => {
    table();
    fireEvent.click(screen.getByRole("button", { name: "Pounds" }));
    expect(names()).toEqual(["M-10 main", "M-9 branch", "Café riser"]);
    fireEvent.click(screen.getByRole("button", { name: "Pounds" }));
    expect(names()).toEqual(["M-9 branch", "M-10 main", "Café riser"]);
    expect(screen.getByRole("columnheader", { name: "Pounds" })).toHaveAttribute("aria-sort", "descending");
  });

  it("sorts the numbers inside words by size", () => {
    table({ sort: { id: "name", desc: false } });
    expect(names()).toEqual(["Café riser", "M-9 branch", "M-10 main"]);
  });

  it("finds by all typed words, whatever the accents, and offers a way back", () => {
    table();
    fireEvent.change(screen.getByRole("searchbox"), { target: { value: "riser cafe" } });
    expect(names()).toEqual(["Café riser"]);
    fireEvent.change(screen.getByRole("searchbox"), { target: { value: "nothing like it" } });
    fireEvent.click(screen.getByRole("button", { name: "Show all" }));
    expect(names()).toHaveLength(3);
  });

  it("puts rows under their group and leaves empty groups out", () => {
    table({
      groups: [
        { id: "heavy", label: "Heavy", has: (row) => (row.pounds ?? 0) > 100 },
        { id: "gone", label: "Gone", has: () => false },
        { id: "rest", label: "Rest", has: (row) => (row.pounds ?? 0) <= 100 },
      ],
    });
    expect(screen.getAllByRole("row").map((row) => row.textContent)).toEqual([
      "NamePounds",
      "Heavy1",
      "M-9 branch120",
      "Rest2",
      "M-10 main9.5",
      "Café riser",
    ]);
  });

  it("opens a row by its first cell, for keys, and by a press anywhere on it", () => {
    const onOpen = vi.fn();
    table({ onOpen });
    fireEvent.click(screen.getByRole("button", { name: "M-10 main" }));
    fireEvent.click(screen.getByText("120"));
    expect(onOpen.mock.calls.map(([row]) => (row as Row).id)).toEqual(["1", "2"]);
  });

  it("says what would be here when there is nothing", () => {
    table({ rows: [] });
    expect(screen.getByText("None.")).toBeInTheDocument();
    expect(screen.queryByRole("table")).not.toBeInTheDocument();
  });
});
