import { meters } from "@cleatwork/calc";
import type { ChangeSet, LayoutRecord, LevelId, LevelRecord, NodeId, NodeRecord, SystemId } from "@cleatwork/contracts";
import { describe, expect, test } from "vitest";
import { applySets } from "./layouts.rules.ts";

const LEVEL = "lvl_00000000000000000000000001" as LevelId;
const SYSTEM = "sys_00000000000000000000000001" as SystemId;
const NODE_A = "nod_0000000000000000000000000a" as NodeId;
const NODE_B = "nod_0000000000000000000000000b" as NodeId;

const level: LevelRecord = { kind: "level", id: LEVEL, name: "Level 1", elevation_m: meters(0), underlay: null };
const aNode = (id: NodeId, x: number): NodeRecord => ({
  kind: "node",
  id,
  systemId: SYSTEM,
  role: "junction",
  tag: "",
  levelId: LEVEL,
  x_m: meters(x),
  y_m: meters(0),
  elevation_m: meters(3),
  airflow_m3s: null,
  requiredPressure_pa: null,
  deviceKey: null,
  spaceName: "",
});

const set = (...changes: { before: LayoutRecord | null; after: LayoutRecord | null }[]): ChangeSet => ({
  label: "Edit",
  changes: changes.map((change) => ({ id: (change.after ?? change.before ?? level).id, ...change })),
});

describe("a batch of edits on the records as they stand", () => {
  test("an edit from an old base is accepted when others changed other records", () => {
    const movedByOthers = aNode(NODE_B, 9);
    const answer = applySets(
      [level, aNode(NODE_A, 1), movedByOthers],
      [set({ before: aNode(NODE_A, 1), after: aNode(NODE_A, 2) })],
    );
    expect(answer).toMatchObject({ kind: "applied", touched: new Set([NODE_A]) });
    if (answer.kind === "applied") expect(answer.records.get(NODE_B)).toEqual(movedByOthers);
  });

  test("an edit of a record that changed meanwhile is a conflict that shows the record as it stands", () => {
    const answer = applySets([level, aNode(NODE_A, 7)], [set({ before: aNode(NODE_A, 1), after: aNode(NODE_A, 2) })]);
    expect(answer).toEqual({
      kind: "conflict",
      errors: [
        {
          pointer: "/sets/0/changes/0",
          code: "record-changed",
          message: "the junction as it stands now",
          value: aNode(NODE_A, 7),
        },
      ],
    });
  });

  test("a record in conflict is named once, however often the batch edits it", () => {
    const answer = applySets(
      [level, aNode(NODE_A, 7)],
      [
        set({ before: aNode(NODE_A, 1), after: aNode(NODE_A, 2) }),
        set({ before: aNode(NODE_A, 2), after: aNode(NODE_A, 3) }),
      ],
    );
    expect(answer).toMatchObject({ kind: "conflict", errors: [{ pointer: "/sets/0/changes/0" }] });
    if (answer.kind === "conflict") expect(answer.errors).toHaveLength(1);
  });

  test("editing what someone removed is a conflict", () => {
    const answer = applySets([level], [set({ before: aNode(NODE_A, 1), after: aNode(NODE_A, 2) })]);
    expect(answer).toMatchObject({ kind: "conflict", errors: [{ code: "record-gone", value: null }] });
  });

  test("adding an id that is taken is a conflict", () => {
    const answer = applySets([level, aNode(NODE_A, 1)], [set({ before: null, after: aNode(NODE_A, 2) })]);
    expect(answer).toMatchObject({ kind: "conflict", errors: [{ code: "record-exists" }] });
  });

  test("later sets build on earlier ones", () => {
    const answer = applySets(
      [level],
      [set({ before: null, after: aNode(NODE_A, 1) }), set({ before: aNode(NODE_A, 1), after: null })],
    );
    expect(answer).toMatchObject({ kind: "applied", touched: new Set([NODE_A]) });
    if (answer.kind === "applied") expect(answer.records.has(NODE_A)).toBe(false);
  });

  test("a change whose records carry another id is malformed", () => {
    const answer = applySets(
      [level],
      [{ label: "Edit", changes: [{ id: NODE_B, before: null, after: aNode(NODE_A, 1) }] }],
    );
    expect(answer).toMatchObject({ kind: "malformed", errors: [{ code: "ids-differ", value: NODE_A }] });
  });

  test("a change of nothing into nothing is malformed", () => {
    const answer = applySets([level], [{ label: "Edit", changes: [{ id: NODE_B, before: null, after: null }] }]);
    expect(answer).toMatchObject({ kind: "malformed", errors: [{ code: "change-empty" }] });
  });
});
