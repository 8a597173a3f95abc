/** When bids are due, read by the clocks of the place where they are due. */
import type { ProjectItem } from "@cleatwork/contracts";
import { daysBetween, todayIn, zonedClock } from "../../lib/format/dates.ts";
import type { Severity } from "../../ui/severity.tsx";

export interface BidDay {
  readonly key: string;
  /** YYYY-MM-DD; null for what is before or after the days shown. */
  readonly date: string | null;
  readonly label: string;
  readonly weekend: boolean;
  readonly bids: readonly ProjectItem[];
}

export type DatedBid = ProjectItem & { readonly dueAt: string };

export const openBids = (projects: readonly ProjectItem[]): readonly DatedBid[] =>
  projects
    .filter((project): project is DatedBid => project.state === "bidding" && project.dueAt !== null)
    .sort((a, b) => a.dueAt.localeCompare(b.dueAt));

/**
 * Working days from today on, and a weekend day where something is due on it; before them what is overdue, after them what
 * comes later.
 */
export function bidDays(bids: readonly DatedBid[], zone: string, now: number, workingDays = 10): readonly BidDay[] {
  const today = todayIn(zone, now);
  const overdue = bids.filter((bid) => Date.parse(bid.dueAt) < now);
  const ahead = bids.filter((bid) => Date.parse(bid.dueAt) >= now);
  const dayOf = (bid: DatedBid) => zonedClock(bid.dueAt, bid.dueZone).slice(0, 10);

  const days: BidDay[] = [];
  let last = today;
  for (let offset = 0, working = 0; working < workingDays; offset++) {
    const date = new Date(Date.parse(`${today}T00:00:00Z`) + offset * 86_400_000);
    const key = date.toISOString().slice(0, 10);
    const weekend = [0, 6].includes(date.getUTCDay());
    const due = ahead.filter((bid) => dayOf(bid) === key);
    if (!weekend) working++;
    last = key;
    if (weekend && due.length === 0) continue;
    days.push({ key, date: key, label: dayLabel(date, offset), weekend, bids: due });
  }
  const later = ahead.filter((bid) => dayOf(bid) > last || dayOf(bid) < today);
  return [
    ...(overdue.length > 0 ? [{ key: "overdue", date: null, label: "Overdue", weekend: false, bids: overdue }] : []),
    ...days,
    { key: "later", date: null, label: "Later", weekend: false, bids: later },
  ];
}

const dayLabel = (date: Date, offset: number): string =>
  offset === 0
    ? "Today"
    : new Intl.DateTimeFormat("en-US", { weekday: "short", month: "short", day: "numeric", timeZone: "UTC" })
        .format(date)
        .replace(",", "");

/** How pressing a bid is: overdue, today or tomorrow, or neither. */
export function urgency(project: ProjectItem, now: number): { severity: Severity; words: string } | null {
  if (project.state !== "bidding" || project.dueAt === null) return null;
  if (Date.parse(project.dueAt) < now) return { severity: "stop", words: "overdue" };
  const away = daysBetween(todayIn(project.dueZone, now), zonedClock(project.dueAt, project.dueZone).slice(0, 10));
  if (away === 0) return { severity: "warn", words: "due today" };
  if (away === 1) return { severity: "warn", words: "due tomorrow" };
  return null;
}
