/** Every wall of a piece, laid flat. */
import { girth, outerWall, innerWall, coveredArea } from "../surface/girth.ts";
import type { Body } from "../body.ts";
import { triangulated } from "./develop.ts";
import { goredElbowPatterns, miteredElbowPatterns, offsetPatterns, radiusElbowPatterns } from "./elbow-patterns.ts";
import { flat, rectangle, type FlatPattern, type FlatPoint } from "./flat-pattern.ts";
import {
  capPatterns,
  collarPatterns,
  conePatterns,
  junctionPatterns,
  plenumPatterns,
  shoePatterns,
} from "./junction-patterns.ts";
import { pairedRing, walkAround, wallsOf } from "./outline.ts";

type BodyOf<K extends Body["kind"]> = Extract<Body, { readonly kind: K }>;

/**
 * Net outlines of all walls of a piece, or null where it is formed and not developed: a smooth bend of round or oval duct
 * is drawn or pressed.
 *
 * Patterns are the geometry alone; edges for seams and joints come on top (see edges.table.ts).
 *
 * @example patternsOf({ kind: "straight", section, length_m: feet(5) }) // one wrapper with three folds
 */
export function patternsOf(body: Body): readonly FlatPattern[] | null {
  switch (body.kind) {
    case "straight":
      return straightPatterns(body);
    case "radius-elbow":
      return radiusElbowPatterns(body);
    case "offset":
      return offsetPatterns(body);
    case "mitered-elbow":
      return miteredElbowPatterns(body);
    case "gored-elbow":
      return goredElbowPatterns(body);
    case "transition":
      return transitionPatterns(body);
    case "collar":
      return collarPatterns(body);
    case "cone":
      return conePatterns(body);
    case "shoe":
      return shoePatterns(body);
    case "junction":
      return junctionPatterns(body);
    case "wye":
      return wyePatterns(body);
    case "plenum":
      return plenumPatterns(body);
    case "cap":
      return capPatterns(body);
  }
}

function straightPatterns({ section, length_m }: BodyOf<"straight">): FlatPattern[] {
  if (section.shape !== "rectangular") {
    return wallsOf(section).map((wall) => rectangle("wrapper", 1, girth(wall), length_m));
  }
  const { width_m, height_m } = section;
  const folds = [width_m, width_m + height_m, 2 * width_m + height_m].map((x): readonly [FlatPoint, FlatPoint] => [
    [x, 0],
    [x, length_m],
  ]);
  return [{ ...rectangle("wrapper", 1, girth(section), length_m), folds }];
}

function transitionPatterns({ from, to, length_m, shift }: BodyOf<"transition">): FlatPattern[] {
  const none = { x_m: 0, y_m: 0 };
  const between = (name: string, a: ReturnType<typeof outerWall>, b: ReturnType<typeof outerWall>) =>
    flat(name, 1, triangulated(pairedRing(a, 0, none), pairedRing(b, length_m, shift)));
  const patterns = [between("wall", outerWall(from), outerWall(to))];
  const [innerFrom, innerTo] = [innerWall(from), innerWall(to)];
  if (innerFrom && innerTo) return [...patterns, between("inner wall", innerFrom, innerTo)];
  const ending = innerFrom ?? innerTo;
  if (!ending) return patterns;
  const ring = walkAround(ending).map(({ x, y }): FlatPoint => [x, y]);
  return coveredArea(ending) > 0
    ? [...patterns, rectangle("inner wall", 1, girth(ending), length_m), flat("inner end", 1, ring)]
    : patterns;
}

function wyePatterns({ legs }: BodyOf<"wye">): readonly FlatPattern[] | null {
  const patterns: FlatPattern[] = [];
  for (const bend of legs) {
    const leg = radiusElbowPatterns({ bend, splitterCount: 0 });
    if (!leg) return null;
    patterns.push(...leg);
  }
  return patterns;
}
