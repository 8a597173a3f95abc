import { useSyncExternalStore } from "react";
import { OfflineIcon } from "../../ui/icons/icon.tsx";

const subscribe = (listener: () => void) => {
  window.addEventListener("online", listener);
  window.addEventListener("offline", listener);
  return () => {
    window.removeEventListener("online", listener);
    window.removeEventListener("offline", listener);
  };
};

/** The computer says that it has no network. What is on the screen stays; what is typed is not sent yet. */
export function OfflineLine() {
  const online = useSyncExternalStore(subscribe, () => navigator.onLine);
  if (online) return null;
  return (
    <p
      role="status"
      className="flex items-center gap-2 border-b border-line-strong bg-warn-tint px-4 py-1 font-semibold text-warn-ink print:hidden"
    >
      <OfflineIcon />
      No connection. What you see is as it was; saving waits until it is back.
    </p>
  );
}
