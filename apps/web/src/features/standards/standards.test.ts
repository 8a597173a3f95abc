import { inches, NO_COMPANY_STANDARDS, shippedStandards, type GaugeChart } from "@cleatwork/calc";
import { companyStandardsSchema } from "@cleatwork/contracts";
import { describe, expect, it } from "vitest";
import { chartLabel, hoursText, readGauge, readHours, readReinforcement, readSize, sizeText } from "./cells.ts";
import {
  chartsOf,
  copyCharts,
  copyHours,
  draftAfter,
  draftOf,
  dropCharts,
  isChanged,
  replaceChart,
  withSize,
} from "./standards-draft.ts";

describe("a cell", () => {
  it.each([
    ["24", "24 ga"],
    ["24 ga", "24 ga"],
    ["24GA", "24 ga"],
  ])("takes the gauge %s", (typed, gauge) => {
    expect(readGauge(typed, "galvanized")).toEqual({ ok: true, value: gauge });
  });
  it("takes a thickness where the metal is sold by it", () => {
    expect(readGauge(".05", "aluminum")).toEqual({ ok: true, value: "0.050 in." });
  });
  it("refuses a gauge of another metal with what is allowed", () => {
    const read = readGauge("24", "aluminum");
    expect(read).toMatchObject({ ok: false, allowed: expect.stringContaining("0.050 in.") as string });
  });
  it("tells blank, not required and not designed apart", () => {
    const read = (text: string) => readReinforcement(text, { kind: "blank" }, { spacing_m: inches(60) });
    expect(read("")).toEqual({ ok: true, value: { kind: "blank" } });
    expect(read("NR")).toEqual({ ok: true, value: { kind: "not-required" } });
    expect(read("not designed")).toEqual({ ok: true, value: { kind: "not-designed" } });
    expect(read("f")).toEqual({ ok: true, value: { kind: "required", grade: "F", spacing_m: inches(60) } });
  });
  it("shows and reads sizes in the company's units", () => {
    expect(sizeText(inches(24), "inch-pound")).toBe("24");
    expect(sizeText(0.6, "si")).toBe("600");
    expect(readSize("600", "si")).toEqual({ ok: true, value: 0.6 });
  });
  it("shows and reads hours by the pound as they are kept by the kilogram", () => {
    const kept = 1 / (25 * 0.45359237);
    expect(hoursText(kept, "weight", "inch-pound")).toBe("0.0400");
    const read = readHours("0.04", "weight", "inch-pound");
    expect(read.ok && read.value).toBeCloseTo(kept, 12);
  });
  it("names a chart by class and spacing", () => {
    const chart = shippedStandards.gauges.rows.find(
      ({ shape, spacing_m }) => shape === "rectangular" && spacing_m === inches(60),
    );
    expect(chart && chartLabel(chart, "inch-pound")).toBe("0.5 in. w.g., joints 5 ft");
  });
});

describe("the draft", () => {
  const copied = copyCharts(NO_COMPANY_STANDARDS, "galvanized", "rectangular");

  it("copied from what is shipped is the company's, and good as it is", () => {
    expect(chartsOf(NO_COMPANY_STANDARDS, "galvanized", "rectangular").owner).toBe("shipped");
    expect(chartsOf(copied, "galvanized", "rectangular").owner).toBe("company");
    expect(companyStandardsSchema.safeParse(copyHours(copied)).success).toBe(true);
    expect(dropCharts(copied, "galvanized", "rectangular")).toEqual(NO_COMPANY_STANDARDS);
  });

  it("undoes and does again, until it is saved", () => {
    const start = draftOf(NO_COMPANY_STANDARDS);
    const changed = draftAfter(start, { kind: "set", document: copied });
    expect(isChanged(changed)).toBe(true);
    const undone = draftAfter(changed, { kind: "undo" });
    expect([undone.now, isChanged(undone)]).toEqual([NO_COMPANY_STANDARDS, false]);
    expect(draftAfter(undone, { kind: "redo" }).now).toBe(copied);
    expect(draftAfter(changed, { kind: "discard" }).now).toBe(NO_COMPANY_STANDARDS);
    expect(draftAfter(changed, { kind: "saved", document: copied }).before).toEqual([]);
  });

  it("changes one size of one chart and nothing else", () => {
    const [chart] = chartsOf(copied, "galvanized", "rectangular").charts as [GaugeChart];
    const next = replaceChart(copied, chart, withSize(chart, 0, { ...chart.sizes[0]!, gauge: "22 ga" }));
    const differing = next.gauges!.rows.filter((each, index) => each !== copied.gauges!.rows[index]);
    expect(differing).toHaveLength(1);
    expect(differing[0]!.sizes[0]!.gauge).toBe("22 ga");
    expect(differing[0]!.sizes.slice(1)).toEqual(chart.sizes.slice(1));
  });
});
