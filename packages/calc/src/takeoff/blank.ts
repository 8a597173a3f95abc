/** Blank area of a piece: its net area, and the edges that its seams and joints take. Waste is not in it. */
import type { ConstructionSpec, Section } from "../air-system.ts";
import { meters, squareMeters, type Meters, type SquareMeters } from "../quantity.ts";
import type { Body } from "./body.ts";
import { endEdge, seamEdge, type EdgeTable } from "./edges.table.ts";
import { girth } from "./surface/girth.ts";
import type { Arithmetic } from "./takeoff.ts";

export interface Blank {
  readonly area: SquareMeters;
  readonly seamLength: Meters;
  /** Sections at the ends that get an edge for the joint. */
  readonly ends: readonly Section[];
  readonly terms: Arithmetic["terms"];
}

/** `netArea` may come with more ends than the piece has joints of its own: each end needs its edge. */
export function blankOf(
  body: Body,
  { netArea, length, spec, edges }: { netArea: SquareMeters; length: Meters; spec: ConstructionSpec; edges: EdgeTable },
): Blank {
  const section = sectionOf(body);
  const isSpiral = body.kind === "straight" && section.shape !== "rectangular" && spec.roundConstruction === "spiral";
  const seamLength = isSpiral ? meters(0) : seamLengthOf(body, section, length, edges);
  const ends = endsOf(body);
  const seam = seamLength * seamEdge(edges, section, spec, isSpiral);
  let joints = 0;
  for (const end of ends) joints += girth(end) * endEdge(edges, end, spec);
  const turns = turnsOf(body) * edges.end.tapTurn;
  const terms = [{ label: "net area", value: netArea as number, unit: "m²" }];
  if (seam > 0) terms.push({ label: "seams", value: seam, unit: "m²" });
  if (joints > 0) terms.push({ label: "edges for joints", value: joints, unit: "m²" });
  if (turns > 0) terms.push({ label: "edge turned on the main", value: turns, unit: "m²" });
  return { area: squareMeters(netArea + seam + joints + turns), seamLength, ends, terms };
}

/** The end that gives the piece its shape. */
function sectionOf(body: Body): Section {
  switch (body.kind) {
    case "straight":
    case "collar":
    case "cone":
    case "shoe":
    case "cap":
      return body.section;
    case "radius-elbow":
    case "mitered-elbow":
    case "gored-elbow":
    case "offset":
      return body.bend.section;
    case "transition":
      return body.from;
    case "junction":
      return body.main;
    case "wye":
      return body.legs[0]!.section;
    case "plenum":
      return { shape: "rectangular", width_m: body.width_m, height_m: body.height_m };
  }
}

/**
 * A rectangular straight is one wrapper with one seam where its girth comes from one sheet, else two halves, else four
 * walls; any other rectangular piece has a seam in each corner. Round pieces have one along them, gores one more between
 * each two.
 */
function seamLengthOf(body: Body, section: Section, length: Meters, { longestBlank }: EdgeTable): Meters {
  const walls = section.shape === "annular" ? 2 : 1;
  switch (body.kind) {
    case "straight":
      return meters((section.shape === "rectangular" ? wrapperCount(section, longestBlank) : walls) * length);
    case "gored-elbow":
      return meters(walls * length + (body.pieceCount - 1) * girth(section));
    case "cap":
      return meters(0);
    case "plenum":
      return meters(4 * (body.width_m + body.height_m + body.length_m));
    default:
      return meters((section.shape === "rectangular" ? 4 : walls) * length);
  }
}

function wrapperCount({ width_m, height_m }: Extract<Section, { shape: "rectangular" }>, longest: Meters): number {
  // A seam's own edge is taken off what the sheet can hold: 120 in. of sheet less 1 1/4 in. wraps 59 3/8 in. of W + H.
  const reach = longest - WIDEST_SEAM;
  if (2 * (width_m + height_m) <= reach) return 1;
  return width_m + height_m <= reach ? 2 : 4;
}

const WIDEST_SEAM = meters(0.03175);

function endsOf(body: Body): readonly Section[] {
  switch (body.kind) {
    case "straight":
      return [body.section, body.section];
    case "radius-elbow":
    case "mitered-elbow":
    case "gored-elbow":
    case "offset":
      return [body.bend.section, body.bend.section];
    case "transition":
      return [body.from, body.to];
    case "collar":
    case "cone":
    case "shoe":
      return [body.section];
    case "junction":
      return body.runsOn ? [body.main, body.main, ...body.branches] : [body.main, ...body.branches];
    case "wye":
      return body.legs.map(({ section }) => section);
    case "plenum":
      return body.openings;
    case "cap":
      return [];
  }
}

/** Around the edge that is turned over on a main. */
const turnsOf = (body: Body): number =>
  body.kind === "collar" || body.kind === "cone" || body.kind === "shoe" ? girth(body.section) : 0;
