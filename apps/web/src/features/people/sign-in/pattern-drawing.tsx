import { squareToRound, type Flat, type Line } from "./square-to-round.ts";

const pattern = squareToRound({ width: 24, depth: 18, diameter: 16, height: 14 });
const SCALE = 10;
const at = ({ x, y }: Flat) => `${(x * SCALE).toFixed(1)} ${(y * SCALE).toFixed(1)}`;

/** Inches to the nearest sixteenth, as a rule reads: whole, and the fraction. */
function sixteenths(inches: number): { whole: number; fraction: string } {
  const total = Math.round(inches * 16);
  let top = total % 16;
  let bottom = 16;
  while (top > 0 && top % 2 === 0) {
    top /= 2;
    bottom /= 2;
  }
  return { whole: Math.floor(total / 16), fraction: top === 0 ? "" : `${top}/${bottom}` };
}

/** A square-to-round laid out flat, on layout dye: what the trade starts from. Decoration; the caption says it in words. */
export function PatternDrawing() {
  return (
    <svg viewBox="-360 -300 720 360" aria-hidden className="w-full max-w-[720px] fill-none">
      <path
        d={`M${pattern.outline.map(at).join("L")}Z`}
        className="fill-b-duct-fill stroke-b-duct-line"
        fillOpacity={0.55}
        strokeWidth={1.8}
      />
      {pattern.bends.map((line, index) => (
        <path key={index} d={`M${at(line.from)}L${at(line.to)}`} className="stroke-b-center" strokeDasharray="7 4" />
      ))}
      {pattern.outline.map((point, index) => (
        <circle
          key={index}
          cx={point.x * SCALE}
          cy={point.y * SCALE}
          r={2.6}
          className="fill-b-ground stroke-b-duct-line"
        />
      ))}
      {pattern.sides.map((line, index) => (
        <Measure key={index} line={line} />
      ))}
    </svg>
  );
}

/** The length beside its line, outside of the sheet and never upside down. */
function Measure({ line: { from, to, length } }: { line: Line }) {
  const middle = { x: (from.x + to.x) / 2, y: (from.y + to.y) / 2 };
  const along = { x: to.x - from.x, y: to.y - from.y };
  const size = Math.hypot(along.x, along.y);
  const sheetMiddle = { x: 0, y: -16 };
  let normal = { x: -along.y / size, y: along.x / size };
  const outward = (middle.x - sheetMiddle.x) * normal.x + (middle.y - sheetMiddle.y) * normal.y;
  if (outward < 0) normal = { x: -normal.x, y: -normal.y };
  let turn = (Math.atan2(along.y, along.x) * 180) / Math.PI;
  if (turn > 90) turn -= 180;
  if (turn < -90) turn += 180;
  const { whole, fraction } = sixteenths(length);
  return (
    <text
      transform={`translate(${((middle.x + normal.x * 1.6) * SCALE).toFixed(1)} ${((middle.y + normal.y * 1.6) * SCALE).toFixed(1)}) rotate(${turn.toFixed(1)})`}
      textAnchor="middle"
      dominantBaseline="central"
      className="narrow fill-b-label text-[13px] font-medium"
    >
      {whole}
      {fraction && (
        <tspan dx={2} className="frac">
          {fraction}
        </tspan>
      )}
      ″
    </text>
  );
}
