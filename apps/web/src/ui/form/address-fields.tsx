import type { FieldValues } from "react-hook-form";
import { formParts } from "./form-parts.tsx";

const { Text } = formParts<FieldValues>();

/** A postal address, as it is written on an envelope. */
export function AddressFields({ prefix, legend }: { prefix: string; legend: string }) {
  return (
    <fieldset className="grid gap-3">
      <legend className="label-width mb-2 text-help font-semibold text-ink">{legend}</legend>
      <Text name={`${prefix}.line1`} label="Street and number" autoComplete="off" />
      <Text name={`${prefix}.line2`} label="Suite, building" autoComplete="off" />
      <div className="grid grid-cols-[2fr_1fr_1fr] gap-3">
        <Text name={`${prefix}.city`} label="City" autoComplete="off" />
        <Text name={`${prefix}.region`} label="State" autoComplete="off" />
        <Text name={`${prefix}.postalCode`} label="ZIP" autoComplete="off" />
      </div>
    </fieldset>
  );
}
