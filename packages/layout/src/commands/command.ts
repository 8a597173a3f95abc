/** What every command shares. A command is pure: the layout and an input in, a change set or the reasons against it out. */
import { fail, ok, type Result } from "@cleatwork/calc";
import type {
  Change,
  ChangeSet,
  LayoutRecord,
  LevelId,
  NodeId,
  RecordId,
  SegmentId,
  SystemId,
} from "@cleatwork/contracts";
import { sameRecord } from "../change-set.ts";
import type { Layout } from "../layout.ts";

/** Where new ids come from: time and chance stay outside. */
export interface IdSource {
  level(): LevelId;
  system(): SystemId;
  node(): NodeId;
  segment(): SegmentId;
}

export interface CommandProblem {
  readonly code:
    | "not-found"
    | "nothing-changes"
    | "length-not-positive"
    | "outlet-goes-on"
    | "share-outside"
    | "would-loop"
    | "has-equipment"
    | "root-is-taken"
    | "no-length"
    | "level-in-use"
    | "rows-refused";
  readonly message: string;
  readonly recordId: RecordId | null;
}

export type CommandResult = Result<ChangeSet, CommandProblem>;

export const refuse = (
  code: CommandProblem["code"],
  message: string,
  recordId: RecordId | null = null,
): { readonly ok: false; readonly problems: readonly CommandProblem[] } => fail({ code, message, recordId });

export const added = (record: LayoutRecord): Change => ({ id: record.id, before: null, after: record });
export const removed = (record: LayoutRecord): Change => ({ id: record.id, before: record, after: null });
export const changed = (before: LayoutRecord, after: LayoutRecord): Change => ({ id: before.id, before, after });

/** The set without what does not change; refused when nothing is left. */
export function changeSet(label: string, changes: readonly Change[]): CommandResult {
  const real = changes.filter(({ before, after }) => !sameRecord(before, after));
  return real.length === 0
    ? refuse("nothing-changes", "It is so already.")
    : ok({ label: label.slice(0, 120), changes: real });
}

/** The record of this kind, or a refusal that names it. */
export function need<K extends LayoutRecord["kind"]>(
  layout: Layout,
  kind: K,
  id: string,
): Result<Extract<LayoutRecord, { kind: K }>, CommandProblem> {
  const record = layout.records.get(id as RecordId);
  return record?.kind === kind
    ? ok(record as Extract<LayoutRecord, { kind: K }>)
    : refuse("not-found", `This ${kind} is no longer there; someone else may have removed it.`);
}
