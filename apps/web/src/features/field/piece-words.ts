import { formatLength, formatSize } from "@cleatwork/calc/display/index";
import type { Meters } from "@cleatwork/calc";
import type { FieldPiece, UnitSystem } from "@cleatwork/contracts";

const degrees = (radians: number) => Math.round((radians * 180) / Math.PI);

/** "32×18, 5′-0″", "Elbow 24×12, 90°", "Transition 40×18 to 32×18, 18″ long": what to pick up, in one breath. */
export function pieceWords(piece: FieldPiece, units: UnitSystem): string {
  const size = formatSize(piece.section, units).text;
  const length = formatLength(piece.length_m as Meters, units).text;
  const other = piece.otherSection ? formatSize(piece.otherSection, units).text : null;
  switch (piece.kind) {
    case "straight":
      return `${size}, ${length}`;
    case "flexible":
      return `Flexible ${size}, ${length}`;
    case "elbow":
      return `Elbow ${size}, ${degrees(piece.angle_rad)}°`;
    case "transition":
      return other ? `Transition ${other} to ${size}, ${length} long` : `Transition ${size}, ${length} long`;
    case "branch":
      return `${branchNames[piece.fitting ?? ""] ?? "Branch"} ${size}${other ? ` off ${other}` : ""}`;
    case "end-cap":
      return `End cap ${size}`;
  }
}

const branchNames: Readonly<Record<string, string>> = {
  "tap-straight": "Straight tap",
  "tap-shoe": "Shoe tap",
  "tap-conical": "Conical tap",
  "tap-saddle": "Saddle tap",
  tee: "Tee",
  wye: "Wye",
  cross: "Cross",
  plenum: "Plenum",
};

/** Gauge, joint and weight, under the name of the piece. */
export function pieceDetail(piece: FieldPiece, weight: string): string {
  return [piece.gauge, piece.material === "flexible" ? null : piece.material, piece.joint || null, weight]
    .filter((part) => part !== null && part !== "")
    .join(", ");
}
