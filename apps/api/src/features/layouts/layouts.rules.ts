/** Pure: what a batch of edits does to the records as they stand now, or what stands against it. */
import type { ChangeSet, DrawingId, LayoutRecord, RecordId, SpecId } from "@cleatwork/contracts";
import { checkLayout, nameOf, sameRecord } from "@cleatwork/layout";

export interface LayoutError {
  readonly pointer: string;
  readonly code: string;
  readonly message: string;
  readonly value?: unknown;
}

export type Applied =
  | {
      readonly kind: "applied";
      readonly records: ReadonlyMap<RecordId, LayoutRecord>;
      /** Ids that the batch touched, for storing. */
      readonly touched: ReadonlySet<RecordId>;
    }
  | { readonly kind: "conflict"; readonly errors: readonly LayoutError[] }
  | { readonly kind: "malformed"; readonly errors: readonly LayoutError[] };

/**
 * Applies the sets in order. An edit fits when the record it was made on is the record as it stands, whatever happened
 * to others meanwhile: edits from an old base are accepted unless they meet the same record. Each record in conflict is
 * named once, with its present state, so that the browser can show both.
 */
export function applySets(current: readonly LayoutRecord[], sets: readonly ChangeSet[]): Applied {
  const records = new Map<RecordId, LayoutRecord>(current.map((record) => [record.id, record]));
  const touched = new Set<RecordId>();
  const malformed: LayoutError[] = [];
  const conflicts = new Map<RecordId, LayoutError>();

  for (const [setIndex, set] of sets.entries())
    for (const [changeIndex, change] of set.changes.entries()) {
      const pointer = `/sets/${setIndex}/changes/${changeIndex}`;
      const wrong = malformedChange(change);
      if (wrong) {
        malformed.push({ pointer, ...wrong });
        continue;
      }
      const now = records.get(change.id) ?? null;
      if (!sameRecord(now, change.before) && !conflicts.has(change.id))
        conflicts.set(change.id, {
          pointer,
          code: now === null ? "record-gone" : change.before === null ? "record-exists" : "record-changed",
          message: `${calledBy(now ?? change.before ?? change.after)} as it stands now`,
          value: now,
        });
      if (change.after) records.set(change.id, change.after);
      else records.delete(change.id);
      touched.add(change.id);
    }

  if (malformed.length > 0) return { kind: "malformed", errors: malformed };
  if (conflicts.size > 0) return { kind: "conflict", errors: [...conflicts.values()] };
  return { kind: "applied", records, touched };
}

const calledBy = (record: LayoutRecord | null) => (record ? nameOf(record) : "the record");

function malformedChange(change: ChangeSet["changes"][number]): Omit<LayoutError, "pointer"> | null {
  const { id, before, after } = change;
  if (!before && !after)
    return { code: "change-empty", message: "a record before, a record after, or both", value: id };
  if ((before && before.id !== id) || (after && after.id !== id))
    return {
      code: "ids-differ",
      message: `the records of the change have its id, ${id}`,
      value: after?.id ?? before?.id,
    };
  if (before && after && before.kind !== after.kind)
    return { code: "kind-changed", message: `a ${before.kind} stays a ${before.kind}`, value: after.kind };
  return null;
}

/** What makes the layout unsound after the batch, each told where the batch wrote it. */
export function soundnessErrors(
  records: ReadonlyMap<RecordId, LayoutRecord>,
  pointer: (recordId: string, field: string) => string,
): LayoutError[] {
  return checkLayout({ records }).map((found) => ({
    pointer: pointer(found.recordId, found.field),
    code: found.code,
    message: `${found.name} (${found.recordId}) needs ${found.message}`,
    value: found.value,
  }));
}

/** Where in the batch each record was last written, as a JSON pointer. */
export function pointersInto(sets: readonly ChangeSet[]): (recordId: string, field: string) => string {
  const pointers = new Map<string, string>();
  for (const [setIndex, set] of sets.entries())
    for (const [changeIndex, change] of set.changes.entries())
      pointers.set(change.id, `/sets/${setIndex}/changes/${changeIndex}`);
  return (recordId, field) => {
    const pointer = pointers.get(recordId);
    return pointer === undefined ? "" : `${pointer}/after${field === "" ? "" : `/${field}`}`;
  };
}

/** Records that name a spec of no one here, or a drawing of another project. */
export function referenceErrors(
  written: readonly LayoutRecord[],
  known: { specs: ReadonlySet<SpecId>; drawings: ReadonlySet<DrawingId> },
  pointer: (recordId: string, field: string) => string,
): LayoutError[] {
  const errors: LayoutError[] = [];
  for (const record of written) {
    if (record.kind === "system" && !known.specs.has(record.specId))
      errors.push({
        pointer: pointer(record.id, "specId"),
        code: "spec-unknown",
        message: `${nameOf(record)} needs a construction spec of this company`,
        value: record.specId,
      });
    if (record.kind === "level" && record.underlay && !known.drawings.has(record.underlay.drawingId))
      errors.push({
        pointer: pointer(record.id, "underlay/drawingId"),
        code: "drawing-unknown",
        message: `${nameOf(record)} needs a drawing of this project`,
        value: record.underlay.drawingId,
      });
  }
  return errors;
}
