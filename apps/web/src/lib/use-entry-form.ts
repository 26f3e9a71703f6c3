import { useState } from 'react';
import {
  useForm,
  type DefaultValues,
  type FieldPath,
  type FieldValues,
  type UseFormReturn,
} from 'react-hook-form';
import { asProblem } from './api/problem';
import { showFieldProblems } from './show-field-problems';

/** A form, how to send it, and what came of it. */
export interface EntryForm<T extends FieldValues> {
  form: UseFormReturn<T>;
  send: () => Promise<void>;
  busy: boolean;
  /** What the service refused that no field is to blame for. */
  refusal: string | undefined;
}

interface EntryFormOptions<T extends FieldValues, R> {
  entries: DefaultValues<T>;
  perform: (typed: T) => Promise<R>;
  onDone?: (result: R, form: UseFormReturn<T>) => void | Promise<void>;
}

/** A form whose entries go to the service: what it finds wrong comes back beside the fields, and all typed stays. */
export function useEntryForm<T extends FieldValues, R>(options: EntryFormOptions<T, R>): EntryForm<T> {
  const { entries, perform, onDone } = options;
  const form = useForm<T>({ defaultValues: entries });
  const [refusal, setRefusal] = useState<string>();
  const send = form.handleSubmit(async (typed) => {
    setRefusal(undefined);
    try {
      await onDone?.(await perform(typed as T), form);
    } catch (error) {
      const fields = Object.keys(form.getValues()) as FieldPath<T>[];
      setRefusal(showFieldProblems<T>(asProblem(error), fields, form.setError));
    }
  });
  return { form, send: () => send(), busy: form.formState.isSubmitting, refusal };
}
