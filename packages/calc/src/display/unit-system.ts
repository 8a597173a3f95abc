/** Inch-pound or SI is a matter of showing and reading numbers, and of nothing else. It exists in this folder only. */
export type UnitSystem = "inch-pound" | "si";

/** What a person reads: the number and its unit apart, so that a screen can set them in different sizes. */
export interface Shown {
  readonly text: string;
  readonly value: string;
  readonly unit: string;
}

export const shown = (value: string, unit: string): Shown => ({ text: unit ? `${value} ${unit}` : value, value, unit });

/** A minus that is as wide as a plus. */
const MINUS = "\u2212";

const formats = new Map<string, Intl.NumberFormat>();

/** "1,320", "0.151": grouped, with a fixed number of decimals. */
export function decimal(value: number, digits: number): string {
  const key = `${digits}`;
  let format = formats.get(key);
  if (!format) {
    format = new Intl.NumberFormat("en-US", { minimumFractionDigits: digits, maximumFractionDigits: digits });
    formats.set(key, format);
  }
  const text = format.format(value);
  // Rounding may leave a minus before a zero.
  if (!text.startsWith("-")) return text;
  return /[1-9]/.test(text) ? MINUS + text.slice(1) : text.slice(1);
}

/** "+0.032", "−115.30", or "0.00". */
export function signed(value: number, digits: number): string {
  const text = decimal(value, digits);
  return value > 0 && /[1-9]/.test(text) ? `+${text}` : text;
}
