/** The approved takeoff in the order it is hung: by level, then system, then run, then mark. Pure. */
import type { FieldPiece, FieldTakeoff } from "@cleatwork/contracts";

export interface FieldRun {
  readonly name: string;
  readonly pieces: readonly FieldPiece[];
}

export interface FieldFilter {
  readonly levelId: string | null;
  readonly systemId: string | null;
  /** A mark, a size or a name; empty shows all. */
  readonly words: string;
}

/** Runs as they follow each other in the takeoff; a name that comes back later is a run of its own. */
export function runsOf(pieces: readonly FieldPiece[]): readonly FieldRun[] {
  const runs: { name: string; pieces: FieldPiece[] }[] = [];
  for (const piece of pieces) {
    const last = runs.at(-1);
    if (last && last.name === piece.segmentName) last.pieces.push(piece);
    else runs.push({ name: piece.segmentName, pieces: [piece] });
  }
  return runs;
}

export function filterPieces(
  takeoff: FieldTakeoff,
  filter: FieldFilter,
  describe: (piece: FieldPiece) => string,
): readonly FieldPiece[] {
  const words = filter.words.trim().toLowerCase();
  return takeoff.pieces.filter(
    (piece) =>
      (filter.levelId === null || piece.levelId === filter.levelId) &&
      (filter.systemId === null || piece.systemId === filter.systemId) &&
      (words === "" ||
        piece.mark.toLowerCase().startsWith(words) ||
        `${piece.segmentName} ${describe(piece)}`.toLowerCase().includes(words)),
  );
}

export const weightOf = (pieces: readonly FieldPiece[]): number =>
  pieces.reduce((sum, piece) => sum + piece.weight_kg, 0);
