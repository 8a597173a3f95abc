import type { ProjectItem } from "@cleatwork/contracts";
import { describe, expect, it } from "vitest";
import { bidDays, openBids, urgency } from "./due.ts";
import { sheetFromFileName } from "./sheet-name.ts";

const ZONE = "America/Chicago";
/** Tuesday, June 16, 2026, 9:00 in Chicago. */
const NOW = Date.parse("2026-06-16T14:00:00Z");
const bid = (name: string, dueAt: string | null, more: Partial<ProjectItem> = {}): ProjectItem => ({
  id: `prj_${name}` as ProjectItem["id"],
  name,
  number: "",
  clientName: "Oxbow Builders",
  state: "bidding",
  dueAt,
  dueZone: ZONE,
  segmentCount: 0,
  price_minor: null,
  currency: "USD",
  quoteState: null,
  ...more,
});
const days = (...bids: ProjectItem[]) =>
  bidDays(openBids(bids), ZONE, NOW)
    .filter((day) => day.bids.length > 0)
    .map((day) => `${day.label}: ${day.bids.map((one) => one.name).join(", ")}`);

describe("the bid ruler", () => {
  it("shows ten working days and what is later, without empty weekends", () => {
    const labels = bidDays([], ZONE, NOW).map((day) => day.label);
    expect(labels).toHaveLength(11);
    expect(labels.slice(0, 5)).toEqual(["Today", "Wed Jun 17", "Thu Jun 18", "Fri Jun 19", "Mon Jun 22"]);
    expect(labels.at(-1)).toBe("Later");
  });
  it("has a weekend day where something is due on it", () => {
    expect(days(bid("a", "2026-06-20T18:00:00Z"))).toEqual(["Sat Jun 20: a"]);
  });
  it("puts a bid on the day of the place where it is due", () => {
    // 03:30Z on June 18 is still the evening of June 17 in Chicago.
    expect(days(bid("a", "2026-06-18T03:30:00Z"))).toEqual(["Wed Jun 17: a"]);
  });
  it("puts what is past first and what is far off last, each by time", () => {
    expect(
      days(
        bid("later", "2026-08-01T15:00:00Z"),
        bid("late", "2026-06-16T13:00:00Z"),
        bid("second", "2026-06-16T20:00:00Z"),
        bid("first", "2026-06-16T15:00:00Z"),
      ),
    ).toEqual(["Overdue: late", "Today: first, second", "Later: later"]);
  });
  it("leaves out what is no longer bid or has no date", () => {
    expect(days(bid("won", "2026-06-18T15:00:00Z", { state: "won" }), bid("dateless", null))).toEqual([]);
  });
});

describe("how pressing a bid is", () => {
  it.each([
    ["2026-06-16T13:59:00Z", "overdue"],
    ["2026-06-16T20:00:00Z", "due today"],
    ["2026-06-17T20:00:00Z", "due tomorrow"],
  ])("%s is %s", (dueAt, words) => expect(urgency(bid("a", dueAt), NOW)?.words).toBe(words));
  it("is nothing to say for a day further off, or for a quote that is out", () => {
    expect(urgency(bid("a", "2026-06-19T20:00:00Z"), NOW)).toBeNull();
    expect(urgency(bid("a", "2026-06-16T20:00:00Z", { state: "quoted" }), NOW)).toBeNull();
  });
});

describe("the sheet that a file name tells of", () => {
  it.each([
    ["M-101 Level 1 HVAC plan rev B.pdf", "M-101", "Level 1 HVAC plan", "B"],
    ["m201.pdf", "M201", "", ""],
    ["M-2.01_Roof_plan.PNG", "M-2.01", "Roof plan", ""],
    ["scan 0001.jpg", "", "", ""],
  ])("%s", (name, sheetNumber, title, revision) =>
    expect(sheetFromFileName(name)).toEqual({ sheetNumber, title, revision }),
  );
});
