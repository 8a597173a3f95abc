import type { FittingType } from "../air-system.ts";
import { branchType, isJunction, splitType } from "../fittings/infer.ts";
import { angleOfCosine, leg } from "../fittings/joints.ts";
import { legCosine } from "../fittings/junction-sums.ts";
import {
  CONVERGING_SOURCE,
  DIVERGING_SOURCE,
  convergingBranchFactor,
  convergingLegCoefficient,
  divergingBranchCoefficient,
  divergingMainCoefficient,
  splitLegCoefficient,
  type JunctionLeg,
} from "../fittings/junction.ts";
import { openFitting, writeLaw } from "./fitting-columns.ts";
import { markOutOfTable, type FittingContext } from "./fitting-context.ts";
import { drawnTurn } from "./lose-elbow.ts";

/** The loss of the main past a tap, a wye or a cross. The piece belongs to the branch. */
export function putPassage(context: FittingContext, s: number, before: number): void {
  const { system, sections, sums, airflow, friction, joints, diverges, fittings } = context;
  const branch = sums.fullest[before]!;
  const type = junctionType(context, branch, before, system.segments[branch]!.fitting);
  const at = openFitting(fittings, s, type, false, false, before);
  fittings.angle[at] = angleOfCosine(legCosine(joints, branch));
  fittings.velocityPressure[at] = friction.velocityPressure[before]!;
  if (diverges) {
    const areaRatio = sums.branchArea[before]! / sections.area[before]!;
    const flowRatio = sums.branchFlow[before]! / airflow[before]!;
    writeLaw(fittings, at, "divergingMain", areaRatio, flowRatio);
    fittings.lossCoefficient[at] = divergingMainCoefficient({ areaRatio, flowRatio });
    return;
  }
  const flowRatio = airflow[s]! / airflow[before]!;
  const momentum = sums.momentum[before]!;
  writeLaw(fittings, at, "convergingMain", flowRatio, momentum);
  fittings.lossCoefficient[at] = convergingLegCoefficient(flowRatio, momentum);
}

/** The loss of air into a branch, or into one leg of a split; and back out of them in a return. */
export function putJunction(context: FittingContext, s: number, before: number, chosen: FittingType | null): void {
  const { sections, sums, airflow, friction, joints, practice, diverges, fittings } = context;
  const type = junctionType(context, s, before, chosen);
  const kind = joints.leg[s];
  const isSplit = kind === leg.split;
  // A tap chosen where nothing branches turns as drawn, or at a right angle.
  const turnsAsDrawn = kind === leg.only || kind === leg.run;
  const angle = turnsAsDrawn ? drawnTurn(context, s) : angleOfCosine(legCosine(joints, s));
  // One piece serves both sides of a cross and both legs of a tee: the fuller leg makes it.
  const isShared = isSplit || type === "cross";
  const madeHere = !isShared || sums.fullest[before] === s;
  const at = openFitting(fittings, s, type, chosen !== null, madeHere, before);
  fittings.angle[at] = angle;
  fittings.velocityPressure[at] = friction.velocityPressure[before]!;

  const areaRatio = sections.area[s]! / sections.area[before]!;
  if (areaRatio > 1) {
    const limitSource = diverges ? DIVERGING_SOURCE : CONVERGING_SOURCE;
    markOutOfTable(context, at, s, { value: areaRatio, limit: 1, limitSource });
  }
  const turn: JunctionLeg = {
    turnCosine: turnsAsDrawn ? Math.cos(angle) : legCosine(joints, s),
    // A branch larger than its main is read as one of the main's own size.
    areaRatio: Math.min(1, areaRatio),
    flowRatio: airflow[s]! / airflow[before]!,
  };
  const momentum = sums.momentum[before]!;
  const straight = diverges ? divergingLoss(turn, isSplit) : convergingLoss(turn, isSplit, momentum);
  const ease = straight > 0 ? easeOf(type, practice.easedTapOverStraight) : 1;
  fittings.lossCoefficient[at] = straight * ease;

  if (ease !== 1) writeLaw(fittings, at, "easedTap", turn.areaRatio, turn.flowRatio, ease);
  else if (diverges) {
    writeLaw(fittings, at, "divergingBranch", turn.areaRatio, turn.flowRatio, turn.flowRatio / turn.areaRatio);
  } else writeLaw(fittings, at, "convergingBranch", turn.areaRatio, turn.flowRatio, momentum);
}

/** What an entry at a slant or a cone makes of a straight tap's loss. A saddle changes how it is fixed, not the air. */
const easeOf = (type: FittingType, eased: { readonly shoe: number; readonly conical: number }): number =>
  type === "tap-shoe" ? eased.shoe : type === "tap-conical" ? eased.conical : 1;

const divergingLoss = (turn: JunctionLeg, isSplit: boolean): number =>
  isSplit ? splitLegCoefficient(turn) : divergingBranchCoefficient(turn);

function convergingLoss(turn: JunctionLeg, isSplit: boolean, momentum: number): number {
  const coefficient = convergingLegCoefficient(turn.flowRatio / turn.areaRatio, momentum);
  return isSplit ? coefficient : coefficient * convergingBranchFactor(turn);
}

/** The type at a branch or split leg: chosen when it is a junction at all, else by geometry. */
function junctionType(context: FittingContext, s: number, before: number, chosen: FittingType | null): FittingType {
  if (chosen !== null && isJunction(chosen)) return chosen;
  const { system, sections, joints, sums } = context;
  if (joints.leg[s] === leg.split) return splitType(sums.legCount[before]!, sums.leastTurnCosine[before]!);
  return branchType(
    sections.section[s]!,
    system.spec,
    legCosine(joints, s),
    sums.branchCount[before] === 2 && facesAnother(context, s),
  );
}

/** The other of exactly two branches leaves opposite this one: one cross instead of two taps. */
function facesAnother({ tree, course, joints }: FittingContext, s: number): boolean {
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
