import type { Meters } from "../quantity.ts";

/** Beyond this the equation was not fitted; the answer stays, with a finding. */
export const FLEXIBLE_RANGE = { compression: 0.3, diameter_m: 0.3048 } as const;
export const FLEXIBLE_SOURCE =
  "Abushakra, Walker and Sherman (2004), ASHRAE Trans.; fitted to 30 % compression, 6 to 10 in.";

/**
 * Share by which flexible duct is pushed together, from how much too long it is left.
 *
 *     rc = 1 − L / Ls = s / (1 + s)     Ls = (1 + s) L
 */
export const compressionOfSlack = (slack: number): number => slack / (1 + slack);

/**
 * Friction of slack flexible duct over friction of the same duct pulled tight, per installed length.
 *
 *     1 + 0.58 rc e^(−0.00496 D)     rc in percent, D in mm
 *
 * Range    compression to 30 %, diameters to 12 in.; later measurements at 12 to 16 in. found more (Cantrill 2013)
 * Source   ASHRAE Handbook Fundamentals 2009 and later, duct design, after Abushakra, Walker and Sherman (2004); recalled
 *
 * @example slackFactor({ slack: 0, diameter: meters(0.2) }) // 1
 */
export const slackFactor = ({ slack, diameter }: { slack: number; diameter: Meters }): number =>
  slack === 0 ? 1 : 1 + 0.58 * (100 * compressionOfSlack(slack)) * Math.exp(-4.96 * diameter);
