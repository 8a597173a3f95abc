/** Sizes that a shop makes without asking. Inches, converted once; clear inside or sheet metal as the spec says. */
import { inches, type Meters } from "../quantity.ts";

const every = (step: number, from: number, to: number): readonly number[] =>
  Array.from({ length: Math.floor((to - from) / step) + 1 }, (_, index) => from + index * step);

export const standardSizes = {
  rectangular: {
    source: "common practice, no source: even inches",
    side_in: every(2, 4, 120),
    /** An owner's design handbook asks for 4:1 at most. */
    mostAspectRatio: 4,
  },
  round: {
    source: "a maker's spiral duct catalog (single facts), every 4 in. above 44 in. by common practice",
    diameter_in: [...every(1, 4, 18), ...every(2, 20, 44), ...every(4, 48, 84)],
  },
  flatOval: {
    source: "a maker's catalog: rolled from round spiral duct, so the girth stays; widths to the nearest inch",
    height_in: every(2, 4, 24),
    mostAspectRatio: 4,
  },
} as const;

export const standardDiameters: readonly Meters[] = standardSizes.round.diameter_in.map(inches);

/** Overall width of the flat oval of a height made from a round duct: girth stays, to the nearest inch. */
export const flatOvalWidth_in = ({ round_in, height_in }: { round_in: number; height_in: number }): number =>
  Math.round(height_in + (Math.PI * (round_in - height_in)) / 2);
