import type { ComponentProps, ReactNode } from "react";
import { Controller, get, useFormContext, type FieldValues, type Path } from "react-hook-form";
import { CheckField, PasswordField, SelectField, TextAreaField, TextField } from "../controls.tsx";
import type { FieldProps } from "../field.tsx";
import { QuantityField, type Understood } from "../quantity-field.tsx";
import { fieldMessage } from "./field-message.ts";

type Bound<Props, Values extends FieldValues> = Omit<
  Props,
  "name" | "error" | "value" | "onChange" | "onBlur" | "ref"
> & {
  readonly name: Path<Values>;
};

/** The kit's fields, tied to a form of these values; the names are checked by the compiler. */
export function formParts<Values extends FieldValues>() {
  const useBound = (name: Path<Values>) => {
    const { register, getValues, formState } = useFormContext<Values>();
    return { field: register(name), error: errorAt(formState.errors, name, getValues(name)) };
  };

  const Text = ({ name, ...rest }: Bound<ComponentProps<typeof TextField>, Values>) => {
    const { field, error } = useBound(name);
    return <TextField {...rest} {...field} error={error} />;
  };
  const Password = ({ name, ...rest }: Bound<ComponentProps<typeof PasswordField>, Values>) => {
    const { register, formState } = useFormContext<Values>();
    // What was typed is not repeated: someone may be looking.
    const error = errorAt(formState.errors, name, "");
    return <PasswordField {...rest} {...register(name)} error={error} />;
  };
  const Area = ({ name, ...rest }: Bound<ComponentProps<typeof TextAreaField>, Values>) => {
    const { field, error } = useBound(name);
    return <TextAreaField {...rest} {...field} error={error} />;
  };
  /** Controlled, so that a value may arrive before its choice does. `emptyIs` is what no choice means in the body. */
  const Select = ({
    name,
    emptyIs = "",
    onChosen,
    ...rest
  }: Bound<ComponentProps<typeof SelectField>, Values> & {
    emptyIs?: null | "";
    onChosen?: (value: string) => void;
  }) => {
    const { control } = useFormContext<Values>();
    return (
      <Controller
        control={control}
        name={name}
        render={({ field, fieldState }) => (
          <SelectField
            {...rest}
            name={field.name}
            ref={field.ref}
            value={field.value ?? ""}
            onBlur={field.onBlur}
            onChange={(event) => {
              field.onChange(event.target.value === "" ? emptyIs : event.target.value);
              onChosen?.(event.target.value);
            }}
            error={errorOf(fieldState.error, field.value)}
          />
        )}
      />
    );
  };
  const Check = ({ name, ...rest }: { name: Path<Values>; label: ReactNode; hint?: ReactNode }) => {
    const { register } = useFormContext<Values>();
    return <CheckField {...rest} {...register(name)} />;
  };
  /** For values that are not text in the form: a quantity in SI, an amount in millionths, basis points. */
  const Quantity = <Q,>({
    name,
    empty,
    ...rest
  }: FieldProps & {
    name: Path<Values>;
    parse: (text: string) => Understood<Q>;
    format: (value: Q) => { readonly text: string; readonly value: string; readonly unit: string };
    unit?: string;
    /** What no text at all means; without it, nothing typed is a missing value. */
    empty?: null;
  }) => {
    const { control } = useFormContext<Values>();
    return (
      <Controller
        control={control}
        name={name}
        render={({ field, fieldState }) => (
          <QuantityField<Q>
            {...rest}
            whileUnclear="no-value"
            ref={field.ref}
            name={field.name}
            value={field.value ?? null}
            onChange={(value) => field.onChange(value ?? (empty === null ? null : undefined))}
            onBlur={field.onBlur}
            error={errorOf(fieldState.error, field.value)}
          />
        )}
      />
    );
  };
  return { Text, Password, Area, Select, Check, Quantity };
}

function errorAt(errors: object, name: string, value: unknown) {
  const found: { message?: string; type?: string } | undefined = get(errors, name);
  return errorOf(found, value);
}

function errorOf(found: { message?: string; type?: string } | undefined, value: unknown): string | undefined {
  if (!found?.message) return undefined;
  // "said": a whole sentence already.
  return found.type === "said" ? found.message : fieldMessage(value, found.message);
}
