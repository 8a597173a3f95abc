import { describe, expect, it } from "vitest";
import type { AirNode, AirSegment } from "../air-system.ts";
import { meters, pascals } from "../quantity.ts";
import {
  aSystem,
  annular,
  duct,
  equipment,
  flatOval,
  junction,
  oneDuct,
  outlet,
  rectangular,
  round,
} from "../testing/air-system-builder.ts";
import { refused, solved } from "../testing/answers.ts";

const told = (nodes: readonly AirNode[], segments: readonly AirSegment[]) =>
  refused(aSystem(nodes, segments)).map(({ code, subject, field }) => [code, subject.id, field]);

const unit = equipment("unit", [0, 0]);
const a = junction("a", [5, 0]);
const b = junction("b", [10, 0]);
const out = outlet("out", [15, 0], 0.2);
const size = round(0.3);

describe("a layout that is no tree", () => {
  it("names the segment that leads back toward the equipment", () => {
    expect(
      told(
        [unit, a, b, out],
        [duct("unit", "a", size), duct("a", "b", size), duct("b", "a", size), duct("b", "out", size)],
      ),
    ).toEqual([["segment-loops", "b-a", "toNodeId"]]);
  });

  it("names each segment of a circle that hangs on nothing", () => {
    expect(told([unit, a, b, out], [duct("unit", "out", size), duct("a", "b", size), duct("b", "a", size)])).toEqual([
      ["segment-loops", "a-b", "toNodeId"],
      ["segment-loops", "b-a", "toNodeId"],
    ]);
  });

  it("names a segment from a node to itself", () => {
    expect(told([unit, a, out], [duct("unit", "a", size), duct("a", "a", size), duct("a", "out", size)])).toEqual([
      ["segment-loops", "a-a", "toNodeId"],
    ]);
  });

  it("names a segment into the equipment", () => {
    expect(told([unit, a, out], [duct("unit", "a", size), duct("a", "out", size), duct("a", "unit", size)])).toEqual([
      ["segment-loops", "a-unit", "toNodeId"],
    ]);
  });

  it("names the second segment that leads to a node", () => {
    const segments = [duct("unit", "a", size), duct("unit", "b", size), duct("a", "out", size), duct("b", "out", size)];
    expect(told([unit, a, b, out], segments)).toEqual([["node-has-two-parents", "b-out", "toNodeId"]]);
  });

  it("names nodes that nothing leads to", () => {
    expect(
      told([unit, out, a, outlet("far", [0, 9], 0.1)], [duct("unit", "out", size), duct("a", "far", size)]),
    ).toEqual([["node-orphaned", "a", "id"]]);
  });

  it("names the segment that ends without an outlet", () => {
    expect(told([unit, a, b, out], [duct("unit", "a", size), duct("a", "b", size), duct("a", "out", size)])).toEqual([
      ["dead-end-without-outlet", "a-b", "toNodeId"],
    ]);
  });

  it("names an outlet that a segment leaves", () => {
    const beyond = outlet("beyond", [20, 0], 0.1);
    expect(told([unit, out, beyond], [duct("unit", "out", size), duct("out", "beyond", size)])).toEqual([
      ["outlet-with-children", "out", "role"],
    ]);
  });

  it("names an end that is not in the system", () => {
    const codes = told([unit, out], [duct("unit", "out", size), duct("unit", "lost", size)]);
    expect(codes).toEqual([["node-unknown", "unit-lost", "toNodeId"]]);
  });

  it("names ids used twice", () => {
    const segments = [duct("unit", "a", size), duct("a", "out", size, { id: "unit-a" })];
    expect(told([unit, a, out], segments)).toEqual([["duplicate-id", "unit-a", "id"]]);
    expect(told([unit, out, { ...out }], [duct("unit", "out", size)]).map(([code]) => code)).toContain("duplicate-id");
  });

  it("refuses more segments in a row than any building has", () => {
    const chain = (count: number) => {
      const nodes = Array.from({ length: count - 1 }, (_, n) => junction(`n${n}`, [n + 1, 0]));
      const ends = [unit, ...nodes, outlet("end", [count + 1, 0], 0.2)];
      const ducts = ends.slice(1).map((node, n) => duct(ends[n]!.id, node.id, size));
      return aSystem(ends, ducts);
    };
    expect(solved(chain(1000)).paths[0]?.segmentIds).toHaveLength(1000);
    expect(refused(chain(1001)).map(({ code, subject }) => [code, subject.id])).toEqual([
      ["value-out-of-range", "n999-end"],
    ]);
  });

  it("asks for one piece of equipment and an outlet", () => {
    expect(told([], []).map(([code]) => code)).toEqual(["no-equipment", "no-outlet"]);
    const second = equipment("second", [1, 1]);
    expect(told([unit, second, out], [duct("unit", "out", size)])).toEqual([["several-equipment", "second", "role"]]);
  });
});

