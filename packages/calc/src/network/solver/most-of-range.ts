/**
 * A row of numbers to which something can be added over a range, and whose greatest is always known: both in O(log n).
 * A binary tree in two columns; a branch keeps what was added to all of it, and the greatest below including that.
 */
export interface MostOfRange {
  readonly count: number;
  /** Leaves of the tree: a power of two. */
  readonly width: number;
  readonly added: Float64Array;
  readonly most: Float64Array;
}

export function mostOfRange(values: Float64Array): MostOfRange {
  let width = 1;
  while (width < values.length) width *= 2;
  const most = new Float64Array(2 * width).fill(-Infinity);
  most.set(values, width);
  for (let at = width - 1; at >= 1; at--) most[at] = Math.max(most[2 * at]!, most[2 * at + 1]!);
  return { count: values.length, width, added: new Float64Array(2 * width), most };
}

/** Adds to every value from `from` up to, not including, `to`. */
export function addToRange(row: MostOfRange, from: number, to: number, amount: number): void {
  if (from >= to || amount === 0) return;
  const { width, added, most } = row;
  let low = from + width;
  let high = to + width;
  const [firstLeaf, lastLeaf] = [low, high - 1];
  for (; low < high; low >>= 1, high >>= 1) {
    if ((low & 1) === 1) addToBranch(row, low++, amount);
    if ((high & 1) === 1) addToBranch(row, --high, amount);
  }
  for (const leaf of [firstLeaf, lastLeaf]) {
    for (let at = leaf >> 1; at >= 1; at >>= 1) most[at] = Math.max(most[2 * at]!, most[2 * at + 1]!) + added[at]!;
  }
}

function addToBranch({ added, most }: MostOfRange, at: number, amount: number): void {
  added[at]! += amount;
  most[at]! += amount;
}

export function valueAt({ width, added, most }: MostOfRange, index: number): number {
  let value = most[index + width]!;
  for (let at = (index + width) >> 1; at >= 1; at >>= 1) value += added[at]!;
  return value;
}

/** Where the greatest is; of equals, the first. */
export function placeOfMost({ width, most }: MostOfRange): number {
  let at = 1;
  while (at < width) at = most[2 * at]! >= most[2 * at + 1]! ? 2 * at : 2 * at + 1;
  return at - width;
}
