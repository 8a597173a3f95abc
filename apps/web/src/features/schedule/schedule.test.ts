import { feet, inches } from "@cleatwork/calc";
import * as fc from "fast-check";
import { describe, expect, it } from "vitest";
import { edit, gridStart, marked, moveBy, moveTo, tab } from "./grid-state.ts";
import { cellsOf, chained, readBlock } from "./paste-block.ts";

const extent = { rows: 5, columns: 4 };

describe("cursor", () => {
  it("never leaves the grid by arrows", () => {
    fc.assert(
      fc.property(fc.array(fc.tuple(fc.integer({ min: -9, max: 9 }), fc.integer({ min: -9, max: 9 }))), (steps) => {
        let state = gridStart;
        for (const [rows, columns] of steps) state = moveBy(state, rows, columns, extent);
        expect(state.active.row).toBeGreaterThanOrEqual(0);
        expect(state.active.row).toBeLessThan(5);
        expect(state.active.column).toBeGreaterThanOrEqual(0);
        expect(state.active.column).toBeLessThan(4);
      }),
    );
  });

  it("walks by Tab into the next row, and out at the end", () => {
    expect(tab(moveTo(gridStart, { row: 1, column: 3 }, extent), false, extent)?.active).toEqual({ row: 2, column: 0 });
    expect(tab(moveTo(gridStart, { row: 4, column: 3 }, extent), false, extent)).toBeNull();
    expect(tab(moveTo(gridStart, { row: 0, column: 0 }, extent), true, extent)).toBeNull();
  });

  it("marks from where the marking began", () => {
    const state = moveBy(moveTo(gridStart, { row: 3, column: 2 }, extent), -2, -1, extent, true);
    expect(marked(state)).toEqual({ top: 1, bottom: 3, left: 1, right: 2 });
    expect(marked(edit(state, "x"))).toEqual({ top: 1, bottom: 1, left: 1, right: 1 });
  });
});

describe("a pasted block", () => {
  it("is read as spreadsheets copy it", () => {
    expect(cellsOf('a\t"two\nlines"\r\nb\t"say ""hi"""\r\n')).toEqual([
      ["a", "two\nlines"],
      ["b", 'say "hi"'],
    ]);
    // An inch mark is not a quote.
    expect(cellsOf('Main\t24x12\t6\'6"\nBranch\t10o\t150"')).toEqual([
      ["Main", "24x12", "6'6\""],
      ["Branch", "10o", '150"'],
    ]);
  });

  it("goes by its headings", () => {
    const [row] = readBlock("Length\tSize\tName\n20\t24x12\tMain", "inch-pound");
    expect(row?.row).toMatchObject({
      to: { length_m: feet(20) },
      duct: { name: "Main", section: { shape: "rectangular", width_m: inches(24), height_m: inches(12) } },
    });
  });

  it("names each cell that cannot be read, and keeps the others", () => {
    const [good, bad] = readBlock("Main\tmain\t24x12\t20\t\nBranch\tside\t14x\t\t2 tons", "inch-pound");
    expect(good?.row).not.toBeNull();
    expect(bad?.row).toBeNull();
    expect(bad?.cells.class.error).toContain("main, branch or runout");
    expect(bad?.cells.size.error).toContain("one side");
    expect(bad?.cells.length.error).toBe("A length is needed.");
    expect(bad?.cells.airflow.error).toContain("cannot be read");
  });

  it("hangs what follows an outlet on the trunk before it", () => {
    const rows = readBlock("A\t\t24x12\t10\t\nB\t\t10o\t8\t400\nC\t\t20x12\t10\t\n", "inch-pound").flatMap(
      ({ row }) => row ?? [],
    );
    expect(chained(rows).map(({ after }) => after)).toEqual([null, 0, 0]);
  });
});
