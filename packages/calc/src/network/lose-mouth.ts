import type { FittingType, MouthType } from "../air-system.ts";
import { OPEN_EXIT_COEFFICIENT, entryCoefficient } from "../fittings/ends.ts";
import { openFitting, writeLaw } from "./fitting-columns.ts";
import type { FittingContext } from "./fitting-context.ts";
import { NONE } from "./tree-shape.ts";

/** Bellmouth and plenum are pieces; a plain end is the duct itself. */
const hasPiece = (type: FittingType): boolean => type === "entry-bellmouth" || type === "plenum";

/** Where the duct begins at the equipment: supply air enters it there, all other air leaves it. */
export const putMouthAtEquipment = (context: FittingContext, s: number, mouth: MouthType): void =>
  putMouth(context, s, mouth, mouth, context.diverges, false);

/** A tap or tee chosen at the equipment is an opening flush with its casing. */
export const putCollarAtEquipment = (context: FittingContext, s: number, type: FittingType): void =>
  putMouth(context, s, type, "plenum", context.diverges, false);

/** Where the duct ends in a room or outdoors: supply air leaves it there, all other air enters. */
export const putMouthAtOutlet = (context: FittingContext, s: number, mouth: MouthType): void =>
  putMouth(context, s, mouth, mouth, !context.diverges, true);

function putMouth(
  context: FittingContext,
  s: number,
  type: FittingType,
  mouth: MouthType,
  airEnters: boolean,
  isFarEnd: boolean,
): void {
  const { fittings, friction, practice } = context;
  const at = openFitting(fittings, s, type, true, hasPiece(mouth), isFarEnd ? s : NONE);
  fittings.isFarEnd[at] = isFarEnd ? 1 : 0;
  fittings.velocityPressure[at] = friction.velocityPressure[s]!;
  if (!airEnters) {
    writeLaw(fittings, at, "exit");
    fittings.lossCoefficient[at] = OPEN_EXIT_COEFFICIENT;
    return;
  }
  fittings.lossCoefficient[at] = entryCoefficient(mouth, practice.bellmouthRadiusRatio);
  if (mouth === "entry-bellmouth") writeLaw(fittings, at, "entry", practice.bellmouthRadiusRatio);
  else writeLaw(fittings, at, "plainEntry");
}
