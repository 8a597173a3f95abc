/** Piece marks: the segment's number in tree order, then a letter. Read aloud on a lift, painted on metal. */

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
