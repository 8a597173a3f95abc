/** What the pieces of one segment depend on, so that a takeoff after an edit makes only those anew that changed. */
import type { AirSegment, ConstructionSpec, Section } from "../air-system.ts";
import { levelOf, sheetOf } from "./count-items.ts";
import type { FittingPlan, FittingPlans } from "./fitting-plan.ts";
import type { Frame } from "./frame.ts";
import type { CountedItem, Piece, ShopStandards, TakeoffFinding, TakeoffInput } from "./takeoff.ts";

interface SegmentInputs {
  readonly segment: AirSegment;
  readonly number: number;
  readonly levelId: string;
  readonly sheetNumber: string;
  readonly revision: string;
  readonly section: Section;
  readonly length_m: number;
  readonly taken_m: number;
  readonly meanVelocity_m_s: number;
  readonly plans: readonly FittingPlan[];
}

export interface TakeoffMemory {
  readonly spec: ConstructionSpec;
  readonly standards: ShopStandards;
  readonly systemKey: string;
  readonly parts: Map<
    string,
    {
      readonly inputs: SegmentInputs;
      readonly parts: {
        readonly pieces: readonly Piece[];
        readonly items: readonly CountedItem[];
        readonly findings: readonly TakeoffFinding[];
      };
    }
  >;
}

/** What every piece carries of its system. */
export const systemKey = ({ system }: TakeoffInput): string => `${system.id} ${system.tag}`;

/** Spec and standards go into every piece: where they changed, nothing is kept. */
export const isForSame = (memory: TakeoffMemory, input: TakeoffInput): boolean =>
  memory.systemKey === systemKey(input) &&
  isSame(memory.spec, input.system.spec) &&
  isSame(memory.standards, input.standards);

export function inputsOf(frame: Frame, plans: FittingPlans, s: number): SegmentInputs {
  const { length_m, meanVelocity_m_s } = frame.solution.segments[s]!;
  const sheet = sheetOf(frame, s);
  return {
    segment: frame.system.segments[s]!,
    number: frame.numbers[s]!,
    levelId: levelOf(frame, s),
    sheetNumber: sheet?.sheetNumber ?? "",
    revision: sheet?.revision ?? "",
    section: frame.metal[s]!,
    length_m,
    taken_m: plans.near[s]! + plans.far[s]!,
    meanVelocity_m_s,
    plans: plans.of[s]!,
  };
}

/** Plain data, by value. Records that were not touched are the same object and cost nothing. */
export function isSame(a: unknown, b: unknown): boolean {
  if (Object.is(a, b)) return true;
  if (typeof a !== "object" || typeof b !== "object" || a === null || b === null) return false;
  if (Array.isArray(a)) {
    return Array.isArray(b) && a.length === b.length && a.every((item, at) => isSame(item, b[at]));
  }
  const keys = Object.keys(a);
  if (keys.length !== Object.keys(b).length) return false;
  for (const key of keys) {
    if (!isSame((a as Record<string, unknown>)[key], (b as Record<string, unknown>)[key])) return false;
  }
  return true;
}
