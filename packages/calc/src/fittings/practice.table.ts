/** Coefficients for which no formula may be shipped or none is published: a company's own to set. */
import type { AccessoryKind } from "../air-system.ts";

export interface PracticeCoefficients {
  /** Gored round elbow over a smooth one of the same radius. */
  readonly goredOverSmooth: number;
  /** Square-throat elbow with turning vanes, 90°. */
  readonly vanedElbow: number;
  /** Tap with a shoe or cone over a straight tap, where the straight one loses. */
  readonly easedTapOverStraight: number;
  /** Least loss of a change of shape, on the smaller area. */
  readonly shapeChange: number;
  readonly accessory: Readonly<Record<AccessoryKind, { readonly rectangular: number; readonly other: number }>>;
}

export const PRACTICE_SOURCE = "common practice, no source; set your own";

export const shippedPractice: PracticeCoefficients = {
  // Five pieces; printed tables lie between 1.25 and 1.4.
  goredOverSmooth: 1.3,
  // Printed figures run from 0.11 to 0.33 with the vane and its spacing.
  vanedElbow: 0.25,
  easedTapOverStraight: 0.65,
  shapeChange: 0.05,
  accessory: {
    // Blade fully open.
    "volume-damper": { rectangular: 0.04, other: 0.2 },
    // Curtain in the airstream's edge.
    "fire-damper": { rectangular: 0.19, other: 0.19 },
    "flexible-connector": { rectangular: 0, other: 0 },
    "access-door": { rectangular: 0, other: 0 },
  },
};
