/** The fittings of one segment with their losses: chosen by the estimator, or inferred. */
import type { AirSystem, FittingType, Section } from "../air-system.ts";
import {
  RADIUS_ELBOW_SOURCE,
  SMOOTH_ELBOW_SOURCE,
  SQUARE_THROAT_SOURCE,
  bendAngleFactor,
  isSideRatioInTable,
  radiusElbowCoefficient,
  smoothElbowCoefficient,
  squareThroatElbowCoefficient,
} from "../fittings/elbow.ts";
import { rectangularElbowTable } from "../fittings/elbow.table.ts";
import { FLUSH_ENTRY_COEFFICIENT, ENDS_SOURCE, OPEN_EXIT_COEFFICIENT } from "../fittings/ends.ts";
import {
  SMALLEST_TURN_RAD,
  branchType,
  elbowType,
  isElbow,
  isJunction,
  isTransition,
  splitType,
  transitionType,
} from "../fittings/infer.ts";
import { leg, type Joints } from "../fittings/joints.ts";
import { legCosine, type JunctionSums } from "../fittings/junction-sums.ts";
import {
  CONVERGING_SOURCE,
  DIVERGING_SOURCE,
  convergingBranchFactor,
  convergingLegCoefficient,
  divergingBranchCoefficient,
  divergingMainCoefficient,
  splitLegCoefficient,
} from "../fittings/junction.ts";
import { PRACTICE_SOURCE, type PracticeCoefficients } from "../fittings/practice.table.ts";
import {
  CONTRACTION_SOURCE,
  EXPANSION_SOURCE,
  contractionCoefficient,
  expansionCoefficient,
  type TransitionForm,
} from "../fittings/transition.ts";
import { isSameSection } from "../geometry/section.ts";
import { pascals, radians, squareMeters, type Radians } from "../quantity.ts";
import type { Course } from "./course.ts";
import { addFinding, type FindingList } from "./findings.ts";
import type { Friction } from "./friction.ts";
import { plainRecord, type Draft } from "./plain-record.ts";
import type { Sections } from "./sections.ts";
import type { SolvedFitting } from "./solution.ts";
import { NONE, type Tree } from "./tree.ts";

export interface FittingContext {
  readonly system: AirSystem;
  readonly tree: Tree;
  readonly course: Course;
  readonly airflow: Float64Array;
  readonly sections: Sections;
  readonly friction: Friction;
  readonly joints: Joints;
  readonly sums: JunctionSums;
  readonly practice: PracticeCoefficients;
  readonly transitionForm: TransitionForm;
  /** Supply air leaves the equipment and junctions diverge; else it comes in and they converge. */
  readonly diverges: boolean;
  readonly findings: FindingList;
  /** Room for the fittings of one segment, used again for the next. */
  readonly scratch: SolvedFitting[];
}

const NO_FITTINGS: readonly SolvedFitting[] = [];
const RIGHT_ANGLE = radians(Math.PI / 2);
const STRAIGHT = radians(0);

/** Fittings where a segment leaves the one before, nearest the equipment first. */
export function fittingsOf(context: FittingContext, s: number): readonly SolvedFitting[] {
  const chosen = context.system.segments[s]!.fitting;
  const before = context.tree.before[s]!;
  if (chosen !== null) return chosenFittings(context, s, before, chosen);
  if (before === NONE) return NO_FITTINGS;

  const kind = context.joints.leg[s];
  if (kind === leg.branch || kind === leg.split) return listed(context, junction(context, s, before, null), null, null);
  const passes = kind === leg.run ? passage(context, s, before) : null;
  const changes = isSizeKept(context, s, before) ? null : transition(context, s, before, null);
  const turns = kind === leg.only && context.joints.turnCosine[s]! < SMALLEST_TURN_COSINE;
  return listed(context, passes, changes, turns ? elbow(context, s, before, null) : null);
}

