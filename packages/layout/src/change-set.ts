/** One edit as data: each touched record before and after. Undo is the same set read backwards; the log is the list of sets. */
import { fail, ok, type Result } from "@cleatwork/calc";
import type { Change, ChangeSet, LayoutRecord, RecordId } from "@cleatwork/contracts";
import type { Layout } from "./layout.ts";

/** Someone else changed the record that an edit was made on. */
export interface Conflict {
  readonly code: "record-changed" | "record-gone" | "record-exists";
  readonly id: RecordId;
  readonly present: LayoutRecord | null;
}

/** The layout after the edit, or each record that is not as the edit found it. All or nothing. */
export function applyChangeSet(layout: Layout, set: ChangeSet): Result<Layout, Conflict> {
  const conflicts: Conflict[] = [];
  const records = new Map(layout.records);
  for (const { id, before, after } of set.changes) {
    const present = records.get(id) ?? null;
    if (!sameRecord(present, before)) {
      const code = present === null ? "record-gone" : before === null ? "record-exists" : "record-changed";
      conflicts.push({ code, id, present });
      continue;
    }
    if (after) records.set(id, after);
    else records.delete(id);
  }
  return conflicts.length > 0 ? fail(...conflicts) : ok({ records });
}

export const invert = (set: ChangeSet): ChangeSet => ({
  label: set.label,
  changes: set.changes.map(({ id, before, after }) => ({ id, before: after, after: before })).reverse(),
});

/** Several edits as one: a record begins where the earliest found it and ends where the latest left it. */
export function merge(label: string, sets: readonly ChangeSet[]): ChangeSet {
  const merged = new Map<RecordId, Change>();
  for (const set of sets)
    for (const change of set.changes) {
      const earlier = merged.get(change.id);
      merged.set(change.id, earlier ? { ...change, before: earlier.before } : change);
    }
  return { label, changes: [...merged.values()].filter(({ before, after }) => !sameRecord(before, after)) };
}

/** The same record, field by field; an absent field and a null one differ. */
export const sameRecord = (a: LayoutRecord | null, b: LayoutRecord | null): boolean => a === b || same(a, b);

function same(a: unknown, b: unknown): boolean {
  if (Object.is(a, b)) return true;
  if (typeof a !== "object" || typeof b !== "object" || a === null || b === null) return false;
  if (Array.isArray(a) !== Array.isArray(b)) return false;
  const keys = Object.keys(a);
  if (keys.length !== Object.keys(b).length) return false;
  return keys.every((key) => Object.hasOwn(b, key) && same(Reflect.get(a, key), Reflect.get(b, key)));
}
