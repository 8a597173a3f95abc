import { useEffect } from "react";
import { useWorkspace } from "./workspace-context.ts";

/** Ctrl/⌘ Z without end, Ctrl/⌘ Shift Z and Ctrl Y forward; not while text is being typed. */
export function useWorkspaceKeys(): void {
  const { undo, redo } = useWorkspace();
  useEffect(() => {
    const onKey = (event: KeyboardEvent) => {
      if (!(event.ctrlKey || event.metaKey) || isTyping(event.target)) return;
      const key = event.key.toLowerCase();
      if (key === "z" && !event.shiftKey) undo();
      else if ((key === "z" && event.shiftKey) || key === "y") redo();
      else return;
      event.preventDefault();
    };
    window.addEventListener("keydown", onKey);
    return () => window.removeEventListener("keydown", onKey);
  }, [undo, redo]);
}

const isTyping = (target: EventTarget | null): boolean =>
  target instanceof HTMLElement && (target.matches("input, textarea, select") || target.isContentEditable);
