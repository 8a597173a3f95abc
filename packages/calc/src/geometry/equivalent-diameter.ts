/** The round duct that loses as much per meter at the same volumetric flow rate. For friction and for people, not for velocity. */
import type { Section } from "../air-system.ts";
import { meters, type Meters, type SquareMeters } from "../quantity.ts";

/**
 * Equivalent diameter of a rectangular duct.
 *
 *     De = 1.30 (w h)^0.625 / (w + h)^0.25
 *
 * Not the hydraulic diameter; velocity pressure still comes from the real cross-section.
 *
 * Range    sides > 0; checked against the printed table up to an aspect ratio of 5
 * Source   Huebscher, R. G. (1948), ASHVE Trans. 54, 101–118. Disputed: Koch (2008), Building Serv. Eng. Res. Technol. 29,
 *          341–347. We follow the table that the trade uses; friction itself is computed on the hydraulic diameter.
 *
 * @example equivalentDiameterOfRectangle({ width: inches(30), height: inches(12) }) // 0.5136 m (20.2 in.)
 */
export const equivalentDiameterOfRectangle = ({ width, height }: { width: Meters; height: Meters }): Meters =>
  meters(1.3 * equalFrictionPower(width * height, width + height));

/**
 * Equivalent diameter of a flat oval duct.
 *
 *     De = 1.55 A^0.625 / P^0.25
 *
 * Source   Heyt, J. W., Diaz, M. J. (1975), ASHRAE Trans. 81(2), 221–232
 *
 * @example a flat oval of 20 × 10 in.: 14.3 in.
 */
export const equivalentDiameterOfFlatOval = (duct: { area: SquareMeters; perimeter: Meters }): Meters =>
  meters(1.55 * equalFrictionPower(duct.area, duct.perimeter));

/**
 * Equivalent diameter of an annulus: no published formula is known to us, so it follows from equal friction rate and flow
 * rate with one friction factor for both ducts, Dh A² = De (π De² / 4)².
 *
 *     De = (16 Dh A² / π²)^(1/5)
 *
 * Source   derived here; within 2 % of equal friction computed in full for Re > 10⁴ (friction.test.ts)
 */
export const equivalentDiameterOfAnnulus = (duct: { area: SquareMeters; hydraulicDiameter: Meters }): Meters =>
  meters(((16 * duct.hydraulicDiameter * duct.area * duct.area) / (Math.PI * Math.PI)) ** 0.2);

/** Equivalent diameter of any section, from measures that the caller already has. */
export function equivalentDiameter(
  section: Section,
  area: SquareMeters,
  perimeter: Meters,
  hydraulicDiameter: Meters,
): Meters {
  switch (section.shape) {
    case "round":
      return section.diameter_m;
    case "rectangular":
      return equivalentDiameterOfRectangle({ width: section.width_m, height: section.height_m });
    case "flat-oval":
      return equivalentDiameterOfFlatOval({ area, perimeter });
    case "annular":
      return equivalentDiameterOfAnnulus({ area, hydraulicDiameter });
  }
}

/**
 * area^0.625 / span^0.25, which both formulas have in common.
 *
 * Written as (area² √area / span)^¼: square roots are several times faster than a general power.
 */
const equalFrictionPower = (area: number, span: number): number =>
  Math.sqrt(Math.sqrt((area * area * Math.sqrt(area)) / span));
