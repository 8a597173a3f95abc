import type { FieldPiece, FieldTakeoff } from "@cleatwork/contracts";
import * as fc from "fast-check";
import { describe, expect, it } from "vitest";
import { filterPieces, runsOf } from "./field-list.ts";

const piece = (mark: string, segmentName: string, systemId = "s1", levelId = "l1") =>
  ({ mark, segmentName, systemId, levelId, weight_kg: 1 }) as FieldPiece;
const takeoff = {
  pieces: [piece("4A", "Corridor main"), piece("4B", "Corridor main"), piece("35A", "Reading trunk", "s1", "l2")],
} as unknown as FieldTakeoff;

describe("field list", () => {
  it("keeps every piece once, in its order", () => {
    fc.assert(
      fc.property(fc.array(fc.tuple(fc.string({ maxLength: 3 }), fc.constantFrom("a", "b", "c"))), (rows) => {
        const pieces = rows.map(([mark, name]) => piece(mark, name));
        expect(runsOf(pieces).flatMap((run) => run.pieces)).toEqual(pieces);
      }),
    );
  });

  it("finds a piece by the start of its mark", () => {
    const found = filterPieces(takeoff, { levelId: null, systemId: null, words: "4" }, () => "");
    expect(found.map(({ mark }) => mark)).toEqual(["4A", "4B"]);
  });

  it("narrows to a level", () => {
    const found = filterPieces(takeoff, { levelId: "l2", systemId: null, words: "" }, () => "");
    expect(found.map(({ mark }) => mark)).toEqual(["35A"]);
  });
});
