import { totalsOf } from "./totals.ts";
import type { Piece, TakeoffTotals } from "./takeoff.ts";

export const PIECE_GROUPINGS = ["system", "level", "kind", "gauge"] as const;
export type PieceGrouping = (typeof PIECE_GROUPINGS)[number];

export interface PieceGroup {
  /** System id, level id, piece kind, or material and gauge; "no gauge" where the schedule had none. */
  readonly key: string;
  readonly pieces: readonly Piece[];
  /** Of the pieces alone: hangers, devices and dampers are not in the hours. */
  readonly totals: TakeoffTotals;
}

export const NO_GAUGE = "no gauge";

const keyOf: Readonly<Record<PieceGrouping, (piece: Piece) => string>> = {
  system: ({ systemId }) => systemId,
  level: ({ levelId }) => levelId,
  kind: ({ kind }) => kind,
  gauge: ({ kind, material, gauge }) => (kind === "flexible" ? "flexible" : gauge ? `${material} ${gauge}` : NO_GAUGE),
};

/** Pieces together by one property, groups in the order in which they first come. Each piece is in one group. */
export function groupPieces(pieces: readonly Piece[], by: PieceGrouping): readonly PieceGroup[] {
  const groups = new Map<string, Piece[]>();
  for (const piece of pieces) {
    const key = keyOf[by](piece);
    const group = groups.get(key);
    if (group) group.push(piece);
    else groups.set(key, [piece]);
  }
  return [...groups].map(([key, members]) => ({ key, pieces: members, totals: totalsOf(members, []) }));
}
