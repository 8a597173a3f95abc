/** The calendar day where the company is, YYYY-MM-DD: prices are read for it. */
export const dayIn = (zone: string, now: Date): string =>
  new Intl.DateTimeFormat("en-CA", { timeZone: zone, dateStyle: "short" }).format(now);
