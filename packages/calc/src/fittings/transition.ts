/** Loss coefficients of changes of size, on the velocity pressure of the smaller area, by the included angle. */
import type { Radians, SquareMeters } from "../quantity.ts";

export const CONTRACTION_SOURCE = "Rennels and Hudson (2012), Pipe Flow, ch. 10, less friction";
export const EXPANSION_SOURCE = "Gibson's formula as in Crane TP-410 (2009)";

export interface TransitionForm {
  readonly sineOfHalfAngle: number;
  /** 0.622 (α/180°)^0.8 */
  readonly jetContraction: number;
  /** Share of the sudden enlargement's loss. */
  readonly expansionShare: number;
}

/** What depends on the angle alone, once for a whole system. Flat angle (180°) is an abrupt change. */
export function transitionForm(angle: Radians): TransitionForm {
  const sineOfHalfAngle = Math.sin(angle / 2);
  return {
    sineOfHalfAngle,
    jetContraction: 0.622 * (angle / Math.PI) ** 0.8,
    expansionShare: Math.min(1, 2.6 * sineOfHalfAngle),
  };
}

export interface AreaStep {
  readonly smaller: SquareMeters;
  readonly larger: SquareMeters;
}

/**
 * Contraction, air going from the larger to the smaller area.
 *
 *     K = 0.0696 sin(α/2) (1 − β⁵) λ² + (λ − 1)²,   λ = 1 + 0.622 (α/180°)^0.8 (1 − 0.215 β² − 0.785 β⁵)
 *
 * β is the ratio of diameters, β² of areas.
 *
 * Range    any area ratio, angles to 180°
 * Source   Rennels, D. C., Hudson, H. M. (2012), Pipe Flow, ch. 10
 */
export function contractionCoefficient(form: TransitionForm, { smaller, larger }: AreaStep): number {
  const areaRatio = smaller / larger;
  const fifth = areaRatio * areaRatio * Math.sqrt(areaRatio);
  const excess = form.jetContraction * (1 - 0.215 * areaRatio - 0.785 * fifth);
  return 0.0696 * form.sineOfHalfAngle * (1 - fifth) * (1 + excess) ** 2 + excess * excess;
}

/**
 * Expansion, air going from the smaller to the larger area.
 *
 *     K = min(1, 2.6 sin(α/2)) (1 − A1/A2)²
 *
 * Duct tables print up to twice this, because they include an uneven approach; see checks/fittings.check.test.ts.
 *
 * Range    any area ratio, angles to 180°; from 45° on the sudden enlargement of Borda and Carnot
 * Source   Gibson (1910), as in Crane TP-410 (2009)
 */
export function expansionCoefficient(form: TransitionForm, { smaller, larger }: AreaStep): number {
  const lost = 1 - smaller / larger;
  return form.expansionShare * lost * lost;
}
