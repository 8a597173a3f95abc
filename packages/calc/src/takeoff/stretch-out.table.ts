/** How much wider than the duct's girth its wrap is cut, overlap of 2 in. included. */
import type { Section } from "../air-system.ts";
import { inches, meters, METERS_PER_INCH, type Meters } from "../quantity.ts";

export const stretchOutTable = {
  source: "Insulation makers' guide specification 23 07 13 (2017), table 2; 1 in. from a second maker's article",
  /** Inches, by label thickness. Flat oval and annular as round. */
  rows: [
    { thickness: 1, round: 7, rectangular: 6 },
    { thickness: 1.5, round: 9.5, rectangular: 8 },
    { thickness: 2, round: 12, rectangular: 10 },
    { thickness: 2.2, round: 13, rectangular: 11 },
    { thickness: 3, round: 17, rectangular: 14.5 },
  ],
} as const;

const OVERLAP = inches(2);

/** Added to the girth, at least the overlap. Between rows and past the ends the line through the two nearest rows. */
export function stretchOut(section: Section, thickness: Meters): Meters {
  const { rows } = stretchOutTable;
  const column = section.shape === "rectangular" ? "rectangular" : "round";
  const thickness_in = thickness / METERS_PER_INCH;
  let above = 1;
  while (above < rows.length - 1 && thickness_in > rows[above]!.thickness) above++;
  const low = rows[above - 1]!;
  const high = rows[above]!;
  const share = (thickness_in - low.thickness) / (high.thickness - low.thickness);
  return meters(Math.max(OVERLAP, inches(low[column] + share * (high[column] - low[column]))));
}
