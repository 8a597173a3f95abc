import { formatLength, formatPressure } from "@cleatwork/calc/display/index";
import { METERS_PER_FOOT, PASCALS_PER_INCH_OF_WATER, meters, pascals, type Solution } from "@cleatwork/calc";
import type { UnitSystem } from "@cleatwork/contracts";
import { useId, useMemo } from "react";
import { axisSteps, gradeLineOf, polyline, segmentsById, type GradeLine, type GradePoint } from "./grade-line.ts";

interface GradeLineChartProps {
  readonly solution: Solution;
  readonly units: UnitSystem;
  readonly hoveredId: string | null;
  readonly selectedId: string | null;
  readonly onHover: (segmentId: string | null) => void;
  readonly onSelect: (segmentId: string) => void;
  /** "AH-1 to D-47". */
  readonly outletName: (nodeId: string) => string;
  readonly segmentNumber: (segmentId: string) => string;
}

const WIDTH = 960;
const HEIGHT = 190;
const LEFT = 52;
const RIGHT = 120;
const TOP = 10;
const BOTTOM = 26;

/** Pressure left from the equipment to the governing outlet, with every other path drawn thin behind it. */
export function GradeLineChart(props: GradeLineChartProps) {
  const { solution, units, hoveredId, selectedId, onHover, onSelect } = props;
  const titleId = useId();
  const { governing, others, total, top, low } = useMemo(() => chartOf(solution), [solution]);
  if (!governing) return null;

  const x = (distance_m: number) => LEFT + ((WIDTH - LEFT - RIGHT) * distance_m) / total;
  const y = (pressure_pa: number) => TOP + ((HEIGHT - TOP - BOTTOM) * (top - pressure_pa)) / (top - low);
  const path = (points: readonly GradePoint[]) =>
    points
      .map(
        (point, index) =>
          `${index === 0 ? "M" : "L"}${x(point.distance_m).toFixed(1)} ${y(point.pressureLeft_pa).toFixed(1)}`,
      )
      .join("");

  const spare = governing.arrives_pa - governing.outletPressure_pa;
  const needs = formatPressure(pascals(governing.outletPressure_pa), units).text;
  const arrives = formatPressure(pascals(governing.arrives_pa), units).text;
  const unitSize = units === "inch-pound" ? PASCALS_PER_INCH_OF_WATER : 1;

  return (
    <svg viewBox={`0 0 ${WIDTH} ${HEIGHT}`} className="block w-full" role="img" aria-labelledby={titleId}>
      <title id={titleId}>
        {`Pressure left from the equipment to ${props.outletName(governing.path.outletNodeId)}: ${arrives} arrives, ${needs} needed.`}
      </title>
      {axisSteps(top / unitSize, 4)
        .filter((step) => step * unitSize <= top)
        .map((step) => (
          <g key={step}>
            <line
              x1={LEFT}
              x2={WIDTH - RIGHT}
              y1={y(step * unitSize)}
              y2={y(step * unitSize)}
              className="stroke-line"
            />
            <text x={LEFT - 6} y={y(step * unitSize) + 4} textAnchor="end" className="fill-ink-3 text-[11px]">
              {Number(step.toFixed(3))}
            </text>
          </g>
        ))}
      {others.map((line) => (
        <path
          key={line.path.outletNodeId}
          d={path(polyline(line))}
          className="fill-none stroke-line-strong"
          strokeWidth={0.75}
        />
      ))}
      <path
        d={path(polyline(governing))}
        className="fill-none stroke-scribe-key"
        strokeWidth={5}
        strokeLinejoin="round"
      />
      <path
        d={path(polyline(governing))}
        className="fill-none stroke-scribe"
        strokeWidth={2.5}
        strokeLinejoin="round"
      />
      {governing.stretches.map(({ segmentId, start, end }) => {
        const left = x(start.distance_m) - 3;
        const width = Math.max(6, x(end.distance_m) - left);
        const marked = segmentId === hoveredId || segmentId === selectedId;
        return (
          <g key={segmentId}>
            <rect
              x={left}
              y={TOP}
              width={width}
              height={HEIGHT - TOP - BOTTOM}
              className={marked ? "fill-dye opacity-15" : "fill-transparent"}
              onPointerEnter={() => onHover(segmentId)}
              onPointerLeave={() => onHover(null)}
              onClick={() => onSelect(segmentId)}
            />
            {width > 18 && (
              <text
                x={left + width / 2}
                y={HEIGHT - 8}
                textAnchor="middle"
                className={marked ? "fill-ink text-[11px] font-bold" : "fill-ink-3 text-[11px]"}
              >
                {props.segmentNumber(segmentId)}
              </text>
            )}
          </g>
        );
      })}
      <line
        x1={x(governing.total_m)}
        x2={x(governing.total_m) + 10}
        y1={y(governing.outletPressure_pa)}
        y2={y(governing.outletPressure_pa)}
        className="stroke-ink"
        strokeWidth={2}
      />
      <text
        x={x(governing.total_m) + 14}
        y={y(governing.outletPressure_pa) - 4}
        className="fill-ink text-[11px] font-semibold"
      >
        needs {needs}
      </text>
      <text
        x={x(governing.total_m) + 14}
        y={y(governing.outletPressure_pa) + 12}
        className={spare < 0 ? "fill-stop-ink text-[11px] font-semibold" : "fill-ink-2 text-[11px]"}
      >
        {spare < 0 ? "has" : "gets"} {arrives}
      </text>
      <text x={WIDTH - RIGHT} y={HEIGHT - 8} textAnchor="start" className="fill-ink-3 text-[11px]">
        {formatLength(meters(Math.round(total / METERS_PER_FOOT) * METERS_PER_FOOT), units).text}
      </text>
    </svg>
  );
}

function chartOf(solution: Solution): {
  governing: GradeLine | null;
  others: readonly GradeLine[];
  total: number;
  top: number;
  low: number;
} {
  const bySegment = segmentsById(solution);
  const lines = solution.paths.map((path) => gradeLineOf(solution, path, bySegment));
  const governing = lines.find(({ path }) => path.outletNodeId === solution.governingOutletNodeId) ?? null;
  return {
    governing,
    others: lines.filter((line) => line !== governing),
    total: Math.max(...lines.map(({ total_m }) => total_m), 0.1),
    top: Math.max(solution.availablePressure_pa, 1) * 1.05,
    low: Math.min(0, ...lines.map(({ arrives_pa }) => arrives_pa)),
  };
}
