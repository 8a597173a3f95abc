import { useState, type ComponentPropsWithRef, type ReactNode } from "react";
import { classNames } from "../lib/class-names.ts";
import { Field, controlLook, type FieldProps } from "./field.tsx";
import { EyeIcon } from "./icons/icon.tsx";

type Tall = { readonly tall?: boolean };

export function TextField({
  label,
  hint,
  error,
  hideLabel,
  aside,
  className,
  unit,
  tall,
  ...input
}: FieldProps & Tall & Omit<ComponentPropsWithRef<"input">, "className"> & { readonly unit?: string }) {
  return (
    <Field {...{ label, hint, error, aside }} {...spread({ hideLabel, className })}>
      {(slots) => (
        <div className="relative">
          <input
            type="text"
            {...input}
            {...slots}
            className={classNames(controlLook, tall ? "h-11 text-[0.9375rem]" : "h-8", unit && "pr-14")}
          />
          {unit && (
            <span
              aria-hidden
              className="pointer-events-none absolute inset-y-0 right-2 flex items-center text-help text-ink-3"
            >
              {unit}
            </span>
          )}
        </div>
      )}
    </Field>
  );
}

export function PasswordField({
  label,
  hint,
  error,
  aside,
  className,
  tall,
  ...input
}: FieldProps & Tall & Omit<ComponentPropsWithRef<"input">, "className" | "type">) {
  const [shown, setShown] = useState(false);
  return (
    <Field {...{ label, hint, error, aside }} {...spread({ className })}>
      {(slots) => (
        <div className="relative">
          <input
            {...input}
            {...slots}
            type={shown ? "text" : "password"}
            className={classNames(controlLook, tall ? "h-11 text-[0.9375rem]" : "h-8", "pr-10")}
          />
          <button
            type="button"
            aria-pressed={shown}
            aria-label="Show the password"
            title="Show the password"
            className="absolute inset-y-1 right-1 grid w-8 place-items-center rounded-edge text-ink-3 hover:text-ink"
            onClick={() => setShown(!shown)}
          >
            <EyeIcon size={18} />
          </button>
        </div>
      )}
    </Field>
  );
}

export function TextAreaField({
  label,
  hint,
  error,
  hideLabel,
  aside,
  className,
  ...input
}: FieldProps & Omit<ComponentPropsWithRef<"textarea">, "className">) {
  return (
    <Field {...{ label, hint, error, aside }} {...spread({ hideLabel, className })}>
      {(slots) => <textarea rows={4} {...input} {...slots} className={classNames(controlLook, "py-1.5 leading-5")} />}
    </Field>
  );
}

export interface Choice {
  readonly value: string;
  readonly label: string;
}

/** The native select: it works with every finger, key and reader there is. */
export function SelectField({
  label,
  hint,
  error,
  hideLabel,
  aside,
  className,
  choices = [],
  empty,
  children,
  ...input
}: FieldProps &
  Omit<ComponentPropsWithRef<"select">, "className"> & {
    /** Or `option` elements as children, where they come in groups. */
    readonly choices?: readonly Choice[];
    /** What an empty choice says, where there may be none. */
    readonly empty?: string;
  }) {
  return (
    <Field {...{ label, hint, error, aside }} {...spread({ hideLabel, className })}>
      {(slots) => (
        <select {...input} {...slots} className={classNames(controlLook, "h-8")}>
          {empty !== undefined && <option value="">{empty}</option>}
          {choices.map((choice) => (
            <option key={choice.value} value={choice.value}>
              {choice.label}
            </option>
          ))}
          {children}
        </select>
      )}
    </Field>
  );
}

export function CheckField({
  label,
  hint,
  className,
  ...input
}: { readonly label: ReactNode; readonly hint?: ReactNode } & Omit<ComponentPropsWithRef<"input">, "type">) {
  return (
    <label className={classNames("flex min-h-6 items-start gap-2", className)}>
      <input type="checkbox" {...input} className="mt-0.5 size-4 shrink-0 accent-dye" />
      <span>
        {label}
        {hint && <span className="block text-help text-ink-3">{hint}</span>}
      </span>
    </label>
  );
}

/** Leaves out what is undefined, which exact optional types do not accept. */
function spread<T extends object>(props: T): { [K in keyof T]?: Exclude<T[K], undefined> } {
  return Object.fromEntries(Object.entries(props).filter(([, value]) => value !== undefined)) as {
    [K in keyof T]?: Exclude<T[K], undefined>;
  };
}
