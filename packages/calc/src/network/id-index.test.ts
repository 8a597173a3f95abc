import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { NOT_FOUND, findId, indexIds } from "./id-index.ts";

const records = (ids: readonly string[]) => ids.map((id) => ({ id }));

/** Ids that differ only where they are not looked at first. */
const crowded = Array.from({ length: 4096 }, (_, n) => `${String(n).padStart(4, "0")}-the-same-end`);

describe("an index of ids", () => {
  it("finds what a Map finds, for any ids", () => {
    fc.assert(
      fc.property(fc.array(fc.string()), fc.array(fc.string()), (ids, others) => {
        const index = indexIds(records(ids));
        for (const id of [...ids, ...others]) expect(findId(index, id)).toBe(ids.indexOf(id));
        expect(index.hasDuplicates).toBe(new Set(ids).size < ids.length);
      }),
    );
  });

  it("stays quick for ids chosen to collide, and as right", () => {
    const index = indexIds(records(crowded));
    expect(index.map).not.toBeNull();
    expect(index.hasDuplicates).toBe(false);
    expect(findId(index, crowded[4000] ?? "")).toBe(4000);
    expect(findId(index, "4096-the-same-end")).toBe(NOT_FOUND);
    expect(indexIds(records([...crowded, crowded[0] ?? ""])).hasDuplicates).toBe(true);
  });
});
