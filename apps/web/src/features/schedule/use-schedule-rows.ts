import { find } from "@cleatwork/layout";
import { useMemo } from "react";
import { useWorkspace } from "../workspace/index.ts";
import type { ScheduleRow } from "./columns.ts";

/** The rows that are not folded away, each with its results. */
export function useScheduleRows(systemId: string, folded: ReadonlySet<string>): readonly ScheduleRow[] {
  const { rowsOf, solvedOf, layout, index, numberOf } = useWorkspace();
  return useMemo(() => {
    const hidden = new Set<string>();
    const rows: ScheduleRow[] = [];
    for (const row of rowsOf(systemId)) {
      const { segment } = row;
      const parent = index.parentOf.get(segment.fromNodeId);
      const isHidden = parent !== undefined && (hidden.has(parent.id) || folded.has(parent.id));
      if (isHidden) hidden.add(segment.id);
      else
        rows.push({
          ...row,
          solved: solvedOf(segment.id),
          from: parent ? numberOf(parent.id) : (find(layout, "node", segment.fromNodeId)?.tag ?? ""),
          foldable: (index.childrenOf.get(segment.toNodeId) ?? []).length > 0,
        });
    }
    return rows;
  }, [rowsOf, solvedOf, layout, index, numberOf, systemId, folded]);
}
