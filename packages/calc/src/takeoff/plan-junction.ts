/** Branches: taps on a main, and the tees, crosses and wyes that take the place of a piece of it. */
import type { Section } from "../air-system.ts";
import { leg } from "../fittings/joints.ts";
import type { SolvedFitting } from "../network/solution.ts";
import { meters, radians, squareMeters } from "../quantity.ts";
import { GEOMETRY, larger, sidesInBend, type FittingPlan, type FittingPlans } from "./fitting-plan.ts";
import { isSteep, segmentBefore, type Frame } from "./frame.ts";
import type { Bend, Body } from "./body.ts";
import { makingTable } from "./making.table.ts";
import { bodyLength, bodySurface } from "./surface/body.ts";
import { radiusElbowSurface, radiusElbowTangent } from "./surface/elbow.ts";
import { girth } from "./surface/girth.ts";
import { collarSurface, coneSurface, shoeEntry, shoeSurface, wallOfMain, type MainWall } from "./surface/tap.ts";
import { extent } from "./surface/transition.ts";

export function planJunction(frame: Frame, plans: FittingPlans, s: number, fitting: SolvedFitting): FittingPlan {
  const before = segmentBefore(frame, s);
  // At the equipment a branch is a collar on a flat casing; its length is measured from there.
  if (before === null) return planTap(frame, plans, s, fitting, { distance: meters(0), radius: null }, null);
  const isSplit = frame.joints.leg[s] === leg.split;
  if (fitting.type === "wye" && isSplit) return planWye(frame, plans, s, before, fitting);
  if (fitting.type === "tee" || fitting.type === "cross") return planBody(frame, plans, s, before, fitting);
  const vertical = isSteep(frame, s) && !isSteep(frame, before);
  const main = frame.metal[before]!;
  return planTap(frame, plans, s, fitting, wallOfMain(main, vertical), main);
}

/** Straight, shoe and conical taps, and the lateral that leaves a main at a slant. */
function planTap(
  frame: Frame,
  plans: FittingPlans,
  s: number,
  { type, angle_rad }: SolvedFitting,
  wall: MainWall,
  main: Section | null,
): FittingPlan {
  const section = frame.metal[s]!;
  // A branch drawn along its main still leaves it; under 15° it could not be made.
  const angle = radians(type === "wye" ? Math.max(angle_rad, MOST_SLANTED) : Math.PI / 2);
  const entry = type === "tap-shoe" && section.shape === "rectangular" ? shoeEntry(section.width_m) : meters(0);
  // A slanted collar is long enough for its short side to clear the main.
  const lean = extent(section).width / 2 / Math.tan(angle);
  const length = meters(Math.max(makingTable.tapCollar + lean, entry));
  plans.near[s]! += wall.distance / Math.sin(angle) + length;

  let netArea = collarSurface(section, wall, angle, length);
  let body: Body = { kind: "collar", section, wall, angle_rad: angle, length_m: length };
  if (type === "tap-shoe" && section.shape === "rectangular") {
    netArea = shoeSurface(section, wall, length, entry);
    body = { kind: "shoe", section, wall, length_m: length, entry_m: entry };
  }
  if (type === "tap-conical" && section.shape !== "annular") {
    netArea = coneSurface(section, wall, length, makingTable.coneSpread);
    body = { kind: "cone", section, wall, length_m: length, spread_m: makingTable.coneSpread };
  }
  return {
    segment: s,
    type,
    kind: "branch",
    section,
    otherSection: main,
    angle: radians(angle_rad),
    length,
    gaugeSection: section,
    body,
    netArea,
    netTerms: [
      { label: "girth", value: girth(section), unit: "m" },
      { label: "mean length to the main's wall", value: netArea / girth(section), unit: "m" },
    ],
    netBasis: `${GEOMETRY}; the hole in the main is not taken off`,
  };
}

const MOST_SLANTED = Math.PI / 12;

