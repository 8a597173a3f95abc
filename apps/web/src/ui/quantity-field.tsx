import { useRef, useState } from "react";
import { TextField } from "./controls.tsx";
import type { FieldProps } from "./field.tsx";

export type Understood<Q> =
  | { readonly ok: true; readonly value: Q }
  | { readonly ok: false; readonly problems: readonly { readonly message: string }[] };

/**
 * Takes what people type (`12'6`, `24x12`, `3.8 m`), hands over the quantity, and shows back what it understood, beside the
 * label, where nothing moves when it goes. While the text is not understood, either the last good value stays in force and
 * the error says so (where every key counts at once), or there is no value (in a form, which then refuses to be saved).
 */
export function QuantityField<Q>({
  value,
  onChange,
  parse,
  format,
  unit,
  error,
  hint,
  name,
  disabled,
  onBlur,
  whileUnclear = "keep-last",
  aside,
  ref,
  ...field
}: FieldProps & {
  readonly value: Q | null;
  readonly onChange: (value: Q | null) => void;
  /** Only called with something to parse. */
  readonly parse: (text: string) => Understood<Q>;
  readonly format: (value: Q) => { readonly text: string; readonly value: string; readonly unit: string };
  readonly unit?: string;
  readonly name?: string;
  readonly disabled?: boolean;
  readonly onBlur?: () => void;
  readonly whileUnclear?: "keep-last" | "no-value";
  readonly ref?: React.Ref<HTMLInputElement>;
}) {
  const shown = value === null ? null : format(value);
  // Null: what is shown is the value; a text: what is being typed.
  const [typed, setTyped] = useState<string | null>(null);
  const atFocus = useRef(value);
  const understood = typed === null || typed.trim() === "" ? null : parse(typed);
  const problem = understood && !understood.ok ? (understood.problems[0]?.message ?? "This is not understood.") : null;
  const keeps = whileUnclear === "keep-last";
  const echo = understood?.ok ? `= ${format(understood.value).text}` : null;

  return (
    <TextField
      {...field}
      {...(name === undefined ? {} : { name })}
      disabled={disabled ?? false}
      inputMode="text"
      autoComplete="off"
      {...(ref ? { ref } : {})}
      value={typed ?? shown?.value ?? ""}
      {...((unit ?? shown?.unit) ? { unit: unit ?? shown?.unit ?? "" } : {})}
      error={problem ? [problem, shown && keeps ? `${shown.text} stays in force.` : ""].join(" ").trim() : error}
      hint={hint}
      aside={echo ? <span className="label-width text-help text-ink-3">{echo}</span> : aside}
      onChange={(event) => {
        const text = event.target.value;
        setTyped(text);
        if (text.trim() === "") return onChange(null);
        const next = parse(text);
        if (next.ok) onChange(next.value);
        else if (!keeps) onChange(null);
      }}
      onFocus={() => {
        if (typed === null) atFocus.current = value;
      }}
      onBlur={() => {
        if (!problem) setTyped(null);
        onBlur?.();
      }}
      onKeyDown={(event) => {
        if (event.key === "Escape" && typed !== null) {
          event.stopPropagation();
          setTyped(null);
          onChange(atFocus.current);
        }
      }}
    />
  );
}
