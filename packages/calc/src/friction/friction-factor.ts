import type { Section } from "../air-system.ts";
import type { FlowRegime } from "../network/solution.ts";
import { colebrookFrictionFactor } from "./colebrook.ts";
import { laminarConstant } from "./laminar.ts";

/** Common practice: laminar below a Reynolds number of 2,000, turbulent above 4,000, no authoritative formula between. */
export const LAMINAR_UNDER_REYNOLDS = 2000;
export const TURBULENT_FROM_REYNOLDS = 4000;

export const flowRegime = (reynoldsNumber: number): FlowRegime =>
  reynoldsNumber < LAMINAR_UNDER_REYNOLDS
    ? "laminar"
    : reynoldsNumber < TURBULENT_FROM_REYNOLDS
      ? "transitional"
      : "turbulent";

/**
 * Darcy friction factor on the hydraulic diameter, for any Reynolds number.
 *
 * Laminar by the exact constant of the shape, turbulent by Colebrook. Between the two the factor goes from the laminar value
 * at 2,000 to the turbulent value at 4,000, linearly in the logarithm of both, so that it is continuous and more flow never
 * loses less.
 *
 * `turbulentScale` multiplies the Reynolds number in turbulent flow: 1 on the hydraulic diameter, `laminarEquivalentRatio` on the
 * laminar-equivalent one. Laminar flow is exact by shape and knows no such choice.
 *
 * Range    Re > 0
 * Source   regimes: common practice, no source; blend: our choice, flagged by the regime in the answer
 */
export function darcyFrictionFactor(
  section: Section,
  reynoldsNumber: number,
  relativeRoughness: number,
  turbulentScale = 1,
): number {
  if (reynoldsNumber >= TURBULENT_FROM_REYNOLDS)
    return colebrookFrictionFactor(turbulentScale * reynoldsNumber, relativeRoughness).value;

  const constant = laminarConstant(section);
  if (reynoldsNumber < LAMINAR_UNDER_REYNOLDS) return constant / reynoldsNumber;

  const laminarEnd = Math.log(constant / LAMINAR_UNDER_REYNOLDS);
  const turbulentEnd = Math.log(
    colebrookFrictionFactor(turbulentScale * TURBULENT_FROM_REYNOLDS, relativeRoughness).value,
  );
  const share =
    Math.log(reynoldsNumber / LAMINAR_UNDER_REYNOLDS) / Math.log(TURBULENT_FROM_REYNOLDS / LAMINAR_UNDER_REYNOLDS);
  return Math.exp(laminarEnd + share * (turbulentEnd - laminarEnd));
}
