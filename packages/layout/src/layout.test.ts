import { feet, meters } from "@cleatwork/calc";
import { layoutRecordSchema, type NodeRecord, type SegmentRecord } from "@cleatwork/contracts";
import * as fc from "fast-check";
import { describe, expect, it } from "vitest";
import { airSystemsFrom } from "./air-systems.ts";
import { applyChangeSet, invert, merge } from "./change-set.ts";
import { checkLayout } from "./check-layout.ts";
import { addLevel, placeEquipment } from "./commands/add-system.ts";
import type { CommandResult } from "./commands/command.ts";
import { copyBranch } from "./commands/copy-branch.ts";
import { removeLevel, setSegments } from "./commands/edit-record.ts";
import { extendRun } from "./commands/extend-run.ts";
import { lengthOfSegment, moveNode, setLength } from "./commands/move.ts";
import { pasteRows } from "./commands/paste-rows.ts";
import { joinAtNode, removeBranches } from "./commands/remove.ts";
import { splitSegment } from "./commands/split-segment.ts";
import { createLayout, find, listOf, recordsOf, type Layout } from "./layout.ts";
import { indexOf, pathTo, treeOf } from "./layout-index.ts";
import { countingIds, done, setOf, smallSystem, specId } from "./testing/fixtures.ts";

const ids = countingIds();
const layout = smallSystem(ids);
const segments = listOf(layout, "segment");
const [first, second, third, branch] = segments as [SegmentRecord, SegmentRecord, SegmentRecord, SegmentRecord];
const systemId =
  listOf(layout, "system")[0]?.id ??
  (() => {
    throw new Error("a system");
  })();
const lengthFrom = (of: Layout, id: string) => lengthOfSegment(of, find(of, "segment", id) as SegmentRecord);

const numbersIn = (of: Layout) =>
  new Map(treeOf(indexOf(of), systemId).map(({ segment, number }) => [segment.id, number]));

/** Any edit that a person could make on a layout; some are refused, and then nothing happens. */
const anyEdit = fc.oneof(
  fc.record({
    kind: fc.constant("move" as const),
    pick: fc.nat(20),
    x_m: fc.double({ min: -50, max: 50, noNaN: true }),
    y_m: fc.double({ min: -50, max: 50, noNaN: true }),
  }),
  fc.record({
    kind: fc.constant("length" as const),
    pick: fc.nat(20),
    length: fc.double({ min: 0.01, max: 40, noNaN: true }),
  }),
  fc.record({
    kind: fc.constant("split" as const),
    pick: fc.nat(20),
    share: fc.double({ min: 0.01, max: 0.99, noNaN: true }),
  }),
  fc.record({ kind: fc.constant("remove" as const), pick: fc.nat(20) }),
  fc.record({ kind: fc.constant("copy" as const), pick: fc.nat(20), to: fc.nat(20) }),
  fc.record({
    kind: fc.constant("extend" as const),
    pick: fc.nat(20),
    turn: fc.constantFrom("straight", "left", "right", "up", "down"),
    length: fc.double({ min: 0.1, max: 20, noNaN: true }),
  }),
);
type Edit = typeof anyEdit extends fc.Arbitrary<infer T> ? T : never;

function resultOf(edit: Edit, on: Layout): CommandResult | null {
  const pick = <T>(list: readonly T[], index: number): T | undefined => list[index % Math.max(1, list.length)];
  const segment = pick(listOf(on, "segment"), edit.pick);
  const node = pick(listOf(on, "node"), edit.pick);
  if (!segment || !node) return null;
  switch (edit.kind) {
    case "move":
      return moveNode(on, { id: node.id, x_m: edit.x_m, y_m: edit.y_m });
    case "length":
      return setLength(on, { segmentId: segment.id, length_m: meters(edit.length) });
    case "split":
      return splitSegment(on, { segmentId: segment.id, share: edit.share }, ids);
    case "remove":
      return removeBranches(on, { segmentIds: [segment.id] });
    case "copy": {
      const to = pick(listOf(on, "node"), edit.to);
      return to ? copyBranch(on, { segmentId: segment.id, toNodeId: to.id, mirror: "none" }, ids) : null;
    }
    case "extend":
      return extendRun(
        on,
        {
          fromNodeId: node.id,
          to: { kind: "length", length_m: meters(edit.length), turn: edit.turn as "straight" },
          duct: {},
          outlet: null,
        },
        ids,
      );
  }
}

