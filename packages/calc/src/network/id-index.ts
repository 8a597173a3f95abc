/**
 * Finds a record by its id. Small and for this one use, because the built-in Map takes five times as long to fill as the
 * whole rest of the structure check; it steps in when ids were chosen so that they all fall on one place.
 */
export interface IdIndex {
  readonly records: readonly { readonly id: string }[];
  /** Index + 1 of a record, 0 where empty; open addressing, at most half full. */
  readonly slots: Slots;
  readonly hasDuplicates: boolean;
  /** Used instead of the slots when they would be slow. */
  readonly map: Map<string, number> | null;
}

/** Small numbers where they suffice: half the memory to clear. */
type Slots = Uint16Array | Int32Array;

export const NOT_FOUND = -1;

/** So many steps for each record are never needed by chance. */
const MOST_STEPS = 16;

export function indexIds(records: readonly { readonly id: string }[]): IdIndex {
  let size = 16;
  while (size < 2 * records.length) size *= 2;
  const slots = records.length < 0xffff ? new Uint16Array(size) : new Int32Array(size);
  const stepsLeft = MOST_STEPS * records.length;
  const answer = fill(records, slots, stepsLeft);
  return answer === CROWDED ? indexByMap(records) : { records, slots, hasDuplicates: answer > 0, map: null };
}

const CROWDED = -1;

/** Number of ids that were there already, or CROWDED. */
function fill(records: readonly { readonly id: string }[], slots: Slots, steps: number): number {
  const mask = slots.length - 1;
  let duplicates = 0;
  let stepsLeft = steps;
  for (let r = 0; r < records.length; r++) {
    const id = records[r]!.id;
    let at = hash(id) & mask;
    while (slots[at] !== 0 && records[slots[at]! - 1]!.id !== id) {
      at = (at + 1) & mask;
      if (--stepsLeft < 0) return CROWDED;
    }
    if (slots[at] === 0) slots[at] = r + 1;
    else duplicates++;
  }
  return duplicates;
}

function indexByMap(records: readonly { readonly id: string }[]): IdIndex {
  const map = new Map<string, number>();
  records.forEach(({ id }, index) => {
    if (!map.has(id)) map.set(id, index);
  });
  return { records, slots: new Int32Array(0), hasDuplicates: map.size < records.length, map };
}

/** The first record with the id, or NOT_FOUND. */
export function findId(index: IdIndex, id: string): number {
  if (index.map !== null) return index.map.get(id) ?? NOT_FOUND;
  const { records, slots } = index;
  const mask = slots.length - 1;
  let at = hash(id) & mask;
  while (slots[at] !== 0) {
    const found = slots[at]! - 1;
    if (records[found]!.id === id) return found;
    at = (at + 1) & mask;
  }
  return NOT_FOUND;
}

/** The same, for an id that is likely the one at `guess`: layouts tell nodes and segments in the order they were drawn. */
export function findIdNear(index: IdIndex, id: string, guess: number): number {
  const { records } = index;
  return guess >= 0 && guess < records.length && records[guess]!.id === id ? guess : findId(index, id);
}

/**
 * Ids differ in their last letters, whether counted or drawn by chance; those that do not are found by the Map. Written out
 * letter by letter because the engine then reads a string three times as fast as in a loop.
 */
function hash(id: string): number {
  const n = id.length;
  const letters =
    n < 6
      ? shortHash(id)
      : id.charCodeAt(n - 1) +
        (id.charCodeAt(n - 2) << 5) +
        (id.charCodeAt(n - 3) << 10) +
        (id.charCodeAt(n - 4) << 15) +
        (id.charCodeAt(n - 5) << 20) +
        (id.charCodeAt(n - 6) << 25);
  const mixed = Math.imul(letters, 0x9e3779b1);
  return mixed ^ (mixed >>> 15);
}

function shortHash(id: string): number {
  let letters = id.length;
  for (let i = 0; i < id.length; i++) letters = (letters << 5) + id.charCodeAt(i);
  return letters;
}
