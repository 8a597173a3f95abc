import { merge, pasteRows, applyChangeSet } from "@cleatwork/layout";
import type { ChangeSet } from "@cleatwork/contracts";
import { useMemo, useState } from "react";
import { Button } from "../../ui/button.tsx";
import { Dialog, DialogActions } from "../../ui/dialog.tsx";
import { SeverityText } from "../../ui/severity.tsx";
import { Toggle } from "../../ui/toggle.tsx";
import { notify } from "../../ui/toast.tsx";
import { browserIds, useWorkspace } from "../workspace/index.ts";
import type { ScheduleColumn, ScheduleRow, Sheet, Typed } from "./columns.ts";
import { cellsOf, chained, PASTE_COLUMNS, readBlock } from "./paste-block.ts";

interface Into {
  readonly rows: readonly ScheduleRow[];
  readonly columns: readonly ScheduleColumn[];
  readonly sheet: Sheet;
}

/** What a pasted block would do, cell by cell, before anything is done. */
export function PasteDialog({
  text,
  atNodeId,
  into,
  onClose,
}: {
  text: string;
  atNodeId: string;
  into: Into;
  onClose: () => void;
}) {
  const { units, run, store } = useWorkspace();
  const [way, setWay] = useState<"add" | "replace">(cellsOf(text)[0]?.length === 1 ? "replace" : "add");
  const read = useMemo(() => readBlock(text, units), [text, units]);
  const replacements = useMemo(() => replacementsOf(text, into), [text, into]);
  const wrongRows = read.filter(({ row }) => row === null).length;
  const wrongCells = replacements.filter(({ typed }) => !typed.ok).length;

  const add = () => {
    const rows = chained(read.flatMap(({ row }) => row ?? []));
    if (run((layout) => pasteRows(layout, { atNodeId, rows }, browserIds)).ok) onClose();
  };
  const replace = () => {
    let now = store.getState().layout;
    const sets: ChangeSet[] = [];
    for (const { typed } of replacements) {
      const result = typed.ok ? typed.command(now) : null;
      if (!result?.ok) continue;
      const applied = applyChangeSet(now, result.value);
      if (!applied.ok) continue;
      now = applied.value;
      sets.push(result.value);
    }
    if (sets.length > 0) store.apply(merge("Paste", sets));
    else notify("Nothing changes: it is so already.");
    onClose();
  };

  return (
    <Dialog
      open
      onOpenChange={(open) => {
        if (!open) onClose();
      }}
      title="Paste from a spreadsheet"
      wide
    >
      <div className="grid gap-3">
        <Toggle
          label="What the block does"
          value={way}
          onChange={setWay}
          choices={[
            { value: "add", label: "Adds ducts" },
            { value: "replace", label: "Changes cells from the cursor on" },
          ]}
        />
        <div className="max-h-96 overflow-auto">
          {way === "add" ? (
            <table className="grid-table">
              <thead>
                <tr>
                  {PASTE_COLUMNS.map((column) => (
                    <th key={column}>{column}</th>
                  ))}
                </tr>
              </thead>
              <tbody>
                {read.map(({ cells }, position) => (
                  <tr key={position}>
                    {PASTE_COLUMNS.map((column) => (
                      <td key={column}>
                        {cells[column].error ? (
                          <SeverityText severity="stop">{cells[column].error}</SeverityText>
                        ) : (
                          cells[column].shown
                        )}
                      </td>
                    ))}
                  </tr>
                ))}
              </tbody>
            </table>
          ) : (
            <table className="grid-table">
              <thead>
                <tr>
                  <th>Segment</th>
                  <th>Column</th>
                  <th>Now</th>
                  <th>Becomes</th>
                </tr>
              </thead>
              <tbody>
                {replacements.map(({ row, column, text: becomes, typed }) => (
                  <tr key={`${row.segment.id} ${column.id}`}>
                    <td>
                      {row.number} {row.segment.name}
                    </td>
                    <td>{column.head}</td>
                    <td>{column.text(row, into.sheet)}</td>
                    <td>{typed.ok ? becomes : <SeverityText severity="stop">{typed.message}</SeverityText>}</td>
                  </tr>
                ))}
              </tbody>
            </table>
          )}
        </div>
      </div>
      <DialogActions>
        <Button onClick={onClose}>Leave it</Button>
        {way === "add" ? (
          <Button rank="primary" disabled={wrongRows > 0 || read.length === 0} onClick={add}>
            {wrongRows > 0
              ? `Mend ${wrongRows} ${wrongRows === 1 ? "row" : "rows"} first`
              : `Add ${read.length} ${read.length === 1 ? "duct" : "ducts"}`}
          </Button>
        ) : (
          <Button rank="primary" disabled={wrongCells > 0 || replacements.length === 0} onClick={replace}>
            {wrongCells > 0
              ? `Mend ${wrongCells} ${wrongCells === 1 ? "cell" : "cells"} first`
              : `Change ${replacements.length} ${replacements.length === 1 ? "cell" : "cells"}`}
          </Button>
        )}
      </DialogActions>
    </Dialog>
  );
}

function replacementsOf(text: string, { rows, columns, sheet }: Into) {
  const found: { row: ScheduleRow; column: ScheduleColumn; text: string; typed: Typed }[] = [];
  for (const [down, cells] of cellsOf(text).entries())
    for (const [across, cell] of cells.entries()) {
      const row = rows[down];
      const column = columns[across];
      if (row && column?.type) found.push({ row, column, text: cell, typed: column.type(row, cell, sheet) });
    }
  return found;
}
