/** What a change does: pieces, pounds, hours and money, the later less the earlier. */
import type { Piece, Takeoff } from "../takeoff/takeoff.ts";
import { sumTotals } from "../takeoff/totals.ts";
import type { Estimate } from "./estimate.ts";

export interface JobState {
  readonly takeoffs: readonly Takeoff[];
  readonly estimate: Estimate;
}

export interface PieceRef {
  readonly systemId: string;
  readonly mark: string;
}

export interface Difference {
  readonly pieceCount: number;
  readonly netWeight_kg: number;
  readonly shopHours_h: number;
  readonly fieldHours_h: number;
  readonly directCost_minor: number;
  readonly price_minor: number;
  readonly profit_minor: number;
  readonly pieces: {
    readonly added: readonly PieceRef[];
    readonly removed: readonly PieceRef[];
    readonly changed: readonly PieceRef[];
  };
  /** Lines whose amount or quantity differs, also those that came or went. */
  readonly lines: readonly {
    readonly key: string;
    readonly description: string;
    readonly quantity: number;
    readonly amount_minor: number;
  }[];
}

export function differenceBetween(before: JobState, after: JobState): Difference {
  const was = sumTotals(before.takeoffs);
  const is = sumTotals(after.takeoffs);
  return {
    pieceCount: is.pieceCount - was.pieceCount,
    netWeight_kg: is.netWeight_kg - was.netWeight_kg,
    shopHours_h: is.shopHours_h - was.shopHours_h,
    fieldHours_h: is.fieldHours_h - was.fieldHours_h,
    directCost_minor: after.estimate.directCost_minor - before.estimate.directCost_minor,
    price_minor: after.estimate.price_minor - before.estimate.price_minor,
    profit_minor: after.estimate.profit_minor - before.estimate.profit_minor,
    pieces: comparePieces(before.takeoffs, after.takeoffs),
    lines: compareLines(before.estimate, after.estimate),
  };
}

const piecesByMark = (takeoffs: readonly Takeoff[]): Map<string, Piece> =>
  new Map(takeoffs.flatMap(({ pieces }) => pieces.map((piece) => [`${piece.systemId}\n${piece.mark}`, piece])));

function comparePieces(before: readonly Takeoff[], after: readonly Takeoff[]): Difference["pieces"] {
  const was = piecesByMark(before);
  const is = piecesByMark(after);
  const ref = ({ systemId, mark }: Piece): PieceRef => ({ systemId, mark });
  const added: PieceRef[] = [];
  const changed: PieceRef[] = [];
  for (const [key, piece] of is) {
    const earlier = was.get(key);
    if (!earlier) added.push(ref(piece));
    else if (!isSamePiece(earlier, piece)) changed.push(ref(piece));
  }
  const removed = [...was].filter(([key]) => !is.has(key)).map(([, piece]) => ref(piece));
  return { added, removed, changed };
}

/** Alike to the shop: hours may differ without a different piece to make. */
const isSamePiece = (a: Piece, b: Piece): boolean =>
  a.kind === b.kind &&
  a.fitting === b.fitting &&
  a.material === b.material &&
  a.gauge === b.gauge &&
  a.joint === b.joint &&
  a.seam === b.seam &&
  a.angle_rad === b.angle_rad &&
  a.length_m === b.length_m &&
  a.netArea_m2 === b.netArea_m2 &&
  a.insulationArea_m2 === b.insulationArea_m2 &&
  a.linerArea_m2 === b.linerArea_m2 &&
  JSON.stringify([a.section, a.otherSection]) === JSON.stringify([b.section, b.otherSection]);

function compareLines(before: Estimate, after: Estimate): Difference["lines"] {
  const was = new Map(before.lines.map((line) => [line.key, line]));
  const is = new Map(after.lines.map((line) => [line.key, line]));
  return [...new Set([...was.keys(), ...is.keys()])]
    .map((key) => ({
      key,
      description: (is.get(key) ?? was.get(key))!.description,
      quantity: (is.get(key)?.quantity ?? 0) - (was.get(key)?.quantity ?? 0),
      amount_minor: (is.get(key)?.amount_minor ?? 0) - (was.get(key)?.amount_minor ?? 0),
    }))
    .filter(({ quantity, amount_minor }) => quantity !== 0 || amount_minor !== 0);
}
