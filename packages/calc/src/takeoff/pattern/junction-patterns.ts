/** Flat patterns of taps, and of the bodies that take the place of a piece of the main. */
import type { Section } from "../../air-system.ts";
import type { Body } from "../body.ts";
import { makingTable } from "../making.table.ts";
import { coneProfile, rise } from "../surface/tap.ts";
import { girth, outerWall } from "../surface/girth.ts";
import { triangulated, unrolled } from "./develop.ts";
import { flat, rectangle, type FlatPattern, type FlatPoint } from "./flat-pattern.ts";
import { ARC_STEPS, walkAround, wallsOf, type Point3, type WallPoint } from "./outline.ts";

type BodyOf<K extends Body["kind"]> = Extract<Body, { readonly kind: K }>;

/** A branch's width lies along the main, its height across it: there a round main falls away. */
export function collarPatterns({ section, wall, angle_rad, length_m }: BodyOf<"collar">): FlatPattern[] {
  const sine = Math.sin(angle_rad);
  const lean = 1 / Math.tan(angle_rad);
  const low = ({ x, y }: WallPoint) => {
    const fallen = wall.radius === null ? 0 : (wall.radius - rise(wall.radius, y)) / sine;
    return x * lean - fallen;
  };
  return wallsOf(section).map((each) =>
    flat(
      "collar",
      1,
      unrolled(walkAround(each), low, () => length_m),
    ),
  );
}

export function conePatterns(body: BodyOf<"cone">): FlatPattern[] {
  const { radiusAt, trimmedAt, end } = coneProfile(body.section, body.wall, body.length_m, body.spread_m);
  const low: Point3[] = [];
  const high: Point3[] = [];
  for (let i = 0; i <= 4 * ARC_STEPS; i++) {
    const phi = (i / (4 * ARC_STEPS)) * 2 * Math.PI;
    const z = trimmedAt(phi);
    low.push([radiusAt(z) * Math.cos(phi), radiusAt(z) * Math.sin(phi), z]);
    high.push([radiusAt(end) * Math.cos(phi), radiusAt(end) * Math.sin(phi), end]);
  }
  return [flat("cone", 1, triangulated(low, high))];
}

/** Two sides with the entry, the back, and the front that slants over it. */
export function shoePatterns({ section, wall, length_m: length, entry_m: entry }: BodyOf<"shoe">): FlatPattern[] {
  const { width_m: along, height_m: across } = section;
  const fallenAt = (y: number) => (wall.radius === null ? 0 : wall.radius - rise(wall.radius, y));
  const side = length + fallenAt(across / 2);
  const panel = (height: number): FlatPoint[] => {
    const steps = 2 * ARC_STEPS;
    const low = Array.from({ length: steps + 1 }, (_, i): FlatPoint => {
      const x = (i / steps) * across;
      return [x, -1 * fallenAt(x - across / 2)];
    });
    return [...low, [across, height], [0, height]];
  };
  return [
    flat("side", 2, [
      [0, 0],
      [along + entry, 0],
      [along, entry],
      [along, side],
      [0, side],
    ]),
    flat("back", 1, panel(length)),
    flat("front", 1, panel(length + entry * (Math.SQRT2 - 1))),
  ];
}

/** The main's wall with its holes, a collar for each branch, and its end where no duct runs on. */
export function junctionPatterns({ main, branches, length_m, runsOn }: BodyOf<"junction">): FlatPattern[] {
  const [outer, ...inner] = wallsOf(main);
  const around = walkAround(outer!).at(-1)!.around;
  const wrapper = rectangle("main", 1, around, length_m);
  // The first branch on one side, the second opposite.
  const holes = branches.map((branch, at) => holeOf(branch, (around * (1 + 2 * (at % 2))) / 4, length_m / 2));
  const patterns: FlatPattern[] = [{ ...wrapper, holes }];
  for (const wall of inner) patterns.push(rectangle("inner wall", 1, girth(wall), length_m));
  for (const branch of branches) {
    for (const wall of wallsOf(branch)) patterns.push(rectangle("collar", 1, girth(wall), makingTable.bodyCollar));
  }
  if (!runsOn) patterns.push(flat("end", 1, outlineOf(main)));
  return patterns;
}

const holeOf = (section: Section, x: number, y: number): FlatPoint[] =>
  outlineOf(section).map(([px, py]): FlatPoint => [x + py, y + px]);

const outlineOf = (section: Section): FlatPoint[] =>
  walkAround(outerWall(section))
    .slice(0, -1)
    .map(({ x, y }): FlatPoint => [x, y]);

/** Rectangular: one blank with its corners cut out. Others: the end, and its turned edge as a strip. */
export function capPatterns({ section }: BodyOf<"cap">): FlatPattern[] {
  const turn = makingTable.capTurn;
  if (section.shape !== "rectangular") {
    return [flat("end", 1, outlineOf(section)), rectangle("edge", 1, girth(section), turn)];
  }
  const { width_m: w, height_m: h } = section;
  return [
    flat("end", 1, [
      [0, -1 * turn],
      [w, -1 * turn],
      [w, 0],
      [w + turn, 0],
      [w + turn, h],
      [w, h],
      [w, h + turn],
      [0, h + turn],
      [0, h],
      [-1 * turn, h],
      [-1 * turn, 0],
      [0, 0],
    ]),
  ];
}

/** Six sides; openings are cut in the ends, one after the other. */
export function plenumPatterns({ width_m, height_m, length_m, openings }: BodyOf<"plenum">): FlatPattern[] {
  const end = rectangle("end", 1, width_m, height_m);
  const holes = openings.map((opening) => holeOf(opening, width_m / 2, height_m / 2));
  return [
    rectangle("top and bottom", 2, width_m, length_m),
    rectangle("side", 2, height_m, length_m),
    { ...end, holes: holes.filter((_, at) => at % 2 === 0) },
    { ...end, holes: holes.filter((_, at) => at % 2 === 1) },
  ];
}
