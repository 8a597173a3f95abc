import { describe, expect, it } from "vitest";
import { inches, kilograms, KILOGRAMS_PER_POUND, meters } from "../quantity.ts";
import { hoursOf, hoursReader, type HoursRow, type ProductivityTable } from "./productivity.ts";
import { shippedProductivity } from "./productivity.table.ts";

const aRow = (more: Partial<HoursRow>): HoursRow => ({
  place: "field",
  kind: "straight",
  shape: null,
  material: null,
  upTo_m: null,
  per: "weight",
  hours_h: 1,
  standing: "own",
  note: "",
  ...more,
});
const tableOf = (...rows: HoursRow[]): ProductivityTable => ({ ...shippedProductivity, rows });
const question = {
  place: "field",
  kind: "straight",
  shape: "rectangular",
  material: "galvanized",
  size_m: inches(20),
} as const;

describe("the row of hours", () => {
  it("is the band that holds the size, whatever the order they were typed in", () => {
    const read = hoursReader(
      tableOf(aRow({ hours_h: 3 }), aRow({ upTo_m: inches(30), hours_h: 2 }), aRow({ upTo_m: inches(12), hours_h: 1 })),
    );
    expect(read({ ...question, size_m: inches(12) })?.hours_h).toBe(1);
    expect(read(question)?.hours_h).toBe(2);
    expect(read({ ...question, size_m: inches(31) })?.hours_h).toBe(3);
  });

  it("that names the metal goes before one that does not", () => {
    const read = hoursReader(
      tableOf(aRow({ upTo_m: inches(24), hours_h: 1 }), aRow({ material: "stainless", hours_h: 9 })),
    );
    expect(read({ ...question, material: "stainless" })?.hours_h).toBe(9);
    expect(read(question)?.hours_h).toBe(1);
  });

  it("of the very kind goes before one of any fitting", () => {
    const read = hoursReader(tableOf(aRow({ kind: "fitting", hours_h: 1 }), aRow({ kind: "elbow", hours_h: 2 })));
    expect(read({ ...question, kind: "elbow" })?.hours_h).toBe(2);
    expect(read({ ...question, kind: "branch" })?.hours_h).toBe(1);
    expect(read(question)).toBeNull();
  });

  it("past the last band is none", () => {
    expect(hoursReader(tableOf(aRow({ upTo_m: inches(12) })))(question)).toBeNull();
  });
});

describe("hours of a piece", () => {
  const measure = { weight: kilograms(10), length: meters(3) };
  it.each([
    ["weight", 5],
    ["length", 1.5],
    ["piece", 0.5],
  ] as const)("by %s come to %f", (per, hours) => {
    expect(hoursOf(aRow({ per, hours_h: 0.5 }), measure, 1)).toBe(hours);
  });
  it("follow the conditions in the field, not in the shop", () => {
    expect(hoursOf(aRow({ hours_h: 1 }), measure, 1.5)).toBe(15);
    expect(hoursOf(aRow({ place: "shop", hours_h: 1 }), measure, 1.5)).toBe(10);
  });
});

describe("the shipped hours", () => {
  it("hold a row for every kind, shape, metal and size", () => {
    const read = hoursReader(shippedProductivity);
    for (const material of ["galvanized", "stainless", "aluminum", "black-steel"] as const)
      for (const shape of ["round", "rectangular", "flat-oval"] as const)
        for (const kind of ["straight", "elbow", "transition", "branch", "end-cap"] as const)
          for (const place of ["shop", "field"] as const)
            for (const size of [4, 12, 30, 54, 84, 200])
              expect(read({ place, kind, shape, material, size_m: inches(size) })).not.toBeNull();
  });

  it("call themselves common practice, row by row", () => {
    expect(new Set(shippedProductivity.rows.map(({ standing }) => standing))).toEqual(new Set(["common practice"]));
  });

  it("hang 22 lb of 24 in. duct in an hour", () => {
    // Common practice, 16 to 30 lb an hour for sides over 12 to 30 in.; no single source.
    const row = hoursReader(shippedProductivity)({ ...question, size_m: inches(24) });
    expect(hoursOf(row, { weight: kilograms(22 * KILOGRAMS_PER_POUND), length: meters(1) }, 1)).toBeCloseTo(1, 12);
  });
});