describe("every edit", () => {
  it("can be taken back to the record", () => {
    fc.assert(
      fc.property(fc.array(anyEdit, { minLength: 1, maxLength: 6 }), (edits) => {
        let now = layout;
        const sets = [];
        for (const edit of edits) {
          const result = resultOf(edit, now);
          if (!result?.ok) continue;
          sets.push(result.value);
          now = done(now, result);
        }
        for (const set of sets.toReversed()) {
          const undone = applyChangeSet(now, invert(set));
          if (!undone.ok) throw new Error("the inverse fits what the edit left");
          now = undone.value;
        }
        expect(new Map(now.records)).toEqual(new Map(layout.records));
      }),
      { numRuns: 60 },
    );
  });

  it("leaves a sound layout that the contract accepts", () => {
    fc.assert(
      fc.property(fc.array(anyEdit, { minLength: 1, maxLength: 6 }), (edits) => {
        let now = layout;
        for (const edit of edits) {
          const result = resultOf(edit, now);
          if (result?.ok) now = done(now, result);
        }
        expect(checkLayout(now)).toEqual([]);
        for (const record of recordsOf(now)) expect(layoutRecordSchema.safeParse(record).error).toBeUndefined();
      }),
      { numRuns: 60 },
    );
  });

  it("leaves every duct that stays its number, and gives no number twice", () => {
    fc.assert(
      fc.property(fc.array(anyEdit, { minLength: 1, maxLength: 8 }), (edits) => {
        let now = layout;
        let known = numbersIn(now);
        for (const edit of edits) {
          const result = resultOf(edit, now);
          if (!result?.ok) continue;
          now = done(now, result);
          const numbers = numbersIn(now);
          expect(new Set(numbers.values()).size).toBe(numbers.size);
          for (const [id, number] of numbers) expect(known.get(id) ?? number).toBe(number);
          known = numbers;
        }
      }),
      { numRuns: 60 },
    );
  });

  it("merges into one that does the same", () => {
    fc.assert(
      fc.property(fc.array(anyEdit, { minLength: 2, maxLength: 5 }), (edits) => {
        let now = layout;
        const sets = [];
        for (const edit of edits) {
          const result = resultOf(edit, now);
          if (!result?.ok) continue;
          sets.push(result.value);
          now = done(now, result);
        }
        const merged = applyChangeSet(layout, merge("all", sets));
        if (!merged.ok) throw new Error("the merged set fits where the first one did");
        expect(new Map(merged.value.records)).toEqual(new Map(now.records));
      }),
      { numRuns: 40 },
    );
  });
});

describe("change set", () => {
  it("is refused when someone else changed the record", () => {
    const mine = setOf(setSegments(layout, { ids: [first.id], fields: { name: "Mine" }, label: "Name" }));
    const theirs = done(layout, setSegments(layout, { ids: [first.id], fields: { name: "Theirs" }, label: "Name" }));
    expect(applyChangeSet(theirs, mine)).toMatchObject({
      ok: false,
      problems: [{ code: "record-changed", id: first.id }],
    });
  });

  it("tells an absent field from a null one", () => {
    const { length_m: _gone, ...absent } = first;
    const set = { label: "Name", changes: [{ id: first.id, before: absent as SegmentRecord, after: first }] };
    expect(applyChangeSet(layout, set).ok).toBe(false);
  });
});

describe("tree", () => {
  it("numbers ducts from the equipment outward, each before what hangs on it", () => {
    const rows = treeOf(indexOf(layout), systemId);
    expect(rows.map(({ segment }) => segment.id)).toEqual([first.id, second.id, third.id, branch.id]);
    expect(rows.map(({ number, depth }) => [number, depth])).toEqual([
      [1, 0],
      [2, 0],
      [3, 0],
      [4, 1],
    ]);
  });

  it("leads from the equipment to an outlet", () => {
    expect(pathTo(indexOf(layout), branch.toNodeId).map(({ id }) => id)).toEqual([first.id, second.id, branch.id]);
  });
});

