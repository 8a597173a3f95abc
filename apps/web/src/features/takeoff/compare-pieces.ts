/** What became of a takeoff: each piece by its system and mark. Pure. */
import type { Piece } from "@cleatwork/calc";
import type { ComparedPiece } from "@cleatwork/contracts";

export interface Compared {
  readonly state: "added" | "removed" | "changed";
  readonly before: ComparedPiece | null;
  readonly after: ComparedPiece | null;
  /** Size, gauge, length…: what differs, as words. */
  readonly fields: readonly string[];
}

export interface Comparison {
  readonly pieces: readonly Compared[];
  readonly unchanged: number;
  readonly weight_kg: number;
  readonly shop_h: number;
  readonly field_h: number;
}

const keyOf = ({ systemId, mark }: Pick<ComparedPiece, "systemId" | "mark">) => `${systemId} ${mark}`;

export function comparePieces(before: readonly ComparedPiece[], after: readonly Piece[]): Comparison {
  const was = new Map(before.map((piece) => [keyOf(piece), piece]));
  const is = new Map(after.map((piece) => [keyOf(piece), piece]));
  const pieces: Compared[] = [];
  let unchanged = 0;
  for (const [key, piece] of is) {
    const earlier = was.get(key);
    if (!earlier) {
      pieces.push({ state: "added", before: null, after: piece, fields: [] });
      continue;
    }
    const fields = differingFields(earlier, piece);
    if (fields.length === 0) unchanged++;
    else pieces.push({ state: "changed", before: earlier, after: piece, fields });
  }
  for (const [key, piece] of was)
    if (!is.has(key)) pieces.push({ state: "removed", before: piece, after: null, fields: [] });
  const sum = (list: readonly ComparedPiece[], of: (piece: ComparedPiece) => number) =>
    list.reduce((total, piece) => total + of(piece), 0);
  const difference = (of: (piece: ComparedPiece) => number) => sum(after, of) - sum(before, of);
  return {
    pieces,
    unchanged,
    weight_kg: difference(({ weight_kg }) => weight_kg),
    shop_h: difference(({ shopHours_h }) => shopHours_h),
    field_h: difference(({ fieldHours_h }) => fieldHours_h),
  };
}

/** A millimeter is not a change: both come from the same numbers, through JSON. */
const SAME_M = 1e-6;

function differingFields(a: ComparedPiece, b: ComparedPiece): string[] {
  return [
    ...(a.kind === b.kind ? [] : ["kind"]),
    ...(JSON.stringify(a.section) === JSON.stringify(b.section) ? [] : ["size"]),
    ...(Math.abs(a.length_m - b.length_m) < SAME_M ? [] : ["length"]),
    ...(a.material === b.material ? [] : ["metal"]),
    ...(a.gauge === b.gauge ? [] : ["gauge"]),
  ];
}