const childrenAt = ({ tree }: Frame, s: number): number[] => {
  const node = tree.from[s]!;
  return Array.from(tree.childList.subarray(tree.childStart[node], tree.childStart[node + 1]));
};

/** A wye that ends its main: two or more radius elbows back to back. */
function planWye(frame: Frame, plans: FittingPlans, s: number, before: number, { type }: SolvedFitting): FittingPlan {
  const { joints, metal, system } = frame;
  const legs = childrenAt(frame, s);
  let netArea = 0;
  let farthest = 0;
  const terms: { label: string; value: number; unit: string }[] = [];
  const bends: Bend[] = [];
  for (const child of legs) {
    const section = metal[child]!;
    const cosine = joints.turnCosine[child]!;
    const angle = radians(Number.isNaN(cosine) ? Math.PI / 4 : Math.acos(cosine));
    const { planeSide, acrossSide } = sidesInBend(frame, child, section);
    const centerRadius = meters(system.spec.elbow.radiusRatio * planeSide);
    bends.push({
      section,
      planeSide_m: planeSide,
      acrossSide_m: acrossSide,
      angle_rad: angle,
      centerRadius_m: centerRadius,
    });
    const area = radiusElbowSurface(section, angle, centerRadius);
    const tangent = radiusElbowTangent(angle, centerRadius);
    netArea += area;
    farthest = Math.max(farthest, tangent);
    plans.near[child]! += tangent;
    terms.push({ label: "leg, girth × angle × radius", value: area, unit: "m²" });
  }
  plans.far[before]! += farthest;
  return {
    segment: s,
    type,
    kind: "branch",
    section: metal[before]!,
    otherSection: metal[s]!,
    angle: radians(frame.solution.segments[s]!.fittings.find((fitting) => fitting.type === type)?.angle_rad ?? 0),
    length: meters(2 * farthest),
    gaugeSection: larger(metal[before]!, metal[s]!),
    body: { kind: "wye", legs: bends },
    netArea: squareMeters(netArea),
    netTerms: terms,
    netBasis: `${GEOMETRY}; radius legs back to back`,
  };
}

/** A tee or cross takes the place of a piece of the main; it is closed at its end where no duct runs on. */
function planBody(
  frame: Frame,
  plans: FittingPlans,
  s: number,
  before: number,
  { type, angle_rad }: SolvedFitting,
): FittingPlan {
  const { joints, metal } = frame;
  const legs = childrenAt(frame, s);
  const isShared = type === "cross" || joints.leg[s] === leg.split;
  const branches = isShared ? legs.filter((child) => joints.leg[child] !== leg.run) : [s];
  const run = legs.find((child) => joints.leg[child] === leg.run) ?? null;
  const main = metal[before]!;
  const sections = branches.map((child) => metal[child]!);
  const length = bodyLength(sections);

  plans.far[before]! += length / 2;
  if (run !== null) plans.near[run]! += length / 2;
  const vertical = isSteep(frame, s) && !isSteep(frame, before);
  for (const child of branches) plans.near[child]! += wallOfMain(main, vertical).distance + makingTable.bodyCollar;

  const netArea = bodySurface(main, sections, { length, runsOn: run !== null });
  const walls = girth(main) * length;
  return {
    segment: s,
    type,
    kind: "branch",
    section: main,
    otherSection: metal[s]!,
    angle: radians(angle_rad),
    length,
    gaugeSection: larger(main, metal[s]!),
    body: { kind: "junction", main, branches: sections, length_m: length, runsOn: run !== null },
    netArea,
    netTerms: [
      { label: "walls along the main", value: walls, unit: "m²" },
      {
        label: run === null ? "closed end and collars, less holes" : "collars, less holes",
        value: netArea - walls,
        unit: "m²",
      },
    ],
    netBasis: `${GEOMETRY}; walls taken as flat`,
  };
}
