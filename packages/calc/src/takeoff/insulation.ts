/** Insulation by its thickness: the key of its price, and the resistance that its thickness is sold for. */
import type { Insulation } from "../air-system.ts";
import { METERS_PER_INCH } from "../quantity.ts";
import { resistanceTable } from "./hardware.table.ts";

type Insulated = Exclude<Insulation, { readonly kind: "none" }>;

/** "wrap:2": by thickness in inches, to two decimals. */
export const insulationKey = ({ kind, thickness_m }: Insulated): string => `${kind}:${inchesOf(thickness_m)}`;

const inchesOf = (thickness_m: number): number => Math.round((thickness_m / METERS_PER_INCH) * 100) / 100;

/** h·ft²·°F/Btu; null for a thickness that the table does not have. Nothing between its rows is made up. */
export function resistanceOf({ kind, thickness_m }: Insulated): number | null {
  const thickness = inchesOf(thickness_m);
  return resistanceTable[kind].find(({ thickness_in }) => Math.abs(thickness_in - thickness) < 0.01)?.r ?? null;
}

/** @example insulationWords({ kind: "wrap", thickness_m: inches(2) }) // "Insulation wrap, 2 in., R-5.6 installed" */
export function insulationWords(insulation: Insulated): string {
  const name = insulation.kind === "wrap" ? "Insulation wrap" : "Duct liner";
  const resistance = resistanceOf(insulation);
  const thick = `${name}, ${inchesOf(insulation.thickness_m)} in.`;
  if (resistance === null) return thick;
  return insulation.kind === "wrap" ? `${thick}, R-${resistance} installed` : `${thick}, R-${resistance}`;
}
