import type { z } from "@restband/solver";
import { useState, type FormEventHandler } from "react";
import {
  useForm,
  type DefaultValues,
  type FieldErrors,
  type FieldValues,
  type Path,
  type UseFormRegister,
} from "react-hook-form";
import { showFailure } from "../../api/form-failure.ts";
import { checkedBy } from "./form-messages.ts";

interface EntryFormSettings<Input extends FieldValues, Output extends Input> {
  schema: z.ZodType<Output, Input>;
  /** One sentence for each field, whatever is wrong with it. */
  messages: Record<Path<Input>, string>;
  values: DefaultValues<Input>;
  /** Sends what was typed; it goes on from there. */
  send: (values: Output) => Promise<void>;
  /** What to say of a failure in place of the server's sentence; null: that. */
  sayOwn?: (error: unknown) => string | null;
}

/** A form before the sign-in: checked as the server checks, and after a refusal still as it was typed. */
export interface EntryFormState<Input extends FieldValues> {
  readonly register: UseFormRegister<Input>;
  readonly errors: FieldErrors<Input>;
  readonly isSubmitting: boolean;
  /** A failure that belongs to no field. */
  readonly failure: string | null;
  readonly submit: FormEventHandler<HTMLFormElement>;
}

export function useEntryForm<Input extends FieldValues, Output extends Input>({
  schema,
  messages,
  values,
  send,
  sayOwn,
}: EntryFormSettings<Input, Output>): EntryFormState<Input> {
  const [failure, setFailure] = useState<string | null>(null);
  const { register, handleSubmit, setError, formState } = useForm<Input, unknown, Output>({
    resolver: checkedBy(schema, messages),
    defaultValues: values,
  });
  const { errors, isSubmitting } = formState;
  const submit = handleSubmit(async (typed) => {
    setFailure(null);
    try {
      await send(typed);
    } catch (error) {
      setFailure(sayOwn?.(error) ?? showFailure(error, Object.keys(messages) as Path<Input>[], setError));
    }
  });
  return { register, errors, isSubmitting, failure, submit };
}
