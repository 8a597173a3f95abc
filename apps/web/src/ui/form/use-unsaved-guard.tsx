import { useEffect } from "react";
import { useBlocker } from "react-router-dom";
import { Button } from "../button.tsx";
import { Dialog, DialogActions } from "../dialog.tsx";

/** Asks before something typed is left behind; the browser itself asks when the tab is closed. */
export function useUnsavedGuard(unsaved: boolean) {
  const blocker = useBlocker(
    ({ currentLocation, nextLocation }) => unsaved && currentLocation.pathname !== nextLocation.pathname,
  );
  useEffect(() => {
    if (!unsaved) return;
    const ask = (event: BeforeUnloadEvent) => event.preventDefault();
    window.addEventListener("beforeunload", ask);
    return () => window.removeEventListener("beforeunload", ask);
  }, [unsaved]);
  if (blocker.state !== "blocked") return null;
  return (
    <Dialog
      open
      onOpenChange={(open) => {
        if (!open) blocker.reset();
      }}
      title="Leave without saving?"
      description="What you typed on this page is not saved yet."
    >
      <DialogActions>
        <Button rank="primary" onClick={() => blocker.reset()}>
          Stay
        </Button>
        <Button rank="danger" onClick={() => blocker.proceed()}>
          Leave
        </Button>
      </DialogActions>
    </Dialog>
  );
}
