/** What a takeoff asks of the price book: one entry for each price, with its quantity by system. */
import { METERS_PER_INCH } from "../quantity.ts";
import { sizeKey } from "../takeoff/count-items.ts";
import { longestSide } from "../takeoff/gauge.ts";
import { insulationKey, insulationWords } from "../takeoff/insulation.ts";
import type { CountedItem, Piece, Takeoff } from "../takeoff/takeoff.ts";
import type { LineGroup } from "./estimate.ts";
import type { Dimension } from "./units.ts";

export interface Measure {
  readonly dimension: Dimension;
  /** In SI or as a count, with what is cut away in seams and laps. */
  readonly bySystem: ReadonlyMap<string, number>;
  /** What is in the pieces themselves. */
  readonly net: number;
}

export interface Demand {
  readonly key: string;
  /** Key of the price that holds for it. */
  readonly priceKey: string;
  /** What it is called until a price names it. */
  readonly description: string;
  readonly group: LineGroup;
  /** Metal can be priced by weight or by area, all else by one measure. */
  readonly measures: readonly Measure[];
  /** Bought with waste. */
  readonly isMetal: boolean;
}

interface Ask {
  readonly key: string;
  /** Its line is its own, its price another's: an allowance of sheet is priced as that sheet. */
  readonly pricedAs?: string;
  /** Goes up to the next band that the book has: "spiral:to 12" for 11 in. */
  readonly band?: { readonly base: string; readonly size_in: number };
  readonly description: string;
  readonly group: LineGroup;
  readonly isMetal: boolean;
  readonly systemId: string;
  readonly amounts: readonly { readonly dimension: Dimension; readonly amount: number; readonly net: number }[];
}

/**
 * In the order of the takeoff: metal first as its pieces come, then wrap and liner, then what is counted.
 *
 * A size that the book does not know is asked for without its size: "volume-damper:12" as "volume-damper".
 */
export function demandsOf(takeoffs: readonly Takeoff[], isInBook: (key: string) => boolean): readonly Demand[] {
  const byKey = new Map<string, OpenDemand>();
  const ask = (one: Ask) => collect(byKey, one, isInBook);
  for (const { pieces } of takeoffs) for (const piece of pieces) askForPiece(piece, ask);
  for (const { pieces } of takeoffs) for (const piece of pieces) askForInsulation(piece, ask);
  for (const { items } of takeoffs) for (const item of items) ask(askForItem(item));
  return [...byKey.values()];
}

interface OpenMeasure extends Measure {
  readonly bySystem: Map<string, number>;
  net: number;
}
interface OpenDemand extends Demand {
  readonly measures: readonly OpenMeasure[];
}

function collect(byKey: Map<string, OpenDemand>, ask: Ask, isInBook: (key: string) => boolean): void {
  const { systemId, amounts } = ask;
  const key = ask.band ? bandInBook(ask.key, ask.band, isInBook) : keyInBook(ask.key, isInBook);
  let open = byKey.get(key);
  if (!open) {
    const measures = amounts.map(({ dimension }) => ({ dimension, bySystem: new Map<string, number>(), net: 0 }));
    open = {
      key,
      priceKey: ask.pricedAs ?? key,
      description: ask.description,
      group: ask.group,
      isMetal: ask.isMetal,
      measures,
    };
    byKey.set(key, open);
  }
  for (const { dimension, amount, net } of amounts) {
    const measure = open.measures.find((each) => each.dimension === dimension);
    if (!measure) throw new Error(`"${key}" is asked for by ${dimension} and by something else`);
    measure.bySystem.set(systemId, (measure.bySystem.get(systemId) ?? 0) + amount);
    measure.net += net;
  }
}

/** The size itself, or the smallest band over it; without either the size is asked for. */
function bandInBook(
  key: string,
  { base, size_in }: NonNullable<Ask["band"]>,
  isInBook: (key: string) => boolean,
): string {
  if (isInBook(key)) return key;
  for (let to = Math.ceil(size_in - 1e-6); to <= WIDEST_BAND_IN; to++) {
    const band = `${base}:to ${to}`;
    if (isInBook(band)) return band;
  }
  return key;
}

const WIDEST_BAND_IN = 120;

