import { METERS_PER_FOOT } from "@cleatwork/calc";
import type { UnitSystem } from "@cleatwork/contracts";
import { scaleBarLength } from "./canvas/paint-ground.ts";

/** How long a length is at the present zoom. */
export function ScaleBar({ pixelsPerMeter, units }: { pixelsPerMeter: number; units: UnitSystem }) {
  const pixelsPerUnit = units === "si" ? pixelsPerMeter : pixelsPerMeter * METERS_PER_FOOT;
  const length = scaleBarLength(pixelsPerUnit);
  return (
    <div className="pointer-events-none absolute bottom-3 left-3 text-help text-b-label" aria-hidden>
      <div className="h-1.5 border-x border-b border-b-label" style={{ width: length * pixelsPerUnit }} />
      {length} {units === "si" ? "m" : "ft"}
    </div>
  );
}
