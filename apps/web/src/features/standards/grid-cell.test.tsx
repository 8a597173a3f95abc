import { fireEvent, render, screen } from "@testing-library/react";
import { describe, expect, it, vi } from "vitest";
import { readGauge } from "./cells.ts";
import { GridCell } from "./grid-cell.tsx";

function column(gauges: readonly string[], problem?: string) {
  const onChange = vi.fn<(row: number, value: string | null) => void>();
  const onUnclear = vi.fn<(name: string, unclear: boolean) => void>();
  render(
    <table>
      <tbody>
        {gauges.map((gauge, row) => (
          <tr key={row}>
            <GridCell
              name={`Gauge, row ${row + 1}`}
              column="gauge"
              text={gauge}
              read={(text) => readGauge(text, "galvanized")}
              onChange={(value) => onChange(row, value)}
              onUnclear={onUnclear}
              problem={row === 0 ? problem : undefined}
            />
          </tr>
        ))}
      </tbody>
    </table>,
  );
  const cell = (row: number) => screen.getByRole<HTMLInputElement>("textbox", { name: `Gauge, row ${row}` });
  const type = (row: number, text: string) => {
    cell(row).focus();
    fireEvent.change(cell(row), { target: { value: text } });
  };
  return { onChange, onUnclear, cell, type };
}

describe("a cell of a schedule", () => {
  it("takes what was typed on Enter and goes on to the cell below", () => {
    const { onChange, cell, type } = column(["26 ga", "24 ga"]);
    type(1, "22");
    fireEvent.keyDown(cell(1), { key: "Enter" });
    expect(onChange).toHaveBeenCalledExactlyOnceWith(0, "22 ga");
    expect(cell(2)).toHaveFocus();
  });

  it("keeps what it does not understand and names the field, what was typed and what is allowed", () => {
    const { onChange, onUnclear, cell, type } = column(["26 ga", "24 ga"]);
    type(1, "25");
    fireEvent.blur(cell(1));
    expect(cell(1)).toHaveValue("25");
    expect(screen.getByRole("alert")).toHaveTextContent(/Gauge, row 1: “25”.*Allowed: of galvanized: .*24 ga/);
    expect(onUnclear).toHaveBeenLastCalledWith("Gauge, row 1", true);
    expect(onChange).not.toHaveBeenCalled();
  });

  it("Escape puts the last good value back", () => {
    const { onUnclear, cell, type } = column(["26 ga"]);
    type(1, "25");
    fireEvent.keyDown(cell(1), { key: "Escape" });
    expect(cell(1)).toHaveValue("26 ga");
    expect(onUnclear).toHaveBeenLastCalledWith("Gauge, row 1", false);
  });

  it("says what the schedule's rules have against a value that can be read", () => {
    column(["26 ga"], "larger than the size above it");
    expect(screen.getByRole("alert")).toHaveTextContent(
      "Gauge, row 1: “26 ga”. Allowed: larger than the size above it.",
    );
  });
});