/** Metal goes by its full key; only what is counted falls back. */
function keyInBook(key: string, isInBook: (key: string) => boolean): string {
  const colon = key.indexOf(":");
  if (colon < 0 || key.startsWith("metal:") || key.startsWith("allowance:") || isInBook(key)) return key;
  return key.slice(0, colon);
}

function askForPiece(piece: Piece, ask: (one: Ask) => void): void {
  const { systemId } = piece;
  if (piece.kind === "flexible") {
    const size = sizeKey(piece.section);
    const amounts = [{ dimension: "length", amount: piece.length_m, net: piece.length_m }] as const;
    const description = `Flexible duct, ${size} in.`;
    const band = { base: "flexible", size_in: longestSide(piece.section) / METERS_PER_INCH };
    ask({ key: `flexible:${size}`, band, description, group: "devices", isMetal: false, systemId, amounts });
    return;
  }
  if (piece.supply === "bought") return askForBought(piece, ask);
  // Without a gauge there is nothing to price; the takeoff's own finding stops the quote.
  if (piece.gauge === null) return;
  const blankShare = piece.netArea_m2 > 0 ? piece.blankArea_m2 / piece.netArea_m2 : 1;
  ask({
    key: `metal:${piece.material}:${piece.gauge}`,
    description: `Sheet, ${piece.material}, ${piece.gauge}`,
    group: "metal",
    isMetal: true,
    systemId,
    amounts: [
      { dimension: "mass", amount: piece.weight_kg * blankShare, net: piece.weight_kg },
      { dimension: "area", amount: piece.blankArea_m2, net: piece.netArea_m2 },
    ],
  });
}

/** Duct by its length, fittings each; under the size of their larger end. "spiral:14", "elbow-gored-90:14". */
function askForBought(piece: Piece, ask: (one: Ask) => void): void {
  const { systemId, section, otherSection, fitting, angle_rad } = piece;
  const size = sizeKey(section);
  const other = otherSection === null || sizeKey(otherSection) === size ? "" : ` to ${sizeKey(otherSection)}`;
  const ends = otherSection === null ? [section] : [section, otherSection];
  const size_in = Math.max(...ends.map((end) => longestSide(end) / METERS_PER_INCH));
  const turn = piece.kind === "elbow" ? `-${Math.round((angle_rad * 180) / Math.PI)}` : "";
  const duct = piece.seam === "spiral" ? "spiral" : "pipe";
  const base = `${fitting === null ? (section.shape === "flat-oval" ? `oval-${duct}` : duct) : fitting}${turn}`;
  const dimension = fitting === null ? "length" : "count";
  const amount = fitting === null ? piece.length_m : 1;
  ask({
    key: `${base}:${size}${other}`,
    band: { base, size_in },
    description: `Bought: ${base.replaceAll("-", " ")}, ${size}${other} in.`,
    group: "metal",
    isMetal: false,
    systemId,
    amounts: [{ dimension, amount, net: amount }],
  });
}

function askForInsulation(piece: Piece, ask: (one: Ask) => void): void {
  const { systemId, insulation, insulationArea_m2: wrap, linerArea_m2: liner } = piece;
  if (insulation.kind === "none") return;
  const of = (key: string, description: string, area: number): Ask => ({
    key,
    description,
    group: "metal",
    isMetal: false,
    systemId,
    amounts: [{ dimension: "area", amount: area, net: area }],
  });
  const area = insulation.kind === "wrap" ? wrap : liner;
  if (area > 0) ask(of(insulationKey(insulation), insulationWords(insulation), area));
}

const ITEM_GROUPS: Readonly<Record<CountedItem["kind"], LineGroup>> = {
  hanger: "metal",
  sealant: "metal",
  hardware: "metal",
  allowance: "metal",
  accessory: "accessories",
  device: "devices",
};

const DIMENSIONS: Readonly<Record<CountedItem["unit"], Dimension>> = {
  ea: "count",
  L: "volume",
  m: "length",
  kg: "mass",
};

const askForItem = ({ key, kind, description, systemId, quantity, unit }: CountedItem): Ask => ({
  key,
  ...(kind === "allowance" ? { pricedAs: key.slice(key.indexOf(":metal:") + 1) } : {}),
  description,
  group: ITEM_GROUPS[kind],
  isMetal: false,
  systemId,
  amounts: [{ dimension: DIMENSIONS[unit], amount: quantity, net: quantity }],
});