describe("length", () => {
  it("moves what hangs on the duct along and leaves the rest", () => {
    const after = done(layout, setLength(layout, { segmentId: second.id, length_m: feet(25) }));
    expect(lengthFrom(after, second.id)).toBeCloseTo(feet(25), 9);
    for (const { id } of [first, third, branch]) expect(lengthFrom(after, id)).toBeCloseTo(lengthFrom(layout, id), 6);
  });

  it("must be more than nothing", () => {
    expect(setLength(layout, { segmentId: second.id, length_m: meters(0) })).toMatchObject({
      ok: false,
      problems: [{ code: "length-not-positive", recordId: second.id }],
    });
  });
});

describe("split", () => {
  it("leaves as much duct as there was", () => {
    fc.assert(
      fc.property(fc.double({ min: 0.01, max: 0.99, noNaN: true }), (share) => {
        const after = done(layout, splitSegment(layout, { segmentId: second.id, share }, ids));
        const added = listOf(after, "segment").filter(({ id }) => !layout.records.has(id));
        expect(lengthFrom(after, second.id) + lengthFrom(after, added[0]?.id ?? "")).toBeCloseTo(
          lengthFrom(layout, second.id),
          5,
        );
      }),
    );
  });

  it("leaves the damper in the first part and the end at the outlet in the second", () => {
    const fields = { accessories: ["volume-damper" as const], damperAngle_rad: 0.5, mouth: "entry-flush" as const };
    const drawn = done(layout, setSegments(layout, { ids: [second.id], fields, label: "Damper" }));
    const after = done(drawn, splitSegment(drawn, { segmentId: second.id, share: 0.5 }, ids));
    const [added] = listOf(after, "segment").filter(({ id }) => !layout.records.has(id));
    expect(find(after, "segment", second.id)).toMatchObject({ ...fields, mouth: null });
    expect(added).toMatchObject({ accessories: [], damperAngle_rad: null, mouth: "entry-flush" });

    const joined = done(after, joinAtNode(after, { nodeId: added?.fromNodeId ?? "" }));
    expect(find(joined, "segment", second.id)).toEqual(find(drawn, "segment", second.id));
  });

  it("is undone by taking the joint out", () => {
    const after = done(layout, splitSegment(layout, { segmentId: second.id, share: 0.5 }, ids));
    const joint = listOf(after, "node").find(({ id }) => !layout.records.has(id)) as NodeRecord;
    const joined = done(after, joinAtNode(after, { nodeId: joint.id }));
    expect(new Map(joined.records)).toEqual(new Map(layout.records));
  });
});

describe("copy", () => {
  it("has the shape of the branch, elsewhere", () => {
    const after = done(
      layout,
      copyBranch(layout, { segmentId: branch.id, toNodeId: first.toNodeId, mirror: "up-down" }, ids),
    );
    const copy = listOf(after, "segment").find(({ id }) => !layout.records.has(id)) as SegmentRecord;
    expect(copy).toMatchObject({ name: "Branch", section: branch.section, fromNodeId: first.toNodeId });
    expect(lengthFrom(after, copy.id)).toBeCloseTo(lengthFrom(layout, branch.id), 6);
    const end = find(after, "node", copy.toNodeId) as NodeRecord;
    expect(end.y_m).toBeCloseTo(-1 * feet(20), 6);
    expect(end.airflow_m3s).toBe((find(layout, "node", branch.toNodeId) as NodeRecord).airflow_m3s);
  });
});

describe("paste", () => {
  const row = {
    after: null,
    to: { kind: "length", length_m: feet(10), turn: "straight" },
    duct: {},
    outlet: null,
  } as const;

  it("hangs each row on the one it names", () => {
    const after = done(
      layout,
      pasteRows(
        layout,
        {
          atNodeId: first.toNodeId,
          rows: [row, { ...row, after: 0 }, { ...row, after: 0, to: { ...row.to, turn: "left" } }],
        },
        ids,
      ),
    );
    const added = listOf(after, "segment").filter(({ id }) => !layout.records.has(id));
    expect(added.map(({ fromNodeId }) => fromNodeId)).toEqual([first.toNodeId, added[0]?.toNodeId, added[0]?.toNodeId]);
  });

  it("is all or nothing, and names each row that cannot be", () => {
    const result = pasteRows(
      layout,
      { atNodeId: first.toNodeId, rows: [row, { ...row, to: { ...row.to, length_m: meters(0) } }] },
      ids,
    );
    expect(result).toMatchObject({
      ok: false,
      problems: [{ code: "rows-refused", message: "Row 2: A duct is longer than nothing." }],
    });
  });
});

