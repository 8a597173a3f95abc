/** Dates on screens, always in a named zone: a bid is due where the client is. */
const cache = new Map<string, Intl.DateTimeFormat>();

function formatter(zone: string | undefined, options: Intl.DateTimeFormatOptions): Intl.DateTimeFormat {
  const key = `${zone ?? ""}${JSON.stringify(options)}`;
  const known = cache.get(key);
  if (known) return known;
  const made = new Intl.DateTimeFormat("en-US", { ...options, ...(zone ? { timeZone: zone } : {}) });
  cache.set(key, made);
  return made;
}

/** "Thu Jun 18, 2:00 PM". */
export const dueText = (instant: string, zone: string): string =>
  formatter(zone, { weekday: "short", month: "short", day: "numeric", hour: "numeric", minute: "2-digit" })
    .format(new Date(instant))
    .replace(",", "");

/** "Jun 18, 2026". */
export const dayText = (instant: string, zone?: string): string =>
  formatter(zone, { month: "short", day: "numeric", year: "numeric" }).format(new Date(instant));

/** A calendar date, which belongs to no zone: "Jun 18, 2026". */
export const calendarDateText = (date: string): string => dayText(`${date}T00:00:00Z`, "UTC");

/** "Jun 18, 10:42 AM". */
export const momentText = (instant: string, zone?: string): string =>
  formatter(zone, { month: "short", day: "numeric", hour: "numeric", minute: "2-digit" }).format(new Date(instant));

/** "CDT". */
export const zoneName = (zone: string, instant: string): string =>
  formatter(zone, { timeZoneName: "short" })
    .formatToParts(new Date(instant))
    .find((part) => part.type === "timeZoneName")?.value ?? zone;

/** Year, month, day, hour, minute of an instant on the clocks of a zone: "2026-06-18T14:00". */
export function zonedClock(instant: string, zone: string): string {
  const parts = Object.fromEntries(
    formatter(zone, {
      year: "numeric",
      month: "2-digit",
      day: "2-digit",
      hour: "2-digit",
      minute: "2-digit",
      hourCycle: "h23",
    })
      .formatToParts(new Date(instant))
      .map((part) => [part.type, part.value]),
  );
  return `${parts.year}-${parts.month}-${parts.day}T${parts.hour}:${parts.minute}`;
}

/**
 * The instant at which the clocks of a zone show this. Where clocks go back, the earlier of the two; where they go
 * forward and the hour does not exist, the hour after.
 */
export function instantFromZonedClock(clock: string, zone: string): string | null {
  const asUtc = Date.parse(`${clock}:00Z`);
  if (Number.isNaN(asUtc)) return null;
  const hour = 3_600_000;
  const offsets = [-26, 0, 26].map((away) => offsetAt(asUtc + away * hour, zone));
  const fitting = [...new Set(offsets)]
    .map((offset) => asUtc - offset)
    .filter((instant) => zonedClock(new Date(instant).toISOString(), zone) === clock)
    .sort((a, b) => a - b);
  const chosen = fitting[0] ?? asUtc - Math.min(...offsets);
  return new Date(chosen).toISOString();
}

function offsetAt(instant: number, zone: string): number {
  const minute = Math.floor(instant / 60_000) * 60_000;
  return Date.parse(`${zonedClock(new Date(minute).toISOString(), zone)}:00Z`) - minute;
}

/** Whole days from one calendar date to another; negative when the second is earlier. */
export const daysBetween = (from: string, to: string): number =>
  Math.round((Date.parse(`${to}T00:00:00Z`) - Date.parse(`${from}T00:00:00Z`)) / 86_400_000);

export const todayIn = (zone: string, now: number): string =>
  zonedClock(new Date(now).toISOString(), zone).slice(0, 10);

/** How far away, in the words of a person: "in 2 days", "3 hours ago". */
export function awayText(instant: string, now: number): string {
  const minutes = Math.round((Date.parse(instant) - now) / 60_000);
  const words = new Intl.RelativeTimeFormat("en-US", { numeric: "auto" });
  if (Math.abs(minutes) < 60) return words.format(minutes, "minute");
  if (Math.abs(minutes) < 36 * 60) return words.format(Math.round(minutes / 60), "hour");
  return words.format(Math.round(minutes / 1440), "day");
}
