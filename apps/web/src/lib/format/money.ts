/** Money on screens. Amounts are integer minor units; unit prices millionths of a major unit. */
export function moneyText(minor: number, currency: string, options: { cents?: boolean } = {}): string {
  const digits = options.cents === false ? 0 : 2;
  return new Intl.NumberFormat("en-US", {
    style: "currency",
    currency,
    minimumFractionDigits: digits,
    maximumFractionDigits: digits,
  }).format(minor / 100);
}

/** A unit price: two decimals at least, as many as it has. */
export function unitPriceText(micro: number, currency: string): string {
  return new Intl.NumberFormat("en-US", {
    style: "currency",
    currency,
    minimumFractionDigits: 2,
    maximumFractionDigits: 6,
  }).format(micro / 1e6);
}

/** What people type for a price (`$1,250.50`, `1250.5`, `.85`) to millionths; null when it is none. */
export function parseMicro(text: string): number | null {
  const match = /^\$?\s*(\d{1,3}(?:,\d{3})+|\d*)(?:\.(\d{0,6}))?$/.exec(text.trim());
  if (!match || text.replace(/\D/g, "") === "") return null;
  const whole = (match[1] ?? "").replace(/,/g, "") || "0";
  const fraction = (match[2] ?? "").padEnd(6, "0");
  const micro = Number(whole) * 1_000_000 + Number(fraction);
  return Number.isSafeInteger(micro) ? micro : null;
}

export const microText = (micro: number): string => {
  const [whole = "0", fraction = ""] = (micro / 1e6).toFixed(6).split(".");
  return `${whole}.${fraction.replace(/0{1,4}$/, "")}`;
};
