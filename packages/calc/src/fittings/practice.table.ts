/** Coefficients for which no formula may be shipped or none is published: a company's own to set. */
import type { DamperBlade } from "./throttled-damper.ts";

export interface PracticeCoefficients {
  /** Where they come from: told with every coefficient that they are in. */
  readonly source: string;
  /** Gored round elbow over a smooth one of the same radius, by pieces; of more than five the last row. */
  readonly goredOverSmooth: { readonly pieces3: number; readonly pieces4: number; readonly pieces5: number };
  /** Square-throat elbow with turning vanes, 90°. */
  readonly vanedElbow: number;
  /** Tap with a shoe or cone over a straight tap, where the straight one loses. */
  readonly easedTapOverStraight: { readonly shoe: number; readonly conical: number };
  /** Least loss of a change of shape, on the smaller area. */
  readonly shapeChange: number;
  /** Each turn of an offset chosen where none is drawn. */
  readonly offsetAngle_rad: number;
  /** Edge radius of a bellmouth over the duct's diameter. */
  readonly bellmouthRadiusRatio: number;
  /** Share of its area that a screen leaves free. */
  readonly screenFreeArea: number;
  readonly damper: { readonly rectangular: DamperBlade; readonly other: DamperBlade };
  readonly fireDamper: number;
  readonly smokeDamper: number;
  readonly flexibleConnector: number;
  readonly accessDoor: number;
}

const PRACTICE_SOURCE = "common practice, no source; set your own";

export const shippedPractice: PracticeCoefficients = {
  source: PRACTICE_SOURCE,
  // Printed tables lie at 1.39 to 2.37, 1.29 to 1.73 and 1.19 to 1.40 times our smooth elbow.
  goredOverSmooth: { pieces3: 1.8, pieces4: 1.5, pieces5: 1.3 },
  // Printed figures run from 0.11 to 0.33 with the vane and its spacing.
  vanedElbow: 0.25,
  easedTapOverStraight: { shoe: 0.65, conical: 0.65 },
  shapeChange: 0.05,
  offsetAngle_rad: Math.PI / 4,
  bellmouthRadiusRatio: 0.2,
  screenFreeArea: 0.7,
  damper: {
    // 1.4 keeps within a sixth of recalled rows for one blade in a rectangular duct to 50°.
    rectangular: { open: 0.04, jet: 1.4 },
    // The jet term is Idelchik's own.
    other: { open: 0.2, jet: 1.56 },
  },
  // Curtain in the airstream's edge.
  fireDamper: 0.19,
  // Blades stay in the airstream.
  smokeDamper: 0.5,
  // Fabric drawn taut; slack under suction bulges in and loses more.
  flexibleConnector: 0.05,
  accessDoor: 0,
};
