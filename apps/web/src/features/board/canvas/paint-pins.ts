/** Findings pinned to the duct: severity by shape and color together, so that neither is needed alone. */
import type { PlanPoint } from "../core/camera.ts";
import type { Brush } from "./brush.ts";

export interface Pin {
  readonly at: PlanPoint;
  readonly severity: "stop" | "warn";
}

const SIZE = 7;

export function paintPins(brush: Brush, pins: readonly Pin[]): void {
  const { context, palette } = brush;
  for (const pin of pins) {
    if (!brush.sees(pin.at, pin.at, 1)) continue;
    const { x, y } = brush.at(pin.at);
    context.beginPath();
    if (pin.severity === "stop") {
      for (let corner = 0; corner < 8; corner++) {
        const angle = Math.PI / 8 + (corner * Math.PI) / 4;
        context.lineTo(x + SIZE * 1.1 * Math.cos(angle), y + SIZE * 1.1 * Math.sin(angle));
      }
    } else {
      context.moveTo(x, y - SIZE);
      context.lineTo(x + SIZE, y + SIZE * 0.85);
      context.lineTo(x - SIZE, y + SIZE * 0.85);
    }
    context.closePath();
    context.fillStyle = palette[pin.severity];
    context.fill();
    context.strokeStyle = palette.scribeKey;
    context.lineWidth = 1.25;
    context.stroke();
  }
}
