/** What is carried as a share of the metal because no plan shows it, each a line of its own. */
import type { AllowanceOf } from "../air-system.ts";
import { hours } from "../quantity.ts";
import type { Frame } from "./frame.ts";
import type { CountedItem, Piece, TakeoffFinding } from "./takeoff.ts";

const WORDS: Readonly<Record<AllowanceOf, string>> = {
  offsets: "Offsets that plans do not show",
  hangers: "Hangers, as a share",
  sealant: "Sealant, as a share",
  joints: "Joints, as a share",
  waste: "Metal waste, as a share",
};

/**
 * One line for each allowance and sheet: a share of the blank weight, of straight duct where it stands for offsets, else
 * of all metal. Offsets carry the same share of the hours.
 */
export function countAllowances({ system }: Frame, pieces: readonly Piece[]): CountedItem[] {
  const items: CountedItem[] = [];
  for (const { of, share } of system.spec.allowances ?? []) {
    const bySheet = new Map<string, { weight: number; shop: number; field: number; first: Piece }>();
    for (const piece of pieces) {
      if (piece.gauge === null || piece.supply === "bought") continue;
      if (of === "offsets" && piece.kind !== "straight") continue;
      const key = `metal:${piece.material}:${piece.gauge}`;
      let sum = bySheet.get(key);
      if (!sum) bySheet.set(key, (sum = { weight: 0, shop: 0, field: 0, first: piece }));
      sum.weight += (piece.weight_kg * piece.blankArea_m2) / piece.netArea_m2;
      sum.shop += piece.shopHours_h;
      sum.field += piece.fieldHours_h;
    }
    for (const [sheet, { weight, shop, field, first }] of bySheet) {
      const worked = of === "offsets" ? share : 0;
      items.push({
        key: `allowance:${of}:${sheet}`,
        kind: "allowance",
        description: `${WORDS[of]}, ${first.gauge ?? ""}`,
        systemId: system.id,
        levelId: first.levelId,
        segmentId: null,
        nodeId: null,
        section: null,
        quantity: weight * share,
        unit: "kg",
        shopHours_h: hours(shop * worked),
        fieldHours_h: hours(field * worked),
        basis: `the spec's allowance: ${Number((100 * share).toFixed(2))} % of ${of === "offsets" ? "the straight duct" : "the metal"} of ${first.gauge ?? ""}`,
      });
    }
  }
  return items;
}

/** A thing that is carried as a share and counted too is in the total twice. */
export function checkAllowances(
  { system }: Frame,
  { pieces, items }: { readonly pieces: readonly Piece[]; readonly items: readonly CountedItem[] },
  findings: TakeoffFinding[],
): void {
  const counted: Readonly<Record<AllowanceOf, boolean>> = {
    offsets: pieces.some(({ fitting }) => fitting === "offset"),
    hangers: items.some(({ kind }) => kind === "hanger"),
    sealant: items.some(({ kind }) => kind === "sealant"),
    joints: pieces.some(({ ends }) => ends.length > 0),
    // Waste is a percentage of the price; there it is checked.
    waste: false,
  };
  for (const { of, share } of system.spec.allowances ?? []) {
    if (share <= 0 || !counted[of]) continue;
    findings.push({
      id: `${system.id}:carried-and-counted:${of}`,
      code: "carried-and-counted",
      severity: "warn",
      segmentId: system.segments[0]?.id ?? "",
      message: `${WORDS[of]}: ${Number((100 * share).toFixed(2))} % is carried and they are counted too; take one of them out`,
    });
  }
}
