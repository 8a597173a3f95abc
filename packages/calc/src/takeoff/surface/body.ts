/** Surface of junctions that replace a piece of the main: tees, crosses, wyes; and of caps. */
import type { Section } from "../../air-system.ts";
import { meters, squareMeters, type Meters, type SquareMeters } from "../../quantity.ts";
import { makingTable } from "../making.table.ts";
import { coveredArea, girth } from "./girth.ts";
import { extent } from "./transition.ts";

/** Along the main: the widest branch and a collar to each side. */
export const bodyLength = (branches: readonly Section[]): Meters =>
  meters(Math.max(...branches.map((branch) => extent(branch).width)) + 2 * makingTable.bodyCollar);

/**
 * Tee or cross: a piece of the main with a collar for every branch; closed at its end where no duct runs on.
 *
 *     A = P L (+ cap) + Σ (Pb c − Ab)
 *
 * Holes are out, for they are cut before the piece is made. Walls are taken as flat.
 */
export function bodySurface(
  main: Section,
  branches: readonly Section[],
  { length, runsOn }: { length: Meters; runsOn: boolean },
): SquareMeters {
  let area = girth(main) * length + (runsOn ? 0 : coveredArea(main));
  for (const branch of branches) area += girth(branch) * makingTable.bodyCollar - coveredArea(branch);
  return squareMeters(area);
}

/**
 * Closed box less its openings.
 *
 *     A = 2 (W H + W L + H L) − Σ openings
 *
 * Source   geometry; trades that pay by area leave the openings in
 */
export function plenumSurface(
  box: { readonly width_m: Meters; readonly height_m: Meters; readonly length_m: Meters },
  openings: readonly Section[],
): SquareMeters {
  const { width_m: w, height_m: h, length_m: l } = box;
  let area = 2 * (w * h + w * l + h * l);
  for (const opening of openings) area -= coveredArea(opening);
  return squareMeters(area);
}

/** End cap with its edge turned over: W H + 2 (W + H) f, π D²/4 + π D f. */
export const capSurface = (section: Section): SquareMeters =>
  squareMeters(coveredArea(section) + girth(section) * makingTable.capTurn);
