/** What a takeoff asks of the price book: one entry for each price, with its quantity by system. */
import { sizeKey } from "../takeoff/count-items.ts";
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
  const key = keyInBook(ask.key, isInBook);
  let open = byKey.get(key);
  if (!open) {
    const measures = amounts.map(({ dimension }) => ({ dimension, bySystem: new Map<string, number>(), net: 0 }));
    open = { key, description: ask.description, group: ask.group, isMetal: ask.isMetal, measures };
    byKey.set(key, open);
  }
  for (const { dimension, amount, net } of amounts) {
    const measure = open.measures.find((each) => each.dimension === dimension);
    if (!measure) throw new Error(`"${key}" is asked for by ${dimension} and by something else`);
    measure.bySystem.set(systemId, (measure.bySystem.get(systemId) ?? 0) + amount);
    measure.net += net;
  }
}

/** Metal and flexible duct go by their full key; only what is counted falls back. */
function keyInBook(key: string, isInBook: (key: string) => boolean): string {
  const colon = key.indexOf(":");
  if (colon < 0 || key.startsWith("metal:") || key.startsWith("flexible:") || isInBook(key)) return key;
  return key.slice(0, colon);
}

function askForPiece(piece: Piece, ask: (one: Ask) => void): void {
  const { systemId } = piece;
  if (piece.kind === "flexible") {
    const size = sizeKey(piece.section);
    const amounts = [{ dimension: "length", amount: piece.length_m, net: piece.length_m }] as const;
    const description = `Flexible duct, ${size} in.`;
    ask({ key: `flexible:${size}`, description, group: "devices", isMetal: false, systemId, amounts });
    return;
  }
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

function askForInsulation(piece: Piece, ask: (one: Ask) => void): void {
  const { systemId, insulationArea_m2: wrap, linerArea_m2: liner } = piece;
  const of = (key: string, description: string, area: number): Ask => ({
    key,
    description,
    group: "metal",
    isMetal: false,
    systemId,
    amounts: [{ dimension: "area", amount: area, net: area }],
  });
  if (wrap > 0) ask(of("wrap", "Insulation wrap", wrap));
  if (liner > 0) ask(of("liner", "Duct liner", liner));
}

const ITEM_GROUPS: Readonly<Record<CountedItem["kind"], LineGroup>> = {
  hanger: "metal",
  sealant: "metal",
  accessory: "accessories",
  device: "devices",
};

const askForItem = ({ key, kind, description, systemId, quantity, unit }: CountedItem): Ask => ({
  key,
  description,
  group: ITEM_GROUPS[kind],
  isMetal: false,
  systemId,
  amounts: [{ dimension: unit === "L" ? "volume" : "count", amount: quantity, net: quantity }],
});
