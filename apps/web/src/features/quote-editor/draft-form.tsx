import { quoteDraft, type Quote, type QuoteDraft } from "@cleatwork/contracts";
import { zodResolver } from "@hookform/resolvers/zod";
import { useEffect } from "react";
import { useForm, useWatch } from "react-hook-form";
import { SelectField, TextAreaField, TextField } from "../../ui/controls.tsx";

const LISTS = [
  { name: "inclusions", label: "Included", hint: "One line each." },
  { name: "exclusions", label: "Not included", hint: "One line each; what is not here will be asked about later." },
  { name: "clarifications", label: "Clarifications", hint: "One line each." },
  { name: "addenda", label: "Addenda acknowledged", hint: "One line each." },
] as const;

/** As it is typed: lists are text with a line for each entry. */
type Typed = Omit<QuoteDraft, (typeof LISTS)[number]["name"]> & Record<(typeof LISTS)[number]["name"], string>;

const typedFrom = (draft: QuoteDraft): Typed => ({
  ...draft,
  inclusions: draft.inclusions.join("\n"),
  exclusions: draft.exclusions.join("\n"),
  clarifications: draft.clarifications.join("\n"),
  addenda: draft.addenda.join("\n"),
});
const linesOf = (text: string): string[] =>
  text
    .split("\n")
    .map((line) => line.trim())
    .filter((line) => line !== "");

export const draftFrom = (typed: Typed): QuoteDraft => ({
  ...typed,
  validDays: Number(typed.validDays),
  inclusions: linesOf(typed.inclusions),
  exclusions: linesOf(typed.exclusions),
  clarifications: linesOf(typed.clarifications),
  addenda: linesOf(typed.addenda),
});

/** The words of the quote. Saved by itself a moment after the last key. */
export function DraftForm({
  quote,
  disabled,
  onChange,
}: {
  quote: Quote;
  disabled: boolean;
  onChange: (draft: QuoteDraft) => void;
}) {
  const { register, control, formState } = useForm<Typed>({
    defaultValues: typedFrom(quote.draft),
    mode: "onChange",
    resolver: async (typed, context, options) => {
      const result = await zodResolver(quoteDraft)(draftFrom(typed), context, options as never);
      return result as never;
    },
  });
  const typed = useWatch({ control });
  useEffect(() => {
    const parsed = quoteDraft.safeParse(draftFrom(typed as Typed));
    if (parsed.success && JSON.stringify(parsed.data) !== JSON.stringify(quote.draft)) onChange(parsed.data);
    // The form is the one that changes; the quote follows it.
    // eslint-disable-next-line react-hooks/exhaustive-deps
  }, [typed]);
  const error = (name: keyof Typed) => formState.errors[name]?.message;

  return (
    <fieldset disabled={disabled} className="grid gap-3">
      <TextField label="Title" error={error("title")} {...register("title")} />
      <TextAreaField label="Greeting" rows={3} error={error("greeting")} {...register("greeting")} />
      <TextAreaField label="Scope" rows={5} error={error("scope")} {...register("scope")} />
      {LISTS.map(({ name, label, hint }) => (
        <TextAreaField key={name} label={label} hint={hint} rows={4} error={error(name)} {...register(name)} />
      ))}
      <TextAreaField label="Terms" rows={3} error={error("terms")} {...register("terms")} />
      <div className="grid grid-cols-2 gap-3">
        <TextField
          label="Valid for"
          unit="days"
          inputMode="numeric"
          error={error("validDays")}
          {...register("validDays")}
        />
        <SelectField
          label="The client sees"
          {...register("priceDetail")}
          choices={[
            { value: "by-system", label: "the price by system" },
            { value: "lump-sum", label: "one sum" },
          ]}
        />
      </div>
    </fieldset>
  );
}
