/** What later columns ask of each segment, read in one pass: an object read once is read cheaply. */
import { DUCT_CLASSES, type AirSystem, type DuctClass } from "../air-system.ts";
import { roughnessOf } from "../friction/roughness.ts";
import { leakageClass } from "./leakage.ts";
import type { Section } from "../air-system.ts";

export interface Traits {
  readonly isFlexible: Uint8Array;
  /** Place in DUCT_CLASSES. */
  readonly ductClass: Uint8Array;
  readonly roughness: Float64Array;
  readonly leakageClass: Float64Array;
}

export function readTraits({ segments, spec }: AirSystem, section: readonly Section[]): Traits {
  const traits: Traits = {
    isFlexible: new Uint8Array(segments.length),
    ductClass: new Uint8Array(segments.length),
    roughness: new Float64Array(segments.length),
    leakageClass: new Float64Array(segments.length),
  };
  for (let s = 0; s < segments.length; s++) {
    const segment = segments[s]!;
    traits.isFlexible[s] = segment.flexible ? 1 : 0;
    traits.ductClass[s] = placeOf(segment.ductClass);
    traits.roughness[s] = roughnessOf(segment, spec);
    traits.leakageClass[s] = leakageClass(spec.sealClass, section[s]!.shape, segment.flexible);
  }
  return traits;
}

const placeOf = (ductClass: DuctClass): number => (ductClass === "main" ? 0 : ductClass === "branch" ? 1 : 2);

/** A limit for each duct class, by its place. */
export const byPlace = (limits: Readonly<Record<DuctClass, number>>): Float64Array =>
  Float64Array.from(DUCT_CLASSES, (ductClass) => limits[ductClass]);
