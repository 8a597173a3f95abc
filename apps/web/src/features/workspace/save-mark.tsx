import { Button, IconButton } from "../../ui/button.tsx";
import { RedoIcon, UndoIcon } from "../../ui/icons/icon.tsx";
import { SeverityText } from "../../ui/severity.tsx";
import { useWorkspace } from "./workspace-context.ts";

/** Whether everything is safe, and the way back. */
export function SaveMark() {
  const { state, store, undo, redo, mayEdit } = useWorkspace();
  return (
    <div className="px-4 py-1.5 text-right">
      <div className="text-label text-ink-2" role="status" data-testid="save-state">
        {words(state.save)}
      </div>
      {mayEdit && (
        <div className="flex justify-end gap-1">
          <IconButton
            label={state.undoLabel ? `Undo ${state.undoLabel}` : "Nothing to undo"}
            size="small"
            rank="bare"
            disabled={!state.undoLabel}
            onClick={undo}
          >
            <UndoIcon size={14} />
          </IconButton>
          <IconButton
            label={state.redoLabel ? `Redo ${state.redoLabel}` : "Nothing to redo"}
            size="small"
            rank="bare"
            disabled={!state.redoLabel}
            onClick={redo}
          >
            <RedoIcon size={14} />
          </IconButton>
        </div>
      )}
      {state.lost.length > 0 && (
        <div className="max-w-md text-left" role="alert">
          {state.lost.map(({ label, reason }, position) => (
            <SeverityText key={position} severity="warn">
              Not kept: {label}, {reason}
            </SeverityText>
          ))}
          <Button size="small" onClick={() => store.dismissLost()}>
            I have seen it
          </Button>
        </div>
      )}
    </div>
  );
}

type Save = ReturnType<typeof useWorkspace>["state"]["save"];

function words(save: Save): string {
  switch (save.kind) {
    case "saved":
      return save.at
        ? `All changes saved, ${save.at.toLocaleTimeString("en-US", { hour: "numeric", minute: "2-digit" })}`
        : "All changes saved";
    case "saving":
      return `Saving ${save.waiting === 1 ? "one change" : `${save.waiting} changes`}`;
    case "offline":
      return `No connection: ${save.waiting === 1 ? "one change waits" : `${save.waiting} changes wait`} on this machine`;
  }
}
