import { useState } from "react";
import { TextField } from "../../ui/controls.tsx";

type Parsed<Q> =
  | { readonly ok: true; readonly value: Q }
  | { readonly ok: false; readonly problems: readonly { readonly message: string }[] };

/**
 * A field that takes effect when it is left or Enter is pressed, as one edit. While the text is not understood, what was in
 * force stays. Many things with different values show so, and take one when it is typed.
 */
export function TypedField<Q>({
  label,
  text,
  mixed = false,
  hint,
  placeholder,
  parse,
  onCommit,
  onClear,
  disabled = false,
}: {
  label: string;
  text: string;
  mixed?: boolean;
  hint?: string;
  placeholder?: string;
  parse: (typed: string) => Parsed<Q>;
  onCommit: (value: Q) => void;
  /** Called when the field is emptied; without it, emptying takes the typing back. */
  onClear?: () => void;
  disabled?: boolean;
}) {
  const [typed, setTyped] = useState<string | null>(null);
  const parsed = typed === null || typed.trim() === "" ? null : parse(typed);
  const commit = () => {
    if (typed === null || typed === text) return setTyped(null);
    if (typed.trim() === "") {
      onClear?.();
      return setTyped(null);
    }
    if (!parsed?.ok) return;
    onCommit(parsed.value);
    setTyped(null);
  };
  return (
    <TextField
      label={label}
      value={typed ?? (mixed ? "" : text)}
      placeholder={mixed ? "several values" : (placeholder ?? "")}
      disabled={disabled}
      autoComplete="off"
      hint={hint}
      error={parsed && !parsed.ok ? `${parsed.problems[0]?.message ?? ""} ${text} stays in force.` : undefined}
      onChange={(event) => setTyped(event.target.value)}
      onBlur={commit}
      onKeyDown={(event) => {
        if (event.key === "Enter") commit();
        if (event.key === "Escape") setTyped(null);
        event.stopPropagation();
      }}
    />
  );
}

export const anyText = (typed: string): Parsed<string> => ({ ok: true, value: typed.trim() });
