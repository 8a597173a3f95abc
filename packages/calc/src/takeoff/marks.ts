/** Piece marks: the segment's number, then a letter. Read aloud on a lift, painted on metal. */

/**
 * Number of each segment, unique in its system. A number that was given stays; of two that have the same the earlier id
 * keeps it; whoever has none gets the lowest that is free.
 *
 * @example markNumbers([{ id: "a", number: 2 }, { id: "b" }, { id: "c", number: 2 }]) // [2, 1, 3]
 */
export function markNumbers(
  segments: readonly { readonly id: string; readonly number?: number | null | undefined }[],
): number[] {
  const holders = new Map<number, number>();
  segments.forEach(({ id, number }, at) => {
    if (number === null || number === undefined) return;
    const holder = holders.get(number);
    if (holder === undefined || id < segments[holder]!.id) holders.set(number, at);
  });
  let free = 1;
  return segments.map(({ number }, at) => {
    if (number !== null && number !== undefined && holders.get(number) === at) return number;
    while (holders.has(free)) free++;
    return free++;
  });
}

/**
 * Letters of straight pieces. E, J, T and X name fittings; I and O look like 1 and 0.
 * After Y come two letters: AA, AB…
 */
const STRAIGHT_LETTERS = "ABCDFGHKLMNPQRSUVWY";

export const FITTING_LETTERS = { elbow: "E", transition: "T", branch: "J", "end-cap": "X" } as const;

/** Letters of the straight piece at this place in its segment, counted from 0. */
export function straightLetters(place: number): string {
  const base = STRAIGHT_LETTERS.length;
  let letters = "";
  for (let rest = place; rest >= 0; rest = Math.floor(rest / base) - 1) {
    letters = STRAIGHT_LETTERS.charAt(rest % base) + letters;
  }
  return letters;
}

export const straightMark = (segmentNumber: number, place: number): string =>
  `${segmentNumber}${straightLetters(place)}`;

/** "4T"; the second transition of one segment is "4T2". */
export const fittingMark = (segmentNumber: number, kind: keyof typeof FITTING_LETTERS, earlierOfKind: number): string =>
  `${segmentNumber}${FITTING_LETTERS[kind]}${earlierOfKind === 0 ? "" : earlierOfKind + 1}`;
