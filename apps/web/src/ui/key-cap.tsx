import { Fragment } from "react";

const mac = typeof navigator !== "undefined" && /Mac|iPhone|iPad/.test(navigator.userAgent);

/** Keys, separated by spaces, as people see them on their keyboard. `mod` is ⌘ on a Mac and Ctrl elsewhere. */
export function KeyCap({ keys, children = "" }: { keys?: string; children?: string }) {
  return (
    <span className="inline-flex items-center gap-0.5">
      {(keys ?? children).split(" ").map((key, index) => (
        <Fragment key={index}>
          <kbd className="label-width inline-block h-[18px] min-w-[18px] rounded-edge border border-b-2 border-line-strong bg-sheet-hi px-1 text-center font-sans text-label leading-4 text-ink-2">
            {key === "mod" ? (mac ? "⌘" : "Ctrl") : key}
          </kbd>
        </Fragment>
      ))}
    </span>
  );
}
