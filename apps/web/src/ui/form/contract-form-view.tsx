import type { ReactNode } from "react";
import { FormProvider, type FieldValues } from "react-hook-form";
import { classNames } from "../../lib/class-names.ts";
import { FormNotice } from "./form-notice.tsx";
import { useUnsavedGuard } from "./use-unsaved-guard.tsx";
import type { ContractForm } from "./use-contract-form.ts";

/** The form element around the fields, with what belongs to the whole above its buttons. */
export function ContractFormView<Input extends FieldValues, Output>({
  contractForm,
  children,
  actions,
  className,
  guard = false,
  label,
}: {
  contractForm: ContractForm<Input, Output>;
  children: ReactNode;
  actions: ReactNode;
  className?: string;
  /** Ask before the page is left with something unsaved. */
  guard?: boolean;
  label?: string;
}) {
  const { form, submit, problem, stale } = contractForm;
  const { isDirty, isSubmitting, isSubmitSuccessful, errors, isSubmitted } = form.formState;
  const asking = useUnsavedGuard(guard && isDirty && !isSubmitting && !(isSubmitSuccessful && !problem && !stale));
  return (
    <FormProvider {...form}>
      <form
        noValidate
        {...(label ? { "aria-label": label } : {})}
        className={classNames("grid gap-4", className)}
        onSubmit={(event) => {
          // A form in a dialog is still inside the form around it, for React.
          event.stopPropagation();
          void submit(event);
        }}
      >
        {children}
        <FormNotice problem={problem} stale={stale} missing={isSubmitted ? Object.keys(errors).length : 0} />
        {actions}
      </form>
      {asking}
    </FormProvider>
  );
}