/** The estimator's choice in place of what was inferred; the loss of passing another's branch stays. */
function chosenFittings(
  context: FittingContext,
  s: number,
  before: number,
  chosen: FittingType,
): readonly SolvedFitting[] {
  if (chosen === "none") return NO_FITTINGS;
  if (before === NONE) return listed(context, atEquipment(context, s, chosen), null, null);
  if (isJunction(chosen)) return listed(context, junction(context, s, before, chosen), null, null);

  const kind = context.joints.leg[s];
  const passes = kind === leg.run ? passage(context, s, before) : null;
  if (isTransition(chosen)) return listed(context, passes, transition(context, s, before, chosen), null);
  if (chosen === "end-cap") return listed(context, passes, endCap(context, s, context.sections.section[before]!), null);
  const joinsDirectly = kind === leg.only || kind === leg.run;
  const changes = joinsDirectly && !isSizeKept(context, s, before) ? transition(context, s, before, null) : null;
  return listed(context, passes, changes, elbow(context, s, before, chosen));
}

const isSizeKept = ({ sections }: FittingContext, s: number, before: number): boolean =>
  isSameSection(sections.section[before]!, sections.section[s]!);

/** Those that are there, in their order. */
function listed(
  context: FittingContext,
  first: SolvedFitting | null,
  second: SolvedFitting | null,
  third: SolvedFitting | null,
): readonly SolvedFitting[] {
  const { scratch } = context;
  let count = 0;
  if (first !== null) scratch[count++] = first;
  if (second !== null) scratch[count++] = second;
  if (third !== null) scratch[count++] = third;
  // A copy rather than a literal, for the reason told in plain-record.ts.
  return count === 0 ? NO_FITTINGS : scratch.slice(0, count);
}

const SMALLEST_TURN_COSINE = Math.cos(SMALLEST_TURN_RAD);

const FittingRecord = plainRecord(function (
  this: Draft<SolvedFitting>,
  type: FittingType,
  chosen: FittingType | null,
  nodeId: string,
  angle: Radians,
  upstreamSection: Section | null,
  lossCoefficient: number,
  velocityPressure: number,
  source: string,
  madeHere: boolean,
) {
  this.type = type;
  this.basis = chosen === null ? "inferred" : "chosen";
  this.nodeId = nodeId;
  this.angle_rad = angle;
  this.upstreamSection = upstreamSection;
  this.lossCoefficient = lossCoefficient;
  this.velocityPressure_pa = pascals(velocityPressure);
  this.loss_pa = pascals(lossCoefficient * velocityPressure);
  this.source = source;
  this.madeHere = madeHere;
});

/** The turn as drawn; a right angle where an elbow or tap was chosen and nothing was drawn. */
function drawnTurn({ joints }: FittingContext, s: number): Radians {
  const cosine = joints.turnCosine[s]!;
  return cosine < SMALLEST_TURN_COSINE ? radians(Math.acos(cosine)) : RIGHT_ANGLE;
}

function elbow(context: FittingContext, s: number, before: number, chosen: FittingType | null): SolvedFitting {
  const { system, sections } = context;
  const segment = system.segments[s]!;
  const section = sections.section[s]!;
  const type = chosen ?? elbowType(section, system.spec);
  const angle = drawnTurn(context, s);
  const upstream = before === NONE ? null : section;
  // Flexible duct bends by itself: its loss is that of a smooth elbow, and no piece is made.
  const madeHere = !segment.flexible;
  const pressure = context.friction.velocityPressure[s]!;
  const at = segment.fromNodeId;

  switch (type) {
    case "elbow-radius": {
      const sideRatio = sideRatioOf(context, s, before, section);
      const coefficient = radiusElbowCoefficient({ angle, radiusRatio: system.spec.elbow.radiusRatio, sideRatio });
      return new FittingRecord(type, chosen, at, angle, upstream, coefficient, pressure, RADIUS_ELBOW_SOURCE, madeHere);
    }
    case "elbow-square-throat": {
      const sideRatio = sideRatioOf(context, s, before, section);
      const coefficient = squareThroatElbowCoefficient({ angle, sideRatio });
      return new FittingRecord(
        type,
        chosen,
        at,
        angle,
        upstream,
        coefficient,
        pressure,
        SQUARE_THROAT_SOURCE,
        madeHere,
      );
    }
    case "elbow-square-throat-vanes": {
      const coefficient = context.practice.vanedElbow * bendAngleFactor(angle);
      return new FittingRecord(type, chosen, at, angle, upstream, coefficient, pressure, PRACTICE_SOURCE, madeHere);
    }
    default: {
      const smooth = smoothElbowCoefficient({
        angle,
        radiusRatio: system.spec.elbow.radiusRatio,
        darcyFrictionFactor: context.friction.darcyFrictionFactor[s]!,
      });
      const isGored = type === "elbow-gored";
      const coefficient = isGored ? smooth * context.practice.goredOverSmooth : smooth;
      const source = isGored ? GORED_SOURCE : SMOOTH_ELBOW_SOURCE;
      return new FittingRecord(type, chosen, at, angle, upstream, coefficient, pressure, source, madeHere);
    }
  }
}

