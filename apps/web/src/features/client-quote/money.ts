/** "$66,120.62", or without the sign in a column that says its currency once. */
export function money(minor: number, currency: string, display: "symbol" | "plain" = "symbol"): string {
  const format = new Intl.NumberFormat("en-US", {
    style: display === "symbol" ? "currency" : "decimal",
    currency,
    minimumFractionDigits: 2,
    maximumFractionDigits: 2,
  });
  return format.format(minor / 100);
}

/** A calendar date, in words: "July 17, 2026". */
export function dateInWords(date: string): string {
  return new Intl.DateTimeFormat("en-US", { dateStyle: "long", timeZone: "UTC" }).format(
    new Date(`${date.slice(0, 10)}T00:00:00Z`),
  );
}
