import { zodResolver } from "@hookform/resolvers/zod";
import { useRef, useState } from "react";
import {
  useForm,
  type DefaultValues,
  type FieldValues,
  type Path,
  type PathValue,
  type UseFormReturn,
} from "react-hook-form";
import type { ProblemCode } from "@cleatwork/contracts";
import type { z } from "zod";
import { newIdempotencyKey } from "../../lib/http.ts";
import { HttpProblem, isProblem } from "../../lib/problem.ts";
import { fieldOfPointer } from "./pointers.ts";

/** What is saved goes with this: the version it builds on, and a key that makes a second try harmless. */
export interface SaveContext {
  readonly version: number;
  readonly idempotencyKey: string;
}

export interface ContractForm<Input extends FieldValues, Output> {
  readonly form: UseFormReturn<Input, unknown, Output>;
  readonly submit: (event?: React.BaseSyntheticEvent) => Promise<void>;
  readonly busy: boolean;
  /** What belongs to no field; null when there is nothing to say. */
  readonly problem: Error | null;
  /** Someone saved in between: take what is stored now, or save this over it. */
  readonly stale: { readonly takeTheirs: () => Promise<void>; readonly keepMine: () => Promise<void> } | null;
}

/**
 * A form over a contract: the same schema that the API parses with says what is missing, problems with pointers land on
 * their fields, the first takes the focus, and nothing typed is ever lost.
 */
export function useContractForm<Schema extends z.ZodType<FieldValues, FieldValues>, Saved>({
  schema,
  initial,
  version = 0,
  save,
  onSaved,
  reload,
  fieldOf = {},
}: {
  schema: Schema;
  initial: z.input<Schema>;
  /** Of what `initial` was read from; leave out for something new. */
  version?: number;
  save: (values: z.output<Schema>, context: SaveContext) => Promise<Saved>;
  onSaved: (saved: Saved) => void | Promise<void>;
  /** Reads again what is stored, for when someone else saved first. */
  reload?: () => Promise<{ values: z.input<Schema>; version: number }>;
  /** The field that a problem without a pointer is about. */
  fieldOf?: { readonly [C in ProblemCode]?: Path<z.input<Schema> & FieldValues> };
}): ContractForm<z.input<Schema> & FieldValues, z.output<Schema>> {
  type Input = z.input<Schema> & FieldValues;
  const form = useForm<Input, unknown, z.output<Schema>>({
    resolver: zodResolver<Input, unknown, z.output<Schema>>(schema as never),
    defaultValues: initial as DefaultValues<Input>,
    mode: "onSubmit",
    reValidateMode: "onChange",
  });
  const [problem, setProblem] = useState<Error | null>(null);
  const [stale, setStale] = useState(false);
  const [firstKey] = useState(newIdempotencyKey);
  const building = useRef({ version, idempotencyKey: firstKey });

  const send = async (values: z.output<Schema>) => {
    setProblem(null);
    setStale(false);
    try {
      const saved = await save(values, building.current);
      building.current = { version: versionOf(saved) ?? building.current.version, idempotencyKey: newIdempotencyKey() };
      await onSaved(saved);
      form.reset(form.getValues());
    } catch (error) {
      if (isProblem(error, "stale") && reload) return setStale(true);
      const onForm = placeOnFields(form, error, fieldOf);
      // Another body under the same key would be refused: what follows a refusal is a new request.
      if (error instanceof HttpProblem) building.current.idempotencyKey = newIdempotencyKey();
      if (onForm) setProblem(onForm);
    }
  };

  return {
    form,
    submit: (event) => form.handleSubmit(send)(event),
    busy: form.formState.isSubmitting,
    problem,
    stale:
      stale && reload
        ? {
            takeTheirs: async () => {
              const now = await reload();
              building.current.version = now.version;
              form.reset(now.values);
              setStale(false);
            },
            keepMine: async () => {
              building.current.version = (await reload()).version;
              await form.handleSubmit(send)();
            },
          }
        : null,
  };
}

/** Puts each problem on its field and gives the first the focus; answers what is left for the form as a whole. */
function placeOnFields<Input extends FieldValues, Output>(
  form: UseFormReturn<Input, unknown, Output>,
  error: unknown,
  fieldOf: { readonly [C in ProblemCode]?: Path<Input> },
): Error | null {
  if (!(error instanceof Error)) return new Error("Something went wrong here.");
  if (!(error instanceof HttpProblem)) return error;
  const about = fieldOf[error.code];
  if (about) {
    form.setError(about, { type: "said", message: error.detail || error.title }, { shouldFocus: true });
    return null;
  }
  let placed = 0;
  for (const { pointer, message } of error.errors) {
    const name = fieldOfPointer(pointer) as Path<Input>;
    if (name === "" || form.getValues(name) === (undefined as PathValue<Input, Path<Input>>)) continue;
    form.setError(name, { type: "server", message }, { shouldFocus: placed === 0 });
    placed++;
  }
  return placed > 0 && placed === error.errors.length ? null : error;
}

const versionOf = (saved: unknown): number | null =>
  typeof saved === "object" && saved !== null && "version" in saved && typeof saved.version === "number"
    ? saved.version
    : null;
