/** Gasket, corners, cleats, slips, couplings, pins, adhesive, tape: counted from the pieces of one segment. */
import type { Insulation, Section } from "../air-system.ts";
import { hours } from "../quantity.ts";
import { levelOf } from "./count-items.ts";
import type { Frame } from "./frame.ts";
import { hardwareTable } from "./hardware.table.ts";
import { girth } from "./surface/girth.ts";
import { extent } from "./surface/transition.ts";
import type { CountedItem, Piece } from "./takeoff.ts";

const roundUp = (value: number): number => Math.ceil(value - 1e-9);

interface Count {
  readonly key: string;
  readonly description: string;
  readonly quantity: number;
  readonly unit: CountedItem["unit"];
  readonly basis: string;
}

/** Their hours are in those by weight and length, for hands do both at once. */
export function countHardware(
  frame: Frame,
  s: number,
  pieces: readonly Piece[],
  insulation: Insulation,
): CountedItem[] {
  const { system, metal, solution } = frame;
  const made = pieces.filter(({ kind }) => kind !== "flexible");
  const isFast = solution.segments[s]!.meanVelocity_m_s > hardwareTable.pins.fastOver_m_s;
  const counts: Count[] = [];
  countJoints(made, counts);
  countInsulation(made, insulation, isFast, system.spec.vaporBarrier === true, counts);
  if (counts.length === 0) return [];
  const levelId = levelOf(frame, s);
  // Fields are written out: an object spread is an order of magnitude slower, and thousands are made at each edit.
  return counts.map(({ key, description, quantity, unit, basis }) => ({
    key,
    kind: "hardware",
    description,
    systemId: system.id,
    levelId,
    segmentId: system.segments[s]!.id,
    nodeId: null,
    section: metal[s]!,
    quantity,
    unit,
    fieldHours_h: hours(0),
    basis,
  }));
}

/** The section at the joint that a piece brings: its end nearer the equipment. */
const jointSection = ({ section, otherSection, kind }: Piece): Section =>
  kind === "transition" ? section : (otherSection ?? section);

function countJoints(pieces: readonly Piece[], counts: Count[]): void {
  const { flange, slip, coupling } = hardwareTable;
  let [gasket, corners, cleats, slips, standing, drives, couplings] = [0, 0, 0, 0, 0, 0, 0];
  for (const piece of pieces) {
    const section = jointSection(piece);
    if (piece.kind === "branch" || piece.kind === "end-cap") continue;
    if (section.shape !== "rectangular") {
      if (piece.kind === "straight" && piece.joint === "slip coupling") couplings += piece.jointCount;
      if (piece.joint === "flange") gasket += girth(section);
      continue;
    }
    const { width_m, height_m } = section;
    if (piece.joint === "flange") {
      gasket += girth(section);
      corners += flange.cornersPerJoint;
      cleats += 2 * (roundUp(width_m / flange.cleatSpacing) + roundUp(height_m / flange.cleatSpacing));
    } else {
      if (piece.joint === "standing S") standing += 2 * width_m;
      else slips += 2 * width_m;
      drives += 2 * height_m;
    }
  }
  const add = (key: string, description: string, quantity: number, unit: Count["unit"], basis: string) => {
    if (quantity > 0) counts.push({ key, description, quantity, unit, basis });
  };
  add("gasket", "Flange gasket", gasket, "m", "around every flanged joint");
  add("flange-corner", "Flange corner", corners, "ea", flange.source);
  add("flange-cleat", "Flange cleat", cleats, "ea", flange.source);
  add("slip-strip", "Slip", slips, "m", slip.source);
  add("standing-slip-strip", "Standing slip", standing, "m", slip.source);
  add("drive-strip", "Drive", drives, "m", slip.source);
  add("coupling", "Slip coupling", couplings, "ea", coupling.source);
}

function countInsulation(
  pieces: readonly Piece[],
  insulation: Insulation,
  isFast: boolean,
  hasBarrier: boolean,
  counts: Count[],
): void {
  const { pins, adhesive, tape } = hardwareTable;
  if (insulation.kind === "liner") {
    const area = pieces.reduce((sum, { linerArea_m2 }) => sum + linerArea_m2, 0);
    const count = pieces.reduce((sum, piece) => sum + pinCount(piece.clearSection, piece.length_m, isFast), 0);
    const glue = area * adhesive.liters_per_m2;
    if (count > 0) {
      counts.push({ key: "liner-pin", description: "Liner pin", quantity: count, unit: "ea", basis: pins.source });
    }
    if (glue > 0) {
      const [key, description] = ["liner-adhesive", "Liner adhesive"];
      counts.push({ key, description, quantity: glue, unit: "L", basis: adhesive.source });
    }
    return;
  }
  if (insulation.kind === "none" || !hasBarrier) return;
  const quantity = pieces.reduce((sum, { insulationArea_m2 }) => sum + insulationArea_m2, 0) * tape.m_per_m2;
  if (quantity === 0) return;
  counts.push({ key: "vapor-tape", description: "Vapor barrier tape", quantity, unit: "m", basis: tape.source });
}

/**
 * Pins of one lined piece: rows along it, in each row so many on each side that is wider than 8 in.
 *
 *     rows = ⌈(L − 2·3 in.) / along⌉ + 1,   on a side ⌈(W − 2·6 in.) / around⌉ + 1
 *
 * Source   SMACNA 1995, S2.0 to S2.11: 3 in. from joints, then 18 in. apart, 12 in. around; over 2,500 fpm 16 in. and 6 in.
 * @example pinCount(24 × 12 in., 60 in., false) // 4 rows of 6: 24
 */
export function pinCount(clear: Section, length_m: number, isFast: boolean): number {
  const { pins } = hardwareTable;
  const apart = isFast ? pins.fast : pins.slow;
  const rows = Math.max(0, roundUp((length_m - 2 * pins.fromJoint) / apart.along)) + 1;
  const onSide = (width: number) =>
    width <= pins.noneUpTo ? 0 : Math.max(0, roundUp((width - 2 * pins.fromCorner) / apart.around)) + 1;
  const { width, height } = extent(clear);
  return rows * 2 * (onSide(width) + onSide(height));
}
