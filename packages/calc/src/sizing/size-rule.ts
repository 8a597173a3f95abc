/** Sizes for segments whose section is left to the rule: the least metal that carries the air within the rule. */
import { DUCT_CLASSES, type AirSegment, type AirSystem, type Section } from "../air-system.ts";
import { slackFactor } from "../friction/flexible.ts";
import { laminarEquivalentRatio } from "../friction/laminar-equivalent.ts";
import { roughnessOf } from "../friction/roughness.ts";
import { hydraulicDiameter, sectionArea, wettedPerimeter } from "../geometry/section.ts";
import { clearSection, insulationOf, linerThickness } from "../network/clear-section.ts";
import { addFinding, type FindingList } from "../network/findings.ts";
import {
  pascalsPerMeter,
  type KilogramsPerCubicMeter,
  type Meters,
  type MetersPerSecond,
  type PascalSeconds,
} from "../quantity.ts";
import { standardCandidates, type Candidate } from "./candidates.ts";
import { velocityAtFrictionRate } from "./capacity.ts";
import { standardSizes } from "./standard-sizes.table.ts";

export interface SizingTables {
  /** The section for a segment at an airflow in m³/s; adds `size-not-found` when even the largest is too small. */
  sectionFor(segment: AirSegment, airflow: number, place: number, findings: FindingList): Section;
}

interface CapacityRow {
  readonly section: Section;
  /** m³/s that it carries within the rule. */
  readonly capacity: number;
}

/**
 * Tables of standard sections by what they carry, made when a kind of duct is first asked for. Each row carries more than the
 * row before and needs more metal, so a size is one search.
 *
 * Equal friction also keeps the velocity limit of the duct class; the velocity rule looks at nothing else.
 */
export function sizingTables(
  system: AirSystem,
  air: { density: KilogramsPerCubicMeter; viscosity: PascalSeconds },
): SizingTables {
  const tables = new Map<number, readonly CapacityRow[]>();

  return {
    sectionFor(segment, airflow, place, findings) {
      const key = kindOf(segment, system);
      let table = tables.get(key);
      if (table === undefined) tables.set(key, (table = capacityTable(segment, system, air)));

      const row = firstThatCarries(table, airflow);
      const largest = table[table.length - 1]!;
      if (row !== undefined) return row.section;
      addFinding(
        findings,
        place,
        "size-not-found",
        { kind: "segment", id: segment.id },
        {
          value: airflow,
          limit: largest.capacity,
          unit: "m³/s",
          limitSource: `Largest standard size that the rule allows; ${standardSizes.rectangular.source}`,
        },
      );
      return largest.section;
    },
  };
}

/** Segments of one kind share a table: class, flexible or not, and what the wall is like inside. */
function kindOf(segment: AirSegment, { spec }: AirSystem): number {
  const insulation = insulationOf(segment, spec);
  const micrometers = insulation.kind === "liner" && !segment.flexible ? Math.round(insulation.thickness_m * 1e6) : 0;
  return (micrometers * 2 + (segment.flexible ? 1 : 0)) * DUCT_CLASSES.length + DUCT_CLASSES.indexOf(segment.ductClass);
}

function capacityTable(
  segment: AirSegment,
  { limits, sizing, spec, frictionBasis }: AirSystem,
  air: { density: KilogramsPerCubicMeter; viscosity: PascalSeconds },
): readonly CapacityRow[] {
  const mostVelocity = limits.velocity_m_s[segment.ductClass];
  const roughness = roughnessOf(segment, spec);
  const lining = linerThickness(segment, spec);

  const velocityIn = (section: Section, hydraulic: Meters): MetersPerSecond => {
    if (sizing.method === "velocity") return mostVelocity;
    const slack = segment.flexible ? slackFactor({ slack: spec.flexibleSlack, diameter: hydraulic }) : 1;
    const atRate = velocityAtFrictionRate({
      frictionRate: pascalsPerMeter(sizing.frictionRate_pa_m / slack),
      hydraulicDiameter: hydraulic,
      roughness,
      ...air,
      turbulentScale: frictionBasis === "hydraulic-diameter" ? 1 : laminarEquivalentRatio(section),
    });
    return atRate < mostVelocity ? atRate : mostVelocity;
  };

  const rows: CapacityRow[] = [];
  let most = 0;
  let largestArea = 0;
  for (const { section } of allowedCandidates(segment, sizing)) {
    const clear = clearSection(section, lining);
    const area = sectionArea(clear);
    // More metal for no more area carries no more air: most candidates end here.
    if (area <= largestArea) continue;
    const perimeter = wettedPerimeter(clear);
    if (!(perimeter > 0) || !isOpen(clear)) continue;
    largestArea = area;
    const capacity = area * velocityIn(clear, hydraulicDiameter(area, perimeter));
    if (capacity <= most) continue;
    most = capacity;
    rows.push({ section, capacity });
  }
  return rows;
}

/** Two sides both eaten up by liner multiply to a positive area. */
const isOpen = (section: Section): boolean =>
  section.shape === "round" ? section.diameter_m > 0 : section.shape === "annular" || section.height_m > 0;

/** Under the greatest height; where none is, the lowest there are. Flexible duct is round whatever the rule says. */
function allowedCandidates(segment: AirSegment, sizing: AirSystem["sizing"]): readonly Candidate[] {
  const candidates = standardCandidates[segment.flexible ? "round" : sizing.shape];
  const limit = sizing.maximumHeight_m;
  if (limit === null || sizing.shape === "round" || segment.flexible) return candidates;
  const allowed = candidates.filter(({ height_m }) => height_m <= limit + 1e-6);
  if (allowed.length > 0) return allowed;
  const lowest = Math.min(...candidates.map(({ height_m }) => height_m));
  return candidates.filter(({ height_m }) => height_m === lowest);
}

/** Binary search: capacities rise. */
function firstThatCarries(table: readonly CapacityRow[], airflow: number): CapacityRow | undefined {
  let low = 0;
  let high = table.length;
  while (low < high) {
    const middle = (low + high) >> 1;
    if (table[middle]!.capacity >= airflow * (1 - 1e-9)) high = middle;
    else low = middle + 1;
  }
  return table[low];
}
