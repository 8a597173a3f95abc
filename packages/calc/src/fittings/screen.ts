export const SCREEN_SOURCE = "Idelchik (1986), diagram 8-6, round wire; free area as set";

/**
 * Wire screen across the duct, on the duct's velocity pressure.
 *
 *     ζ = 1.3 (1 − f) + (1/f − 1)²
 *
 * Range    0 < f ≤ 1, f the share of the area left free; Reynolds number of the wire over 1,000
 * Source   Idelchik (1986), diagram 8-6
 *
 * @example screenCoefficient(0.6) // 0.964
 */
export const screenCoefficient = (freeArea: number): number => 1.3 * (1 - freeArea) + (1 / freeArea - 1) ** 2;
