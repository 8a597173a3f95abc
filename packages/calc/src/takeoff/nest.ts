/** Nesting: how many sheets or how much coil the blanks of a takeoff are cut from, by metal and gauge. */
import { inches, meters, squareMeters, type Meters, type SquareMeters } from "../quantity.ts";
import { patternSize } from "./pattern/flat-pattern.ts";
import { patternsOf } from "./pattern/patterns.ts";
import type { Piece } from "./takeoff.ts";

export interface Stock {
  readonly source: string;
  readonly sheet: { readonly width_m: Meters; readonly length_m: Meters };
  /** Straight rectangular duct is cut across the coil: its length is the coil's width. */
  readonly coilWidths_m: readonly Meters[];
}

export const shippedStock: Stock = {
  source: "common practice: sheets of 5 × 10 ft, coil of 48, 60 and 72 in.",
  sheet: { width_m: inches(60), length_m: inches(120) },
  coilWidths_m: [inches(48), inches(60), inches(72)],
};

export interface NestedSheet {
  readonly material: string;
  readonly gauge: string;
  readonly coil: readonly {
    readonly width_m: Meters;
    readonly length_m: Meters;
    readonly blankArea_m2: SquareMeters;
  }[];
  readonly sheets: number;
  readonly sheetBlankArea_m2: SquareMeters;
  /** Net blanks over stock used, coil and sheets together. */
  readonly utilization: number;
  /** Blanks that no stock is large enough for: they are made of several. */
  readonly tooLarge: readonly string[];
}

interface Blank {
  readonly width: number;
  readonly length: number;
  readonly area: number;
}

/**
 * Wrappers of straight rectangular duct come off the narrowest coil that is as wide as they are long, one after the other.
 * Everything else goes on sheets as the rectangle that holds it, on shelves: longest first, each blank on the first shelf
 * that has room, turned where it fits better; a new shelf or sheet where none has. Simple, the same every time, and never
 * better than a person would nest by hand.
 *
 * Range    n blanks on k open shelves: at most n k steps; shelves that are full are closed
 */
export function nestPieces(pieces: readonly Piece[], stock: Stock): readonly NestedSheet[] {
  const groups = new Map<string, Piece[]>();
  for (const piece of pieces) {
    if (piece.gauge === null || piece.material === "flexible" || piece.supply === "bought") continue;
    const key = `${piece.material} ${piece.gauge}`;
    const group = groups.get(key);
    if (group) group.push(piece);
    else groups.set(key, [piece]);
  }
  return [...groups.values()].map((group) => nestGroup(group, stock));
}

function nestGroup(pieces: readonly Piece[], stock: Stock): NestedSheet {
  const coil = new Map<Meters, { length: number; area: number }>();
  const blanks: Blank[] = [];
  const tooLarge: string[] = [];
  const { width_m: sheetWidth, length_m: sheetLength } = stock.sheet;
  for (const piece of pieces) {
    // Spiral duct is wound from strip, not cut.
    if (piece.kind === "straight" && piece.seam === "spiral") continue;
    const across = Math.max(0, piece.blankArea_m2 / piece.netArea_m2);
    if (piece.kind === "straight") {
      const width = stock.coilWidths_m.find((each) => each >= piece.length_m - 1e-9);
      if (width !== undefined) {
        const length = piece.blankArea_m2 / piece.length_m;
        const used = coil.get(width) ?? { length: 0, area: 0 };
        coil.set(width, { length: used.length + length, area: used.area + piece.blankArea_m2 });
        continue;
      }
    }
    for (const pattern of patternsOf(piece.body) ?? []) {
      const { width_m, height_m } = patternSize(pattern);
      // The edges that the blank gains are shared by both sides.
      const grown = Math.sqrt(across);
      const [long, short] = [Math.max(width_m, height_m) * grown, Math.min(width_m, height_m) * grown];
      if (short > sheetWidth || long > sheetLength) {
        tooLarge.push(piece.mark);
        blanks.push(...splitBlank({ width: short, length: long, area: short * long }, stock, pattern.count));
        continue;
      }
      for (let i = 0; i < pattern.count; i++) blanks.push({ width: short, length: long, area: short * long });
    }
  }
  const sheets = packSheets(blanks, stock.sheet);
  const sheetArea = blanks.reduce((sum, { area }) => sum + area, 0);
  const coilUsed = [...coil].map(([width, { length, area }]) => ({ width, length, area }));
  const stockArea =
    sheets * sheetWidth * sheetLength + coilUsed.reduce((sum, { width, length }) => sum + width * length, 0);
  const { material, gauge } = pieces[0]!;
  return {
    material,
    gauge: gauge ?? "",
    coil: coilUsed
      .sort((a, b) => a.width - b.width)
      .map(({ width, length, area }) => ({
        width_m: width,
        length_m: meters(length),
        blankArea_m2: squareMeters(area),
      })),
    sheets,
    sheetBlankArea_m2: squareMeters(sheetArea),
    utilization: stockArea > 0 ? (sheetArea + coilUsed.reduce((sum, { area }) => sum + area, 0)) / stockArea : 0,
    tooLarge: [...new Set(tooLarge)],
  };
}

/** Cut into equal parts that fit, along and across. */
function splitBlank({ width, length }: Blank, { sheet }: Stock, count: number): Blank[] {
  const across = Math.ceil(width / sheet.width_m);
  const along = Math.ceil(length / sheet.length_m);
  const part = { width: width / across, length: length / along, area: (width * length) / (across * along) };
  return Array.from({ length: across * along * count }, () => part);
}

interface Shelf {
  /** Across the sheet, of its first and widest blank. */
  readonly depth: number;
  left: number;
}

/** Shelves run along the sheet; a sheet holds shelves side by side until its width is used. Answers the sheets begun. */
export function packSheets(
  blanks: readonly Blank[],
  sheet: { readonly width_m: number; readonly length_m: number },
): number {
  const waiting = blanks
    .map((blank) => turnedToFit(blank, sheet))
    .sort((a, b) => b.width - a.width || b.length - a.length);
  const sheets: { room: number }[] = [];
  let open: Shelf[] = [];
  for (const { width, length } of waiting) {
    const shelf = open.find((each) => each.depth >= width - 1e-9 && each.left >= length - 1e-9);
    if (shelf) {
      shelf.left -= length;
    } else {
      let home = sheets.find(({ room }) => room >= width - 1e-9);
      if (!home) sheets.push((home = { room: sheet.width_m }));
      home.room -= width;
      open.push({ depth: width, left: sheet.length_m - length });
    }
    // What cannot take the smallest blank any more is of no use to look at.
    if (open.length > MOST_OPEN) open = open.filter(({ left }) => left > sheet.length_m / 20);
  }
  return sheets.length;
}

const MOST_OPEN = 200;

/** Along the sheet or across it, whichever way more of the same come out of one. */
function turnedToFit(blank: Blank, sheet: { readonly width_m: number; readonly length_m: number }): Blank {
  const fit = (side: number, of: number) => Math.floor((of + 1e-9) / side);
  const { width, length } = blank;
  const asItIs = fit(width, sheet.width_m) * fit(length, sheet.length_m);
  const turned = fit(length, sheet.width_m) * fit(width, sheet.length_m);
  return turned > asItIs ? { ...blank, width: length, length: width } : blank;
}