const GORED_SOURCE = `Smooth elbow times a factor: ${PRACTICE_SOURCE}`;

/** Side across the plane of the bend over the side in it: a bend up or down lies in the height, any other in the width. */
function sideRatioOf(context: FittingContext, s: number, before: number, section: Section): number {
  if (section.shape !== "rectangular" && section.shape !== "flat-oval") return 1;
  const { direction } = context.course;
  const isVertical = isSteep(direction, s) || (before !== NONE && isSteep(direction, before));
  const ratio = isVertical ? section.width_m / section.height_m : section.height_m / section.width_m;
  if (!isSideRatioInTable(ratio)) {
    const { sideRatio } = rectangularElbowTable.range;
    addRangeFinding(
      context,
      s,
      ratio,
      ratio < sideRatio.from ? sideRatio.from : sideRatio.to,
      rectangularElbowTable.source,
    );
  }
  return ratio;
}

const isSteep = (direction: Float64Array, s: number): boolean => Math.abs(direction[3 * s + 2]!) > 0.5;

function addRangeFinding(context: FittingContext, s: number, value: number, limit: number, limitSource: string): void {
  const id = context.system.segments[s]!.id;
  addFinding(
    context.findings,
    s,
    "table-range-exceeded",
    { kind: "segment", id },
    { value, limit, unit: "1", limitSource },
  );
}

/** The change of size comes after a junction, so it carries this segment's air in both areas. */
function transition(context: FittingContext, s: number, before: number, chosen: FittingType | null): SolvedFitting {
  const { system, sections, friction, transitionForm, practice, diverges } = context;
  const upstream = sections.section[before]!;
  const type = chosen ?? transitionType(upstream, sections.section[s]!);
  const areaBefore = squareMeters(sections.area[before]!);
  const areaHere = squareMeters(sections.area[s]!);

  const narrows = areaHere <= areaBefore;
  const step = narrows ? { smaller: areaHere, larger: areaBefore } : { smaller: areaBefore, larger: areaHere };
  const contracts = narrows === diverges;
  const bySize = contracts ? contractionCoefficient(transitionForm, step) : expansionCoefficient(transitionForm, step);
  const isPractice = type === "shape-transition" && bySize < practice.shapeChange;
  const coefficient = isPractice ? practice.shapeChange : bySize;
  const source = isPractice ? PRACTICE_SOURCE : contracts ? CONTRACTION_SOURCE : EXPANSION_SOURCE;

  const pressure = friction.velocityPressure[s]! * (areaHere / step.smaller) ** 2;
  return new FittingRecord(
    type,
    chosen,
    system.segments[s]!.fromNodeId,
    STRAIGHT,
    upstream,
    coefficient,
    pressure,
    source,
    true,
  );
}

/** The loss of the main past a tap, a wye or a cross. The piece belongs to the branch. */
function passage(context: FittingContext, s: number, before: number): SolvedFitting {
  const { system, sections, sums, airflow, friction, joints, diverges } = context;
  const branch = sums.fullest[before]!;
  const type = junctionType(context, branch, before, system.segments[branch]!.fitting);
  const share = {
    areaRatio: sums.branchArea[before]! / sections.area[before]!,
    flowRatio: sums.branchFlow[before]! / airflow[before]!,
  };
  const run = { angle: STRAIGHT, areaRatio: 1, flowRatio: airflow[s]! / airflow[before]! };
  const coefficient = diverges
    ? divergingMainCoefficient(share)
    : convergingLegCoefficient(run, sums.momentum[before]!);
  return new FittingRecord(
    type,
    null,
    system.segments[s]!.fromNodeId,
    radians(Math.acos(legCosine(joints, branch))),
    sections.section[before]!,
    coefficient,
    friction.velocityPressure[before]!,
    diverges ? DIVERGING_SOURCE : CONVERGING_SOURCE,
    false,
  );
}

