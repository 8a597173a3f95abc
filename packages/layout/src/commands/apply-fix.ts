/** A fix of a finding, made in the layout: one edit, however many ducts it touches. */
import type { Fix } from "@cleatwork/calc";
import { merge } from "../change-set.ts";
import type { Layout } from "../layout.ts";
import { changeSet, type CommandResult } from "./command.ts";
import { setSegments } from "./edit-record.ts";

export function applyFix(layout: Layout, input: { fix: Fix; label: string }): CommandResult {
  const sets = [];
  for (const { segmentId, fields } of input.fix.edits) {
    const set = setSegments(layout, { ids: [segmentId], fields: recordFields(fields), label: input.label });
    if (!set.ok) return set;
    sets.push(set.value);
  }
  return changeSet(input.label, merge(input.label, sets).changes);
}

/** The layout's lists are its own to keep. */
const recordFields = ({ accessories, ...fields }: Fix["edits"][number]["fields"]) => ({
  ...fields,
  ...(accessories ? { accessories: [...accessories] } : {}),
});
