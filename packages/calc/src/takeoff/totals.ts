/** Sums over pieces and items. Every total of a takeoff is one of these, so totals are sums by construction. */
import { hours, kilograms, squareMeters } from "../quantity.ts";
import type { CountedItem, Piece, Takeoff, TakeoffTotals } from "./takeoff.ts";

export function totalsOf(pieces: readonly Piece[], items: readonly CountedItem[]): TakeoffTotals {
  let netWeight = 0;
  let netArea = 0;
  let blankArea = 0;
  let jointCount = 0;
  let insulationArea = 0;
  let linerArea = 0;
  let shopHours = 0;
  let fieldHours = 0;
  for (const piece of pieces) {
    netWeight += piece.weight_kg;
    netArea += piece.netArea_m2;
    blankArea += piece.blankArea_m2;
    jointCount += piece.jointCount;
    insulationArea += piece.insulationArea_m2;
    linerArea += piece.linerArea_m2;
    shopHours += piece.shopHours_h;
    fieldHours += piece.fieldHours_h;
  }
  for (const item of items) {
    fieldHours += item.fieldHours_h;
    shopHours += item.shopHours_h ?? 0;
  }
  return {
    pieceCount: pieces.length,
    netWeight_kg: kilograms(netWeight),
    netArea_m2: squareMeters(netArea),
    blankArea_m2: squareMeters(blankArea),
    jointCount,
    insulationArea_m2: squareMeters(insulationArea),
    linerArea_m2: squareMeters(linerArea),
    shopHours_h: hours(shopHours),
    fieldHours_h: hours(fieldHours),
  };
}

/** Totals of several systems. */
export function sumTotals(takeoffs: readonly Pick<Takeoff, "totals">[]): TakeoffTotals {
  const sum = (of: (totals: TakeoffTotals) => number) =>
    takeoffs.reduce((total, takeoff) => total + of(takeoff.totals), 0);
  return {
    pieceCount: sum(({ pieceCount }) => pieceCount),
    netWeight_kg: kilograms(sum(({ netWeight_kg }) => netWeight_kg)),
    netArea_m2: squareMeters(sum(({ netArea_m2 }) => netArea_m2)),
    blankArea_m2: squareMeters(sum(({ blankArea_m2 }) => blankArea_m2)),
    jointCount: sum(({ jointCount }) => jointCount),
    insulationArea_m2: squareMeters(sum(({ insulationArea_m2 }) => insulationArea_m2)),
    linerArea_m2: squareMeters(sum(({ linerArea_m2 }) => linerArea_m2)),
    shopHours_h: hours(sum(({ shopHours_h }) => shopHours_h)),
    fieldHours_h: hours(sum(({ fieldHours_h }) => fieldHours_h)),
  };
}
