/** Losses where the duct meets a room or a box, on the velocity pressure of the duct. */
import type { MouthType } from "../air-system.ts";

export const ENTRY_SOURCE = "Idelchik (1986), diagrams 3-1 and 3-4";
export const EXIT_SOURCE = "Air that leaves loses one velocity pressure; exact for an even profile";

/** Air that leaves an open duct end, into a room or a box, loses all its velocity pressure. Exact for an even profile. */
export const OPEN_EXIT_COEFFICIENT = 1;

/**
 * Air that enters a duct end flush with a wall, over a rounded edge.
 *
 *     ζ = 0.03 + 0.47 · 10^(−7.7 r/D)
 *
 * Range    r/D ≥ 0; 0 is the sharp flush edge, 0.5
 * Source   Idelchik (1986), diagram 3-4, bellmouth in a wall, as fitted there
 *
 * @example flushEntryCoefficient(0.1) // 0.110
 */
export const flushEntryCoefficient = (radiusRatio: number): number => 0.03 + 0.47 * 10 ** (-7.7 * radiusRatio);

/** Air that enters a plain, sharp, thin end standing free by half a diameter or more. Source: Idelchik (1986), diagram 3-1. */
export const OPEN_ENTRY_COEFFICIENT = 1;

/** Air that enters the duct through a mouth of this form. A plenum's wall is flush; an open exit taken the wrong way projects. */
export function entryCoefficient(mouth: MouthType, bellmouthRadiusRatio: number): number {
  switch (mouth) {
    case "entry-bellmouth":
      return flushEntryCoefficient(bellmouthRadiusRatio);
    case "entry-flush":
    case "plenum":
      return flushEntryCoefficient(0);
    case "entry-projecting":
    case "exit-open":
      return OPEN_ENTRY_COEFFICIENT;
  }
}
