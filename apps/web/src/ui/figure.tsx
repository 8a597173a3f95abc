import type { ReactNode } from "react";
import { classNames } from "../lib/class-names.ts";

/** A value and its unit, on one line, the unit quieter. */
export function Figure({ value, unit, className }: { value: ReactNode; unit?: string; className?: string }) {
  return (
    <span className={classNames("whitespace-nowrap", className)}>
      {value}
      {unit && <span className="figure-unit">{unit}</span>}
    </span>
  );
}

/** A share of a limit: filled to the value, the limit a tick; what is over is hatched by shape, not only by color. */
export function LimitBar({ share, label, width = 80 }: { share: number; label: string; width?: number }) {
  const limitAt = width / 1.25;
  const filled = Math.max(0, Math.min(share, 1)) * limitAt;
  const over = Math.max(0, Math.min(share - 1, 0.25)) * limitAt;
  return (
    <svg width={width} height={12} viewBox={`0 0 ${width} 12`} role="img" aria-label={label} className="shrink-0">
      <rect x={0} y={3} width={filled} height={6} className="fill-dye" />
      {over > 0 && <path d={`M${limitAt} 3h${over}v6h${-over}z`} className="fill-stop" />}
      {over > 0 && <path d={`M${limitAt + 2} 9l4-6M${limitAt + 7} 9l4-6`} className="stroke-on-stop" strokeWidth={1} />}
      <path d={`M${limitAt} 0v12`} className="stroke-ink" strokeWidth={2} />
    </svg>
  );
}