/** The type at a branch or split leg: chosen when it is a junction at all, else by geometry. */
function junctionType(context: FittingContext, s: number, before: number, chosen: FittingType | null): FittingType {
  if (chosen !== null && isJunction(chosen)) return chosen;
  const { system, sections, joints, sums } = context;
  if (joints.leg[s] === leg.split) {
    return splitType(sums.legCount[before]!, Math.acos(sums.leastTurnCosine[before]!));
  }
  return branchType(sections.section[s]!, system.spec, {
    angle: Math.acos(legCosine(joints, s)),
    facesAnother: facesAnother(context, s, before),
  });
}

/** Exactly two branches leave opposite each other: one cross instead of two taps. */
function facesAnother({ tree, course, joints, sums }: FittingContext, s: number, before: number): boolean {
  if (sums.branchCount[before] !== 2) return false;
  const { childStart, childList } = tree;
  const node = tree.from[s]!;
  const { direction } = course;
  for (let c = childStart[node]!; c < childStart[node + 1]!; c++) {
    const other = childList[c]!;
    if (other === s || joints.leg[other] !== leg.branch) continue;
    const along =
      direction[3 * s]! * direction[3 * other]! +
      direction[3 * s + 1]! * direction[3 * other + 1]! +
      direction[3 * s + 2]! * direction[3 * other + 2]!;
    return along < -0.9;
  }
  return false;
}

/** The loss of air into a branch, or into one leg of a split; and back out of them in a return. */
function junction(context: FittingContext, s: number, before: number, chosen: FittingType | null): SolvedFitting {
  const { system, sections, sums, airflow, friction, joints, practice, diverges } = context;
  const type = junctionType(context, s, before, chosen);
  const isSplit = joints.leg[s] === leg.split;
  const angle = radians(Math.acos(legCosine(joints, s)));
  const of = {
    angle: joints.leg[s] === leg.only || joints.leg[s] === leg.run ? drawnTurn(context, s) : angle,
    areaRatio: sections.area[s]! / sections.area[before]!,
    flowRatio: airflow[s]! / airflow[before]!,
  };
  if (of.areaRatio > 1) addRangeFinding(context, s, of.areaRatio, 1, diverges ? DIVERGING_SOURCE : CONVERGING_SOURCE);

  let coefficient: number;
  if (diverges) coefficient = isSplit ? splitLegCoefficient(of) : divergingBranchCoefficient(of);
  else {
    coefficient = convergingLegCoefficient(of, sums.momentum[before]!);
    if (!isSplit) coefficient *= convergingBranchFactor(of);
  }
  let source = diverges ? DIVERGING_SOURCE : CONVERGING_SOURCE;
  if ((type === "tap-shoe" || type === "tap-conical") && coefficient > 0) {
    coefficient *= practice.easedTapOverStraight;
    source = EASED_TAP_SOURCE;
  }

  // One piece serves both sides of a cross and both legs of a tee: the fuller leg makes it.
  const isShared = isSplit || type === "cross";
  return new FittingRecord(
    type,
    chosen,
    system.segments[s]!.fromNodeId,
    of.angle,
    sections.section[before]!,
    coefficient,
    friction.velocityPressure[before]!,
    source,
    !isShared || sums.fullest[before] === s,
  );
}

const EASED_TAP_SOURCE = `Idelchik's straight tap times a factor: ${PRACTICE_SOURCE}`;

function endCap({ system }: FittingContext, s: number, upstream: Section | null): SolvedFitting {
  return new FittingRecord(
    "end-cap",
    "end-cap",
    system.segments[s]!.fromNodeId,
    STRAIGHT,
    upstream,
    0,
    0,
    END_CAP_SOURCE,
    true,
  );
}

const END_CAP_SOURCE = "No air passes an end cap";

/** A fitting chosen for a segment that starts at the equipment: an elbow, or an opening in the plenum. */
function atEquipment(context: FittingContext, s: number, chosen: FittingType): SolvedFitting {
  if (isElbow(chosen)) return elbow(context, s, NONE, chosen);
  if (chosen === "end-cap") return endCap(context, s, null);
  const coefficient = context.diverges ? FLUSH_ENTRY_COEFFICIENT : OPEN_EXIT_COEFFICIENT;
  const at = context.system.segments[s]!.fromNodeId;
  return new FittingRecord(
    chosen,
    chosen,
    at,
    STRAIGHT,
    null,
    coefficient,
    context.friction.velocityPressure[s]!,
    ENDS_SOURCE,
    true,
  );
}