describe("a value that physics refuses", () => {
  const codes = (segment: Partial<AirSegment>) =>
    refused(oneDuct(segment.section ?? size, 0.2, segment)).map(({ code, field }) => [code, field]);

  it.each([0, -1, NaN, Infinity, -Infinity])("refuses a diameter of %s", (value) => {
    expect(codes({ section: round(value) })).toEqual([
      [value === Infinity ? "value-out-of-range" : "size-not-positive", "section.diameter_m"],
    ]);
  });

  it("tells both sides of a rectangle", () => {
    expect(codes({ section: rectangular(0, -2) })).toEqual([
      ["size-not-positive", "section.width_m"],
      ["size-not-positive", "section.height_m"],
    ]);
  });

  it("refuses an inner diameter that is not less than the outer", () => {
    expect(codes({ section: annular(0.3, 0.3) })).toEqual([
      ["inner-not-smaller-than-outer", "section.innerDiameter_m"],
    ]);
  });

  it("refuses a flat oval that stands on end", () => {
    expect(codes({ section: flatOval(0.2, 0.4) })).toEqual([["flat-oval-taller-than-wide", "section.height_m"]]);
  });

  it("refuses flexible duct that is not round", () => {
    expect(codes({ section: rectangular(0.3, 0.2), flexible: true })).toEqual([
      ["flexible-not-round", "section.shape"],
    ]);
  });

  it.each([0, -3, NaN])("refuses a length of %s", (value) => {
    expect(codes({ length_m: meters(value) })).toEqual([["length-not-positive", "length_m"]]);
  });

  it("refuses a length from nodes that stand on one point", () => {
    expect(refused(oneDuct(size, 0.2, { length: 0 })).map(({ code }) => code)).toEqual(["length-not-positive"]);
  });

  it("refuses liner that leaves no room for air", () => {
    const lined = { kind: "liner", thickness_m: meters(0.15) } as const;
    const spec = { ...oneDuct(size, 1).spec, sizesAre: "sheet-metal" } as const;
    const problems = refused(oneDuct(round(0.3), 0.2, { insulation: lined, system: { spec } }));
    expect(problems.map(({ code }) => code)).toEqual(["size-not-positive"]);
  });

  it.each([0, null])("refuses an outlet with an airflow of %s", (value) => {
    const system = oneDuct(size, 0.2);
    const nodes = system.nodes.map((node) =>
      node.id === "out" ? { ...node, airflow_m3s: value as (typeof node)["airflow_m3s"] } : node,
    );
    expect(refused({ ...system, nodes }).map(({ code, subject }) => [code, subject.id])).toEqual([
      ["outlet-without-airflow", "out"],
    ]);
  });

  it("tells NaN in words, because JSON has none", () => {
    const [problem] = refused(oneDuct(round(NaN), 0.2));
    expect(problem?.value).toBe("NaN");
    expect(problem?.limit).toBe("more than 0 and at most 10 m");
  });

  it("reports every problem of a system, not the first", () => {
    const system = oneDuct(round(0), 0.2, { length_m: meters(-1) });
    const design = { ...system.design, relativeHumidity: 3, availablePressure_pa: pascals(NaN) };
    expect(refused({ ...system, design }).map(({ field }) => field)).toEqual([
      "design.relativeHumidity",
      "design.availablePressure_pa",
      "section.diameter_m",
      "length_m",
    ]);
  });

  it("takes what is at the edge of a range", () => {
    const system = oneDuct(round(10), 1000, { length_m: meters(10_000) });
    expect(solved(system).segments).toHaveLength(1);
  });
});
