import { describe, expect, it } from "vitest";
import { csvText } from "./csv.ts";
import { awayText, daysBetween, dueText, instantFromZonedClock, todayIn, zonedClock } from "./dates.ts";
import { microText, parseMicro, unitPriceText } from "./money.ts";
import { parsePercent, percentText } from "./percent.ts";

describe("a price that is typed", () => {
  it.each([
    ["1.25", 1_250_000],
    ["$1,204.255", 1_204_255_000],
    [".85", 850_000],
    ["0", 0],
    ["12.", 12_000_000],
    ["0.000001", 1],
  ])("%s is read", (typed, micro) => expect(parseMicro(typed)).toBe(micro));
  it.each(["", "abc", "1,20", "-3", "1.2.3", "1.1234567", "$"])("“%s” is refused", (typed) =>
    expect(parseMicro(typed)).toBeNull(),
  );
  it("is shown with two decimals at least and as many as it has", () => {
    expect(microText(1_000_000)).toBe("1.00");
    expect(microText(1_062_500)).toBe("1.0625");
    expect(unitPriceText(1_062_500, "USD")).toBe("$1.0625");
  });
  it("comes back as it was typed", () => {
    for (const micro of [0, 1, 10, 999_999, 1_062_500, 9_000_000_000_000])
      expect(parseMicro(microText(micro))).toBe(micro);
  });
});

describe("a percentage that is typed", () => {
  it.each([
    ["12.5", 1250],
    ["12.5 %", 1250],
    ["7%", 700],
    [".25", 25],
  ])("%s is read as basis points", (typed, bp) => expect(parsePercent(typed)).toBe(bp));
  it.each(["", "ten", "1.234", "-1"])("“%s” is refused", (typed) => expect(parsePercent(typed)).toBeNull());
  it("is shown without needless zeros", () =>
    expect([percentText(1400), percentText(1325)]).toEqual(["14 %", "13.25 %"]));
});

describe("a bid's hour", () => {
  it("is shown on the clocks where it is due", () => {
    expect(dueText("2026-06-18T19:00:00Z", "America/Chicago")).toBe("Thu Jun 18, 2:00 PM");
  });
  it("is read from those clocks, in summer and in winter", () => {
    expect(instantFromZonedClock("2026-06-18T14:00", "America/Chicago")).toBe("2026-06-18T19:00:00.000Z");
    expect(instantFromZonedClock("2026-12-18T14:00", "America/Chicago")).toBe("2026-12-18T20:00:00.000Z");
  });
  it("is the earlier of two where clocks go back", () => {
    // 2026-11-01 1:30 happens at 06:30Z (daylight time) and at 07:30Z.
    expect(instantFromZonedClock("2026-11-01T01:30", "America/Chicago")).toBe("2026-11-01T06:30:00.000Z");
  });
  it("is the hour after where clocks go forward over it", () => {
    // 2026-03-08 2:30 does not exist; clocks go from 2:00 to 3:00 at 08:00Z.
    const instant = instantFromZonedClock("2026-03-08T02:30", "America/Chicago");
    expect(zonedClock(instant ?? "", "America/Chicago")).toBe("2026-03-08T03:30");
  });
  it("is none while it is half typed", () => expect(instantFromZonedClock("2026-06", "America/Chicago")).toBeNull());
  it("belongs to the day of the place, not of the reader", () => {
    expect(todayIn("America/Los_Angeles", Date.parse("2026-06-18T03:00:00Z"))).toBe("2026-06-17");
  });
});

describe("time away", () => {
  const now = Date.parse("2026-06-18T12:00:00Z");
  it.each([
    ["2026-06-18T12:20:00Z", "in 20 minutes"],
    ["2026-06-18T09:00:00Z", "3 hours ago"],
    ["2026-06-21T12:00:00Z", "in 3 days"],
  ])("%s is %s", (instant, words) => expect(awayText(instant, now)).toBe(words));
  it("counts calendar days across a change of clocks", () => expect(daysBetween("2026-03-07", "2026-03-09")).toBe(2));
});

describe("CSV", () => {
  it("quotes what holds a comma, a quote or a line end", () => {
    expect(csvText([["a,b", 'say "x"', "two\nlines", 1.5, null]])).toBe('"a,b","say ""x""","two\nlines",1.5,\r\n');
  });
  it.each(["=1+1", "+1", "-1", "@x"])("writes %s as text that no spreadsheet runs", (cell) =>
    expect(csvText([[cell]])).toBe(`'${cell}\r\n`),
  );
  it("leaves negative numbers alone", () => expect(csvText([[-1.5]])).toBe("-1.5\r\n"));
});
