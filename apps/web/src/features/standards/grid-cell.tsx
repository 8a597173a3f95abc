import { useState } from "react";
import { SeverityMark } from "../../ui/severity.tsx";
import type { Read } from "./cells.ts";

/**
 * One cell of a schedule. It takes what people type, keeps what it does not understand and says why; arrows and Enter go on
 * in the same column, Escape puts the last good value back.
 */
export function GridCell<T>({
  name,
  column,
  text,
  read,
  onChange,
  onUnclear,
  problem,
  choices,
  disabled,
  wide,
}: {
  /** What the field is called in an error: "Gauge, up to 24 in." */
  name: string;
  column: string;
  text: string;
  read: (typed: string) => Read<T>;
  onChange: (value: T) => void;
  /** True while what stands here cannot be saved. */
  onUnclear: (name: string, unclear: boolean) => void;
  /** What the document's rules say of the value. */
  problem?: string | undefined;
  choices?: readonly string[];
  disabled?: boolean;
  wide?: boolean;
}) {
  const [typed, setTyped] = useState<string | null>(null);
  const understood = typed === null ? null : read(typed);
  const error =
    understood && !understood.ok
      ? `${name}: “${typed ?? ""}” is not understood. Allowed: ${understood.allowed}.`
      : problem
        ? `${name}: “${text}”. Allowed: ${problem}.`
        : null;
  const put = (next: string | null) => {
    setTyped(next);
    onUnclear(name, next !== null && !read(next).ok);
  };
  const commit = () => {
    if (typed === null || !understood?.ok) return;
    if (typed.trim() !== text) onChange(understood.value);
    put(null);
  };
  const list = choices && choices.length > 0 ? `${column}-choices` : undefined;
  return (
    <td className="p-0!">
      <input
        type="text"
        autoComplete="off"
        data-grid-column={column}
        aria-label={name}
        disabled={disabled}
        {...(list ? { list } : {})}
        {...(error ? { "aria-invalid": true, title: error } : {})}
        value={typed ?? text}
        onFocus={(event) => event.target.select()}
        onChange={(event) => put(event.target.value)}
        onBlur={commit}
        onKeyDown={(event) => {
          if (event.key === "Escape" && typed !== null) {
            event.stopPropagation();
            put(null);
          }
          const step = { Enter: event.shiftKey ? -1 : 1, ArrowDown: 1, ArrowUp: -1 }[event.key];
          if (step === undefined) return;
          event.preventDefault();
          const cells = [...document.querySelectorAll<HTMLInputElement>(`[data-grid-column="${column}"]`)];
          const next = cells[cells.indexOf(event.currentTarget) + step];
          if (next) next.focus();
          else commit();
        }}
        className={`h-7 rounded-edge border border-transparent bg-transparent px-1.5 hover:border-line-strong focus:bg-sheet-hi disabled:text-ink-2 disabled:hover:border-transparent aria-invalid:border-stop aria-invalid:bg-stop-tint ${wide ? "w-44" : "w-28"}`}
      />
      {error && (
        <p role="alert" className="flex max-w-64 items-start gap-1 px-1.5 pb-1 text-help font-semibold text-stop-ink">
          <span className="mt-px">
            <SeverityMark severity="stop" />
          </span>
          <span>{error}</span>
        </p>
      )}
    </td>
  );
}
