/** The section of every segment, as typed or by the rule, and the measures that follow from it alone. */
import type { AirSystem, Section } from "../air-system.ts";
import { hydraulicDiameter, sectionArea, wettedPerimeter } from "../geometry/section.ts";
import type { SizingTables } from "../sizing/size-rule.ts";
import { clearSection, linerThickness } from "./clear-section.ts";
import type { FindingList } from "./findings.ts";

export interface Sections {
  /** Clear inside. */
  readonly section: Section[];
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
  const area = new Float64Array(segments.length);
  const perimeter = new Float64Array(segments.length);
  const hydraulic = new Float64Array(segments.length);
  for (let s = 0; s < segments.length; s++) {
    const segment = segments[s]!;
    const given = segment.section ?? sizing.sectionFor(segment, airflow[s]!, s, findings);
    const clear = clearSection(given, linerThickness(segment, spec));
    const clearArea = sectionArea(clear);
    const clearPerimeter = wettedPerimeter(clear);
    section[s] = clear;
    area[s] = clearArea;
    perimeter[s] = clearPerimeter;
    hydraulic[s] = hydraulicDiameter(clearArea, clearPerimeter);
  }
  return { section, area, perimeter, hydraulicDiameter: hydraulic };
}
