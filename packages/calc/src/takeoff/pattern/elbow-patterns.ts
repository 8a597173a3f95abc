/** Flat patterns of bends. */
import type { Section } from "../../air-system.ts";
import { radians } from "../../quantity.ts";
import type { Bend, Body } from "../body.ts";
import { makingTable } from "../making.table.ts";
import { splitterRadii } from "../surface/elbow.ts";
import { unrolled } from "./develop.ts";
import { flat, rectangle, type FlatPattern, type FlatPoint } from "./flat-pattern.ts";
import { walkAround, wallsOf, type WallPoint } from "./outline.ts";

type BodyOf<K extends Body["kind"]> = Extract<Body, { readonly kind: K }>;

const STEP_RAD = Math.PI / 360;

/** Points of an arc about the origin, both ends included. */
function arc(radius: number, from: number, to: number): FlatPoint[] {
  const steps = Math.max(4, Math.ceil(Math.abs(to - from) / STEP_RAD));
  return Array.from({ length: steps + 1 }, (_, i): FlatPoint => {
    const t = from + (i / steps) * (to - from);
    return [radius * Math.cos(t), radius * Math.sin(t)];
  });
}

/** Cheeks, throat, heel and splitters. Bends of other than rectangular duct are formed, not developed. */
export function radiusElbowPatterns({ bend, splitterCount }: Pick<BodyOf<"radius-elbow">, "bend" | "splitterCount">) {
  const { section, planeSide_m: plane, acrossSide_m: across, angle_rad: angle, centerRadius_m: center } = bend;
  if (section.shape !== "rectangular") return null;
  const throat = center - plane / 2;
  const heel = throat + plane;
  const patterns: FlatPattern[] = [
    flat("cheek", 2, [...arc(throat, 0, angle), ...arc(heel, angle, 0)]),
    rectangle("heel", 1, angle * heel, across),
  ];
  if (throat > 0) patterns.push(rectangle("throat", 1, angle * throat, across));
  for (const radius of splitterRadii(bend, splitterCount)) {
    patterns.push(rectangle("splitter", 1, angle * radius, across));
  }
  return patterns;
}

/** Cheeks that are an S, and two walls alike, each the throat of one turn and the heel of the other. */
export function offsetPatterns({ bend }: BodyOf<"offset">): readonly FlatPattern[] | null {
  const { section, planeSide_m: plane, acrossSide_m: across, angle_rad: angle, centerRadius_m: center } = bend;
  if (section.shape !== "rectangular") return null;
  const throat = center - plane / 2;
  const heel = center + plane / 2;
  // The second turn has its center on the other side, on the line through the middle of the S.
  const middle: FlatPoint = [2 * center * Math.cos(angle), 2 * center * Math.sin(angle)];
  const back = (radius: number, from: number, to: number) =>
    arc(radius, from + Math.PI, to + Math.PI).map(([x, y]): FlatPoint => [middle[0] + x, middle[1] + y]);
  const outline = [
    ...arc(throat, 0, angle),
    ...back(heel, angle, 0),
    ...back(throat, 0, angle),
    ...arc(heel, angle, 0),
  ];
  return [flat("cheek", 2, outline), rectangle("wall", 2, angle * (throat + heel), across)];
}

/** Square-throat elbows in cheeks, throat and heel; others as two tubes cut on the slant. */
export function miteredElbowPatterns({ bend, leg_m: leg, vaneCount }: BodyOf<"mitered-elbow">): FlatPattern[] {
  const { section, planeSide_m: plane, acrossSide_m: across, angle_rad: angle } = bend;
  const slope = Math.tan(angle / 2);
  if (section.shape !== "rectangular") {
    const high = (p: WallPoint) => leg + slope * (plane / 2 + inPlane(bend, p));
    return tubes("half", 2, section, () => 0, high);
  }
  const [sine, cosine] = [Math.sin(angle), Math.cos(angle)];
  const cheek: FlatPoint[] = [
    [-1 * leg, 0],
    [0, 0],
    [leg * cosine, leg * sine],
    [leg * cosine + plane * sine, leg * sine - plane * cosine],
    [plane * slope, -1 * plane],
    [-1 * leg, -1 * plane],
  ];
  const patterns = [
    flat("cheek", 2, cheek),
    rectangle("throat", 1, 2 * leg, across),
    rectangle("heel", 1, 2 * (leg + plane * slope), across),
  ];
  if (vaneCount > 0) patterns.push(rectangle("vane", vaneCount, angle * makingTable.vane.radius, across));
  return patterns;
}

/** N pieces: two ends of half a gore, the others whole ones, 2 (N − 1) half gores in all. */
export function goredElbowPatterns({ bend, pieceCount }: BodyOf<"gored-elbow">): FlatPattern[] {
  const half = radians(bend.angle_rad / (2 * (pieceCount - 1)));
  const high = (p: WallPoint) => Math.tan(half) * (bend.centerRadius_m + inPlane(bend, p));
  const ends = tubes("end gore", 2, bend.section, () => 0, high);
  if (pieceCount === 2) return ends;
  return [...ends, ...tubes("gore", pieceCount - 2, bend.section, (p) => -high(p), high)];
}

/** How far out from the center line a point of the wall lies, in the plane of the bend. */
function inPlane({ section, planeSide_m }: Pick<Bend, "section" | "planeSide_m">, { x, y }: WallPoint): number {
  return section.shape === "flat-oval" && planeSide_m === section.height_m ? y : x;
}

const tubes = (
  name: string,
  count: number,
  section: Section,
  low: (p: WallPoint) => number,
  high: (p: WallPoint) => number,
): FlatPattern[] => wallsOf(section).map((wall) => flat(name, count, unrolled(walkAround(wall), low, high)));
