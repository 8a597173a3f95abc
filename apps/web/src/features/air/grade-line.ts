/**
 * The grade line: total pressure left against distance along a path, from the equipment to one outlet. A fitting drops
 * it at a point, straight duct along its length.
 */
import type { Solution, SolvedPath, SolvedSegment } from "@cleatwork/calc";

export interface GradePoint {
  readonly distance_m: number;
  readonly pressureLeft_pa: number;
}

export interface GradeStretch {
  readonly segmentId: string;
  readonly start: GradePoint;
  /** After the fittings at its start, before the length of duct. */
  readonly afterFittings: GradePoint;
  readonly end: GradePoint;
}

export interface GradeLine {
  readonly path: SolvedPath;
  readonly stretches: readonly GradeStretch[];
  readonly total_m: number;
  /** What the outlet needs of the pressure that arrives. */
  readonly outletPressure_pa: number;
  readonly arrives_pa: number;
}

export function gradeLineOf(solution: Solution, path: SolvedPath, bySegment = segmentsById(solution)): GradeLine {
  const stretches: GradeStretch[] = [];
  let distance = 0;
  let left: number = solution.availablePressure_pa;
  for (const segmentId of path.segmentIds) {
    const segment = bySegment.get(segmentId);
    if (!segment) continue;
    const start = { distance_m: distance, pressureLeft_pa: left };
    left -= segment.dynamicLoss_pa;
    const afterFittings = { distance_m: distance, pressureLeft_pa: left };
    left -= segment.frictionLoss_pa;
    distance += segment.length_m;
    stretches.push({ segmentId, start, afterFittings, end: { distance_m: distance, pressureLeft_pa: left } });
  }
  return {
    path,
    stretches,
    total_m: distance,
    outletPressure_pa: path.outletPressure_pa,
    arrives_pa: left,
  };
}

export const segmentsById = (solution: Solution): ReadonlyMap<string, SolvedSegment> =>
  new Map(solution.segments.map((segment) => [segment.segmentId, segment]));

export const polyline = (line: GradeLine): readonly GradePoint[] =>
  line.stretches.flatMap(({ start, afterFittings, end }) => [start, afterFittings, end]);

/** Round steps for an axis from zero to at least `maximum`, about `count` of them. */
export function axisSteps(maximum: number, count: number): readonly number[] {
  if (!(maximum > 0)) return [0];
  const raw = maximum / count;
  const power = 10 ** Math.floor(Math.log10(raw));
  const step = ([1, 2, 5, 10].find((factor) => factor * power >= raw) ?? 10) * power;
  return Array.from({ length: Math.ceil(maximum / step) + 1 }, (_, index) => index * step);
}
