import type { Section } from "../air-system.ts";
import { laminarConstant } from "./laminar.ts";

/**
 * Laminar-equivalent diameter over hydraulic diameter: the round duct of that diameter has, in laminar flow, this section's
 * friction factor at the same velocity. Used in the Reynolds number it brings turbulent factors of non-circular sections closer
 * to those of the circle.
 *
 *     DL / Dh = 64 / (f·Re)laminar
 *
 * 1 for a circle; under 1 for wide rectangles and annuli (2/3 for parallel plates), a little over 1 for a square.
 *
 * Source   Jones, O. C. (1976), J. Fluids Eng. 98, 173–181, rectangles; Jones and Leung (1981), J. Fluids Eng. 103, 615–623,
 *          annuli; for flat ovals the same principle on our laminar constant
 *
 * @example laminarEquivalentRatio({ shape: "round", diameter_m: meters(0.3) }) // 1
 */
export const laminarEquivalentRatio = (section: Section): number => 64 / laminarConstant(section);
