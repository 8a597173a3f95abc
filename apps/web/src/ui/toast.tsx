import { useEffect, useSyncExternalStore } from "react";
import { Button } from "./button.tsx";
import { CloseIcon } from "./icons/icon.tsx";
import { SeverityMark, type Severity } from "./severity.tsx";

interface Toast {
  readonly id: number;
  readonly text: string;
  readonly severity: Severity | null;
  readonly undo: (() => void) | null;
}

let toasts: readonly Toast[] = [];
let announcement = "";
let last = 0;
const listeners = new Set<() => void>();
const tell = () => listeners.forEach((listener) => listener());
const subscribe = (listener: () => void) => {
  listeners.add(listener);
  return () => listeners.delete(listener);
};

/** Says that something happened, and for some seconds offers to take it back. */
export function notify(text: string, options: { severity?: Severity; undo?: () => void } = {}) {
  toasts = [...toasts.slice(-2), { id: ++last, text, severity: options.severity ?? null, undo: options.undo ?? null }];
  tell();
}

/** Said by screen readers only: totals that changed somewhere else on the screen. */
export function announce(text: string) {
  announcement = text;
  tell();
}

const dismiss = (id: number) => {
  toasts = toasts.filter((toast) => toast.id !== id);
  tell();
};

/** The live region. Stands once, in the app. */
export function Toasts() {
  const shown = useSyncExternalStore(subscribe, () => toasts);
  const said = useSyncExternalStore(subscribe, () => announcement);
  return (
    <>
      <div className="sr-only" aria-live="polite">
        {said}
      </div>
      <div
        role="status"
        aria-live="polite"
        className="fixed bottom-16 right-4 left-4 z-50 grid justify-items-end gap-2 print:hidden md:bottom-4 md:left-auto"
      >
        {shown.map((toast) => (
          <ToastView key={toast.id} toast={toast} />
        ))}
      </div>
    </>
  );
}

function ToastView({ toast }: { toast: Toast }) {
  useEffect(() => {
    const timer = setTimeout(() => dismiss(toast.id), toast.undo ? 10_000 : 6_000);
    return () => clearTimeout(timer);
  }, [toast]);
  return (
    <div className="float-in flex items-center gap-3 border border-line-strong bg-sheet-hi px-3 py-2 shadow-float">
      {toast.severity && <SeverityMark severity={toast.severity} />}
      <span>{toast.text}</span>
      {toast.undo && (
        <Button
          size="small"
          onClick={() => {
            toast.undo?.();
            dismiss(toast.id);
          }}
        >
          Undo
        </Button>
      )}
      <button
        type="button"
        aria-label="Dismiss"
        className="text-ink-3 hover:text-ink"
        onClick={() => dismiss(toast.id)}
      >
        <CloseIcon size={14} />
      </button>
    </div>
  );
}