describe("check", () => {
  const withSegment = (fields: Partial<SegmentRecord>, on: SegmentRecord = second) =>
    createLayout(recordsOf(layout).map((record) => (record.id === on.id ? { ...on, ...fields } : record)));
  const codes = (of: Layout) => checkLayout(of).map(({ code, recordId }) => [code, recordId]);

  it("finds nothing in a sound layout", () => {
    expect(checkLayout(layout)).toEqual([]);
  });

  it("names the duct of a loop", () => {
    const looped = withSegment({ fromNodeId: third.toNodeId }, second);
    expect(codes(looped).filter(([code]) => code === "segment-loops")).toHaveLength(1);
  });

  it("names a duct that leads where another leads", () => {
    expect(codes(withSegment({ toNodeId: first.toNodeId, fromNodeId: branch.toNodeId }, third))).toContainEqual([
      "node-has-two-parents",
      third.id,
    ]);
  });

  it("names a size of zero with its side", () => {
    const zero = withSegment({ section: { shape: "round", diameter_m: meters(0) } }, branch);
    expect(checkLayout(zero)).toMatchObject([
      { code: "size-not-positive", recordId: branch.id, field: "section/diameter_m", value: 0, name: "Branch" },
    ]);
  });

  it("names a node of nowhere", () => {
    expect(codes(withSegment({ fromNodeId: "nod_99999999999999999999999999" as never }))).toContainEqual([
      "reference-unknown",
      second.id,
    ]);
  });

  it("wants flexible duct round, and annular duct hollow", () => {
    expect(codes(withSegment({ flexible: true }, first))).toContainEqual(["flexible-not-round", first.id]);
    const solid = withSegment({
      section: { shape: "annular", outerDiameter_m: meters(0.3), innerDiameter_m: meters(0.3) },
    });
    expect(codes(solid)).toContainEqual(["inner-not-smaller-than-outer", second.id]);
  });
});

describe("refusals", () => {
  it("keep one piece of equipment in a system", () => {
    const levelId = listOf(layout, "level")[0]?.id ?? "";
    const result = placeEquipment(
      layout,
      { systemId, levelId, tag: "AH-2", x_m: meters(0), y_m: meters(0), elevation_m: meters(0) },
      ids,
    );
    expect(result).toMatchObject({ ok: false, problems: [{ code: "has-equipment" }] });
  });

  it("hang nothing on an outlet", () => {
    const result = extendRun(
      layout,
      {
        fromNodeId: branch.toNodeId,
        to: { kind: "length", length_m: feet(1), turn: "straight" },
        duct: {},
        outlet: null,
      },
      ids,
    );
    expect(result).toMatchObject({ ok: false, problems: [{ code: "outlet-goes-on" }] });
  });

  it("keep a level that ducts stand on", () => {
    const levelId = listOf(layout, "level")[0]?.id ?? "";
    expect(removeLevel(layout, { id: levelId })).toMatchObject({ ok: false, problems: [{ code: "level-in-use" }] });
    const more = done(layout, addLevel(layout, { name: "Level 2", elevation_m: feet(14) }, ids));
    const empty = listOf(more, "level")[1]?.id ?? "";
    expect(removeLevel(more, { id: empty }).ok).toBe(true);
  });
});

describe("air system", () => {
  it("holds every duct in tree order, the site's altitude and the company's friction basis", () => {
    const [system] = airSystemsFrom(layout, {
      specs: [{ id: specId, construction: {} as never }],
      altitude_m: meters(400),
      frictionBasis: "laminar-equivalent-diameter",
    });
    expect(system?.segments.map(({ id }) => id)).toEqual([first.id, second.id, third.id, branch.id]);
    expect(system?.nodes).toHaveLength(5);
    expect(system?.design.altitude_m).toBe(400);
    expect(system?.frictionBasis).toBe("laminar-equivalent-diameter");
  });
});
