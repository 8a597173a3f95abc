/** A run of duct as pieces: whole sections, and the short one that is left. */
import { meters, type Meters } from "../quantity.ts";

/** Shorter than a tenth of a millimeter is arithmetic, not metal. */
const NOTHING = 1e-4;

/**
 * Lengths of the pieces of a straight, the short one last. They sum to the straight, within a
 * tenth of a millimeter.
 *
 * @example cutStraight(feet(37), inches(56.5)) // seven whole sections and one of 48.5 in.
 */
export function cutStraight(straight: Meters, sectionLength: Meters): { whole: number; rest: Meters } {
  if (straight < NOTHING) return { whole: 0, rest: meters(0) };
  const whole = Math.floor((straight + NOTHING) / sectionLength);
  const rest = straight - whole * sectionLength;
  return { whole, rest: meters(rest < NOTHING ? 0 : rest) };
}
