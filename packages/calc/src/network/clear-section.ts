/** The section that the air sees, where sizes are given over the liner. */
import type { AirSegment, ConstructionSpec, Insulation, Section } from "../air-system.ts";
import { meters } from "../quantity.ts";

export const insulationOf = (segment: AirSegment, spec: ConstructionSpec): Insulation =>
  segment.insulation ?? spec.insulation;

/** Rigid duct with liner inside; flexible duct is never lined here, it comes with its own insulation. */
export const isLined = (segment: AirSegment, spec: ConstructionSpec): boolean =>
  !segment.flexible && insulationOf(segment, spec).kind === "liner";

/** What the liner takes off each side of a given size; 0 where the size is the clear inside already. */
export function linerThickness(segment: AirSegment, spec: ConstructionSpec): number {
  if (segment.flexible || spec.sizesAre === "clear-inside") return 0;
  const insulation = insulationOf(segment, spec);
  return insulation.kind === "liner" ? insulation.thickness_m : 0;
}

/** A section less `thickness` on every outer wall. The inner wall of an annulus carries no liner. */
export function clearSection(section: Section, thickness: number): Section {
  if (thickness === 0) return section;
  const less = (side: number) => meters(side - 2 * thickness);
  switch (section.shape) {
    case "round":
      return { shape: "round", diameter_m: less(section.diameter_m) };
    case "rectangular":
    case "flat-oval":
      return { shape: section.shape, width_m: less(section.width_m), height_m: less(section.height_m) };
    case "annular":
      return {
        shape: "annular",
        outerDiameter_m: less(section.outerDiameter_m),
        innerDiameter_m: section.innerDiameter_m,
      };
  }
}
