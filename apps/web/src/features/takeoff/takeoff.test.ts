import { feet, pounds, shippedStandards } from "@cleatwork/calc";
import type { ComparedPiece } from "@cleatwork/contracts";
import { describe, expect, it } from "vitest";
import { comparePieces } from "./compare-pieces.ts";
import { factorOf, reasonOf, reasonsIn } from "./work-conditions.ts";

const aPiece = (mark: string, more: Partial<ComparedPiece> = {}): ComparedPiece => ({
  mark,
  systemId: "s1",
  systemTag: "S1",
  segmentId: "seg",
  segmentName: "",
  kind: "straight",
  section: { shape: "rectangular", width_m: feet(2), height_m: feet(1) },
  length_m: feet(5),
  material: "galvanized",
  gauge: "26 ga",
  weight_kg: pounds(30),
  shopHours_h: 1,
  fieldHours_h: 2,
  ...more,
});
const compare = (before: readonly ComparedPiece[], after: readonly ComparedPiece[]) =>
  comparePieces(before, after as Parameters<typeof comparePieces>[1]);

describe("a takeoff beside an earlier one", () => {
  it("tells pieces that came, went and changed, and in what", () => {
    const { pieces, unchanged } = compare(
      [aPiece("1A"), aPiece("1B"), aPiece("2A")],
      [aPiece("1A"), aPiece("1B", { gauge: "24 ga" }), aPiece("3A")],
    );
    expect(unchanged).toBe(1);
    expect(pieces.map(({ state, fields, before, after }) => [state, (after ?? before)?.mark, fields])).toEqual([
      ["changed", "1B", ["gauge"]],
      ["added", "3A", []],
      ["removed", "2A", []],
    ]);
  });
  it("keeps pieces of two systems apart", () => {
    expect(compare([aPiece("1A")], [aPiece("1A", { systemId: "s2" })]).pieces.map(({ state }) => state)).toEqual([
      "added",
      "removed",
    ]);
  });
  it("adds up to the difference of the totals", () => {
    const { weight_kg, field_h } = compare([aPiece("1A")], [aPiece("1A"), aPiece("1B", { weight_kg: pounds(12) })]);
    expect([weight_kg, field_h]).toEqual([expect.closeTo(pounds(12), 9), 2]);
  });
});

describe("conditions picked for a project", () => {
  const { conditions } = shippedStandards.productivity;
  it("multiply, and are found again by their names", () => {
    const picked = conditions.filter(({ name }) => /Congested|Riser/.test(name));
    expect(factorOf(picked)).toBe(1.56);
    expect(reasonsIn(reasonOf(picked), conditions)).toEqual(picked);
  });
  it("keep the reason as short as its field", () => {
    expect(reasonOf(conditions).length).toBeLessThanOrEqual(200);
  });
});
