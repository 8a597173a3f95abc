/** What an edit would do, before it is made: the project computed with it, against the project as it is. */
import { pascals, type Pascals, type SolvedSegment } from "@cleatwork/calc";
import type { ChangeSet, RecordId } from "@cleatwork/contracts";
import { applyChangeSet } from "./change-set.ts";
import { checkLayout } from "./check-layout.ts";
import { createLayout, recordsOf } from "./layout.ts";
import { computeNumbers, type Numbers, type PricingDocuments } from "./project-numbers.ts";

/** After less before, in one air system. */
export interface SystemChange {
  readonly systemId: string;
  /** What the governing path needs. */
  readonly requiredPressure_pa: number;
  /** Available less required, once the edit is made. */
  readonly spareAfter_pa: Pascals;
}

/** After less before, over the whole project. */
export interface TrialChange {
  /** Systems whose required pressure the edit touches or could touch: those of its records. */
  readonly systems: readonly SystemChange[];
  readonly metal_kg: number;
  readonly shop_h: number;
  readonly field_h: number;
  /** Null where there is no price before or after. */
  readonly price_minor: number | null;
  /** Findings that go, and findings that come, by id. */
  readonly cleared: readonly string[];
  readonly raised: readonly string[];
}

export type TrialOutcome =
  | {
      readonly ok: true;
      readonly change: TrialChange;
      /** The ducts that the edit touches, as they would be. */
      readonly segments: readonly SolvedSegment[];
    }
  | { readonly ok: false; readonly reason: string };

export interface Trial {
  /** The numbers without any edit. */
  readonly before: Numbers;
  readonly of: (set: ChangeSet) => TrialOutcome;
}

/**
 * Edits tried on the documents, one at a time, each on the project as it is. Nothing is changed.
 *
 * Range    costs one computation of the project for each edit, and one for the start
 */
export function createTrial(documents: PricingDocuments): Trial {
  const layout = createLayout(documents.records);
  const before = computeNumbers(documents);

  return {
    before,
    of(set) {
      const applied = applyChangeSet(layout, set);
      if (!applied.ok) return { ok: false, reason: "The layout has changed since." };
      const unsound = checkLayout(applied.value)[0];
      if (unsound) return { ok: false, reason: `${unsound.name}: needs ${unsound.message}.` };

      const after = computeNumbers({ ...documents, records: recordsOf(applied.value) });
      const [problem] = after.problems.filter(
        ({ subject }) => !before.problems.some((each) => each.subject.id === subject.id),
      );
      if (problem) return { ok: false, reason: `${problem.subject.name || "The system"}: needs ${problem.limit}.` };

      const touched = new Set<RecordId>(set.changes.map(({ id }) => id));
      return {
        ok: true,
        change: differenceOf(before, after, systemsOf(set)),
        segments: after.solutions.flatMap(({ segments }) =>
          segments.filter(({ segmentId }) => touched.has(segmentId as RecordId)),
        ),
      };
    },
  };
}

function systemsOf(set: ChangeSet): ReadonlySet<string> {
  const ids = new Set<string>();
  for (const { before, after } of set.changes)
    for (const record of [before, after]) {
      if (record?.kind === "system") ids.add(record.id);
      if (record?.kind === "segment" || record?.kind === "node") ids.add(record.systemId);
    }
  return ids;
}

function differenceOf(before: Numbers, after: Numbers, systems: ReadonlySet<string>): TrialChange {
  const sumOf = (numbers: Numbers, of: (totals: Numbers["takeoffs"][number]["totals"]) => number) =>
    numbers.takeoffs.reduce((sum, { totals }) => sum + of(totals), 0);
  const changeOf = (of: (totals: Numbers["takeoffs"][number]["totals"]) => number) =>
    sumOf(after, of) - sumOf(before, of);
  const [had, has] = [findingIds(before), findingIds(after)];
  return {
    systems: after.solutions.flatMap((solution) => {
      if (!systems.has(solution.systemId)) return [];
      const earlier = before.solutions.find(({ systemId }) => systemId === solution.systemId);
      return [
        {
          systemId: solution.systemId,
          requiredPressure_pa: solution.requiredPressure_pa - (earlier?.requiredPressure_pa ?? 0),
          spareAfter_pa: pascals(solution.availablePressure_pa - solution.requiredPressure_pa),
        },
      ];
    }),
    metal_kg: changeOf(({ netWeight_kg }) => netWeight_kg),
    shop_h: changeOf(({ shopHours_h }) => shopHours_h),
    field_h: changeOf(({ fieldHours_h }) => fieldHours_h),
    price_minor: before.estimate && after.estimate ? after.estimate.price_minor - before.estimate.price_minor : null,
    cleared: [...had].filter((id) => !has.has(id)),
    raised: [...has].filter((id) => !had.has(id)),
  };
}

function findingIds({ solutions, takeoffs }: Numbers): ReadonlySet<string> {
  return new Set([...solutions, ...takeoffs].flatMap(({ findings }) => findings.map(({ id }) => id)));
}
