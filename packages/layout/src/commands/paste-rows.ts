/** A block from a paper takeoff or a spreadsheet becomes ducts, each row after the one it names, or after the last. */
import { ok } from "@cleatwork/calc";
import type { ChangeSet } from "@cleatwork/contracts";
import { applyChangeSet, merge } from "../change-set.ts";
import type { Layout } from "../layout.ts";
import { refuse, type CommandProblem, type CommandResult, type IdSource } from "./command.ts";
import { extendRun, type DuctFields, type OutletFields, type RunTo } from "./extend-run.ts";

export interface PastedRow {
  /** Index of the row that this one hangs on; null for the node that the block is pasted at. */
  readonly after: number | null;
  readonly to: RunTo & { readonly kind: "length" };
  readonly duct: DuctFields;
  readonly outlet: OutletFields | null;
}

export function pasteRows(
  layout: Layout,
  input: { atNodeId: string; rows: readonly PastedRow[] },
  ids: Pick<IdSource, "node" | "segment">,
): CommandResult {
  const ends: string[] = [];
  const sets: ChangeSet[] = [];
  const problems: CommandProblem[] = [];
  let now = layout;
  for (const [position, row] of input.rows.entries()) {
    const fromNodeId = row.after === null ? input.atNodeId : ends[row.after];
    const made =
      fromNodeId === undefined
        ? null
        : extendRun(now, { fromNodeId, to: row.to, duct: row.duct, outlet: row.outlet }, ids);
    if (!made?.ok) {
      const reason = made ? made.problems[0]?.message : "it hangs on a row that is not there";
      problems.push({ code: "rows-refused", message: `Row ${position + 1}: ${reason ?? ""}`, recordId: null });
      ends.push("");
      continue;
    }
    const applied = applyChangeSet(now, made.value);
    if (!applied.ok) throw new Error("a command's own set must fit the layout that it was made on");
    now = applied.value;
    sets.push(made.value);
    ends.push(made.value.changes[0]?.id ?? "");
  }
  if (problems.length > 0) return { ok: false, problems };
  return sets.length === 0
    ? refuse("nothing-changes", "There is no row to paste.")
    : ok(merge(`Paste ${sets.length} rows`, sets));
}
