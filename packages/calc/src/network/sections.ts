/** The section of every segment, as typed or by the rule, and the measures that follow from it alone. */
import type { AirSystem, Section } from "../air-system.ts";
import { hydraulicDiameter, sectionArea, wettedPerimeter } from "../geometry/section.ts";
import { meters, squareMeters } from "../quantity.ts";
import type { SizingTables } from "../sizing/size-rule.ts";
import { clearSection, linerThickness } from "./clear-section.ts";
import type { FindingList } from "./findings.ts";

export interface Sections {
  /** Clear inside. */
  readonly section: readonly Section[];
  readonly area: Float64Array;
  readonly perimeter: Float64Array;
  readonly hydraulicDiameter: Float64Array;
}

export function chooseSections(
  { segments, spec }: AirSystem,
  airflow: Float64Array,
  sizing: SizingTables,
  findings: FindingList,
): Sections {
  const section = new Array<Section>(segments.length);
  for (let s = 0; s < segments.length; s++) {
    const segment = segments[s]!;
    const given = segment.section ?? sizing.sectionFor(segment, airflow[s]!, s, findings);
    section[s] = clearSection(given, linerThickness(segment, spec));
  }
  return measure(section);
}

function measure(section: readonly Section[]): Sections {
  const area = new Float64Array(section.length);
  const perimeter = new Float64Array(section.length);
  const hydraulic = new Float64Array(section.length);
  fillAreas(section, area);
  fillPerimeters(section, perimeter);
  fillHydraulicDiameters(area, perimeter, hydraulic);
  return { section, area, perimeter, hydraulicDiameter: hydraulic };
}

// A short loop for each measure: the engine compiles a short loop whole, and then makes no number objects on the way.

function fillAreas(section: readonly Section[], area: Float64Array): void {
  for (let s = 0; s < area.length; s++) area[s] = sectionArea(section[s]!);
}

function fillPerimeters(section: readonly Section[], perimeter: Float64Array): void {
  for (let s = 0; s < perimeter.length; s++) perimeter[s] = wettedPerimeter(section[s]!);
}

function fillHydraulicDiameters(area: Float64Array, perimeter: Float64Array, diameter: Float64Array): void {
  for (let s = 0; s < area.length; s++) {
    diameter[s] = hydraulicDiameter(squareMeters(area[s]!), meters(perimeter[s]!));
  }
}
