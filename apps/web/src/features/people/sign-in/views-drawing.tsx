const SCALE = 7;
const width = 24 * SCALE;
const depth = 18 * SCALE;
const round = 16 * SCALE;
const tall = 14 * SCALE;

/** Elevation and plan of the fitting whose pattern stands below. */
export function ViewsDrawing() {
  const corners = [
    { x: -width / 2, y: -depth / 2, from: 180 },
    { x: width / 2, y: -depth / 2, from: 270 },
    { x: width / 2, y: depth / 2, from: 0 },
    { x: -width / 2, y: depth / 2, from: 90 },
  ];
  return (
    <svg viewBox="-360 -95 720 190" aria-hidden className="w-full max-w-[720px] fill-none">
      <g transform="translate(-180 0)">
        <path
          d={`M${-width / 2} ${tall / 2}h${width}L${round / 2} ${-tall / 2}h${-round}Z`}
          className="stroke-b-duct-line"
          strokeWidth={1.6}
        />
        <path d={`M0 ${-tall / 2 - 12}V${tall / 2 + 12}`} className="stroke-b-center" strokeDasharray="10 3 2 3" />
        <path d={`M${-width / 2 - 22} ${-tall / 2}V${tall / 2}m-4 0h8m-8 ${-tall}h8`} className="stroke-b-center" />
        <Label x={-width / 2 - 34} y={4} anchor="end" text="14″" />
        <Label x={0} y={tall / 2 + 32} text="elevation" />
      </g>
      <g transform="translate(150 0)">
        <path
          d={`M${-width / 2 - 20} 0h${width + 40}M0 ${-depth / 2 - 14}v${depth + 28}`}
          className="stroke-b-center"
          strokeDasharray="10 3 2 3"
        />
        <rect
          x={-width / 2}
          y={-depth / 2}
          width={width}
          height={depth}
          className="stroke-b-duct-line"
          strokeWidth={1.6}
        />
        <circle r={round / 2} className="stroke-b-duct-line" strokeWidth={1.6} />
        {corners.map((corner) =>
          [0, 22.5, 45, 67.5, 90].map((step) => {
            const angle = ((corner.from + step) * Math.PI) / 180;
            const x = (round / 2) * Math.cos(angle);
            const y = (round / 2) * Math.sin(angle);
            return (
              <g key={`${corner.from} ${step}`}>
                <path
                  d={`M${corner.x} ${corner.y}L${x.toFixed(1)} ${y.toFixed(1)}`}
                  className="stroke-b-center"
                  strokeDasharray="7 4"
                />
                <circle cx={x} cy={y} r={2.2} className="fill-b-ground stroke-b-duct-line" />
              </g>
            );
          }),
        )}
        <Label x={0} y={-depth / 2 - 20} text="24 × 18, 16 Ø" />
        <Label x={0} y={depth / 2 + 26} text="plan" />
      </g>
    </svg>
  );
}

const Label = ({
  x,
  y,
  text,
  anchor = "middle",
}: {
  x: number;
  y: number;
  text: string;
  anchor?: "middle" | "end";
}) => (
  <text x={x} y={y} textAnchor={anchor} className="narrow fill-b-label text-[12px] font-medium">
    {text}
  </text>
);
