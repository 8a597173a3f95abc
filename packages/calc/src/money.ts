/** Money in integer minor units. Nothing here holds a fraction of a cent; rounding happens once, half away from zero. */

/** Hundredths: the currencies we serve have two decimals. */
export const MINOR_PER_MAJOR = 100;
/** A unit price is kept in millionths of the major unit. */
export const MICRO_PER_MAJOR = 1_000_000;
const MICRO_PER_MINOR = BigInt(MICRO_PER_MAJOR / MINOR_PER_MAJOR);
/** Quantities are read to the millionth of their unit. */
const PARTS_PER_UNIT = 1_000_000;

/** n ÷ d to the nearest whole number, halves away from zero. */
export function divideRounded(numerator: bigint, denominator: bigint): bigint {
  if (denominator === 0n) throw new RangeError("division by zero");
  const isNegative = numerator < 0n !== denominator < 0n;
  const n = numerator < 0n ? -numerator : numerator;
  const d = denominator < 0n ? -denominator : denominator;
  const whole = (2n * n + d) / (2n * d);
  return isNegative ? -whole : whole;
}

/** To so many decimals, halves away from zero. Reads the number as it is printed, so that 1.005 goes up. */
export function roundTo(value: number, decimals: number): number {
  if (!Number.isFinite(value)) throw new RangeError(`not a finite number: ${value}`);
  const [digits = "0", exponent = "0"] = Math.abs(value).toExponential().split("e");
  const scaled = Math.round(Number(`${digits}e${Number(exponent) + decimals}`));
  const rounded = Number(`${scaled}e${-decimals}`);
  return value < 0 && rounded !== 0 ? -rounded : rounded;
}

/**
 * Quantity × unit price, rounded once to the minor unit, half away from zero. Exact: integers throughout.
 *
 * Range    quantity to 6 decimals; the answer within ±2⁵³ minor units
 *
 * @example lineAmount({ quantity: 37.333, unitPrice_micro: 1_155_000 }) // 4312
 */
export function lineAmount(line: { readonly quantity: number; readonly unitPrice_micro: number }): number {
  const parts = BigInt(roundTo(line.quantity * PARTS_PER_UNIT, 0));
  return Number(divideRounded(parts * BigInt(line.unitPrice_micro), BigInt(PARTS_PER_UNIT) * MICRO_PER_MINOR));
}

/** A percentage in basis points of an integer amount, rounded once, half away from zero. */
export const percentOf = (amount_minor: number, rate_bp: number): number =>
  Number(divideRounded(BigInt(amount_minor) * BigInt(rate_bp), 10_000n));

/** Sum of integers; refuses to pass the range in which they are exact. */
export function sumMinor(amounts: readonly number[]): number {
  let sum = 0;
  for (const amount of amounts) sum += amount;
  if (!Number.isSafeInteger(sum)) throw new RangeError("an amount of money is a whole number within the exact range");
  return sum;
}

/**
 * Splits an amount in proportion to weights so that the parts add up to it: whole shares first, then the units left over
 * go one by one to the largest remainders, the earlier first where they are alike. Without any weight it is split evenly.
 *
 * Range    weights finite, none negative; no parts for no weights, and then nothing to split
 */
export function allocate(amount_minor: number, weights: readonly number[]): readonly number[] {
  if (weights.some((weight) => !(Number.isFinite(weight) && weight >= 0))) {
    throw new RangeError("weights are finite and not negative");
  }
  if (weights.length === 0) {
    if (amount_minor !== 0) throw new RangeError("an amount needs at least one part to go to");
    return [];
  }
  const total = weights.reduce((sum, weight) => sum + weight, 0);
  const shares = weights.map((weight) => (total > 0 ? weight / total : 1 / weights.length));
  const magnitude = Math.abs(amount_minor);
  const exact = shares.map((share) => share * magnitude);
  const parts = exact.map(Math.floor);
  let left = magnitude - parts.reduce((sum, part) => sum + part, 0);
  const byRemainder = exact
    .map((value, index) => ({ index, remainder: value - Math.floor(value) }))
    .sort((a, b) => b.remainder - a.remainder || a.index - b.index);
  for (let turn = 0; left !== 0; turn++) {
    const step = left > 0 ? 1 : -1;
    const { index } = byRemainder[turn % byRemainder.length]!;
    // Rounding of shares may give one unit too many; it is taken back where there is one.
    if (parts[index]! + step < 0) continue;
    parts[index]! += step;
    left -= step;
  }
  return amount_minor < 0 ? parts.map((part) => (part === 0 ? 0 : -part)) : parts;
}
